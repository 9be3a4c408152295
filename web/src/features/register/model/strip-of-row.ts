import type { ListedBound, ListedCorrelation } from '../../../shared/api/types';

/** One axis for every row, so that ranges can be compared down the page. */
export const REYNOLDS_AXIS = { from: 1e-3, to: 1e7 };

/** What a row shows of where its correlation holds: its Reynolds number, or which other symbols bound it. */
export type RowBound = { kind: 'strip'; bound: ListedBound } | { kind: 'others'; symbols: string[] };

export function boundOfRow({ bounds }: Pick<ListedCorrelation, 'bounds'>): RowBound {
  const reynolds = bounds.filter(({ symbol }) => /^Re(_|$)/.test(symbol));
  const stated = reynolds.find(({ stretches }) => stretches.length > 0) ?? reynolds[0];
  if (stated) return { kind: 'strip', bound: stated };
  return {
    kind: 'others',
    symbols: bounds.filter(({ stretches }) => stretches.length > 0).map(({ symbol }) => symbol),
  };
}
