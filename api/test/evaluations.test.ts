import { ENGINE_VERSION, evaluate, compileCorrelation, compilePropertyEquation } from '@merestone/engine';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { EvaluationResponse } from '../src/evaluations/dto/evaluation-response.dto.js';
import type { KeptEvaluation } from '../src/evaluations/dto/kept-evaluation.dto.js';
import { approved, draft, openOffice, rowCounts, submitted, type TestOffice } from './support/office.js';
import { codeOf, problemOf } from './support/problem-of.js';
import { gasDensity, TUBE_INPUTS, tubeSheet } from './support/sheets.js';

const REASON = 'The rig was run up to Re 15 000 with the same result.';

let office: TestOffice;

beforeAll(async () => {
  office = await openOffice();
  await approved(office, draft(office, 'tube-law'));
  // Holds where the first does not: from Re 10 000 on.
  await approved(
    office,
    draft(office, 'tube-law-fast', {
      title: 'Tube, fast',
      bounds: [{ on: 'Re', stretches: [{ lo: { value: 10_000, nature: 'data' } }], basis: 'stated' }],
    }),
  );
  draft(office, 'tube-law-draft');
});

afterAll(() => office.close());

function post(slug: string, body: object, who = office.engineer) {
  return who.agent.post(`/api/correlations/${slug}/evaluations`).send(body);
}

describe('an evaluation', () => {
  test('says what the engine says, to the last digit', async () => {
    const { body } = await post('tube-law', { inputs: TUBE_INPUTS }).expect(200);
    const compiled = compileCorrelation(tubeSheet());
    const engine = compiled.ok && evaluate(compiled.compiled, { inputs: TUBE_INPUTS }, () => undefined);
    const answer = body as EvaluationResponse;
    expect(engine).toMatchObject({ ok: true, outcome: { outcome: 'within', result: answer.result } });
    expect(engine).toMatchObject({ outcome: { coefficient: answer.coefficient, steps: answer.steps } });
    // By hand: Re = 1.2*2*0.05/1.8e-5 = 6666.67; Sh = 2*sqrt(Re) = 163.30; k_c = Sh*2.4e-5/0.05 = 0.07838 m/s.
    expect(answer.groups.Re).toBeCloseTo(6666.667, 3);
    expect(answer.result.value).toBeCloseTo(163.299, 3);
    expect(answer.coefficient?.value).toBeCloseTo(0.078384, 6);
  });

  test('carries standing, provenance and caution', async () => {
    const { body } = await post('tube-law', { inputs: TUBE_INPUTS }).expect(200);
    const sheet = await office.engineer.agent.get('/api/correlations/tube-law').expect(200);
    const { hash } = sheet.body as { hash: string };
    expect(body).toMatchObject({
      slug: 'tube-law',
      revision: 1,
      standing: 'approved',
      outcome: 'within',
      provenance: { slug: 'tube-law', revision: 1, hash, engine: ENGINE_VERSION, equations: [], rows: {} },
    });
    expect((body as EvaluationResponse).caution).toContain('local codes');
  });

  test('takes a property from an approved equation and says which revision of it', async () => {
    const { rho: _, ...rest } = TUBE_INPUTS;
    const inputs = { ...rest, T: { value: 23, unit: 'degC' }, P: { value: 1, unit: 'atm' } };
    const { body } = await post('tube-law', { inputs, equations: { rho: 'test-gas-density' } }).expect(200);
    const listed = await office.engineer.agent.get('/api/property-equations/test-gas-density').expect(200);
    const answer = body as EvaluationResponse;
    expect(answer.provenance.equations).toEqual([
      { key: 'test-gas-density', revision: 1, hash: (listed.body as { hash: string }).hash },
    ]);
    // P M/(R T) = 101325 * 0.029 / (8.314462618 * 296.15)
    expect(answer.equations[0]?.value).toBeCloseTo((101_325 * 0.029) / (8.314462618 * 296.15), 9);
    expect(compilePropertyEquation('test-gas-density', gasDensity()).ok).toBe(true);
  });

  test('is kept whole, and not journalled', async () => {
    const before = rowCounts(office);
    const { body } = await post('tube-law', { inputs: TUBE_INPUTS }).expect(200);
    const after = rowCounts(office);
    expect(after).toEqual({ ...before, evaluation: (before.evaluation ?? 0) + 1 });
    const answer = body as EvaluationResponse;
    const { body: kept } = await office.engineer.agent.get(`/api/evaluations/${answer.id}`).expect(200);
    expect(kept).toEqual({
      id: answer.id,
      at: answer.at,
      person: { id: office.engineer.actor.id, name: office.engineer.actor.name },
      request: { inputs: TUBE_INPUTS },
      evaluation: answer,
    });
  });

  test('gives the flux of a driving force', async () => {
    const drivingForce = {
      kind: 'concentration',
      interface: { value: 1, unit: 'mol/m^3' },
      bulk: { value: 0.25, unit: 'mol/m^3' },
    };
    const { body } = await post('tube-law', { inputs: TUBE_INPUTS, drivingForce }).expect(200);
    const answer = body as EvaluationResponse;
    expect(answer.flux?.value).toBeCloseTo((answer.coefficient?.value ?? 0) * 0.75, 12);
  });
});

describe('outside a bound', () => {
  const inputs = { ...TUBE_INPUTS, u: { value: 4, unit: 'm/s' } };

  test('there is a refusal with its finding, no number, and where to turn', async () => {
    const before = rowCounts(office);
    const response = await post('tube-law', { inputs }).expect(422);
    const problem = problemOf(response);
    expect(problem.type).toBe('urn:merestone:problem:out-of-bounds');
    expect(problem.findings).toMatchObject([
      { symbol: 'Re', kind: 'outside', hi: 10_000, nature: 'data', deviable: true },
    ]);
    // 13 333 / 10 000
    expect(problem.findings?.[0]?.ratio).toBeCloseTo(4 / 3, 6);
    expect(problem.alternatives).toEqual([{ slug: 'tube-law-fast', title: 'Tube, fast', geometry: 'tube' }]);
    expect(response.text).not.toContain('"result"');
    expect(rowCounts(office)).toEqual(before);
  });

  test('past the reach there is none even with a reason', async () => {
    const far = { ...TUBE_INPUTS, u: { value: 40, unit: 'm/s' } };
    const response = await post('tube-law', { inputs: far, deviations: [{ symbol: 'Re', reason: REASON }] });
    expect(response.status).toBe(422);
    expect(codeOf(response)).toBe('past-reach');
  });

  test('a reasoned deviation gives a marked number, kept and journalled in one', async () => {
    const before = rowCounts(office);
    const { body } = await post('tube-law', {
      inputs,
      deviations: [{ symbol: 'Re', reason: REASON }],
    }).expect(200);
    const answer = body as Extract<EvaluationResponse, { outcome: 'deviating' }>;
    expect(answer).toMatchObject({
      outcome: 'deviating',
      mark: 'provisional, not for design',
      deviations: [{ symbol: 'Re', reason: REASON }],
    });
    const after = rowCounts(office);
    expect(after.evaluation).toBe((before.evaluation ?? 0) + 1);
    expect(after.journal).toBe((before.journal ?? 0) + 1);
    const { body: journal } = await office.auditor.agent.get('/api/journal?limit=1').expect(200);
    expect((journal as { items: object[] }).items[0]).toMatchObject({
      act: 'evaluation.deviated',
      subject: 'correlations/tube-law/revisions/1',
      actor: { id: office.engineer.actor.id },
      detail: { evaluation: answer.id, deviations: [{ symbol: 'Re', reason: REASON }] },
    });
  });

  test('a reason that is too short is refused at its field', async () => {
    const response = await post('tube-law', { inputs, deviations: [{ symbol: 'Re', reason: 'looks fine' }] });
    expect(response.status).toBe(400);
    expect(problemOf(response).fields).toMatchObject([{ field: 'deviations[0].reason' }]);
  });
});

describe('who may evaluate', () => {
  test.each([
    ['auditor', 403],
    ['administrator', 403],
    ['reviewer', 200],
    ['authority', 200],
    ['otherEngineer', 200],
  ] as const)('an approved sheet: %s gets %i', async (who, status) => {
    await post('tube-law', { inputs: TUBE_INPUTS }, office[who]).expect(status);
  });

  test('a draft serves its originator, reviewers and authorities, and says that it is one', async () => {
    for (const who of [office.engineer, office.reviewer, office.authority]) {
      const { body } = await post('tube-law-draft', { inputs: TUBE_INPUTS }, who).expect(200);
      expect(body).toMatchObject({ standing: 'draft' });
    }
    const other = await post('tube-law-draft', { inputs: TUBE_INPUTS }, office.otherEngineer).expect(409);
    expect(codeOf(other)).toBe('not-in-use');
    await post('tube-law-draft', { inputs: TUBE_INPUTS, revision: 1 }, office.otherEngineer).expect(404);
  });

  test.each(['suspension', 'withdrawal'])('after %s nobody gets a number', async (act) => {
    const slug = `tube-law-after-${act}`;
    await approved(office, draft(office, slug));
    const reason = 'A slip was found in the source.';
    await office.authority.agent
      .post(`/api/correlations/${slug}/revisions/1/${act}`)
      .send(act === 'withdrawal' ? { reason, class: 'error-in-source' } : { reason })
      .expect(201);
    const response = await post(slug, { inputs: TUBE_INPUTS }).expect(409);
    expect(codeOf(response)).toBe('not-in-use');
  });

  test('a declined revision is not in use', async () => {
    const key = draft(office, 'tube-law-declined');
    submitted(office, key, office.engineer.actor);
    await office.reviewer.agent
      .post('/api/correlations/tube-law-declined/revisions/1/reviews')
      .send({ verdict: 'decline', checklist: allUnchecked(), note: 'The source says otherwise.' })
      .expect(201);
    const response = await post('tube-law-declined', { inputs: TUBE_INPUTS }).expect(409);
    expect(codeOf(response)).toBe('not-in-use');
  });
});

describe('a kept evaluation', () => {
  test('is read by whoever made it, by authorities and auditors, and by nobody else', async () => {
    const { body } = await post('tube-law', { inputs: TUBE_INPUTS }).expect(200);
    const path = `/api/evaluations/${(body as EvaluationResponse).id}`;
    for (const who of [office.engineer, office.authority, office.auditor]) {
      const { body: kept } = await who.agent.get(path).expect(200);
      expect((kept as KeptEvaluation).person.id).toBe(office.engineer.actor.id);
    }
    for (const who of [office.otherEngineer, office.reviewer, office.administrator]) {
      await who.agent.get(path).expect(404);
    }
    await office.auditor.agent.get('/api/evaluations/none').expect(404);
  });
});

function allUnchecked(): Record<string, boolean> {
  return {
    expression: false,
    definitions: false,
    ranges: false,
    basis: false,
    recalculated: false,
    duplicates: false,
  };
}
