import type { ReactNode } from 'react';
import './margin-note.css';

/** A note in the margin: an italic word of what it is, then the note. */
export function MarginNote({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="margin-note">
      <h3 className="margin-note-title">{title}</h3>
      <div className="margin-note-text">{children}</div>
    </section>
  );
}
