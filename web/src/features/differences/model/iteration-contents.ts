import type { CorrelationDefinition, Difference } from '@merestone/engine';
import { undoDifferences } from './undo-differences';

/** What an iteration changed; null where it cannot be told any more. */
export interface IterationContent {
  before: CorrelationDefinition | null;
  after: CorrelationDefinition | null;
}

/** The contents of every iteration, from the present one back through what each changed. */
export function iterationContents(
  present: CorrelationDefinition,
  iterations: readonly { number: number; differences: readonly Difference[] }[],
): ReadonlyMap<number, IterationContent> {
  const contents = new Map<number, IterationContent>();
  let after: CorrelationDefinition | null = present;
  for (const { number, differences } of [...iterations].reverse()) {
    const before: CorrelationDefinition | null = after && undoDifferences(after, differences);
    contents.set(number, { before, after });
    after = before;
  }
  return contents;
}
