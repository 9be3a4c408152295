import { sql, type SQL } from 'drizzle-orm';
import type { Standing } from '../common/standing.js';
import { revisionNow } from './schema/revision.js';

/**
 * What `revision_now` comes to at a moment, in ISO 8601. Only an approved revision changes with the time alone: it is
 * in force from its effective date on, until a later one is.
 */
export function standingAt(now: string): SQL<Standing> {
  return sql<Standing>`CASE WHEN ${superseded(now)} THEN 'superseded' ELSE ${revisionNow.standing} END`;
}

/** When it got that standing. */
export function standingSince(now: string): SQL<string> {
  return sql<string>`CASE WHEN ${superseded(now)} THEN ${revisionNow.supersededFrom} ELSE ${revisionNow.standingAt} END`;
}

/** What was said about that standing. */
export function standingNoteAt(now: string): SQL<string | null> {
  return sql<string | null>`CASE WHEN ${superseded(now)}
    THEN 'Superseded by revision ' || ${revisionNow.supersededBy} || '.' ELSE ${revisionNow.standingNote} END`;
}

/** 1 for the revision of a subject that is used: approved, and its effective date has come. */
export function inForceAt(now: string): SQL<number> {
  return sql<number>`(${revisionNow.standing} = 'approved' AND ${revisionNow.effectiveFrom} <= ${now}
    AND NOT ${superseded(now)})`;
}

/** 1 where a later revision has taken its place and nobody wrote that down yet. */
export function superseded(now: string): SQL<number> {
  return sql<number>`(${revisionNow.standing} = 'approved' AND ${revisionNow.supersededFrom} IS NOT NULL
    AND ${revisionNow.supersededFrom} <= ${now})`;
}
