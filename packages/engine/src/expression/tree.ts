export type BinaryOperator = '+' | '-' | '*' | '/' | '^';

/** A parsed expression: the one form that is compiled, proved for dimension and typeset. */
export type Tree =
  | { kind: 'number'; value: number }
  | { kind: 'symbol'; name: string }
  | { kind: 'negate'; operand: Tree }
  | { kind: 'binary'; operator: BinaryOperator; left: Tree; right: Tree }
  | { kind: 'call'; name: FunctionName; operands: Tree[] };

interface FunctionRule {
  least: number;
  most: number;
  apply: (...values: number[]) => number;
}

/** Every function an expression may call; there are no others. */
export const FUNCTIONS = {
  sqrt: { least: 1, most: 1, apply: Math.sqrt },
  exp: { least: 1, most: 1, apply: Math.exp },
  ln: { least: 1, most: 1, apply: Math.log },
  log10: { least: 1, most: 1, apply: Math.log10 },
  abs: { least: 1, most: 1, apply: Math.abs },
  sin: { least: 1, most: 1, apply: Math.sin },
  cos: { least: 1, most: 1, apply: Math.cos },
  tan: { least: 1, most: 1, apply: Math.tan },
  sinh: { least: 1, most: 1, apply: Math.sinh },
  cosh: { least: 1, most: 1, apply: Math.cosh },
  tanh: { least: 1, most: 1, apply: Math.tanh },
  min: { least: 2, most: 8, apply: Math.min },
  max: { least: 2, most: 8, apply: Math.max },
} as const satisfies Record<string, FunctionRule>;
export type FunctionName = keyof typeof FUNCTIONS;

export function isFunctionName(name: string): name is FunctionName {
  return Object.hasOwn(FUNCTIONS, name);
}

/** Names of all symbols in a tree, each once, in order of appearance. */
export function symbolsOf(tree: Tree, found: Set<string> = new Set()): Set<string> {
  switch (tree.kind) {
    case 'number':
      break;
    case 'symbol':
      found.add(tree.name);
      break;
    case 'negate':
      symbolsOf(tree.operand, found);
      break;
    case 'binary':
      symbolsOf(tree.left, found);
      symbolsOf(tree.right, found);
      break;
    case 'call':
      for (const operand of tree.operands) symbolsOf(operand, found);
  }
  return found;
}
