import { spawnSync } from 'node:child_process';
import { beforeAll, describe, expect, test } from 'vitest';
import { dimensionText } from './dimension.js';
import { OFFERED } from './unit-choices.js';
import { readUnit, toSI, type Unit } from './unit.js';

/**
 * Every unit that is offered, and more, against GNU units (the `units` command, package `units` of Debian). Its names
 * differ from ours in a few places; the values do not.
 */
const MORE = [
  'km',
  'nm',
  'pm',
  'yd',
  'mi',
  'mil',
  'ft^3',
  'gal',
  'ml',
  'uL',
  'L',
  'd',
  'day',
  'g',
  'mg',
  'ug',
  't',
  'oz',
  'slug',
  'N',
  'kN',
  'dyn',
  'lbf',
  'kgf',
  'mbar',
  'hPa',
  'GPa',
  'Torr',
  'torr',
  'inHg',
  'inH2O',
  'cmH2O',
  'mmH2O',
  'psia',
  'lbf/ft^2',
  'kgf/cm^2',
  'P',
  'St',
  'J',
  'kJ',
  'cal',
  'kcal',
  'erg',
  'BTU',
  'Btu',
  'hp',
  'MW',
  'mol',
  'mmol',
  'kmol',
  'lbmol',
  'lbmol/(ft^2 h)',
  'lbmol/(ft^2 h atm)',
  'mol/(l h)',
  'kn',
  'knot',
  'mph',
  'Hz',
  'ppm',
  'ppb',
  'kg/h/m^2',
  'kg m^-2 h^-1',
  'g cm^-3',
  'm2 s-1',
  'J/(kg K)',
  'J/(kg degC)',
  'BTU/(lb degF)',
  'W/(m^2 K)',
  'BTU/(h ft^2 degF)',
  'kW/m^3',
  'l/(m^2 h)',
  'V',
  'A',
  'C',
];

/** Our names where GNU units has another one, or another meaning for it. */
const GNU_NAMES: Readonly<Record<string, string>> = {
  h: 'hour',
  rad: 'radian',
  deg: 'degree',
  in: 'inch',
  BTU: 'btu',
  Btu: 'btu',
  Torr: 'torr',
  psia: 'psi',
  lbmol: 'mol lb/g',
  kn: 'nauticalmile/hour',
  cmH2O: 'cm water',
  mmH2O: 'mm water',
  inH2O: 'inch water',
  inHg: 'inch Hg',
  m2: 'm^2',
  's-1': 's^-1',
  uL: 'microliter',
  gpm: 'gallon/minute',
  a: 'julianyear',
};
const AFFINE: Readonly<Record<string, string>> = {
  degC: 'tempC(20)',
  degF: 'tempF(20)',
  'kPa(g)': '20 kPa + 1 atm',
  'bar(g)': '20 bar + 1 atm',
  'psi(g)': '20 psi + 1 atm',
};

function gnuText(unit: string): string {
  return unit.replace(/m2|s-1|[A-Za-z][A-Za-z0-9]*/g, (name) =>
    Object.hasOwn(GNU_NAMES, name) ? `(${GNU_NAMES[name] ?? ''})` : name,
  );
}

function reading(text: string): Unit {
  const read = readUnit(text);
  if (!read.ok) throw new Error(read.reason);
  return read.unit;
}

const TEXTS = [...new Set([...OFFERED, ...MORE])];
let theirs: number[] = [];

beforeAll(() => {
  const lines = TEXTS.flatMap((text) => {
    const { dimension, angular } = reading(text);
    const base = dimensionText(dimension);
    // GNU units keeps the radian as a unit of its own.
    return [AFFINE[text] ?? `20 ${gnuText(text)}`, angular ? `radian (${base})` : base];
  });
  const run = spawnSync('units', ['--terse', '--quiet', '--digits', '15'], {
    input: `${lines.join('\n')}\n`,
    encoding: 'utf8',
    env: { ...process.env, LC_ALL: 'C.UTF-8' },
  });
  if (run.error)
    throw new Error('These tests need GNU units as their reference: install the Debian package "units".');
  theirs = run.stdout.trim().split('\n').map(Number);
});

describe('units against GNU units', () => {
  test('there is an answer for each unit', () => {
    expect(theirs).toHaveLength(TEXTS.length);
    expect(TEXTS.length).toBeGreaterThan(150);
  });

  test.each(TEXTS.map((text, i) => [text, i] as const))('20 %s', (text, i) => {
    const found = toSI(20, reading(text));
    const expected = theirs[i] ?? Number.NaN;
    expect(Math.abs(found / expected - 1)).toBeLessThan(1e-9);
  });
});
