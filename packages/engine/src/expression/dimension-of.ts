import {
  DIMENSIONLESS,
  dimensionText,
  isDimensionless,
  power,
  product,
  quotient,
  sameDimension,
  type Dimension,
} from '../quantity/dimension.js';
import { constantOf } from './compile-tree.js';
import type { FunctionName, Tree } from './tree.js';

export type DimensionVerdict = { ok: true; dimension: Dimension } | { ok: false; reason: string };

class DimensionFault extends Error {}

/** Functions that carry a dimension through; all others need and give plain numbers. */
const CARRYING = new Set<FunctionName>(['abs', 'min', 'max', 'sqrt']);

/** Works out what an expression's value is measured in, from its symbols' dimensions. */
export function dimensionOf(tree: Tree, symbol: (name: string) => Dimension): DimensionVerdict {
  try {
    return { ok: true, dimension: walk(tree, symbol) };
  } catch (error) {
    if (error instanceof DimensionFault) return { ok: false, reason: error.message };
    throw error;
  }
}

function walk(tree: Tree, symbol: (name: string) => Dimension): Dimension {
  switch (tree.kind) {
    case 'number':
      return DIMENSIONLESS;
    case 'symbol':
      return symbol(tree.name);
    case 'negate':
      return walk(tree.operand, symbol);
    case 'binary':
      return binary(tree, symbol);
    case 'call':
      return call(tree, symbol);
  }
}

function binary(tree: Tree & { kind: 'binary' }, symbol: (name: string) => Dimension): Dimension {
  const left = walk(tree.left, symbol);
  const right = walk(tree.right, symbol);
  switch (tree.operator) {
    case '*':
      return product(left, right);
    case '/':
      return quotient(left, right);
    case '^':
      return raised(left, right, constantOf(tree.right));
    case '+':
    case '-':
      return same(left, right, tree.operator === '+' ? 'added to' : 'subtracted from');
  }
}

function raised(base: Dimension, exponent: Dimension, constant: number | null): Dimension {
  if (!isDimensionless(exponent))
    throw new DimensionFault(`an exponent has the dimension ${dimensionText(exponent)}`);
  if (constant !== null && !Number.isFinite(constant))
    throw new DimensionFault('an exponent has no finite value');
  if (constant !== null) return power(base, constant);
  if (!isDimensionless(base))
    throw new DimensionFault(
      `something of dimension ${dimensionText(base)} is raised to a power that varies`,
    );
  return DIMENSIONLESS;
}

function same(left: Dimension, right: Dimension, verb: string): Dimension {
  if (!sameDimension(left, right))
    throw new DimensionFault(`${dimensionText(right)} is ${verb} ${dimensionText(left)}`);
  return left;
}

function call(tree: Tree & { kind: 'call' }, symbol: (name: string) => Dimension): Dimension {
  const [first = DIMENSIONLESS, ...rest] = tree.operands.map((operand) => walk(operand, symbol));
  if (CARRYING.has(tree.name)) {
    for (const other of rest) same(first, other, 'compared with');
    return tree.name === 'sqrt' ? power(first, 0.5) : first;
  }
  if (!isDimensionless(first))
    throw new DimensionFault(`${tree.name} is taken of something of dimension ${dimensionText(first)}`);
  return DIMENSIONLESS;
}
