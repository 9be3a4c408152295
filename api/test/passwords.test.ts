import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { journalTail, lettersIn, tokenFor } from './support/outbox.js';
import { addPerson, signedInWith, signInAs, TEST_PASSWORD } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

const NEW_PASSWORD = 'seven stones in a row';

let office: TestApp;

beforeAll(async () => {
  office = await createTestApp({ settings: { origin: 'http://register.office.example' } });
});
afterAll(() => office.close());

const ask = (email: unknown) => supertest(office.server).post('/api/password-resets').send({ email });
const reset = (token: string, password: string) =>
  supertest(office.server).post(`/api/password-resets/${token}`).send({ password });
const signIn = (email: string, password: string) =>
  supertest(office.server).post('/api/session').send({ email, password });

describe('asking for a new password', () => {
  it('is answered the same for everybody, and only whoever is here gets a letter', async () => {
    const here = await signedInWith(office, 'engineer');
    const gone = await addPerson(office, { email: 'gone@office.example' });
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(gone.id);
    const administrator = await signedInWith(office, 'administrator');
    await administrator.agent
      .post('/api/people/invitations')
      .send({ name: 'Not Yet', email: 'not-yet@office.example', roles: ['engineer'] })
      .expect(201);
    const letters = lettersIn(office).length;

    const asked = [
      here.email,
      here.email.toUpperCase(),
      'nobody@office.example',
      'gone@office.example',
      'not-yet@office.example',
      'no address',
      "' OR 1=1 --",
    ];
    const answers = [];
    for (const email of asked) answers.push(await ask(email));

    for (const answer of answers) {
      expect([answer.status, answer.text]).toEqual([202, answers[0]?.text]);
      expect(answer.headers['set-cookie']).toBeUndefined();
    }
    expect(
      lettersIn(office)
        .slice(letters)
        .map(({ to }) => to),
    ).toEqual([here.email, here.email]);
    // One journal row each, and never what was typed.
    const rows = journalTail(office, asked.length);
    expect(rows.every(({ act, actor }) => act === 'password-reset.asked' && actor.id === 'anonymous')).toBe(
      true,
    );
    expect(JSON.stringify(rows)).not.toMatch(/nobody@|OR 1=1/);
  });

  it.each([[undefined], [''], [7], [['a@office.example']], ['x'.repeat(255)]])(
    'does not take %j',
    async (email) => {
      expect(problemOf(await ask(email).expect(400)).fields?.[0]?.field).toBe('email');
    },
  );

  it('does not take the host of its link from the request', async () => {
    const { email } = await signedInWith(office, 'engineer');
    await ask(email).set('Host', 'evil.example').set('X-Forwarded-Host', 'evil.example').expect(202);
    expect(lettersIn(office, email).at(-1)?.link).toMatch(
      /^http:\/\/register\.office\.example\/password-reset\//,
    );
  });

  it('cannot be used to flood somebody', async () => {
    const strict = await createTestApp({
      settings: { signInLimits: { windowSeconds: 300, perAddress: 50, perPerson: 3 } },
    });
    const { email } = await addPerson(strict, { email: 'anna@office.example' }).then(() => ({
      email: 'anna@office.example',
    }));
    const post = (to: string) => supertest(strict.server).post('/api/password-resets').send({ email: to });
    for (const to of [email, 'nobody@office.example']) {
      for (let times = 0; times < 3; times += 1) await post(to).expect(202);
      expect(codeOf(await post(to).expect(429))).toBe('too-many-requests');
    }
    expect(lettersIn(strict)).toHaveLength(3);
    await strict.close();
  });
});

describe('choosing a new password by link', () => {
  it('ends every session, voids the link and tells by mail', async () => {
    const { agent, email, actor } = await signedInWith(office, 'engineer');
    await ask(email);
    const token = tokenFor(office, email);
    await reset(token, NEW_PASSWORD).expect(204);
    await agent.get('/api/session').expect(401);
    await signIn(email, TEST_PASSWORD).expect(401);
    await signInAs(office, email, NEW_PASSWORD);
    await reset(token, 'and yet another password').expect(404);
    const letter = lettersIn(office, email).at(-1);
    expect(letter?.subject).toBe('Merestone: your password was changed');
    expect(JSON.stringify(letter)).not.toContain(NEW_PASSWORD);
    const done = journalTail(office, 5).find(({ act }) => act === 'password-reset.done');
    expect(done).toMatchObject({ subject: `people/${actor.id}`, detail: { sessionsEnded: 1 } });
  });

  it('happens once when two try at the same moment', async () => {
    const { email } = await signedInWith(office, 'engineer');
    await ask(email);
    const token = tokenFor(office, email);
    const passwords = ['the first of the two', 'the second of the two'];
    const answers = await Promise.all(passwords.map((password) => reset(token, password)));
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 404]);
    const winner = answers.findIndex(({ status }) => status === 204);
    await signIn(email, passwords[winner] ?? '').expect(200);
    await signIn(email, passwords[1 - winner] ?? '').expect(401);
  });

  it('works with the last link alone, and within an hour', async () => {
    const { email } = await signedInWith(office, 'engineer');
    await ask(email);
    const former = tokenFor(office, email);
    await ask(email);
    const token = tokenFor(office, email);
    await reset(former, NEW_PASSWORD).expect(404);
    office.clock.forward(61);
    await reset(token, NEW_PASSWORD).expect(404);
    await signIn(email, TEST_PASSWORD).expect(200);
  });

  it('is refused for a password that cannot be taken, and the link still holds', async () => {
    const { email } = await signedInWith(office, 'engineer');
    await ask(email);
    const token = tokenFor(office, email);
    for (const password of ['short', 'iloveyou', email, 'x'.repeat(129), '']) {
      const answer = await reset(token, password);
      expect([password, answer.status, problemOf(answer).fields?.[0]?.field]).toEqual([
        password,
        400,
        'password',
      ]);
    }
    await reset(token, NEW_PASSWORD).expect(204);
  });

  it('is not for somebody made inactive in the meantime', async () => {
    const { email, actor } = await signedInWith(office, 'engineer');
    await ask(email);
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(actor.id);
    await reset(tokenFor(office, email), NEW_PASSWORD).expect(404);
  });
});

describe('changing the own password', () => {
  it('needs the present one, and says which field is wrong', async () => {
    const { agent, email } = await signedInWith(office, 'engineer');
    const put = (body: object) => agent.put('/api/session/password').send(body);
    const before = rowCounts({ test: office });
    const wrong = await put({ current: 'not mine', password: NEW_PASSWORD }).expect(403);
    expect([codeOf(wrong), problemOf(wrong).fields?.[0]?.field]).toEqual(['password-refused', 'current']);
    for (const password of ['short', 'password1', TEST_PASSWORD, email]) {
      const answer = await put({ current: TEST_PASSWORD, password }).expect(400);
      expect(problemOf(answer).fields?.map(({ field }) => field)).toEqual(['password']);
    }
    await put({ password: NEW_PASSWORD }).expect(400);
    expect(rowCounts({ test: office })).toEqual(before);
    await signIn(email, TEST_PASSWORD).expect(200);
  });

  it('ends the other sessions, keeps this one and voids links on their way', async () => {
    const { agent, email } = await signedInWith(office, 'engineer');
    const other = await signInAs(office, email);
    await ask(email);
    const token = tokenFor(office, email);
    await agent
      .put('/api/session/password')
      .send({ current: TEST_PASSWORD, password: NEW_PASSWORD })
      .expect(204);
    await agent.get('/api/session').expect(200);
    await other.get('/api/session').expect(401);
    await reset(token, 'somebody else chose this').expect(404);
    await signIn(email, TEST_PASSWORD).expect(401);
    await signIn(email, NEW_PASSWORD).expect(200);
    expect(lettersIn(office, email).at(-1)?.subject).toContain('was changed');
  });

  it('takes an accented letter for the same, however a keyboard sends it', async () => {
    const { agent, email } = await signedInWith(office, 'engineer');
    const composed = 'die Mérestone steht'.normalize('NFC');
    await agent.put('/api/session/password').send({ current: TEST_PASSWORD, password: composed }).expect(204);
    await signIn(email, composed.normalize('NFD')).expect(200);
  });
});

describe('own sessions', () => {
  it('are listed with what the browser said, and name no secret', async () => {
    const { agent, email, actor } = await signedInWith(office, 'engineer');
    const other = supertest.agent(office.server);
    await other
      .post('/api/session')
      .set('User-Agent', `Browser\t1 ${'x'.repeat(500)}`)
      .send({ email, password: TEST_PASSWORD })
      .expect(200);
    await signedInWith(office, 'engineer');
    const { items } = (await agent.get('/api/session/sessions').expect(200)).body as {
      items: { id: string; agent: string; current: boolean }[];
    };
    expect(items.map(({ current }) => current).sort()).toEqual([false, true]);
    for (const item of items) {
      expect(Object.keys(item)).toEqual(['id', 'createdAt', 'lastSeenAt', 'agent', 'current']);
      expect(item.id).toMatch(/^[0-9a-f]{16}$/);
    }
    const second = items.find(({ current }) => !current);
    expect(second?.agent).toMatch(/^Browser 1 x{190}$/);

    await agent.delete(`/api/session/sessions/${second?.id ?? ''}`).expect(204);
    await other.get('/api/session').expect(401);
    await agent.delete(`/api/session/sessions/${second?.id ?? ''}`).expect(404);
    expect(journalTail(office, 1)).toMatchObject([{ act: 'session.closed', subject: `people/${actor.id}` }]);
  });

  it('are ended by their owner alone, and the one in use by signing out', async () => {
    const one = await signedInWith(office, 'engineer');
    const two = await signedInWith(office, 'administrator');
    const idOf = async (agent: typeof one.agent): Promise<string> => {
      const { items } = (await agent.get('/api/session/sessions').expect(200)).body as {
        items: { id: string }[];
      };
      return items[0]?.id ?? '';
    };
    await two.agent.delete(`/api/session/sessions/${await idOf(one.agent)}`).expect(404);
    expect(codeOf(await one.agent.delete(`/api/session/sessions/${await idOf(one.agent)}`))).toBe('conflict');
    for (const id of ['x', '%', 'A'.repeat(16), '0'.repeat(64)]) {
      const { status } = await one.agent.delete(`/api/session/sessions/${id}`);
      expect(status).toBe(400);
    }
    await one.agent.get('/api/session').expect(200);
  });
});
