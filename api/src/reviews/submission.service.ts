import { Injectable } from '@nestjs/common';
import { ENGINE_VERSION, type InspectionReport } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { authorize, type Authorized } from '../common/authorized.js';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import { hasPermission } from '../common/permissions.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { PeopleService } from '../people/people.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { handsOf, mayPutForward } from '../revisions/reviewing.policy.js';
import { maySubmit } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { LifeNoticesService } from './life-notices.service.js';
import { MachineCheckService } from './machine-check.service.js';
import { reviewLetters } from './review-letters.js';
import { ReviewsRepository } from './reviews.repository.js';

export interface Submission {
  readonly reviewers?: readonly string[] | undefined;
  readonly note?: string | undefined;
}

/** Puts revisions before their reviewers: the first time, and again after changes. Each time the machine checks first. */
@Injectable()
export class SubmissionService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly machine: MachineCheckService,
    private readonly people: PeopleService,
    private readonly notices: LifeNoticesService,
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
      this.keep(tx, at, actor, record, 1, report, note);
      this.reviews.insertAssignments(tx, record, reviewers, actor, at);
      const submitted = this.revisions.setStanding(tx, record, { standing: 'in review', note }, actor, at);
      this.notices.tell(tx, at, actor, record, reviewers, reviewLetters.asked(actor, record));
      const detail = { ...detailOf(record, report, note), reviewers: [...reviewers] };
      return { subject: subjectOf(record), detail, result: submitted };
    });
  }

  /** Says that a revision in review is ready again, after changes or answers. Its reviewers are asked once more. */
  putForward(actor: Actor, key: RevisionKey, note: string | undefined): RevisionRecord {
    return this.writer.write(actor, 'revision.put-forward', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const last = this.reviews.lastRound(found.id, tx);
      const hands = handsOf(found, last, this.reviews.verdicts(found.id, tx));
      const record = authorize(found, mayPutForward(actor, found, hands));
      const report = this.machine.pass(record);
      const round = (last?.round ?? 0) + 1;
      this.keep(tx, at, actor, record, round, report, note);
      const reviewers = this.reviews.reviewerIds(record.id, tx);
      this.notices.tell(tx, at, actor, record, reviewers, reviewLetters.readyAgain(actor, record));
      return {
        subject: subjectOf(record),
        detail: { ...detailOf(record, report, note), round },
        result: record,
      };
    });
  }

  private keep(
    tx: Tx,
    at: string,
    actor: Actor,
    record: Authorized<RevisionRecord>,
    round: number,
    report: InspectionReport,
    note: string | undefined,
  ): void {
    this.reviews.insertSubmission(tx, record, actor, at, { round, engine: ENGINE_VERSION, report, note });
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

function detailOf({ hash, iteration }: RevisionRecord, report: InspectionReport, note: string | undefined) {
  const warnings = report.remarks.filter(({ verdict }) => verdict === 'warning').length;
  return {
    hash,
    iteration,
    checks: report.checks.length,
    warnings,
    ...(note === undefined ? {} : { note }),
  };
}
