import { Injectable } from '@nestjs/common';
import { and, asc, desc, eq, sql, type SQL } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import type { Authorized } from '../common/authorized.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { correlation, propertyEquation } from '../database/schema/register-entry.js';
import { revision, revisionContent, revisionNow, standingEvent } from '../database/schema/revision.js';
import { inForceAt, standingAt, standingNoteAt, standingSince, superseded } from '../database/standing-at.js';
import { visibleTo } from '../database/visible-to.js';
import type { Content } from './content.js';
import type { NewStanding } from './new-standing.js';
import type { RevisionKey, RevisionRecord, SubjectKind } from './revision-record.js';
import { sightOf } from './revision.policy.js';
import type { SearchText } from './search-text.js';

@Injectable()
export class RevisionRepository {
  constructor(
    private readonly connection: Connection,
    private readonly clock: Clock,
  ) {}

  /** All revisions of a subject, the first number first. */
  of(kind: SubjectKind, slug: string, reader: Reader = this.connection.reader): RevisionRecord[] {
    return this.select(reader, and(eq(revisionNow.kind, kind), eq(revisionNow.slug, slug)));
  }

  /** Those of them that somebody sees. */
  visible(
    actor: Actor,
    kind: SubjectKind,
    slug: string,
    reader: Reader = this.connection.reader,
  ): RevisionRecord[] {
    return this.select(
      reader,
      and(eq(revisionNow.kind, kind), eq(revisionNow.slug, slug), visibleTo(sightOf(actor))),
    );
  }

  find(key: RevisionKey, reader: Reader = this.connection.reader): RevisionRecord | undefined {
    return this.select(
      reader,
      and(eq(revisionNow.kind, key.kind), eq(revisionNow.slug, key.slug), eq(revisionNow.number, key.number)),
    )[0];
  }

  /** Every revision of one kind, by slug and number. */
  every(kind: SubjectKind, reader: Reader = this.connection.reader): RevisionRecord[] {
    return this.select(reader, eq(revisionNow.kind, kind));
  }

  /** Revisions of the correlations of one geometry. */
  ofGeometry(geometry: string, reader: Reader = this.connection.reader): RevisionRecord[] {
    return this.select(reader, eq(revisionNow.geometry, geometry));
  }

  /**
   * Revisions whose place a later one has taken at a moment, while that is not written down yet; each with the number
   * of the later one.
   */
  toSupersede(at: string, reader: Reader = this.connection.reader): { record: RevisionRecord; by: number }[] {
    const due = reader
      .select({ id: revisionNow.id, by: revisionNow.supersededBy })
      .from(revisionNow)
      .where(superseded(at))
      .orderBy(asc(revisionNow.id))
      .all();
    return due.flatMap(({ id, by }) =>
      this.select(reader, eq(revisionNow.id, id), at).map((record) => ({ record, by: by ?? 0 })),
    );
  }

  exists(kind: SubjectKind, slug: string, reader: Reader = this.connection.reader): boolean {
    return this.subjectId(kind, slug, reader) !== undefined;
  }

  /** The canonical text of a revision's latest content. */
  text(record: RevisionRecord, reader: Reader = this.connection.reader): string {
    const row = reader
      .select({ text: revisionContent.canonicalText })
      .from(revisionContent)
      .where(eq(revisionContent.revisionId, record.id))
      .orderBy(desc(revisionContent.iteration))
      .get();
    if (row === undefined) throw new Error(`Revision ${record.id} has no content.`);
    return row.text;
  }

  insertCorrelation(tx: Tx, slug: string, geometry: string, by: Actor, at: string): void {
    tx.insert(correlation).values({ slug, geometry, createdAt: at, createdBy: by.id }).run();
  }

  insertPropertyEquation(tx: Tx, slug: string, by: Actor, at: string): void {
    tx.insert(propertyEquation).values({ slug, createdAt: at, createdBy: by.id }).run();
  }

  /** A new draft with its first content. */
  insertRevision(
    tx: Tx,
    key: RevisionKey,
    content: Content,
    by: Actor,
    at: string,
    note?: string,
  ): RevisionRecord {
    const subjectId = this.subjectId(key.kind, key.slug, tx);
    const ofCorrelation = key.kind === 'correlation';
    const { id } = tx
      .insert(revision)
      .values({
        correlationId: ofCorrelation ? subjectId : null,
        propertyEquationId: ofCorrelation ? null : subjectId,
        number: key.number,
        originatorId: by.id,
        createdAt: at,
      })
      .returning({ id: revision.id })
      .get();
    this.insertContent(tx, id, 1, content, by, at);
    this.insertStanding(tx, id, content.hash, { standing: 'draft', note }, by, at);
    return this.reload(key, tx);
  }

  /** Puts a further iteration of the content in. */
  addContent(
    tx: Tx,
    record: Authorized<RevisionRecord>,
    content: Content,
    by: Actor,
    at: string,
  ): RevisionRecord {
    this.insertContent(tx, record.id, record.iteration + 1, content, by, at);
    return this.reload(record, tx);
  }

  addStanding(
    tx: Tx,
    record: Authorized<RevisionRecord>,
    standing: NewStanding,
    by: Actor,
    at: string,
  ): RevisionRecord {
    this.insertStanding(tx, record.id, record.hash, standing, by, at);
    return this.reload(record, tx);
  }

  setOriginator(tx: Tx, record: Authorized<RevisionRecord>, by: Actor): void {
    tx.update(revision).set({ originatorId: by.id }).where(eq(revision.id, record.id)).run();
  }

  /** The words that the register's search finds a revision by. */
  setSearchText(tx: Tx, record: RevisionRecord, text: SearchText): void {
    tx.run(sql`DELETE FROM register_search WHERE rowid = ${record.id}`);
    tx.run(sql`
      INSERT INTO register_search (rowid, title, authors, geometry, summary, symbols, cautions, sources)
      VALUES (${record.id}, ${text.title}, ${text.authors}, ${text.geometry}, ${text.summary}, ${text.symbols},
        ${text.cautions}, ${text.sources})
    `);
  }

  private select(
    reader: Reader,
    where: SQL | undefined,
    now: string = this.clock.now().toISOString(),
  ): RevisionRecord[] {
    return reader
      .select({
        id: revisionNow.id,
        kind: revisionNow.kind,
        slug: revisionNow.slug,
        number: revisionNow.number,
        geometry: revisionNow.geometry,
        originatorId: revisionNow.originatorId,
        createdAt: revisionNow.createdAt,
        standing: standingAt(now),
        standingAt: standingSince(now),
        standingNote: standingNoteAt(now),
        iteration: revisionNow.iteration,
        hash: revisionNow.hash,
        title: revisionNow.title,
        phase: revisionNow.phase,
        effectiveFrom: revisionNow.effectiveFrom,
        reviewDue: revisionNow.reviewDue,
        inForce: inForceAt(now).mapWith(Boolean),
      })
      .from(revisionNow)
      .where(where)
      .orderBy(asc(revisionNow.slug), asc(revisionNow.number))
      .all();
  }

  private reload(key: RevisionKey, tx: Tx): RevisionRecord {
    const record = this.find(key, tx);
    if (record === undefined) throw new Error(`Revision ${key.number} of ${key.slug} was not kept.`);
    return record;
  }

  private subjectId(kind: SubjectKind, slug: string, reader: Reader): number | undefined {
    const table = kind === 'correlation' ? correlation : propertyEquation;
    return reader.select({ id: table.id }).from(table).where(eq(table.slug, slug)).get()?.id;
  }

  private insertContent(
    tx: Tx,
    revisionId: number,
    iteration: number,
    content: Content,
    by: Actor,
    at: string,
  ): void {
    tx.insert(revisionContent)
      .values({
        revisionId,
        iteration,
        format: content.format,
        canonicalText: content.text,
        hash: content.hash,
        at,
        byId: by.id,
      })
      .run();
  }

  private insertStanding(
    tx: Tx,
    revisionId: number,
    hash: string,
    standing: NewStanding,
    by: Actor,
    at: string,
  ): void {
    tx.insert(standingEvent)
      .values({ revisionId, hash, at, byId: by.id, byName: by.name, ...standing })
      .run();
  }
}
