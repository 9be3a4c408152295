import { Injectable } from '@nestjs/common';
import { and, count, eq } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import type { Reader, Tx } from '../database/connection.js';
import { comment, commentAnswer, commentResolution } from '../database/schema/review.js';
import type { CommentFacts } from '../revisions/revision-facts.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

export interface CommentRecord extends CommentFacts {
  readonly id: number;
  readonly field: string;
  readonly text: string;
}

@Injectable()
export class CommentsRepository {
  /** A comment on this revision, with how far it has come. */
  find(revisionId: number, id: number, reader: Reader): CommentRecord | undefined {
    const row = reader
      .select({
        id: comment.id,
        field: comment.field,
        text: comment.text,
        byId: comment.byId,
        resolutionId: commentResolution.id,
      })
      .from(comment)
      .leftJoin(commentResolution, eq(commentResolution.commentId, comment.id))
      .where(and(eq(comment.revisionId, revisionId), eq(comment.id, id)))
      .get();
    if (row === undefined) return undefined;
    const given = reader
      .select({ answers: count() })
      .from(commentAnswer)
      .where(eq(commentAnswer.commentId, id))
      .get();
    const { resolutionId, ...said } = row;
    return { ...said, resolved: resolutionId !== null, answers: given?.answers ?? 0 };
  }

  insert(
    tx: Tx,
    { id, hash, iteration }: Authorized<RevisionRecord>,
    by: Actor,
    at: string,
    values: { field: string; text: string },
  ): number {
    return tx
      .insert(comment)
      .values({ revisionId: id, hash, iteration, byId: by.id, byName: by.name, at, ...values })
      .returning({ id: comment.id })
      .get().id;
  }

  insertAnswer(tx: Tx, { id }: Authorized<CommentRecord>, by: Actor, at: string, text: string): void {
    tx.insert(commentAnswer).values({ commentId: id, text, byId: by.id, byName: by.name, at }).run();
  }

  insertResolution(tx: Tx, { id }: Authorized<CommentRecord>, by: Actor, at: string): void {
    tx.insert(commentResolution).values({ commentId: id, byId: by.id, byName: by.name, at }).run();
  }
}
