import type { StripAxis, Stretch } from '@merestone/engine';
import type { ReactNode } from 'react';
import { StripView } from './strip-view';
import { rangeWords, stateWords, type Reading } from './strip-words';
import { useElementWidth } from './use-element-width';
import './bound-strip.css';

interface BoundStripProps {
  /** The symbol as it is set at the left. */
  symbol: ReactNode;
  /** The same in plain words, for the text alternative: `Reynolds number, Re`. */
  label: string;
  stretches: readonly Stretch[];
  unit?: string;
  /** A finding of the engine, or nothing while there is no value. */
  reading?: Reading | null;
  /** A line under the words: basis and place of the bound. */
  note?: ReactNode;
}

/** A bound on a sheet: symbol, strip, and what it says in words. */
export function BoundStrip({ symbol, label, stretches, unit = '1', reading = null, note }: BoundStripProps) {
  const [box, width] = useElementWidth<HTMLDivElement>(400);
  const words = reading ? stateWords(reading) : stretches.length === 0 ? rangeWords(stretches, unit) : null;
  return (
    <div className="bound-strip">
      <div className="bound-strip-symbol">{symbol}</div>
      <div className="bound-strip-picture" ref={box}>
        <StripView size="large" {...{ stretches, label, unit, reading, width }} />
      </div>
      <div className="bound-strip-words">
        {words ? <span className={`bound-state bound-state-${reading?.kind ?? 'none'}`}>{words}</span> : null}
        {note ? <span className="bound-strip-note">{note}</span> : null}
      </div>
    </div>
  );
}

interface SmallBoundStripProps {
  label: string;
  stretches: readonly Stretch[];
  unit?: string;
  reading?: Reading | null;
  axis?: StripAxis;
}

/** A bound in a row of a table; the figures are in its text alternative and on hover. */
export function SmallBoundStrip({
  label,
  stretches,
  unit = '1',
  reading = null,
  axis,
}: SmallBoundStripProps) {
  const [box, width] = useElementWidth<HTMLDivElement>(210);
  return (
    <div className="bound-strip-small" ref={box} title={`${label}: ${rangeWords(stretches, unit)}`}>
      <StripView size="small" {...{ stretches, label, unit, reading, width }} {...(axis ? { axis } : {})} />
    </div>
  );
}
