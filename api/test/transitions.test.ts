import supertest from 'supertest';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { RevisionRecord } from '../src/revisions/revision-record.js';
import { appointed } from './support/appointments.js';
import { inState, lifeRows, present, REASON, STATES, type State } from './support/life.js';
import { CHECKED, openOffice, type TestOffice } from './support/office.js';
import { signedInWith, TEST_PASSWORD, type Agent, type SignedIn } from './support/people.js';
import { tubeSheet } from './support/sheets.js';

/**
 * Every act in the life of a revision × every state × every caller. What is not allowed below is refused and leaves
 * every table as it was.
 */
const CALLERS = [
  'nobody',
  'originator',
  'other engineer',
  'reviewer',
  'third reviewer',
  'authority',
  'reviewing authority',
  'auditor',
  'administrator',
] as const;
type Caller = (typeof CALLERS)[number];

interface Act {
  readonly send: (agent: Agent, record: RevisionRecord) => PromiseLike<Response>;
  /** Who may do it in which state. */
  readonly allowed: Partial<Record<State, readonly Caller[]>>;
}

const post = (agent: Agent, { slug, number }: RevisionRecord, act: string, body: object) =>
  agent.post(`/api/correlations/${slug}/revisions/${number}/${act}`).send(body);
const everywhere = <T>(who: T, ...states: State[]): Partial<Record<State, T>> =>
  Object.fromEntries(states.map((state): [State, T] => [state, who]));

const IN_REVIEW: State[] = ['in review', 'recommended', 'changes asked'];
const SEEN_BY_ALL: State[] = ['approved', 'suspended', 'superseded', 'withdrawn'];
const AUTHORITIES: Caller[] = ['authority', 'reviewing authority'];
const REVIEWERS: Caller[] = ['reviewer', 'third reviewer', 'reviewing authority'];
const SEEING: Caller[] = [...REVIEWERS, 'originator', 'authority'];
const DRAFTERS: Caller[] = ['originator', 'other engineer', ...REVIEWERS];

const ACTS: Record<string, Act> = {
  edit: {
    send: (agent, { slug, number, hash }) =>
      agent
        .put(`/api/correlations/${slug}/revisions/${number}`)
        .set('If-Match', `"${hash}"`)
        .send({ definition: tubeSheet({ year: 1987 }) }),
    allowed: everywhere(['originator'], 'draft', ...IN_REVIEW),
  },
  submit: {
    send: (agent, record) => post(agent, record, 'submission', {}),
    allowed: { draft: ['originator'] },
  },
  'put forward': {
    send: (agent, record) => post(agent, record, 'iterations', {}),
    allowed: { 'changes asked': ['originator'] },
  },
  take: {
    send: (agent, record) => post(agent, record, 'assignments', {}),
    // Whoever gave a verdict has the review already.
    allowed: {
      'in review': REVIEWERS,
      recommended: ['third reviewer', 'reviewing authority'],
      'changes asked': ['third reviewer', 'reviewing authority'],
    },
  },
  recommend: {
    send: (agent, record) => post(agent, record, 'reviews', { verdict: 'recommend', checklist: CHECKED }),
    allowed: everywhere(REVIEWERS, 'in review', 'recommended'),
  },
  comment: {
    send: (agent, record) => post(agent, record, 'comments', { field: '', text: 'A remark.' }),
    allowed: {
      ...everywhere(SEEING, 'draft', ...IN_REVIEW, 'declined'),
      ...everywhere([...SEEING, 'other engineer'], ...SEEN_BY_ALL),
    },
  },
  approve: {
    send: (agent, record) =>
      post(agent, record, 'approval', { password: TEST_PASSWORD, meaning: 'Yes.', hash: record.hash }),
    allowed: { recommended: AUTHORITIES },
  },
  decline: {
    send: (agent, record) => post(agent, record, 'decline', { reason: REASON }),
    allowed: everywhere(AUTHORITIES, ...IN_REVIEW),
  },
  suspend: {
    send: (agent, record) => post(agent, record, 'suspension', { reason: REASON }),
    allowed: everywhere(AUTHORITIES, 'approved', 'superseded'),
  },
  reinstate: {
    send: (agent, record) => post(agent, record, 'reinstatement', { reason: REASON }),
    allowed: { suspended: AUTHORITIES },
  },
  withdraw: {
    send: (agent, record) => post(agent, record, 'withdrawal', { reason: REASON, class: 'error-in-source' }),
    allowed: everywhere(AUTHORITIES, 'approved', 'suspended', 'superseded'),
  },
  'draft the next': {
    send: (agent, { slug }) =>
      agent.post(`/api/correlations/${slug}/revisions`).send({ definition: tubeSheet({ year: 2020 }) }),
    allowed: {
      ...everywhere(DRAFTERS, ...SEEN_BY_ALL),
      declined: ['originator', ...REVIEWERS],
    },
  },
  'report a problem': {
    send: (agent, { slug, number }) =>
      agent
        .post(`/api/correlations/${slug}/problem-reports`)
        .send({ revision: number, severity: 'error', text: REASON }),
    allowed: everywhere(
      CALLERS.filter((caller) => caller !== 'nobody'),
      ...SEEN_BY_ALL,
    ),
  },
};

let office: TestOffice;
let agents: Record<Caller, Agent>;

const appoint = ({ actor }: SignedIn) =>
  appointed(office.test, { proposer: office.administrator, confirmer: office.otherEngineer }, actor.id);

beforeAll(async () => {
  office = await openOffice();
  const reviewingAuthority = await signedInWith(office.test, 'authority', 'reviewer');
  await appoint(reviewingAuthority);
  agents = {
    nobody: supertest.agent(office.test.server),
    originator: office.engineer.agent,
    'other engineer': office.otherEngineer.agent,
    reviewer: office.reviewer.agent,
    'third reviewer': (await signedInWith(office.test, 'reviewer')).agent,
    authority: office.authority.agent,
    'reviewing authority': reviewingAuthority.agent,
    auditor: office.auditor.agent,
    administrator: office.administrator.agent,
  };
});
afterAll(() => office.close());

describe.each(STATES)('a revision that is %s', (state) => {
  let record: RevisionRecord;
  beforeAll(async () => {
    record = await inState(office, state);
  });

  test.each(Object.entries(ACTS))(
    '%s: refused to everybody else, with nothing changed',
    async (_name, act) => {
      const allowed = act.allowed[state] ?? [];
      const before = lifeRows(office);
      for (const caller of CALLERS.filter((one) => !allowed.includes(one))) {
        const response = await act.send(agents[caller], record);
        expect(caller === 'nobody' ? [401] : [403, 404, 409], caller).toContain(response.status);
        expect(lifeRows(office), caller).toBe(before);
      }
      expect(present(office, record)).toEqual(record);
    },
  );

  test.each(Object.entries(ACTS).filter(([, { allowed }]) => allowed[state] !== undefined))(
    '%s: open to those it is for',
    async (_name, act) => {
      for (const caller of act.allowed[state] ?? []) {
        const own = await inState(office, state);
        const response = await act.send(agents[caller], own);
        expect([200, 201], `${caller}: ${response.text}`).toContain(response.status);
      }
    },
  );
});

describe('four eyes, for whoever holds every role', () => {
  test('nobody reviews, approves or declines what they originated, or approves what they reviewed', async () => {
    const all = await signedInWith(office.test, 'engineer', 'reviewer', 'authority');
    await appoint(all);
    const { body } = await all.agent
      .post('/api/correlations')
      .send({ slug: 'own-work', definition: tubeSheet() })
      .expect(201);
    const own = { slug: 'own-work', number: 1, hash: (body as { hash: string }).hash } as RevisionRecord;
    await post(all.agent, own, 'submission', {}).expect(201);
    const before = lifeRows(office);
    for (const act of ['take', 'recommend', 'approve', 'decline']) {
      expect((await ACTS[act]!.send(all.agent, own)).status, act).toBe(403);
    }
    expect(lifeRows(office)).toBe(before);

    const reviewed = await inState(office, 'recommended');
    await ACTS.recommend!.send(all.agent, reviewed);
    expect((await ACTS.approve!.send(all.agent, reviewed)).status).toBe(403);
    // Asking for changes and stepping back does not make anybody fresh eyes again.
    expect(present(office, reviewed).standing).toBe('in review');
  });
});

describe('acts that come twice', () => {
  const twice = async (state: State, act: string, callers: [Caller, Caller]) => {
    const record = await inState(office, state);
    const answers = await Promise.all(callers.map((caller) => ACTS[act]!.send(agents[caller], record)));
    return { record, statuses: answers.map(({ status }) => status).sort() };
  };

  test.each<[State, string, [Caller, Caller]]>([
    ['recommended', 'approve', ['authority', 'reviewing authority']],
    ['approved', 'withdraw', ['authority', 'reviewing authority']],
    ['approved', 'suspend', ['authority', 'authority']],
    ['in review', 'decline', ['authority', 'reviewing authority']],
    ['draft', 'submit', ['originator', 'originator']],
  ])('in a race on one that is %s: %s holds once', async (state, act, callers) => {
    const { statuses } = await twice(state, act, callers);
    expect(statuses).toEqual([201, 409]);
  });

  test('an edit in a race loses nothing: the second is told', async () => {
    const record = await inState(office, 'draft');
    const edit = (year: number) =>
      agents.originator
        .put(`/api/correlations/${record.slug}/revisions/1`)
        .set('If-Match', `"${record.hash}"`)
        .send({ definition: tubeSheet({ year }) });
    const answers = await Promise.all([edit(1990), edit(1991)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(present(office, record).iteration).toBe(2);
  });

  test('a content that changed is not approved by its former hash', async () => {
    const record = await inState(office, 'recommended');
    await ACTS.edit!.send(agents.originator, record);
    const response = await ACTS.approve!.send(agents.authority, record);
    expect(response.status).toBe(409);
    expect(present(office, record).standing).toBe('in review');
  });
});
