import { dimensionOf } from '../expression/dimension-of.js';
import { parse } from '../expression/parse.js';
import { symbolTex } from '../expression/symbol-tex.js';
import { symbolsOf } from '../expression/tree.js';
import { treeTex } from '../expression/tree-tex.js';
import { CONSTANTS, isConstant } from '../quantity/constants.js';
import { dimensionText, quotient, isDimensionless, type Dimension } from '../quantity/dimension.js';
import { readUnit } from '../quantity/unit.js';

/** A symbol with its unit as somebody is still writing them. */
export interface SketchSymbol {
  symbol: string;
  unit: string;
  tex?: string | undefined;
}

/** One equation still being written; of pieces each is one. */
export interface SketchLine extends SketchSymbol {
  /** Path in the definition. */
  path: string;
  expression: string;
  /** No dimension is proved. */
  dimensional?: boolean | undefined;
}

/** Whether an equation's dimensions close, as far as can be said. */
export type DimensionOfSketch =
  | { state: 'closes' }
  | { state: 'open'; leftOver: string }
  | { state: 'wrong'; reason: string }
  /** Not proved: a dimensional formula, or symbols without a unit so far. */
  | { state: 'not-proved'; reason: string };

export interface LineSketch {
  path: string;
  symbolTex: string;
  /** The right-hand side typeset; null while it cannot be parsed. */
  tex: string | null;
  /** Why it cannot be parsed, and where; null where it can or is empty. */
  fault: { at: number | null; reason: string } | null;
  /** Symbols in it that the sheet does not have. */
  unknown: string[];
  dimension: DimensionOfSketch;
}

/**
 * Looks at equations one by one while a sheet is being written: what can be typeset, what is not known, and what is
 * left over of the dimensions. Nothing else of the sheet has to hold yet; what a compiled sheet says counts more.
 */
export function sketchLines(quantities: readonly SketchSymbol[], lines: readonly SketchLine[]): LineSketch[] {
  const known = new Map<string, SketchSymbol>();
  for (const one of [...quantities, ...lines]) if (one.symbol !== '') known.set(one.symbol, one);
  return lines.map((line) => sketch(line, known));
}

function sketch(line: SketchLine, known: ReadonlyMap<string, SketchSymbol>): LineSketch {
  const base = { path: line.path, symbolTex: letterOf(line.symbol, known) };
  const notYet = { state: 'not-proved', reason: 'there is no expression to prove yet' } as const;
  if (line.expression.trim() === '')
    return { ...base, tex: null, fault: null, unknown: [], dimension: notYet };
  const parsed = parse(line.expression);
  if (!parsed.ok) return { ...base, tex: null, fault: parsed.fault, unknown: [], dimension: notYet };
  const { tree } = parsed;
  const unknown = [...symbolsOf(tree)].filter((symbol) => !isConstant(symbol) && !known.has(symbol));
  return {
    ...base,
    tex: treeTex(tree, (name) => ({ tex: letterOf(name, known), compound: false })),
    fault: null,
    unknown,
    dimension: proof(line, tree, known),
  };
}

function proof(
  line: SketchLine,
  tree: Parameters<typeof dimensionOf>[0],
  known: ReadonlyMap<string, SketchSymbol>,
): DimensionOfSketch {
  if (line.dimensional) return { state: 'not-proved', reason: 'a dimensional formula is taken at its word' };
  const dimensions = new Map<string, Dimension>();
  const without: string[] = [];
  for (const name of symbolsOf(tree)) {
    const dimension = CONSTANTS[name]?.dimension ?? dimensionOfUnit(known.get(name)?.unit);
    if (dimension) dimensions.set(name, dimension);
    else without.push(name);
  }
  const claimed = dimensionOfUnit(line.unit);
  if (without.length > 0) return { state: 'not-proved', reason: `no unit is known of ${without.join(', ')}` };
  if (!claimed) return { state: 'not-proved', reason: 'its own unit cannot be read yet' };
  const verdict = dimensionOf(tree, (name) => dimensions.get(name) ?? {});
  if (!verdict.ok) return { state: 'wrong', reason: verdict.reason };
  const surplus = quotient(verdict.dimension, claimed);
  return isDimensionless(surplus) ? { state: 'closes' } : { state: 'open', leftOver: dimensionText(surplus) };
}

function dimensionOfUnit(unit: string | undefined): Dimension | undefined {
  const reading = unit === undefined || unit.trim() === '' ? undefined : readUnit(unit);
  return reading?.ok ? reading.unit.dimension : undefined;
}

function letterOf(symbol: string, known: ReadonlyMap<string, SketchSymbol>): string {
  return symbol === '' ? '\\square' : symbolTex(symbol, known.get(symbol)?.tex);
}
