import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { SYSTEM_ACTOR } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Reader, Tx } from '../database/connection.js';
import type { Content } from './content.js';
import { NamesReadModel } from './names.read-model.js';
import type { NewStanding } from './new-standing.js';
import type { RevisionKey, RevisionRecord, SubjectKind } from './revision-record.js';
import { RevisionRepository } from './revision.repository.js';
import type { SearchText } from './search-text.js';

const NOUN: Record<SubjectKind, string> = {
  correlation: 'correlation',
  'property-equation': 'property equation',
};

/** What the other features do with revisions. Reads answer with what the caller may see, and nothing else. */
@Injectable()
export class RevisionsService {
  constructor(
    private readonly revisions: RevisionRepository,
    private readonly names: NamesReadModel,
  ) {}

  /** The name of somebody whom a record names by id: of this office, of a former one, or the program itself. */
  nameOf(personId: string): string {
    return this.names.name(personId) ?? SYSTEM_ACTOR.name;
  }

  /** One revision, as the caller may see it; else `not-found`. */
  one(actor: Actor, key: RevisionKey, reader?: Reader): RevisionRecord {
    const found = this.visible(actor, key.kind, key.slug, reader).find(({ number }) => number === key.number);
    if (found === undefined) {
      throw new ApiProblem(
        'not-found',
        `There is no revision ${key.number} of the ${NOUN[key.kind]} "${key.slug}".`,
      );
    }
    return found;
  }

  /** The revision in force, else the latest that the caller may see; else `not-found`. */
  shown(actor: Actor, kind: SubjectKind, slug: string): RevisionRecord {
    const seen = this.visible(actor, kind, slug);
    const found = seen.find(({ inForce }) => inForce) ?? seen.at(-1);
    if (found === undefined) throw new ApiProblem('not-found', `There is no ${NOUN[kind]} "${slug}".`);
    return found;
  }

  visible(actor: Actor, kind: SubjectKind, slug: string, reader?: Reader): RevisionRecord[] {
    return this.revisions.visible(actor, kind, slug, reader);
  }

  /** All revisions of a subject, whoever asks: for the rules, never for an answer. */
  all(kind: SubjectKind, slug: string, reader?: Reader): RevisionRecord[] {
    return this.revisions.of(kind, slug, reader);
  }

  /** All revisions of the correlations of a geometry, whoever asks. */
  ofGeometry(geometry: string): RevisionRecord[] {
    return this.revisions.ofGeometry(geometry);
  }

  /** All revisions of correlations, whoever asks. */
  ofCorrelations(): RevisionRecord[] {
    return this.revisions.every('correlation');
  }

  /** All revisions of property equations, whoever asks. */
  ofPropertyEquations(): RevisionRecord[] {
    return this.revisions.every('property-equation');
  }

  /** Revisions that a later one has superseded by a moment, while no standing event says so yet. */
  toSupersede(at: string, reader?: Reader) {
    return this.revisions.toSupersede(at, reader);
  }

  exists(kind: SubjectKind, slug: string, reader?: Reader): boolean {
    return this.revisions.exists(kind, slug, reader);
  }

  /** A correlation with its first draft. Throws `duplicate` when the slug is taken. */
  draftCorrelation(
    tx: Tx,
    by: Actor,
    at: string,
    slug: string,
    geometry: string,
    content: Content,
    note?: string,
  ) {
    this.assertFree('correlation', slug, tx);
    this.revisions.insertCorrelation(tx, slug, geometry, by, at);
    return this.revisions.insertRevision(tx, { kind: 'correlation', slug, number: 1 }, content, by, at, note);
  }

  draftPropertyEquation(tx: Tx, by: Actor, at: string, slug: string, content: Content, note?: string) {
    this.assertFree('property-equation', slug, tx);
    this.revisions.insertPropertyEquation(tx, slug, by, at);
    return this.revisions.insertRevision(
      tx,
      { kind: 'property-equation', slug, number: 1 },
      content,
      by,
      at,
      note,
    );
  }

  draftNext(tx: Tx, by: Actor, at: string, key: RevisionKey, content: Content): RevisionRecord {
    return this.revisions.insertRevision(tx, key, content, by, at);
  }

  addContent(
    tx: Tx,
    record: Authorized<RevisionRecord>,
    content: Content,
    by: Actor,
    at: string,
  ): RevisionRecord {
    return this.revisions.addContent(tx, record, content, by, at);
  }

  setStanding(tx: Tx, record: Authorized<RevisionRecord>, standing: NewStanding, by: Actor, at: string) {
    return this.revisions.addStanding(tx, record, standing, by, at);
  }

  setSearchText(tx: Tx, record: RevisionRecord, text: SearchText): void {
    this.revisions.setSearchText(tx, record, text);
  }

  /** A draft that came with the library becomes the work of whoever takes it up. True when that happened. */
  takeOver(tx: Tx, record: Authorized<RevisionRecord>, by: Actor): boolean {
    if (record.originatorId !== SYSTEM_ACTOR.id || by.id === SYSTEM_ACTOR.id) return false;
    this.revisions.setOriginator(tx, record, by);
    return true;
  }

  private assertFree(kind: SubjectKind, slug: string, tx: Tx): void {
    if (!this.revisions.exists(kind, slug, tx)) return;
    throw ApiProblem.ofField('duplicate', 'slug', `There is a ${NOUN[kind]} "${slug}" already.`);
  }
}
