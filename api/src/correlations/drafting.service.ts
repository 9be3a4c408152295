import { Injectable } from '@nestjs/common';
import type { CorrelationDefinition } from '@merestone/engine';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { GeometriesService } from '../geometries/geometries.service.js';
import type { Act } from '../journal/acts.js';
import { contentOf } from '../revisions/content.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayEdit } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { searchTextOf } from '../revisions/search-text.js';

/** New sheets, next revisions and edits. A definition given here has passed the engine's checks in its DTO. */
@Injectable()
export class DraftingService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly geometries: GeometriesService,
    private readonly writer: Writer,
  ) {}

  /** A new correlation with its first draft. */
  create(actor: Actor, slug: string, definition: CorrelationDefinition, note?: string): RevisionRecord {
    const content = contentOf(definition);
    return this.writer.write(actor, 'correlation.drafted', (tx, at) => {
      this.assertGeometry(definition, tx);
      const { geometry } = definition;
      const record = this.revisions.draftCorrelation(tx, actor, at, slug, geometry, content, note);
      this.index(tx, record, definition);
      return written(record);
    });
  }

  /** A draft of the next revision. There is at most one that is still worked on. */
  next(actor: Actor, slug: string, definition: CorrelationDefinition): RevisionRecord {
    const content = contentOf(definition);
    return this.writer.write(actor, 'revision.drafted', (tx, at) => {
      const seen = this.revisions.visible(actor, 'correlation', slug, tx);
      if (seen.length === 0) throw new ApiProblem('not-found', `There is no correlation "${slug}".`);
      const all = this.revisions.all('correlation', slug, tx);
      const open = all.find(({ standing }) => standing === 'draft' || standing === 'in review');
      if (open !== undefined) {
        throw new ApiProblem(
          'conflict',
          `Revision ${open.number} is still being worked on; finish that one first.`,
        );
      }
      assertSameGeometry(all, definition);
      const number = Math.max(...all.map((one) => one.number)) + 1;
      const record = this.revisions.draftNext(tx, actor, at, { kind: 'correlation', slug, number }, content);
      this.index(tx, record, definition);
      return written(record);
    });
  }

  /**
   * Puts other content into a draft, or into a revision in review, where it is the next iteration: verdicts speak of
   * the iteration they were given on. `ifMatch` is the hash of the content that the caller has edited.
   */
  edit(
    actor: Actor,
    key: RevisionKey,
    definition: CorrelationDefinition,
    ifMatch: string | undefined,
  ): RevisionRecord {
    if (ifMatch === undefined) {
      throw new ApiProblem(
        'if-match-needed',
        'Send the hash of the content you edited in the If-Match header.',
      );
    }
    const seen = this.revisions.one(actor, key);
    const act = contentOf(definition).hash === seen.hash ? undefined : actOfEdit(actor, seen);
    const work = (tx: Tx, at: string) => this.put(tx, at, actor, key, definition, ifMatch);
    if (act === undefined) return this.writer.writeUnjournalled('draft-autosave', work);
    return this.writer.write(actor, act, (tx, at) => written(work(tx, at)));
  }

  private put(
    tx: Tx,
    at: string,
    actor: Actor,
    key: RevisionKey,
    definition: CorrelationDefinition,
    ifMatch: string,
  ): RevisionRecord {
    const record = this.revisions.one(actor, key, tx);
    const subject = authorize(record, mayEdit(actor, record));
    if (record.hash !== ifMatch) {
      throw new ApiProblem(
        'stale',
        'The content was changed in the meantime. Load it again and repeat your edit.',
      );
    }
    assertSameGeometry([record], definition);
    const content = contentOf(definition);
    if (content.hash === record.hash) return record;
    this.revisions.takeOver(tx, subject, actor);
    const edited = this.revisions.addContent(tx, subject, content, actor, at);
    this.index(tx, edited, definition);
    return edited;
  }

  private index(tx: Tx, record: RevisionRecord, definition: CorrelationDefinition): void {
    const name = this.geometries.find(definition.geometry, tx)?.name ?? '';
    this.revisions.setSearchText(tx, record, searchTextOf(definition, name));
  }

  private assertGeometry({ geometry }: CorrelationDefinition, tx: Tx): void {
    if (this.geometries.find(geometry, tx) !== undefined) return;
    throw ApiProblem.ofField(
      'malformed',
      'definition.geometry',
      `There is no geometry "${geometry}" in the register.`,
    );
  }
}

/** An edit of a draft is not journalled; what else it may amount to is. */
function actOfEdit(actor: Actor, record: RevisionRecord): Act | undefined {
  if (record.standing === 'in review') return 'revision.edited';
  const ofLibrary = record.originatorId === SYSTEM_ACTOR.id && actor.id !== SYSTEM_ACTOR.id;
  return ofLibrary ? 'revision.taken-over' : undefined;
}

function assertSameGeometry(revisions: readonly RevisionRecord[], { geometry }: CorrelationDefinition): void {
  const expected = revisions[0]?.geometry;
  if (expected === geometry) return;
  throw ApiProblem.ofField(
    'malformed',
    'definition.geometry',
    `A correlation keeps its geometry, ${String(expected)}; what was measured on another is another correlation.`,
  );
}

function written(record: RevisionRecord) {
  const { iteration, hash } = record;
  return { subject: subjectOf(record), detail: { iteration, hash }, result: record };
}
