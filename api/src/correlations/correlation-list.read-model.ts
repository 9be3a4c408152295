import { Injectable } from '@nestjs/common';
import { sql, type SQL } from 'drizzle-orm';
import { Clock } from '../common/clock.js';
import type { Standing } from '../common/standing.js';
import { Connection } from '../database/connection.js';
import { inForceAt, standingAt, standingNoteAt, standingSince } from '../database/standing-at.js';
import { visibleTo, type VisibleTo } from '../database/visible-to.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import type { PageCursor } from './page-cursor.js';

export interface ListFilter {
  /** A full-text query; undefined looks for nothing in particular. */
  readonly match?: string | undefined;
  readonly geometry?: string | undefined;
  readonly phase?: string | undefined;
  readonly standing?: Standing | undefined;
}

export type ListRow = RevisionRecord & { readonly rank: number };
/** SQLite says true with a 1. */
type StoredRow = Omit<ListRow, 'inForce'> & { readonly inForce: number };

export interface Count {
  readonly value: string;
  readonly count: number;
}

/** Weights of title, authors, geometry, summary, symbols, cautions and sources in the ranking. */
const RANK = sql`bm25(register_search, 10.0, 8.0, 6.0, 4.0, 2.0, 1.0, 1.0)`;
const COLUMNS = sql.raw(`
  id, kind, slug, geometry, number, originatorId, createdAt, standing, standingAt, standingNote, iteration, hash,
  title, phase, effectiveFrom, reviewDue, inForce, rank`);

/** The revisions of correlations that somebody sees, each as it stands now. */
const revisionsOf = (sight: VisibleTo, now: string): SQL => sql`
  SELECT id, kind, slug, geometry, number, originator_id AS originatorId, created_at AS createdAt,
    ${standingAt(now)} AS standing, ${standingSince(now)} AS standingAt, ${standingNoteAt(now)} AS standingNote,
    iteration, hash, title, phase, effective_from AS effectiveFrom, review_due AS reviewDue, ${inForceAt(now)} AS inForce
  FROM revision_now WHERE kind = 'correlation' AND ${visibleTo(sight)}`;

/**
 * The register as a list: of each correlation one revision, the one in force or else the latest that the caller sees;
 * with a filter on standing, the latest of that standing.
 */
@Injectable()
export class CorrelationListReadModel {
  constructor(
    private readonly connection: Connection,
    private readonly clock: Clock,
  ) {}

  page(sight: VisibleTo, filter: ListFilter, after: PageCursor | undefined, limit: number): ListRow[] {
    const later =
      after === undefined
        ? sql`1`
        : sql`(rank, title COLLATE NOCASE, slug) > (${after.rank}, ${after.title}, ${after.slug})`;
    const rows = this.connection.reader.all<StoredRow>(sql`
      ${this.found(sight, filter)}
      SELECT ${COLUMNS} FROM found WHERE ${inGeometry(filter)} AND ${inPhase(filter)} AND ${later}
      ORDER BY rank, title COLLATE NOCASE, slug LIMIT ${limit}
    `);
    return rows.map((row) => ({ ...row, inForce: row.inForce === 1 }));
  }

  total(sight: VisibleTo, filter: ListFilter): number {
    const [row] = this.connection.reader.all<{ count: number }>(sql`
      ${this.found(sight, filter)}
      SELECT count(*) AS count FROM found WHERE ${inGeometry(filter)} AND ${inPhase(filter)}
    `);
    return row?.count ?? 0;
  }

  geometries(sight: VisibleTo, filter: ListFilter): Count[] {
    return this.connection.reader.all<Count>(sql`
      ${this.found(sight, filter)}
      SELECT geometry AS value, count(*) AS count FROM found WHERE ${inPhase(filter)} GROUP BY geometry
    `);
  }

  /** A sheet for gas or liquid, or for both, counts for each. */
  phases(sight: VisibleTo, filter: ListFilter): Count[] {
    return this.connection.reader.all<Count>(sql`
      ${this.found(sight, filter)}
      SELECT 'gas' AS value, count(*) AS count FROM found WHERE phase <> 'liquid' AND ${inGeometry(filter)}
      UNION ALL
      SELECT 'liquid', count(*) FROM found WHERE phase <> 'gas' AND ${inGeometry(filter)}
    `);
  }

  standings(sight: VisibleTo, filter: ListFilter): Count[] {
    return this.connection.reader.all<Count>(sql`
      ${this.found(sight, filter)}
      SELECT standing AS value, count(DISTINCT slug) AS count FROM seen
      WHERE ${inGeometry(filter)} AND ${inPhase(filter)} GROUP BY standing
    `);
  }

  /** `seen`: every revision the caller sees that matches; `found`: of each correlation the one to be listed. */
  private found(sight: VisibleTo, { match, standing }: ListFilter): SQL {
    const seen =
      match === undefined
        ? sql`seen AS (SELECT *, 0 AS rank FROM visible)`
        : sql`
            hits AS MATERIALIZED (
              SELECT rowid AS hit, ${RANK} AS rank FROM register_search WHERE register_search MATCH ${match}
            ),
            seen AS (SELECT visible.*, rank FROM visible JOIN hits ON hit = visible.id)`;
    const ofStanding = standing === undefined ? sql`1` : sql`standing = ${standing}`;
    return sql`
      WITH visible AS MATERIALIZED (${revisionsOf(sight, this.clock.now().toISOString())}),
      ${seen},
      chosen AS (
        SELECT id, row_number() OVER (PARTITION BY slug ORDER BY inForce DESC, number DESC) AS place
        FROM visible WHERE ${ofStanding}
      ),
      found AS (SELECT seen.* FROM seen JOIN chosen ON chosen.id = seen.id WHERE place = 1)`;
  }
}

function inGeometry({ geometry }: ListFilter): SQL {
  return geometry === undefined ? sql`1` : sql`geometry = ${geometry}`;
}

function inPhase({ phase }: ListFilter): SQL {
  if (phase === undefined) return sql`1`;
  if (phase === 'gas') return sql`phase <> 'liquid'`;
  if (phase === 'liquid') return sql`phase <> 'gas'`;
  return sql`phase = ${phase}`;
}
