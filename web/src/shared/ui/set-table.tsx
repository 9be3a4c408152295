import type { ReactNode } from 'react';
import './set-table.css';

/** A table set with hairlines only; one that is too wide scrolls inside its own box, reachable by keyboard. */
export function SetTable({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="set-table-box" tabIndex={0} role="group" aria-label={label}>
      <table className="set-table">{children}</table>
    </div>
  );
}
