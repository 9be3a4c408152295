import type { ReactNode } from 'react';
import type { Iteration } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { shortHash } from '../../../shared/ui/running-head';

interface IterationListProps {
  iterations: readonly Iteration[];
  /** Sets what an iteration changed against the one before. */
  differences: (iteration: Iteration) => ReactNode;
}

/** The iterations of the revision, the latest first, each with what it changed. */
export function IterationList({ iterations, differences }: IterationListProps) {
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
          {iteration.number === 1 ? (
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
