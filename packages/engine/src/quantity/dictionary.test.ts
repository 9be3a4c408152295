import { readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { CONSTANTS, isConstant } from './constants.js';
import { QUANTITIES, serves } from './dictionary.js';
import { sameDimension } from './dimension.js';
import { measuresSame, readUnit } from './unit.js';
import { unitsFor, usualUnitFor } from './unit-choices.js';

/** The parts of the dictionary, one a file. */
async function parts(): Promise<Record<string, unknown>[]> {
  const files = readdirSync(new URL('./dictionary/', import.meta.url)).filter((file) => file.endsWith('.ts'));
  const modules = await Promise.all(
    files.map((file) => import(`./dictionary/${file}`) as Promise<Record<string, Record<string, unknown>>>),
  );
  return modules.flatMap((module) => Object.values(module));
}

describe('the quantity dictionary', () => {
  test('no name stands in two parts, and no part is left out', async () => {
    const names = (await parts()).flatMap((part) => Object.keys(part));
    expect(new Set(names).size).toBe(names.length);
    expect(new Set(Object.keys(QUANTITIES))).toEqual(new Set(names));
  });

  test.each(Object.keys(QUANTITIES))(
    '%s is written in coherent SI, under a symbol that an expression can hold',
    (name) => {
      const entry = QUANTITIES[name];
      expect(name).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
      expect(entry?.symbol).toMatch(/^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?$/);
      expect(isConstant(entry?.symbol ?? 'g')).toBe(false);
      expect(entry?.title).toMatch(/^[A-Z].*[^.]$/);
      expect(readUnit(entry?.unit ?? '?')).toMatchObject({ ok: true, unit: { factor: 1, offset: 0 } });
      for (const narrow of entry?.covers ?? []) {
        const [wide, other] = [readUnit(entry?.unit ?? '?'), readUnit(QUANTITIES[narrow]?.unit ?? '?')];
        expect(wide.ok && other.ok && sameDimension(wide.unit.dimension, other.unit.dimension), narrow).toBe(
          true,
        );
      }
    },
  );

  const withUsual = Object.entries(QUANTITIES).filter(([, entry]) => entry.usual !== undefined);
  test.each(withUsual)(
    'the usual unit of %s measures the same and is among those offered',
    (_name, entry) => {
      const [own, usual] = [readUnit(entry.unit), readUnit(entry.usual ?? '?')];
      expect(own.ok && usual.ok && measuresSame(own.unit, usual.unit)).toBe(true);
      expect(entry.usual).not.toBe(entry.unit);
      expect(unitsFor(entry.unit, entry)).toContain(entry.usual);
      expect(usualUnitFor(entry.unit, entry)).toBe(entry.usual);
    },
  );

  // Common practice, no source: what data sheets and gauges show.
  test.each([
    ['gas-temperature', 'K', 'degC'],
    ['total-pressure', 'atm', 'kPa'],
    ['tube-inside-diameter', 'm', 'mm'],
    ['liquid-viscosity', 'Pa s', 'mPa s'],
    ['liquid-density', 'g/cm^3', 'kg/m^3'],
    ['superficial-gas-velocity', 'm/s', 'm/s'],
    ['wind-speed', 'm/h', 'm/s'],
    ['corrugation-angle', 'deg', 'deg'],
  ])('%s on a sheet in %s is asked for in %s', (name, own, asked) => {
    expect(usualUnitFor(own, QUANTITIES[name])).toBe(asked);
  });

  test('per cent is offered for parts of a whole, not for counts and constants', () => {
    expect(unitsFor('1', QUANTITIES['relative-humidity'])).toEqual(['1', '%']);
    expect(unitsFor('1', QUANTITIES['fibre-count'])).toEqual(['1']);
    expect(unitsFor('kg/(m s)', QUANTITIES['film-rate-per-width'])).not.toContain('mPa s');
  });

  test('an inherited name is no entry', () => {
    expect(QUANTITIES['constructor']).toBeUndefined();
    expect(QUANTITIES['__proto__']).toBeUndefined();
    expect(CONSTANTS['constructor']).toBeUndefined();
    expect(isConstant('toString')).toBe(false);
    expect(serves('constructor', 'toString')).toBe(false);
  });

  test('a wide name serves for its narrow ones and the other way round, but not one narrow for another', () => {
    expect(serves('gas-density', 'gas-density')).toBe(true);
    expect(serves('gas-density', 'fluid-density')).toBe(true);
    expect(serves('fluid-density', 'liquid-density')).toBe(true);
    expect(serves('gas-density', 'liquid-density')).toBe(false);
    expect(serves('gas-density', 'gas-viscosity')).toBe(false);
  });
});

describe('constants', () => {
  // g by definition (ISO 80000-3, CGPM 1901); R from the exact k and N_A of the SI of 2019.
  test('have the values of the standards', () => {
    expect(CONSTANTS['g']?.value).toBe(9.80665);
    expect(CONSTANTS['R']?.value).toBeCloseTo(1.380649e-23 * 6.02214076e23, 9);
    expect(CONSTANTS['pi']?.value).toBe(Math.PI);
    for (const { unit, dimension } of Object.values(CONSTANTS)) {
      const read = readUnit(unit);
      expect(read.ok && sameDimension(read.unit.dimension, dimension)).toBe(true);
    }
  });
});
