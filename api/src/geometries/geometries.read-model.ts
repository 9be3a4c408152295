import { Injectable } from '@nestjs/common';
import { and, asc, countDistinct, eq, isNotNull, sql } from 'drizzle-orm';
import { Clock } from '../common/clock.js';
import { Connection, type Reader } from '../database/connection.js';
import { geometry } from '../database/schema/geometry.js';
import { revisionNow } from '../database/schema/revision.js';
import { inForceAt } from '../database/standing-at.js';
import { visibleTo, type VisibleTo } from '../database/visible-to.js';

export interface Geometry {
  readonly slug: string;
  readonly name: string;
  readonly summary: string;
  readonly characteristicLength: string;
  readonly velocity: string;
  readonly cautions: string[];
}

export interface CountedGeometry extends Geometry {
  readonly total: number;
  readonly approved: number;
}

@Injectable()
export class GeometriesReadModel {
  constructor(
    private readonly connection: Connection,
    private readonly clock: Clock,
  ) {}

  all(reader: Reader = this.connection.reader): Geometry[] {
    return reader.select().from(geometry).orderBy(asc(geometry.name)).all();
  }

  /** Every geometry with the number of its correlations that somebody sees. */
  counted(sight: VisibleTo): CountedGeometry[] {
    const now = this.clock.now().toISOString();
    const counts = this.connection.reader
      .select({
        geometry: revisionNow.geometry,
        total: countDistinct(revisionNow.slug),
        approved: sql<number>`count(DISTINCT CASE WHEN ${inForceAt(now)} THEN ${revisionNow.slug} END)`,
      })
      .from(revisionNow)
      .where(and(isNotNull(revisionNow.geometry), visibleTo(sight)))
      .groupBy(revisionNow.geometry)
      .all();
    const bySlug = new Map(counts.map((row) => [row.geometry, row]));
    return this.all().map((row) => ({
      ...row,
      total: bySlug.get(row.slug)?.total ?? 0,
      approved: bySlug.get(row.slug)?.approved ?? 0,
    }));
  }

  find(slug: string, reader: Reader = this.connection.reader): Geometry | undefined {
    return reader.select().from(geometry).where(eq(geometry.slug, slug)).get();
  }
}
