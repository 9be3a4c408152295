import { constantOf } from './compile-tree.js';
import { numberTex } from './number-text.js';
import type { Tree } from './tree.js';

/** How a symbol is set: its letter, or its value. A set value may need brackets under a power. */
export type Leaf = (name: string) => { tex: string; compound: boolean };

const LEVEL = { sum: 1, product: 2, negate: 2, power: 3, atom: 4 } as const;

interface Set {
  tex: string;
  level: number;
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
      return { tex, level: compound ? LEVEL.product : LEVEL.atom };
    }
    case 'negate':
      return { tex: `-${within(set(tree.operand, leaf), LEVEL.product)}`, level: LEVEL.sum };
    case 'binary':
      return binary(tree, leaf);
    case 'call':
      return call(tree, leaf);
  }
}

function numberSet(value: number): Set {
  const tex = numberTex(value, 12);
  return { tex, level: tex.includes('times') || value < 0 ? LEVEL.product : LEVEL.atom };
}

function binary(tree: Tree & { kind: 'binary' }, leaf: Leaf): Set {
  switch (tree.operator) {
    case '+':
    case '-': {
      const left = set(tree.left, leaf).tex;
      const right = within(set(tree.right, leaf), tree.operator === '-' ? LEVEL.product : LEVEL.sum);
      return { tex: `${left} ${tree.operator} ${right}`, level: LEVEL.sum };
    }
    case '*':
      return productSet(tree, leaf);
    case '/':
      return fraction(tree, leaf);
    case '^':
      return raised(tree, leaf);
  }
}

/** Factors stand side by side; a cross comes between where two numbers would run together. */
function productSet(tree: Tree & { kind: 'binary' }, leaf: Leaf): Set {
  const left = within(set(tree.left, leaf), LEVEL.product);
  const right = within(set(tree.right, leaf), LEVEL.product);
  const crossed = /^-?\d/.test(right.replace(/^(\{|\\left\()+/, ''));
  return { tex: `${left}${crossed ? ' \\times ' : ' \\, '}${right}`, level: LEVEL.product };
}

function fraction(tree: Tree & { kind: 'binary' }, leaf: Leaf): Set {
  const whole = constantOf(tree.left) !== null && constantOf(tree.right) !== null;
  if (whole) return { tex: `${set(tree.left, leaf).tex}/${set(tree.right, leaf).tex}`, level: LEVEL.product };
  return { tex: `\\frac{${set(tree.left, leaf).tex}}{${set(tree.right, leaf).tex}}`, level: LEVEL.product };
}

function raised(tree: Tree & { kind: 'binary' }, leaf: Leaf): Set {
  const base = set(tree.left, leaf);
  const exponent = set(tree.right, leaf).tex;
  return { tex: `{${within(base, LEVEL.atom)}}^{${exponent}}`, level: LEVEL.power };
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
