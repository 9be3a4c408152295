import { DraftingService } from '../../src/correlations/drafting.service.js';
import { ApprovalService } from '../../src/reviews/approval.service.js';
import { ReviewingService } from '../../src/reviews/reviewing.service.js';
import { StandingService } from '../../src/reviews/standing.service.js';
import type { RevisionRecord } from '../../src/revisions/revision-record.js';
import { RevisionsService } from '../../src/revisions/revisions.service.js';
import { approved, CHECKED, draft, recommended, submitted, type TestOffice } from './office.js';
import { tubeSheet } from './sheets.js';

/** Where a revision can be in its life; of a revision in review also whose turn it is. */
export const STATES = [
  'draft',
  'in review',
  'recommended',
  'changes asked',
  'approved',
  'suspended',
  'superseded',
  'withdrawn',
  'declined',
] as const;
export type State = (typeof STATES)[number];

export const REASON = 'Found while the tests were run.';

let made = 0;

/** A correlation of its own whose first revision is in this state, originated by the office's engineer. */
export async function inState(office: TestOffice, state: State): Promise<RevisionRecord> {
  const { app } = office.test;
  const record = draft(office, `life-${state.replaceAll(' ', '-')}-${(made += 1)}`);
  const { actor: engineer } = office.engineer;
  const { actor: authority } = office.authority;
  const review = (verdict: 'ask-for-changes' | 'decline') =>
    app
      .get(ReviewingService)
      .review(office.reviewer.actor, record, { verdict, checklist: CHECKED, note: REASON });
  switch (state) {
    case 'draft':
      break;
    case 'in review':
      submitted(office, record, engineer);
      break;
    case 'recommended':
      recommended(office, record);
      break;
    case 'changes asked':
      submitted(office, record, engineer);
      review('ask-for-changes');
      break;
    case 'approved':
      await approved(office, record);
      break;
    case 'suspended':
      await approved(office, record);
      app.get(StandingService).suspend(authority, record, { reason: REASON });
      break;
    case 'superseded': {
      await approved(office, record);
      const next = app.get(DraftingService).next(engineer, record.slug, tubeSheet({ year: 2011 }));
      await approved(office, next);
      break;
    }
    case 'withdrawn':
      await approved(office, record);
      app.get(StandingService).withdraw(authority, record, { reason: REASON, class: 'unsafe' });
      break;
    case 'declined':
      submitted(office, record, engineer);
      app.get(ApprovalService).decline(authority, record, REASON);
  }
  return present(office, record);
}

/** The revision as it stands now, whoever asks. */
export function present({ test }: TestOffice, { kind, slug, number }: RevisionRecord): RevisionRecord {
  const found = test.app
    .get(RevisionsService)
    .all(kind, slug)
    .find((one) => one.number === number);
  if (found === undefined) throw new Error(`There is no revision ${number} of ${slug}.`);
  return found;
}

/** The number of rows in every table that an act on a revision writes to. */
export function lifeRows({ test }: TestOffice): string {
  const tables = [
    'journal',
    'revision',
    'revision_content',
    'standing_event',
    'submission',
    'review_assignment',
    'review',
    'comment',
    'comment_answer',
    'comment_resolution',
    'approval',
    'problem_report',
    'notice',
    'mail',
  ];
  const counts = tables.map((table) => `(SELECT count(*) FROM ${table})`).join(" || ' ' || ");
  return test.connection.sqlite.prepare(`SELECT ${counts}`).pluck().get() as string;
}
