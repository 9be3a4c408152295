import { numberTex } from './number-text.js';
import type { Tree } from './tree.js';

/** How a symbol is set: its letter, or its value. A set value may need brackets under a power. */
export type Leaf = (name: string) => { tex: string; compound: boolean };

const LEVEL = { sum: 1, product: 2, power: 3, atom: 4 } as const;

interface Set {
  tex: string;
  level: number;
  /** Of something with a minus in front: the same without it. */
  unsigned?: Set;
}

/** Sets a tree as TeX: fractions as fractions, powers as powers, brackets only where they are needed. */
export function treeTex(tree: Tree, leaf: Leaf): string {
  return set(tree, leaf).tex;
}

function set(tree: Tree, leaf: Leaf): Set {
  switch (tree.kind) {
    case 'number':
      return numberSet(tree.value);
    case 'symbol': {
      const { tex, compound } = leaf(tree.name);
      return { tex, level: tex.startsWith('-') ? LEVEL.sum : compound ? LEVEL.product : LEVEL.atom };
    }
    case 'negate':
      return negated(set(tree.operand, leaf));
    case 'binary':
      return binary(tree, leaf);
    case 'call':
      return call(tree, leaf);
  }
}

function numberSet(value: number): Set {
  const tex = numberTex(value, 12);
  return { tex, level: tex.includes('times') ? LEVEL.product : LEVEL.atom };
}

function negated(operand: Set): Set {
  return { tex: `-${within(operand, LEVEL.product)}`, level: LEVEL.sum, unsigned: operand };
}

function binary(tree: Tree & { kind: 'binary' }, leaf: Leaf): Set {
  const left = set(tree.left, leaf);
  const right = set(tree.right, leaf);
  switch (tree.operator) {
    case '+':
    case '-':
      return sum(tree.operator, left, right);
    case '*':
      return product(left, right);
    case '/':
      return fraction(left, right);
    case '^':
      return {
        tex: `{${within(left, LEVEL.atom)}}^{${plainFraction(tree.right, leaf) ?? right.tex}}`,
        level: LEVEL.power,
      };
  }
}

function sum(operator: '+' | '-', left: Set, right: Set): Set {
  const bracketed = operator === '-' || right.tex.startsWith('-');
  return {
    tex: `${left.tex} ${operator} ${within(right, bracketed ? LEVEL.product : LEVEL.sum)}`,
    level: LEVEL.sum,
  };
}

/** Factors stand side by side; a cross comes between where two numbers would run together or read as a mixed number. */
function product(left: Set, right: Set): Set {
  if (left.unsigned) return negated(product(left.unsigned, right));
  const [first, second] = [within(left, LEVEL.product), within(right, LEVEL.product)];
  const crossed = /^\d/.test(second.replace(/^(\{|\\left\(|\\frac\{)+/, ''));
  return { tex: `${first}${crossed ? ' \\times ' : ' \\, '}${second}`, level: LEVEL.product };
}

function fraction(left: Set, right: Set): Set {
  if (left.unsigned) return negated(fraction(left.unsigned, right));
  return { tex: `\\frac{${left.tex}}{${right.tex}}`, level: LEVEL.product };
}

/** A fraction of two plain numbers stands on the line in an exponent, as in Sc^{1/3}; null for anything else. */
function plainFraction(tree: Tree, leaf: Leaf): string | null {
  if (tree.kind !== 'binary' || tree.operator !== '/' || tree.right.kind !== 'number') return null;
  const over = tree.left.kind === 'negate' ? tree.left.operand : tree.left;
  return over.kind === 'number' ? `${set(tree.left, leaf).tex}/${set(tree.right, leaf).tex}` : null;
}

function call(tree: Tree & { kind: 'call' }, leaf: Leaf): Set {
  const operands = tree.operands.map((operand) => set(operand, leaf).tex);
  const [first = ''] = operands;
  switch (tree.name) {
    case 'sqrt':
      return { tex: `\\sqrt{${first}}`, level: LEVEL.atom };
    case 'abs':
      return { tex: `\\left|${first}\\right|`, level: LEVEL.atom };
    case 'log10':
      return { tex: `\\log_{10}\\left(${first}\\right)`, level: LEVEL.power };
    default:
      return { tex: `\\${tree.name}\\left(${operands.join(',\\ ')}\\right)`, level: LEVEL.power };
  }
}

function within({ tex, level }: Set, needed: number): string {
  return level < needed ? `\\left(${tex}\\right)` : tex;
}
