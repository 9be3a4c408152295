import fc from 'fast-check';
import katex from 'katex';
import { describe, expect, test } from 'vitest';
import { compileTree } from './compile-tree.js';
import { putInTex } from './number-text.js';
import { parse } from './parse.js';
import { symbolTex } from './symbol-tex.js';
import { treeTex, type Leaf } from './tree-tex.js';
import type { Tree } from './tree.js';
import { bracketedText, randomPoint, randomTree, SYMBOLS } from '../testing/random-tree.js';
import { valueOfTex } from '../testing/value-of-tex.js';

const symbols: Leaf = (name) => ({ tex: symbolTex(name), compound: false });

function treeOf(text: string): Tree {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.fault.reason}`);
  return parsed.tree;
}

function tex(text: string, leaf: Leaf = symbols): string {
  return treeTex(treeOf(text), leaf);
}

/** Numbers put in by symbol, in the way the written-out steps do it. */
function numbers(values: Record<string, number>): Leaf {
  return (name) => putInTex(values[name] ?? Number.NaN);
}

/** Sets with the strictest settings: anything doubtful throws. */
function typeset(formula: string): string {
  return katex.renderToString(formula, { throwOnError: true, strict: 'error' });
}

describe('formulas in symbols', () => {
  test.each([
    ['rho*u*d/mu', '\\frac{\\rho \\, u \\, d}{\\mu}'],
    ['mu/(rho*D)', '\\frac{\\mu}{\\rho \\, D}'],
    ['0.023*Re^0.83*Sc^0.44', '0.023 \\, {\\mathrm{Re}}^{0.83} \\, {\\mathrm{Sc}}^{0.44}'],
    ['Sc^(1/3)', '{\\mathrm{Sc}}^{1/3}'],
    ['Sc^(-2/3)', '{\\mathrm{Sc}}^{-2/3}'],
    ['x^-0.4', '{x}^{-0.4}'],
    ['x^(n/2)', '{x}^{\\frac{n}{2}}'],
    ['(1/3)*x', '\\frac{1}{3} \\, x'],
    ['2/3*x', '\\frac{2}{3} \\, x'],
    ['(1 + 2)/(3 + 4)', '\\frac{1 + 2}{3 + 4}'],
    ['2/(3*4)', '\\frac{2}{3 \\times 4}'],
    ['(a/b)^2', '{\\left(\\frac{a}{b}\\right)}^{2}'],
    ['(a^2)^3', '{\\left({a}^{2}\\right)}^{3}'],
    ['(a*b)^2', '{\\left(a \\, b\\right)}^{2}'],
    ['a^(b + c)', '{a}^{b + c}'],
    ['ln(x)^2', '{\\left(\\ln\\left(x\\right)\\right)}^{2}'],
    ['sqrt(x)^3', '{\\sqrt{x}}^{3}'],
    ['a*(b + c)', 'a \\, \\left(b + c\\right)'],
    ['a - (b + c)', 'a - \\left(b + c\\right)'],
    ['a - (b - c)', 'a - \\left(b - c\\right)'],
    ['a + (b - c)', 'a + b - c'],
    ['a + -b', 'a + \\left(-b\\right)'],
    ['a - -b', 'a - \\left(-b\\right)'],
    ['-a*b', '-a \\, b'],
    ['-a*b*c', '-a \\, b \\, c'],
    ['-a/b', '-\\frac{a}{b}'],
    ['a*-b', 'a \\, \\left(-b\\right)'],
    ['-(a + b)', '-\\left(a + b\\right)'],
    ['--a', '-\\left(-a\\right)'],
    ['-x^2', '-{x}^{2}'],
    ['(-x)^2', '{\\left(-x\\right)}^{2}'],
    ['exp(-4*x)', '\\exp\\left(-4 \\, x\\right)'],
    ['log10(x)', '\\log_{10}\\left(x\\right)'],
    ['abs(a - b)', '\\left|a - b\\right|'],
    ['max(a, b, 2)', '\\max\\left(a,\\ b,\\ 2\\right)'],
    ['x*1e-9', 'x \\times 1\\times 10^{-9}'],
    ['(1e-9)^2', '{\\left(1\\times 10^{-9}\\right)}^{2}'],
    ['x*3', 'x \\times 3'],
    ['0.5*(a/b)', '0.5 \\, \\frac{a}{b}'],
    ['2*(3/4)', '2 \\times \\frac{3}{4}'],
  ])('%s', (text, expected) => {
    expect(tex(text)).toBe(expected);
    expect(typeset(expected)).toContain('katex');
  });
});

describe('formulas with numbers put in', () => {
  test.each([
    [
      'rho*u*d/mu',
      { rho: 1.147, u: 8.72, d: 0.0254, mu: 1.92e-5 },
      '\\frac{1.147 \\times 8.72 \\times 0.0254}{1.92\\times 10^{-5}}',
    ],
    ['0.023*Re^0.83', { Re: 13230 }, '0.023 \\times {13\\,230}^{0.83}'],
    ['x^2', { x: 1e-5 }, '{\\left(1\\times 10^{-5}\\right)}^{2}'],
    ['x^2', { x: -3 }, '{\\left(-3\\right)}^{2}'],
    ['a - b', { a: 2, b: -3 }, '2 - \\left(-3\\right)'],
    ['a + b', { a: 2, b: -3 }, '2 + \\left(-3\\right)'],
    ['a*b', { a: 2, b: -3 }, '2 \\, \\left(-3\\right)'],
    ['-a', { a: -3 }, '-\\left(-3\\right)'],
    ['0.5*(a/b)', { a: 3, b: 4 }, '0.5 \\times \\frac{3}{4}'],
    ['a*sqrt(b)', { a: 3, b: 4 }, '3 \\, \\sqrt{4}'],
  ])('%s at %o', (text, values, expected) => {
    expect(tex(text, numbers(values))).toBe(expected);
    expect(typeset(expected)).toContain('katex');
  });

  test('no two numbers run together, and none reads as a mixed number', () => {
    fc.assert(
      fc.property(randomTree, randomPoint, (tree, point) => {
        const set = treeTex(tree, numbers(point));
        expect(set).not.toMatch(/\d\}* \\, (?:\{|\\left\()*(?:\\frac\{)*\d/);
        expect(set).not.toMatch(/[\d.] [\d.]/);
        expect(set).not.toMatch(/[-+] -/);
      }),
      { numRuns: 2000, seed: 7 },
    );
  });
});

/** Letters for the five symbols that a reader of TeX can tell apart. */
const LETTERS: Readonly<Record<string, string>> = Object.fromEntries(
  SYMBOLS.map((symbol, i) => [symbol, 'abcde'.charAt(i)]),
);

describe('what is set means what is computed', () => {
  test('TeX read back has the value of the tree', () => {
    let finite = 0;
    fc.assert(
      fc.property(randomTree, randomPoint, (tree, point) => {
        const run = compileTree(tree, (name) => ({ slot: SYMBOLS.findIndex((symbol) => symbol === name) }));
        const expected = run(Float64Array.from(SYMBOLS, (symbol) => point[symbol]));
        const set = treeTex(tree, (name) => ({ tex: LETTERS[name] ?? '', compound: false }));
        const letters = Object.fromEntries(SYMBOLS.map((symbol) => [LETTERS[symbol] ?? '', point[symbol]]));
        const found = valueOfTex(set, letters);
        if (!Number.isFinite(expected)) {
          expect(Number.isFinite(found), `${bracketedText(tree)} as ${set}`).toBe(false);
          return;
        }
        finite += 1;
        expect(Math.abs(found - expected), `${bracketedText(tree)} as ${set}`).toBeLessThanOrEqual(
          1e-9 * Math.max(Math.abs(expected), 1e-300),
        );
      }),
      { numRuns: 3000, seed: 8 },
    );
    expect(finite).toBeGreaterThan(1500);
  });

  test('all TeX is set by KaTeX in its strictest mode', () => {
    fc.assert(
      fc.property(randomTree, randomPoint, (tree, point) => {
        expect(() => typeset(treeTex(tree, symbols))).not.toThrow();
        expect(() => typeset(treeTex(tree, numbers(point)))).not.toThrow();
      }),
      { numRuns: 400, seed: 9 },
    );
  });
});
