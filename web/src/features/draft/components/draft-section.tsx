import type { ReactNode } from 'react';
import { SECTIONS, sectionId, type SectionKey } from '../model/sections';

interface DraftSectionProps {
  section: SectionKey;
  /** What belongs here, in a line. */
  about?: ReactNode;
  children: ReactNode;
}

/** One section of the form under its heading; findings about the whole of it lead here. */
export function DraftSection({ section, about, children }: DraftSectionProps) {
  const id = sectionId(section);
  return (
    <section aria-labelledby={`${id}-title`} className="draft-section">
      <h2 id={`${id}-title`}>
        <span id={id} tabIndex={-1}>
          {SECTIONS.find(({ key }) => key === section)?.title}
        </span>
      </h2>
      {about ? <p className="draft-about">{about}</p> : null}
      {children}
    </section>
  );
}
