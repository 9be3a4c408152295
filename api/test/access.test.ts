import { Controller, Get, Post } from '@nestjs/common';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Public } from '../src/common/access/public.decorator.js';
import { rolesWith, type Permission } from '../src/common/permissions.js';
import { ROLES, type Role } from '../src/common/roles.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson, everyCaller, signedInWith, signInAs, type Agent } from './support/people.js';
import { codeOf } from './support/problem-of.js';

@Controller('test')
class TestController {
  @Get('undeclared')
  undeclared(): string {
    return 'nobody should read this';
  }

  @Get('failing')
  @Public()
  failing(): never {
    throw new Error('secret-of-the-house in /some/path');
  }

  @Post('busy')
  @Public()
  busy(): never {
    throw Object.assign(new Error('database is locked'), { code: 'SQLITE_BUSY' });
  }
}

let office: TestApp;
let callers: Map<Role | 'nobody', Agent>;

beforeAll(async () => {
  office = await createTestApp({ controllers: [TestController] });
  callers = await everyCaller(office);
});
afterAll(() => office.close());

const statusFor = async (
  caller: Role | 'nobody',
  method: 'get' | 'post' | 'delete',
  path: string,
): Promise<number> => {
  const agent = callers.get(caller) ?? supertest.agent(office.server);
  return (await agent[method](path)).status;
};

type Route = readonly ['get' | 'post', string, Permission];

// Who may do what, written out once more, so that a slip in the permission table is seen.
const EXPECTED: readonly (readonly [...Route, readonly Role[]])[] = [
  ['get', '/api/people', 'people.list', ['engineer', 'reviewer', 'authority', 'administrator']],
  ['get', '/api/journal', 'journal.read', ['authority', 'auditor', 'administrator']],
  ['get', '/api/journal/checkpoints', 'journal.read', ['authority', 'auditor', 'administrator']],
  ['post', '/api/journal/verification', 'journal.verify', ['authority', 'auditor', 'administrator']],
  ['get', '/api/mail/outbox', 'mail.read', ['administrator']],
];

describe.each(EXPECTED)('%s %s', (method, path, permission, allowed) => {
  it.each(ROLES)('answers the %s as the table says', async (role) => {
    expect(await statusFor(role, method, path)).toBe(allowed.includes(role) ? 200 : 403);
    expect(rolesWith(permission).includes(role)).toBe(allowed.includes(role));
  });

  it('is closed to whoever is not signed in', async () => {
    expect(await statusFor('nobody', method, path)).toBe(401);
  });
});

describe('routes for everybody signed in', () => {
  it.each(ROLES)('let the %s in', async (role) => {
    expect(await statusFor(role, 'get', '/api/session')).toBe(200);
  });

  it('let nobody else in', async () => {
    expect(await statusFor('nobody', 'get', '/api/session')).toBe(401);
    expect(await statusFor('nobody', 'delete', '/api/session')).toBe(401);
  });
});

describe('public routes', () => {
  it.each([...ROLES, 'nobody'] as const)('let in: %s', async (caller) => {
    expect(await statusFor(caller, 'get', '/api/health')).toBe(200);
    expect(await statusFor(caller, 'get', '/api/openapi.json')).toBe(200);
    expect(await statusFor(caller, 'get', '/api/session/demo-people')).toBe(404);
  });
});

describe('a route that says nothing about who may use it', () => {
  it.each([...ROLES, 'nobody'] as const)('is closed to: %s', async (caller) => {
    expect(await statusFor(caller, 'get', '/api/test/undeclared')).toBe(caller === 'nobody' ? 401 : 403);
  });
});

describe('roles', () => {
  it('add up on one person', async () => {
    const { agent } = await signedInWith(office, 'engineer', 'auditor');
    await agent.get('/api/people').expect(200);
    await agent.get('/api/journal').expect(200);
    await agent.get('/api/mail/outbox').expect(403);
  });

  it('never make an administrator a technical authority', async () => {
    await expect(addPerson(office, { roles: ['administrator', 'authority'] })).rejects.toMatchObject({
      code: 'conflict',
    });
  });

  it('allow nothing when there are none', async () => {
    await addPerson(office, { email: 'none@office.example', roles: [] });
    const agent = await signInAs(office, 'none@office.example');
    await agent.get('/api/session').expect(200);
    for (const [method, path] of EXPECTED) expect((await agent[method](path)).status).toBe(403);
  });
});

describe('the list of people', () => {
  it('holds name and roles of everybody active, and nothing else', async () => {
    const gone = await addPerson(office, { name: 'Gone' });
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(gone.id);
    const { body } = (await callers.get('engineer')?.get('/api/people')) as {
      body: { items: { name: string }[] };
    };

    expect(body.items.map(({ name }) => name)).not.toContain('Gone');
    for (const item of body.items) expect(Object.keys(item)).toEqual(['id', 'name', 'roles']);
  });
});

describe('what goes wrong', () => {
  it('tells the caller nothing of an unexpected failure but a number to quote', async () => {
    const answer = await supertest(office.server).get('/api/test/failing').expect(500);

    expect(codeOf(answer)).toBe('internal');
    expect(answer.text).toMatch(/"instance":"urn:uuid:[0-9a-f-]{36}"/);
    expect(answer.text).not.toMatch(/secret-of-the-house|some\/path|Error|stack/);
  });

  it('asks for patience when the database is busy', async () => {
    expect(codeOf(await supertest(office.server).post('/api/test/busy').expect(503))).toBe('unavailable');
  });

  it.each(['/api', '/api/nothing', '/api/journal/nothing', '/api/health/nothing'])(
    'says that there is nothing at %s',
    async (path) => {
      expect(codeOf(await supertest(office.server).get(path).expect(404))).toBe('not-found');
    },
  );

  it('says the same of an address that cannot be read', async () => {
    const answer = await supertest(office.server).get('/api/%E0%A4%A');
    expect(answer.status).toBeGreaterThanOrEqual(400);
    expect(answer.status).toBeLessThan(500);
    expect(['malformed', 'not-found']).toContain(codeOf(answer));
  });
});
