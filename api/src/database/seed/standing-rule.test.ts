import { describe, expect, test } from 'vitest';
import type { Bound, CorrelationDefinition } from '@merestone/engine';
import { gasDensity, tubeSheet } from '../../../test/support/sheets.js';
import { correlationStanding, propertyEquationStanding } from './standing-rule.js';

const bound = (on: string, basis: Bound['basis'], limited = true): Bound => ({
  on,
  basis,
  stretches: limited ? [{ lo: { value: 1, nature: 'data' } }] : [],
});
const standingWith = (bounds: Bound[], overrides: Partial<CorrelationDefinition> = {}) =>
  correlationStanding(tubeSheet({ bounds, ...overrides }));

describe('a sheet starts approved', () => {
  test.each<[string, Bound[]]>([
    ['with limits from the source', [bound('Re', 'stated')]],
    ['with limits from a handbook', [bound('Re', 'handbook')]],
    ['with nothing on record for another symbol', [bound('Re', 'handbook'), bound('d', 'none', false)]],
    [
      'with habit on a symbol that the formula does not stand on',
      [bound('Re', 'stated'), bound('d', 'common-practice')],
    ],
  ])('%s', (_name, bounds) => {
    expect(standingWith(bounds)).toEqual({ standing: 'approved' });
  });
});

describe('a sheet starts in review and says why', () => {
  test('from memory, whatever its bounds', () => {
    const verification = { status: 'from-memory' as const, note: 'Look up the paper.' };
    expect(standingWith([bound('Re', 'stated')], { verification })).toMatchObject({
      standing: 'in review',
      reason: expect.stringMatching(/from memory.*Look up the paper\./) as string,
    });
  });

  test('without any founded limit', () => {
    expect(standingWith([bound('Re', 'none', false)])).toMatchObject({
      standing: 'in review',
      reason: expect.stringContaining('No limit') as string,
    });
  });

  test('with limits of habit on what the formula stands on, also through an intermediate step', () => {
    const intermediates = [{ symbol: 'f', name: 'Factor', unit: '1', expression: 'Re^0.2' }];
    const [part] = tubeSheet().parts;
    const parts = part ? [{ ...part, result: { ...part.result, expression: 'f*2' } }] : [];
    const bounds = [bound('d', 'handbook'), bound('Re', 'common-practice')];
    expect(standingWith(bounds)).toMatchObject({ reason: expect.stringContaining('Re') as string });
    expect(standingWith(bounds, { intermediates, parts })).toMatchObject({ standing: 'in review' });
  });
});

describe('a property equation', () => {
  const verification = { status: 'from-memory' as const, note: 'Look it up.' };

  test('is approved where it was seen', () => {
    expect(propertyEquationStanding(gasDensity())).toEqual({ standing: 'approved' });
  });

  test('from memory is approved where it reproduces a published value, else not', () => {
    const [check] = gasDensity().checks;
    const published = check ? [{ ...check, kind: 'published' as const }] : [];
    expect(propertyEquationStanding(gasDensity({ verification, checks: published }))).toEqual({
      standing: 'approved',
    });
    expect(propertyEquationStanding(gasDensity({ verification }))).toMatchObject({ standing: 'in review' });
  });
});
