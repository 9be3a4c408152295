/** A note as a sentence: a capital in front (a symbol keeps its own letter), one full stop behind. */
export function sentence(text: string | undefined): string {
  const trimmed = (text ?? '').trim();
  if (trimmed === '') return '';
  const start = /^\p{Ll}{2,}(?![\p{L}_\d(/])/u.test(trimmed)
    ? trimmed.charAt(0).toUpperCase()
    : trimmed.charAt(0);
  return `${start}${trimmed.slice(1)}${/[.?!]$/.test(trimmed) ? '' : '.'}`;
}
