import { describe, expect, test } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { changeDraft, type DraftChange, type DraftState } from './change-draft';
import { emptyForm, emptyGroup } from './empty-rows';
import { formOfDefinition } from './form-of-definition';

const full = (): DraftState => ({ form: formOfDefinition(gillilandSherwood, 'sample'), removed: null });
const after = (state: DraftState, ...changes: DraftChange[]) => changes.reduce(changeDraft, state);
const symbols = ({ form }: DraftState) => form.groups.map(({ symbol }) => symbol);

describe('rows', () => {
  test('one is edited, the others stay the very same', () => {
    const before = full();
    const state = after(before, { do: 'edit-row', list: 'groups', at: 1, patch: { symbol: 'Sc_G' } });
    expect(symbols(state)).toEqual(['Re', 'Sc_G']);
    expect(state.form.groups[0]).toBe(before.form.groups[0]);
    expect(state.form.quantities).toBe(before.form.quantities);
  });

  test('one is added in its place', () => {
    const row = { ...emptyGroup(), symbol: 'We' };
    expect(symbols(after(full(), { do: 'add-row', list: 'groups', at: 1, row }))).toEqual(['Re', 'We', 'Sc']);
    expect(symbols(after(full(), { do: 'add-row', list: 'groups', row }))).toEqual(['Re', 'Sc', 'We']);
  });

  test('one is moved, and not past the ends', () => {
    expect(symbols(after(full(), { do: 'move-row', list: 'groups', at: 0, by: 1 }))).toEqual(['Sc', 'Re']);
    expect(symbols(after(full(), { do: 'move-row', list: 'groups', at: 0, by: -1 }))).toEqual(['Re', 'Sc']);
    expect(symbols(after(full(), { do: 'move-row', list: 'groups', at: 7, by: 1 }))).toEqual(['Re', 'Sc']);
  });

  test('one that was removed comes back to its place, whatever was typed since', () => {
    const state = after(
      full(),
      { do: 'remove-row', list: 'groups', at: 0 },
      { do: 'edit-row', list: 'groups', at: 0, patch: { name: 'Another' } },
    );
    expect(symbols(state)).toEqual(['Sc']);
    const back = after(state, { do: 'put-back' });
    expect(symbols(back)).toEqual(['Re', 'Sc']);
    expect(back.form.groups[1]?.name).toBe('Another');
    expect(back.removed).toBeNull();
    expect(after(back, { do: 'put-back' })).toBe(back);
  });

  test('removing what is not there changes nothing', () => {
    const state = full();
    expect(after(state, { do: 'remove-row', list: 'groups', at: 9 })).toBe(state);
  });
});

describe('the name in the register', () => {
  const title = (text: string): DraftChange => ({ do: 'edit-head', patch: { title: text } });

  test('follows the title until somebody writes it', () => {
    const state = after({ form: emptyForm(), removed: null }, title('Pipe, laminar (Lévêque)'));
    expect(state.form.slug).toBe('pipe-laminar-leveque');
    const typed = after(state, { do: 'name-slug', slug: 'leveque' }, title('Something else'));
    expect(typed.form.slug).toBe('leveque');
  });

  test('does not grow past 80 characters, and ends with a whole word', () => {
    const { form } = after({ form: emptyForm(), removed: null }, title('turbulent flow '.repeat(12)));
    expect(form.slug.length).toBeLessThanOrEqual(80);
    expect(form.slug).toMatch(/(turbulent|flow)$/);
  });
});
