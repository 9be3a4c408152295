import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROLES, type Role } from '../src/common/roles.js';
import { NoticesService } from '../src/notices/notices.service.js';
import { Writer } from '../src/database/write.js';
import { namePrincipal } from './support/appointments.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { signedInWith, signInAs, type Agent, type SignedIn } from './support/people.js';
import { addGeometries } from './support/sheets.js';
import supertest from 'supertest';

type Caller = Role | 'nobody';
type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

const ALL: readonly Caller[] = [...ROLES];
const EVERYBODY: readonly Caller[] = [...ROLES, 'nobody'];
const ADMINISTRATOR: readonly Caller[] = ['administrator'];
const reason = 'Long enough to be one.';
const token = 'x'.repeat(43);

/**
 * Every route on people and the office: who may use it, and what those who may get. Acts are asked of what is not
 * there, or with a body that cannot be used, so that who may is told that, and nothing is done.
 */
const ROUTES: readonly (readonly [Method, string, object | undefined, readonly Caller[], number])[] = [
  ['get', '/api/people', undefined, ['engineer', 'reviewer', 'authority', 'administrator'], 200],
  ['patch', '/api/people/nobody', { name: 'Else' }, ADMINISTRATOR, 404],
  ['post', '/api/people/nobody/deactivation', { reason }, ADMINISTRATOR, 404],
  ['post', '/api/people/nobody/reactivation', { reason }, ADMINISTRATOR, 404],
  ['post', '/api/people/invitations', {}, ADMINISTRATOR, 400],
  ['get', `/api/invitations/${token}`, undefined, EVERYBODY, 404],
  ['post', `/api/invitations/${token}`, { password: 'a fine new password' }, EVERYBODY, 404],
  ['post', '/api/password-resets', {}, EVERYBODY, 400],
  ['post', `/api/password-resets/${token}`, { password: 'a fine new password' }, EVERYBODY, 404],
  ['get', '/api/session/sessions', undefined, ALL, 200],
  ['delete', '/api/session/sessions/0123456789abcdef', undefined, ALL, 404],
  ['put', '/api/session/password', { current: 'no', password: 'a fine new password' }, ALL, 403],
  ['get', '/api/appointments', undefined, ALL, 200],
  ['post', '/api/appointments', {}, ADMINISTRATOR, 400],
  ['post', '/api/appointments/none/confirmation', { password: 'x' }, ALL, 404],
  ['post', '/api/appointments/none/end', { reason }, ['authority', 'administrator'], 404],
  ['get', '/api/settings', undefined, ALL, 200],
  ['put', '/api/settings', {}, ADMINISTRATOR, 400],
  ['get', '/api/notices', undefined, ALL, 200],
  ['post', '/api/notices/1/reading', {}, ALL, 404],
  ['get', '/api/notices/preferences', undefined, ALL, 200],
  ['put', '/api/notices/preferences', {}, ALL, 400],
];

let office: TestApp;
let people: Map<Role, SignedIn>;
let agents: Map<Caller, Agent>;

beforeAll(async () => {
  office = await createTestApp();
  addGeometries(office);
  people = new Map();
  for (const role of ROLES) people.set(role, await signedInWith(office, role));
  agents = new Map<Caller, Agent>([['nobody', supertest.agent(office.server)]]);
  for (const [role, { agent }] of people) agents.set(role, agent);
  // A notice of somebody who is none of the callers.
  const { actor } = await signedInWith(office, 'engineer');
  office.app.get(Writer).writeUnjournalled('mail-delivery', (tx, at) => {
    office.app.get(NoticesService).tell(tx, at, [actor.id], { kind: 'comment', text: 'Other', href: '/' });
  });
});
afterAll(() => office.close());

describe.each(ROUTES)('%s %s', (method, path, body, allowed, status) => {
  it.each<Caller>(['nobody', ...ROLES])('for %s', async (caller) => {
    const before = rowCounts({ test: office });
    const request = agents.get(caller)?.[method](path);
    const response = await (body === undefined ? request : request?.send(body));
    const refused = caller === 'nobody' ? 401 : 403;
    expect(response?.status).toBe(allowed.includes(caller) ? status : refused);
    expect(rowCounts({ test: office })).toEqual(before);
  });
});

describe('confirming a proposal', () => {
  it('is for the principal and for appointed authorities alone, whatever the role', async () => {
    const administrator = people.get('administrator')!;
    const candidate = await signedInWith(office, 'engineer');
    const until = new Date(office.clock.now().getTime() + 40 * 86_400_000).toISOString().slice(0, 10);
    const proposed = await administrator.agent
      .post('/api/appointments')
      .send({ person: candidate.actor.id, geometries: ['tube'], until })
      .expect(201);
    const path = `/api/appointments/${(proposed.body as { id: string }).id}/confirmation`;
    const password = 'a password for tests';

    // The authority holds the role and no appointment, so it may not appoint others either.
    for (const role of ROLES) {
      const before = rowCounts({ test: office });
      expect([role, (await agents.get(role)!.post(path).send({ password })).status]).toEqual([role, 403]);
      expect(rowCounts({ test: office })).toEqual(before);
    }
    const principal = await signedInWith(office, 'auditor');
    namePrincipal(office, administrator, principal);
    await principal.agent.post(path).send({ password }).expect(201);
    const agent = await signInAs(office, candidate.email);
    const { body } = await agent.get('/api/session').expect(200);
    expect((body as { person: { roles: string[] } }).person.roles).toEqual(['engineer', 'authority']);
  });
});
