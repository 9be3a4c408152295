import { citationKey, sameWork, type CslItem, type Likeness } from '@merestone/engine';
import type { SubjectKind } from '../revisions/revision-record.js';

export interface CitingSheetItems {
  readonly kind: SubjectKind;
  readonly slug: string;
  readonly title: string;
  readonly items: readonly CslItem[];
}

/** A sheet that cites what was read already. */
export interface CitedBy {
  /** Index of what was read. */
  readonly item: number;
  readonly kind: SubjectKind;
  readonly slug: string;
  readonly title: string;
  readonly by: Likeness;
}

/** Which sheets cite any of the items already, each sheet once an item. */
export function citedBy(items: readonly CslItem[], sheets: readonly CitingSheetItems[]): CitedBy[] {
  const keyed = sheets.map(({ items: cited, ...sheet }) => ({ sheet, keys: cited.map(citationKey) }));
  return items.flatMap((item, index) => {
    const key = citationKey(item);
    return keyed.flatMap(({ sheet, keys }) => {
      const by = keys.map((other) => sameWork(key, other)).find((likeness) => likeness !== undefined);
      return by === undefined ? [] : [{ item: index, ...sheet, by }];
    });
  });
}
