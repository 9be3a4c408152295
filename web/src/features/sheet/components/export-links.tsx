import type { Sheet } from '../../../shared/api/types';

const FORMATS = [
  { format: 'bibtex', name: 'BibTeX' },
  { format: 'ris', name: 'RIS' },
  { format: 'csl-json', name: 'CSL-JSON' },
] as const;

/** The revision as a file, and its sources in the formats that reference managers read. */
export function ExportLinks({ sheet: { slug, revision } }: { sheet: Pick<Sheet, 'slug' | 'revision'> }) {
  const at = `/api/correlations/${encodeURIComponent(slug)}/revisions/${revision}`;
  return (
    <details className="export-links">
      <summary>Export</summary>
      <ul>
        <li>
          <a href={`${at}/sheet.json`} download>
            The sheet as one file (JSON)
          </a>
        </li>
        {FORMATS.map(({ format, name }) => (
          <li key={format}>
            <a href={`${at}/citations?format=${format}`} download>
              Its sources as {name}
            </a>
          </li>
        ))}
      </ul>
    </details>
  );
}
