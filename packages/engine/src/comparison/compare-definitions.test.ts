import { describe, expect, it } from 'vitest';
import { aSheet } from '../testing/a-sheet.js';
import { compareDefinitions } from './compare-definitions.js';

describe('compareDefinitions', () => {
  it('finds nothing between a definition and itself, nor when named members only change places', () => {
    const sheet = aSheet();
    expect(compareDefinitions(sheet, structuredClone(sheet))).toEqual([]);
    expect(compareDefinitions(sheet, { ...sheet, groups: [...sheet.groups].reverse() })).toEqual([]);
  });

  it('names a changed limit by the symbol it stands on', () => {
    const after = structuredClone(aSheet());
    const hi = after.bounds[0]?.stretches[0]?.hi;
    if (hi) hi.value = 40_000;
    expect(compareDefinitions(aSheet(), after)).toEqual([
      {
        path: 'bounds[Re].stretches[0].hi.value',
        section: 'bounds',
        change: 'changed',
        before: 35_000,
        after: 40_000,
      },
    ]);
  });

  it('tells added from removed', () => {
    const group = { symbol: 'Pe', name: 'Péclet number', expression: 'Re*Sc' };
    const more = { ...aSheet(), groups: [...aSheet().groups, group], cautions: ['Mind the film.'] };
    expect(compareDefinitions(aSheet(), more).map(({ path, change }) => `${change} ${path}`)).toEqual([
      'added groups[Pe]',
      'added cautions[0]',
    ]);
    expect(compareDefinitions(more, aSheet()).map(({ change }) => change)).toEqual(['removed', 'removed']);
  });

  it('sees a changed exponent', () => {
    const after = structuredClone(aSheet());
    const part = after.parts[0];
    if (part) part.result.expression = '0.023*Re^0.8*Sc^0.44';
    expect(compareDefinitions(aSheet(), after)).toMatchObject([
      {
        path: 'parts[gas-side].result.expression',
        before: '0.023*Re^0.83*Sc^0.44',
        after: '0.023*Re^0.8*Sc^0.44',
      },
    ]);
  });
});
