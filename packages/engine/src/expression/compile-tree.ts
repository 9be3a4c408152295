import { FUNCTIONS, type BinaryOperator, type Tree } from './tree.js';

/** An expression as a closure over a vector of values. */
export type Run = (slots: Float64Array) => number;

/** How a symbol is read: from a slot, as a fixed value, or through a closure. */
export type SymbolReading = { slot: number } | { fixed: number } | { run: Run };

/** A part of an expression on its way to a closure: fixed values are folded, plain slots are read directly. */
interface Operand {
  run: Run;
  fixed: number | null;
  slot: number | null;
}

/**
 * Turns a tree into a closure; `symbol` says how a name is read. Only our own small functions run, never text:
 * one a node, with the frequent forms (fixed factors and powers, bare symbols) made direct.
 */
export function compileTree(tree: Tree, symbol: (name: string) => SymbolReading): Run {
  return operandOf(tree, symbol).run;
}

/** The value of a tree without symbols; null where it has some. */
export function constantOf(tree: Tree): number | null {
  return operandOf(tree, () => ({ run: () => Number.NaN })).fixed;
}

function operandOf(tree: Tree, symbol: (name: string) => SymbolReading): Operand {
  switch (tree.kind) {
    case 'number':
      return fixed(tree.value);
    case 'symbol':
      return read(symbol(tree.name));
    case 'negate': {
      const operand = operandOf(tree.operand, symbol);
      if (operand.fixed !== null) return fixed(-operand.fixed);
      const { run } = operand;
      return computed((slots) => -run(slots));
    }
    case 'binary': {
      const left = operandOf(tree.left, symbol);
      const right = operandOf(tree.right, symbol);
      if (left.fixed !== null && right.fixed !== null)
        return fixed(combine(tree.operator, left.fixed, right.fixed));
      return computed(binaryRun(tree.operator, left, right));
    }
    case 'call':
      return callOperand(
        tree,
        tree.operands.map((operand) => operandOf(operand, symbol)),
      );
  }
}

function fixed(value: number): Operand {
  return { run: () => value, fixed: value, slot: null };
}

function computed(run: Run): Operand {
  return { run, fixed: null, slot: null };
}

function read(reading: SymbolReading): Operand {
  if ('fixed' in reading) return fixed(reading.fixed);
  if ('run' in reading) return computed(reading.run);
  const { slot } = reading;
  return { run: (slots) => slots[slot] ?? Number.NaN, fixed: null, slot };
}

function binaryRun(operator: BinaryOperator, left: Operand, right: Operand): Run {
  const { run: a } = left;
  const { run: b } = right;
  switch (operator) {
    case '+':
      return (slots) => a(slots) + b(slots);
    case '-':
      return (slots) => a(slots) - b(slots);
    case '*':
      return productRun(left, right);
    case '/':
      return quotientRun(left, right);
    case '^':
      return powerRun(left, right);
  }
}

function productRun({ run: a, fixed: factor, slot: i }: Operand, { run: b, slot: j }: Operand): Run {
  if (factor !== null) return (slots) => factor * b(slots);
  if (i !== null && j !== null) return (slots) => (slots[i] ?? Number.NaN) * (slots[j] ?? Number.NaN);
  if (j !== null) return (slots) => a(slots) * (slots[j] ?? Number.NaN);
  return (slots) => a(slots) * b(slots);
}

function quotientRun({ run: a, slot: i }: Operand, { run: b, slot: j }: Operand): Run {
  if (j !== null) return (slots) => a(slots) / (slots[j] ?? Number.NaN);
  if (i !== null) return (slots) => (slots[i] ?? Number.NaN) / b(slots);
  return (slots) => a(slots) / b(slots);
}

function powerRun({ run: base, slot }: Operand, { run: b, fixed: exponent }: Operand): Run {
  if (exponent === null) return (slots) => base(slots) ** b(slots);
  if (exponent === 0.5) return (slots) => Math.sqrt(base(slots));
  if (exponent === 2)
    return (slots) => {
      const value = base(slots);
      return value * value;
    };
  if (slot !== null) return (slots) => (slots[slot] ?? Number.NaN) ** exponent;
  return (slots) => base(slots) ** exponent;
}

function callOperand({ name }: Tree & { kind: 'call' }, operands: readonly Operand[]): Operand {
  const apply: (...values: number[]) => number = FUNCTIONS[name].apply;
  const values = operands.map((operand) => operand.fixed).filter((value) => value !== null);
  if (values.length === operands.length) return fixed(apply(...values));
  const [first, second, ...rest] = operands.map(({ run }) => run);
  if (!first) throw new RangeError(`${name} without an operand passed the parser`);
  if (!second) return computed((slots) => apply(first(slots)));
  if (rest.length === 0) return computed((slots) => apply(first(slots), second(slots)));
  const all = [first, second, ...rest];
  return computed((slots) => apply(...all.map((run) => run(slots))));
}

function combine(operator: BinaryOperator, left: number, right: number): number {
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
