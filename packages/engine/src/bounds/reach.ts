import { fromSI, readUnit, toSI, type Unit } from '../quantity/unit.js';
import type { BoundEnd } from '../sheet/common-schema.js';
import { compareWithLimit } from './interval.js';

/** How far past a limit of data a deviation may go, where the sheet says nothing else. */
export const DEFAULT_REACH = 2;
/** The same for temperatures, in kelvin: twice 300 K is another world, a tenth more is some 30 K. */
export const TEMPERATURE_REACH = 1.1;

export type Side = 'lo' | 'hi';

/** Whether a unit measures temperature; its ratios have a meaning in kelvin only. */
export function isTemperature(unit: string): boolean {
  return kelvinUnit(unit) !== null;
}

/** Value over upper limit, or lower limit over value; null where that says nothing. */
export function ratioTo(end: BoundEnd | undefined, value: number, side: Side, unit: string): number | null {
  if (!end) return null;
  const [limit, here] = [absolute(end.value, unit), absolute(value, unit)];
  if (limit <= 0 || here <= 0) return null;
  return side === 'hi' ? here / limit : limit / here;
}

/** How far a deviation reaches past a limit, in the symbol's unit; null where it has no reach. */
export function reachLimit(end: BoundEnd, side: Side, unit: string): number | null {
  const limit = absolute(end.value, unit);
  if (end.nature !== 'data' || limit <= 0) return null;
  const reach = end.reach ?? (isTemperature(unit) ? TEMPERATURE_REACH : DEFAULT_REACH);
  const kelvin = kelvinUnit(unit);
  const furthest = side === 'hi' ? limit * reach : limit / reach;
  return kelvin ? fromSI(furthest, kelvin) : furthest;
}

export function isWithinReach(end: BoundEnd, value: number, side: Side, unit: string): boolean {
  const furthest = reachLimit(end, side, unit);
  if (furthest === null) return false;
  return side === 'hi' ? compareWithLimit(value, furthest) <= 0 : compareWithLimit(value, furthest) >= 0;
}

function absolute(value: number, unit: string): number {
  const kelvin = kelvinUnit(unit);
  return kelvin ? toSI(value, kelvin) : value;
}

function kelvinUnit(text: string): Unit | null {
  const reading = readUnit(text);
  if (!reading.ok) return null;
  const { dimension } = reading.unit;
  return dimension.K === 1 && Object.keys(dimension).length === 1 ? reading.unit : null;
}
