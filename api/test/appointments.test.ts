import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AppointmentsService } from '../src/appointments/appointments.service.js';
import type { AppointmentItem } from '../src/appointments/dto/appointments-response.dto.js';
import { ApprovalService } from '../src/reviews/approval.service.js';
import { ScheduleService } from '../src/schedule/schedule.service.js';
import { appointed, dayIn, namePrincipal } from './support/appointments.js';
import { approved, draft, openOffice, recommended, rowCounts, type TestOffice } from './support/office.js';
import { journalTail, lettersIn } from './support/outbox.js';
import { signedInWith, signInAs, TEST_PASSWORD, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

const reason = 'Goes into retirement in autumn.';

let office: TestOffice;
let principal: SignedIn;

beforeAll(async () => {
  office = await openOffice();
  principal = office.otherEngineer;
});
afterAll(() => office.close());

const propose = (body: object, by = office.administrator) => by.agent.post('/api/appointments').send(body);
const confirm = (id: string, by: SignedIn, password = TEST_PASSWORD) =>
  by.agent.post(`/api/appointments/${id}/confirmation`).send({ password });
const end = (id: string, by: SignedIn) => by.agent.post(`/api/appointments/${id}/end`).send({ reason });
const until = (days = 100): string => dayIn(office.test, days);

async function proposed(person: SignedIn, overrides: object = {}): Promise<AppointmentItem> {
  const body = { person: person.actor.id, geometries: ['tube'], until: until(), ...overrides };
  return (await propose(body).expect(201)).body as AppointmentItem;
}

async function itemFor(reader: SignedIn, id: string): Promise<AppointmentItem> {
  const { items } = (await reader.agent.get('/api/appointments').expect(200)).body as {
    items: AppointmentItem[];
  };
  return items.find((one) => one.id === id)!;
}

/** Somebody appointed for tubes alone, signed in anew with the role. */
async function tubeAuthority(overrides: object = {}): Promise<SignedIn> {
  const person = await signedInWith(office.test, 'engineer');
  const parties = { proposer: office.administrator, confirmer: principal };
  await appointed(office.test, parties, person.actor.id, { geometries: ['tube'], ...overrides });
  return {
    ...person,
    agent: await signInAs(office.test, person.email),
    actor: { ...person.actor, roles: ['engineer', 'authority'] },
  };
}

const approve = (slug: string, hash: string, by: SignedIn) =>
  by.agent
    .post(`/api/correlations/${slug}/revisions/1/approval`)
    .send({ password: TEST_PASSWORD, meaning: 'Approved for tests', hash });

describe('a proposal', () => {
  it.each([
    ['nobody', { person: 'nobody' }, 409, 'person'],
    ['no person', { person: undefined }, 400, 'person'],
    ['no geometry', { geometries: [] }, 400, 'geometries'],
    ['a geometry that is not there', { geometries: ['tube', 'cone'] }, 400, 'geometries.1'],
    ['a geometry twice', { geometries: ['tube', 'tube'] }, 400, 'geometries'],
    ['a scope of its own making', { geometries: 'ALL' }, 400, 'geometries'],
    ['numbers for geometries', { geometries: [1] }, 400, 'geometries'],
    ['a day in the past', { until: '2020-01-01' }, 400, 'until'],
    ['a day that does not exist', { until: '2027-02-30' }, 400, 'until'],
    ['a time for a day', { until: '2027-02-20T00:00:00Z' }, 400, 'until'],
    ['a day far off', { until: '2099-01-01' }, 400, 'until'],
    ['a confirmation along with it', { confirmedAt: '2026-01-01' }, 400, 'confirmedAt'],
  ])('is refused with %s', async (_name, wrong, status, field) => {
    const before = rowCounts(office);
    const answer = await propose({
      person: office.engineer.actor.id,
      geometries: 'all',
      until: until(),
      ...wrong,
    });
    expect([answer.status, problemOf(answer).fields?.map((one) => one.field)]).toEqual([status, [field]]);
    expect(rowCounts(office)).toEqual(before);
  });

  it('is not for an administrator, nor for oneself', async () => {
    const other = await signedInWith(office.test, 'administrator');
    expect((await propose({ person: other.actor.id, geometries: 'all', until: until() })).status).toBe(409);
    const own = await propose({ person: office.administrator.actor.id, geometries: 'all', until: until() });
    expect([own.status, codeOf(own)]).toEqual([403, 'forbidden']);
  });

  it('gives no right, and tells those who can confirm it, by mail too', async () => {
    const person = await signedInWith(office.test, 'engineer');
    const item = await proposed(person);
    expect(item).toMatchObject({ state: 'proposed', geometries: ['tube'], confirmed: null, ended: null });
    expect(item.abilities).toEqual({ confirm: false, end: true });
    const { body } = await (await signInAs(office.test, person.email)).get('/api/session').expect(200);
    expect((body as { person: { roles: string[] } }).person.roles).toEqual(['engineer']);
    for (const one of [principal, office.authority, office.secondAuthority]) {
      const letter = lettersIn(office.test, one.email).at(-1);
      expect(letter?.subject).toBe('Merestone: an appointment');
      expect((await itemFor(one, item.id)).abilities.confirm).toBe(true);
    }
    expect((await itemFor(office.auditor, item.id)).abilities).toEqual({ confirm: false, end: false });
  });
});

describe('a confirmation', () => {
  it('is signed with the own password', async () => {
    const person = await signedInWith(office.test, 'engineer');
    const { id } = await proposed(person);
    const before = rowCounts(office);
    const wrong = await confirm(id, principal, 'not mine');
    expect([wrong.status, codeOf(wrong), problemOf(wrong).fields?.[0]?.field]).toEqual([
      403,
      'password-refused',
      'password',
    ]);
    expect((await principal.agent.post(`/api/appointments/${id}/confirmation`).send({})).status).toBe(400);
    expect(rowCounts(office)).toEqual(before);
    const { body } = await confirm(id, principal).expect(201);
    expect(body).toMatchObject({ state: 'current', confirmed: { by: { id: principal.actor.id } } });
    expect(journalTail(office.test, 1)).toMatchObject([
      {
        act: 'appointment.confirmed',
        actor: { id: principal.actor.id },
        detail: { person: person.actor.id },
      },
    ]);
  });

  it('is not by the one concerned, even an authority, nor by whoever is only principal no more', async () => {
    const { id } = await proposed(office.authority, { geometries: 'all' });
    expect((await confirm(id, office.authority)).status).toBe(403);
    namePrincipal(office.test, office.administrator, null);
    expect((await confirm(id, principal)).status).toBe(403);
    namePrincipal(office.test, office.administrator, principal);
    await confirm(id, office.secondAuthority).expect(201);
  });

  it('is not by the administrator who proposed it, even as principal of old', async () => {
    const both = await signedInWith(office.test, 'engineer');
    namePrincipal(office.test, office.administrator, both);
    await office.administrator.agent
      .patch(`/api/people/${both.actor.id}`)
      .send({ roles: ['administrator'] })
      .expect(200);
    const person = await signedInWith(office.test, 'engineer');
    const item = (
      await propose({ person: person.actor.id, geometries: 'all', until: until() }, both).expect(201)
    ).body as AppointmentItem;
    expect((await confirm(item.id, both)).status).toBe(403);
    namePrincipal(office.test, office.administrator, principal);
  });

  it('happens once when two confirm at the same moment', async () => {
    const person = await signedInWith(office.test, 'engineer');
    const { id } = await proposed(person);
    const answers = await Promise.all(
      [principal, office.authority, office.secondAuthority].map((by) => confirm(id, by)),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    const confirmations = journalTail(office.test, 10).filter(
      ({ act, subject }) => act === 'appointment.confirmed' && subject === `appointments/${id}`,
    );
    expect(confirmations).toHaveLength(1);
  });

  it('is not for a proposal taken back, nor for somebody who left or became administrator', async () => {
    const person = await signedInWith(office.test, 'engineer');
    const back = await proposed(person);
    await end(back.id, office.administrator).expect(201);
    expect((await confirm(back.id, principal)).status).toBe(409);

    const turned = await proposed(person);
    await office.administrator.agent
      .patch(`/api/people/${person.actor.id}`)
      .send({ roles: ['administrator'] })
      .expect(200);
    expect((await confirm(turned.id, principal)).status).toBe(409);

    const left = await signedInWith(office.test, 'engineer');
    const open = await proposed(left);
    await office.administrator.agent
      .post(`/api/people/${left.actor.id}/deactivation`)
      .send({ reason })
      .expect(201);
    expect((await confirm(open.id, principal)).status).toBe(409);
  });
});

describe('approvals', () => {
  it('need an appointment that covers the geometry', async () => {
    const tube = await tubeAuthority();
    const ball = await tubeAuthority({ geometries: ['ball'] });
    const { hash } = recommended(office, draft(office, 'for-tubes'));
    const before = rowCounts(office);
    const refused = await approve('for-tubes', hash, ball);
    expect([refused.status, codeOf(refused)]).toEqual([403, 'forbidden']);
    expect(rowCounts(office)).toEqual(before);
    const sheet = (by: SignedIn) => by.agent.get('/api/correlations/for-tubes/revisions/1').expect(200);
    expect((await sheet(ball)).body).toMatchObject({ abilities: { approve: false } });
    expect((await sheet(tube)).body).toMatchObject({ abilities: { approve: true } });
    await approve('for-tubes', hash, tube).expect(201);
  });

  it('are not for somebody with the role alone', async () => {
    const unappointed = await signedInWith(office.test, 'authority');
    const { hash } = recommended(office, draft(office, 'role-alone'));
    expect((await approve('role-alone', hash, unappointed)).status).toBe(403);
  });

  it('stop with the end of the appointment, and those that were given stand', async () => {
    const authority = await tubeAuthority();
    const { hash, ...key } = recommended(office, draft(office, 'before-the-end'));
    const signature = { password: TEST_PASSWORD, meaning: 'Approved for tests', hash };
    await office.test.app.get(ApprovalService).approve(authority.actor, key, signature);
    const next = recommended(office, draft(office, 'after-the-end'));
    const item = office.test.app
      .get(AppointmentsService)
      .list(authority.actor)
      .items.find(({ person }) => person.id === authority.actor.id)!;
    const { body } = await end(item.id, office.administrator).expect(201);
    expect(body).toMatchObject({ state: 'ended', endReason: reason });
    expect((await end(item.id, office.administrator)).status).toBe(409);
    expect((await approve('after-the-end', next.hash, authority)).status).toBe(403);
    const sheet = await authority.agent.get('/api/correlations/before-the-end').expect(200);
    expect(sheet.body).toMatchObject({ standing: 'approved', approval: { by: { id: authority.actor.id } } });
    // New approvals alone stop: the role stays until an administrator takes it.
    await authority.agent
      .post('/api/correlations/before-the-end/revisions/1/suspension')
      .send({ reason: 'A doubt about the inlet.' })
      .expect(201);
  });

  it('rest on as many reviews as the office asks for', async () => {
    const settings = { officeName: 'Office for tests', principal: principal.actor.id, reviewDueMonths: 36 };
    const set = (reviewsNeeded: number) =>
      office.administrator.agent
        .put('/api/settings')
        .send({ ...settings, reviewsNeeded })
        .expect(200);
    const { hash } = recommended(office, draft(office, 'three-reviews'));
    await set(3);
    const refused = await approve('three-reviews', hash, office.authority);
    expect([refused.status, codeOf(refused)]).toEqual([409, 'conflict']);
    await set(2);
    await approve('three-reviews', hash, office.authority).expect(201);
  });
});

describe('the rows of appointments', () => {
  const refuse = (sql: string): void => {
    expect(() => office.test.connection.sqlite.exec(sql), sql).toThrow(/appointment/);
  };

  it('can be neither changed nor removed nor put in confirmed, with raw SQL either', async () => {
    await approved(office, draft(office, 'rows'));
    for (const column of [
      'id',
      'person_id',
      'geometries',
      'until',
      'proposed_at',
      'proposed_by_id',
      'proposed_by_name',
      'confirmed_at',
      'confirmed_by_id',
      'confirmed_by_name',
    ]) {
      refuse(`UPDATE appointment SET "${column}" = 'x' WHERE confirmed_at IS NOT NULL`);
    }
    refuse("UPDATE appointment SET end_reason = 'x' WHERE ended_at IS NOT NULL");
    refuse('DELETE FROM appointment');
    refuse('INSERT OR REPLACE INTO appointment SELECT * FROM appointment WHERE confirmed_at IS NOT NULL');
    refuse(`INSERT INTO appointment (id, person_id, until, proposed_at, proposed_by_id, proposed_by_name, confirmed_at)
      SELECT 'own', person_id, until, proposed_at, proposed_by_id, proposed_by_name, proposed_at FROM appointment LIMIT 1`);
    const { id } = await proposed(await signedInWith(office.test, 'engineer'));
    refuse(`UPDATE appointment SET confirmed_at = 'now', confirmed_by_id = person_id WHERE id = '${id}'`);
    refuse(
      `UPDATE appointment SET confirmed_at = 'now', confirmed_by_id = proposed_by_id WHERE id = '${id}'`,
    );
  });
});

describe('an appointment whose last day has passed', () => {
  it('covers nothing from then on, and the tick writes that down once', async () => {
    const authority = await tubeAuthority({ until: until(3) });
    const service = office.test.app.get(AppointmentsService);
    const now = (): string => office.test.clock.now().toISOString();
    expect(service.mayApproveFor(authority.actor.id, 'tube', now())).toBe(true);
    expect(service.mayApproveFor(authority.actor.id, 'ball', now())).toBe(false);
    office.test.clock.forward(4 * 24 * 60);
    expect(service.mayApproveFor(authority.actor.id, 'tube', now())).toBe(false);
    const schedule = office.test.app.get(ScheduleService);
    await schedule.tick();
    await schedule.tick();
    const lapsed = journalTail(office.test, 20).filter(({ act }) => act === 'appointment.lapsed');
    expect(lapsed).toMatchObject([{ actor: { id: 'system' }, detail: { person: authority.actor.id } }]);
    expect(lettersIn(office.test, authority.email).at(-1)?.body).toContain(
      'Approvals that were given stand.',
    );
  });
});
