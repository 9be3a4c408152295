import type { Finding, Stretch } from '@merestone/engine';
import { NUMBER_SPACE, formatBriefly, formatExactly, formatNumber } from '../../format/format-number';
import { formatUnit } from '../../format/format-unit';

/** A value as it stands against its bound; a finding of the engine is one. */
export type Reading = Pick<Finding, 'kind' | 'value' | 'lo' | 'hi' | 'ratio'>;

/** What the strip says in words beside it, so that nothing is told by colour alone. */
export function stateWords(reading: Reading): string {
  switch (reading.kind) {
    case 'within':
      return 'in bounds';
    case 'near':
      return 'near bound';
    case 'between':
      return 'between its stretches';
    case 'unchecked':
      return reading.value === null ? 'not held: no value' : 'no bound to hold it';
    case 'outside':
      return pastWords(reading);
    case 'past-reach':
      return `${pastWords(reading)}, past reach`;
  }
}

function pastWords({ value, lo, hi, ratio }: Reading): string {
  const below = value !== null && lo !== null && value <= lo;
  const above = value !== null && hi !== null && value >= hi;
  const side = below && !above ? 'lower' : 'upper';
  if (ratio === null || !Number.isFinite(ratio) || ratio <= 0)
    return below ? 'below the lower bound' : 'above the upper bound';
  if (ratio === 1) return `on the ${side} bound, which is left out`;
  // As the engine's findings say it: the value as a multiple of the bound it has passed.
  const multiple = side === 'upper' ? ratio : 1 / ratio;
  return `${formatNumber(multiple, Math.abs(multiple - 1) < 0.1 ? 4 : 3)} × the ${side} bound`;
}

/** `2 000 to 35 000`; what is left out and what is not stated is said. */
export function rangeWords(stretches: readonly Stretch[], unit = '1'): string {
  if (stretches.length === 0) return 'no bound stated';
  return stretches.map((stretch) => stretchWords(stretch, unit)).join(', and ');
}

function stretchWords({ lo, hi }: Stretch, unit: string): string {
  const low = lo ? `${lo.closed === false ? 'above ' : ''}${withUnit(lo.value, unit)}` : null;
  const high = hi ? `${hi.closed === false ? 'below ' : ''}${withUnit(hi.value, unit)}` : null;
  if (low !== null && high !== null) return `${low} to ${high}`;
  if (high !== null) return `${hi?.closed === false ? '' : 'up to '}${high}, no lower bound stated`;
  if (low !== null) return `${lo?.closed === false ? '' : 'from '}${low}, no upper bound stated`;
  return 'no bound stated';
}

/** The text alternative of the picture. */
export function stripText(
  label: string,
  stretches: readonly Stretch[],
  unit: string,
  reading: Reading | null,
): string {
  const range = `${label}: ${rangeWords(stretches, unit)}.`;
  if (!reading) return range;
  const now = reading.value === null ? '' : `Now ${withUnit(reading.value, unit, 4)}, `;
  const words = stateWords(reading);
  return `${range} ${now}${now ? words : words.charAt(0).toUpperCase() + words.slice(1)}.`;
}

/** A figure with its unit in one line; exactly as on record unless told how many digits to keep. */
export function withUnit(value: number, unit: string, digits?: number): string {
  const set = formatUnit(unit);
  const number = digits === undefined ? formatExactly(value) : formatBriefly(value, digits);
  return set ? `${number}${NUMBER_SPACE}${set}` : number;
}
