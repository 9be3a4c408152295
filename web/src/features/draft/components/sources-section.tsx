import { findDuplicates } from '@merestone/engine';
import { memo, useMemo } from 'react';
import { citationOf } from '../model/csl-form';
import type { SourceRow } from '../model/draft-form';
import { DraftSection } from './draft-section';
import { PasteReferences } from './paste-references';
import { RowList } from './row-list';
import { SourceFields } from './source-fields';

/** Where everything comes from: the citation, the place in it, and whether anybody has read it. */
export const SourcesSection = memo(function SourcesSection({ rows }: { rows: readonly SourceRow[] }) {
  const twins = useMemo(() => twinsOf(rows), [rows]);
  return (
    <DraftSection
      section="sources"
      about="A source without its place cannot be checked: name the equation, table or page."
    >
      <PasteReferences rows={rows} />
      <RowList
        list="sources"
        rows={rows}
        noun="source"
        first="csl.authors"
        titleOf={(row) => row.title}
        empty="A sheet has one source at least."
      >
        {(row, at, path) => <SourceFields row={row} at={at} path={path} twin={twins.get(at)} />}
      </RowList>
    </DraftSection>
  );
});

/** Of each source that repeats an earlier one: which, and by what it was found. */
function twinsOf(rows: readonly SourceRow[]): ReadonlyMap<number, string> {
  return new Map(
    findDuplicates(rows.map(citationOf)).map(({ first, second, by }) => [
      second,
      `Names the same work as source ${first + 1}: ${by === 'doi' ? 'the DOI is the same' : 'author, year and page are the same'}.`,
    ]),
  );
}
