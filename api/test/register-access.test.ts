import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Role } from '../src/common/roles.js';
import { approved, draft, openOffice, recommended, rowCounts, type TestOffice } from './support/office.js';
import { everyCaller, signedInWith, TEST_PASSWORD, type Agent } from './support/people.js';
import { codeOf } from './support/problem-of.js';
import { tubeSheet, TUBE_INPUTS } from './support/sheets.js';

type Caller = Role | 'nobody';
type Method = 'get' | 'post' | 'put';

const EVERYBODY: readonly Role[] = ['engineer', 'reviewer', 'authority', 'auditor', 'administrator'];
const DRAFTERS: readonly Role[] = ['engineer', 'reviewer'];
const EVALUATORS: readonly Role[] = ['engineer', 'reviewer', 'authority'];
const REVISION = '/api/correlations/public/revisions/1';
const FAR_REVISION = '/api/correlations/no-such/revisions/1';
const CHECKLIST = Object.fromEntries(
  ['expression', 'definitions', 'ranges', 'basis', 'recalculated', 'duplicates'].map((point) => [
    point,
    true,
  ]),
);
const definition = tubeSheet();
const reason = 'Long enough to be one.';

/**
 * Every route of the register: who may use it, and what those who may get. Acts are asked of a revision that does not
 * exist, so that who may is told that, and nothing is done.
 */
const ROUTES: readonly [Method, string, object | undefined, readonly Role[], number][] = [
  ['get', '/api/geometries', undefined, EVERYBODY, 200],
  ['get', '/api/correlations', undefined, EVERYBODY, 200],
  ['get', '/api/correlations/public', undefined, EVERYBODY, 200],
  ['get', REVISION, undefined, EVERYBODY, 200],
  ['get', '/api/desk', undefined, EVERYBODY, 200],
  ['get', `${REVISION}/sheet.json`, undefined, EVERYBODY, 200],
  ['post', '/api/exchange/sheets', { format: 'none' }, DRAFTERS, 400],
  ['get', '/api/exchange/register.json', undefined, ['authority', 'auditor'], 200],
  ['post', '/api/exchange/register', { format: 'none' }, ['administrator'], 400],
  ['get', '/api/property-equations', undefined, EVERYBODY, 200],
  ['get', '/api/property-equations/test-gas-density', undefined, EVERYBODY, 200],
  ['get', '/api/evaluations/no-such', undefined, EVERYBODY, 404],
  ['post', '/api/correlations/no-such/evaluations', { inputs: TUBE_INPUTS }, EVALUATORS, 404],
  ['post', '/api/candidates', { geometry: 'tube', inputs: {} }, EVALUATORS, 200],
  ['post', '/api/correlations', { slug: 'public', definition }, DRAFTERS, 409],
  ['post', '/api/correlations/no-such/revisions', { definition }, DRAFTERS, 404],
  ['put', FAR_REVISION, { definition }, DRAFTERS, 428],
  ['post', `${FAR_REVISION}/submission`, {}, DRAFTERS, 404],
  ['post', `${FAR_REVISION}/iterations`, {}, DRAFTERS, 404],
  ['get', `${REVISION}/review`, undefined, EVERYBODY, 200],
  ['get', '/api/correlations/public/differences?from=1&to=1', undefined, EVERYBODY, 200],
  ['post', `${FAR_REVISION}/assignments`, {}, ['reviewer'], 404],
  ['post', `${FAR_REVISION}/comments`, { field: '', text: 'x' }, EVALUATORS, 404],
  ['post', `${FAR_REVISION}/comments/1/answers`, { text: 'x' }, EVALUATORS, 404],
  ['post', `${FAR_REVISION}/comments/1/resolution`, {}, EVALUATORS, 404],
  ['post', `${FAR_REVISION}/decline`, { reason }, ['authority'], 404],
  ['get', '/api/correlations/public/problem-reports', undefined, EVERYBODY, 200],
  [
    'post',
    '/api/correlations/no-such/problem-reports',
    { revision: 1, severity: 'error', text: reason },
    EVERYBODY,
    404,
  ],
  ['post', '/api/problem-reports/999/answer', { outcome: 'no-fault', text: reason }, ['authority'], 404],
  ['post', `${FAR_REVISION}/reviews`, { verdict: 'recommend', checklist: CHECKLIST }, ['reviewer'], 404],
  [
    'post',
    `${FAR_REVISION}/approval`,
    { password: 'x', meaning: 'yes', hash: 'a'.repeat(64) },
    ['authority'],
    404,
  ],
  ['post', `${FAR_REVISION}/suspension`, { reason }, ['authority'], 404],
  ['post', `${FAR_REVISION}/reinstatement`, { reason }, ['authority'], 404],
  ['post', `${FAR_REVISION}/withdrawal`, { reason, class: 'unsafe' }, ['authority'], 404],
];

let office: TestOffice;
let callers: Map<Caller, Agent>;

beforeAll(async () => {
  office = await openOffice();
  await approved(office, draft(office, 'public'));
  callers = await everyCaller(office.test);
});
afterAll(() => office.close());

describe.each(ROUTES)('%s %s', (method, path, body, allowed, status) => {
  test.each<Caller>(['nobody', ...EVERYBODY])('for %s', async (caller) => {
    const agent = callers.get(caller);
    const before = rowCounts(office);
    const response = await agent?.[method](path).send(body);
    const refused = caller === 'nobody' ? 401 : 403;
    const may = caller !== 'nobody' && allowed.includes(caller);
    expect(response?.status).toBe(may ? status : refused);
    expect(rowCounts(office)).toEqual(before);
  });
});

describe('four eyes, for people with several roles', () => {
  test('nobody reviews or approves what they originated', async () => {
    const both = await signedInWith(office.test, 'engineer', 'reviewer', 'authority');
    const key = draft(office, 'own-work', {}, both.actor);
    const { hash } = recommended(office, key, both.actor);
    const review = await both.agent
      .post('/api/correlations/own-work/revisions/1/reviews')
      .send({ verdict: 'recommend', checklist: CHECKLIST });
    expect([review.status, codeOf(review)]).toEqual([403, 'forbidden']);
    const approval = await both.agent
      .post('/api/correlations/own-work/revisions/1/approval')
      .send({ password: TEST_PASSWORD, meaning: 'Mine', hash });
    expect([approval.status, codeOf(approval)]).toEqual([403, 'forbidden']);
  });

  test('nobody approves what they reviewed', async () => {
    const both = await signedInWith(office.test, 'reviewer', 'authority');
    const { hash } = recommended(office, draft(office, 'reviewed-work'));
    await both.agent
      .post('/api/correlations/reviewed-work/revisions/1/reviews')
      .send({ verdict: 'recommend', checklist: CHECKLIST })
      .expect(201);
    const approval = await both.agent
      .post('/api/correlations/reviewed-work/revisions/1/approval')
      .send({ password: TEST_PASSWORD, meaning: 'Seen', hash });
    expect([approval.status, codeOf(approval)]).toEqual([403, 'forbidden']);
  });
});
