import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { FirstAdministratorService } from '../src/invitations/first-administrator.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { journalTail, lettersIn, tokenFor } from './support/outbox.js';
import { signedInWith, signInAs, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

const PASSWORD = 'stones along the edge';
const DAY_MIN = 24 * 60;

let office: TestApp;
let administrator: SignedIn;
let invited = 0;

beforeAll(async () => {
  office = await createTestApp({ settings: { origin: 'http://register.office.example' } });
  administrator = await signedInWith(office, 'administrator');
});
afterAll(() => office.close());

const invite = (body: object) => administrator.agent.post('/api/people/invitations').send(body);
const open = (token: string) => supertest(office.server).get(`/api/invitations/${token}`);
const accept = (token: string, body: object = { password: PASSWORD }) =>
  supertest(office.server).post(`/api/invitations/${token}`).send(body);
const somebody = (overrides: object = {}) => ({
  name: 'Wilma Cairn',
  email: `wilma-${(invited += 1)}@office.example`,
  roles: ['engineer', 'reviewer'],
  ...overrides,
});

async function invitedPerson(overrides: object = {}): Promise<{ id: string; email: string; token: string }> {
  const person = somebody(overrides);
  const { body } = await invite(person).expect(201);
  return { id: (body as { id: string }).id, email: person.email, token: tokenFor(office, person.email) };
}

describe('an invitation', () => {
  it('is refused with every field that cannot be used, and nothing is written', async () => {
    const before = rowCounts({ test: office });
    const fields = problemOf(await invite({ name: '', email: 'wilma', roles: ['chief'] }).expect(400)).fields;
    expect(fields?.map(({ field }) => field)).toEqual(['name', 'email', 'roles']);
    expect(rowCounts({ test: office })).toEqual(before);
  });

  it.each([
    ['a header in the name', { name: 'Wilma\r\nBcc: all@office.example' }, 'name'],
    ['a line separator in the name', { name: 'Wilma\u2028Cairn' }, 'name'],
    ['writing turned round in the name', { name: 'Wilma \u202Eniarc' }, 'name'],
    ['a header in the address', { email: 'wilma@office.example\r\nBcc: all@office.example' }, 'email'],
    ['a second address', { email: 'wilma@office.example,all@office.example' }, 'email'],
    ['a display name', { email: 'Wilma <wilma@office.example>' }, 'email'],
    ['a quoted address', { email: '"a b"@office.example' }, 'email'],
    ['an address with a tab', { email: 'wil\tma@office.example' }, 'email'],
    [
      'an address beyond its length',
      { email: `${'w'.repeat(64)}@${'o'.repeat(60)}.${'o'.repeat(200)}.example` },
      'email',
    ],
    ['no role', { roles: [] }, 'roles'],
    ['the same role twice', { roles: ['engineer', 'engineer'] }, 'roles'],
    ['roles that are no list', { roles: 'engineer' }, 'roles'],
    ['an identity of its own choice', { id: 'root' }, 'id'],
  ])('does not take %s', async (_name, wrong, field) => {
    const before = rowCounts({ test: office });
    const answer = await invite(somebody(wrong));
    expect([answer.status, problemOf(answer).fields?.map((one) => one.field)]).toEqual([400, [field]]);
    expect(rowCounts({ test: office })).toEqual(before);
  });

  it('makes nobody a technical authority, and nobody both that and administrator', async () => {
    for (const roles of [['authority'], ['engineer', 'authority'], ['administrator', 'authority']]) {
      const answer = await invite(somebody({ roles }));
      expect([answer.status, codeOf(answer), problemOf(answer).fields?.[0]?.field]).toEqual([
        409,
        'conflict',
        'roles',
      ]);
    }
  });

  it('is not for somebody who is here', async () => {
    const here = await signedInWith(office, 'engineer');
    const answer = await invite(somebody({ email: here.email.toUpperCase() }));
    expect([answer.status, codeOf(answer)]).toEqual([409, 'duplicate']);
  });

  it('goes out as a letter with a link, whose token is kept as a hash alone', async () => {
    const { id, email, token } = await invitedPerson();
    const [letter] = lettersIn(office, email);
    expect(letter?.subject).toBe('Merestone: your invitation');
    expect(letter?.body).not.toContain(token);
    expect(letter?.link).toBe(`http://register.office.example/invitation/${token}`);
    const links = JSON.stringify(office.connection.sqlite.prepare('SELECT * FROM one_time_link').all());
    expect(links).not.toContain(token);
    expect(JSON.stringify(journalTail(office, 5))).not.toContain(token);
    expect(journalTail(office, 1)).toMatchObject([{ act: 'person.invited', subject: `people/${id}` }]);
  });

  it('lets nobody in before it was taken up, and is not shown among the people', async () => {
    const { id, email } = await invitedPerson();
    await supertest(office.server).post('/api/session').send({ email, password: '' }).expect(400);
    await supertest(office.server).post('/api/session').send({ email, password: PASSWORD }).expect(401);
    const engineer = await signedInWith(office, 'engineer');
    const seen = (await engineer.agent.get('/api/people').expect(200)).body as { items: { id: string }[] };
    expect(seen.items.map((one) => one.id)).not.toContain(id);
    const managed = (await administrator.agent.get('/api/people').expect(200)).body as {
      items: { id: string }[];
    };
    expect(managed.items.find((one) => one.id === id)).toMatchObject({
      invited: true,
      active: true,
      lastSignIn: null,
    });
  });

  it('is taken up once, with a password that can be taken', async () => {
    const { id, email, token } = await invitedPerson();
    expect((await open(token).expect(200)).body).toEqual({ name: 'Wilma Cairn', email });
    for (const password of ['short', 'password1', email, 'Wilma Cairn', 'x'.repeat(129)]) {
      const answer = await accept(token, { password });
      expect([password, answer.status, problemOf(answer).fields?.[0]?.field]).toEqual([
        password,
        400,
        'password',
      ]);
    }
    expect((await accept(token).expect(201)).body).toEqual({ name: 'Wilma Cairn', email });
    expect(journalTail(office, 1)).toMatchObject([{ act: 'person.joined', subject: `people/${id}` }]);
    await signInAs(office, email, PASSWORD);
    expect(codeOf(await accept(token, { password: 'another one of theirs' }).expect(404))).toBe('not-found');
    await open(token).expect(404);
    await signInAs(office, email, PASSWORD);
  });

  it('is taken up once when two try at the same moment', async () => {
    const { email, token } = await invitedPerson();
    const passwords = ['the first of the two', 'the second of the two', 'and a third one, too'];
    const answers = await Promise.all(passwords.map((password) => accept(token, { password })));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 404, 404]);
    const winner = answers.findIndex(({ status }) => status === 201);
    for (const [at, password] of passwords.entries()) {
      const { status } = await supertest(office.server).post('/api/session').send({ email, password });
      expect(status).toBe(at === winner ? 200 : 401);
    }
  });

  it('sent again voids the former link and takes the name and roles now given', async () => {
    const { id, email, token } = await invitedPerson();
    const { body } = await invite({ name: 'Wilma Cairn-Reed', email, roles: ['auditor'] }).expect(201);
    expect(body).toMatchObject({ id, name: 'Wilma Cairn-Reed', roles: ['auditor'], invited: true });
    await accept(token).expect(404);
    await accept(tokenFor(office, email)).expect(201);
  });

  it('holds for seven days and not a minute longer', async () => {
    const first = await invitedPerson();
    office.clock.forward(7 * DAY_MIN - 1);
    await open(first.token).expect(200);
    office.clock.forward(2);
    await open(first.token).expect(404);
    await accept(first.token).expect(404);
    administrator = await signedInWith(office, 'administrator');
  });

  it('lets nobody in who was made inactive in the meantime', async () => {
    const { id, token } = await invitedPerson();
    await administrator.agent
      .post(`/api/people/${id}/deactivation`)
      .send({ reason: 'Did not come after all.' })
      .expect(201);
    await open(token).expect(404);
    await accept(token).expect(404);
  });

  it.each(['x', 'x'.repeat(43), '%00', '..%2f..', 'a'.repeat(2000), encodeURIComponent("' OR 1=1 --")])(
    'is not found under a token made up: %s',
    async (token) => {
      const before = rowCounts({ test: office });
      for (const answer of [await open(token), await accept(token)]) {
        expect(answer.status).toBeGreaterThanOrEqual(400);
        expect(answer.status).toBeLessThan(500);
      }
      expect(rowCounts({ test: office })).toEqual(before);
    },
  );

  it('is no password reset, and a reset is no invitation', async () => {
    const { token } = await invitedPerson();
    await supertest(office.server)
      .post(`/api/password-resets/${token}`)
      .send({ password: PASSWORD })
      .expect(404);
    await accept(token).expect(201);
    const { email } = await signedInWith(office, 'engineer');
    await supertest(office.server).post('/api/password-resets').send({ email }).expect(202);
    await accept(tokenFor(office, email)).expect(404);
  });
});

describe('the first administrator of an office', () => {
  const FIRST = { name: 'Wilma Cairn', email: 'first@office.example', password: PASSWORD };
  let empty: TestApp;
  const link = (): string => empty.app.get(FirstAdministratorService).open('http://here') ?? '';
  const tokenOf = (address: string): string => address.split('/').at(-1) ?? '';
  const take = (token: string, body: object) =>
    supertest(empty.server).post(`/api/invitations/${token}`).send(body);

  beforeAll(async () => {
    empty = await createTestApp();
  });
  afterAll(() => empty.close());

  it('says who they are', async () => {
    const token = tokenOf(link());
    expect((await supertest(empty.server).get(`/api/invitations/${token}`).expect(200)).body).toEqual({
      name: null,
      email: null,
    });
    const missing = await take(token, { password: PASSWORD }).expect(400);
    expect(problemOf(missing).fields?.map(({ field }) => field)).toEqual(['name', 'email']);
    const weak = await take(token, { ...FIRST, password: 'trustno1' }).expect(400);
    expect(problemOf(weak).fields?.map(({ field }) => field)).toEqual(['password']);
    await take(token, { ...FIRST, roles: ['authority'] }).expect(400);
  });

  it('has a link of http://here/invitation/…, void once another was printed', async () => {
    const former = link();
    expect(former).toMatch(/^http:\/\/here\/invitation\/[\w-]{43}$/);
    link();
    await take(tokenOf(former), FIRST).expect(404);
  });

  it('comes in alone, even when two try at the same moment', async () => {
    const token = tokenOf(link());
    const answers = await Promise.all([
      take(token, FIRST),
      take(token, { ...FIRST, email: 'second@office.example' }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 404]);
    expect(empty.app.get(FirstAdministratorService).open('http://here')).toBeUndefined();
    const { email } = answers.find(({ status }) => status === 201)?.body as { email: string };
    const agent = await signInAs(empty, email, PASSWORD);
    const { body } = await agent.get('/api/session').expect(200);
    expect((body as { person: { roles: string[] } }).person.roles).toEqual(['administrator']);
    await agent.post('/api/correlations').send({}).expect(403);
  });
});
