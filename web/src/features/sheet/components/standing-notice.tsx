import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Sheet, Standing } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { paths } from '../../../shared/paths';
import { CLASS_WORDS, heldFrom, isOverdue } from '../model/life-words';

const MEANT: Readonly<Record<Exclude<Standing, 'approved'>, string>> = {
  draft: 'A draft: nobody has checked it yet. It may not be used for design.',
  'in review': 'In review: it may not be used for design before a technical authority has approved it.',
  suspended: 'Suspended: a problem with it is being looked into. It serves comparison only.',
  superseded: 'Superseded: a later revision has taken its place.',
  withdrawn: 'Withdrawn: it serves comparison only.',
  declined: 'Declined: the office does not take it into use.',
};
const STOPS = new Set<Standing>(['suspended', 'withdrawn', 'declined']);

/**
 * What must be known of a revision before it is used: why it is not in use, large where it is out of it, and what
 * takes its place; of an approved one that its day has not come, or that it is due to be looked at again.
 */
export function StandingNotice({ sheet }: { sheet: Sheet }) {
  if (sheet.standing === 'approved') return <ApprovedNotice sheet={sheet} />;
  const { standing, standingNote } = sheet;
  const last = sheet.history.filter((event) => event.standing === standing).at(-1);
  const reason = sheet.withdrawal?.reason ?? sheet.suspension?.reason ?? last?.note ?? null;
  return (
    <Notice stop={STOPS.has(standing)} words={MEANT[standing]}>
      {standingNote ? <p>{standingNote}</p> : null}
      {reason && reason !== standingNote ? <p>{reason}</p> : null}
      {sheet.withdrawal ? <p>What is wrong: {CLASS_WORDS[sheet.withdrawal.class]}.</p> : null}
      <Successor sheet={sheet} />
      {last ? (
        <p className="standing-notice-who">
          {last.by.name}, {formatDay(last.at)}
        </p>
      ) : null}
    </Notice>
  );
}

function Notice({ stop = false, words, children }: { stop?: boolean; words: string; children?: ReactNode }) {
  return (
    <div
      className={stop ? 'standing-notice standing-notice-stop' : 'standing-notice'}
      role="note"
      aria-label="Standing"
    >
      <p className="standing-notice-words">{words}</p>
      {children}
    </div>
  );
}

function ApprovedNotice({ sheet }: { sheet: Sheet }) {
  const from = heldFrom(sheet);
  if (from !== null)
    return (
      <Notice words={`Approved from ${formatDay(from)}: until then it is not in use.`}>
        <p>
          <Link to={paths.sheet(sheet.slug)}>The revision in use now</Link>
        </p>
      </Notice>
    );
  if (!isOverdue(sheet, new Date())) return null;
  return (
    <Notice words={`Due to be looked at again since ${formatDay(sheet.reviewDue ?? '')}.`}>
      <p>Its approval stands; whether it still should is for a technical authority to say.</p>
    </Notice>
  );
}

/** What to turn to instead: the successor on record, else a later revision. */
function Successor({ sheet }: { sheet: Sheet }) {
  const { successor, slug, revision, revisions } = sheet;
  if (successor)
    return (
      <p className="standing-notice-successor">
        Use instead:{' '}
        <Link to={paths.revision(successor.slug, successor.revision)}>
          {successor.slug === slug ? '' : `${successor.title}, `}rev {successor.revision}
        </Link>
      </p>
    );
  const newer = revisions.filter(({ number }) => number > revision).at(-1);
  if (!newer) return null;
  return (
    <p>
      <Link to={paths.revision(slug, newer.number)}>
        Revision {newer.number} ({newer.standing})
      </Link>
    </p>
  );
}
