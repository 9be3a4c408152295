import { describe, expect, test } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { definitionOfForm } from './definition-of-form';
import type { DraftForm } from './draft-form';
import { emptyBound, emptyForm } from './empty-rows';
import { formOfDefinition } from './form-of-definition';

const form = (changes: Partial<DraftForm> = {}): DraftForm => ({
  ...formOfDefinition(gillilandSherwood, 'sample'),
  ...changes,
});
const problemsOf = (changes: Partial<DraftForm>) => definitionOfForm(form(changes)).problems;

describe('what a form says', () => {
  test('an empty form names what is missing, and nothing as wrong', () => {
    const { problems } = definitionOfForm(emptyForm());
    expect(new Set(problems.map(({ code }) => code))).toEqual(new Set(['empty']));
    expect(problems.map(({ field }) => field)).toEqual(
      expect.arrayContaining(['title', 'authors', 'geometry', 'quantities[0].symbol', 'sources[0].place']),
    );
    expect(problems.map(({ field }) => field)).not.toContain('year');
  });

  test('a comma in a number is asked about at its field, never taken for something', () => {
    const [first] = form().checks;
    const check = { ...first!, tolerancePercent: '0,5' };
    expect(problemsOf({ checks: [check] })).toEqual([
      { field: 'checks[0].tolerancePercent', code: 'unreadable', message: 'Do you mean 0.5?' },
    ]);
  });

  test('a limit without a value is none; a bound of no basis has no stretches', () => {
    const open = { ...emptyBound(), on: 'Re', stretches: emptyBound().stretches };
    open.stretches[0]!.hi.value = '2100';
    const { value } = definitionOfForm(form({ bounds: [open, { ...open, on: 'Sc', basis: 'none' }] }));
    expect(value).toMatchObject({
      bounds: [
        { on: 'Re', stretches: [{ hi: { value: 2100, nature: 'data' } }] },
        { on: 'Sc', stretches: [], basis: 'none' },
      ],
    });
    expect(JSON.stringify(value)).not.toContain('"lo":{');
  });

  test('what stands behind a switch that is off stays typed and is not said', () => {
    const [part] = form().parts;
    const parts = [{ ...part!, coefficient: { ...part!.coefficient, present: false } }];
    expect(definitionOfForm(form({ parts })).value).toMatchObject({ parts: [{ coefficient: null }] });
  });

  test('symbols and units lose the space around them, sentences keep theirs', () => {
    const [first, ...others] = form().quantities;
    const quantities = [{ ...first!, symbol: ' rho ', unit: ' kg/m^3' }, ...others];
    const { value } = definitionOfForm(form({ quantities, head: { ...form().head, summary: ' As is. ' } }));
    expect(value).toMatchObject({
      quantities: [{ symbol: 'rho', unit: 'kg/m^3' }, {}, {}, {}, {}, {}, {}, {}],
    });
    expect(value).toMatchObject({ summary: ' As is. ' });
  });

  test('a value without a symbol is not lost without a word', () => {
    const [first] = form().checks;
    const check = { ...first!, inputs: [{ symbol: '', value: '3', unit: '' }] };
    expect(problemsOf({ checks: [check] })).toEqual([
      { field: 'checks[0].inputs[0].symbol', code: 'empty', message: 'Still empty.' },
    ]);
  });
});
