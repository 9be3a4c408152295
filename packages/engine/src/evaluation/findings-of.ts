import { formatNumber } from '../expression/number-text.js';
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
  return reckoner.sheet.bounds.map((bound) => {
    const value = reckoner.solve(bound.on) ? reckoner.shownValueOf(bound.on) : null;
    return holdAgainstBound(
      bound,
      value,
      unitOf(reckoner.sheet, bound.on)?.text ?? '1',
      `${symbol}.${bound.on}`,
    );
  });
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
function gapFindings(reckoner: Reckoner): Finding[] {
  return [...reckoner.gaps].flatMap((symbol) => {
    const line = reckoner.sheet.lines.get(symbol);
    return line ? gapFinding(reckoner, line) : [];
  });
}

function gapFinding(reckoner: Reckoner, { line, variants }: CompiledLine): Finding[] {
  const symbols = [...new Set(variants.flatMap(({ when }) => when.map(({ on }) => on)))];
  return symbols.map((on) => {
    const value = reckoner.shownValueOf(on);
    const intervals = variants.flatMap(({ when }) => when.filter((c) => c.on === on).map((c) => c.interval));
    const below = Math.max(...intervals.map(({ hi }) => hi ?? Infinity).filter((hi) => hi <= value));
    const above = Math.min(...intervals.map(({ lo }) => lo ?? -Infinity).filter((lo) => lo >= value));
    const lo = Number.isFinite(below) ? below : null;
    const hi = Number.isFinite(above) ? above : null;
    return {
      symbol: on,
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
      message: `No piece of the equation for ${line.symbol} covers ${on} = ${formatNumber(value)}${neighbours(lo, hi)}.`,
    };
  });
}

function neighbours(lo: number | null, hi: number | null): string {
  if (lo !== null && hi !== null)
    return `: one ends at ${formatNumber(lo)}, the next begins at ${formatNumber(hi)}`;
  if (lo !== null) return `: the last one ends at ${formatNumber(lo)}`;
  if (hi !== null) return `: the first one begins at ${formatNumber(hi)}`;
  return ' together with the other conditions';
}
