import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayAnswer, mayComment, mayResolve } from '../revisions/reviewing.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { CommentsRepository, type CommentRecord } from './comments.repository.js';
import { leadsSomewhere } from './field-path.js';
import { LifeNoticesService } from './life-notices.service.js';
import { reviewLetters } from './review-letters.js';

/** Remarks on the fields of a revision, what is said to them, and that they are settled. */
@Injectable()
export class CommentsService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly comments: CommentsRepository,
    private readonly notices: LifeNoticesService,
    private readonly writer: Writer,
  ) {}

  /** A remark on one field of the present content, or on the whole of it. Answers with its id. */
  comment(actor: Actor, key: RevisionKey, field: string, text: string): number {
    return this.writer.write(actor, 'revision.commented', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, mayComment(actor));
      if (!leadsSomewhere(this.definitions.definition(record), field)) {
        throw ApiProblem.ofField('malformed', 'field', 'There is no such field on this sheet.');
      }
      const id = this.comments.insert(tx, record, actor, at, { field, text });
      const letter = reviewLetters.commented(actor, record);
      this.notices.tell(tx, at, actor, record, [record.originatorId], letter);
      const { hash, iteration } = record;
      return {
        subject: subjectOf(record),
        detail: { comment: id, hash, iteration, field, text },
        result: id,
      };
    });
  }

  answer(actor: Actor, key: RevisionKey, id: number, text: string): void {
    this.writer.write(actor, 'comment.answered', (tx, at) => {
      const { record, comment: found } = this.find(actor, key, id, tx);
      const comment = authorize(found, mayAnswer(actor, found));
      this.comments.insertAnswer(tx, comment, actor, at, text);
      const others = [comment.byId, record.originatorId];
      this.notices.tell(tx, at, actor, record, others, reviewLetters.answered(actor, record));
      return { subject: subjectOf(record), detail: { comment: id, text }, result: undefined };
    });
  }

  resolve(actor: Actor, key: RevisionKey, id: number): void {
    this.writer.write(actor, 'comment.resolved', (tx, at) => {
      const { record, comment: found } = this.find(actor, key, id, tx);
      const comment = authorize(found, mayResolve(actor, record, found));
      this.comments.insertResolution(tx, comment, actor, at);
      return { subject: subjectOf(record), detail: { comment: id }, result: undefined };
    });
  }

  private find(
    actor: Actor,
    key: RevisionKey,
    id: number,
    tx: Tx,
  ): { record: RevisionRecord; comment: CommentRecord } {
    const record = this.revisions.one(actor, key, tx);
    const comment = this.comments.find(record.id, id, tx);
    if (comment === undefined)
      throw new ApiProblem('not-found', 'There is no such comment on this revision.');
    return { record, comment };
  }
}
