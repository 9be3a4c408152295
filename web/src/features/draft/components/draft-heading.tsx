import type { Draft } from '../hooks/use-draft';
import { StandingWord } from '../../../shared/ui/standing-word';

/** What is being written, and which revision of it. */
export function DraftHeading({ draft: { opening, autosave, form } }: { draft: Draft }) {
  if (opening.kind === 'new') return 'Submit a correlation';
  return (
    <>
      {form.head.title || 'Without a title'}
      <span className="draft-heading-line">
        revision {autosave.base?.revision ?? `${opening.nextRevision}, not opened yet`}
        {autosave.standing ? (
          <>
            {' '}
            <StandingWord standing={autosave.standing} />
          </>
        ) : null}
      </span>
    </>
  );
}
