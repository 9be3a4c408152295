import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { sameDimension } from './dimension.js';
import { convert, OFFERED, unitsFor } from './unit-choices.js';
import { fromSI, readUnit, toSI, type Unit } from './unit.js';

function unit(text: string): Unit {
  const read = readUnit(text);
  if (!read.ok) throw new Error(read.reason);
  return read.unit;
}

describe('how units are written', () => {
  test.each([
    ['kg/(m^2 s)', 'kg/m^2/s'],
    ['kg/(m^2 s)', 'kg/m2/s'],
    ['kg/(m^2 s)', 'kg m^-2 s^-1'],
    ['kg/(m^2 s)', 'kg·m⁻²·s⁻¹'],
    ['kg/(m^2 s)', 'kg⋅m⁻²⋅s⁻¹'],
    ['kg/(m^2 s)', 'kg*m^-2*s^-1'],
    ['kg/(m^2 s)', 'kg/(m² s)'],
    ['kg/(m^2 s)', '  kg/( m^2  s ) '],
    ['m^2/s', 'm²/s'],
    ['m^2/s', 'm2 s-1'],
    ['um', 'µm'],
    ['um', 'μm'],
    ['uPa s', 'µPa s'],
    ['degC', '°C'],
    ['degF', '°F'],
    ['bar(g)', 'barg'],
    ['kPa(g)', 'kPag'],
    ['psi(g)', 'psig'],
    ['psi', 'psia'],
    ['l', 'L'],
    ['ml', 'mL'],
    ['lb', 'lbm'],
    ['1', ''],
    ['1', '-'],
    ['W/(m^2 K)', 'W/(m^2 °C)'],
    ['1/m', 'm^-1'],
    ['Torr', 'torr'],
    ['d', 'day'],
  ])('%s and %s are the same', (one, other) => {
    const [a, b] = [unit(one), unit(other)];
    expect(b.factor).toBeCloseTo(a.factor, 15);
    expect(b.offset).toBe(a.offset);
    expect(sameDimension(a.dimension, b.dimension)).toBe(true);
  });

  // ISO 80000-1, 7.2.2: a product under a solidus stands in brackets (from memory).
  test.each(['kg/m s', 'kg/m*s', 'W/m·K'])('%s can be read in two ways and is refused', (text) => {
    const reading = readUnit(text);
    expect(reading.ok ? '' : reading.reason).toContain('in brackets');
  });

  test.each([
    ['nothing known', 'smoot'],
    ['a unit the library rounds', 'furlong'],
    ['weight per cent, which is no unit', 'wt%'],
    ['mole per cent, which is no unit', 'mol%'],
    ['a prefix on what has none', 'kmin'],
    ['a ton, of which there are several', 'ton'],
    ['an inherited name', 'constructor'],
    ['an inherited name', 'toString'],
    ['an inherited name', '__proto__'],
    ['a prototype path', 'm.__proto__'],
    ['a number in front', '3 m'],
    ['a power of ten', '1e3 m'],
    ['two stars', 'm**2'],
    ['a bracket left open', 'kg/(m s'],
    ['a bracket too many', 'kg/m)'],
    ['brackets in brackets', 'kg/((m s))'],
    ['a solidus in brackets', '(kg/m)/s'],
    ['a solidus at the end', 'kg/'],
    ['a solidus in front', '/m'],
    ['two solidi', 'kg//m'],
    ['a power of nothing', 'm^'],
    ['an absurd power', 'm^99'],
    ['a zeroth power', 'm^0'],
    ['too large for a number', 'Ym^9 Ym^9'],
    ['too small for a number', 'ym^9 ym^9 ym^9'],
    ['a line break', 'm\n/s/x'],
    ['markup', '<b>m</b>'],
    ['a temperature point in a product', 'tempC'],
    ['a gauge unit in a product', 'bar(g)/m'],
    ['a currency', 'USD'],
    ['a level', 'dB'],
    ['a look-alike', 'м/с'],
  ])('%s is refused: %s', (_why, text) => {
    expect(readUnit(text)).toEqual({ ok: false, reason: `"${text}" is not a unit we know` });
  });

  test('a text of 41 characters is refused at once', () => {
    expect(readUnit('m '.repeat(20) + 'm')).toEqual({
      ok: false,
      reason: 'a unit has at most 40 characters',
    });
  });

  test('whatever text comes, there is a unit with a usable factor or a reason', () => {
    const piece = fc.constantFrom(
      'm',
      'kg',
      's',
      '/',
      '(',
      ')',
      '^',
      '2',
      '-1',
      ' ',
      '·',
      '²',
      '%',
      'deg',
      '.',
      'Y',
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary', maxLength: 45 }),
          fc.array(piece, { maxLength: 12 }).map((pieces) => pieces.join('')),
        ),
        (text) => {
          const read = readUnit(text);
          if (read.ok) {
            expect(Number.isFinite(read.unit.factor) && read.unit.factor > 0, text).toBe(true);
            expect(Number.isFinite(read.unit.offset)).toBe(true);
          } else expect(read.reason).not.toBe('');
        },
      ),
      { numRuns: 1500, seed: 11 },
    );
  });
});

describe('offsets', () => {
  // Fixed points of the scales by definition: 0 °C = 273.15 K, 32 °F = 0 °C, 212 °F = 100 °C, 0 °F = 459.67/1.8 K.
  test.each([
    [0, 'degC', 'K', 273.15],
    [100, '°C', '°F', 212],
    [32, 'degF', 'degC', 0],
    [-40, 'degC', 'degF', -40],
    [-459.67, 'degF', 'K', 0],
    [25, 'degC', 'K', 298.15],
    // Standard atmosphere 101 325 Pa (ISO 2533).
    [0, 'bar(g)', 'Pa', 101325],
    [1, 'barg', 'bar', 2.01325],
    [0, 'psig', 'atm', 1],
    [101.325, 'kPa(g)', 'atm', 2],
    [1, 'atm', 'kPa(g)', 0],
  ])('%d %s in %s', (value, from, to, expected) => {
    expect(convert(value, from, to)).toBeCloseTo(expected, 9);
  });

  test('in a product a degree is a difference', () => {
    expect(unit('J/(kg degC)').factor).toBe(1);
    expect(unit('J/(kg degF)').factor).toBeCloseTo(1.8, 14);
    expect(unit('degC/m').offset).toBe(0);
  });

  test('a gauge unit says which atmosphere it takes', () => {
    expect(unit('bar(g)').remark).toMatch(/101\.325 kPa/);
    expect(unit('bar').remark).toBeUndefined();
  });
});

describe('angular speed and frequency', () => {
  test('one turn per second is 2π rad/s, and neither passes for the other', () => {
    expect(unit('rpm').factor * 60).toBeCloseTo(2 * Math.PI, 14);
    expect(convert(60, 'rpm', 'rad/s')).toBeCloseTo(2 * Math.PI, 14);
    expect(convert(60, 'rpm', '1/s')).toBeNull();
    expect(convert(1, 'Hz', 'rad/s')).toBeNull();
    expect(convert(60, '1/min', '1/s')).toBeCloseTo(1, 15);
    expect(unitsFor('1/s')).toEqual(['1/s', '1/min', '1/h']);
    expect(unitsFor('rad/s')).toEqual(['rad/s', 'rpm']);
  });

  test('an angle in degrees is one in radians', () => {
    expect(convert(180, 'deg', 'rad')).toBeCloseTo(Math.PI, 14);
  });
});

describe('units to choose from', () => {
  test('every unit on offer can be read, and stands there once', () => {
    for (const offered of OFFERED) expect(readUnit(offered), offered).toMatchObject({ ok: true });
    expect(new Set(OFFERED).size).toBe(OFFERED.length);
  });

  test('the own unit comes first and once, the others fit', () => {
    for (const own of OFFERED) {
      const choices = unitsFor(own);
      expect(choices[0]).toBe(own);
      expect(new Set(choices).size).toBe(choices.length);
      for (const choice of choices) expect(convert(1, own, choice), `${own} ${choice}`).not.toBeNull();
    }
  });

  test('gauge units are offered for an absolute pressure only, degrees for a point of temperature only', () => {
    expect(unitsFor('Pa')).not.toContain('bar(g)');
    expect(unitsFor('Pa', { absolutePressure: true })).toContain('bar(g)');
    expect(unitsFor('K')).toEqual(['K', 'degC', 'degF']);
    expect(unitsFor('K', { difference: true })).toEqual(['K']);
  });

  test('a unit nobody knows stays the only choice', () => {
    expect(unitsFor('furlong')).toEqual(['furlong']);
  });
});

describe('conversion', () => {
  const alike = OFFERED.flatMap((from) =>
    unitsFor(from, { absolutePressure: true }).map((to) => [from, to] as const),
  );

  test('there and back is the same number', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...alike),
        fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
        ([from, to], value) => {
          const there = convert(value, from, to);
          const back = there === null ? null : convert(there, to, from);
          const scale = Math.max(
            value,
            ...[from, to].map((text) => Math.abs(unit(text).offset / unit(from).factor)),
          );
          expect(Math.abs((back ?? Number.NaN) - value)).toBeLessThanOrEqual(1e-12 * scale);
        },
      ),
      { numRuns: 3000, seed: 12 },
    );
  });

  test('SI and back is the same number', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...OFFERED),
        fc.double({ min: 1e-3, max: 1e6, noNaN: true }),
        (text, value) => {
          const read = unit(text);
          const scale = Math.max(value, Math.abs(read.offset / read.factor));
          expect(Math.abs(fromSI(toSI(value, read), read) - value)).toBeLessThanOrEqual(1e-14 * 4 * scale);
        },
      ),
      { numRuns: 1000, seed: 13 },
    );
  });

  test.each([
    ['m', 's'],
    ['Pa', 'kg'],
    ['1', 'm'],
    ['m', 'furlong'],
  ])('%s is not converted to %s', (from, to) => {
    expect(convert(1, from, to)).toBeNull();
  });

  test('the same unit changes no digit', () => {
    expect(convert(0.1, 'psi', 'psi')).toBe(0.1);
    expect(convert(0.1, 'degF', '°F')).toBe(0.1);
  });
});
