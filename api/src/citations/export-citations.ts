import type { CslItem } from '@merestone/engine';
import { bibtexEntry } from './bibtex/write-bibtex.js';
import { citationLabels } from './citation-label.js';
import type { CitationFormat } from './citation-format.js';
import { cleanCsl } from './clean-csl.js';
import { risRecord } from './ris/write-ris.js';

/** Media type and file ending of each format. */
export const CITATION_FILES: Readonly<Record<CitationFormat, { mediaType: string; ending: string }>> = {
  bibtex: { mediaType: 'application/x-bibtex; charset=utf-8', ending: 'bib' },
  ris: { mediaType: 'application/x-research-info-systems; charset=utf-8', ending: 'ris' },
  'csl-json': { mediaType: 'application/vnd.citationstyles.csl+json; charset=utf-8', ending: 'json' },
};

/** Citations as the text of a file. Items that name no work are left out. */
export function exportCitations(items: readonly CslItem[], format: CitationFormat): string {
  const clean = items.map((item) => cleanCsl(item, () => undefined)).filter((item) => item !== undefined);
  const labels = citationLabels(clean);
  switch (format) {
    case 'bibtex':
      return clean.map((item, i) => bibtexEntry(item, labels[i] ?? '')).join('\n');
    case 'ris':
      return clean.map((item, i) => risRecord(item, labels[i] ?? '')).join('');
    case 'csl-json':
      return `${JSON.stringify(
        clean.map((item, i) => ({ id: labels[i], ...item })),
        null,
        2,
      )}\n`;
  }
}
