/** The row of the page that a path belongs to: the longest row path that is the path or leads to it; null: none. */
export function rowOf(field: string, rows: readonly string[]): string | null {
  const leading = rows.filter(
    (row) => field === row || field.startsWith(`${row}.`) || field.startsWith(`${row}[`),
  );
  return leading.sort((a, b) => b.length - a.length)[0] ?? null;
}

/** What belongs to each row; what belongs to none, or to the sheet as a whole, under the empty path. */
export function byRow<T extends { field: string }>(
  things: readonly T[],
  rows: readonly string[],
): ReadonlyMap<string, readonly T[]> {
  const sorted = new Map<string, T[]>();
  for (const thing of things) {
    const row = rowOf(thing.field, rows) ?? '';
    sorted.set(row, [...(sorted.get(row) ?? []), thing]);
  }
  return sorted;
}

/** Id of a row on the page, for links to it. */
export function rowId(path: string): string {
  return `field-${path.replace(/[^A-Za-z0-9]+/g, '-').replace(/-$/, '') || 'whole'}`;
}
