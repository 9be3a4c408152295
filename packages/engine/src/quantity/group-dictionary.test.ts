import { describe, expect, test } from 'vitest';
import { dimensionOf } from '../expression/dimension-of.js';
import { parse } from '../expression/parse.js';
import { symbolsOf, type Tree } from '../expression/tree.js';
import { compileTree } from '../expression/compile-tree.js';
import { CONSTANTS, isConstant } from './constants.js';
import { QUANTITIES } from './dictionary.js';
import { DIMENSIONLESS, isDimensionless, sameDimension } from './dimension.js';
import { GROUPS, GROUP_SLOTS, type GroupSlot } from './group-dictionary.js';
import { groupForSheet } from './group-for-sheet.js';
import { readUnit } from './unit.js';

const SLOTS: Readonly<Record<string, GroupSlot>> = GROUP_SLOTS;

function treeOf(expression: string): Tree {
  const parsed = parse(expression);
  if (!parsed.ok) throw new Error(parsed.fault.reason);
  return parsed.tree;
}

function dimension(symbol: string) {
  const reading = readUnit(CONSTANTS[symbol]?.unit ?? SLOTS[symbol]?.unit ?? '?');
  return reading.ok ? reading.unit.dimension : DIMENSIONLESS;
}

/** Value of a group of the dictionary at given values, in SI. */
function valueOf(symbol: string, given: Record<string, number>): number {
  const entry = GROUPS.find((group) => group.symbol === symbol);
  const tree = treeOf(entry?.expression ?? '');
  const names = [...symbolsOf(tree)];
  const run = compileTree(tree, (name) => ({ slot: names.indexOf(name) }));
  return run(Float64Array.from(names, (name) => CONSTANTS[name]?.value ?? given[name] ?? Number.NaN));
}

describe('the dictionary of groups', () => {
  test('each symbol stands once', () => {
    const symbols = GROUPS.map(({ symbol }) => symbol);
    expect(new Set(symbols).size).toBe(symbols.length);
  });

  test.each(GROUPS)(
    '$name is dimensionless, in symbols that are explained',
    ({ symbol, expression, hint }) => {
      const tree = treeOf(expression);
      expect(symbol).toMatch(/^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?$/);
      expect(hint).toMatch(/\.$/);
      for (const name of symbolsOf(tree)) expect(isConstant(name) || name in GROUP_SLOTS, name).toBe(true);
      const verdict = dimensionOf(tree, dimension);
      expect(verdict.ok && isDimensionless(verdict.dimension)).toBe(true);
    },
  );

  test.each(Object.entries(SLOTS))('%s asks for quantities of its own dimension', (symbol, { names }) => {
    for (const name of names) {
      const reading = readUnit(QUANTITIES[name]?.unit ?? '?');
      expect(reading.ok && sameDimension(reading.unit.dimension, dimension(symbol)), name).toBe(true);
    }
  });

  // Water at 20 °C in a 25 mm tube: ρ 998.2 kg/m³, µ 1.002 mPa s (IAPWS values as any steam table prints them).
  const water = {
    rho: 998.2,
    mu: 1.002e-3,
    D: 2e-9,
    u: 1.5,
    d: 0.025,
    L: 2,
    sigma: 0.0728,
    delta_rho: 3,
    k: 5e-5,
    d_c: 0.5,
  };

  test('of water in a tube they come out as worked by hand', () => {
    expect(valueOf('Re', water)).toBeCloseTo((998.2 * 1.5 * 0.025) / 0.001002, 6);
    expect(valueOf('Sc', water)).toBeCloseTo(501.9, 1);
    expect(valueOf('We', water)).toBeCloseTo((998.2 * 2.25 * 0.025) / 0.0728, 6);
    expect(valueOf('Fr', water)).toBeCloseTo(2.25 / (9.80665 * 0.025), 9);
  });

  test('they agree with each other as the textbooks have it', () => {
    const v = (symbol: string) => valueOf(symbol, water);
    expect(v('Pe') / (v('Re') * v('Sc'))).toBeCloseTo(1, 12);
    expect(v('Ra') / (v('Gr') * v('Sc'))).toBeCloseTo(1, 12);
    expect(v('Gz') / (v('Pe') * (0.025 / 2))).toBeCloseTo(1, 12);
    expect((v('St') * v('Re') * v('Sc')) / v('Sh')).toBeCloseTo(1, 12);
    expect(v('j_D') / (v('St') * v('Sc') ** (2 / 3))).toBeCloseTo(1, 12);
    expect((v('Ga') * (3 / 998.2)) / v('Ar')).toBeCloseTo(1, 12);
    expect(v('Ca') / (v('We') / v('Re'))).toBeCloseTo(1, 12);
    // Mo = Eo We² / Re⁴ (Clift, Grace and Weber, Bubbles, Drops, and Particles, 1978; from memory).
    expect(v('Mo') / ((v('Eo') * v('We') ** 2) / v('Re') ** 4)).toBeCloseTo(1, 12);
  });
});

describe('a group in the symbols of a sheet', () => {
  const entry = (symbol: string) => GROUPS.find((group) => group.symbol === symbol)!;
  const liquid = { symbol: 'rho_L', is: 'liquid-density', unit: 'kg/m^3' };

  test('takes the only quantity that fits, by name or by role', () => {
    expect(
      groupForSheet(entry('Re'), [
        liquid,
        { symbol: 'mu_L', is: 'liquid-viscosity', unit: 'mPa s' },
        { symbol: 'w', is: 'nozzle-exit-velocity', unit: 'm/s', role: 'velocity' },
        { symbol: 'd_n', is: 'nozzle-diameter', unit: 'mm', role: 'characteristic-length' },
      ]),
    ).toEqual({ expression: 'rho_L*w*d_n/mu_L', open: [] });
  });

  test('leaves open what could be either of two, and what is not there', () => {
    const { expression, open } = groupForSheet(entry('Sc'), [
      liquid,
      { symbol: 'rho_G', is: 'gas-density', unit: 'kg/m^3' },
      { symbol: 'mu', is: 'liquid-viscosity', unit: 'Pa s' },
    ]);
    expect(expression).toBe('mu/(rho*D)');
    expect(open).toEqual([
      { symbol: 'rho', words: 'density', candidates: ['rho_L', 'rho_G'] },
      { symbol: 'D', words: 'diffusivity', candidates: [] },
    ]);
  });

  test('does not take a role of another dimension: a rate per width is no velocity', () => {
    const film = { symbol: 'Gamma', is: 'film-rate-per-width', unit: 'kg/(m s)', role: 'velocity' as const };
    expect(groupForSheet(entry('Ca'), [film]).open.map(({ symbol }) => symbol)).toContain('u');
  });
});
