/** A note as a sentence: a capital in front, one full stop behind. */
export function sentence(text: string | undefined): string {
  const trimmed = (text ?? '').trim();
  if (trimmed === '') return '';
  return `${trimmed.charAt(0).toUpperCase()}${trimmed.slice(1)}${/[.?!]$/.test(trimmed) ? '' : '.'}`;
}
