/** A name that stays a name inside a sentence: `Reynolds number`, `Sherwood number`. */
const NAMED = /^\p{Lu}[\p{L}’-]+ (number|factor)\b/u;

/** A phrase as it goes on inside a sentence; names, abbreviations and symbols keep their capitals. */
export function lowerFirst(text: string): string {
  if (NAMED.test(text)) return text;
  const word = /^[\p{L}'’-]+/u.exec(text)?.[0] ?? '';
  return /^\p{Lu}[\p{Ll}'’-]+$/u.test(word) || word === 'A'
    ? text.charAt(0).toLowerCase() + text.slice(1)
    : text;
}
