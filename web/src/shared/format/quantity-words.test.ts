import { describe, expect, it } from 'vitest';
import { lowerFirst } from './lower-first';
import { coefficientTitle } from './part-words';
import { quantityWords } from './quantity-words';

describe('the words for a quantity', () => {
  it.each([
    [{ is: 'gas-density', at: 'bulk' }, 'Gas density, in the bulk'],
    [{ is: 'gas-viscosity', at: 'film' }, 'Gas viscosity, at film conditions'],
    [{ is: 'interface-temperature', at: 'interface' }, 'Temperature of the phase boundary'],
    [
      { is: 'partial-pressure-bulk', at: 'bulk' },
      'Partial pressure of the transferred species in the bulk gas',
    ],
    [{ is: 'total-pressure' }, 'Total pressure'],
  ] as const)('say once where it is taken', (quantity, words) => {
    expect(quantityWords(quantity)).toBe(words);
  });
});

describe('words inside a sentence', () => {
  it.each([
    ['Gas temperature, in the bulk', 'gas temperature, in the bulk'],
    ['Log-mean partial pressure', 'log-mean partial pressure'],
    ['Reynolds number', 'Reynolds number'],
    ['D·µ/T stays constant', 'D·µ/T stays constant'],
    ['A tabulated value', 'a tabulated value'],
  ])('%s', (text, inside) => {
    expect(lowerFirst(text)).toBe(inside);
  });

  it('call a coefficient one once', () => {
    expect(coefficientTitle({ title: 'Gas-side coefficient' })).toBe('Gas-side coefficient');
    expect(coefficientTitle({ title: 'Gas side, per wetted area' })).toBe(
      'Gas side, per wetted area: coefficient',
    );
  });
});
