import { QUANTITIES, type Quantity } from '@merestone/engine';

export type SectionKey = 'geometry' | 'conditions' | 'rest';

const SHAPE_UNITS = new Set(['m', 'm^2', 'm^3', '1/m']);
const SHAPE_WORDS = /void|porosity|angle|aspect|number-of|turns|hydraulic|open-area|pitch/;
const CONDITION_UNITS = [
  'K',
  'Pa',
  'm/s',
  'kg/(m^2 s)',
  'kg/(m s)',
  'kg/s',
  'm^3/s',
  'm^2/s',
  '1/s',
  'rad/s',
];

/** Where a quantity stands in the head of an engineer: the apparatus, the fluid and its conditions, the rest. */
export function sectionOf(quantity: Quantity): SectionKey {
  if (quantity.role === 'characteristic-length') return 'geometry';
  const unit = QUANTITIES[quantity.is]?.unit ?? quantity.unit;
  if (SHAPE_UNITS.has(unit) || SHAPE_WORDS.test(quantity.is)) return 'geometry';
  return unit === '1' ? 'rest' : 'conditions';
}

/** Order within a section: the characteristic length first; temperature and pressure before what is found from them. */
export function rankOf(quantity: Quantity): number {
  if (quantity.role === 'characteristic-length') return -1;
  if (quantity.is === 'total-pressure') return 0.5;
  if (quantity.is.endsWith('diffusivity')) return CONDITION_UNITS.length + 1;
  const unit = QUANTITIES[quantity.is]?.unit ?? quantity.unit;
  if (unit === 'Pa') return CONDITION_UNITS.length + 2;
  const place = CONDITION_UNITS.indexOf(unit);
  return place === -1 ? CONDITION_UNITS.length : place;
}

/** Quantities in the order in which they are asked for, section by section. */
export function inFieldOrder(
  quantities: readonly Quantity[],
): { section: SectionKey; quantities: Quantity[] }[] {
  const sections: SectionKey[] = ['geometry', 'conditions', 'rest'];
  return sections
    .map((section) => ({
      section,
      quantities: quantities
        .filter((quantity) => sectionOf(quantity) === section)
        .sort((a, b) => rankOf(a) - rankOf(b)),
    }))
    .filter(({ quantities: found }) => found.length > 0);
}
