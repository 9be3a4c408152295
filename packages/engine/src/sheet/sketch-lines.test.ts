import { expect, test } from 'vitest';
import { sketchLines, type SketchLine } from './sketch-lines.js';

const QUANTITIES = [
  { symbol: 'rho', unit: 'kg/m^3' },
  { symbol: 'u', unit: 'm/s' },
  { symbol: 'd', unit: 'mm' },
  { symbol: 'mu', unit: 'Pa s' },
  { symbol: 'x', unit: '' },
];

function sketched(line: Partial<SketchLine>, others: SketchLine[] = []) {
  const [sketch] = sketchLines(QUANTITIES, [
    { path: 'groups[0]', symbol: 'Re', unit: '1', expression: 'rho*u*d/mu', ...line },
    ...others,
  ]);
  return sketch!;
}

test('a group that closes says so, whatever multiples its units are', () => {
  expect(sketched({})).toEqual({
    path: 'groups[0]',
    symbolTex: '\\mathrm{Re}',
    tex: '\\frac{\\rho \\, u \\, d}{\\mu}',
    fault: null,
    unknown: [],
    dimension: { state: 'closes' },
  });
});

test('what is left over is named', () => {
  expect(sketched({ expression: 'rho*u*d^2/mu' }).dimension).toEqual({ state: 'open', leftOver: 'm' });
  expect(sketched({ expression: 'rho*u' }).dimension).toEqual({ state: 'open', leftOver: 'kg/(m^2 s)' });
  expect(sketched({ symbol: 'w', unit: 'm', expression: 'd*u' }).dimension).toEqual({
    state: 'open',
    leftOver: 'm/s',
  });
});

test('a sum of unlike things is wrong in itself', () => {
  expect(sketched({ expression: '(rho+u)/mu' }).dimension).toEqual({
    state: 'wrong',
    reason: 'm/s is added to kg/m^3',
  });
});

test('nothing is claimed of what is not known yet', () => {
  expect(sketched({ expression: 'rho*u*q/mu' })).toMatchObject({
    unknown: ['q'],
    dimension: { state: 'not-proved', reason: 'no unit is known of q' },
  });
  expect(sketched({ expression: 'x' }).dimension).toMatchObject({ state: 'not-proved' });
  expect(sketched({ unit: 'furlongs' }).dimension).toMatchObject({ state: 'not-proved' });
  expect(sketched({ expression: '' })).toMatchObject({ tex: null, fault: null });
  expect(sketched({ expression: 'rho*u', dimensional: true }).dimension).toEqual({
    state: 'not-proved',
    reason: 'a dimensional formula is taken at its word',
  });
});

test('a text that is no expression is told with its place', () => {
  expect(sketched({ expression: 'rho*u*/mu' })).toMatchObject({ tex: null, fault: { at: 7 } });
});

test('other lines count with the unit that they claim, and with their own letters', () => {
  const area = { path: 'intermediates[0]', symbol: 'A', unit: 'm^2', tex: 'A_{w}', expression: 'd^2' };
  expect(sketched({ expression: 'A/d^2' }, [area])).toMatchObject({
    tex: '\\frac{A_{w}}{{d}^{2}}',
    dimension: { state: 'closes' },
  });
});

test('a line without a symbol so far is set with an empty box', () => {
  expect(sketched({ symbol: '' }).symbolTex).toBe('\\square');
});
