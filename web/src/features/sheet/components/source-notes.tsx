import type { Source } from '@merestone/engine';
import { MarginNote } from '../../../shared/ui/margin-note';
import { Citation } from '../../../shared/ui/on-sheet/citation';
import { READ_WORDS } from '../../../shared/format/plain-words';
import { sentence } from '../../../shared/format/sentence';

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
