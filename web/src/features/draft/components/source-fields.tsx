import { formatCitation, readDoi } from '@merestone/engine';
import { memo } from 'react';
import { READ, SOURCE_TYPES } from '../model/choices';
import { citationOf } from '../model/csl-form';
import type { SourceRow } from '../model/draft-form';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';

interface SourceFieldsProps {
  row: SourceRow;
  at: number;
  path: string;
  /** What says that the work stands in the list before. */
  twin: string | undefined;
}

/** One source: the work as a reference list has it, and what of it serves this sheet. */
export const SourceFields = memo(function SourceFields({ row, at, path, twin }: SourceFieldsProps) {
  const { change, problemAt } = useDraftTools();
  const edit = (patch: Partial<SourceRow>) => change({ do: 'edit-row', list: 'sources', at, patch });
  const isArticle = row.type === 'article-journal' || row.type === 'paper-conference';
  const citation = problemAt(`${path}.csl`);
  const doiFault =
    row.doi.trim() !== '' && readDoi(row.doi) === undefined
      ? 'A DOI begins with 10. and has a slash, as in 10.1021/ie50293a010.'
      : undefined;
  const shown = formatCitation(citationOf(row)).text;
  return (
    <>
      {shown.length > 2 ? <p className="draft-cited">{shown}</p> : null}
      {twin ? <p className="draft-twin">{twin}</p> : null}
      <div className="draft-grid">
        <LongTextField
          path={`${path}.csl.authors`}
          label="Authors"
          value={row.authors}
          onChange={(authors) => edit({ authors })}
          hint="One a line: Gilliland, E. R. A body in braces: {Institute of …}."
        />
        <div>
          <PickField
            path={`${path}.csl.type`}
            label="Kind of work"
            value={row.type}
            choices={SOURCE_TYPES}
            onChange={(type) => edit({ type })}
          />
          <TextField
            path={`${path}.csl.issued`}
            label="Year"
            value={row.issued}
            onChange={(issued) => edit({ issued })}
            hint="1934, or 1934-05"
            number
          />
        </div>
      </div>
      <TextField
        path={`${path}.csl.title`}
        label="Title"
        value={row.title}
        onChange={(title) => edit({ title })}
      />
      <TextField
        path={`${path}.csl.container`}
        label={isArticle ? 'Journal or proceedings' : 'In (journal or book)'}
        value={row.container}
        onChange={(container) => edit({ container })}
      />
      <div className="draft-grid draft-grid-narrow">
        <TextField
          path={`${path}.csl.volume`}
          label="Volume"
          value={row.volume}
          onChange={(volume) => edit({ volume })}
        />
        <TextField
          path={`${path}.csl.issue`}
          label="Issue"
          value={row.issue}
          onChange={(issue) => edit({ issue })}
        />
        <TextField
          path={`${path}.csl.page`}
          label="Pages"
          value={row.page}
          onChange={(page) => edit({ page })}
        />
        <TextField
          path={`${path}.csl.edition`}
          label="Edition"
          value={row.edition}
          onChange={(edition) => edit({ edition })}
        />
      </div>
      <div className="draft-grid">
        <TextField
          path={`${path}.csl.publisher`}
          label="Publisher"
          value={row.publisher}
          onChange={(publisher) => edit({ publisher })}
        />
        <TextField
          path={`${path}.csl.DOI`}
          label="DOI"
          value={row.doi}
          onChange={(doi) => edit({ doi })}
          error={doiFault}
          code
        />
      </div>
      {citation ? (
        <p className="field-error" id={draftFieldId(`${path}.csl`)} tabIndex={-1}>
          {citation.message}
        </p>
      ) : null}
      <div className="draft-grid">
        <TextField
          path={`${path}.place`}
          label="Place in the source"
          value={row.place}
          onChange={(place) => edit({ place })}
          hint="Eq. 12, p. 519; Table 3."
        />
        <PickField
          path={`${path}.read`}
          label="Read or from memory"
          value={row.read}
          choices={READ}
          onChange={(read) => edit({ read })}
        />
      </div>
      <TextField
        path={`${path}.gives`}
        label="What it gave (optional)"
        value={row.gives}
        onChange={(gives) => edit({ gives })}
        hint="The expression, the range, the constants."
      />
    </>
  );
});
