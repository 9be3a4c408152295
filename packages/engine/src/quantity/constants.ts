import type { Dimension } from './dimension.js';

/** J/(mol K), product of the exact constants of the SI of 2019 (CODATA 2018). */
export const MOLAR_GAS_CONSTANT = 8.314462618;

interface Constant {
  value: number;
  unit: string;
  dimension: Dimension;
  name: string;
}

const ENTRIES: Readonly<Record<string, Constant>> = {
  /** Standard acceleration of free fall, exact by definition (ISO 80000-3). */
  g: {
    value: 9.80665,
    unit: 'm/s^2',
    dimension: { m: 1, s: -2 },
    name: 'standard acceleration of free fall',
  },
  R: {
    value: MOLAR_GAS_CONSTANT,
    unit: 'J/(mol K)',
    dimension: { kg: 1, m: 2, s: -2, mol: -1, K: -1 },
    name: 'molar gas constant',
  },
  pi: { value: Math.PI, unit: '1', dimension: {}, name: 'ratio of circumference to diameter' },
};

/** Symbols that every expression may use and no sheet may redefine. Bare, so that no inherited name is taken for one. */
export const CONSTANTS: Readonly<Record<string, Constant>> = Object.freeze(
  Object.assign(Object.create(null) as Record<string, Constant>, ENTRIES),
);

export function isConstant(symbol: string): boolean {
  return Object.hasOwn(CONSTANTS, symbol);
}
