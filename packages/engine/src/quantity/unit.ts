import Qty from 'js-quantities';
import {
  DIMENSIONLESS,
  isDimensionless,
  power,
  product,
  sameDimension,
  type BaseUnit,
  type Dimension,
} from './dimension.js';

/** A unit as an affine map to coherent SI: SI value = value × factor + offset. */
export interface Unit {
  text: string;
  factor: number;
  offset: number;
  dimension: Dimension;
  /** A remark that belongs to a value in this unit, such as the atmosphere under a gauge reading. */
  remark?: string;
  /** Counts radians (rad, deg, rpm): as an angular speed no frequency, though of the same dimension. */
  angular: boolean;
}

export type UnitReading = { ok: true; unit: Unit } | { ok: false; reason: string };

/** Standard atmosphere, the exact value of ISO 2533. */
export const STANDARD_ATMOSPHERE = 101325;
const GAUGE_REMARK = 'a gauge pressure is taken over the standard atmosphere of 101.325 kPa';

/** Atoms the unit library lacks or rounds; exact by definition (NIST SP 811, appendix B). */
const EXACT: Readonly<Record<string, { factor: number; like: string }>> = {
  psi: { factor: 6894.757293168361, like: 'Pa' },
  lbf: { factor: 4.4482216152605, like: 'N' },
  mmHg: { factor: 133.322387415, like: 'Pa' },
  Torr: { factor: 101325 / 760, like: 'Pa' },
  inHg: { factor: 3386.388640341, like: 'Pa' },
  inH2O: { factor: 249.08891, like: 'Pa' },
  kgf: { factor: 9.80665, like: 'N' },
  gal: { factor: 0.003785411784, like: 'm3' },
  gpm: { factor: 0.003785411784 / 60, like: 'm3/s' },
  cfm: { factor: 0.028316846592 / 60, like: 'm3/s' },
  lbmol: { factor: 453.59237, like: 'mol' },
  hp: { factor: 745.6998715822702, like: 'W' },
  BTU: { factor: 1055.05585262, like: 'J' },
  kn: { factor: 1852 / 3600, like: 'm/s' },
  cmH2O: { factor: 98.0665, like: 'Pa' },
  mmH2O: { factor: 9.80665, like: 'Pa' },
  oz: { factor: 0.028349523125, like: 'kg' },
  slug: { factor: 14.593902937206365, like: 'kg' },
  a: { factor: 31557600, like: 's' },
  d: { factor: 86400, like: 's' },
  rpm: { factor: Math.PI / 30, like: 'rad/s' },
  deg: { factor: Math.PI / 180, like: 'rad' },
  K: { factor: 1, like: 'degK' },
};

/**
 * What is taken from the unit library: the names whose factors there are exact. Its list is wider, and in places
 * rounded (rods, gallons) or surprising (weight per cent as a density), so that nothing else of it is let in.
 */
const FROM_LIBRARY =
  /^(?:(?:[fpnumcdhkMGT]|da)?(?:m|g|s|A|mol|Pa|bar|N|J|W|V|C|Hz|P|St|cal|l|L)|[mu]?M|cd|t|tonne|sec|min|h|hr|hour|in|inch|ft|foot|feet|yd|mi|mile|mil|atm|dyn|erg|lbs|degC|degF|degK|degR|mph|rad|ppm|ppb|%)$/;

/** Offset units, which stand alone only. Gauge readings are pressures over the atmosphere. */
const OFFSET: Readonly<Record<string, { factor: number; offset: number; like: string; remark?: string }>> = {
  degC: { factor: 1, offset: 273.15, like: 'K' },
  degF: { factor: 5 / 9, offset: (459.67 * 5) / 9, like: 'K' },
  'kPa(g)': { factor: 1e3, offset: STANDARD_ATMOSPHERE, like: 'Pa', remark: GAUGE_REMARK },
  'bar(g)': { factor: 1e5, offset: STANDARD_ATMOSPHERE, like: 'Pa', remark: GAUGE_REMARK },
  'psi(g)': { factor: 6894.757293168361, offset: STANDARD_ATMOSPHERE, like: 'Pa', remark: GAUGE_REMARK },
};

/** The same unit in other writing. */
const SPELLINGS: Readonly<Record<string, string>> = {
  '°C': 'degC',
  '°F': 'degF',
  barg: 'bar(g)',
  psig: 'psi(g)',
  kPag: 'kPa(g)',
  psia: 'psi',
  '-': '1',
  '': '1',
};
const ATOM_SPELLINGS: Readonly<Record<string, string>> = {
  lb: 'lbs',
  lbm: 'lbs',
  torr: 'Torr',
  Btu: 'BTU',
  yr: 'a',
  day: 'd',
  knot: 'kn',
};

const known = new Map<string, UnitReading>();
const CACHE_LIMIT = 2000;

/**
 * Reads a unit: products and quotients of units with powers, `kg/(m^2 s)`, `kg/m2/s`, `m² s⁻¹`; `1` or `%` for plain
 * numbers; °C and gauge pressures alone. In a product a degree is a difference. Says why where it cannot.
 */
export function readUnit(text: string): UnitReading {
  const cached = known.get(text);
  if (cached) return cached;
  const reading = readAnew(text);
  if (reading.ok && known.size < CACHE_LIMIT) known.set(text, reading);
  return reading;
}

function readAnew(text: string): UnitReading {
  if (text.length > 40) return { ok: false, reason: 'a unit has at most 40 characters' };
  const plain = normalise(text);
  const offset = Object.hasOwn(OFFSET, plain) ? OFFSET[plain] : undefined;
  if (offset) {
    const { dimension } = atom(offset.like) ?? { dimension: DIMENSIONLESS };
    return { ok: true, unit: { text, ...offset, dimension, angular: false } };
  }
  return readProduct(plain, text);
}

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  '⁰': '0',
  '¹': '1',
  '²': '2',
  '³': '3',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
  '⁷': '7',
  '⁸': '8',
  '⁹': '9',
  '⁻': '-',
};

function normalise(text: string): string {
  const trimmed = text.trim();
  if (Object.hasOwn(SPELLINGS, trimmed)) return SPELLINGS[trimmed] ?? trimmed;
  return trimmed
    .replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹⁻]+/g, (run) => `^${[...run].map((c) => SUPERSCRIPTS[c] ?? '').join('')}`)
    .replace(/[µμ]/g, 'u')
    .replace(/[·⋅*×]/g, ' ')
    .replace(/°/g, 'deg')
    .replace(/\s+/g, ' ');
}

/** Names that count an angle; the radian itself is a plain number to the engine. */
const ANGULAR = new Set(['rad', 'deg', 'rpm']);
const FACTOR = /^([A-Za-z][A-Za-z0-9]*?|%)(?:\^?(-?\d+(?:\.\d+)?))?$/;

function readProduct(plain: string, text: string): UnitReading {
  let factor = 1;
  let dimension: Dimension = DIMENSIONLESS;
  const factors = factorsOf(plain);
  if (factors === 'ambiguous')
    return {
      ok: false,
      reason: `"${text}" can be read in two ways; put what stands under the stroke in brackets`,
    };
  if (!factors) return unknownUnit(text);
  for (const { name, exponent } of factors) {
    const read = name === '1' ? { factor: 1, dimension: DIMENSIONLESS } : atom(name);
    if (!read) return unknownUnit(text);
    factor *= read.factor ** exponent;
    dimension = product(dimension, power(read.dimension, exponent));
  }
  // Powers of a large prefix can leave the range of a double; such a unit measures nothing.
  if (factor === 0 || !Number.isFinite(factor)) return unknownUnit(text);
  const angular = factors.some(({ name }) => ANGULAR.has(name));
  return { ok: true, unit: { text, factor, offset: 0, dimension, angular } };
}

function unknownUnit(text: string): UnitReading {
  return { ok: false, reason: `"${text}" is not a unit we know` };
}

/**
 * Splits `a b/(c d)/e` into names with exponents; null where brackets or slashes are misused. A product under a stroke
 * stands in brackets (ISO 80000-1): `kg/m s` means different things to different people.
 */
function factorsOf(plain: string): { name: string; exponent: number }[] | 'ambiguous' | null {
  const found: { name: string; exponent: number }[] = [];
  for (const [i, side] of splitAtSlashes(plain).entries()) {
    const inside = side.trim().replace(/^\((.*)\)$/, '$1');
    if (/[()]/.test(inside) || inside.trim() === '') return null;
    if (i > 0 && inside === side.trim() && inside.includes(' ')) return 'ambiguous';
    for (const word of inside.trim().split(' ')) {
      const match = word === '1' ? ['', '1', undefined] : FACTOR.exec(word);
      if (!match?.[1]) return null;
      const exponent = Number(match[2] ?? 1);
      if (exponent === 0 || Math.abs(exponent) > 9) return null;
      found.push({ name: match[1], exponent: i === 0 ? exponent : -exponent });
    }
  }
  return found;
}

function splitAtSlashes(plain: string): string[] {
  let depth = 0;
  const sides = [''];
  for (const c of plain) {
    if (c === '(') depth += 1;
    if (c === ')') depth -= 1;
    if (c === '/' && depth === 0) sides.push('');
    else sides.push(`${sides.pop() ?? ''}${c}`);
  }
  return sides;
}

const BASE_NAMES: Readonly<Record<string, BaseUnit | null>> = {
  '<kilogram>': 'kg',
  '<meter>': 'm',
  '<second>': 's',
  '<kelvin>': 'K',
  '<mole>': 'mol',
  '<ampere>': 'A',
  '<candela>': 'cd',
  '<radian>': null,
  '<1>': null,
};

/** One unit without a power, from the exact table or the unit library. */
function atom(spelling: string): { factor: number; dimension: Dimension } | null {
  const name = Object.hasOwn(ATOM_SPELLINGS, spelling) ? (ATOM_SPELLINGS[spelling] ?? spelling) : spelling;
  const exact = Object.hasOwn(EXACT, name) ? EXACT[name] : undefined;
  if (exact) return { factor: exact.factor, dimension: libraryUnit(exact.like)?.dimension ?? DIMENSIONLESS };
  return FROM_LIBRARY.test(name) ? libraryUnit(name) : null;
}

function libraryUnit(name: string): { factor: number; dimension: Dimension } | null {
  try {
    const base = new Qty(1, name).toBase();
    let dimension: Dimension = DIMENSIONLESS;
    for (const [list, sign] of [
      [base.numerator, 1],
      [base.denominator, -1],
    ] as const)
      for (const part of list) {
        if (!Object.hasOwn(BASE_NAMES, part)) return null;
        const unit = BASE_NAMES[part];
        if (unit) dimension = product(dimension, { [unit]: sign });
      }
    return { factor: base.scalar, dimension };
  } catch {
    return null;
  }
}

/** Whether two units measure the same; a frequency and an angular speed do not, though their dimension agrees. */
export function measuresSame(a: Unit, b: Unit): boolean {
  return sameDimension(a.dimension, b.dimension) && (a.angular === b.angular || isDimensionless(a.dimension));
}

/** SI value of a number in a unit. */
export function toSI(value: number, unit: Unit): number {
  return value * unit.factor + unit.offset;
}

export function fromSI(value: number, unit: Unit): number {
  return (value - unit.offset) / unit.factor;
}
