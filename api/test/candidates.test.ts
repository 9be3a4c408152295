import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { CandidatesResponse } from '../src/candidates/dto/candidates-response.dto.js';
import { approved, draft, openOffice, rowCounts, type TestOffice } from './support/office.js';
import { problemOf } from './support/problem-of.js';

const DUTY = {
  'mean-velocity-in-tube': { value: 2, unit: 'm/s' },
  'tube-inside-diameter': { value: 5, unit: 'cm' },
  'fluid-density': { value: 1.2, unit: 'kg/m^3' },
  'gas-viscosity': { value: 1.8e-5, unit: 'Pa s' },
  'gas-diffusivity': { value: 2.4e-5, unit: 'm^2/s' },
};

let office: TestOffice;

beforeAll(async () => {
  office = await openOffice();
  const bounds = (lo: number, hi: number) => [
    {
      on: 'Re',
      stretches: [{ lo: { value: lo, nature: 'data' as const }, hi: { value: hi, nature: 'data' as const } }],
      basis: 'stated' as const,
    },
  ];
  await approved(office, draft(office, 'holds', { bounds: bounds(100, 10_000) }));
  await approved(office, draft(office, 'near', { bounds: bounds(100, 6700) }));
  await approved(
    office,
    draft(office, 'unchecked', { bounds: [{ on: 'Re', stretches: [], basis: 'none' }] }),
  );
  await approved(office, draft(office, 'out-a-little', { bounds: bounds(100, 5000) }));
  await approved(office, draft(office, 'out-far', { bounds: bounds(1, 100) }));
  await approved(office, draft(office, 'withdrawn-one'));
  await office.authority.agent
    .post('/api/correlations/withdrawn-one/revisions/1/withdrawal')
    .send({ reason: 'The source retracted it.', class: 'error-in-source' })
    .expect(201);
  await approved(
    office,
    draft(office, 'needs-more', {
      phase: 'liquid',
      groups: [{ symbol: 'Re', name: 'Reynolds number', expression: 'rho*u*d*(d/L)/mu' }],
      quantities: [
        { symbol: 'u', is: 'mean-velocity-in-tube', unit: 'm/s' },
        { symbol: 'd', is: 'tube-inside-diameter', unit: 'm' },
        { symbol: 'L', is: 'tube-length', unit: 'm' },
        { symbol: 'rho', is: 'fluid-density', unit: 'kg/m^3' },
        { symbol: 'mu', is: 'fluid-viscosity', unit: 'Pa s' },
        { symbol: 'D', is: 'fluid-diffusivity', unit: 'm^2/s' },
      ],
    }),
  );
  draft(office, 'draft-one');
});

afterAll(() => office.close());

const find = (body: object, who = office.engineer) => who.agent.post('/api/candidates').send(body);

describe('candidates for a duty', () => {
  test('refuses what cannot be asked, at its field', async () => {
    const before = rowCounts(office);
    for (const [body, status, field] of [
      [{ geometry: 'nowhere', inputs: DUTY }, 400, 'geometry'],
      [{ geometry: 'tube' }, 400, 'inputs'],
      [{ geometry: 'tube', inputs: { 'magic-dust': { value: 1 } } }, 400, 'inputs.magic-dust'],
      [{ geometry: 'tube', inputs: { constructor: { value: 1 } } }, 400, 'inputs.constructor'],
      [
        { geometry: 'tube', inputs: { 'tube-length': { value: 1, unit: 'kg' } } },
        400,
        'inputs.tube-length.unit',
      ],
      [{ geometry: 'tube', inputs: { 'tube-length': { value: -1 } } }, 422, 'inputs.tube-length'],
      [{ geometry: 'tube', phase: 'plasma', inputs: DUTY }, 400, 'phase'],
    ] as const) {
      const response = await find(body);
      expect(response.status).toBe(status);
      expect(problemOf(response).fields?.map((one) => one.field)).toContain(field);
    }
    expect(rowCounts(office)).toEqual(before);
  });

  test('are ranked: within, near, unchecked, refused by how far, incomplete', async () => {
    const { body } = await find({ geometry: 'tube', inputs: DUTY }, office.otherEngineer).expect(200);
    const { items } = body as CandidatesResponse;
    expect(items.map(({ slug, outcome, inUse }) => [slug, outcome, inUse])).toEqual([
      ['holds', 'within', true],
      ['near', 'within', true],
      ['withdrawn-one', 'within', false],
      ['unchecked', 'unchecked', true],
      ['out-a-little', 'refused', true],
      ['out-far', 'refused', true],
      ['needs-more', 'incomplete', true],
    ]);
    // Sh = 2*sqrt(1.2*2*0.05/1.8e-5)
    expect(items[0]?.result?.value).toBeCloseTo(163.299, 3);
    expect(items[4]).toMatchObject({ result: null, coefficient: null });
    expect(items[4]?.farthest).toBeCloseTo(6666.667 / 5000, 4);
    expect(items[6]?.missing).toEqual(['tube-length']);
  });

  test('are those of the phase', async () => {
    const { body } = await find({ geometry: 'tube', phase: 'liquid', inputs: DUTY }).expect(200);
    expect((body as CandidatesResponse).items.map(({ slug }) => slug)).toEqual(['needs-more']);
  });

  test('include a draft for its originator, marked with its standing', async () => {
    const { body } = await find({ geometry: 'tube', inputs: DUTY }).expect(200);
    const found = (body as CandidatesResponse).items.find(({ slug }) => slug === 'draft-one');
    expect(found).toMatchObject({ standing: 'draft', inUse: false, outcome: 'within' });
  });

  test('are none where nothing was measured', async () => {
    const { body } = await find({ geometry: 'ball', inputs: DUTY }).expect(200);
    expect((body as CandidatesResponse).items).toEqual([]);
  });
});
