import type { Dimension } from './dimension.js';

/** J/(mol K), product of the exact constants of the SI of 2019 (CODATA 2018). */
export const MOLAR_GAS_CONSTANT = 8.314462618;

/** Symbols that every expression may use and no sheet may redefine. */
export const CONSTANTS: Readonly<
  Record<string, { value: number; unit: string; dimension: Dimension; name: string }>
> = {
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

export function isConstant(symbol: string): boolean {
  return Object.hasOwn(CONSTANTS, symbol);
}
