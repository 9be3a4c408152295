/** Names in a sentence: `Onda, Takeuchi and Okumoto`. */
export function inWords(names: readonly string[]): string {
  const last = names.at(-1) ?? '';
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`;
}
