import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, test } from 'vitest';
import { compileTree, constantOf } from './compile-tree.js';
import { MAX_LENGTH, parse } from './parse.js';
import type { Tree } from './tree.js';
import { bracketedText, randomChain, randomPoint, randomTree, SYMBOLS } from '../testing/random-tree.js';

// An evaluator by other people (mathjs): real numbers only, its natural logarithm under our name. Its power takes real
// odd roots of negative numbers, and its min and max round; both are set aside, since neither is what double arithmetic does.
const math = create(all ?? {}, { predictable: true, relTol: 1e-15, absTol: 1e-300 });
math.import({ ln: (value: number) => Math.log(value) }, {});
math.import({ pow: (base: number, exponent: number) => Math.pow(base, exponent) }, { override: true });

type Point = Record<(typeof SYMBOLS)[number], number>;

function treeOf(text: string): Tree {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.fault.reason}`);
  return parsed.tree;
}

function slotsOf(point: Point): Float64Array {
  return Float64Array.from(SYMBOLS, (symbol) => point[symbol]);
}

function ours(text: string, point: Point): number {
  const run = compileTree(treeOf(text), (name) => ({ slot: SYMBOLS.findIndex((symbol) => symbol === name) }));
  return run(slotsOf(point));
}

function theirs(text: string, point: Point): number {
  const value: unknown = math.evaluate(text, { ...point });
  return typeof value === 'number' ? value : Number.NaN;
}

/** Equal within 1e-12 relative, or both without a finite value. */
function agree(a: number, b: number): boolean {
  if (!Number.isFinite(a) || !Number.isFinite(b)) return Number.isFinite(a) === Number.isFinite(b);
  return Math.abs(a - b) <= 1e-12 * Math.max(Math.abs(a), Math.abs(b));
}

const ORIGIN: Point = { x: 2, y: 3, z: 5, u_1: 7, rho: 11 };

describe('values against an independent evaluator (mathjs)', () => {
  test('random trees over all operators and functions, at random points', () => {
    let finite = 0;
    fc.assert(
      fc.property(randomTree, randomPoint, (tree, point) => {
        const text = bracketedText(tree);
        fc.pre(text.length <= MAX_LENGTH);
        const [found, expected] = [ours(text, point), theirs(text, point)];
        if (Number.isFinite(expected)) finite += 1;
        if (!agree(found, expected))
          throw new Error(`${text} at ${JSON.stringify(point)}: ${found}, not ${expected}`);
      }),
      { numRuns: 5000, seed: 3 },
    );
    expect(finite).toBeGreaterThan(2500);
  });

  test('random chains without brackets: precedence and associativity', () => {
    let finite = 0;
    fc.assert(
      fc.property(randomChain, randomPoint, (text, point) => {
        const [found, expected] = [ours(text, point), theirs(text, point)];
        if (Number.isFinite(expected)) finite += 1;
        if (!agree(found, expected))
          throw new Error(`${text} at ${JSON.stringify(point)}: ${found}, not ${expected}`);
      }),
      { numRuns: 5000, seed: 4 },
    );
    expect(finite).toBeGreaterThan(2500);
  });

  test.each([
    ['-2^2', -4],
    ['2^3^2', 512],
    ['(2^3)^2', 64],
    ['2^-1', 0.5],
    ['-x^2', -4],
    ['(-x)^2', 4],
    ['12/3/2', 2],
    ['12/(3/2)', 8],
    ['7-3-2', 2],
    ['7-(3-2)', 6],
    ['2*-x', -4],
    ['x--y', 5],
    ['8^(1/3)', 2],
    ['log10(1000)', 3],
    ['ln(exp(2))', 2],
    ['min(x, y, z)', 2],
    ['max(x, y, z, rho)', 11],
    ['abs(x - y)', 1],
  ])('%s is %d', (text, expected) => {
    expect(ours(text, ORIGIN)).toBeCloseTo(expected, 12);
    expect(theirs(text, ORIGIN)).toBeCloseTo(expected, 12);
  });
});

describe('constants', () => {
  test.each([
    ['1/3', 1 / 3],
    ['-(2 + 1)', -3],
    ['sqrt(4)*2^3', 16],
    ['min(3, 2, 1)', 1],
    ['x', null],
    ['0*x', null],
    ['sqrt(x)', null],
    ['2 + -x', null],
  ])('%s folds to %s', (text, expected) => {
    expect(constantOf(treeOf(text))).toBe(expected);
  });

  test('a fixed symbol is folded in, a closure is asked', () => {
    const run = compileTree(treeOf('pi*x^2 + y'), (name) =>
      name === 'pi'
        ? { fixed: Math.PI }
        : name === 'x'
          ? { slot: 0 }
          : { run: (slots) => (slots[1] ?? 0) / 1000 },
    );
    expect(run(Float64Array.of(2, 500))).toBeCloseTo(Math.PI * 4 + 0.5, 14);
  });
});
