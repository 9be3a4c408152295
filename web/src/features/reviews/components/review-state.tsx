import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { Review } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { useAct } from '../../../shared/hooks/use-act';
import { paths } from '../../../shared/paths';
import { MarginNote } from '../../../shared/ui/margin-note';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { rowId, rowOf } from '../model/field-rows';
import { openWords, progressWords } from '../model/review-words';
import type { FieldGroup } from './sheet-field';

interface ReviewStateProps {
  review: Review;
  groups: readonly FieldGroup[];
  onTake: () => Promise<unknown>;
}

/** How far the review has come, whose turn it is, and who looks at it. */
export function ReviewState({ review, groups, onTake }: ReviewStateProps) {
  const { standing, abilities, comments } = review;
  const { working, problem, run } = useAct();
  const open = comments.filter(({ resolved }) => resolved === null).length;
  return (
    <MarginRow notes={<ReviewNotes review={review} groups={groups} />}>
      <div className="review-state">
        <p className="review-progress">{progressWords(review)}</p>
        <p>
          {turnWords(review)} {openWords(open)}
        </p>
        {problem ? <ProblemNotice problem={problem} /> : null}
        <p className="review-state-acts">
          {abilities.take ? (
            <Button type="primary" loading={working} onClick={() => void run(onTake)}>
              Take this review
            </Button>
          ) : null}
          {abilities.verdict ? <a href="#your-verdict">Go to your verdict</a> : null}
          {abilities.approve || abilities.decline ? <a href="#decision">Go to the decision</a> : null}
          {abilities.edit && standing === 'in review' ? (
            <Link to={paths.revise(review.slug)}>Edit revision {review.revision}</Link>
          ) : null}
          <Link to={paths.revision(review.slug, review.revision)}>Read the sheet as a page</Link>
        </p>
      </div>
    </MarginRow>
  );
}

function turnWords({ standing, hands, originator, revision }: Review): string {
  if (standing !== 'in review') return `Revision ${revision} is ${standing}.`;
  return hands === 'originator'
    ? `It is with ${originator.name}, who puts it forward again when it is ready.`
    : 'It is with its reviewers.';
}

function ReviewNotes({ review, groups }: Pick<ReviewStateProps, 'review' | 'groups'>) {
  const { originator, assignments, iterations } = review;
  const last = iterations.at(-1);
  return (
    <>
      <MarginNote title="Originator">
        {originator.name}
        {last ? `; the present content is of ${formatDay(last.at)}` : ''}.
      </MarginNote>
      <MarginNote title="Reviewers">
        {assignments.length === 0 ? (
          'Nobody has been asked and nobody has taken it yet.'
        ) : (
          <ul className="plain-list">
            {assignments.map(({ reviewer, how, at }) => (
              <li key={reviewer.id}>
                {reviewer.name}, {how === 'named' ? 'asked' : 'took it'} {formatDay(at)}
              </li>
            ))}
          </ul>
        )}
      </MarginNote>
      <OpenComments review={review} groups={groups} />
    </>
  );
}

/** The fields with open comments, each a way to its row. */
function OpenComments({ review: { comments }, groups }: Pick<ReviewStateProps, 'review' | 'groups'>) {
  const fields = groups.flatMap((group) => group.fields);
  const rowPaths = fields.map(({ path }) => path);
  const open = comments.filter(({ resolved }) => resolved === null);
  const rows = [...new Set(open.map(({ field }) => rowOf(field, rowPaths) ?? ''))];
  if (rows.length === 0) return null;
  return (
    <MarginNote title="Open comments on">
      <ul className="plain-list">
        {rows.map((row) => (
          <li key={row}>
            <a href={`#${rowId(row)}`}>
              {fields.find(({ path }) => path === row)?.label ?? 'the sheet as a whole'}
            </a>
          </li>
        ))}
      </ul>
    </MarginNote>
  );
}
