export interface ChosenRevisions {
  from: number;
  to: number;
}

/**
 * The two revisions to compare: what the address says where there are such revisions, else the latest against the one
 * before it. Null where there are not two.
 */
export function chosenRevisions(search: URLSearchParams, numbers: readonly number[]): ChosenRevisions | null {
  const sorted = [...numbers].sort((a, b) => a - b);
  if (sorted.length < 2) return null;
  const asked = (name: string) => sorted.find((number) => String(number) === search.get(name));
  const to = asked('to') ?? sorted.at(-1) ?? 0;
  const from = asked('from') ?? sorted.filter((number) => number < to).at(-1) ?? sorted[0] ?? 0;
  return { from, to };
}
