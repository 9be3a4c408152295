import { compilePropertyEquation, type PropertyLibrary } from '@merestone/engine';
import { describe, expect, test } from 'vitest';
import { gillilandSherwood, idealGasDryAir } from '../../../shared/samples/gilliland-sherwood';
import type { DraftForm } from './draft-form';
import { verdictOn } from './draft-verdict';
import { emptyForm, emptyQuantity } from './empty-rows';
import { formOfDefinition } from './form-of-definition';

const air = compilePropertyEquation('ideal-gas-dry-air', idealGasDryAir);
const library: PropertyLibrary = () => (air.ok ? air.compiled : undefined);
const form = (changes: Partial<DraftForm> = {}): DraftForm => ({
  ...formOfDefinition(gillilandSherwood, 'sample'),
  ...changes,
});

describe('the verdict on a draft', () => {
  test('a whole sheet comes with the report that a submission would get', () => {
    const verdict = verdictOn(form(), library);
    expect(verdict.definition).toEqual(gillilandSherwood);
    expect(verdict.wrong).toEqual([]);
    expect(verdict.report?.passed).toBe(true);
    expect(verdict.working.checks.get(0)?.passed).toBe(true);
  });

  test('an empty form has open places only, and no word of the schema', () => {
    const verdict = verdictOn(emptyForm(), library);
    expect(verdict.definition).toBeNull();
    expect(verdict.empty.length).toBeGreaterThan(10);
    expect(verdict.wrong).toEqual([]);
    expect(verdict.working.compiled).toBeNull();
  });

  test('a group that does not close is told at its field', () => {
    const [re, ...others] = form().groups;
    const verdict = verdictOn(form({ groups: [{ ...re!, expression: 'rho*u*d^2/mu' }, ...others] }), library);
    expect(verdict.wrong).toEqual([
      {
        code: 'dimension',
        field: 'groups[0].expression',
        message: 'Re is not dimensionless: m is left over.',
      },
    ]);
  });

  test('a fault of form is said the way the form speaks', () => {
    const [first, ...others] = form().quantities;
    const quantities = [{ ...first!, symbol: 'rho-1' }, ...others];
    expect(verdictOn(form({ quantities }), library).wrong).toEqual([
      expect.objectContaining({
        field: 'quantities[0].symbol',
        message: expect.stringMatching(/^A symbol is letters and digits/) as string,
      }),
    ]);
    expect(verdictOn(form({ checks: [] }), library).wrong).toEqual([
      expect.objectContaining({ field: 'checks', message: 'A sheet has one worked check at least.' }),
    ]);
  });

  test('the mathematics run while title, sources and a new row are still missing', () => {
    const bare = emptyForm();
    const unfinished = form({
      head: bare.head,
      sources: bare.sources,
      verification: bare.verification,
      bounds: [],
      quantities: [...form().quantities, { ...emptyQuantity(), symbol: 'q' }],
    });
    const verdict = verdictOn(unfinished, library);
    expect(verdict.definition).toBeNull();
    expect(verdict.working.compiled).not.toBeNull();
    expect(verdict.working.checks.get(0)?.passed).toBe(true);
  });

  test('a check that is half written is left out, the other keeps its place', () => {
    const [first] = form().checks;
    const checks = [{ ...first!, expected: [{ symbol: 'Sh', value: '', unit: '' }] }, first!];
    const { working } = verdictOn(form({ checks }), library);
    expect([...working.checks.keys()]).toEqual([1]);
    expect(working.checks.get(1)?.passed).toBe(true);
  });
});
