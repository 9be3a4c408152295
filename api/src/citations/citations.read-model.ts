import type { Source } from '@merestone/engine';
import { Injectable } from '@nestjs/common';
import { and, asc, eq, ne, sql } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { revisionContent, revisionNow } from '../database/schema/revision.js';
import { visibleTo, type VisibleTo } from '../database/visible-to.js';
import type { SubjectKind } from '../revisions/revision-record.js';

/** A sheet with what it cites. */
export interface CitingSheet {
  readonly kind: SubjectKind;
  readonly slug: string;
  readonly title: string;
  readonly sources: readonly Source[];
}

/** What the register cites. */
@Injectable()
export class CitationsReadModel {
  constructor(private readonly connection: Connection) {}

  /** Every correlation and property equation by the latest revision that somebody sees; declined ones left out. */
  citing(sight: VisibleTo): CitingSheet[] {
    const rows = this.connection.reader
      .select({
        kind: revisionNow.kind,
        slug: revisionNow.slug,
        title: revisionNow.title,
        sources: sql<string>`json_extract(${revisionContent.canonicalText}, '$.sources')`,
      })
      .from(revisionNow)
      .innerJoin(revisionContent, eq(revisionContent.id, revisionNow.contentId))
      .where(and(visibleTo(sight), ne(revisionNow.standing, 'declined')))
      .orderBy(asc(revisionNow.kind), asc(revisionNow.slug), asc(revisionNow.number))
      .all();
    const latest = new Map(rows.map((row) => [`${row.kind} ${row.slug}`, row]));
    return [...latest.values()].map(({ sources, ...sheet }) => ({
      ...sheet,
      sources: JSON.parse(sources) as Source[],
    }));
  }
}
