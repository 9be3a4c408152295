import { tokensOf, type RawToken } from './tokens-of.js';
import { FUNCTIONS, isFunctionName, type BinaryOperator, type Tree } from './tree.js';

export const MAX_LENGTH = 2000;
export const MAX_DEPTH = 64;
const ALPHABET = /^[A-Za-z0-9_+\-*/^(). ,]*$/;
const SYMBOL = /^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?$/;
const BINARY = new Set<string>(['+', '-', '*', '/', '^']);

/** Why a text is no expression, and where: a place in the text counted from 1, or null for the whole of it. */
export interface ExpressionFault {
  at: number | null;
  reason: string;
}

export type Parsed = { ok: true; tree: Tree } | { ok: false; fault: ExpressionFault };

class Refusal extends Error {
  constructor(
    readonly at: number | null,
    readonly reason: string,
  ) {
    super(reason);
  }
}

/**
 * Reads an expression: ASCII infix with + - * / ^, brackets, numbers, symbols and the listed functions.
 * Everything else is refused with place and reason; nothing is evaluated here.
 */
export function parse(text: string): Parsed {
  try {
    checkText(text);
    return { ok: true, tree: treeOf(readTokens(text), text) };
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, fault: { at: error.at, reason: error.reason } };
    throw error;
  }
}

/** Closed alphabet, length and bracket depth, before any parser sees the text. */
function checkText(text: string): void {
  if (text.trim() === '') throw new Refusal(1, 'the expression is empty');
  if (text.length > MAX_LENGTH)
    throw new Refusal(MAX_LENGTH + 1, `longer than ${MAX_LENGTH} characters (${text.length})`);
  if (!ALPHABET.test(text)) {
    const at = [...text].findIndex((c) => !ALPHABET.test(c)) + 1;
    throw new Refusal(at, `the character ${JSON.stringify([...text][at - 1])} has no place in an expression`);
  }
  const comment = text.indexOf('/*');
  if (comment >= 0) throw new Refusal(comment + 1, 'comments have no place in an expression');
  const radix = /(?<![A-Za-z0-9_])0[xXbB][0-9A-Fa-f]/.exec(text);
  if (radix) throw new Refusal(radix.index + 1, 'numbers are decimal; hexadecimal and binary are refused');
  const member = /[A-Za-z_)]\s*\.|(?<!\d)\.\s*[A-Za-z_]/.exec(text);
  if (member) throw new Refusal(text.indexOf('.', member.index) + 1, 'member access with a dot is refused');
  checkNumbers(text);
  checkDepth(text);
  checkOperands(text);
}

/** Numbers that a double cannot hold would become infinity or zero without a word. */
function checkNumbers(text: string): void {
  for (const match of text.matchAll(/(?<![A-Za-z0-9_.])([\d.]+)(?:[eE][+-]?\d+)?/g)) {
    const value = Number(match[0]);
    if (value === Infinity) throw new Refusal(match.index + 1, 'a number is too large to be represented');
    if (value === 0 && /[1-9]/.test(match[1] ?? ''))
      throw new Refusal(match.index + 1, 'a number is too small to be represented');
  }
}

/** Where an operand should stand: after an operator, a comma, an opening bracket, or at the start. */
const MISSING_OPERAND = /(?:^|[-+*/^,])\s*(?=[*/^,)]|$)|\(\s*(?=[*/^,]|$)|(?<![A-Za-z0-9_]\s*)\(\s*(?=\))/;

function checkOperands(text: string): void {
  const gap = MISSING_OPERAND.exec(text);
  if (gap) throw new Refusal(gap.index + gap[0].length + 1, 'an operand is missing here');
}

function checkDepth(text: string): void {
  let depth = 0;
  for (let i = 0; i < text.length; i += 1) {
    if (text[i] === '(') depth += 1;
    if (text[i] === ')') depth -= 1;
    if (depth > MAX_DEPTH) throw new Refusal(i + 1, `nested deeper than ${MAX_DEPTH} brackets`);
    if (depth < 0) throw new Refusal(i + 1, 'a closing bracket without an opening one');
  }
  if (depth > 0) throw new Refusal(text.lastIndexOf('(') + 1, 'an opening bracket is not closed');
}

function readTokens(text: string): RawToken[] {
  try {
    return tokensOf(text);
  } catch (error) {
    const message = error instanceof Error ? error.message : '';
    // The parser counts on to the end of the token it stumbles over; a person looks at the token.
    const column = /\[\d+:(\d+)\]/.exec(message);
    throw new Refusal(column ? Number(column[1]) - 1 : null, 'not an expression that can be read');
  }
}

/** Builds the tree from postfix tokens, letting through only what is on the list. */
function treeOf(tokens: RawToken[], text: string): Tree {
  const stack: Tree[] = [];
  const pop = (): Tree => {
    const tree = stack.pop();
    if (!tree) throw new Refusal(null, 'an operator or function lacks an operand');
    return tree;
  };
  for (const token of tokens) stack.push(node(token, pop, text));
  const [tree, ...rest] = stack;
  if (!tree || rest.length > 0) throw new Refusal(null, 'not one single expression');
  refuseBareFunctions(tree, text);
  checkTreeDepth(tree);
  return tree;
}

function node(token: RawToken, pop: () => Tree, text: string): Tree {
  switch (token.type) {
    case 'INUMBER':
      return numberNode(token.value, text);
    case 'IVAR':
      return { kind: 'symbol', name: symbolName(token.value, text) };
    case 'IOP1': {
      const operand = pop();
      if (token.value === '-') return { kind: 'negate', operand };
      if (token.value === '+') return operand;
      break;
    }
    case 'IOP2': {
      const right = pop();
      const left = pop();
      if (typeof token.value === 'string' && BINARY.has(token.value))
        return { kind: 'binary', operator: token.value as BinaryOperator, left, right };
      break;
    }
    case 'IFUNCALL':
      return callNode(token.value, pop, text);
  }
  throw new Refusal(
    placeOf(String(token.value), text),
    `${JSON.stringify(String(token.value))} is not allowed here`,
  );
}

function numberNode(value: unknown, text: string): Tree {
  if (typeof value !== 'number')
    throw new Refusal(placeOf(String(value), text), 'only numbers stand in an expression');
  return { kind: 'number', value };
}

function symbolName(value: unknown, text: string): string {
  const name = String(value);
  if (!SYMBOL.test(name)) throw new Refusal(placeOf(name, text), `"${name}" is not a symbol`);
  return name;
}

function callNode(count: unknown, pop: () => Tree, text: string): Tree {
  const operands = Array.from({ length: Number(count) }, pop).reverse();
  const callee = pop();
  if (callee.kind !== 'symbol') throw new Refusal(null, 'only a named function can be called');
  if (!isFunctionName(callee.name))
    throw new Refusal(placeOf(callee.name, text), `"${callee.name}" is not a function that may be used`);
  const { least, most } = FUNCTIONS[callee.name];
  if (operands.length < least || operands.length > most)
    throw new Refusal(
      placeOf(callee.name, text),
      `${callee.name} takes ${least === most ? least : `${least} to ${most}`} operand${most === 1 ? '' : 's'}, not ${operands.length}`,
    );
  return { kind: 'call', name: callee.name, operands };
}

/** A function's name is no symbol: `sqrt + 1` means nothing. */
function refuseBareFunctions(tree: Tree, text: string): void {
  if (tree.kind === 'symbol' && isFunctionName(tree.name))
    throw new Refusal(
      placeOf(tree.name, text),
      `${tree.name} is a function and needs its operand in brackets`,
    );
  if (tree.kind === 'negate') refuseBareFunctions(tree.operand, text);
  if (tree.kind === 'binary') {
    refuseBareFunctions(tree.left, text);
    refuseBareFunctions(tree.right, text);
  }
  if (tree.kind === 'call') for (const operand of tree.operands) refuseBareFunctions(operand, text);
}

/** Long chains without brackets (a long sum, `^` or minus signs) nest as well; 400 levels keep recursion safe. */
function checkTreeDepth(tree: Tree): void {
  const stack: { tree: Tree; depth: number }[] = [{ tree, depth: 1 }];
  for (let next = stack.pop(); next; next = stack.pop()) {
    if (next.depth > 400) throw new Refusal(null, 'nested too deeply');
    const depth = next.depth + 1;
    const { tree: here } = next;
    if (here.kind === 'negate') stack.push({ tree: here.operand, depth });
    if (here.kind === 'binary') stack.push({ tree: here.left, depth }, { tree: here.right, depth });
    if (here.kind === 'call') stack.push(...here.operands.map((operand) => ({ tree: operand, depth })));
  }
}

/** Where a name stands in the text, counted from 1. */
function placeOf(name: string, text: string): number | null {
  const escaped = name.replace(/[^A-Za-z0-9_]/g, '\\$&');
  const match = new RegExp(`(?<![A-Za-z0-9_])${escaped}(?![A-Za-z0-9_])`).exec(text);
  return match ? match.index + 1 : null;
}
