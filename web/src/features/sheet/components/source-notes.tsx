import type { Source } from '@merestone/engine';
import { MarginNote } from '../../../shared/ui/margin-note';
import { formatCitation } from '../model/format-citation';
import { READ_WORDS } from '../model/plain-words';
import { sentence } from '../model/sentence';

/** Each source with the place in it, what it gave, and whether anybody has read it for this sheet. */
export function SourceNotes({ sources }: { sources: readonly Source[] }) {
  return sources.map((source, i) => (
    <MarginNote
      key={`${source.csl.title ?? ''}${source.place}`}
      title={sources.length > 1 ? `Source ${i + 1}` : 'Source'}
    >
      <p>
        <Citation source={source} /> {sentence(source.gives)} {READ_WORDS[source.read]}
      </p>
    </MarginNote>
  ));
}

/** A citation as a reference list has it, the place in the source behind it. */
export function Citation({ source }: { source: Source }) {
  const { before, work, after, doi } = formatCitation(source.csl);
  return (
    <>
      {before} <i>{work}</i>
      {after.startsWith(',') || after === '.' ? after : ` ${after}`} {source.place.replace(/\.$/, '')}.
      {doi ? (
        <>
          {' '}
          <a href={`https://doi.org/${encodeURI(doi)}`} rel="noreferrer" target="_blank">
            doi:{doi}
          </a>
        </>
      ) : null}
    </>
  );
}
