import type { CorrelationDefinition } from '@merestone/engine';
import type { Sheet, Standing } from '../../../shared/api/types';
import type { RevisionOpening } from '../api/fetch-opening';
import type { DraftForm } from './draft-form';
import { emptyForm } from './empty-rows';
import { formOfDefinition } from './form-of-definition';
import type { DraftBase, StoredDraft } from './stored-draft';

/** What an editor begins with. */
export interface Opening {
  /** A new sheet, or the next content of one that the register has. */
  kind: 'new' | 'revision';
  /** Where this browser keeps it, without the person. */
  storeAs: string;
  form: DraftForm;
  /** The draft in the register that it continues. */
  base: DraftBase | null;
  standing: Standing | null;
  /** The revision number that the next one gets, for words. */
  nextRevision: number;
  /** Whether the form is just as the register has it. */
  saved: boolean;
  /** What the register has in the meantime, where it is not what the kept draft was made on. */
  theirs: Sheet | null;
}

/** A new sheet: what was kept of it, else after a pattern, else empty. */
export function openNew(kept: StoredDraft | null, pattern: Sheet | null): Opening {
  const form = kept?.form ?? (pattern ? formAfter(pattern.definition) : emptyForm());
  return {
    kind: 'new',
    storeAs: newStoreName(pattern?.slug ?? null),
    form,
    base: null,
    standing: null,
    nextRevision: 1,
    saved: false,
    theirs: null,
  };
}

/** The next revision, or the one being worked on; what this browser kept of it goes before what the register has. */
export function openRevise(kept: StoredDraft | null, { sheet, open }: RevisionOpening): Opening {
  const current = open ?? sheet;
  const base = open ? { revision: open.revision, hash: open.hash } : null;
  const fresh = { form: formOfDefinition(current.definition, current.slug), base, saved: true, theirs: null };
  const mine = kept?.unsaved ? kept : null;
  const own =
    mine === null
      ? fresh
      : {
          form: { ...mine.form, slug: current.slug, slugTyped: true },
          base,
          saved: false,
          theirs: open !== null && mine.base?.hash !== open.hash ? open : null,
        };
  return {
    kind: 'revision',
    storeAs: reviseStoreName(sheet.slug),
    standing: open?.standing ?? null,
    nextRevision: open?.revision ?? Math.max(...sheet.revisions.map(({ number }) => number)) + 1,
    ...own,
  };
}

export function newStoreName(pattern: string | null): string {
  return pattern === null ? 'new' : `after:${pattern}`;
}

export function reviseStoreName(slug: string): string {
  return `revise:${slug}`;
}

/** A pattern gives everything but its title and what was said of how it was verified. */
function formAfter(definition: CorrelationDefinition): DraftForm {
  const form = formOfDefinition(definition, '');
  return {
    ...form,
    head: { ...form.head, title: '' },
    verification: { status: '', note: '' },
  };
}
