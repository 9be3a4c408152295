import type { DictionaryEntry, DictionaryPart } from './dictionary-entry.js';
import { beds } from './dictionary/beds.js';
import { dispersions } from './dictionary/dispersions.js';
import { apparatusLengths } from './dictionary/apparatus-lengths.js';
import { flow } from './dictionary/flow.js';
import { interfaceStates } from './dictionary/interface-states.js';
import { jetsAndCoils } from './dictionary/jets-and-coils.js';
import { movingDrops } from './dictionary/moving-drops.js';
import { openSurfaces } from './dictionary/open-surfaces.js';
import { lengths } from './dictionary/lengths.js';
import { localVelocities } from './dictionary/local-velocities.js';
import { properties } from './dictionary/properties.js';
import { propertyInputs } from './dictionary/property-inputs.js';
import { states } from './dictionary/states.js';

const PARTS: readonly DictionaryPart[] = [
  beds,
  dispersions,
  apparatusLengths,
  flow,
  interfaceStates,
  lengths,
  localVelocities,
  properties,
  propertyInputs,
  jetsAndCoils,
  movingDrops,
  openSurfaces,
  states,
];

/** No inherited names: `constructor` is not in the dictionary. */
const NOTHING = Object.create(null) as Record<string, DictionaryEntry>;

/** The quantity dictionary, by name. Forms that serve several sheets, and property equations, are keyed by these names. */
export const QUANTITIES: Readonly<Record<string, DictionaryEntry>> = Object.freeze(
  PARTS.reduce((all, part) => Object.assign(all, part), NOTHING),
);

/** Whether a value of `given` serves where `wanted` is asked for. */
export function serves(given: string, wanted: string): boolean {
  return given === wanted || covers(given, wanted) || covers(wanted, given);
}

/**
 * The quantity that serves where `wanted` is asked for: the one of that name, else the one that stands for it under a
 * wider or narrower name. Where there are two of a kind nobody but a person can say which; then there is none.
 */
export function servingQuantity<T extends { is: string }>(
  quantities: readonly T[],
  wanted: string,
): T | undefined {
  const exact = quantities.filter(({ is }) => is === wanted);
  const [match, ...others] = exact.length > 0 ? exact : quantities.filter(({ is }) => serves(is, wanted));
  return others.length > 0 ? undefined : match;
}

function covers(wide: string, narrow: string): boolean {
  return QUANTITIES[wide]?.covers?.includes(narrow) ?? false;
}
