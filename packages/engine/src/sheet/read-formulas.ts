import type { Problem } from '../evaluation/outcome.js';
import { parse } from '../expression/parse.js';
import { symbolsOf, type Tree } from '../expression/tree.js';
import { isConstant } from '../quantity/constants.js';
import type { Condition } from './common-schema.js';
import { definition } from './check-symbols.js';
import { memberPath, type Calculable, type Line } from './lines.js';

export interface Formula {
  title: string | undefined;
  when: Condition[];
  tree: Tree;
  /** Symbols in the expression, constants left out. */
  needs: string[];
  path: string;
}

export interface ReadLine {
  line: Line;
  formulas: Formula[];
}

/** Parses every expression, resolves its symbols, and puts the lines in an order in which each can be computed. */
export function readFormulas(calculable: Calculable): { lines: ReadLine[]; problems: Problem[] } {
  const known = new Set([...calculable.quantities, ...calculable.lines].map(({ symbol }) => symbol));
  const problems: Problem[] = [];
  const read = calculable.lines.map((line): ReadLine => {
    const texts = expressionsOf(line);
    if (texts.length === 0 || (line.expression !== undefined && line.pieces !== undefined))
      problems.push(definition(line.path || 'expression', 'There is one expression, or pieces of one.'));
    return { line, formulas: texts.flatMap((text) => readFormula(text, known, problems)) };
  });
  return { lines: problems.length > 0 ? read : inOrder(read, problems), problems };
}

interface FormulaText {
  text: string;
  title: string | undefined;
  when: Condition[];
  path: string;
}

function expressionsOf(line: Line): FormulaText[] {
  const { expression, pieces } = line;
  if (pieces)
    return pieces.map((piece, i) => ({
      text: piece.expression,
      title: piece.title,
      when: piece.when,
      path: `${memberPath(line, 'pieces')}[${i}].expression`,
    }));
  return expression === undefined
    ? []
    : [{ text: expression, title: undefined, when: [], path: memberPath(line, 'expression') }];
}

function readFormula(from: FormulaText, known: ReadonlySet<string>, problems: Problem[]): Formula[] {
  const parsed = parse(from.text);
  if (!parsed.ok) {
    const { at, reason } = parsed.fault;
    const place = at === null ? '' : ` at character ${at}`;
    problems.push({ code: 'expression', field: from.path, message: `Not accepted${place}: ${reason}.` });
    return [];
  }
  const needs = [...symbolsOf(parsed.tree)].filter((symbol) => !isConstant(symbol));
  for (const symbol of needs)
    if (!known.has(symbol)) {
      const at = new RegExp(`(?<![A-Za-z0-9_])${symbol}(?![A-Za-z0-9_])`).exec(from.text);
      const place = at ? ` at character ${at.index + 1}` : '';
      problems.push({
        code: 'expression',
        field: from.path,
        message: `There is no symbol ${symbol}${place}.`,
      });
    }
  return [{ title: from.title, when: from.when, tree: parsed.tree, needs, path: from.path }];
}

/** Depth-first order by need; a circle is named with all its members. */
function inOrder(lines: ReadLine[], problems: Problem[]): ReadLine[] {
  const bySymbol = new Map(lines.map((line) => [line.line.symbol, line]));
  const done = new Set<string>();
  const order: ReadLine[] = [];
  const visit = (read: ReadLine, trail: string[]): void => {
    const { symbol } = read.line;
    if (done.has(symbol)) return;
    if (trail.includes(symbol)) {
      const circle = [...trail.slice(trail.indexOf(symbol)), symbol].join(' → ');
      problems.push(
        definition(memberPath(read.line, 'expression'), `The definitions go in a circle: ${circle}.`),
      );
      return;
    }
    for (const need of needsOf(read)) {
      const next = bySymbol.get(need);
      if (next) visit(next, [...trail, symbol]);
    }
    if (!done.has(symbol)) order.push(read);
    done.add(symbol);
  };
  for (const line of lines) visit(line, []);
  return order;
}

/** Everything a line stands on, in its expressions and in their conditions. */
export function needsOf({ formulas }: ReadLine): Set<string> {
  return new Set(formulas.flatMap(({ needs, when }) => [...when.map(({ on }) => on), ...needs]));
}
