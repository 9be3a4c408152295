import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { Parser } from 'expr-eval';
import { afterEach, describe, expect, test, vi } from 'vitest';
import { evaluate } from '../evaluation/evaluate.js';
import type { InputValue } from '../evaluation/outcome.js';
import { compileCorrelation } from '../sheet/compile-sheet.js';
import { aRequest, aSheet, compiled, GAS_PART, LIBRARY } from '../testing/a-sheet.js';
import { parse } from './parse.js';

/** Texts in the style of the published attacks (from memory of the two advisories of 2025). */
const ATTACKS = [
  'exec("id")',
  'f(1)',
  'sqrt.constructor("return process")()',
  'constructor.constructor("return process")()',
  'toString.constructor("return 1")()',
  '(f(x) = x)(exec)',
  'f = exec; f(1)',
  '__proto__.polluted = 1',
  'constructor.prototype.polluted = 1',
  '__proto__',
  'a["__proto__"]["polluted"] = 1',
  '__defineGetter__(1, 2)',
  'map(exec, [1])',
  'fold(exec, 0, [1])',
  'random()',
];

/** The ways into expr-eval's evaluator and code generator. */
function foreignEntrances() {
  const expression: unknown = Object.getPrototypeOf(new Parser().parse('1'));
  const open = expression as Record<'evaluate' | 'toJSFunction' | 'simplify' | 'substitute', () => void>;
  return [
    vi.spyOn(open, 'evaluate'),
    vi.spyOn(open, 'toJSFunction'),
    vi.spyOn(open, 'simplify'),
    vi.spyOn(open, 'substitute'),
    vi.spyOn(Parser.prototype, 'evaluate'),
    vi.spyOn(Parser, 'evaluate'),
  ];
}

afterEach(() => {
  vi.restoreAllMocks();
});

function sheetWith(expression: string) {
  return aSheet({ groups: [...aSheet().groups.slice(1), { symbol: 'Re', name: 'Reynolds', expression }] });
}

describe('CVE-2025-12735: functions in the values handed to the evaluator are called', () => {
  test.each(ATTACKS)('%s is no expression of a sheet, and reaches no evaluator', (text) => {
    const entrances = foreignEntrances();
    expect(parse(text).ok).toBe(false);
    const result = compileCorrelation(sheetWith(text));
    expect(result.ok).toBe(false);
    if (!result.ok)
      expect(result.problems).toContainEqual(
        expect.objectContaining({ code: 'expression', field: 'groups[1].expression' }),
      );
    for (const entrance of entrances) expect(entrance).not.toHaveBeenCalled();
  });

  test('a function given as a value is refused at its field and not called', () => {
    const entrances = foreignEntrances();
    const called = vi.fn(() => 1);
    for (const hostile of [called, { valueOf: called }, { toString: called }, [called]]) {
      const input = { value: hostile } as unknown as InputValue;
      const evaluation = evaluate(compiled(aSheet()), aRequest({ u: input }), LIBRARY);
      expect(evaluation.ok).toBe(false);
      if (!evaluation.ok)
        expect(evaluation.problems).toEqual([
          expect.objectContaining({ code: 'malformed', field: 'inputs.u' }),
        ]);
    }
    expect(called).not.toHaveBeenCalled();
    for (const entrance of entrances) expect(entrance).not.toHaveBeenCalled();
  });

  test('a whole evaluation uses our own closures only', () => {
    const entrances = foreignEntrances();
    const evaluation = evaluate(compiled(aSheet()), aRequest(), LIBRARY);
    expect(evaluation).toMatchObject({ ok: true, outcome: { outcome: 'within' } });
    for (const entrance of entrances) expect(entrance).not.toHaveBeenCalled();
  });

  test('expr-eval is imported in one place, for parsing', () => {
    const root = fileURLToPath(new URL('..', import.meta.url));
    const sources = readdirSync(root, { recursive: true, encoding: 'utf8' }).filter(
      (file) => file.endsWith('.ts') && !file.endsWith('.test.ts'),
    );
    const importing = sources.filter((file) => readFileSync(root + file, 'utf8').includes("'expr-eval'"));
    expect(importing.map((file) => file.replaceAll('\\', '/'))).toEqual(['expression/tokens-of.ts']);
    const text = readFileSync(`${root}expression/tokens-of.ts`, 'utf8');
    expect(text).not.toMatch(/\.(evaluate|toJSFunction|simplify|substitute)\b/);
    for (const file of sources)
      expect(readFileSync(root + file, 'utf8'), file).not.toMatch(/\beval\(|new Function|toJSFunction/);
  });
});

describe('CVE-2025-13204: the prototype of all objects is polluted', () => {
  const prototypeBefore = Reflect.ownKeys(Object.prototype);

  test('hostile sheets and hostile requests leave Object.prototype as it was', () => {
    for (const text of ATTACKS) {
      compileCorrelation(sheetWith(text));
      compileCorrelation(
        aSheet({ parts: [{ ...GAS_PART, result: { ...GAS_PART.result, expression: text } }] }),
      );
    }
    const polluting: unknown = JSON.parse(
      '{"__proto__": {"value": 1}, "constructor": {"value": 1}, "toString.T": {"value": 1}, "rho.__proto__": {"value": 1}}',
    );
    const evaluation = evaluate(
      compiled(aSheet()),
      aRequest(polluting as Record<string, InputValue>, {
        rows: JSON.parse('{"__proto__": "x", "constructor": "name"}') as Record<string, string>,
        equations: JSON.parse('{"__proto__": "x", "constructor": "name"}') as Record<string, string>,
        deviations: [{ symbol: '__proto__', reason: 'polluted is not a property of it' }],
      }),
      LIBRARY,
    );
    expect(evaluation.ok).toBe(false);
    expect(Reflect.ownKeys(Object.prototype)).toEqual(prototypeBefore);
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
    expect(({} as Record<string, unknown>)['value']).toBeUndefined();
  });

  test.each(['constructor', 'toString', 'valueOf', 'hasOwnProperty'])(
    'a symbol called %s is a number like any other',
    (symbol) => {
      const definition = aSheet({
        quantities: aSheet().quantities.map((q) => (q.symbol === 'u' ? { ...q, symbol } : q)),
        groups: aSheet().groups.map((g) => ({
          ...g,
          expression: g.expression.replace('*u*', `*${symbol}*`),
        })),
      });
      const evaluation = evaluate(
        compiled(definition),
        aRequest({ u: null, [symbol]: { value: 8.72 } }),
        LIBRARY,
      );
      expect(evaluation).toMatchObject({ ok: true, outcome: { outcome: 'within' } });
      const left = evaluate(compiled(definition), aRequest({ u: null }), LIBRARY);
      expect(left).toMatchObject({ ok: false, problems: [{ code: 'missing', field: `inputs.${symbol}` }] });
    },
  );
});
