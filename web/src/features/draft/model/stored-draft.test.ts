import { beforeEach, describe, expect, test } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { definitionOfForm } from './definition-of-form';
import { emptyForm } from './empty-rows';
import { formFromStore } from './form-from-store';
import { formOfDefinition } from './form-of-definition';
import { dropStoredDraft, readStoredDraft, storeDraft } from './stored-draft';

const store = window.localStorage;
const form = formOfDefinition(gillilandSherwood, 'sample');
const draft = { form, base: { revision: 3, hash: 'abc' }, unsaved: true, at: '2026-03-04T11:00:00Z' };

beforeEach(() => store.clear());

describe('a draft kept in the browser', () => {
  test('comes back with everything that was typed, its rows under new names', () => {
    expect(storeDraft(store, 'k', draft)).toBe(true);
    const back = readStoredDraft(store, 'k');
    expect(back).toMatchObject({ base: draft.base, unsaved: true, at: draft.at });
    expect(definitionOfForm(back!.form)).toEqual(definitionOfForm(form));
    const ids = [...form.quantities, ...(back?.form.quantities ?? [])].map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  test('half-typed text survives as well', () => {
    const [first] = form.checks;
    storeDraft(store, 'k', { ...draft, form: { ...form, checks: [{ ...first!, tolerancePercent: '0,' }] } });
    expect(readStoredDraft(store, 'k')?.form.checks[0]?.tolerancePercent).toBe('0,');
  });

  test('is gone once it is dropped', () => {
    storeDraft(store, 'k', draft);
    dropStoredDraft(store, 'k');
    expect(readStoredDraft(store, 'k')).toBeNull();
  });

  test.each([['nothing'], ['{'], ['null'], ['[]'], ['{"form":7}'], ['"text"']])(
    'what is no draft (%s) is none',
    (text) => {
      store.setItem('k', text);
      expect(readStoredDraft(store, 'k')).toBeNull();
    },
  );

  test('a full store is told', () => {
    const full = {
      setItem: () => {
        throw new Error('quota');
      },
    } as unknown as Storage;
    expect(storeDraft(full, 'k', draft)).toBe(false);
  });
});

describe('a form of another shape', () => {
  test('is brought into today’s, whatever stands in it', () => {
    const back = formFromStore({
      head: { title: 'Kept', year: 1934 },
      quantities: [{ symbol: 'u', equations: [1, 'air'] }, null, 'text'],
      bounds: [{ on: 'Re', stretches: 'no list' }],
      sources: [{ kept: 'no citation', title: 'Kept too' }],
      checks: { 0: 'no list' },
      colour: 'red',
    });
    expect(back.head).toMatchObject({ title: 'Kept', year: '' });
    expect(back.quantities.map(({ symbol }) => symbol)).toEqual(['u', '', '']);
    expect(back.quantities[0]?.equations).toEqual(['', 'air']);
    expect(back.bounds[0]?.stretches).toEqual([]);
    expect(back.sources[0]).toMatchObject({ title: 'Kept too', kept: { type: 'article-journal' } });
    expect(back.checks).toEqual([]);
    expect(Object.keys(back)).toEqual(Object.keys(emptyForm()));
    expect(() => definitionOfForm(back)).not.toThrow();
  });
});
