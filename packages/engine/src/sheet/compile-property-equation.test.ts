import { describe, expect, test } from 'vitest';
import type { Problem } from '../evaluation/outcome.js';
import { compiledEquation, idealDensity, straightViscosity } from '../testing/a-sheet.js';
import { compilePropertyEquation } from './compile-sheet.js';
import type { PropertyEquationDefinition } from './definition.js';

function equationProblems(changes: Partial<PropertyEquationDefinition>): Problem[] {
  const result = compilePropertyEquation('test', idealDensity(changes));
  return result.ok ? [] : result.problems;
}

describe('property equations', () => {
  test('compile, and take their fields at the top of the definition', () => {
    expect(compiledEquation('ideal-density', idealDensity()).sheet.answers).toEqual(['value']);
    expect(compiledEquation('straight-viscosity', straightViscosity()).sheet.answers).toEqual(['value']);
  });

  test.each<[string, Partial<PropertyEquationDefinition>, string, string]>([
    ['an unknown unit', { unit: 'smoot' }, 'unit', '"smoot" is not a unit we know.'],
    [
      'a unit that does not come out',
      { expression: 'P/(R*T)' },
      'expression',
      'value should be in kg/m^3 but comes out in mol/m^3: mol/kg is left over.',
    ],
    [
      'a unit that the quantity cannot have',
      { gives: 'gas-viscosity' },
      'unit',
      'gas-viscosity is in Pa s; "kg/m^3" does not fit.',
    ],
    [
      'a quantity that is not in the dictionary',
      { gives: 'toString' },
      'gives',
      '"toString" is not in the quantity dictionary.',
    ],
    ['an unknown symbol', { expression: 'P*M/(R*x)' }, 'expression', 'There is no symbol x at character 8.'],
    [
      'an answer defined by itself',
      { expression: 'value' },
      'expression',
      'The definitions go in a circle: value → value.',
    ],
    [
      'pieces that overlap',
      {
        expression: undefined,
        pieces: [
          { when: [{ on: 'T', hi: 300 }], expression: 'P*M/(R*T)' },
          { when: [{ on: 'T', lo: 200 }], expression: 'P*M/(R*T)' },
        ],
      },
      'pieces[1].when',
      'Pieces 1 and 2 overlap.',
    ],
    [
      'a quantity with the name of the answer',
      { quantities: [...idealDensity().quantities, { symbol: 'value', is: 'gas-density', unit: 'kg/m^3' }] },
      'symbol',
      'value is defined before, at quantities[3].symbol.',
    ],
  ])('%s is refused', (_what, changes, field, message) => {
    expect(equationProblems(changes)).toContainEqual(expect.objectContaining({ field, message }));
  });
});
