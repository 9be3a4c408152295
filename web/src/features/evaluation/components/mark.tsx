/** The words that travel with every number from outside a bound. */
export function Mark({ words }: { words: string | null }) {
  return words === null ? null : <strong className="mark">{words}</strong>;
}
