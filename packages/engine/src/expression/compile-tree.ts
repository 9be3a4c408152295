import { FUNCTIONS, type Tree } from './tree.js';

/** An expression as a closure over a vector of values. */
export type Run = (slots: Float64Array) => number;

/**
 * Turns a tree into a closure; `leaf` says how a symbol is read. Our own code runs, never text:
 * each node is one small function, with the frequent forms (constant factors and powers) made direct.
 */
export function compileTree(tree: Tree, leaf: (name: string) => Run): Run {
  const constant = constantOf(tree);
  if (constant !== null) return () => constant;
  switch (tree.kind) {
    case 'number': {
      const { value } = tree;
      return () => value;
    }
    case 'symbol':
      return leaf(tree.name);
    case 'negate': {
      const operand = compileTree(tree.operand, leaf);
      return (slots) => -operand(slots);
    }
    case 'binary':
      return compileBinary(tree, leaf);
    case 'call':
      return compileCall(tree, leaf);
  }
}

function compileBinary(tree: Tree & { kind: 'binary' }, leaf: (name: string) => Run): Run {
  if (tree.operator === '^') return compilePower(tree, leaf);
  const left = compileTree(tree.left, leaf);
  const right = compileTree(tree.right, leaf);
  const factor = constantOf(tree.left);
  switch (tree.operator) {
    case '+':
      return (slots) => left(slots) + right(slots);
    case '-':
      return (slots) => left(slots) - right(slots);
    case '*':
      if (factor !== null) return (slots) => factor * right(slots);
      return (slots) => left(slots) * right(slots);
    case '/':
      return (slots) => left(slots) / right(slots);
  }
}

function compilePower(tree: Tree & { kind: 'binary' }, leaf: (name: string) => Run): Run {
  const base = compileTree(tree.left, leaf);
  const exponent = constantOf(tree.right);
  if (exponent === null) {
    const run = compileTree(tree.right, leaf);
    return (slots) => base(slots) ** run(slots);
  }
  if (exponent === 0.5) return (slots) => Math.sqrt(base(slots));
  if (exponent === 2)
    return (slots) => {
      const value = base(slots);
      return value * value;
    };
  return (slots) => base(slots) ** exponent;
}

function compileCall(tree: Tree & { kind: 'call' }, leaf: (name: string) => Run): Run {
  const [first, second, ...rest] = tree.operands.map((operand) => compileTree(operand, leaf));
  if (!first) throw new RangeError(`${tree.name} without an operand passed the parser`);
  if (!second) {
    const apply = FUNCTIONS[tree.name].apply as (value: number) => number;
    return (slots) => apply(first(slots));
  }
  const apply = FUNCTIONS[tree.name].apply as (...values: number[]) => number;
  if (rest.length === 0) return (slots) => apply(first(slots), second(slots));
  const all = [first, second, ...rest];
  return (slots) => apply(...all.map((run) => run(slots)));
}

/** The value of a tree without symbols; null where it has some. */
export function constantOf(tree: Tree): number | null {
  switch (tree.kind) {
    case 'number':
      return tree.value;
    case 'symbol':
      return null;
    case 'negate': {
      const value = constantOf(tree.operand);
      return value === null ? null : -value;
    }
    case 'binary': {
      const left = constantOf(tree.left);
      const right = constantOf(tree.right);
      return left === null || right === null ? null : combine(tree.operator, left, right);
    }
    case 'call': {
      const values = tree.operands.map(constantOf);
      const known = values.filter((value) => value !== null);
      if (known.length < values.length) return null;
      return (FUNCTIONS[tree.name].apply as (...values: number[]) => number)(...known);
    }
  }
}

function combine(operator: '+' | '-' | '*' | '/' | '^', left: number, right: number): number {
  switch (operator) {
    case '+':
      return left + right;
    case '-':
      return left - right;
    case '*':
      return left * right;
    case '/':
      return left / right;
    case '^':
      return left ** right;
  }
}
