import { memo } from 'react';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import { SECTIONS, sectionId, sectionOf } from '../model/sections';
import { FieldLink } from './field-link';

/** The sections in their order, each with how much is open in it. */
export const SectionIndex = memo(function SectionIndex({ live }: { live: LiveDraft }) {
  const { empty, wrong } = live.verdict;
  const fields = [...empty, ...wrong].map(({ field }) => sectionOf(field));
  return (
    <nav aria-label="Sections" className="draft-index">
      <ol>
        {SECTIONS.map(({ key, title }) => {
          const open = fields.filter((section) => section === key).length;
          return (
            <li key={key}>
              <FieldLink id={sectionId(key)}>{title}</FieldLink>
              {open > 0 ? (
                <span className="draft-index-count">
                  {' '}
                  {open}
                  <span className="heard-only"> open</span>
                </span>
              ) : null}
            </li>
          );
        })}
      </ol>
    </nav>
  );
});
