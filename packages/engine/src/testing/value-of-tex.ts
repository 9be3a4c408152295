import { FUNCTIONS, isFunctionName } from '../expression/tree.js';

/**
 * Reads TeX as a mathematician would and works out its value: an independent way back from typeset formulas, which
 * shows brackets that were left out. Knows fractions, powers, roots, bars, brackets, functions, thin spaces and crosses.
 */
export function valueOfTex(tex: string, values: Readonly<Record<string, number>>): number {
  const tokens =
    tex.match(/\\left[(|]|\\right[)|]|\\log_\{10\}|\\[a-z]+|\\[, ]|\d+(?:\.\d+)?|[A-Za-z]|[{}^+\-/,]/g) ?? [];
  let at = 0;
  const peek = (): string => tokens[at] ?? '';
  const take = (expected?: string): string => {
    const token = peek();
    if (expected !== undefined && token !== expected)
      throw new Error(`${tex}: ${token || 'the end'} stands where ${expected} should`);
    at += 1;
    return token;
  };
  const group = (): number => {
    take('{');
    const value = sum();
    take('}');
    return value;
  };
  const sum = (): number => {
    let value = peek() === '-' ? (take(), -product()) : product();
    while (peek() === '+' || peek() === '-') value = take() === '+' ? value + product() : value - product();
    return value;
  };
  const product = (): number => {
    let value = power();
    while (['\\,', '\\times', '/'].includes(peek()))
      value = take() === '/' ? value / power() : value * power();
    return value;
  };
  const power = (): number => {
    const base = atom();
    if (peek() !== '^') return base;
    take();
    return base ** group();
  };
  const bracketed = (): number[] => {
    take('\\left(');
    const inside = [sum()];
    while (peek() === ',') {
      take();
      take('\\ ');
      inside.push(sum());
    }
    take('\\right)');
    return inside;
  };
  const atom = (): number => {
    const token = peek();
    if (token === '{') return group();
    if (token === '\\left(') return bracketed()[0] ?? Number.NaN;
    take();
    if (token === '\\frac') return group() / group();
    if (token === '\\sqrt') return Math.sqrt(group());
    if (token === '\\left|') {
      const value = sum();
      take('\\right|');
      return Math.abs(value);
    }
    if (/^\d/.test(token)) return Number(token);
    const name = token === '\\log_{10}' ? 'log10' : token.slice(1);
    if (token.startsWith('\\') && isFunctionName(name)) {
      const apply: (...operands: number[]) => number = FUNCTIONS[name].apply;
      return apply(...bracketed());
    }
    const value = values[token];
    if (value === undefined) throw new Error(`${tex}: cannot read ${token || 'the end'}`);
    return value;
  };
  const value = sum();
  if (at < tokens.length) throw new Error(`${tex}: ${peek()} is left over`);
  return value;
}
