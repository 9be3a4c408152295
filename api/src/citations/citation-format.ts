export const CITATION_FORMATS = ['bibtex', 'ris', 'csl-json'] as const;
export type CitationFormat = (typeof CITATION_FORMATS)[number];

/** Tells the format from how the text begins; undefined where it is none of them. */
export function detectFormat(text: string): CitationFormat | undefined {
  if (/^\s*[[{]/.test(text)) return 'csl-json';
  if (/^\s*TY {1,2}-/.test(text)) return 'ris';
  if (/@[A-Za-z]{1,40}\s*[{(]/.test(text)) return 'bibtex';
  return undefined;
}
