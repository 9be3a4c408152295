import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appointed, namePrincipal } from './support/appointments.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { journalTail } from './support/outbox.js';
import { signedInWith, signInAs, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

const reason = 'Left the office in spring.';

let office: TestApp;
let administrator: SignedIn;

beforeAll(async () => {
  office = await createTestApp();
  administrator = await signedInWith(office, 'administrator');
});
afterAll(() => office.close());

const change = (id: string, body: object) => administrator.agent.patch(`/api/people/${id}`).send(body);
const act = (id: string, what: 'deactivation' | 'reactivation', body: object = { reason }) =>
  administrator.agent.post(`/api/people/${id}/${what}`).send(body);

describe('the list of people', () => {
  it('shows an administrator everybody with all that is needed, and no secret', async () => {
    const someone = await signedInWith(office, 'engineer', 'auditor');
    const { body } = await administrator.agent.get('/api/people').expect(200);
    const entry = (body as { items: { id: string }[] }).items.find(({ id }) => id === someone.actor.id);
    expect(Object.keys(entry ?? {})).toEqual([
      'id',
      'name',
      'email',
      'roles',
      'active',
      'invited',
      'lastSignIn',
    ]);
    expect(entry).toMatchObject({
      email: someone.email,
      roles: ['engineer', 'auditor'],
      active: true,
      invited: false,
      lastSignIn: expect.stringMatching(/^\d{4}-.*Z$/) as string,
    });
    expect(JSON.stringify(body)).not.toMatch(/argon2|password/i);
  });
});

describe('changing a person', () => {
  it('takes name and roles, and the journal keeps what they were', async () => {
    const { actor } = await signedInWith(office, 'engineer');
    const { body } = await change(actor.id, { name: 'Another Name', roles: ['reviewer', 'auditor'] }).expect(
      200,
    );
    expect(body).toMatchObject({ id: actor.id, name: 'Another Name', roles: ['reviewer', 'auditor'] });
    expect(journalTail(office, 1)).toMatchObject([
      {
        act: 'person.changed',
        subject: `people/${actor.id}`,
        detail: {
          name: { from: actor.name, to: 'Another Name' },
          roles: { from: ['engineer'], to: ['reviewer', 'auditor'] },
        },
      },
    ]);
  });

  it('has its effect on the very next request', async () => {
    const { agent, actor } = await signedInWith(office, 'auditor');
    await agent.get('/api/journal').expect(200);
    await change(actor.id, { roles: ['engineer'] }).expect(200);
    await agent.get('/api/journal').expect(403);
  });

  it.each([
    [{}, 400, undefined],
    [{ name: null }, 400, 'name'],
    [{ name: 'A\nB' }, 400, 'name'],
    [{ name: ' ' }, 400, 'name'],
    [{ roles: null }, 400, 'roles'],
    [{ roles: ['root'] }, 400, 'roles'],
    [{ roles: ['engineer', 'engineer'] }, 400, 'roles'],
    [{ email: 'other@office.example' }, 400, 'email'],
    [{ active: false }, 400, 'active'],
    [{ passwordHash: 'x' }, 400, 'passwordHash'],
    [{ roles: ['authority'] }, 409, 'roles'],
    [{ roles: ['administrator', 'authority'] }, 409, 'roles'],
  ])('refuses %j', async (body, status, field) => {
    const { actor } = await signedInWith(office, 'engineer');
    const before = rowCounts({ test: office });
    const answer = await change(actor.id, body);
    expect([answer.status, problemOf(answer).fields?.[0]?.field]).toEqual([status, field]);
    expect(rowCounts({ test: office })).toEqual(before);
  });

  it('does not leave the office without an administrator', async () => {
    const alone = await createTestApp();
    const only = await signedInWith(alone, 'administrator');
    const step = (body: object) => only.agent.patch(`/api/people/${only.actor.id}`).send(body);
    expect(problemOf(await step({ roles: ['engineer'] }).expect(409)).fields?.[0]?.field).toBe('roles');
    const second = await signedInWith(alone, 'administrator');
    await step({ roles: ['engineer'] }).expect(200);
    await only.agent.get('/api/mail/outbox').expect(403);
    await second.agent.get('/api/mail/outbox').expect(200);
    await alone.close();
  });

  it('that takes the role of authority ends the appointment', async () => {
    const principal = await signedInWith(office, 'engineer');
    namePrincipal(office, administrator, principal);
    const candidate = await signedInWith(office, 'engineer');
    const { id } = await appointed(
      office,
      { proposer: administrator, confirmer: principal },
      candidate.actor.id,
    );
    await change(candidate.actor.id, { roles: ['engineer'] }).expect(200);
    const { body } = await administrator.agent.get('/api/appointments').expect(200);
    const item = (body as { items: { id: string; state: string }[] }).items.find((one) => one.id === id);
    expect(item).toMatchObject({ state: 'ended', endReason: 'The role of technical authority was taken.' });
    expect(journalTail(office, 2).map((entry) => entry.act)).toEqual(['person.changed', 'appointment.ended']);
  });
});

describe('making somebody inactive', () => {
  it('ends their sessions at once and for good, and their appointment', async () => {
    const principal = await signedInWith(office, 'engineer');
    namePrincipal(office, administrator, principal);
    const person = await signedInWith(office, 'engineer');
    await appointed(office, { proposer: administrator, confirmer: principal }, person.actor.id);
    const second = await signInAs(office, person.email);

    const { body } = await act(person.actor.id, 'deactivation').expect(201);
    expect(body).toMatchObject({ id: person.actor.id, active: false });
    await person.agent.get('/api/session').expect(401);
    await second.get('/api/session').expect(401);
    expect(journalTail(office, 1)).toMatchObject([{ act: 'person.deactivated', detail: { reason } }]);

    await act(person.actor.id, 'reactivation').expect(201);
    // What was ended stays ended.
    await person.agent.get('/api/session').expect(401);
    await signInAs(office, person.email);
    const { body: list } = await administrator.agent.get('/api/appointments').expect(200);
    const theirs = (list as { items: { person: { id: string }; state: string }[] }).items.filter(
      (one) => one.person.id === person.actor.id,
    );
    expect(theirs.map(({ state }) => state)).toEqual(['ended']);
  });

  it('is refused twice, for oneself, for nobody and without a reason', async () => {
    const { actor } = await signedInWith(office, 'engineer');
    await act(actor.id, 'reactivation').expect(409);
    await act(actor.id, 'deactivation').expect(201);
    const before = rowCounts({ test: office });
    expect(codeOf(await act(actor.id, 'deactivation'))).toBe('conflict');
    expect((await act(administrator.actor.id, 'deactivation')).status).toBe(403);
    expect((await act('nobody', 'deactivation')).status).toBe(404);
    for (const body of [
      {},
      { reason: '' },
      { reason: '         x' },
      { reason: 7 },
      { reason: 'x'.repeat(4001) },
    ]) {
      expect((await act(actor.id, 'reactivation', body)).status).toBe(400);
    }
    expect(rowCounts({ test: office })).toEqual(before);
  });

  it('leaves one of two administrators who do it to each other at the same moment', async () => {
    const pair = await createTestApp();
    const one = await signedInWith(pair, 'administrator');
    const two = await signedInWith(pair, 'administrator');
    const answers = await Promise.all([
      one.agent.post(`/api/people/${two.actor.id}/deactivation`).send({ reason }),
      two.agent.post(`/api/people/${one.actor.id}/deactivation`).send({ reason }),
    ]);
    expect(answers.filter(({ status }) => status === 201)).toHaveLength(1);
    const left = pair.connection.sqlite.prepare('SELECT count(*) FROM person WHERE active = 1').pluck().get();
    expect(left).toBe(1);
    await pair.close();
  });
});
