import { compileCorrelation, evaluate, type CorrelationDefinition } from '@merestone/engine';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { CandidatesResponse } from '../src/candidates/dto/candidates-response.dto.js';
import type { CorrelationPage } from '../src/correlations/dto/correlation-page.dto.js';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import { STANDINGS, UNAPPROVED } from '../src/common/standing.js';
import type { Desk } from '../src/desk/dto/desk.dto.js';
import { FixtureFiles } from '../src/database/seed/fixture-files.js';
import { SeedService } from '../src/database/seed/seed.service.js';
import { correlationStanding } from '../src/database/seed/standing-rule.js';
import type { EvaluationResponse } from '../src/evaluations/dto/evaluation-response.dto.js';
import type { GeometriesResponse } from '../src/geometries/dto/geometries-response.dto.js';
import { DEMO_PASSWORD } from '../src/people/demo-people.js';
import type { PropertyEquationsResponse } from '../src/property-equations/dto/property-equation.dto.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { signInAs, type Agent } from './support/people.js';
import { problemOf } from './support/problem-of.js';

/** The demo office with the whole library, as on a first start. */
let office: TestApp;
let engineer: Agent;
let secondEngineer: Agent;
let reviewer: Agent;
let auditor: Agent;

const files = new FixtureFiles();
const demo = (name: string): Promise<Agent> => signInAs(office, `${name}@merestone.example`, DEMO_PASSWORD);

beforeAll(async () => {
  office = await createTestApp();
  await office.app.get(SeedService).fill(true);
  [engineer, secondEngineer, reviewer, auditor] = await Promise.all([
    demo('engineer'),
    demo('engineer2'),
    demo('reviewer'),
    demo('auditor'),
  ]);
});
afterAll(() => office.close());

async function page(who: Agent, query: Record<string, string | number> = {}): Promise<CorrelationPage> {
  return (await who.get('/api/correlations').query(query).expect(200)).body as CorrelationPage;
}

async function everyItem(who: Agent, query: Record<string, string> = {}): Promise<CorrelationPage['items']> {
  const items: CorrelationPage['items'] = [];
  let cursor: string | null = null;
  do {
    const next: CorrelationPage = await page(who, {
      ...query,
      limit: 7,
      ...(cursor === null ? {} : { cursor }),
    });
    items.push(...next.items);
    cursor = next.nextCursor;
  } while (cursor !== null);
  return items;
}

describe('the demo office', () => {
  test('has every sheet of the library, in the standing that the rule gives or that its life led to', async () => {
    const items = await everyItem(auditor);
    const library = files.correlations();
    expect(items.map(({ slug }) => slug).sort()).toEqual(library.map(({ slug }) => slug).sort());
    const standings = new Map(items.map(({ slug, standing }) => [slug, standing]));
    const ruled = library.filter(({ slug }) => standings.get(slug) !== 'draft');
    const ledTo = new Map<string, string>(
      files.demoLife().life.flatMap(({ slug, acts }): [string, string][] => {
        if (acts.some((act) => act.do === 'suspend')) return [[slug, 'suspended']];
        return acts.some((act) => act.do === 'decline') ? [[slug, 'declined']] : [];
      }),
    );
    expect(Object.fromEntries(ruled.map(({ slug }) => [slug, standings.get(slug)]))).toEqual(
      Object.fromEntries(
        ruled.map(({ slug, definition }) => [
          slug,
          ledTo.get(slug) ?? correlationStanding(definition).standing,
        ]),
      ),
    );
    expect(items.filter(({ standing }) => standing === 'approved').length).toBeGreaterThan(20);
  });

  test('says of each sheet that is not approved why it is not', async () => {
    const waiting = (await everyItem(auditor)).filter(({ standing }) => standing !== 'approved');
    for (const { slug } of waiting) {
      const { body } = await auditor.get(`/api/correlations/${slug}`).expect(200);
      expect((body as Sheet).standingNote, slug).toMatch(/\w{4}/);
    }
  });

  test('was brought in by people, and its journal holds', async () => {
    const { body } = await auditor.post('/api/journal/verification').expect(200);
    expect(body).toMatchObject({ ok: true });
    const sheet = (await engineer.get('/api/correlations/wetted-wall-gilliland-sherwood').expect(200))
      .body as Sheet;
    expect(sheet.history.map(({ standing }) => standing)).toEqual(['draft', 'in review', 'approved']);
    const people = [
      sheet.originator.id,
      ...sheet.reviews.map((one) => one.reviewer.id),
      sheet.approval?.by.id,
    ];
    expect(new Set(people).size).toBe(4);
    expect(sheet.checks.every(({ passed }) => passed)).toBe(true);
  });

  test('shows every standing, and a revision that holds from a later day on', async () => {
    const { facets } = await page(auditor);
    expect(facets.standing.map(({ value }) => value)).toEqual([...STANDINGS]);
    const successors = await Promise.all(
      ['superseded', 'withdrawn'].map(async (standing) => {
        const [item] = (await page(engineer, { standing })).items;
        const { body } = await engineer
          .get(`/api/correlations/${item?.slug ?? ''}/revisions/${item?.revision ?? 0}`)
          .expect(200);
        return (body as Sheet).successor;
      }),
    );
    expect(successors).toMatchObject([{ revision: 2 }, { revision: 2 }]);
    const pending = (await engineer.get('/api/correlations/stirred-tank-vant-riet-noncoalescing').expect(200))
      .body as Sheet;
    expect(pending).toMatchObject({ revision: 1, inForce: true });
    expect(pending.revisions.map(({ standing }) => standing)).toEqual(['approved', 'approved']);
  });

  test('has work on the desk of everybody', async () => {
    const waiting = async (name: string): Promise<string[]> => {
      const { sections } = (await (await demo(name)).get('/api/desk').expect(200)).body as Desk;
      return sections.filter(({ items }) => items.length > 0).map(({ key }) => key);
    };
    expect(await waiting('engineer')).toContain('drafts');
    expect(await waiting('engineer2')).toContain('drafts');
    for (const name of ['reviewer', 'reviewer2', 'reviewer3'])
      expect(await waiting(name)).toContain('to-review');
    expect([...(await waiting('reviewer')), ...(await waiting('reviewer3'))]).toContain('to-take');
    expect(await waiting('authority')).toEqual(
      expect.arrayContaining(['to-approve', 'reports', 'due', 'appointments', 'notices']),
    );
    expect(await waiting('admin')).toContain('appointments');
  });

  test('is not set up a second time', async () => {
    const before = rowCounts({ test: office });
    await office.app.get(SeedService).fill(true);
    expect(rowCounts({ test: office })).toEqual(before);
  });
});

describe('geometries', () => {
  test('count what the caller sees', async () => {
    const listed = async (who: Agent) =>
      ((await who.get('/api/geometries').expect(200)).body as GeometriesResponse).items;
    const seen = await listed(auditor);
    expect(seen).toHaveLength(files.geometries().length);
    const sum = (items: typeof seen, key: 'total' | 'approved') =>
      items.reduce((all, one) => all + one[key], 0);
    expect(sum(seen, 'total')).toBe(files.correlations().length);
    const approvedOnes = (await everyItem(auditor, { standing: 'approved' })).length;
    expect(sum(seen, 'approved')).toBe(approvedOnes);
    expect(sum(await listed(engineer), 'total')).toBeLessThan(sum(seen, 'total'));
  });
});

describe('the list', () => {
  test('comes in pages that leave nothing out and give nothing twice', async () => {
    const { total, items } = await page(auditor, { limit: 100 });
    const paged = await everyItem(auditor);
    expect(paged).toHaveLength(total);
    expect(new Set(paged.map(({ slug }) => slug)).size).toBe(total);
    expect(paged.slice(0, items.length)).toEqual(items);
    const found = await everyItem(auditor, { q: 'flow' });
    expect(new Set(found.map(({ slug }) => slug)).size).toBe((await page(auditor, { q: 'flow' })).total);
  });

  test('shows an engineer what is in use and what is their own', async () => {
    const items = await everyItem(engineer);
    const own = await engineer.get('/api/session').expect(200);
    const { id } = (own.body as { person: { id: string } }).person;
    for (const { slug } of items.filter(({ standing }) => UNAPPROVED.includes(standing))) {
      const { body } = await engineer.get(`/api/correlations/${slug}`).expect(200);
      expect((body as Sheet).originator.id).toBe(id);
    }
    const other = new Set((await everyItem(secondEngineer)).map(({ slug }) => slug));
    expect(items.some(({ slug }) => !other.has(slug))).toBe(true);
    expect((await page(reviewer)).total).toBe(files.correlations().length);
  });

  test('carries bounds for the strips', async () => {
    const { items } = await page(engineer, { q: 'gilliland' });
    expect(items[0]).toMatchObject({ slug: 'wetted-wall-gilliland-sherwood', geometryName: 'Wetted wall' });
    expect(items[0]?.bounds[0]).toMatchObject({
      symbol: 'Re',
      name: 'Reynolds number',
      unit: '1',
      stretches: [{ lo: { value: 2000 }, hi: { value: 35_000 } }],
    });
  });

  test('filters, and its facets count what a filter would find', async () => {
    const { facets } = await page(auditor, { q: 'turbulent' });
    for (const [filter, counts] of Object.entries(facets)) {
      for (const { value, count } of counts) {
        expect((await page(auditor, { q: 'turbulent', [filter]: value })).total, `${filter}=${value}`).toBe(
          count,
        );
      }
    }
    const gas = await everyItem(auditor, { phase: 'gas' });
    expect(new Set(gas.map(({ phase }) => phase))).not.toContain('liquid');
  });

  test.each(['Sherwood', 'gilliland sher', 'Benítez', 'benitez', 'schmidt number'])(
    'finds something for %j',
    async (q) => {
      expect((await page(auditor, { q })).total).toBeGreaterThan(0);
    },
  );

  test.each([
    'title:sphere',
    'sphere OR pipe',
    'NOT pipe',
    'NEAR(a b)',
    '"',
    '""',
    "'; DROP TABLE revision; --",
    'a*',
    '*',
    '^a',
    '(',
    ')',
    '{title authors}: x',
    '-pipe',
    'pipe AND',
    '\\',
    '%',
    '_',
    'a'.repeat(200),
    '☃',
    '   ',
  ])('takes %j as words', async (q) => {
    const before = rowCounts({ test: office });
    await page(auditor, { q });
    expect(rowCounts({ test: office })).toEqual(before);
  });

  test('an operator is no operator: a word that occurs nowhere finds nothing', async () => {
    expect((await page(auditor, { q: 'pipe OR xyzzyplugh' })).total).toBe(0);
  });

  test.each([
    ['limit', '0'],
    ['limit', '101'],
    ['limit', 'many'],
    ['standing', 'good'],
    ['phase', 'plasma'],
    ['geometry', 'Not A Slug'],
    ['cursor', 'abc'],
    ['cursor', Buffer.from('[1,2,3]').toString('base64url')],
    ['q', 'a'.repeat(201)],
    ['colour', 'red'],
  ])('refuses %s=%s at its field', async (field, value) => {
    const response = await engineer.get('/api/correlations').query({ [field]: value });
    expect(response.status).toBe(400);
    expect(problemOf(response).fields?.map((one) => one.field)).toEqual([field]);
  });

  test.each(['q=a&q=b', 'limit[]=1', 'q[__proto__]=1'])('refuses the query %s', async (query) => {
    expect((await engineer.get(`/api/correlations?${query}`)).status).toBe(400);
  });
});

describe('a sheet', () => {
  test('brings every property equation that it lists', async () => {
    const { body } = await engineer.get('/api/correlations/wetted-wall-gilliland-sherwood').expect(200);
    const { definition, equations } = body as Sheet;
    const listed = definition.quantities.flatMap((one) => one.equations ?? []);
    const brought = equations.map(({ slug }) => slug);
    const approved = (await engineer.get('/api/property-equations').expect(200))
      .body as PropertyEquationsResponse;
    const inUse = new Set(
      approved.items.filter(({ standing }) => standing === 'approved').map(({ slug }) => slug),
    );
    expect(brought).toEqual(expect.arrayContaining([...new Set(listed)].filter((slug) => inUse.has(slug))));
  });

  test.each(['no-such-sheet', '%00', 'a%20b', '..%2f..%2fetc', 'x'.repeat(300)])(
    'of the slug %s is not there',
    async (slug) => {
      const { status } = await engineer.get(`/api/correlations/${slug}`);
      expect([400, 404]).toContain(status);
    },
  );

  test.each([
    ['2', 404],
    ['0', 400],
    ['-1', 400],
    ['one', 400],
    ['1e9', 400],
  ])('has no revision %s', async (number, status) => {
    await engineer.get(`/api/correlations/wetted-wall-gilliland-sherwood/revisions/${number}`).expect(status);
  });
});

describe('evaluations of the library', () => {
  test('each approved sheet answers its first worked check as the engine does', async () => {
    const approved = (await everyItem(auditor, { standing: 'approved' })).map(({ slug }) => slug);
    const answered = new Map<string, string>();
    for (const { slug, definition } of files.correlations().filter((one) => approved.includes(one.slug))) {
      const request = firstSelfContained(definition);
      if (request === undefined) continue;
      const compiled = compileCorrelation(definition);
      const engine = compiled.ok ? evaluate(compiled.compiled, request, () => undefined) : undefined;
      const response = await engineer.post(`/api/correlations/${slug}/evaluations`).send(request);
      answered.set(slug, String(response.status));
      if (engine?.ok !== true) continue;
      if (engine.outcome.outcome === 'refused')
        expect(problemOf(response).findings).toEqual(engine.outcome.findings);
      else expect((response.body as EvaluationResponse).result, slug).toEqual(engine.outcome.result);
    }
    expect(answered.size).toBeGreaterThan(15);
    expect([...answered.values()].filter((status) => status === '200').length).toBeGreaterThan(10);
    expect([...answered.values()].filter((status) => status.startsWith('5'))).toEqual([]);
  });

  test('fill air properties in and say from where', async () => {
    const { body } = await engineer
      .post('/api/correlations/wetted-wall-gilliland-sherwood/evaluations')
      .send({
        inputs: {
          u: { value: 6, unit: 'm/s' },
          d: { value: 25.4, unit: 'mm' },
          D: { value: 0.25, unit: 'cm^2/s' },
          T: { value: 20, unit: 'degC' },
          P: { value: 1, unit: 'atm' },
          p_BM: { value: 100, unit: 'kPa' },
        },
        equations: equationsFor(await engineer.get('/api/correlations/wetted-wall-gilliland-sherwood')),
      })
      .expect(200);
    const answer = body as EvaluationResponse;
    expect(answer.provenance.equations).toHaveLength(2);
    // Air at 20 °C and 1 atm: about 1.204 kg/m^3 and 1.82e-5 Pa s, as in any handbook table.
    const [rho, mu] = answer.equations;
    expect(rho?.value).toBeCloseTo(1.204, 2);
    expect((mu?.value ?? 0) * 1e5).toBeCloseTo(1.82, 1);
  });

  test('candidates of a wetted wall are ranked for a duty', async () => {
    const { body } = await engineer
      .post('/api/candidates')
      .send({ geometry: 'wetted-wall', inputs: { 'gas-density': { value: 1.2 } } })
      .expect(200);
    expect((body as CandidatesResponse).items[0]).toMatchObject({ outcome: 'incomplete', inUse: true });
  });
});

/** A worked check that needs no property equation. */
function firstSelfContained({ checks }: CorrelationDefinition) {
  const check = checks.find(({ equations }) => equations === undefined);
  return check && { inputs: check.inputs, ...(check.rows === undefined ? {} : { rows: check.rows }) };
}

/** The first equation that the sheet lists for density and for viscosity. */
function equationsFor({ body }: { body: unknown }): Record<string, string> {
  const { quantities } = (body as Sheet).definition;
  return Object.fromEntries(
    quantities.flatMap(({ symbol, equations: [first] = [] }) =>
      first !== undefined && ['rho', 'mu'].includes(symbol) ? [[symbol, first]] : [],
    ),
  );
}
