import { Injectable } from '@nestjs/common';
import { ENGINE_VERSION } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import { hasPermission } from '../common/permissions.js';
import { Writer } from '../database/write.js';
import { PeopleService } from '../people/people.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { maySubmit } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { MachineCheckService } from './machine-check.service.js';
import { ReviewsRepository } from './reviews.repository.js';

export interface Submission {
  readonly reviewers?: readonly string[] | undefined;
  readonly note?: string | undefined;
}

@Injectable()
export class SubmissionService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly machine: MachineCheckService,
    private readonly people: PeopleService,
    private readonly writer: Writer,
  ) {}

  /** Puts a draft into review, once the machine check passes; its report is kept. */
  submit(actor: Actor, key: RevisionKey, { reviewers = [], note }: Submission): RevisionRecord {
    return this.writer.write(actor, 'revision.submitted', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, maySubmit(actor, found));
      this.assertReviewers(actor, reviewers);
      const report = this.machine.pass(record);
      this.revisions.takeOver(tx, record, actor);
      this.reviews.insertSubmission(tx, record, actor, at, ENGINE_VERSION, report);
      this.reviews.insertAssignments(tx, record, reviewers, actor, at);
      const submitted = this.revisions.setStanding(tx, record, { standing: 'in review', note }, actor, at);
      const detail = {
        hash: record.hash,
        iteration: record.iteration,
        checks: report.length,
        reviewers: [...reviewers],
        ...(note === undefined ? {} : { note }),
      };
      return { subject: subjectOf(record), detail, result: submitted };
    });
  }

  /** People who can review it: here, with the permission, and not the one who submits it. */
  private assertReviewers(actor: Actor, reviewers: readonly string[]): void {
    const fields = reviewers.flatMap((id, i): FieldProblem[] => {
      const person = this.people.activeActor(id);
      const field = `reviewers.${i}`;
      if (person === undefined || !hasPermission(person.roles, 'correlation.review')) {
        return [{ field, code: 'malformed', message: 'This is nobody who can review.' }];
      }
      if (id === actor.id)
        return [{ field, code: 'malformed', message: 'Nobody reviews their own revision.' }];
      return [];
    });
    if (fields.length > 0)
      throw new ApiProblem('malformed', 'Some of the reviewers cannot be asked.', { fields });
  }
}
