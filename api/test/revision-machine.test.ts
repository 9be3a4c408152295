import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Actor } from '../src/common/actor.js';
import { ApiProblem } from '../src/common/problem.js';
import { journalSize } from '../src/database/append-to-journal.js';
import { DraftingService } from '../src/correlations/drafting.service.js';
import { verifyJournal } from '../src/journal/verify-journal.js';
import { JournalRepository } from '../src/journal/journal.repository.js';
import { ApprovalService } from '../src/reviews/approval.service.js';
import { ReviewingService } from '../src/reviews/reviewing.service.js';
import { StandingService } from '../src/reviews/standing.service.js';
import { SubmissionService } from '../src/reviews/submission.service.js';
import { SupersessionService } from '../src/reviews/supersession.service.js';
import type { RevisionRecord } from '../src/revisions/revision-record.js';
import { RevisionsService } from '../src/revisions/revisions.service.js';
import { appointed, dayIn } from './support/appointments.js';
import { REASON } from './support/life.js';
import { CHECKED, openOffice, type TestOffice } from './support/office.js';
import { addPerson, TEST_PASSWORD } from './support/people.js';
import { tubeSheet } from './support/sheets.js';

/** Random acts by random people on one correlation, through the services, with time going by. */
let office: TestOffice;
let people: Actor[];
let correlations = 0;
let approvals = 0;
let supersessions = 0;

beforeAll(async () => {
  office = await openOffice();
  const { test: app, engineer, reviewer, secondReviewer, authority, administrator, otherEngineer } = office;
  const everything = await addPerson(app, { roles: ['engineer', 'reviewer', 'authority'] });
  const reviewingEngineer = await addPerson(app, { roles: ['engineer', 'reviewer'] });
  const draftingAuthority = await addPerson(app, { roles: ['engineer', 'authority'] });
  for (const { id } of [everything, draftingAuthority, authority.actor]) {
    // Long enough for all the time that goes by here.
    const until = dayIn(app, 3600);
    await appointed(app, { proposer: administrator, confirmer: otherEngineer }, id, { until });
  }
  people = [
    engineer.actor,
    reviewer.actor,
    secondReviewer.actor,
    authority.actor,
    administrator.actor,
    everything,
    reviewingEngineer,
    draftingAuthority,
  ];
});
afterAll(() => office.close());

/** The more often named, the more often tried. */
const ACTS = [
  ...(['recommended by all', 'recommended by all', 'recommended by all', 'recommend', 'submit'] as const),
  ...(['approve', 'approve', 'approve', 'approve later', 'approve later'] as const),
  ...(['next', 'next', 'next', 'next', 'edit', 'ask', 'put forward', 'decline verdict', 'decline'] as const),
  ...(['suspend', 'reinstate', 'withdraw', 'wait', 'wait', 'tick'] as const),
] as const;

interface Step {
  readonly act: (typeof ACTS)[number];
  readonly who: number;
  /** Picks a revision, a year for the content, a number of days. */
  readonly pick: number;
}

const steps = fc.array(
  fc.record<Step>({
    act: fc.constantFrom(...ACTS),
    who: fc.nat({ max: 7 }),
    pick: fc.nat({ max: 30 }),
  }),
  { minLength: 50, maxLength: 70, size: 'max' },
);

const revisionsOf = (slug: string): RevisionRecord[] =>
  office.test.app.get(RevisionsService).all('correlation', slug);
const size = (): number => journalSize(office.test.connection.reader);
const pluck = (sql: string, ...values: unknown[]): unknown[] =>
  office.test.connection.sqlite
    .prepare(sql)
    .pluck()
    .all(...values);

/** Somebody who could do it more likely than just anybody, so that the walks get somewhere. */
function suited(act: Step['act'], who: number, { originatorId }: RevisionRecord): number {
  if (['submit', 'put forward', 'edit'].includes(act)) {
    return people.findIndex(({ id }) => id === originatorId);
  }
  const authorities = ['approve', 'approve later', 'decline', 'suspend', 'reinstate', 'withdraw'];
  return authorities.includes(act) ? [3, 5, 7][who % 3]! : who;
}

/** Does one step. How many acts the journal has to tell of. */
async function take({ act, who, pick }: Step, slug: string): Promise<number> {
  const { app, clock } = office.test;
  const all = revisionsOf(slug);
  const record = pick % 3 === 0 ? all[pick % all.length]! : all.at(-1)!;
  const actor = people[pick % 4 === 0 ? who : suited(act, who, record)]!;
  const content = tubeSheet({ year: 1950 + pick });
  switch (act) {
    case 'wait':
      clock.forward((pick % 4) * 24 * 60);
      return 0;
    case 'tick':
      app.get(SupersessionService).writeDown(clock.now());
      return 0;
    case 'next':
      app.get(DraftingService).next(actor, slug, content);
      return 1;
    case 'edit': {
      const edited = app.get(DraftingService).edit(actor, record, content, record.hash);
      return record.standing === 'in review' && edited.iteration > record.iteration ? 1 : 0;
    }
    case 'submit':
      app.get(SubmissionService).submit(actor, record, {});
      return 1;
    case 'put forward':
      app.get(SubmissionService).putForward(actor, record, undefined);
      return 1;
    case 'recommended by all': {
      // Put before them first, if the turn is the originator's; the odd picks lead to the originator and the last one.
      const put = { who, pick: 1 };
      let given = await attempted({ act: 'submit', ...put }, slug);
      given += await attempted({ act: 'put forward', ...put }, slug);
      for (const reviewer of people.keys()) {
        given += await attempted({ act: 'recommend', who: reviewer, pick: 1 }, slug);
      }
      return given;
    }
    case 'recommend':
    case 'ask':
    case 'decline verdict': {
      const verdict = act === 'ask' ? 'ask-for-changes' : act === 'recommend' ? 'recommend' : 'decline';
      app.get(ReviewingService).review(actor, record, { verdict, checklist: CHECKED, note: REASON });
      return 1;
    }
    case 'approve':
    case 'approve later':
      await app.get(ApprovalService).approve(actor, record, {
        password: TEST_PASSWORD,
        meaning: 'Random',
        hash: record.hash,
        ...(act === 'approve' ? {} : { effectiveFrom: dayIn(office.test, 1 + (pick % 4)) }),
      });
      approvals += 1;
      return 1;
    case 'decline':
      app.get(ApprovalService).decline(actor, record, REASON);
      return 1;
    case 'suspend':
      app.get(StandingService).suspend(actor, record, { reason: REASON });
      return 1;
    case 'reinstate':
      app.get(StandingService).reinstate(actor, record, REASON);
      return 1;
    case 'withdraw':
      app.get(StandingService).withdraw(actor, record, { reason: REASON, class: 'unsafe' });
      return 1;
  }
}

/** What must hold whatever was done. */
function assertSound(slug: string, approvedBefore: ReadonlyMap<number, string>): void {
  const all = revisionsOf(slug);
  expect(all.filter(({ inForce }) => inForce).length).toBeLessThanOrEqual(1);
  for (const { id, hash } of all) {
    expect(hash).toBe(approvedBefore.get(id) ?? hash);
    const texts = pluck(
      'SELECT canonical_text FROM revision_content WHERE revision_id = ? ORDER BY iteration',
      id,
    );
    expect(
      createHash('sha256')
        .update(String(texts.at(-1)), 'utf8')
        .digest('hex'),
    ).toBe(hash);
  }
  assertFourEyes(all);
}

function assertFourEyes(all: readonly RevisionRecord[]): void {
  for (const { id, originatorId } of all) {
    const reviewers = pluck('SELECT reviewer_id FROM review WHERE revision_id = ?', id);
    expect(reviewers).not.toContain(originatorId);
    for (const signer of pluck('SELECT by_id FROM approval WHERE revision_id = ?', id)) {
      expect([originatorId, ...reviewers]).not.toContain(signer);
      const favourable = pluck(
        `SELECT DISTINCT reviewer_id FROM review JOIN approval USING (revision_id, hash)
         WHERE revision_id = ? AND verdict = 'recommend'`,
        id,
      );
      expect(favourable.length).toBeGreaterThanOrEqual(2);
    }
  }
}

/** Refusals are problems with a code; anything else is a fault of the program. */
async function attempted(step: Step, slug: string): Promise<number> {
  try {
    return await take(step, slug);
  } catch (error) {
    if (!(error instanceof ApiProblem) || error.status >= 500) throw error;
    return 0;
  }
}

describe('the life of a revision, whatever people try', () => {
  test('keeps its promises', async () => {
    await fc.assert(
      fc.asyncProperty(steps, async (taken) => {
        const slug = `random-${(correlations += 1)}`;
        office.test.app.get(DraftingService).create(office.engineer.actor, slug, tubeSheet());
        const approvedHashes = new Map<number, string>();
        const start = size();
        let acts = await attempted({ act: 'submit', who: 0, pick: 0 }, slug);
        for (const step of taken) {
          const before = size();
          const journalled = await attempted(step, slug);
          if (journalled === 0 && step.act !== 'tick') expect(size()).toBe(before);
          acts += journalled;
          // A refused act wrote nothing, as was seen; only time may have changed what counts.
          if (journalled === 0 && step.act !== 'wait') continue;
          for (const one of revisionsOf(slug)) {
            if (one.effectiveFrom !== null)
              approvedHashes.set(one.id, approvedHashes.get(one.id) ?? one.hash);
          }
          assertSound(slug, approvedHashes);
        }
        const superseded = pluck(
          `SELECT count(*) FROM journal WHERE "index" >= ? AND act = 'revision.superseded'`,
          start,
        )[0] as number;
        supersessions += superseded;
        expect(size() - start).toBe(acts + superseded);

        // Writing down what time has done changes nothing that anybody sees.
        const seen = revisionsOf(slug).map(({ standing, inForce, standingAt }) => [
          standing,
          inForce,
          standingAt,
        ]);
        office.test.app.get(SupersessionService).writeDown(office.test.clock.now());
        expect(
          revisionsOf(slug).map(({ standing, inForce, standingAt }) => [standing, inForce, standingAt]),
        ).toEqual(seen);
      }),
      { numRuns: 25 },
    );
    // The walks have to get far enough to be worth anything.
    expect(approvals).toBeGreaterThan(8);
    expect(supersessions).toBeGreaterThan(0);
    expect(verifyJournal(office.test.app.get(JournalRepository)).ok).toBe(true);
  }, 120_000);
});
