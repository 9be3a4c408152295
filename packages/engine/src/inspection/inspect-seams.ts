import { holds } from '../bounds/interval.js';
import { kernelFor } from '../evaluation/kernel.js';
import type { Reckoner } from '../evaluation/reckoner.js';
import { formatNumber } from '../expression/number-text.js';
import { fromSI, toSI } from '../quantity/unit.js';
import {
  slotOf,
  unitOf,
  type CompiledLine,
  type CompiledSheet,
  type CompiledVariant,
} from '../sheet/compiled.js';
import type { Remark } from './remark.js';
import { boxAround, samplePoint } from './sample-points.js';

/** A jump at a seam above this share is worth a reviewer's attention. */
const NOTABLE_JUMP = 0.05;
const SAMPLES = 64;

interface Seam {
  on: string;
  /** Limit in the symbol's unit on the sheet. */
  at: number;
  below: CompiledVariant;
  above: CompiledVariant;
}

/** Where pieces of an equation meet: by how much they disagree there. Where they do not meet: the gap. */
export function inspectSeams(sheet: CompiledSheet, point: Reckoner): Remark[] {
  return [...sheet.lines.values()].flatMap((line) => [
    ...seamsOf(line).flatMap((seam) => seamRemark(sheet, line, seam, point)),
    ...gapsOf(line),
  ]);
}

function seamsOf({ variants }: CompiledLine): Seam[] {
  return variants.flatMap((below) =>
    variants.flatMap((above) =>
      below.when.flatMap(({ on, interval: { hi } }) =>
        hi !== undefined && meets(below, above, on, hi) ? [{ on, at: hi, below, above }] : [],
      ),
    ),
  );
}

/** Neighbours across one limit: the same elsewhere or open there. */
function meets(below: CompiledVariant, above: CompiledVariant, on: string, at: number): boolean {
  if (!above.when.some((condition) => condition.on === on && condition.interval.lo === at)) return false;
  return above.when.every(({ on: other, interval }) => {
    const same = below.when.find((condition) => condition.on === other);
    if (other === on || !same) return true;
    const lo = Math.max(interval.lo ?? -Infinity, same.interval.lo ?? -Infinity);
    const hi = Math.min(interval.hi ?? Infinity, same.interval.hi ?? Infinity);
    return lo < hi;
  });
}

function seamRemark(sheet: CompiledSheet, { line }: CompiledLine, seam: Seam, point: Reckoner): Remark[] {
  const box = boxAround(sheet, point);
  const unit = unitOf(sheet, seam.on);
  const slot = slotOf(sheet, seam.on);
  if (!unit || slot === undefined) return [];
  const given = [...new Set([...box.held.keys(), ...box.sides.map(({ symbol }) => symbol), seam.on])];
  const conditions = [...seam.below.when, ...seam.above.when].filter(({ on }) => on !== seam.on);
  const others = [...seam.below.needs, ...seam.above.needs, ...conditions.map(({ on }) => on)];
  let jump = 0;
  for (let i = 0; i < SAMPLES; i += 1) {
    const values = new Float64Array(sheet.slots).fill(Number.NaN);
    for (const [symbol, value] of samplePoint(box, i)) values[slotOf(sheet, symbol) ?? 0] = value;
    values[slot] = toSI(seam.at, unit);
    for (const need of others) if (sheet.lines.has(need)) fill(sheet, values, given, need);
    if (!conditions.every(({ on, interval }) => holds(shownAt(sheet, values, on), interval))) continue;
    const ratio = seam.above.run(values) / seam.below.run(values);
    if (Number.isFinite(ratio) && ratio > 0)
      jump = Math.max(jump, Math.abs(ratio - 1), Math.abs(1 / ratio - 1));
  }
  return [
    {
      verdict: jump > NOTABLE_JUMP ? 'warning' : 'passed',
      topic: 'seams',
      field: line.path,
      message: `${line.symbol} jumps by ${formatNumber(jump * 100, 2)} % at most at the seam ${seam.on} = ${formatNumber(seam.at)}.`,
    },
  ];
}

function shownAt(sheet: CompiledSheet, values: Float64Array, symbol: string): number {
  const unit = unitOf(sheet, symbol);
  const value = values[slotOf(sheet, symbol) ?? 0] ?? Number.NaN;
  return unit ? fromSI(value, unit) : value;
}

/** Computes a line the seam's formulas stand on, unless it is among the sampled symbols. */
function fill(sheet: CompiledSheet, values: Float64Array, given: readonly string[], symbol: string): void {
  if (given.includes(symbol)) return;
  const kernel = kernelFor(sheet, given, symbol);
  kernel.values.set(values);
  kernel.run();
  values[slotOf(sheet, symbol) ?? 0] = kernel.values[kernel.answerSlot] ?? Number.NaN;
}

/** Along a symbol on which all pieces have conditions, stretches that none of them covers. */
function gapsOf({ line, variants }: CompiledLine): Remark[] {
  const symbols = [...new Set(variants.flatMap(({ when }) => when.map(({ on }) => on)))];
  return symbols.flatMap((on): Remark[] => {
    const spans = variants.map(({ when }) => when.find((condition) => condition.on === on)?.interval);
    if (spans.some((span) => span === undefined)) return [];
    const sorted = spans
      .map((span) => ({ lo: span?.lo ?? -Infinity, hi: span?.hi ?? Infinity }))
      .sort((a, b) => a.lo - b.lo);
    const gaps: Remark[] = [];
    let end = sorted[0]?.hi ?? Infinity;
    for (const { lo, hi } of sorted.slice(1)) {
      if (lo > end)
        gaps.push({
          verdict: 'warning',
          topic: 'seams',
          field: line.path,
          message: `No piece covers ${on} between ${formatNumber(end)} and ${formatNumber(lo)}; there the sheet refuses.`,
        });
      end = Math.max(end, hi);
    }
    return gaps;
  });
}
