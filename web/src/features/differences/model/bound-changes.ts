import type { Bound, CorrelationDefinition, Difference } from '@merestone/engine';
import { symbolOnSheet, type SymbolOnSheet } from '../../../shared/format/symbol-on-sheet';

/** A symbol whose range differs: null where it had, or has, no bound. */
export interface BoundChange extends SymbolOnSheet {
  on: string;
  before: Bound | null;
  after: Bound | null;
}

export interface SplitBounds {
  bounds: BoundChange[];
  /** What the picture does not show: nature, basis, place, notes. */
  rest: Difference[];
}

const BOUND = /^bounds\[([^\]]+)\]/;
/** Whole bounds, and everything of a stretch that its picture shows. */
const DRAWN = /^(\.stretches(\[\d+\](\.(lo|hi)(\.(value|closed))?)?)?)?$/;

/** Parts the differences of bounds into those drawn as strips and the rest. */
export function boundChanges(
  differences: readonly Difference[],
  before: CorrelationDefinition | null,
  after: CorrelationDefinition,
): SplitBounds {
  const drawn = new Set<string>();
  const rest: Difference[] = [];
  for (const difference of differences) {
    const found = BOUND.exec(difference.path);
    const on = found?.[1];
    if (before && found && on !== undefined && DRAWN.test(difference.path.slice(found[0].length)))
      drawn.add(on);
    else rest.push(difference);
  }
  const bounds = [...drawn].map((on) => ({
    on,
    before: before?.bounds.find((bound) => bound.on === on) ?? null,
    after: after.bounds.find((bound) => bound.on === on) ?? null,
    ...symbolOnSheet(knows(after, on) || !before ? after : before, on),
  }));
  return { bounds, rest };
}

function knows({ quantities, groups, intermediates = [] }: CorrelationDefinition, on: string): boolean {
  return [...quantities, ...groups, ...intermediates].some(({ symbol }) => symbol === on);
}
