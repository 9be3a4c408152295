import fc from 'fast-check';
import { FUNCTIONS, type FunctionName, type Tree } from '../expression/tree.js';

/** Symbols of random expressions, none of which is a function or a constant. */
export const SYMBOLS = ['x', 'y', 'z', 'u_1', 'rho'] as const;

/** Numbers as people write constants: a few digits, no extremes. */
const constant = fc.constantFrom(0.023, 0.33, 0.5, 0.83, 1, 1.5, 2, 3, 4, 12.5, 120, 1e-3);

/** Random trees over all operators and functions, up to a depth of about five. */
export const randomTree: fc.Arbitrary<Tree> = fc.letrec<{ tree: Tree }>((tie) => ({
  tree: fc.oneof(
    { depthSize: 'small', withCrossShrink: true },
    constant.map((value): Tree => ({ kind: 'number', value })),
    fc.constantFrom(...SYMBOLS).map((name): Tree => ({ kind: 'symbol', name })),
    tie('tree').map((operand): Tree => ({ kind: 'negate', operand })),
    fc
      .tuple(fc.constantFrom('+', '-', '*', '/', '^'), tie('tree'), tie('tree'))
      .map(([operator, left, right]): Tree => ({ kind: 'binary', operator, left, right })),
    fc.constantFrom(...(Object.keys(FUNCTIONS) as FunctionName[])).chain((name) =>
      fc
        .array(tie('tree'), {
          minLength: FUNCTIONS[name].least,
          maxLength: Math.min(3, FUNCTIONS[name].most),
        })
        .map((operands): Tree => ({ kind: 'call', name, operands })),
    ),
  ),
})).tree;

/** Random texts without brackets, so that precedence alone decides: `-x^2*3--y/z^-2`. */
export const randomChain: fc.Arbitrary<string> = fc
  .array(
    fc.tuple(
      fc.constantFrom('', '', '-'),
      fc.oneof(fc.constantFrom(...SYMBOLS), fc.constantFrom('2', '3', '0.5', '1.5e-1')),
      fc.constantFrom('+', '-', '*', '/', '^'),
    ),
    { minLength: 2, maxLength: 9 },
  )
  .map((links) =>
    links
      .map(([sign, atom, operator], i) => (i === links.length - 1 ? sign + atom : sign + atom + operator))
      .join(''),
  );

/** A tree as text, every operation in its own brackets. */
export function bracketedText(tree: Tree): string {
  switch (tree.kind) {
    case 'number':
      return String(tree.value);
    case 'symbol':
      return tree.name;
    case 'negate':
      return `(-${bracketedText(tree.operand)})`;
    case 'binary':
      return `(${bracketedText(tree.left)} ${tree.operator} ${bracketedText(tree.right)})`;
    case 'call':
      return `${tree.name}(${tree.operands.map(bracketedText).join(', ')})`;
  }
}

/** A value for each symbol. */
export const randomPoint = fc.record(
  Object.fromEntries(
    SYMBOLS.map((symbol) => [symbol, fc.double({ min: -50, max: 50, noNaN: true })]),
  ) as Record<(typeof SYMBOLS)[number], fc.Arbitrary<number>>,
);
