/** What one reading takes. The time it may need is bounded by these alone. */
export const READING_LIMITS = {
  bytes: 200_000,
  entries: 50,
  fieldsPerEntry: 60,
  /** Characters of one field's raw text. */
  fieldText: 4000,
  /** Characters of a defined `@string`. */
  stringText: 300,
  strings: 100,
  /** Pieces that `#` may join in one field. */
  joined: 12,
  braceDepth: 12,
  authors: 100,
} as const;
