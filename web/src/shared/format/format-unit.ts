import { printedUnit } from '@merestone/engine';
import { NUMBER_SPACE } from './format-number';

/** A unit as it is set in print: `kg/(m^2 s)` becomes `kg/(m² s)`, `degC` becomes `°C`, none becomes an empty text. */
export function formatUnit(unit: string): string {
  return printedUnit(unit, NUMBER_SPACE);
}
