/** A phrase as it goes on inside a sentence; abbreviations and symbols keep their capitals. */
export function lowerFirst(text: string): string {
  const word = /^[\p{L}'’-]+/u.exec(text)?.[0] ?? '';
  return /^\p{Lu}\p{Ll}+$/u.test(word) || word === 'A' ? text.charAt(0).toLowerCase() + text.slice(1) : text;
}
