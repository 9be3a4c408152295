import { compileCorrelation, type CompiledCorrelation, type CorrelationDefinition } from '@merestone/engine';
import { describe, expect, test } from 'vitest';
import { tubeSheet } from '../../test/support/sheets.js';
import { dutyOf, requestFor } from './duty.js';

function compiled(overrides: Partial<CorrelationDefinition> = {}): CompiledCorrelation {
  const compilation = compileCorrelation(tubeSheet(overrides));
  if (!compilation.ok) throw new Error(JSON.stringify(compilation.problems));
  return compilation.compiled;
}

/** The same quantities under other letters and in other units. */
const OTHER_LETTERS = compiled({
  quantities: [
    { symbol: 'w', is: 'mean-velocity-in-tube', unit: 'cm/s' },
    { symbol: 'D', is: 'tube-inside-diameter', unit: 'mm' },
    { symbol: 'rho_G', is: 'fluid-density', unit: 'kg/m^3', equations: ['test-gas-density'] },
    { symbol: 'mu_G', is: 'gas-viscosity', unit: 'Pa s' },
    { symbol: 'D_G', is: 'gas-diffusivity', unit: 'm^2/s' },
  ],
  groups: [{ symbol: 'Re', name: 'Reynolds number', expression: 'rho_G*w*D/mu_G' }],
  parts: tubeSheet().parts.map((part) => ({ ...part, coefficient: null })),
});

describe('a duty', () => {
  test('goes from one sheet to another by dictionary name, each value with its unit', () => {
    const duty = dutyOf(compiled(), {
      inputs: { u: { value: 2 }, d: { value: 5, unit: 'cm' }, rho: { value: 1.2 } },
    });
    expect(requestFor(OTHER_LETTERS, duty).inputs).toEqual({
      w: { value: 2, unit: 'm/s' },
      D: { value: 5, unit: 'cm' },
      rho_G: { value: 1.2, unit: 'kg/m^3' },
    });
  });

  test('takes a group along where both sheets mean the same by it', () => {
    const duty = dutyOf(compiled(), { inputs: { Re: { value: 400 } } });
    const sameMeaning = compiled({ title: 'Another' });
    expect(requestFor(sameMeaning, duty).inputs).toEqual({ Re: { value: 400 } });
    const other = compiled({ groups: [{ symbol: 'Re', name: 'Reynolds', expression: '2*rho*u*d/mu' }] });
    expect(requestFor(other, duty).inputs).toEqual({});
  });

  test('takes the choice of a property equation along, where the other sheet offers it', () => {
    const duty = dutyOf(compiled(), {
      inputs: { 'rho.T': { value: 300, unit: 'K' } },
      equations: { rho: 'test-gas-density' },
    });
    expect(requestFor(compiled({ title: 'Another' }), duty)).toMatchObject({
      inputs: { 'rho.T': { value: 300, unit: 'K' } },
      equations: { rho: 'test-gas-density' },
    });
    const quantities = tubeSheet().quantities.map(({ equations: _, ...rest }) => rest);
    expect(requestFor(compiled({ quantities }), duty)).toMatchObject({ inputs: {}, equations: {} });
  });
});
