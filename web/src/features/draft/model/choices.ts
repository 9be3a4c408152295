import type { Choice } from '../../../shared/ui/fields/choice-field';

/** Every coded word of a sheet that is picked from a list, said plainly. */
export const PHASES: readonly Choice[] = [
  { value: 'gas', label: 'gas' },
  { value: 'liquid', label: 'liquid' },
  { value: 'gas-or-liquid', label: 'gas or liquid, the same formula' },
  { value: 'gas-and-liquid', label: 'gas and liquid, both sides' },
];

export const AVERAGING: readonly Choice[] = [
  { value: 'average', label: 'mean over the surface' },
  { value: 'local', label: 'local' },
  { value: 'not-stated', label: 'not stated' },
];

export const WALLS: readonly Choice[] = [
  { value: 'constant-concentration', label: 'constant concentration' },
  { value: 'constant-flux', label: 'constant flux' },
  { value: 'not-applicable', label: 'does not apply' },
  { value: 'not-stated', label: 'not stated' },
];

export const DRIVING_FORCES: readonly Choice[] = [
  { value: 'local', label: 'local' },
  { value: 'log-mean', label: 'log mean' },
  { value: 'inlet', label: 'at the inlet' },
  { value: 'not-stated', label: 'not stated' },
];

export const PROPERTY_STATES: readonly Choice[] = [
  { value: 'film', label: 'film, midway between interface and bulk' },
  { value: 'bulk', label: 'bulk' },
  { value: 'interface', label: 'interface' },
  { value: 'inlet', label: 'inlet' },
  { value: 'not-stated', label: 'not stated' },
];

export const QUANTITY_STATES: readonly Choice[] = [
  { value: '', label: 'as the sheet says' },
  { value: 'film', label: 'film' },
  { value: 'bulk', label: 'bulk' },
  { value: 'interface', label: 'interface' },
  { value: 'wall', label: 'wall' },
  { value: 'inlet', label: 'inlet' },
];

export const ROLES: readonly Choice[] = [
  { value: '', label: 'none in particular' },
  { value: 'characteristic-length', label: 'characteristic length' },
  { value: 'velocity', label: 'velocity' },
  { value: 'state', label: 'state: for properties and bases only' },
];

export const RESULT_KINDS: readonly Choice[] = [
  { value: 'Sherwood', label: 'Sherwood number' },
  { value: 'Stanton', label: 'Stanton number' },
  { value: 'j-factor', label: 'j factor' },
  { value: 'coefficient', label: 'coefficient itself' },
  { value: 'volumetric-coefficient', label: 'volumetric coefficient' },
  { value: 'interfacial-area', label: 'interfacial area' },
];

export const COEFFICIENT_BASES: readonly Choice[] = [
  { value: 'concentration', label: 'concentration' },
  { value: 'partial-pressure', label: 'partial pressure' },
  { value: 'mole-fraction', label: 'mole fraction' },
];

export const PER: readonly Choice[] = [
  { value: 'area', label: 'area' },
  { value: 'volume', label: 'volume' },
];

export const RATE_FORMS: readonly Choice[] = [
  { value: 'dilute-or-equimolar', label: 'dilute or equimolar' },
  { value: 'stagnant-inert', label: 'through a stagnant inert' },
  { value: 'drift-free', label: 'drift-free, F' },
];

export const PART_PHASES: readonly Choice[] = [
  { value: '', label: 'as the sheet' },
  { value: 'gas', label: 'gas' },
  { value: 'liquid', label: 'liquid' },
];

export const BOUND_BASES: readonly Choice[] = [
  { value: 'stated', label: 'stated in the source' },
  { value: 'handbook', label: 'from a handbook' },
  { value: 'common-practice', label: 'common practice, no source' },
  { value: 'none', label: 'no bound on record' },
];

export const NATURES: readonly Choice[] = [
  { value: 'data', label: 'data end here' },
  { value: 'regime', label: 'regime changes' },
  { value: 'definition', label: 'formula loses its meaning' },
  { value: 'physical', label: 'nothing beyond is possible' },
];

export const CLOSINGS: readonly Choice[] = [
  { value: 'closed', label: 'included' },
  { value: 'open', label: 'left out' },
];

export const STATISTICS: readonly Choice[] = [
  { value: 'max', label: 'largest deviation' },
  { value: 'mean', label: 'mean deviation' },
  { value: 'rms', label: 'root mean square' },
  { value: '95 %', label: 'for 95 % of the data' },
  { value: 'not-stated', label: 'not stated' },
];

export const SOURCE_TYPES: readonly Choice[] = [
  { value: 'article-journal', label: 'article in a journal' },
  { value: 'book', label: 'book' },
  { value: 'chapter', label: 'chapter of a book' },
  { value: 'paper-conference', label: 'conference paper' },
  { value: 'thesis', label: 'thesis' },
  { value: 'report', label: 'report' },
  { value: 'document', label: 'other document' },
];

export const READ: readonly Choice[] = [
  { value: 'seen', label: 'the source was seen' },
  { value: 'memory', label: 'from memory, not seen' },
];

export const CHECK_KINDS: readonly Choice[] = [
  { value: 'published', label: 'published example' },
  { value: 'computed', label: 'computed by us' },
];

export const VERIFICATIONS: readonly Choice[] = [
  { value: 'published-example', label: 'recomputed from a published example' },
  { value: 'expression-seen', label: 'expression seen in a source' },
  { value: 'from-memory', label: 'from memory, to be checked' },
];
