/** `Gilliland and Sherwood`; `Bravo, Rocha and Fair`. */
export function authorWords(authors: readonly string[]): string {
  if (authors.length < 2) return authors[0] ?? 'no author named';
  return `${authors.slice(0, -1).join(', ')} and ${authors.at(-1) ?? ''}`;
}
