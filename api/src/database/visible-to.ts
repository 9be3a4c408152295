import { inArray, notInArray, or, sql, type SQL } from 'drizzle-orm';
import { UNAPPROVED } from '../common/standing.js';
import { revisionNow } from './schema/revision.js';

/** What somebody sees of the register besides what everybody sees. */
export interface VisibleTo {
  readonly everything: boolean;
  readonly originators: readonly string[];
}

/** The condition on `revision_now` that leaves out what somebody may not see. */
export function visibleTo({ everything, originators }: VisibleTo): SQL {
  if (everything) return sql`1`;
  const seen = or(
    notInArray(revisionNow.standing, [...UNAPPROVED]),
    inArray(revisionNow.originatorId, [...originators]),
  );
  return seen ?? sql`0`;
}
