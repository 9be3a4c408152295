import { afterAll, beforeEach, describe, expect, test } from 'vitest';
import type { CorrelationPage } from '../src/correlations/dto/correlation-page.dto.js';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import type { GeometriesResponse } from '../src/geometries/dto/geometries-response.dto.js';
import { monthsAfter } from '../src/reviews/effective-dates.js';
import { ScheduleService } from '../src/schedule/schedule.service.js';
import { dayIn } from './support/appointments.js';
import { REASON } from './support/life.js';
import { approved, draft, openOffice, recommended, type TestOffice } from './support/office.js';
import { TEST_PASSWORD, signInAs, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';
import { tubeSheet, TUBE_INPUTS } from './support/sheets.js';

const DAY = 24 * 60;

let office: TestOffice;
beforeEach(async () => {
  await (office as TestOffice | undefined)?.close();
  office = await openOffice();
});
afterAll(() => office.close());

/** Signed in anew, since time goes by. */
const ask = async ({ email }: SignedIn) => signInAs(office.test, email);
const sheetOf = async (who: SignedIn, path: string): Promise<Sheet> =>
  (await (await ask(who)).get(`/api/correlations/${path}`).expect(200)).body as Sheet;
const listed = async (query: string) =>
  ((await (await ask(office.engineer)).get(`/api/correlations?${query}`).expect(200)).body as CorrelationPage)
    .items;
const tick = () => office.test.app.get(ScheduleService).tick();
const journalled = (act: string): unknown[] =>
  office.test.connection.sqlite.prepare('SELECT subject FROM journal WHERE act = ?').pluck().all(act);

async function approveNext(slug: string, dates: object, hash?: string) {
  const next = await office.otherEngineer.agent
    .post(`/api/correlations/${slug}/revisions`)
    .send({ definition: tubeSheet({ year: 2010 }) })
    .expect(201);
  const { revision: number, hash: present } = next.body as Sheet;
  recommended(office, { kind: 'correlation', slug, number }, office.otherEngineer.actor);
  return office.authority.agent
    .post(`/api/correlations/${slug}/revisions/${number}/approval`)
    .send({ password: TEST_PASSWORD, meaning: 'Approved for tests', hash: hash ?? present, ...dates });
}

describe('an approval from a later date', () => {
  test('lets the revision before stand until then, on every page', async () => {
    await approved(office, draft(office, 'dated'));
    const response = await approveNext('dated', { effectiveFrom: dayIn(office.test, 10) });
    expect(response.status).toBe(201);
    const next = response.body as Sheet;
    expect(next).toMatchObject({
      standing: 'approved',
      inForce: false,
      effectiveFrom: `${dayIn(office.test, 10)}T00:00:00.000Z`,
    });
    const shown = await sheetOf(office.engineer, 'dated');
    expect(shown).toMatchObject({ revision: 1, standing: 'approved', inForce: true, successor: null });
    expect((await listed('geometry=tube')).map(({ slug, revision }) => [slug, revision])).toEqual([
      ['dated', 1],
    ]);

    const evaluate = (body: object) =>
      office.engineer.agent
        .post('/api/correlations/dated/evaluations')
        .send({ inputs: TUBE_INPUTS, ...body });
    expect((await evaluate({})).body).toMatchObject({ revision: 1 });
    const early = await evaluate({ revision: 2 });
    expect([early.status, codeOf(early)]).toEqual([409, 'not-in-use']);
  });

  test.each([
    ['read before anything is written down', false],
    ['written down by the schedule', true],
  ])('takes the place when its day comes: %s', async (_name, ticks) => {
    await approved(office, draft(office, 'dated'));
    await approveNext('dated', { effectiveFrom: dayIn(office.test, 10) });
    office.test.clock.forward(10 * DAY);
    if (ticks) await tick();

    const shown = await sheetOf(office.engineer, 'dated');
    expect(shown).toMatchObject({ revision: 2, standing: 'approved', inForce: true });
    expect(shown.revisions.map(({ standing }) => standing)).toEqual(['superseded', 'approved']);
    const former = await sheetOf(office.engineer, 'dated/revisions/1');
    expect(former).toMatchObject({
      standing: 'superseded',
      standingNote: 'Superseded by revision 2.',
      successor: { slug: 'dated', revision: 2, title: tubeSheet().title },
    });
    expect((await listed('standing=superseded')).map(({ revision }) => revision)).toEqual([1]);
    expect((await listed('standing=approved')).map(({ revision }) => revision)).toEqual([2]);
    const { items } = (await (await ask(office.engineer)).get('/api/geometries').expect(200))
      .body as GeometriesResponse;
    expect(items.find(({ slug }) => slug === 'tube')).toMatchObject({ total: 1, approved: 1 });
    expect(journalled('revision.superseded')).toEqual(ticks ? ['correlations/dated/revisions/1'] : []);
    await tick();
    await tick();
    expect(journalled('revision.superseded')).toHaveLength(1);
  });

  test('is called off by a suspension or withdrawal before its day', async () => {
    await approved(office, draft(office, 'called-off'));
    await approveNext('called-off', { effectiveFrom: dayIn(office.test, 5) });
    const act = (name: string, body: object) =>
      office.authority.agent.post(`/api/correlations/called-off/revisions/2/${name}`).send(body);
    await act('suspension', { reason: REASON }).expect(201);
    office.test.clock.forward(6 * DAY);
    await tick();
    expect(await sheetOf(office.engineer, 'called-off')).toMatchObject({ revision: 1, inForce: true });

    const authority = await ask(office.authority);
    await authority
      .post('/api/correlations/called-off/revisions/2/reinstatement')
      .send({ reason: REASON })
      .expect(201);
    expect(await sheetOf(office.engineer, 'called-off')).toMatchObject({ revision: 2, inForce: true });
    expect((await sheetOf(office.engineer, 'called-off/revisions/1')).standing).toBe('superseded');
  });

  test('stands when the suspension came after its day, whoever wrote what down first', async () => {
    await approved(office, draft(office, 'late'));
    await approveNext('late', { effectiveFrom: dayIn(office.test, 5) });
    office.test.clock.forward(6 * DAY);
    const authority = await ask(office.authority);
    await authority
      .post('/api/correlations/late/revisions/2/suspension')
      .send({ reason: REASON })
      .expect(201);
    expect((await sheetOf(office.engineer, 'late/revisions/1')).standing).toBe('superseded');
    expect((await sheetOf(office.engineer, 'late')).inForce).toBe(false);
  });

  test('of a suspended revision that comes back too late: superseded', async () => {
    await approved(office, draft(office, 'back'));
    await approveNext('back', { effectiveFrom: dayIn(office.test, 5) });
    const post = async (name: string): Promise<void> => {
      const authority = await ask(office.authority);
      const path = `/api/correlations/back/revisions/1/${name}`;
      await authority.post(path).send({ reason: REASON }).expect(201);
    };
    await post('suspension');
    office.test.clock.forward(6 * DAY);
    await post('reinstatement');
    expect((await sheetOf(office.engineer, 'back/revisions/1')).standing).toBe('superseded');
  });

  test.each<[object, string]>([
    [{ effectiveFrom: '2020-01-01' }, 'effectiveFrom'],
    [{ effectiveFrom: '2027-02-30' }, 'effectiveFrom'],
    [{ effectiveFrom: 'soon' }, 'effectiveFrom'],
    [{ effectiveFrom: 20270101 }, 'effectiveFrom'],
    [{ effectiveFrom: '9999-01-01' }, 'effectiveFrom'],
    [{ reviewDue: '2020-01-01' }, 'reviewDue'],
    [{ reviewDue: '2999-01-01' }, 'reviewDue'],
  ])('refuses %j at its field, and signs nothing', async (dates, field) => {
    draft(office, 'refused');
    recommended(office, { kind: 'correlation', slug: 'refused', number: 1 });
    const { hash } = await sheetOf(office.authority, 'refused');
    const response = await office.authority.agent
      .post('/api/correlations/refused/revisions/1/approval')
      .send({ password: TEST_PASSWORD, meaning: 'Yes.', hash, ...dates });
    expect(response.status).toBe(400);
    expect(problemOf(response).fields?.map((one) => one.field)).toEqual([field]);
    expect((await sheetOf(office.authority, 'refused')).standing).toBe('in review');
  });

  test('holds at once when it says today', async () => {
    await approved(office, draft(office, 'today'));
    await approveNext('today', { effectiveFrom: dayIn(office.test, 0) });
    expect(await sheetOf(office.engineer, 'today')).toMatchObject({ revision: 2, inForce: true });
  });
});

describe('the day of the next review', () => {
  test("is the office's number of months ahead, or as given", async () => {
    await approved(office, draft(office, 'reviewed'));
    const { effectiveFrom, reviewDue } = await sheetOf(office.engineer, 'reviewed');
    expect(reviewDue).toBe(monthsAfter(effectiveFrom ?? '', 36));
    await approveNext('reviewed', { reviewDue: dayIn(office.test, 100) });
    expect((await sheetOf(office.engineer, 'reviewed')).reviewDue).toBe(
      `${dayIn(office.test, 100)}T00:00:00.000Z`,
    );
  });

  test('is the last of a month that has fewer days', () => {
    expect(monthsAfter('2026-01-31T10:00:00.000Z', 1)).toBe('2026-02-28T00:00:00.000Z');
    expect(monthsAfter('2024-02-29T10:00:00.000Z', 12)).toBe('2025-02-28T00:00:00.000Z');
    expect(monthsAfter('2026-12-01T00:00:00.000Z', 36)).toBe('2029-12-01T00:00:00.000Z');
  });

  test('is reminded of thirty days before and on the day, once each', async () => {
    await approved(office, draft(office, 'remembered'));
    await approveNext('remembered', { reviewDue: dayIn(office.test, 100) });
    const reminders = (who: SignedIn): unknown[] =>
      office.test.connection.sqlite
        .prepare("SELECT text FROM notice WHERE kind = 'reminder' AND person_id = ? ORDER BY id")
        .pluck()
        .all(who.actor.id);
    await tick();
    expect(reminders(office.authority)).toEqual([]);
    office.test.clock.forward(71 * DAY);
    await tick();
    await tick();
    expect(reminders(office.authority)).toHaveLength(1);
    expect(reminders(office.otherEngineer)).toEqual(reminders(office.authority));
    expect(reminders(office.reviewer)).toEqual([]);
    office.test.clock.forward(30 * DAY);
    await tick();
    await tick();
    expect(reminders(office.authority)).toMatchObject(
      [/ is due /, / was due /].map((text) => expect.stringMatching(text) as string),
    );
    expect(journalled('revision.review-due')).toHaveLength(2);
  });
});
