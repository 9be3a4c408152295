import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { MAX_DEPTH, MAX_LENGTH, parse } from './parse.js';
import type { Tree } from './tree.js';
import { bracketedText, randomTree } from '../testing/random-tree.js';

function treeOf(text: string): Tree {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.fault.reason}`);
  return parsed.tree;
}

function faultOf(text: string) {
  const parsed = parse(text);
  return parsed.ok ? null : parsed.fault;
}

describe('what an expression is', () => {
  test.each([
    ['0.023*Re^0.83*Sc^0.44', '((0.023 * (Re ^ 0.83)) * (Sc ^ 0.44))'],
    ['-2^2', '(-(2 ^ 2))'],
    ['2^3^2', '(2 ^ (3 ^ 2))'],
    ['2^-x', '(2 ^ (-x))'],
    ['a - -b', '(a - (-b))'],
    ['a/b/c', '((a / b) / c)'],
    ['a-b-c', '((a - b) - c)'],
    ['+a', 'a'],
    ['sqrt(2*x)', 'sqrt((2 * x))'],
    ['min(a, b,  c)', 'min(a, b, c)'],
    ['1.5e-3', '0.0015'],
    ['1E+2', '100'],
    ['1.e2', '100'],
    ['.5', '0.5'],
    ['e', 'e'],
    ['PI', 'PI'],
    ['and', 'and'],
    ['x0x1', 'x0x1'],
  ])('%s reads as %s', (text, expected) => {
    expect(bracketedText(treeOf(text))).toBe(expected);
  });

  test('a printed tree is read back as the same tree', () => {
    fc.assert(
      fc.property(randomTree, (tree) => {
        const text = bracketedText(tree);
        fc.pre(text.length <= MAX_LENGTH);
        expect(treeOf(text)).toEqual(tree);
      }),
      { numRuns: 1000, seed: 1 },
    );
  });
});

describe('what is refused, where and why', () => {
  test.each([
    ['member access', 'a.b', 2, /member access/],
    ['member access after a bracket', '(a).b', 4, /member access/],
    ['member access with a space', 'a . b', 3, /member access/],
    ['member access behind a number', 'x.5', 2, /member access/],
    ['assignment', 'a = 1', 3, /character "="/],
    ['function definition', 'f(x) = x', 6, /character "="/],
    ['two statements', 'a; b', 2, /character ";"/],
    ['array', '[1, 2]', 1, /character "\["/],
    ['index', 'a[0]', 2, /character "\["/],
    ['string', 'a + "b"', 5, /character/],
    ['string in single quotes', "a + 'b'", 5, /character/],
    ['template', '`a`', 1, /character/],
    ['comparison', 'a < b', 3, /character "<"/],
    ['equality', 'a == b', 3, /character "="/],
    ['conditional', 'a ? b : c', 3, /character "\?"/],
    ['logical or', 'a || b', 3, /character "\|"/],
    ['logical and in words', 'a and b', 5, /cannot be read|can be read/],
    ['negation in words', 'not a', 5, /can be read/],
    ['membership', 'a in b', 4, /can be read/],
    ['remainder', 'a % b', 3, /character "%"/],
    ['factorial', 'a!', 2, /character "!"/],
    ['hexadecimal', '2 + 0x1F', 5, /hexadecimal/],
    ['binary', '0b101', 1, /binary/],
    ['block comment', 'a /* b */', 3, /comments/],
    ['line break', 'a\n+ b', 2, /character/],
    ['random', '2*random()', 3, /"random" is not a function/],
    ['a function of expr-eval', 'fac(3)', 1, /"fac" is not a function/],
    ['its conditional function', 'if(a, b, c)', 1, /"if" is not a function/],
    ['its map', 'map(f, a)', 1, /"map" is not a function/],
    ['its length', 'length(a)', 1, /"length" is not a function/],
    ['a symbol called', '2*x(3)', 3, /"x" is not a function/],
    ['a number called', '2(3)', null, /named function/],
    ['a result called', 'sqrt(4)(2)', null, /named function/],
    ['too few operands', '1 + min(a)', 5, /min takes 2 to 8 operands, not 1/],
    ['too many operands', 'sqrt(a, b)', 1, /sqrt takes 1 operand, not 2/],
    ['nine operands', 'max(1,2,3,4,5,6,7,8,9)', 1, /max takes 2 to 8 operands, not 9/],
    ['no operand', 'exp()', 1, /exp takes 1 operand, not 0/],
    ['bare function', '2 + sqrt', 5, /sqrt is a function/],
    ['bare function as operand', 'exp(ln)', 5, /ln is a function/],
    ['no symbol: underscore first', '_a + 1', 1, /not a symbol/],
    ['no symbol: underscore last', 'a_', 1, /not a symbol/],
    ['no symbol: two underscores', 'a__b', 1, /not a symbol/],
    ['Cyrillic a', '2*\u0430', 3, /character/],
    ['Greek rho', '\u03c1*u', 1, /character/],
    ['full-width digit', '\uff12*x', 1, /character/],
    ['superscript two', 'x\u00b2', 2, /character/],
    ['typographic minus', '2 \u2212 x', 3, /character/],
    ['middle dot', 'a\u00b7b', 2, /character/],
    ['no-break space', 'a\u00a0+ b', 2, /character/],
    ['zero-width space', 'a\u200b', 2, /character/],
    ['astral letter', '2*\u{1d465}', 3, /character/],
    ['NUL', 'a\u0000', 2, /character/],
    ['empty', '', 1, /empty/],
    ['blank', '   ', 1, /empty/],
    ['operator without right operand', 'a +', 4, /operand is missing/],
    ['operator without left operand', '* a', 1, /operand is missing/],
    ['two operators', 'a ** b', 4, /operand is missing/],
    ['division twice', 'a//b', 3, /operand is missing/],
    ['empty brackets', 'a*()', 4, /operand is missing/],
    ['empty operand', 'min(a,,b)', 7, /operand is missing/],
    ['comma at the end', 'min(a,b,)', 9, /operand is missing/],
    ['implicit product', '2x', 2, /can be read/],
    ['two operands', 'x y', 3, /can be read/],
    ['list', 'a, b', 2, /can be read/],
    ['bracket not closed', 'exp(-x', 4, /not closed/],
    ['bracket not opened', 'a)', 2, /without an opening one/],
    ['too large', '2*1e400', 3, /too large/],
    ['too small', '1e-400', 1, /too small/],
    ['two points', '1.2.3', 5, /can be read/],
  ])('%s', (_what, text, at, reason) => {
    const fault = faultOf(text);
    expect(fault?.reason).toMatch(reason);
    expect(fault?.at).toBe(at);
  });

  test.each(['constructor', 'toString', 'valueOf', 'hasOwnProperty', 'isPrototypeOf'])(
    'the prototype name %s is a plain symbol, and no function',
    (name) => {
      expect(treeOf(`2*${name}`)).toEqual({
        kind: 'binary',
        operator: '*',
        left: { kind: 'number', value: 2 },
        right: { kind: 'symbol', name },
      });
      expect(faultOf(`${name}(1)`)).toEqual({
        at: 1,
        reason: `"${name}" is not a function that may be used`,
      });
      expect(faultOf(`a.${name}`)?.reason).toMatch(/member access/);
    },
  );

  test.each(['__proto__', '__defineGetter__', '__lookupSetter__'])('%s is no symbol', (name) => {
    expect(faultOf(name)).toEqual({ at: 1, reason: `"${name}" is not a symbol` });
    expect(faultOf(`${name}(1)`)).toEqual({ at: 1, reason: `"${name}" is not a symbol` });
  });
});

describe('limits of size', () => {
  test('2 000 characters are read, one more is refused', () => {
    const longest = `x${' '.repeat(MAX_LENGTH - 1)}`;
    expect(parse(longest).ok).toBe(true);
    expect(faultOf(`${longest} `)).toEqual({ at: 2001, reason: 'longer than 2000 characters (2001)' });
  });

  test('64 brackets are read, one more is refused where it opens', () => {
    const nested = (depth: number) => `${'('.repeat(depth)}x${')'.repeat(depth)}`;
    expect(parse(nested(MAX_DEPTH)).ok).toBe(true);
    expect(faultOf(nested(MAX_DEPTH + 1))).toEqual({ at: 65, reason: 'nested deeper than 64 brackets' });
  });

  test.each([
    ['powers', Array.from({ length: 999 }, () => 'x').join('^')],
    ['minus signs', `${'-'.repeat(1999)}x`],
    ['a sum', Array.from({ length: 999 }, () => 'x').join('+')],
    ['calls', `${'exp('.repeat(64)}${'-'.repeat(500)}x${')'.repeat(64)}`],
  ])('a long chain of %s is refused and overflows nothing', (_what, text) => {
    expect(faultOf(text)?.reason).toBe('nested too deeply');
  });

  test('a sum of 300 terms is no such chain', () => {
    expect(parse(Array.from({ length: 300 }, () => 'x').join('+')).ok).toBe(true);
  });

  test('whatever text comes, there is a tree or a fault, and no exception', () => {
    const piece = fc.constantFrom(
      'x',
      '2',
      '(',
      ')',
      '+',
      '-',
      '^',
      '/',
      '*',
      ',',
      '.',
      ' ',
      'sqrt',
      '1e',
      '__proto__',
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary', maxLength: 60 }),
          fc.array(piece, { maxLength: 20 }).map((pieces) => pieces.join('')),
        ),
        (text) => {
          const parsed = parse(text);
          if (!parsed.ok) {
            expect(parsed.fault.reason).not.toBe('');
            if (parsed.fault.at !== null) {
              expect(parsed.fault.at).toBeGreaterThanOrEqual(1);
              expect(parsed.fault.at).toBeLessThanOrEqual(Math.max(1, text.length + 1));
            }
          }
        },
      ),
      { numRuns: 3000, seed: 2 },
    );
  });
});
