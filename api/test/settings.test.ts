import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { journalTail } from './support/outbox.js';
import { signedInWith, type SignedIn } from './support/people.js';
import { problemOf } from './support/problem-of.js';

const GIVEN = { officeName: 'Cairn & Daughters', reviewsNeeded: 3, principal: null, reviewDueMonths: 24 };

let office: TestApp;
let administrator: SignedIn;
let engineer: SignedIn;

beforeAll(async () => {
  office = await createTestApp();
  administrator = await signedInWith(office, 'administrator');
  engineer = await signedInWith(office, 'engineer');
});
afterAll(() => office.close());

const put = (body: object) => administrator.agent.put('/api/settings').send(body);

describe('the settings of the office', () => {
  it('have defaults', async () => {
    expect((await engineer.agent.get('/api/settings').expect(200)).body).toEqual({
      officeName: 'This office',
      reviewsNeeded: 2,
      principal: null,
      reviewDueMonths: 36,
    });
  });

  it('are replaced whole, and the journal keeps what each was', async () => {
    const principal = { id: engineer.actor.id, name: engineer.actor.name };
    const { body } = await put({ ...GIVEN, principal: principal.id }).expect(200);
    expect(body).toEqual({ ...GIVEN, principal });
    expect(journalTail(office, 1)).toMatchObject([
      {
        act: 'settings.changed',
        detail: {
          officeName: { from: 'This office', to: GIVEN.officeName },
          reviewsNeeded: { from: 2, to: 3 },
          principalId: { from: null, to: principal.id },
          reviewDueMonths: { from: 36, to: 24 },
        },
      },
    ]);
    await put({ ...GIVEN, reviewsNeeded: 4, principal: principal.id }).expect(200);
    expect(journalTail(office, 1)[0]?.detail).toEqual({ reviewsNeeded: { from: 3, to: 4 } });
    expect((await engineer.agent.get('/api/settings').expect(200)).body).toMatchObject({ reviewsNeeded: 4 });
  });

  it.each([
    [{ reviewsNeeded: 0 }, 400, 'reviewsNeeded'],
    [{ reviewsNeeded: 6 }, 400, 'reviewsNeeded'],
    [{ reviewsNeeded: 1.5 }, 400, 'reviewsNeeded'],
    [{ reviewsNeeded: '2' }, 400, 'reviewsNeeded'],
    [{ reviewsNeeded: null }, 400, 'reviewsNeeded'],
    [{ reviewDueMonths: 0 }, 400, 'reviewDueMonths'],
    [{ reviewDueMonths: 121 }, 400, 'reviewDueMonths'],
    [{ officeName: '' }, 400, 'officeName'],
    [{ officeName: 'Two\nlines' }, 400, 'officeName'],
    [{ principal: undefined }, 400, 'principal'],
    [{ principal: 7 }, 400, 'principal'],
    [{ principal: 'nobody' }, 409, 'principal'],
    [{ demo: true }, 400, 'demo'],
  ])('refuse %j', async (wrong, status, field) => {
    const before = rowCounts({ test: office });
    const answer = await put({ ...GIVEN, ...wrong });
    expect([answer.status, problemOf(answer).fields?.map((one) => one.field)]).toEqual([status, [field]]);
    expect(rowCounts({ test: office })).toEqual(before);
  });

  it('do not take an administrator, or somebody who left, for principal', async () => {
    const gone = await signedInWith(office, 'engineer');
    await administrator.agent
      .post(`/api/people/${gone.actor.id}/deactivation`)
      .send({ reason: 'Left the office in spring.' })
      .expect(201);
    for (const { actor } of [administrator, gone]) {
      expect((await put({ ...GIVEN, principal: actor.id })).status).toBe(409);
    }
  });
});
