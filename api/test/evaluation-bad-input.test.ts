import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest';
import { approved, draft, openOffice, rowCounts, type TestOffice } from './support/office.js';
import { problemOf } from './support/problem-of.js';
import { TUBE_INPUTS } from './support/sheets.js';

const PATH = '/api/correlations/tube-law/evaluations';

let office: TestOffice;
let before: Record<string, number>;

beforeAll(async () => {
  office = await openOffice();
  await approved(office, draft(office, 'tube-law'));
  before = rowCounts(office);
});

afterEach(() => expect(rowCounts(office)).toEqual(before));
afterAll(() => office.close());

const without = (symbol: keyof typeof TUBE_INPUTS): object =>
  Object.fromEntries(Object.entries(TUBE_INPUTS).filter(([key]) => key !== symbol));

describe('inputs that cannot be used', () => {
  test.each<[string, object, number, string, string]>([
    ['no inputs', {}, 400, 'missing', 'inputs'],
    ['inputs that are a list', { inputs: [1] }, 400, 'malformed', 'inputs'],
    ['inputs that are null', { inputs: null }, 400, 'malformed', 'inputs'],
    ['an input that is missing', { inputs: without('mu') }, 400, 'missing', 'inputs.mu'],
    [
      'a symbol that is not on the sheet',
      { inputs: { ...TUBE_INPUTS, Q: { value: 1 } } },
      400,
      'unknown-symbol',
      'inputs.Q',
    ],
    [
      'a symbol that none can be',
      { inputs: { ...TUBE_INPUTS, 'a b': { value: 1 } } },
      400,
      'unknown-symbol',
      'inputs.a b',
    ],
    [
      'a symbol from the prototype',
      { inputs: { ...TUBE_INPUTS, toString: { value: 1 } } },
      400,
      'unknown-symbol',
      'inputs.toString',
    ],
    [
      'a group with all that it is made of',
      { inputs: { ...TUBE_INPUTS, Re: { value: 400 } } },
      400,
      'over-determined',
      'inputs.Re',
    ],
    [
      'a number as text',
      { inputs: { ...TUBE_INPUTS, u: { value: '2' } } },
      400,
      'malformed',
      'inputs.u.value',
    ],
    [
      'a value of null',
      { inputs: { ...TUBE_INPUTS, u: { value: null } } },
      400,
      'malformed',
      'inputs.u.value',
    ],
    ['a bare number', { inputs: { ...TUBE_INPUTS, u: 2 } }, 400, 'malformed', 'inputs.u'],
    [
      'a field too many',
      { inputs: { ...TUBE_INPUTS, u: { value: 2, per: 'h' } } },
      400,
      'malformed',
      'inputs.u.per',
    ],
    [
      'a unit of another dimension',
      { inputs: { ...TUBE_INPUTS, u: { value: 2, unit: 'kg' } } },
      400,
      'unit',
      'inputs.u',
    ],
    [
      'a unit that is none',
      { inputs: { ...TUBE_INPUTS, u: { value: 2, unit: 'furlong/moon' } } },
      400,
      'unit',
      'inputs.u',
    ],
    [
      'a unit that is too long',
      { inputs: { ...TUBE_INPUTS, u: { value: 2, unit: 'm'.repeat(41) } } },
      400,
      'malformed',
      'inputs.u.unit',
    ],
    [
      'an empty unit',
      { inputs: { ...TUBE_INPUTS, u: { value: 2, unit: '' } } },
      400,
      'malformed',
      'inputs.u.unit',
    ],
    [
      'a negative value',
      { inputs: { ...TUBE_INPUTS, u: { value: -2, unit: 'm/s' } } },
      422,
      'domain',
      'inputs.u',
    ],
    ['zero', { inputs: { ...TUBE_INPUTS, d: { value: 0, unit: 'm' } } }, 422, 'domain', 'inputs.d'],
    [
      'an unknown row',
      { inputs: TUBE_INPUTS, rows: { packing: 'ring' } },
      400,
      'unknown-row',
      'rows.packing',
    ],
    [
      'an unknown equation',
      { inputs: without('rho'), equations: { rho: 'no-such' } },
      400,
      'unknown-equation',
      'equations.rho',
    ],
    [
      'a value and an equation for it',
      { inputs: TUBE_INPUTS, equations: { rho: 'test-gas-density' } },
      400,
      'over-determined',
      'equations.rho',
    ],
    [
      'an equation name that is none',
      { inputs: TUBE_INPUTS, equations: { rho: '../../etc' } },
      400,
      'malformed',
      'equations.rho',
    ],
    ['a basis that is none', { inputs: TUBE_INPUTS, bases: ['k_z'] }, 400, 'malformed', 'bases'],
    [
      'a deviation of nothing',
      { inputs: TUBE_INPUTS, deviations: [{ symbol: 'Sc', reason: 'x'.repeat(30) }] },
      400,
      'malformed',
      'deviations[0].symbol',
    ],
    [
      'two deviations of one symbol',
      {
        inputs: { ...TUBE_INPUTS, u: { value: 4 } },
        deviations: [1, 2].map(() => ({ symbol: 'Re', reason: 'x'.repeat(30) })),
      },
      400,
      'malformed',
      'deviations[1].symbol',
    ],
    [
      'deviations that are no list',
      { inputs: TUBE_INPUTS, deviations: { Re: 'because' } },
      400,
      'malformed',
      'deviations',
    ],
    ['a revision that is no number', { inputs: TUBE_INPUTS, revision: 'two' }, 400, 'malformed', 'revision'],
    ['a field that there is not', { inputs: TUBE_INPUTS, safe: true }, 400, 'malformed', 'safe'],
    [
      'a driving force without a side',
      { inputs: TUBE_INPUTS, drivingForce: { kind: 'concentration', bulk: { value: 1 } } },
      400,
      'missing',
      'drivingForce.interface',
    ],
    [
      'more entries than any sheet has symbols',
      { inputs: Object.fromEntries(Array.from({ length: 61 }, (_, i) => [`a${i}`, { value: 1 }])) },
      400,
      'malformed',
      'inputs',
    ],
  ])('%s', async (_name, body, status, code, field) => {
    const response = await office.engineer.agent.post(PATH).send(body);
    const problem = problemOf(response);
    expect({ status: response.status, type: problem.type }).toEqual({
      status,
      type: `urn:merestone:problem:${code}`,
    });
    expect(problem.fields?.map((one) => one.field)).toContain(field);
    expect(problem.fields?.every(({ message }) => message.length > 5)).toBe(true);
  });
});

describe('texts that are no usable JSON', () => {
  const valid = JSON.stringify({ inputs: TUBE_INPUTS });

  test.each<[string, string, number, string | undefined]>([
    ['NaN', valid.replace('"value":2,', '"value":NaN,'), 400, undefined],
    ['Infinity', valid.replace('"value":2,', '"value":Infinity,'), 400, undefined],
    ['1e400', valid.replace('"value":2,', '"value":1e400,'), 400, 'inputs.u.value'],
    ['cut short', valid.slice(0, -3), 400, undefined],
    ['a symbol given twice', valid.replace('"u":', '"u":{"value":1},"u":'), 400, 'inputs.u'],
    [
      '__proto__ among the inputs',
      valid.replace('"u":', '"__proto__":{"value":1},"u":'),
      400,
      'inputs.__proto__',
    ],
    ['__proto__ on top', valid.replace('{"inputs"', '{"__proto__":{"a":1},"inputs"'), 400, '__proto__'],
    ['a list', '[]', 400, undefined],
    ['10 MB', `{"inputs":{"u":{"value":1,"unit":"${'m'.repeat(10_000_000)}"}}}`, 413, undefined],
  ])('%s', async (_name, text, status, field) => {
    const response = await office.engineer.agent
      .post(PATH)
      .set('Content-Type', 'application/json')
      .send(text);
    expect(response.status).toBe(status);
    const problem = problemOf(response);
    if (field !== undefined) expect(problem.fields?.map((one) => one.field)).toContain(field);
  });
});

describe('addresses that lead nowhere', () => {
  test.each([
    ['an unknown slug', '/api/correlations/no-such-sheet/evaluations', {}, 404],
    ['a slug that none can be', '/api/correlations/%22%3B--/evaluations', {}, 404],
    ['an unknown revision', PATH, { revision: 7 }, 404],
    ['revision zero', PATH, { revision: 0 }, 400],
  ])('%s', async (_name, path, more, status) => {
    const response = await office.engineer.agent.post(path).send({ inputs: TUBE_INPUTS, ...more });
    expect(response.status).toBe(status);
    expect(problemOf(response).detail).not.toBe('');
  });
});
