import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Reader } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { NoticesService } from '../notices/notices.service.js';
import { PeopleService } from '../people/people.service.js';
import { subjectOf, type RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type {
  ProblemReport,
  ProblemReportAnswerBody,
  ProblemReportBody,
  ProblemReportsResponse,
} from './dto/problem-report.dto.js';
import { problemReport } from './problem-report.mapper.js';
import { mayAnswerReport, mayReport } from './problem-report.policy.js';
import { ProblemReportsRepository, type ReportRecord } from './problem-reports.repository.js';

/** What people find wrong with sheets in use, and what technical authorities find out about it. */
@Injectable()
export class ProblemReportsService {
  constructor(
    private readonly reports: ProblemReportsRepository,
    private readonly revisions: RevisionsService,
    private readonly people: PeopleService,
    private readonly notices: NoticesService,
    private readonly writer: Writer,
  ) {}

  list(actor: Actor, slug: string): ProblemReportsResponse {
    const seen = this.revisions.visible(actor, 'correlation', slug);
    if (seen.length === 0) throw new ApiProblem('not-found', `There is no correlation "${slug}".`);
    return { items: this.reports.of(slug).map((record) => problemReport(actor, record)) };
  }

  file(actor: Actor, slug: string, { revision, text, severity }: ProblemReportBody): ProblemReport {
    return this.writer.write(actor, 'problem-report.filed', (tx, at) => {
      const found = this.revisions.one(actor, { kind: 'correlation', slug, number: revision }, tx);
      const record = authorize(found, mayReport(actor, found));
      const id = this.reports.insert(tx, record, actor, at, { severity, text });
      const authorities = this.people.list('authority', tx).map((person) => person.id);
      this.notices.tell(
        tx,
        at,
        [...authorities, record.originatorId].filter((one) => one !== actor.id),
        {
          kind: 'report',
          text: `${actor.name} reports a problem (${severity}) with "${record.title}", revision ${record.number}.`,
          href: `/register/${slug}/revisions/${record.number}`,
        },
      );
      const detail = { report: id, hash: record.hash, severity, text };
      return { subject: subjectOf(record), detail, result: problemReport(actor, this.one(id, tx)) };
    });
  }

  answer(actor: Actor, id: number, { text, outcome }: ProblemReportAnswerBody): ProblemReport {
    return this.writer.write(actor, 'problem-report.answered', (tx, at) => {
      const found = this.one(id, tx);
      const report = authorize(found, mayAnswerReport(actor, found));
      this.reports.insertAnswer(tx, report, actor, at, { outcome, text });
      const href = `/register/${report.slug}/revisions/${report.revision}`;
      this.notices.tell(tx, at, [report.byId], {
        kind: 'report',
        text: `${actor.name} answered your problem report on ${report.slug}, revision ${report.revision}.`,
        href,
      });
      const subject = subjectOf({ kind: 'correlation', slug: report.slug, number: report.revision });
      const detail = { report: id, outcome, text };
      return { subject, detail, result: problemReport(actor, this.one(id, tx)) };
    });
  }

  /** Throws at the field unless this is an open report on the correlation. */
  assertOpen({ kind, slug }: RevisionRecord, id: number, field: string, reader: Reader): void {
    const report = this.reports.find(id, reader);
    if (kind === 'correlation' && report?.slug === slug && report.answer === null) return;
    throw ApiProblem.ofField('malformed', field, 'There is no such open report on this correlation.');
  }

  private one(id: number, reader?: Reader): ReportRecord {
    const report = this.reports.find(id, reader);
    if (report === undefined) throw new ApiProblem('not-found', 'There is no such problem report.');
    return report;
  }
}
