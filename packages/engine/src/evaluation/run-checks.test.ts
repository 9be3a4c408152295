import { describe, expect, test } from 'vitest';
import type { WorkedCheck } from '../sheet/common-schema.js';
import {
  aSheet,
  compiled,
  compiledEquation,
  idealDensity,
  LIBRARY,
  straightViscosity,
} from '../testing/a-sheet.js';
import { propertyValue, runChecks, runPropertyChecks } from './run-checks.js';

const check = (change: Partial<WorkedCheck>): WorkedCheck => ({
  title: 'A check',
  kind: 'computed',
  inputs: { Re: { value: 10000 }, Sc: { value: 1 } },
  expected: { Sh: { value: 48 } },
  tolerancePercent: 1,
  ...change,
});
const report = (change: Partial<WorkedCheck>) =>
  runChecks(compiled(aSheet({ checks: [check(change)] })), LIBRARY)[0];
/** 0.023 × 10 000^0.83 = 0.023 × 10^3.32 = 0.023 × 2089.296. */
const SH = 48.05381;

describe('worked checks of a sheet', () => {
  test('compare within the tolerance, both ways', () => {
    expect(report({ expected: { Sh: { value: SH } }, tolerancePercent: 0.01 })).toMatchObject({
      passed: true,
      problems: [],
      findings: [],
    });
    expect(report({ expected: { Sh: { value: SH * 1.02 } } })?.passed).toBe(false);
    expect(report({ expected: { Sh: { value: SH * 0.98 } } })?.passed).toBe(false);
    expect(report({ expected: { Sh: { value: SH * 1.009 } } })?.passed).toBe(true);
  });

  test('say what was found, in the unit that was expected', () => {
    const found = report({
      inputs: { Re: { value: 10000 }, Sc: { value: 1 }, D: { value: 2.5e-5 }, d: { value: 1, unit: 'in' } },
      expected: { k_g: { value: 17000, unit: 'cm/h' }, Sh: { value: 50 } },
    });
    const k = (SH * 2.5e-5) / 0.0254;
    expect(found?.values[0]).toMatchObject({ symbol: 'k_g', expected: 17000, unit: 'cm/h' });
    expect((found?.values[0]?.found ?? 0) / (k * 360000)).toBeCloseTo(1, 4);
    expect(found?.values[0]?.deviationPercent).toBeCloseTo(((k * 360000) / 17000 - 1) * 100, 1);
    expect(found?.values[1]?.deviationPercent).toBeCloseTo((SH / 50 - 1) * 100, 1);
    expect(found?.values[1]?.unit).toBe('1');
  });

  test('outside a bound a check still runs, and the finding is told', () => {
    const found = report({
      inputs: { Re: { value: 1000 }, Sc: { value: 1 } },
      expected: { Sh: { value: 0.023 * 1000 ** 0.83 } },
    });
    expect(found?.passed).toBe(true);
    expect(found?.findings).toEqual([
      expect.objectContaining({ symbol: 'Re', kind: 'outside', nature: 'regime' }),
    ]);
  });

  test.each<[string, Partial<WorkedCheck>, string]>([
    [
      'an input of another dimension',
      { inputs: { Re: { value: 1, unit: 'm' }, Sc: { value: 1 } } },
      'inputs.Re',
    ],
    ['an equation that is not there', { equations: { rho: 'nobodys' } }, 'equations.rho'],
    ['a row that is not there', { rows: { packing: 'ring' } }, 'rows.packing'],
    ['an input too few', { inputs: { Re: { value: 10000 } } }, 'Sh'],
  ])('%s fails the check with the problem', (_what, change, field) => {
    const found = report(change);
    expect(found).toMatchObject({
      passed: false,
      values: [{ symbol: 'Sh', found: null, deviationPercent: null }],
    });
    expect(found?.problems.map((problem) => problem.field)).toContain(field);
  });

  test('an expected zero is met by zero only', () => {
    const zero = aSheet({
      groups: [...aSheet().groups, { symbol: 'Z', name: 'Nothing', expression: 'Re - Re' }],
      checks: [check({ expected: { Z: { value: 0 }, Re: { value: 0 } } })],
    });
    expect(runChecks(compiled(zero), LIBRARY)[0]?.values.map(({ passed }) => passed)).toEqual([true, false]);
  });

  test('every check is reported, in order', () => {
    const sheet = compiled(
      aSheet({ checks: [check({ title: 'one' }), check({ title: 'two', tolerancePercent: 0.001 })] }),
    );
    expect(runChecks(sheet, LIBRARY).map(({ title, passed }) => [title, passed])).toEqual([
      ['one', true],
      ['two', false],
    ]);
  });
});

describe('property equations', () => {
  const density = compiledEquation('ideal-density', idealDensity());

  test('their checks run without a sheet', () => {
    expect(runPropertyChecks(density)[0]).toMatchObject({
      passed: true,
      values: [{ symbol: 'value', unit: 'kg/m^3' }],
    });
    expect(runPropertyChecks(compiledEquation('v', straightViscosity()))[0]?.passed).toBe(true);
  });

  test('a value comes in the unit of the equation, with its findings', () => {
    const found = propertyValue(compiledEquation('v', straightViscosity()), {
      inputs: { t: { value: 298.15, unit: 'K' } },
    });
    expect(found.value).toBeCloseTo(18.4, 10);
    const outside = propertyValue(density, {
      inputs: { T: { value: 430 }, P: { value: 1, unit: 'atm' } },
      rows: { gas: 'air' },
    });
    expect(outside.value).toBeCloseTo((101325 * 0.0289647) / (8.314462618 * 430), 10);
    expect('findings' in outside && outside.findings[0]).toMatchObject({ symbol: 'T', kind: 'outside' });
  });

  test.each([
    ['a unit that does not fit', { T: { value: 1, unit: 'm' } }, 'inputs.T'],
    ['what is missing', {}, 'value'],
  ])('%s is a problem', (_what, inputs, field) => {
    const found = propertyValue(density, { inputs });
    expect(found.value).toBeNull();
    expect('problems' in found && found.problems.map((problem) => problem.field)).toContain(field);
  });
});
