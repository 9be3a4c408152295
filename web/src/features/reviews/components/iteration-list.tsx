import type { ReactNode } from 'react';
import type { Iteration, Review } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { shortHash } from '../../../shared/ui/running-head';

interface IterationListProps {
  iterations: readonly Iteration[];
  /** What was said each time it was put forward. */
  rounds: Review['rounds'];
  /** Sets what an iteration changed against the one before. */
  differences: (iteration: Iteration) => ReactNode;
}

/** The iterations of the revision, the latest first, each with what it changed. */
export function IterationList({ iterations, rounds, differences }: IterationListProps) {
  if (iterations.length < 2) return null;
  const latest = iterations.at(-1);
  return (
    <section aria-labelledby="iterations">
      <h2 id="iterations">Iterations</h2>
      {[...iterations].reverse().map((iteration) => (
        <details key={iteration.number} className="iteration" open={iteration === latest}>
          <summary>
            Iteration {iteration.number}, {formatDay(iteration.at)}
            <span className="iteration-hash">{shortHash(iteration.hash)}</span>
          </summary>
          <RoundNotes rounds={rounds.filter((round) => round.iteration === iteration.number)} />
          {iteration === iterations[0] ? (
            <p className="field-note">The content as it was first put forward.</p>
          ) : iteration.differences.length === 0 ? (
            <p className="field-note">The content is that of the iteration before.</p>
          ) : (
            differences(iteration)
          )}
        </details>
      ))}
    </section>
  );
}

function RoundNotes({ rounds }: { rounds: Review['rounds'] }) {
  return rounds.map(({ round, by, at, note }) => (
    <p key={round} className="round-note">
      <span className="verdict-when">
        {by.name} put it forward, {formatDay(at)}
      </span>
      {note ? <span className="comment-text">{note}</span> : null}
    </p>
  ));
}
