import { describe, expect, test } from 'vitest';
import { draftSheet } from '../testing/draft-server';
import { emptyForm } from './empty-rows';
import { openNew, openRevise } from './opening';
import type { StoredDraft } from './stored-draft';

const kept = (base: StoredDraft['base'], unsaved = true): StoredDraft => ({
  form: { ...emptyForm(), slug: 'old-name', head: { ...emptyForm().head, title: 'Mine' } },
  base,
  unsaved,
  at: '2026-03-04T11:00:00Z',
});

describe('a new sheet', () => {
  test('begins empty, with what was kept, or after a pattern', () => {
    expect(openNew(null, null)).toMatchObject({ storeAs: 'new', form: { slug: '' }, base: null });
    expect(openNew(kept(null), null).form.head.title).toBe('Mine');
    const after = openNew(null, draftSheet());
    expect(after.storeAs).toBe('after:gilliland-sherwood');
    expect(after.form).toMatchObject({
      slug: '',
      head: { title: '' },
      verification: { status: '', note: '' },
    });
    expect(after.form.groups.map(({ symbol }) => symbol)).toEqual(['Re', 'Sc']);
  });
});

describe('a revision', () => {
  const open = draftSheet();

  test('goes on with the draft that the register has', () => {
    expect(openRevise(null, { sheet: open, open })).toMatchObject({
      base: { revision: 3, hash: open.hash },
      saved: true,
      theirs: null,
      nextRevision: 3,
    });
  });

  test('starts from the sheet in use where none is worked on', () => {
    const sheet = draftSheet({ standing: 'approved' });
    expect(openRevise(null, { sheet, open: null })).toMatchObject({
      base: null,
      nextRevision: 4,
      saved: true,
    });
  });

  test('what was kept unsaved comes first, under the name that the register knows', () => {
    const opening = openRevise(kept({ revision: 3, hash: open.hash }), { sheet: open, open });
    expect(opening).toMatchObject({
      form: { slug: 'gilliland-sherwood', head: { title: 'Mine' } },
      saved: false,
      theirs: null,
    });
  });

  test('where the register has moved on, both versions are there', () => {
    const opening = openRevise(kept({ revision: 3, hash: 'of before' }), { sheet: open, open });
    expect(opening.form.head.title).toBe('Mine');
    expect(opening.theirs).toBe(open);
  });

  test('what was kept and is saved gives way to what the register has', () => {
    const opening = openRevise(kept({ revision: 3, hash: 'of before' }, false), { sheet: open, open });
    expect(opening.form.head.title).toBe(open.title);
    expect(opening.theirs).toBeNull();
  });
});
