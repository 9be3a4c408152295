import { symbolTex, type Finding } from '@merestone/engine';
import { StripView } from '../../../shared/ui/bound-strip/strip-view';
import { stateWords } from '../../../shared/ui/bound-strip/strip-words';
import { useElementWidth } from '../../../shared/ui/bound-strip/use-element-width';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import { boundsOfDraft, type DrawnBound } from '../model/bounds-of-draft';
import type { DraftSymbol } from '../model/draft-symbols';

interface BoundsNoteProps {
  live: LiveDraft;
  /** Of the numbers that are tried out. */
  findings: readonly Finding[];
}

/** The bounds of the draft as strips, with the value that is tried out on them. */
export function BoundsNote({ live, findings }: BoundsNoteProps) {
  const bounds = boundsOfDraft(live.form);
  if (bounds.length === 0) return null;
  return (
    <MarginNote title="Where it holds">
      <ul className="draft-strips">
        {bounds.map((bound, i) => (
          <li key={`${bound.on}${i}`}>
            <DraftStrip
              bound={bound}
              symbol={live.symbols.find(({ symbol }) => symbol === bound.on)}
              finding={findings.find(({ symbol }) => symbol === bound.on) ?? null}
            />
          </li>
        ))}
      </ul>
    </MarginNote>
  );
}

interface DraftStripProps {
  bound: DrawnBound;
  symbol: DraftSymbol | undefined;
  finding: Finding | null;
}

function DraftStrip({ bound: { on, stretches }, symbol, finding }: DraftStripProps) {
  const [box, width] = useElementWidth<HTMLDivElement>(240);
  return (
    <>
      <p className="draft-strip-head">
        <InlineEquation tex={symbolTex(on, symbol?.tex)} />{' '}
        <span className={`bound-state bound-state-${finding?.kind ?? 'none'}`}>
          {stretches.length === 0 ? 'no bound stated' : finding ? stateWords(finding) : null}
        </span>
      </p>
      {stretches.length === 0 ? null : (
        <div ref={box}>
          <StripView
            size="large"
            stretches={stretches}
            label={symbol?.name ? `${symbol.name}, ${on}` : on}
            unit={symbol?.unit || '1'}
            reading={finding}
            width={width}
          />
        </div>
      )}
    </>
  );
}
