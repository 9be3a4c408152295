import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson, TEST_PASSWORD } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

let office: TestApp;
let rowsBefore: string;

const tables = ['person', 'person_role', 'session', 'mail', 'journal'];
const allRows = (): string =>
  JSON.stringify(tables.map((table) => office.connection.sqlite.prepare(`SELECT * FROM ${table}`).all()));

beforeAll(async () => {
  office = await createTestApp();
  await addPerson(office, { email: 'anna@office.example' });
  rowsBefore = allRows();
});
afterAll(async () => {
  expect(allRows()).toBe(rowsBefore);
  await office.close();
});

const send = (body: string | Buffer, type = 'application/json') =>
  supertest(office.server).post('/api/session').set('Content-Type', type).send(body);

const credentials = `"email":"anna@office.example","password":"${TEST_PASSWORD}"`;

describe('bodies', () => {
  it.each([
    ['cut off', '{"email":'],
    ['with a trailing comma', `{${credentials},}`],
    ['with NaN', '{"email":NaN}'],
    ['with Infinity', '{"email":-Infinity}'],
    ['with a comment', `{${credentials}/* */}`],
    ['of two values', `{${credentials}}{}`],
    ['an array', '[]'],
    ['a string', '"email"'],
    ['a number', '1'],
    ['null', 'null'],
    ['binary', Buffer.from([0, 1, 2, 3])],
    ['not UTF-8', Buffer.from('{"email":"\xff"}', 'latin1')],
    ['UTF-16', Buffer.from(`{${credentials}}`, 'utf16le')],
  ])('%s are refused as malformed', async (_what, body) => {
    expect(codeOf(await send(body).expect(400))).toBe('malformed');
  });

  it.each([
    ['1e400', '{"email":1e400}', 'email'],
    ['-1e400 deep inside', '{"a":{"b":[0,{"c":-1e400}]}}', 'a.b.1.c'],
    ['a NUL character', String.raw`{"email":"a\u0000b"}`, 'email'],
    ['half a character', String.raw`{"email":"\ud800"}`, 'email'],
    ['__proto__', '{"__proto__":{"admin":true}}', '__proto__'],
    ['__proto__ deep inside', '{"a":[{"__proto__":1}]}', 'a.0.__proto__'],
    ['constructor', '{"constructor":{"prototype":{"admin":true}}}', 'constructor'],
    ['a name given twice', '{"email":"a","email":"b"}', 'email'],
    ['a name given twice, once escaped', String.raw`{"a":{"b":1,"\u0062":2}}`, 'a.b'],
  ])('with %s are refused at that field', async (_what, body, field) => {
    const problem = problemOf(await send(body).expect(400));
    expect(problem.fields?.map((entry) => entry.field)).toContain(field);
    expect(({} as { admin?: boolean }).admin).toBeUndefined();
  });

  it('nested without end are refused', async () => {
    expect(codeOf(await send(`{"a":${'['.repeat(5000)}${']'.repeat(5000)}}`).expect(400))).toBe('malformed');
  });

  it('that are empty lack their fields', async () => {
    for (const body of ['', '{}']) {
      const problem = problemOf(await send(body).expect(400));
      expect(problem.type).toBe('urn:merestone:problem:missing');
      expect(problem.fields?.map(({ field, code }) => [field, code])).toEqual([
        ['email', 'missing'],
        ['password', 'missing'],
      ]);
    }
  });

  it.each([
    ['{"email":["anna@office.example"],"password":"x"}', 'email'],
    ['{"email":{"$gt":""},"password":"x"}', 'email'],
    ['{"email":true,"password":"x"}', 'email'],
    [`{"email":"${'a'.repeat(300)}","password":"x"}`, 'email'],
    [`{"email":"a","password":"${'a'.repeat(300)}"}`, 'password'],
    ['{"email":"","password":"x"}', 'email'],
  ])('%s name the field', async (body, field) => {
    const problem = problemOf(await send(body).expect(400));
    expect(problem.fields?.map((entry) => entry.field)).toEqual([field]);
  });

  it('just under a megabyte are read to their end, whatever they hold', async () => {
    const room = 1024 * 1024 - 100;
    for (const long of ['a'.repeat(room), String.raw`\"`.repeat(room / 2), String.raw`\\`.repeat(room / 2)]) {
      expect(problemOf(await send(`{"email":"${long}","password":"x"}`).expect(400)).fields?.[0]?.field).toBe(
        'email',
      );
    }
    const many = `{"a":[${'{},'.repeat(room / 3 - 10)}{}]}`;
    expect(codeOf(await send(many).expect(400))).toBe('malformed');
    expect(codeOf(await send(`{"a":${'['.repeat(room / 2)}${']'.repeat(room / 2)}}`).expect(400))).toBe(
      'malformed',
    );
  });

  it('of more than a megabyte are refused, however they are sent', async () => {
    const big = `{"email":"${'a'.repeat(10 * 1024 * 1024)}"}`;
    expect(codeOf(await send(big).expect(413))).toBe('too-large');
    expect(codeOf(await send(big, 'text/plain').expect(413))).toBe('too-large');
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'application/xml', 'application/jsonp'])(
    'of type %s are refused',
    async (type) => {
      expect(codeOf(await send(`{${credentials}}`, type).expect(415))).toBe('unsupported-media-type');
    },
  );

  it('that are compressed are refused, so that little cannot become much', async () => {
    const answer = await send(`{${credentials}}`).set('Content-Encoding', 'gzip').expect(415);
    expect(codeOf(answer)).toBe('unsupported-media-type');
  });

  it('sent to where nothing is do no harm', async () => {
    await supertest(office.server).post('/api/nothing').send({ a: 1 }).expect(404);
    await supertest(office.server).put('/api/health').send({ a: 1 }).expect(404);
    await supertest(office.server).post('/').send({ a: 1 }).expect(404);
  });
});

describe('queries', () => {
  it.each(['__proto__=1', 'constructor=1', 'a=%00'])('with %s are refused', async (query) => {
    expect(codeOf(await supertest(office.server).get(`/api/health?${query}`).expect(400))).toBe('malformed');
  });
});
