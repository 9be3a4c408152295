import supertest from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { FirstAdministratorService } from '../src/people/first-administrator.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { signInAs } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

const PATH = '/api/people/first-administrator';
const PERSON = { name: 'Wilma Cairn', email: 'wilma@office.example', password: 'a long enough password' };

let office: TestApp;
let token: string;

beforeAll(async () => {
  office = await createTestApp();
  token = office.app.get(FirstAdministratorService).newToken() ?? '';
});
afterAll(() => office.close());

const post = (body: object) => supertest(office.server).post(PATH).send(body);

test.each([
  ['a token that is none', { ...PERSON, token: 'x' }, 403, undefined],
  ['no token', PERSON, 400, 'token'],
  ['a short password', { ...PERSON, token: 'x', password: 'short' }, 400, 'password'],
  ['an address that is none', { ...PERSON, token: 'x', email: 'wilma' }, 400, 'email'],
  ['a role of their own choice', { ...PERSON, token: 'x', roles: ['authority'] }, 400, 'roles'],
])('refuses %s', async (_name, body, status, field) => {
  const before = rowCounts({ test: office });
  const response = await post(body);
  expect(response.status).toBe(status);
  if (field !== undefined) expect(problemOf(response).fields?.map((one) => one.field)).toEqual([field]);
  expect(rowCounts({ test: office })).toEqual(before);
});

test('lets one in, and no second one, not even at the same moment', async () => {
  const answers = await Promise.all([
    post({ ...PERSON, token }),
    post({ ...PERSON, email: 'two@office.example', token }),
  ]);
  expect(answers.map(({ status }) => status).sort()).toEqual([201, 403]);
  const late = await post({ ...PERSON, email: 'three@office.example', token });
  expect([late.status, codeOf(late)]).toEqual([403, 'forbidden']);
  expect(office.app.get(FirstAdministratorService).newToken()).toBeUndefined();
});

test('makes an administrator who can sign in and has no say on content', async () => {
  const email = answersEmail(await supertest(office.server).post('/api/session').send(PERSON_SIGN_IN));
  const agent = await signInAs(office, email, PERSON.password);
  const { body } = await agent.get('/api/session').expect(200);
  expect((body as { person: { roles: string[] } }).person.roles).toEqual(['administrator']);
  await agent.post('/api/correlations').send({}).expect(403);
});

const PERSON_SIGN_IN = { email: PERSON.email, password: PERSON.password };

/** Whichever of the two that asked at the same moment was let in. */
function answersEmail({ status }: { status: number }): string {
  return status === 200 ? PERSON.email : 'two@office.example';
}
