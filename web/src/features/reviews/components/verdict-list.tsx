import type { Review, Verdict } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { VERDICT_WORDS, voidWords } from '../model/review-words';

/** The verdicts given so far; those that no longer count are said to be void, and why. */
export function VerdictList({ review }: { review: Review }) {
  const { verdicts } = review;
  return (
    <section aria-labelledby="verdicts">
      <h2 id="verdicts">Verdicts</h2>
      {verdicts.length === 0 ? (
        <p className="field-note">Nobody has given a verdict yet.</p>
      ) : (
        <ol className="verdicts">
          {verdicts.map((verdict) => (
            <VerdictLine
              key={`${verdict.reviewer.id}${verdict.at}`}
              verdict={verdict}
              why={voidWords(verdict, review)}
            />
          ))}
        </ol>
      )}
    </section>
  );
}

function VerdictLine({ verdict, why }: { verdict: Verdict; why: string | null }) {
  const { reviewer, at, iteration, note } = verdict;
  const words = (
    <>
      <strong>{reviewer.name}</strong> {VERDICT_WORDS[verdict.verdict]}
    </>
  );
  return (
    <li>
      <p>
        {why ? <s>{words}</s> : words}
        <span className="verdict-when">
          {formatDay(at)}, iteration {iteration}
        </span>
      </p>
      {why ? <p className="verdict-void">{why}</p> : null}
      {note ? <p className="comment-text">{note}</p> : null}
    </li>
  );
}
