const MOST_WORDS = 16;

/**
 * What somebody typed, as a full-text query in which nothing is an operator: each word is quoted and must occur, and
 * may be the beginning of a longer one. Null when there is no word in it.
 */
export function searchQuery(text: string): string | null {
  const words = text.match(/[\p{L}\p{N}]+(?:[^\s\p{L}\p{N}]+[\p{L}\p{N}]+)*/gu) ?? [];
  if (words.length === 0) return null;
  return words
    .slice(0, MOST_WORDS)
    .map((word) => `"${word.replaceAll('"', '""')}"*`)
    .join(' ');
}
