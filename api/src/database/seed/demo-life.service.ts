import { Injectable } from '@nestjs/common';
import type { CorrelationDefinition } from '@merestone/engine';
import { AppointmentsService } from '../../appointments/appointments.service.js';
import type { Actor } from '../../common/actor.js';
import { Clock } from '../../common/clock.js';
import { DraftingService } from '../../correlations/drafting.service.js';
import { DEMO_PASSWORD } from '../../people/demo-people.js';
import { PeopleService } from '../../people/people.service.js';
import { ProblemReportsService } from '../../problem-reports/problem-reports.service.js';
import { ApprovalService } from '../../reviews/approval.service.js';
import { CommentsService } from '../../reviews/comments.service.js';
import { ReviewingService } from '../../reviews/reviewing.service.js';
import { StandingService } from '../../reviews/standing.service.js';
import { SubmissionService } from '../../reviews/submission.service.js';
import { DefinitionsService } from '../../revisions/definitions.service.js';
import type { RevisionRecord } from '../../revisions/revision-record.js';
import { RevisionsService } from '../../revisions/revisions.service.js';
import { changed, type By, type DemoAct, type DemoLife } from './demo-life.js';
import type { DemoTeam } from './demo-office.js';
import { DEMO_MEANING, EVERYTHING_CHECKED } from './demo-words.js';

const DAY_MS = 24 * 3600_000;

/** A sheet of the library whose life goes on. */
export interface DemoSheet {
  readonly slug: string;
  readonly team: DemoTeam;
  readonly library: CorrelationDefinition;
}

/** Lets the demo office live on: next revisions, comments, reports, decisions, each as its people would do it. */
@Injectable()
export class DemoLifeService {
  constructor(
    private readonly drafting: DraftingService,
    private readonly submissions: SubmissionService,
    private readonly reviewing: ReviewingService,
    private readonly comments: CommentsService,
    private readonly approvals: ApprovalService,
    private readonly standings: StandingService,
    private readonly reports: ProblemReportsService,
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly appointments: AppointmentsService,
    private readonly people: PeopleService,
    private readonly clock: Clock,
  ) {}

  async live(sheet: DemoSheet, acts: readonly DemoAct[]): Promise<void> {
    for (const act of acts) await this.act(sheet, act);
  }

  /** Proposed and not confirmed yet. */
  propose({ person, geometries, days }: DemoLife['appointment'], administrator: Actor): void {
    this.appointments.propose(administrator, {
      person: this.byEmail(person).id,
      geometries,
      until: this.inDays(days).slice(0, 10),
    });
  }

  private async act(sheet: DemoSheet, act: DemoAct): Promise<void> {
    const { slug, team } = sheet;
    const latest = this.latest(slug);
    switch (act.do) {
      case 'next': {
        const by = act.by === undefined ? team.originator : this.who(sheet, act.by);
        const definition = act.library ? sheet.library : this.definition(latest);
        this.drafting.next(by, slug, changed(definition, act.changes ?? []));
        return;
      }
      case 'submit': {
        const reviewers = team.reviewers.slice(0, act.reviewers).map(({ id }) => id);
        this.submissions.submit(this.originator(latest), latest, { reviewers, note: act.note });
        return;
      }
      case 'comment':
        this.comment(sheet, latest, act);
        return;
      case 'recommend':
      case 'ask-for-changes':
        this.reviewing.review(this.who(sheet, act.by), latest, {
          verdict: act.do,
          checklist: EVERYTHING_CHECKED,
          note: act.note,
        });
        return;
      case 'edit':
        this.drafting.edit(
          this.originator(latest),
          latest,
          changed(this.definition(latest), act.changes),
          latest.hash,
        );
        return;
      case 'put-forward':
        this.submissions.putForward(this.originator(latest), latest, act.note);
        return;
      case 'approve':
        await this.approvals.approve(team.authority, latest, {
          password: DEMO_PASSWORD,
          meaning: DEMO_MEANING,
          hash: latest.hash,
          ...(act.inDays === undefined ? {} : { effectiveFrom: this.inDays(act.inDays).slice(0, 10) }),
          ...(act.reviewDueInDays === undefined
            ? {}
            : { reviewDue: this.inDays(act.reviewDueInDays).slice(0, 10) }),
        });
        return;
      case 'decline':
        this.approvals.decline(team.authority, latest, act.reason);
        return;
      case 'report': {
        const { severity, text } = act;
        this.reports.file(this.who(sheet, act.by), slug, { revision: latest.number, severity, text });
        return;
      }
      case 'suspend': {
        const report = this.reports.list(team.authority, slug).items.find(({ answer }) => answer === null);
        this.standings.suspend(team.authority, latest, { reason: act.reason, problemReport: report?.id });
        return;
      }
      case 'withdraw': {
        const { revision: number, reason, class: withdrawalClass } = act;
        const key = { kind: 'correlation', slug, number } as const;
        this.standings.withdraw(team.authority, key, { reason, class: withdrawalClass });
      }
    }
  }

  private comment(
    sheet: DemoSheet,
    record: RevisionRecord,
    { by, field, text, answer, resolved }: Extract<DemoAct, { do: 'comment' }>,
  ): void {
    const commenter = this.who(sheet, by);
    const id = this.comments.comment(commenter, record, field, text);
    if (answer !== undefined) this.comments.answer(this.originator(record), record, id, answer);
    if (resolved) this.comments.resolve(commenter, record, id);
  }

  private latest(slug: string): RevisionRecord {
    const record = this.revisions.all('correlation', slug).at(-1);
    if (record === undefined) throw new Error(`The demo speaks of ${slug}, which is not in the library.`);
    return record;
  }

  private definition(record: RevisionRecord): CorrelationDefinition {
    return this.definitions.correlation(record).definition;
  }

  private originator({ originatorId }: RevisionRecord): Actor {
    const actor = this.people.activeActor(originatorId);
    if (actor === undefined) throw new Error(`The originator ${originatorId} is not in the demo office.`);
    return actor;
  }

  private who({ team }: DemoSheet, by: By): Actor {
    switch (by) {
      case 'originator':
        return team.originator;
      case 'reviewer':
        return team.reviewers[0];
      case 'second reviewer':
        return team.reviewers[1];
      case 'authority':
        return team.authority;
      default:
        return this.byEmail(by);
    }
  }

  private byEmail(email: string): Actor {
    const person = this.people.byEmail(email);
    const actor = person && this.people.activeActor(person.id);
    if (actor === undefined) throw new Error(`There is nobody with the address ${email} in the demo office.`);
    return actor;
  }

  private inDays(days: number): string {
    return new Date(this.clock.now().getTime() + days * DAY_MS).toISOString();
  }
}
