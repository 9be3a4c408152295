import type { ReactNode } from 'react';
import { idsFor } from '../model/field-id';
import { sectionId, sectionOf } from '../model/sections';

type FieldLinkProps = { children: ReactNode } & ({ path: string } | { id: string });

/** Leads to the field for a place in the definition; where it has none on show, to its row or section. */
export function FieldLink(props: FieldLinkProps) {
  const ids = 'id' in props ? [props.id] : [...idsFor(props.path), sectionId(sectionOf(props.path))];
  return (
    <a
      href={`#${ids[0] ?? ''}`}
      onClick={(event) => {
        event.preventDefault();
        goToFirst(ids);
      }}
    >
      {props.children}
    </a>
  );
}

/** Focuses the first of the ids that the page has, unfolding what hides it. */
export function goToFirst(ids: readonly string[]): void {
  const target = ids.map((id) => document.getElementById(id)).find((element) => element !== null);
  if (!target) return;
  for (let fold = target.closest('details'); fold; fold = fold.parentElement?.closest('details') ?? null)
    fold.open = true;
  target.focus({ preventScroll: true });
  target.scrollIntoView({ block: 'center' });
}
