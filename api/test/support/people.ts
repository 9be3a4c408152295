import supertest from 'supertest';
import { SYSTEM_ACTOR, type Actor } from '../../src/common/actor.js';
import { ROLES, type Role } from '../../src/common/roles.js';
import { PeopleService, type PersonToAdd } from '../../src/people/people.service.js';
import type { TestApp } from './create-test-app.js';

export type Agent = ReturnType<typeof supertest.agent>;

export const TEST_PASSWORD = 'a password for tests';

let added = 0;

/** Adds a person through the service that people use; every value can be overridden. */
export function addPerson({ app }: TestApp, overrides: Partial<PersonToAdd> = {}): Promise<Actor> {
  added += 1;
  return app.get(PeopleService).add(SYSTEM_ACTOR, {
    name: `Person ${added}`,
    email: `person-${added}@office.example`,
    password: TEST_PASSWORD,
    roles: ['engineer'],
    ...overrides,
  });
}

/** An agent that keeps the cookie of somebody signed in. */
export async function signInAs(office: TestApp, email: string, password = TEST_PASSWORD): Promise<Agent> {
  const agent = supertest.agent(office.server);
  await agent.post('/api/session').send({ email, password }).expect(200);
  return agent;
}

export interface SignedIn {
  readonly agent: Agent;
  readonly actor: Actor;
  readonly email: string;
}

/** Adds a person with these roles and signs in. */
export async function signedInWith(office: TestApp, ...roles: Role[]): Promise<SignedIn> {
  const email = `${roles.join('-')}-${(added += 1)}@office.example`;
  const actor = await addPerson(office, { email, roles });
  return { agent: await signInAs(office, email), actor, email };
}

/** Somebody signed in for each role, and somebody who is not. */
export async function everyCaller(office: TestApp): Promise<Map<Role | 'nobody', Agent>> {
  const callers = new Map<Role | 'nobody', Agent>([['nobody', supertest.agent(office.server)]]);
  for (const role of ROLES) callers.set(role, (await signedInWith(office, role)).agent);
  return callers;
}
