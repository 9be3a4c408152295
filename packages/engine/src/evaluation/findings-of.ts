import { formatNumber } from '../expression/number-text.js';
import { holds, type Interval } from '../bounds/interval.js';
import { holdAgainstBound } from '../bounds/hold-against-bound.js';
import { unitOf, type CompiledLine, type CompiledSheet } from '../sheet/compiled.js';
import type { Finding } from './outcome.js';
import type { Reckoner } from './reckoner.js';
import type { FilledQuantity } from './supplies.js';

/** Holds every bounded symbol against its bound; those that only serve parts left out are passed over. */
export function findingsOf(
  reckoner: Reckoner,
  filled: readonly FilledQuantity[],
  solvedParts: ReadonlySet<string>,
): Finding[] {
  const { sheet } = reckoner;
  const idle = idleSymbols(sheet, solvedParts);
  const own = sheet.bounds
    .filter(({ on }) => !idle.has(on))
    .map((bound) => {
      const value = reckoner.solve(bound.on) ? reckoner.shownValueOf(bound.on) : null;
      return holdAgainstBound(bound, value, unitOf(sheet, bound.on)?.text ?? '1');
    });
  return [...own, ...gapFindings(reckoner), ...filled.flatMap(equationFindings)];
}

function equationFindings({ symbol, reckoner }: FilledQuantity): Finding[] {
  const own = reckoner.sheet.bounds.map((bound) => {
    const value = reckoner.solve(bound.on) ? reckoner.shownValueOf(bound.on) : null;
    return holdAgainstBound(
      bound,
      value,
      unitOf(reckoner.sheet, bound.on)?.text ?? '1',
      `${symbol}.${bound.on}`,
    );
  });
  return [...own, ...gapFindings(reckoner, `${symbol}.`)];
}

/** Symbols needed by no part that was worked out, though by one that was not. */
function idleSymbols(sheet: CompiledSheet, solvedParts: ReadonlySet<string>): Set<string> {
  const used = new Set<string>();
  const unused = new Set<string>();
  for (const [symbol, { line }] of sheet.lines)
    if (line.part !== null) collect(sheet, symbol, solvedParts.has(line.part) ? used : unused);
  return new Set([...unused].filter((symbol) => !used.has(symbol)));
}

function collect(sheet: CompiledSheet, symbol: string, into: Set<string>): void {
  if (into.has(symbol)) return;
  into.add(symbol);
  for (const { needs, when } of sheet.lines.get(symbol)?.variants ?? [])
    for (const need of [...needs, ...when.map(({ on }) => on)]) collect(sheet, need, into);
}

/** Where no piece of an equation holds, the symbols whose value falls in the gap, with the neighbours named. */
function gapFindings(reckoner: Reckoner, prefix = ''): Finding[] {
  return [...reckoner.gaps].flatMap((symbol) => {
    const line = reckoner.sheet.lines.get(symbol);
    return line ? gapFinding(reckoner, line, prefix) : [];
  });
}

function gapFinding(reckoner: Reckoner, { line, variants }: CompiledLine, prefix: string): Finding[] {
  const symbols = [...new Set(variants.flatMap(({ when }) => when.map(({ on }) => on)))];
  const sides = symbols.map((on) => {
    const value = reckoner.shownValueOf(on);
    const intervals = variants.flatMap(({ when }) => when.filter((c) => c.on === on).map((c) => c.interval));
    return { on, value, ...neighboursOf(value, intervals) };
  });
  // Where every symbol for itself lies in some piece, it is their combination that none covers.
  const uncovered = sides.filter(({ covered }) => !covered);
  return (uncovered.length > 0 ? uncovered : sides).map(({ on, value, lo, hi }) => {
    return {
      symbol: `${prefix}${on}`,
      kind: 'between',
      value,
      unit: unitOf(reckoner.sheet, on)?.text ?? '1',
      lo,
      hi,
      loClosed: false,
      hiClosed: false,
      nature: 'definition',
      basis: 'stated',
      ratio: null,
      deviable: false,
      beyond: [],
      message: `No piece of the equation for ${nameOf(line, prefix)} covers ${on} = ${formatNumber(value)}${neighbours(lo, hi)}.`,
    };
  });
}

/** What the message calls a line: of a property equation the quantity that it fills. */
function nameOf({ symbol }: CompiledLine['line'], prefix: string): string {
  return prefix ? prefix.slice(0, -1) : symbol;
}

/** The ends of the intervals next to a value that lies in none of them. */
function neighboursOf(
  value: number,
  intervals: readonly Interval[],
): { covered: boolean; lo: number | null; hi: number | null } {
  if (intervals.some((interval) => holds(value, interval))) return { covered: true, lo: null, hi: null };
  const below = Math.max(...intervals.flatMap(({ hi }) => (hi !== undefined && hi <= value ? [hi] : [])));
  const above = Math.min(...intervals.flatMap(({ lo }) => (lo !== undefined && lo >= value ? [lo] : [])));
  return {
    covered: false,
    lo: Number.isFinite(below) ? below : null,
    hi: Number.isFinite(above) ? above : null,
  };
}

function neighbours(lo: number | null, hi: number | null): string {
  if (lo !== null && hi !== null)
    return `: one ends at ${formatNumber(lo)}, the next begins at ${formatNumber(hi)}`;
  if (lo !== null) return `: the last one ends at ${formatNumber(lo)}`;
  if (hi !== null) return `: the first one begins at ${formatNumber(hi)}`;
  return ' together with the other conditions';
}
