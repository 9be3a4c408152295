import { describe, expect, it } from 'vitest';
import { parseTypedNumber, typedValue } from './parse-typed-number';

describe('numbers that are read', () => {
  it.each([
    ['0.05', 0.05],
    ['3.20', 3.2],
    ['1e-7', 1e-7],
    ['1E-7', 1e-7],
    ['1.e3', 1000],
    ['.5', 0.5],
    ['5.', 5],
    ['+5', 5],
    ['-40', -40],
    ['\u221240', -40],
    ['0', 0],
    ['0.000', 0],
    ['0e5', 0],
    ['007', 7],
    [' 2 000', 2000],
    ['2\u2009000', 2000],
    ['2\u202f000.5', 2000.5],
    ['101\u00a0325', 101325],
    ["101'325", 101325],
    ['0.000 018 1', 0.0000181],
    ['1.2×10⁻⁵', 1.2e-5],
    ['1.2 × 10^-5', 1.2e-5],
    ['1.2·10^3', 1200],
    ['1.2x10^3', 1200],
    ['2.5 x 10⁴', 25000],
    ['1e308', 1e308],
    ['5e-324', 5e-324],
  ])('%j is %d', (typed, value) => {
    expect(parseTypedNumber(typed)).toEqual({ kind: 'number', value });
  });
});

describe('nothing typed', () => {
  it.each(['', ' ', '\u2009', '\t'])('%j is empty', (typed) => {
    expect(parseTypedNumber(typed)).toEqual({ kind: 'empty' });
  });
});

describe('a comma is asked about', () => {
  it.each([
    ['1,5', ['1.5']],
    ['-1,5', ['-1.5']],
    [',5', ['0.5']],
    ['0,050', ['0.05']],
    ['1,500', ['1.5', '1500']],
    ['12,345', ['12.345', '12345']],
    ['1,500e3', ['1.500e3', '1500e3']],
    ['1,500,000', ['1500000']],
    ['1,234.5', ['1234.5']],
    ['1.234,5', ['1234.5']],
    ['1,2e-5', ['1.2e-5']],
    ['2 000,5', ['2 000.5']],
  ])('%j could be %j', (typed, texts) => {
    const parsed = parseTypedNumber(typed);
    expect(parsed.kind).toBe('ask');
    expect(parsed.kind === 'ask' ? parsed.readings.map((r) => r.text) : []).toEqual(texts);
    expect(typedValue(typed)).toBeNull();
  });

  it('each reading is read back as the value it stands for', () => {
    const parsed = parseTypedNumber('1,500');
    const readings = parsed.kind === 'ask' ? parsed.readings : [];
    expect(readings.map((r) => typedValue(r.text))).toEqual([1.5, 1500]);
  });
});

describe('refused with a sentence', () => {
  it.each([
    ['NaN', 'is not a number'],
    ['null', 'is not a number'],
    ['Infinity', 'must be finite'],
    ['-inf', 'must be finite'],
    ['∞', 'must be finite'],
    ['0x1F', 'decimal digits'],
    ['0b101', 'decimal digits'],
    ['1e400', 'larger than any number'],
    ['1e-400', 'too small'],
    ['1e', 'power of ten'],
    ['1e5e5', 'not read|power of ten'],
    ['--5', 'not read'],
    ['1_000', 'not read'],
    ['1.2.3', 'not read'],
    ['.', 'not read'],
    ['-', 'not read'],
    ['e5', 'not read'],
    ['5 5', 'groups of three'],
    ['2 00', 'groups of three'],
    ['12 m/s', 'unit is chosen'],
    ['25°C', 'unit is chosen'],
    ['5 %', 'unit is chosen'],
    ['1,5,5', 'commas cannot be read'],
    [',', 'commas cannot be read'],
    ['１２', 'not read'],
    ['١٢', 'not read'],
    ['=1+1', 'not read'],
    ['<b>1</b>', 'not read'],
    ['__proto__', 'not read'],
    ['9'.repeat(61), 'more than 60'],
  ])('%j', (typed, words) => {
    const parsed = parseTypedNumber(typed);
    expect(parsed.kind).toBe('refused');
    expect(parsed.kind === 'refused' ? parsed.message : '').toMatch(new RegExp(words));
  });
});
