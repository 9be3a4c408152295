import { formatCitation, type Source } from '@merestone/engine';
import { MarginNote } from '../../../shared/ui/margin-note';
import { READ_WORDS } from '../model/plain-words';
import { sentence } from '../model/sentence';

/** The first source with the place in it, what it gave, and whether anybody has read it; further ones folded under it. */
export function SourceNotes({ sources }: { sources: readonly Source[] }) {
  const [first, ...others] = sources;
  if (!first) return null;
  return (
    <MarginNote title="Source">
      <SourceText source={first} />
      {others.length > 0 ? (
        <details className="more-sources">
          <summary>{others.length === 1 ? 'One more source' : `${others.length} more sources`}</summary>
          {others.map((source) => (
            <SourceText key={`${source.csl.title ?? ''}${source.place}`} source={source} />
          ))}
        </details>
      ) : null}
    </MarginNote>
  );
}

function SourceText({ source }: { source: Source }) {
  return (
    <p>
      <Citation source={source} /> {sentence(source.gives)} {READ_WORDS[source.read]}
    </p>
  );
}

/** A citation as a reference list has it, the place in the source behind it. */
export function Citation({ source }: { source: Source }) {
  const { before, work, after, doi } = formatCitation(source.csl);
  return (
    <>
      {before} <i>{work}</i>
      {after}; {source.place.replace(/\.$/, '')}.
      {doi ? (
        <>
          {' '}
          <a href={doi.href} rel="noreferrer" target="_blank">
            doi:{doi.name}
          </a>
        </>
      ) : null}
    </>
  );
}
