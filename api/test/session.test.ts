import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson, signedInWith, signInAs, TEST_PASSWORD } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

let office: TestApp;

beforeAll(async () => {
  office = await createTestApp();
  await addPerson(office, { email: 'anna@office.example', name: 'Anna', roles: ['engineer', 'reviewer'] });
});
afterAll(() => office.close());

const signIn = (email: unknown, password: unknown) =>
  supertest(office.server).post('/api/session').send({ email, password });

const cookieOf = (response: supertest.Response): string =>
  String(response.headers['set-cookie']).split(';')[0] ?? '';

describe('refused sign-ins', () => {
  it('says the same of a wrong password, an unknown person and an inactive one', async () => {
    const inactive = await addPerson(office, { email: 'gone@office.example' });
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(inactive.id);

    const answers = await Promise.all([
      signIn('anna@office.example', 'wrong'),
      signIn('nobody@office.example', TEST_PASSWORD),
      signIn('gone@office.example', TEST_PASSWORD),
    ]);

    for (const answer of answers) {
      expect(codeOf(answer)).toBe('sign-in-refused');
      expect(answer.status).toBe(401);
      expect(answer.text).toBe(answers[0].text);
      expect(answer.headers['set-cookie']).toBeUndefined();
    }
  });

  it('names every field that cannot be used', async () => {
    const { fields } = problemOf(await signIn(undefined, 7).expect(400));

    expect(fields?.map(({ field, code }) => [field, code])).toEqual([
      ['email', 'missing'],
      ['password', 'malformed'],
    ]);
  });

  it('does not take fields that it does not know', async () => {
    const answer = await supertest(office.server)
      .post('/api/session')
      .send({ email: 'anna@office.example', password: TEST_PASSWORD, roles: ['administrator'] })
      .expect(400);

    expect(problemOf(answer).fields).toEqual([
      { field: 'roles', code: 'unknown-field', message: 'There is no such field here.' },
    ]);
  });

  it('does not come in with the name of a person who has no password', async () => {
    await addPerson(office, { email: 'invited@office.example' });
    office.connection.sqlite
      .prepare("UPDATE person SET password_hash = NULL WHERE email = 'invited@office.example'")
      .run();

    expect((await signIn('invited@office.example', TEST_PASSWORD)).status).toBe(401);
  });

  it('journals who was let in and who was not, without what was typed', async () => {
    await signIn('anna@office.example', 'wrong-as-can-be');
    await signIn('my-password-in-the-wrong-field', 'wrong-as-can-be');
    await signIn('anna@office.example', TEST_PASSWORD).expect(200);

    const rows = office.connection.sqlite
      .prepare<[], { entry: string }>('SELECT entry FROM journal ORDER BY "index" DESC LIMIT 3')
      .all()
      .map(({ entry }) => entry);
    expect(rows.map((entry) => (JSON.parse(entry) as { act: string }).act)).toEqual([
      'session.started',
      'session.refused',
      'session.refused',
    ]);
    expect(rows.join()).not.toMatch(/my-password|wrong-as/);
  });
});

describe('rate limits', () => {
  it('lets nobody guess on, neither at one person nor from one address, until the window has passed', async () => {
    const strict = await createTestApp({
      settings: { signInLimits: { windowSeconds: 300, perAddress: 4, perPerson: 2 } },
    });
    await addPerson(strict, { email: 'anna@office.example' });
    const attempt = (email: string, password: string) =>
      supertest(strict.server).post('/api/session').send({ email, password });

    for (let successes = 0; successes < 6; successes += 1) {
      await attempt('anna@office.example', TEST_PASSWORD).expect(200);
    }
    await attempt('anna@office.example', 'one').expect(401);
    await attempt('Anna@office.example', 'two').expect(401);
    const refused = await attempt('anna@office.example', TEST_PASSWORD).expect(429);
    expect(codeOf(refused)).toBe('too-many-requests');
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(200);

    await attempt('b@office.example', 'one').expect(401);
    await attempt('c@office.example', 'one').expect(401);
    await attempt('d@office.example', 'one').expect(429);

    strict.clock.forward(5.1);
    await attempt('anna@office.example', TEST_PASSWORD).expect(200);
    await strict.close();
  });
});

describe('a session', () => {
  it('tells who is signed in and what the roles allow', async () => {
    const agent = await signInAs(office, ' Anna@Office.example ');
    const { body } = (await agent.get('/api/session').expect(200)) as { body: { permissions: string[] } };

    expect(body).toMatchObject({
      person: { name: 'Anna', email: 'anna@office.example', roles: ['engineer', 'reviewer'] },
    });
    expect(body.permissions).toContain('correlation.review');
    expect(body.permissions).not.toContain('correlation.approve');
    expect(JSON.stringify(body)).not.toContain('argon2');
  });

  it('has a cookie that scripts and other sites do not get, and only its hash is stored', async () => {
    const answer = await signIn('anna@office.example', TEST_PASSWORD).expect(200);
    const header = String(answer.headers['set-cookie']);

    expect(header).toMatch(/^merestone=/);
    expect(header).toMatch(/; Path=\/; HttpOnly; SameSite=Lax$/);
    const id = decodeURIComponent(cookieOf(answer)).replace('merestone=s:', '').split('.')[0] ?? '';
    expect(id.length).toBeGreaterThanOrEqual(43);
    const stored = JSON.stringify(office.connection.sqlite.prepare('SELECT * FROM session').all());
    expect(stored).not.toContain(id);
  });

  it('has a __Host- cookie behind TLS, and headers that keep browsers there', async () => {
    const secure = await createTestApp({ settings: { origin: 'https://register.office.example' } });
    await addPerson(secure, { email: 'anna@office.example' });

    const answer = await supertest(secure.server)
      .post('/api/session')
      .set('X-Forwarded-Proto', 'https')
      .send({ email: 'anna@office.example', password: TEST_PASSWORD })
      .expect(200);

    expect(String(answer.headers['set-cookie'])).toMatch(
      /^__Host-merestone=.*; Path=\/; HttpOnly; Secure; SameSite=Lax$/,
    );
    expect(answer.headers['strict-transport-security']).toMatch(/max-age=\d{8}/);
    await secure.close();
  });

  it('gets a new id at sign-in, and one that was planted opens nothing', async () => {
    const first = cookieOf(await signIn('anna@office.example', TEST_PASSWORD));
    const second = await supertest(office.server)
      .post('/api/session')
      .set('Cookie', first)
      .send({ email: 'anna@office.example', password: TEST_PASSWORD })
      .expect(200);

    expect(cookieOf(second)).not.toBe(first);
    await supertest(office.server).get('/api/session').set('Cookie', first).expect(401);
    await supertest(office.server).get('/api/session').set('Cookie', cookieOf(second)).expect(200);
    await supertest(office.server)
      .get('/api/session')
      .set('Cookie', 'merestone=s%3Aplanted.signature')
      .expect(401);
  });

  it('ends with signing out, on the server too', async () => {
    const cookie = cookieOf(await signIn('anna@office.example', TEST_PASSWORD));
    const ended = await supertest(office.server).delete('/api/session').set('Cookie', cookie).expect(204);

    expect(String(ended.headers['set-cookie'])).toContain('Expires=Thu, 01 Jan 1970');
    await supertest(office.server).get('/api/session').set('Cookie', cookie).expect(401);
    await supertest(office.server).delete('/api/session').set('Cookie', cookie).expect(401);
  });

  it('ends when it was not used for long, and not before', async () => {
    const { agent } = await signedInWith(office, 'engineer');
    office.clock.forward(59);
    await agent.get('/api/session').expect(200);
    office.clock.forward(59);
    await agent.get('/api/session').expect(200);
    office.clock.forward(61);
    await agent.get('/api/session').expect(401);
  });

  it('ends after its absolute span, however much it is used', async () => {
    const { agent } = await signedInWith(office, 'engineer');
    for (let half = 0; half < 23; half += 1) {
      office.clock.forward(30);
      await agent.get('/api/session').expect(200);
    }
    office.clock.forward(31);
    await agent.get('/api/session').expect(401);
  });

  it('ends at once for a person made inactive', async () => {
    const { agent, actor } = await signedInWith(office, 'engineer');
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(actor.id);

    await agent.get('/api/session').expect(401);
  });
});

describe('requests of other sites', () => {
  it('are refused when they would change something', async () => {
    for (const origin of ['https://evil.example', 'null', 'http://localhost.evil.example', 'not an origin']) {
      const answer = await signIn('anna@office.example', TEST_PASSWORD).set('Origin', origin);
      expect([origin, answer.status, codeOf(answer)]).toEqual([origin, 403, 'foreign-origin']);
    }
  });

  it('are told apart from our own by the origin in the settings', async () => {
    const settled = await createTestApp({ settings: { origin: 'http://localhost:4170' } });
    const post = (origin: string) =>
      supertest(settled.server)
        .post('/api/session')
        .set('Origin', origin)
        .send({ email: 'a', password: 'b' });

    expect((await post('http://localhost:4170')).status).toBe(401);
    expect((await post('http://localhost:4171')).status).toBe(403);
    expect((await post('https://localhost:4170')).status).toBe(403);
    await settled.close();
  });

  it('are told apart from our own by the host where the settings name no origin', async () => {
    const address = office.server.address();
    const port = typeof address === 'object' && address !== null ? address.port : 0;

    await signIn('anna@office.example', TEST_PASSWORD).set('Origin', `http://127.0.0.1:${port}`).expect(200);
  });

  it('may read, as far as a browser without our cookie can', async () => {
    await supertest(office.server).get('/api/health').set('Origin', 'https://evil.example').expect(200);
  });
});

describe('demo people', () => {
  it('are not told of in a real office', async () => {
    expect(codeOf(await supertest(office.server).get('/api/session/demo-people').expect(404))).toBe(
      'not-found',
    );
  });
});
