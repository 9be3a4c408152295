import type { Sheet } from '../../../shared/api/types';
import { fetchRevision, fetchSheet } from './draft-sheets';

/** What the register has for somebody who wants to revise a sheet. */
export interface RevisionOpening {
  /** The sheet in use, or the latest: what the next revision starts from. */
  sheet: Sheet;
  /** The revision that is still being worked on; null where the next one has to be opened first. */
  open: Sheet | null;
}

const WORKED_ON = new Set<Sheet['standing']>(['draft', 'in review']);

export async function fetchRevisionOpening(slug: string): Promise<RevisionOpening> {
  const sheet = await fetchSheet(slug);
  if (WORKED_ON.has(sheet.standing)) return { sheet, open: sheet };
  const open = sheet.revisions.find(({ standing }) => WORKED_ON.has(standing));
  return { sheet, open: open ? await fetchRevision(slug, open.number) : null };
}
