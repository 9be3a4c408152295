import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Desk } from '../src/desk/dto/desk.dto.js';
import type { ReviewPage } from '../src/reviews/dto/review-page.dto.js';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import { inState, lifeRows, REASON } from './support/life.js';
import { CHECKED, draft, openOffice, type TestOffice } from './support/office.js';
import { TEST_PASSWORD, signedInWith, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';
import { tubeSheet } from './support/sheets.js';

let office: TestOffice;
beforeAll(async () => {
  office = await openOffice();
});
afterAll(() => office.close());

const post = (who: SignedIn, path: string, body: object = {}) =>
  who.agent.post(`/api/correlations/${path}`).send(body);
const page = async (who: SignedIn, path: string): Promise<ReviewPage> =>
  (await who.agent.get(`/api/correlations/${path}/review`).expect(200)).body as ReviewPage;
const section = async ({ agent }: SignedIn, key: string) =>
  ((await agent.get('/api/desk').expect(200)).body as Desk).sections.find((one) => one.key === key)?.items;
const notices = async ({ agent }: SignedIn, kind: string): Promise<string[]> =>
  (
    (await agent.get('/api/notices?limit=200').expect(200)).body as {
      items: { kind: string; text: string }[];
    }
  ).items
    .filter((one) => one.kind === kind)
    .map(({ text }) => text);

/** One story from draft to approval, with a round of changes; each test takes up where the one before ended. */
describe('a revision goes through its review', () => {
  const path = 'story/revisions/1';
  let commentId = 0;

  test('is put before a named reviewer, with the report of the machine', async () => {
    draft(office, 'story', { title: 'Story' });
    expect((await section(office.engineer, 'drafts'))?.map(({ title }) => title)).toContain('Story');
    await post(office.engineer, `${path}/submission`, { reviewers: [office.reviewer.actor.id] }).expect(201);
    const seen = await page(office.reviewer, path);
    expect(seen).toMatchObject({
      slug: 'story',
      revision: 1,
      iteration: 1,
      standing: 'in review',
      hands: 'reviewers',
      reviewersNeeded: 2,
      originator: { id: office.engineer.actor.id, name: office.engineer.actor.name },
      inspection: { passed: true },
      assignments: [{ reviewer: { id: office.reviewer.actor.id }, how: 'named' }],
      approvals: { favourable: 0, needed: 2 },
      iterations: [{ number: 1, differences: [] }],
      abilities: { take: false, verdict: true, edit: false, approve: false, putForward: false },
    });
    expect(seen.inspection?.remarks.map(({ topic }) => topic)).toEqual(
      expect.arrayContaining(['definition', 'checks', 'range', 'sources']),
    );
    expect(await notices(office.reviewer, 'review-asked')).toHaveLength(1);
    expect((await section(office.reviewer, 'to-review'))?.map(({ title }) => title)).toContain('Story');
    expect((await section(office.engineer, 'drafts'))?.map(({ title }) => title)).not.toContain('Story');
  });

  test('is taken by a second reviewer, once', async () => {
    expect((await section(office.secondReviewer, 'to-take'))?.map(({ title }) => title)).toContain('Story');
    await post(office.secondReviewer, `${path}/assignments`).expect(201);
    const again = await post(office.secondReviewer, `${path}/assignments`);
    expect([again.status, codeOf(again)]).toEqual([409, 'duplicate']);
    expect((await page(office.secondReviewer, path)).assignments).toMatchObject([
      { how: 'named' },
      {
        reviewer: { id: office.secondReviewer.actor.id, name: office.secondReviewer.actor.name },
        how: 'taken',
      },
    ]);
    expect((await section(office.secondReviewer, 'to-take'))?.map(({ title }) => title)).not.toContain(
      'Story',
    );
  });

  test('is commented, answered, and resolved by those it is for', async () => {
    await post(office.reviewer, `${path}/comments`, { field: 'bounds[0]', text: 'Which page?' }).expect(201);
    const [comment] = (await page(office.engineer, path)).comments;
    commentId = comment?.id ?? 0;
    expect(comment).toMatchObject({
      field: 'bounds[0]',
      iteration: 1,
      resolved: null,
      answers: [],
      abilities: { answer: true, resolve: false },
    });
    expect(await notices(office.engineer, 'comment')).toHaveLength(1);
    expect(await section(office.engineer, 'open-comments')).toHaveLength(1);

    const early = await post(office.engineer, `${path}/comments/${commentId}/resolution`);
    expect([early.status, codeOf(early)]).toEqual([409, 'conflict']);
    for (const text of ['', '   ', 7, 'x'.repeat(4001)]) {
      await post(office.engineer, `${path}/comments/${commentId}/answers`, { text }).expect(400);
    }
    await post(office.engineer, `${path}/comments/${commentId}/answers`, { text: 'Page 3.' }).expect(201);
    expect(await section(office.engineer, 'open-comments')).toHaveLength(0);
    expect(await section(office.reviewer, 'open-comments')).toHaveLength(1);
    for (const [who, status] of [
      [office.secondReviewer, 403],
      [office.otherEngineer, 404],
      [office.auditor, 403],
    ] as const) {
      const refused = await post(who, `${path}/comments/${commentId}/resolution`);
      expect(refused.status).toBe(status);
    }
    await post(office.engineer, `${path}/comments/${commentId}/resolution`).expect(201);
    const [settled] = (await page(office.reviewer, path)).comments;
    expect(settled).toMatchObject({
      resolved: { by: { id: office.engineer.actor.id } },
      answers: [{ text: 'Page 3.', by: { id: office.engineer.actor.id } }],
      abilities: { answer: false, resolve: false },
    });
    for (const act of ['resolution', 'answers']) {
      const late = await post(
        office.reviewer,
        `${path}/comments/${commentId}/${act}`,
        act === 'answers' ? { text: 'But.' } : {},
      );
      expect([late.status, codeOf(late)]).toEqual([409, 'conflict']);
    }
    const other = await inState(office, 'in review');
    const elsewhere = await post(office.reviewer, `${other.slug}/revisions/1/comments/${commentId}/answers`, {
      text: 'Not here.',
    });
    expect(elsewhere.status).toBe(404);
  });

  test('goes back for changes, and no verdict is taken meanwhile', async () => {
    await post(office.reviewer, `${path}/reviews`, { verdict: 'recommend', checklist: CHECKED }).expect(201);
    const note = 'The exponent is 0.51 on that page.';
    await post(office.secondReviewer, `${path}/reviews`, {
      verdict: 'ask-for-changes',
      checklist: { ...CHECKED, expression: false },
      note,
    }).expect(201);
    expect(await page(office.engineer, path)).toMatchObject({
      standing: 'in review',
      hands: 'originator',
      abilities: { edit: true, putForward: true },
      approvals: { favourable: 1, needed: 2 },
    });
    expect(
      (await section(office.engineer, 'drafts'))?.find(({ title }) => title === 'Story')?.line,
    ).toContain('changes are asked for');
    expect(await notices(office.engineer, 'verdict')).toHaveLength(2);
    const meanwhile = await post(office.reviewer, `${path}/reviews`, {
      verdict: 'recommend',
      checklist: CHECKED,
    });
    expect([meanwhile.status, codeOf(meanwhile)]).toEqual([409, 'conflict']);
  });

  test('is changed and put forward again: the next iteration, with what changed, and earlier verdicts void', async () => {
    const { hash } = await page(office.engineer, path);
    const changed = tubeSheet({ title: 'Story' });
    changed.parts[0]!.result.expression = '2*Re^0.51';
    changed.checks[0]!.expected = { Sh: { value: 2 * 400 ** 0.51 } };
    await office.engineer.agent
      .put(`/api/correlations/${path}`)
      .set('If-Match', `"${hash}"`)
      .send({ definition: changed })
      .expect(200);
    expect((await page(office.reviewer, path)).hands).toBe('originator');
    await post(office.engineer, `${path}/iterations`, { note: 'Read it again: 0.51.' }).expect(201);
    const again = await post(office.engineer, `${path}/iterations`);
    expect([again.status, codeOf(again)]).toEqual([409, 'conflict']);
    const seen = await page(office.reviewer, path);
    expect(seen).toMatchObject({
      iteration: 2,
      hands: 'reviewers',
      rounds: [
        { round: 1, iteration: 1 },
        { round: 2, iteration: 2, note: 'Read it again: 0.51.' },
      ],
      approvals: { favourable: 0 },
    });
    expect(seen.verdicts.map(({ verdict, iteration, current }) => [verdict, iteration, current])).toEqual([
      ['recommend', 1, false],
      ['ask-for-changes', 1, false],
    ]);
    expect(
      seen.iterations.map(({ number, differences }) => [number, differences.map(({ path: at }) => at)]),
    ).toEqual([
      [1, []],
      [2, ['checks[Re 400].expected.Sh.value', 'parts[main].result.expression']],
    ]);
    expect(seen.iterations[1]?.differences[1]).toMatchObject({ before: '2*Re^0.5', after: '2*Re^0.51' });
    expect(await notices(office.reviewer, 'review-asked')).toHaveLength(2);
    // Nothing is lost: both contents, both rounds, the comment of the first.
    expect(seen.comments).toMatchObject([{ id: commentId, iteration: 1 }]);
  });

  test('is stopped by the machine when the change does not reproduce its check', async () => {
    const { hash } = await page(office.engineer, path);
    const slip = tubeSheet({ title: 'Story' });
    slip.parts[0]!.result.expression = '2*Re^0.52';
    await office.engineer.agent
      .put(`/api/correlations/${path}`)
      .set('If-Match', `"${hash}"`)
      .send({ definition: slip })
      .expect(200);
    const before = lifeRows(office);
    const response = await post(office.engineer, `${path}/iterations`);
    expect([response.status, codeOf(response)]).toEqual([422, 'machine-check']);
    expect(problemOf(response).inspection?.passed).toBe(false);
    expect(problemOf(response).fields).toMatchObject([{ field: 'definition.checks[0]', code: 'checks' }]);
    expect(lifeRows(office)).toBe(before);
    const right = tubeSheet({ title: 'Story' });
    const { hash: slipped } = await page(office.engineer, path);
    await office.engineer.agent
      .put(`/api/correlations/${path}`)
      .set('If-Match', `"${slipped}"`)
      .send({ definition: right })
      .expect(200);
    await post(office.engineer, `${path}/iterations`).expect(201);
    expect((await page(office.reviewer, path)).iterations.map(({ number }) => number)).toEqual([1, 2, 4]);
  });

  test('is recommended by two and signed; both are told', async () => {
    for (const who of [office.reviewer, office.secondReviewer]) {
      await post(who, `${path}/reviews`, { verdict: 'recommend', checklist: CHECKED }).expect(201);
    }
    expect((await section(office.authority, 'to-approve'))?.map(({ title }) => title)).toContain('Story');
    const { hash, abilities } = await page(office.authority, path);
    expect(abilities).toMatchObject({ approve: true, decline: true, verdict: false, edit: false });
    await post(office.authority, `${path}/approval`, {
      password: TEST_PASSWORD,
      meaning: 'For design',
      hash,
    }).expect(201);
    for (const who of [office.engineer, office.reviewer, office.secondReviewer]) {
      expect((await notices(who, 'approval')).filter((text) => text.includes('"Story"'))).toHaveLength(1);
    }
    const sheet = (await office.auditor.agent.get('/api/correlations/story').expect(200)).body as Sheet;
    expect(sheet).toMatchObject({
      standing: 'approved',
      inForce: true,
      iteration: 4,
      inspection: { passed: true, errors: 0 },
      openReports: 0,
      successor: null,
      withdrawal: null,
      suspension: null,
    });
    expect(sheet.reviewDue).toMatch(/T00:00:00\.000Z$/);
  });
});

describe('who has a say', () => {
  test('a reviewer drafts and submits as engineers do, and does not review that', async () => {
    await post(office.reviewer, '', { slug: 'by-a-reviewer', definition: tubeSheet() }).expect(201);
    const own = { reviewers: [office.reviewer.actor.id] };
    expect((await post(office.reviewer, 'by-a-reviewer/revisions/1/submission', own)).status).toBe(400);
    await post(office.reviewer, 'by-a-reviewer/revisions/1/submission').expect(201);
    for (const [act, body] of [
      ['assignments', {}],
      ['reviews', { verdict: 'recommend', checklist: CHECKED }],
    ] as const) {
      expect((await post(office.reviewer, `by-a-reviewer/revisions/1/${act}`, body)).status).toBe(403);
    }
  });

  test('a no of an authority ends it, with a reason, and the next revision starts anew', async () => {
    const { slug } = await inState(office, 'in review');
    const silent = await post(office.authority, `${slug}/revisions/1/decline`, { reason: 'No.' }).expect(400);
    expect(problemOf(silent).fields).toMatchObject([{ field: 'reason' }]);
    const { body } = await post(office.authority, `${slug}/revisions/1/decline`, { reason: REASON }).expect(
      201,
    );
    expect(body).toMatchObject({ standing: 'declined', standingNote: REASON });
    await post(office.engineer, `${slug}/revisions`, { definition: tubeSheet({ year: 1998 }) }).expect(201);
  });

  test('the number of reviews is for the office to set', async () => {
    const settings = (reviewsNeeded: number) =>
      office.administrator.agent
        .put('/api/settings')
        .send({
          officeName: 'Office for tests',
          reviewsNeeded,
          principal: office.otherEngineer.actor.id,
          reviewDueMonths: 36,
        })
        .expect(200);
    await settings(3);
    const record = await inState(office, 'recommended');
    const approve = () =>
      post(office.authority, `${record.slug}/revisions/1/approval`, {
        password: TEST_PASSWORD,
        meaning: 'Yes.',
        hash: record.hash,
      });
    expect((await approve()).status).toBe(409);
    expect((await page(office.authority, `${record.slug}/revisions/1`)).approvals).toEqual({
      favourable: 2,
      needed: 3,
    });
    await settings(2);
    expect((await approve()).status).toBe(201);
  });
});

describe('differences between revisions', () => {
  test('go field by field, either way, and not to what the caller may not see', async () => {
    const { slug } = await inState(office, 'superseded');
    const compare = (query: string, who = office.auditor) =>
      who.agent.get(`/api/correlations/${slug}/differences?${query}`);
    const { body } = await compare('from=1&to=2').expect(200);
    expect(body).toMatchObject({
      from: { revision: 1 },
      to: { revision: 2 },
      differences: [{ path: 'year', section: 'year', change: 'changed', before: 2001, after: 2011 }],
      before: { year: 2001 },
      after: { year: 2011 },
    });
    expect((await compare('from=2&to=1')).body).toMatchObject({
      differences: [{ before: 2011, after: 2001 }],
    });
    for (const [query, status] of [
      ['from=1', 400],
      ['from=1&to=x', 400],
      ['from=0&to=1', 400],
      ['from=1&to=9', 404],
    ] as const) {
      expect((await compare(query)).status, query).toBe(status);
    }
    await post(office.engineer, `${slug}/revisions`, { definition: tubeSheet({ year: 2020 }) }).expect(201);
    expect((await compare('from=2&to=3', office.otherEngineer)).status).toBe(404);
  });
});

describe('problem reports', () => {
  test('reach the authorities, lead to a suspension, and are answered once', async () => {
    const { slug } = await inState(office, 'approved');
    await office.otherEngineer.agent
      .post(`/api/correlations/${slug}/problem-reports`)
      .send({ revision: 1, severity: 'catastrophe', text: REASON })
      .expect(400);
    const filed = await office.otherEngineer.agent
      .post(`/api/correlations/${slug}/problem-reports`)
      .send({ revision: 1, severity: 'unsafe', text: 'The limit of Re is twice that of the source.' })
      .expect(201);
    const { id } = filed.body as { id: number };
    expect(filed.body).toMatchObject({ slug, revision: 1, answer: null, abilities: { answer: false } });
    expect((await notices(office.authority, 'report')).at(0)).toContain('unsafe');
    expect((await section(office.authority, 'reports'))?.length).toBeGreaterThan(0);
    expect((await office.engineer.agent.get(`/api/correlations/${slug}`)).body).toMatchObject({
      openReports: 1,
    });

    const other = await inState(office, 'approved');
    const elsewhere = await post(office.authority, `${other.slug}/revisions/1/suspension`, {
      reason: REASON,
      problemReport: id,
    });
    expect(problemOf(elsewhere).fields).toMatchObject([{ field: 'problemReport' }]);
    const suspended = await post(office.authority, `${slug}/revisions/1/suspension`, {
      reason: REASON,
      problemReport: id,
    }).expect(201);
    expect(suspended.body).toMatchObject({
      standing: 'suspended',
      suspension: { reason: REASON, by: { id: office.authority.actor.id }, problemReport: id },
    });
    const answer = (who: SignedIn) =>
      who.agent.post(`/api/problem-reports/${id}/answer`).send({ outcome: 'suspended', text: REASON });
    expect((await answer(office.engineer)).status).toBe(403);
    await answer(office.authority).expect(201);
    expect((await answer(office.secondAuthority)).status).toBe(409);
    expect(await notices(office.otherEngineer, 'report')).toHaveLength(1);
    const { body } = await office.auditor.agent.get(`/api/correlations/${slug}/problem-reports`).expect(200);
    expect(body).toMatchObject({
      items: [
        { id, severity: 'unsafe', answer: { outcome: 'suspended', by: { id: office.authority.actor.id } } },
      ],
    });
  });

  test('are for what is or was in use', async () => {
    const { slug } = await inState(office, 'draft');
    const response = await office.reviewer.agent
      .post(`/api/correlations/${slug}/problem-reports`)
      .send({ revision: 1, severity: 'error', text: REASON });
    expect([response.status, codeOf(response)]).toEqual([409, 'conflict']);
    await office.otherEngineer.agent.get(`/api/correlations/${slug}/problem-reports`).expect(404);
  });
});

describe('a withdrawal', () => {
  test('names a successor that is in force, and tells everybody who used the sheet', async () => {
    const { slug } = await inState(office, 'approved');
    const successor = await inState(office, 'approved');
    const suspended = await inState(office, 'suspended');
    const withdraw = (name: string) =>
      post(office.authority, `${slug}/revisions/1/withdrawal`, {
        reason: REASON,
        class: 'error-in-source',
        successor: name,
      });
    for (const name of ['no-such', slug, suspended.slug]) {
      const refused = await withdraw(name);
      expect(refused.status, name).toBe(400);
      expect(problemOf(refused).fields).toMatchObject([{ field: 'successor' }]);
    }
    await office.otherEngineer.agent
      .post(`/api/correlations/${slug}/evaluations`)
      .send({ inputs: { Re: { value: 400 } } })
      .expect(200);
    expect((await withdraw(successor.slug).expect(201)).body).toMatchObject({
      standing: 'withdrawn',
      inForce: false,
      withdrawal: { reason: REASON, class: 'error-in-source', by: { id: office.authority.actor.id } },
      successor: { slug: successor.slug, revision: 1, title: successor.title },
    });
    expect(await notices(office.otherEngineer, 'withdrawal')).toHaveLength(1);
    const late = await withdraw(successor.slug);
    expect([late.status, codeOf(late)]).toEqual([409, 'conflict']);
  });
});

describe('the desk', () => {
  test('has the sections of each role, each with a word for when nothing waits', async () => {
    const keys = async ({ agent }: SignedIn) => {
      const { sections } = (await agent.get('/api/desk').expect(200)).body as Desk;
      expect(sections.every(({ title, empty }) => title.length > 3 && empty.endsWith('.'))).toBe(true);
      return sections.map(({ key }) => key);
    };
    expect(await keys(office.engineer)).toEqual(['drafts', 'open-comments', 'reports', 'due', 'notices']);
    expect(await keys(office.reviewer)).toEqual([
      'drafts',
      'to-review',
      'open-comments',
      'to-take',
      'reports',
      'due',
      'notices',
    ]);
    expect(await keys(office.authority)).toEqual([
      'open-comments',
      'to-approve',
      'reports',
      'due',
      'appointments',
      'notices',
    ]);
    expect(await keys(office.auditor)).toEqual(['notices']);
    expect(await keys(office.administrator)).toEqual(['appointments', 'notices']);
    const nobody = await signedInWith(office.test, 'auditor');
    expect(await section(nobody, 'notices')).toEqual([]);
  });

  test('shows nobody what they may not see', async () => {
    const { slug } = await inState(office, 'in review');
    const { body } = await office.otherEngineer.agent.get('/api/desk').expect(200);
    expect(JSON.stringify(body)).not.toContain(slug);
  });
});
