import type { ReactNode } from 'react';
import './notice.css';

/** An empty list: what would be here, and how to start. */
export function EmptyState({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="notice notice-empty">
      <p className="notice-title">{title}</p>
      {children}
    </div>
  );
}
