import { NATURE_WORDS } from '../../../shared/format/plain-words';
import { rangeWords } from '../../../shared/ui/bound-strip/strip-words';
import { useElementWidth } from '../../../shared/ui/bound-strip/use-element-width';
import { InlineEquation } from '../../../shared/ui/equation';
import type { BoundChange } from '../model/bound-changes';
import { BoundChangeStrip } from './bound-change-strip';

/** Where a symbol's range was and is, one drawn over the other, and the same in words. */
export function BoundChangeView({ change }: { change: BoundChange }) {
  const { on, name, tex, unit, before, after } = change;
  const [box, width] = useElementWidth<HTMLDivElement>(400);
  const [was, is] = [before?.stretches ?? [], after?.stretches ?? []];
  return (
    <li className="field-change bound-change">
      <h3>
        {name}, <InlineEquation tex={tex} /> <span className="change-word">{wordOf(change)}</span>
      </h3>
      <div ref={box}>
        <BoundChangeStrip label={`${name}, ${on}`} before={was} after={is} unit={unit} width={width} />
      </div>
      <p>
        <span className="bound-change-key">
          <Key kind="before" /> Before: {before ? rangeWords(was, unit) : 'no bound on record'}.
        </span>{' '}
        <span className="bound-change-key">
          <Key kind="after" /> After: <strong>{after ? rangeWords(is, unit) : 'no bound on record'}</strong>
          {naturesOf(after) ? ` (${naturesOf(after)})` : ''}.
        </span>
      </p>
    </li>
  );
}

function wordOf({ before, after }: BoundChange): string {
  if (!before) return 'added';
  return after ? 'changed' : 'removed';
}

function naturesOf(bound: BoundChange['after']): string {
  const ends = bound?.stretches.flatMap(({ lo, hi }) => [lo, hi]) ?? [];
  return [...new Set(ends.flatMap((end) => (end ? [NATURE_WORDS[end.nature]] : [])))].join(', ');
}

/** How a range is drawn, small beside its words. */
function Key({ kind }: { kind: 'before' | 'after' }) {
  return (
    <svg className="strip" width={22} height={10} viewBox="0 0 22 10" aria-hidden="true">
      {kind === 'before' ? (
        <rect className="strip-before" x={1} y={1} width={20} height={8} />
      ) : (
        <line className="strip-permitted" x1={0} x2={22} y1={5} y2={5} />
      )}
    </svg>
  );
}
