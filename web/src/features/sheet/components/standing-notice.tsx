import { Link } from 'react-router-dom';
import type { Sheet, Standing } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { paths } from '../../../shared/paths';

const MEANT: Readonly<Record<Exclude<Standing, 'approved'>, string>> = {
  draft: 'A draft: nobody has checked it yet. It may not be used for design.',
  'in review': 'In review: it may not be used for design before a technical authority has approved it.',
  suspended: 'Suspended: a problem with it is being looked into. It serves comparison only.',
  superseded: 'Superseded: a later revision has taken its place.',
  withdrawn: 'Withdrawn: it serves comparison only.',
  declined: 'Declined: the office does not take it into use.',
};
const STOPS = new Set<Standing>(['suspended', 'withdrawn', 'declined']);

/** What a standing other than approved means, and why it is so; large where the sheet is out of use. */
export function StandingNotice({ sheet }: { sheet: Sheet }) {
  const { standing } = sheet;
  if (standing === 'approved') return null;
  const last = sheet.history.filter((event) => event.standing === standing).at(-1);
  const newer = sheet.revisions.filter(({ number }) => number > sheet.revision).at(-1);
  return (
    <div
      className={STOPS.has(standing) ? 'standing-notice standing-notice-stop' : 'standing-notice'}
      role="note"
      aria-label="Standing"
    >
      <p className="standing-notice-words">{MEANT[standing]}</p>
      {sheet.standingNote ? <p>{sheet.standingNote}</p> : null}
      {last?.note && last.note !== sheet.standingNote ? <p>{last.note}</p> : null}
      {last ? (
        <p className="standing-notice-who">
          {last.by.name}, {formatDay(last.at)}
        </p>
      ) : null}
      {newer ? (
        <p>
          <Link to={paths.revision(sheet.slug, newer.number)}>
            Revision {newer.number} ({newer.standing})
          </Link>
        </p>
      ) : null}
    </div>
  );
}
