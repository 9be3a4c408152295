import type { CorrelationDefinition } from '@merestone/engine';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import {
  approved,
  CHECKED,
  draft,
  openOffice,
  recommended,
  rowCounts,
  submitted,
  type TestOffice,
} from './support/office.js';
import { TEST_PASSWORD, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';
import { tubeSheet } from './support/sheets.js';

let office: TestOffice;

beforeAll(async () => {
  office = await openOffice();
});
afterAll(() => office.close());

const post = (who: SignedIn, path: string, body: object) =>
  who.agent.post(`/api/correlations/${path}`).send(body);
const sheetOf = async (who: SignedIn, path: string): Promise<Sheet> =>
  (await who.agent.get(`/api/correlations/${path}`).expect(200)).body as Sheet;
const signature = (hash: string, password = TEST_PASSWORD) => ({
  password,
  meaning: 'Approved for tests',
  hash,
});

async function put(who: SignedIn, path: string, definition: CorrelationDefinition, hash?: string) {
  const request = who.agent.put(`/api/correlations/${path}`);
  if (hash !== undefined) request.set('If-Match', `"${hash}"`);
  return request.send({ definition });
}

describe('drafting', () => {
  test.each<[string, Partial<Record<keyof CorrelationDefinition, unknown>>, string, string]>([
    [
      'a unit that is none',
      { quantities: [{ symbol: 'u', is: 'mean-velocity-in-tube', unit: 'parsec/moon' }] },
      'unit',
      'definition.quantities[0].unit',
    ],
    [
      'a group with a dimension',
      { groups: [{ symbol: 'Re', name: 'Reynolds', expression: 'rho*u*d' }] },
      'dimension',
      'definition.groups[0].expression',
    ],
    [
      'an unknown name',
      { groups: [{ symbol: 'Re', name: 'Reynolds', expression: 'rho*u*d/nu' }] },
      'expression',
      'definition.groups[0].expression',
    ],
    [
      'a call into the program',
      { groups: [{ symbol: 'Re', name: 'Reynolds', expression: 'constructor("x")' }] },
      'expression',
      'definition.groups[0].expression',
    ],
    ['no title', { title: undefined }, 'malformed', 'definition.title'],
    ['a field that there is not', { secret: true } as object, 'malformed', 'definition.secret'],
    ['a geometry that is not here', { geometry: 'moon' }, 'malformed', 'definition.geometry'],
    [
      'bounds out of order',
      {
        bounds: [
          {
            on: 'Re',
            basis: 'stated',
            stretches: [{ lo: { value: 9, nature: 'data' }, hi: { value: 1, nature: 'data' } }],
          },
        ],
      },
      'definition',
      'definition.bounds[0].stretches[0]',
    ],
  ])('refuses %s with its path', async (_name, overrides, code, field) => {
    const before = rowCounts(office);
    const definition = { ...tubeSheet(), ...overrides };
    const response = await post(office.engineer, '', { slug: 'faulty', definition });
    expect(response.status).toBe(400);
    expect(codeOf(response)).toBe(code);
    expect(problemOf(response).fields?.map((one) => one.field)).toContain(field);
    expect(rowCounts(office)).toEqual(before);
  });

  test.each([['Two Words'], ['UPPER'], ['-a'], ['a'.repeat(81)], [''], ['../x'], [7]])(
    'refuses the slug %j',
    async (slug) => {
      const response = await post(office.engineer, '', { slug, definition: tubeSheet() });
      expect(response.status).toBe(400);
      expect(problemOf(response).fields?.map(({ field }) => field)).toEqual(['slug']);
    },
  );

  test('makes a draft that its originator sees, with the hash of its canonical text', async () => {
    const response = await post(office.engineer, '', { slug: 'first', definition: tubeSheet() }).expect(201);
    const sheet = response.body as Sheet;
    expect(sheet).toMatchObject({ slug: 'first', revision: 1, iteration: 1, standing: 'draft' });
    expect(sheet.abilities).toMatchObject({
      edit: true,
      submit: true,
      evaluate: true,
      review: false,
      approve: false,
    });
    expect(response.headers.etag).toBe(`"${sheet.hash}"`);
    const again = await post(office.otherEngineer, '', { slug: 'first', definition: tubeSheet() });
    expect([again.status, codeOf(again)]).toEqual([409, 'duplicate']);
  });

  test('shows a draft to nobody whom it does not concern', async () => {
    draft(office, 'hidden');
    for (const who of [office.otherEngineer, office.administrator]) {
      await who.agent.get('/api/correlations/hidden').expect(404);
      await who.agent.get('/api/correlations/hidden/revisions/1').expect(404);
    }
    for (const who of [office.reviewer, office.authority, office.auditor]) {
      expect((await sheetOf(who, 'hidden')).standing).toBe('draft');
    }
  });
});

describe('editing', () => {
  test('needs the hash of what was edited, and takes only the present one', async () => {
    const { hash } = draft(office, 'edited');
    const changed = tubeSheet({ title: 'Another title' });
    const without = await put(office.engineer, 'edited/revisions/1', changed);
    expect([without.status, codeOf(without)]).toEqual([428, 'if-match-needed']);
    const odd = await office.engineer.agent
      .put('/api/correlations/edited/revisions/1')
      .set('If-Match', 'W/"x"')
      .send({ definition: changed });
    expect([odd.status, codeOf(odd)]).toEqual([400, 'malformed']);
    const first = await put(office.engineer, 'edited/revisions/1', changed, hash);
    expect(first.body).toMatchObject({ title: 'Another title', iteration: 2 });
    const stale = await put(office.engineer, 'edited/revisions/1', tubeSheet({ title: 'Lost' }), hash);
    expect([stale.status, codeOf(stale)]).toEqual([409, 'stale']);
    expect((await sheetOf(office.engineer, 'edited')).title).toBe('Another title');
  });

  test('is for the originator, and moves nothing to another geometry', async () => {
    const { hash } = draft(office, 'edited-by-others');
    const other = await put(office.otherEngineer, 'edited-by-others/revisions/1', tubeSheet(), hash);
    expect(other.status).toBe(404);
    const reviewer = await put(office.reviewer, 'edited-by-others/revisions/1', tubeSheet(), hash);
    expect(reviewer.status).toBe(403);
    const moved = await put(
      office.engineer,
      'edited-by-others/revisions/1',
      tubeSheet({ geometry: 'ball' }),
      hash,
    );
    expect(problemOf(moved).fields?.map(({ field }) => field)).toEqual(['definition.geometry']);
  });

  test('in review is the next iteration, voids the verdicts and gives the turn to the originator', async () => {
    const key = draft(office, 'edited-in-review');
    const { hash } = recommended(office, key);
    const response = await put(
      office.engineer,
      'edited-in-review/revisions/1',
      tubeSheet({ year: 2002 }),
      hash,
    );
    const sheet = response.body as Sheet;
    expect(sheet).toMatchObject({ standing: 'in review', iteration: 2 });
    expect(sheet.reviews.map(({ current }) => current)).toEqual([false, false]);
    const early = await post(office.reviewer, 'edited-in-review/revisions/1/reviews', {
      verdict: 'recommend',
      checklist: CHECKED,
    });
    expect([early.status, codeOf(early)]).toEqual([409, 'conflict']);
    await post(office.engineer, 'edited-in-review/revisions/1/iterations', {}).expect(201);
    const approval = await post(
      office.authority,
      'edited-in-review/revisions/1/approval',
      signature(sheet.hash),
    );
    expect([approval.status, codeOf(approval)]).toEqual([409, 'conflict']);
  });

  test('back to what was recommended does not bring the verdicts back', async () => {
    const key = draft(office, 'edited-to-and-fro');
    const { hash } = recommended(office, key);
    const there = await put(
      office.engineer,
      'edited-to-and-fro/revisions/1',
      tubeSheet({ year: 2002 }),
      hash,
    );
    const back = await put(
      office.engineer,
      'edited-to-and-fro/revisions/1',
      tubeSheet(),
      (there.body as Sheet).hash,
    );
    expect(back.body).toMatchObject({ hash, iteration: 3 });
    await post(office.engineer, 'edited-to-and-fro/revisions/1/iterations', {}).expect(201);
    const approval = await post(office.authority, 'edited-to-and-fro/revisions/1/approval', signature(hash));
    expect([approval.status, codeOf(approval)]).toEqual([409, 'conflict']);
    expect(problemOf(approval).detail).toContain('there are 0');
  });
});

describe('submission', () => {
  test('stops a sheet that does not reproduce its own checks', async () => {
    draft(office, 'slip', {
      checks: [
        {
          title: 'Wrong on purpose',
          kind: 'computed',
          inputs: { Re: { value: 400 } },
          expected: { Sh: { value: 41 } },
          tolerancePercent: 1,
        },
      ],
    });
    const before = rowCounts(office);
    const response = await post(office.engineer, 'slip/revisions/1/submission', {});
    expect([response.status, codeOf(response)]).toEqual([422, 'machine-check']);
    expect(problemOf(response).fields).toMatchObject([{ field: 'definition.checks[0]' }]);
    expect(problemOf(response).detail).toContain('Wrong on purpose');
    expect(problemOf(response).inspection).toMatchObject({ passed: false });
    expect(rowCounts(office)).toEqual(before);
  });

  test('stops a sheet that names a property equation nobody has', async () => {
    const quantities = tubeSheet().quantities.map((one) =>
      one.symbol === 'mu' ? { ...one, equations: ['no-such-equation'] } : one,
    );
    draft(office, 'dangling', { quantities });
    const response = await post(office.engineer, 'dangling/revisions/1/submission', {}).expect(422);
    expect(problemOf(response).fields).toMatchObject([{ field: 'definition.quantities[3].equations' }]);
  });

  test('asks people who can review, and tells why it was put forward', async () => {
    draft(office, 'put-forward');
    const path = 'put-forward/revisions/1/submission';
    for (const id of [office.authority.actor.id, 'nobody']) {
      const refused = await post(office.engineer, path, { reviewers: [id] }).expect(400);
      expect(problemOf(refused).fields).toMatchObject([{ field: 'reviewers.0' }]);
    }
    const { body } = await post(office.engineer, path, {
      reviewers: [office.reviewer.actor.id],
      note: 'Read in the paper itself.',
    }).expect(201);
    expect(body).toMatchObject({ standing: 'in review', standingNote: 'Read in the paper itself.' });
    const again = await post(office.engineer, path, {});
    expect([again.status, codeOf(again)]).toEqual([409, 'conflict']);
  });
});

describe('review', () => {
  test('is not for the originator, and complete when it recommends', async () => {
    submitted(office, draft(office, 'reviewed'), office.engineer.actor);
    const path = 'reviewed/revisions/1/reviews';
    const incomplete = await post(office.reviewer, path, {
      verdict: 'recommend',
      checklist: { ...CHECKED, ranges: false },
    }).expect(400);
    expect(problemOf(incomplete).fields).toMatchObject([{ field: 'checklist.ranges' }]);
    const silent = await post(office.reviewer, path, { verdict: 'decline', checklist: CHECKED }).expect(400);
    expect(problemOf(silent).fields).toMatchObject([{ field: 'note' }]);
    const { body } = await post(office.reviewer, path, { verdict: 'recommend', checklist: CHECKED }).expect(
      201,
    );
    expect((body as Sheet).reviews).toMatchObject([
      { reviewer: { id: office.reviewer.actor.id }, verdict: 'recommend', current: true },
    ]);
  });

  test('names the content it was read on, when it says so', async () => {
    submitted(office, draft(office, 'reviewed-stale'), office.engineer.actor);
    const response = await office.reviewer.agent
      .post('/api/correlations/reviewed-stale/revisions/1/reviews')
      .set('If-Match', `"${'0'.repeat(64)}"`)
      .send({ verdict: 'recommend', checklist: CHECKED });
    expect([response.status, codeOf(response)]).toEqual([409, 'stale']);
  });

  test('that asks for changes gives it back to the originator', async () => {
    submitted(office, draft(office, 'changes'), office.engineer.actor);
    const note = 'The upper limit is 9 000 in the source.';
    const { body } = await post(office.reviewer, 'changes/revisions/1/reviews', {
      verdict: 'ask-for-changes',
      checklist: CHECKED,
      note,
    }).expect(201);
    expect(body).toMatchObject({ standing: 'in review', abilities: { review: false } });
    expect((body as Sheet).reviews).toMatchObject([{ verdict: 'ask-for-changes', note, current: true }]);
  });

  test('by comments goes field by field', async () => {
    draft(office, 'commented');
    const path = 'commented/revisions/1/comments';
    const nowhere = await post(office.reviewer, path, { field: 'bounds[4]', text: 'Hm.' }).expect(400);
    expect(problemOf(nowhere).fields).toMatchObject([{ field: 'field' }]);
    await post(office.reviewer, path, { field: 'bounds[0].stretches', text: '   ' }).expect(400);
    const { body } = await post(office.reviewer, path, {
      field: 'bounds[0].stretches',
      text: 'Which page?',
    }).expect(201);
    expect((body as Sheet).comments).toMatchObject([
      { field: 'bounds[0].stretches', text: 'Which page?', by: { id: office.reviewer.actor.id } },
    ]);
  });
});

describe('approval', () => {
  test('rests on two reviews of the present content', async () => {
    const key = draft(office, 'too-early');
    const { hash } = submitted(office, key, office.engineer.actor);
    await post(office.reviewer, 'too-early/revisions/1/reviews', {
      verdict: 'recommend',
      checklist: CHECKED,
    }).expect(201);
    // The same reviewer once more does not make two.
    await post(office.reviewer, 'too-early/revisions/1/reviews', {
      verdict: 'recommend',
      checklist: CHECKED,
    }).expect(201);
    const response = await post(office.authority, 'too-early/revisions/1/approval', signature(hash));
    expect([response.status, codeOf(response)]).toEqual([409, 'conflict']);
    expect(problemOf(response).detail).toContain('there is 1');
  });

  test('asks for the own password, a meaning and the hash that is signed', async () => {
    const { hash } = recommended(office, draft(office, 'signed'));
    const path = 'signed/revisions/1/approval';
    const before = rowCounts(office);
    const wrong = await post(office.authority, path, signature(hash, 'not this one'));
    expect([wrong.status, codeOf(wrong)]).toEqual([403, 'password-refused']);
    const other = await post(office.authority, path, signature('0'.repeat(64)));
    expect([other.status, codeOf(other)]).toEqual([409, 'stale']);
    for (const [body, field] of [
      [{ ...signature(hash), meaning: ' ' }, 'meaning'],
      [{ ...signature(hash), hash: 'abc' }, 'hash'],
      [{ meaning: 'Approved', hash }, 'password'],
    ] as const) {
      const response = await post(office.authority, path, body).expect(400);
      expect(problemOf(response).fields).toMatchObject([{ field }]);
    }
    expect(rowCounts(office)).toEqual(before);
    const { body } = await post(office.authority, path, signature(hash)).expect(201);
    expect((body as Sheet).approval).toMatchObject({
      by: { id: office.authority.actor.id, name: office.authority.actor.name },
      meaning: 'Approved for tests',
      hash,
    });
  });

  test('in a race is given once', async () => {
    const { hash } = recommended(office, draft(office, 'raced'));
    const answers = await Promise.all(
      [office.authority, office.secondAuthority].map((who) =>
        post(who, 'raced/revisions/1/approval', signature(hash)),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await sheetOf(office.auditor, 'raced')).history.map(({ standing }) => standing)).toEqual([
      'draft',
      'in review',
      'approved',
    ]);
  });

  test('freezes the content', async () => {
    const { hash } = await approved(office, draft(office, 'frozen'));
    const response = await put(office.engineer, 'frozen/revisions/1', tubeSheet({ year: 1999 }), hash);
    expect([response.status, codeOf(response)]).toEqual([409, 'conflict']);
    expect((await sheetOf(office.engineer, 'frozen')).hash).toBe(hash);
  });
});

describe('the next revision', () => {
  test('takes the place of the one before when it is approved, and both acts are journalled', async () => {
    await approved(office, draft(office, 'twice'));
    const next = await post(office.otherEngineer, 'twice/revisions', {
      definition: tubeSheet({ year: 2010 }),
    }).expect(201);
    expect(next.body).toMatchObject({ revision: 2, standing: 'draft' });
    const third = await post(office.engineer, 'twice/revisions', { definition: tubeSheet() });
    expect([third.status, codeOf(third)]).toEqual([409, 'conflict']);
    expect((await sheetOf(office.otherEngineer, 'twice')).revision).toBe(1);

    const key = { kind: 'correlation', slug: 'twice', number: 2 } as const;
    const { hash } = recommended(office, key, office.otherEngineer.actor);
    await post(office.authority, 'twice/revisions/2/approval', signature(hash)).expect(201);
    const shown = await sheetOf(office.engineer, 'twice');
    expect(shown.revision).toBe(2);
    expect(shown.revisions.map(({ number, standing }) => [number, standing])).toEqual([
      [1, 'superseded'],
      [2, 'approved'],
    ]);
    const { body } = await office.auditor.agent.get('/api/journal?limit=2').expect(200);
    expect(
      (body as { items: { act: string; subject: string }[] }).items.map(({ act, subject }) => [act, subject]),
    ).toEqual([
      ['revision.approved', 'correlations/twice/revisions/2'],
      ['revision.superseded', 'correlations/twice/revisions/1'],
    ]);
  });
});

describe('taking out of use', () => {
  const reason = 'A reader found a slip in the range.';

  test('is undone after a suspension, and final after a withdrawal', async () => {
    await approved(office, draft(office, 'in-doubt'));
    const path = 'in-doubt/revisions/1';
    const early = await post(office.authority, `${path}/reinstatement`, { reason });
    expect([early.status, codeOf(early)]).toEqual([409, 'conflict']);
    expect((await post(office.authority, `${path}/suspension`, { reason }).expect(201)).body).toMatchObject({
      standing: 'suspended',
      standingNote: reason,
    });
    expect(
      (await post(office.authority, `${path}/reinstatement`, { reason }).expect(201)).body,
    ).toMatchObject({
      standing: 'approved',
    });
    const { body } = await post(office.authority, `${path}/withdrawal`, {
      reason,
      class: 'error-in-sheet',
    }).expect(201);
    expect((body as Sheet).history.at(-1)).toMatchObject({
      standing: 'withdrawn',
      note: reason,
      class: 'error-in-sheet',
    });
    const late = await post(office.authority, `${path}/suspension`, { reason });
    expect([late.status, codeOf(late)]).toEqual([409, 'conflict']);
  });

  test('says why and of what kind', async () => {
    await approved(office, draft(office, 'unsafe-one'));
    for (const [body, field] of [
      [{ reason: 'no' }, 'reason'],
      [{ reason, class: 'whim' }, 'class'],
    ] as const) {
      const response = await post(office.authority, 'unsafe-one/revisions/1/withdrawal', {
        class: 'unsafe',
        ...body,
      });
      expect(response.status).toBe(400);
      expect(problemOf(response).fields).toMatchObject([{ field }]);
    }
  });
});
