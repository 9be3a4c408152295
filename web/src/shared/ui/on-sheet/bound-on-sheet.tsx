import type { Bound, CorrelationDefinition, Finding } from '@merestone/engine';
import { boundWords } from '../../format/plain-words';
import { symbolOnSheet } from '../../format/symbol-on-sheet';
import { BoundStrip } from '../bound-strip/bound-strip';
import { InlineEquation } from '../equation';

interface BoundOnSheetProps {
  bound: Bound;
  definition: CorrelationDefinition;
  finding?: Finding | undefined;
}

/** A bound of a sheet: its symbol as the sheet sets it, the strip, its nature and basis in words. */
export function BoundOnSheet({ bound, definition, finding }: BoundOnSheetProps) {
  const { tex, name, unit } = symbolOnSheet(definition, bound.on);
  return (
    <BoundStrip
      symbol={<InlineEquation tex={tex} />}
      label={`${name}, ${bound.on}`}
      stretches={bound.stretches}
      unit={unit}
      reading={finding ?? null}
      note={bound.stretches.length === 0 && finding ? null : boundWords(bound)}
    />
  );
}
