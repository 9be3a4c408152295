import type { StripStone } from '@merestone/engine';
import { NUMBER_SPACE } from '../../format/format-number';
import { placeLabels, type PlacedLabel } from './place-labels';
import type { StripMeasures } from './strip-measures';
import { withUnit } from './strip-words';
import { textWidth } from './text-width';

export interface CarvedLabel extends PlacedLabel {
  text: string;
  /** Middle of the stone it belongs to, in pixels. */
  stoneAt: number;
}

/** The limits' values as they are carved under their stones, placed so that none overlaps. */
export function carvedLabels(
  stones: readonly StripStone[],
  unit: string,
  measures: StripMeasures,
): CarvedLabel[] {
  const texts = stones.map((stone) => carved(stone, unit));
  const wishes = stones.map((stone, index) => ({
    at: measures.x(stone.at),
    width: textWidth(texts[index] ?? '', measures.figure),
  }));
  return placeLabels(wishes, measures.width).map((place, index) => ({
    ...place,
    text: texts[index] ?? '',
    stoneAt: wishes[index]?.at ?? place.at,
  }));
}

/** A limit that is itself left out is carved with the sign that leaves it out. */
function carved({ value, side, closed }: StripStone, unit: string): string {
  const figure = withUnit(value, unit);
  if (closed) return figure;
  return side === 'lo' ? `>${NUMBER_SPACE}${figure}` : `<${NUMBER_SPACE}${figure}`;
}
