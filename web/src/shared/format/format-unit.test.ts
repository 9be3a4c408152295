import { expect, test } from 'vitest';
import { formatUnit } from './format-unit';
import { symbolParts, symbolText } from './symbol-parts';

test.each([
  ['m/s', 'm/s'],
  ['m^2/s', 'm²/s'],
  ['kg/(m^2 s)', 'kg/(m²\u00a0s)'],
  ['mol/(m^2*s*Pa)', 'mol/(m²·s·Pa)'],
  ['m^-1', 'm⁻¹'],
  ['degC', '°C'],
  ['um', 'µm'],
  ['1', ''],
  ['', ''],
])('%s is set as %s', (unit, set) => {
  expect(formatUnit(unit)).toBe(set);
});

test.each([
  ['mu_w', 'µ', 'w', false],
  ['p_BM', 'p', 'BM', false],
  ['Re', 'Re', null, true],
  ['rho', 'ρ', null, false],
])('%s has its body and subscript told apart', (symbol, body, subscript, upright) => {
  expect(symbolParts(symbol)).toEqual({ body, subscript, upright });
});

test('a symbol in plain text keeps its subscript', () => {
  expect(symbolText('mu_w')).toBe('µ_w');
});
