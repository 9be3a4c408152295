import { ApiProblem } from '../common/problem.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

/** Throws `stale` when somebody speaks of a content that is no longer the present one. */
export function assertCurrent(record: RevisionRecord, hash: string | undefined): void {
  if (hash === undefined || hash === record.hash) return;
  throw new ApiProblem('stale', 'The content was changed in the meantime. Load it again before you sign.');
}
