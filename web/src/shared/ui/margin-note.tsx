import type { ReactNode } from 'react';
import './margin-note.css';

/** A note in the margin: an italic word of what it is, then the note. */
export function MarginNote({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="margin-note" role="note" aria-label={title}>
      <p className="margin-note-title">{title}</p>
      <div className="margin-note-text">{children}</div>
    </div>
  );
}
