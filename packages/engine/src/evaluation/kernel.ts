import type { Run } from '../expression/compile-tree.js';
import { toSI, type Unit } from '../quantity/unit.js';
import { slotOf, unitOf, type CompiledSheet } from '../sheet/compiled.js';

/** What came of one point: `outside` and `gap` have no number that may be used. */
export const POINT = { within: 0, outside: 1, gap: 2, notFinite: 3 } as const;
export type PointStatus = (typeof POINT)[keyof typeof POINT];

/** A sheet reduced to arithmetic for many points: groups, bounds and result, no steps and no words. */
export interface Kernel {
  /** Put the inputs here, in SI, at their slots, before each run. */
  values: Float64Array;
  slotOf(symbol: string): number;
  /** Computes the point; the result is then at the answer's slot. */
  run(): PointStatus;
  answerSlot: number;
}

/** Stretches in SI, limits moved by the rounding of unit conversion; the first stands apart since it is mostly the only one. */
interface Limit {
  slot: number;
  lo: number;
  hi: number;
  others: { lo: number; hi: number }[];
}

interface KernelLine {
  slot: number;
  /** The formula, where there is just one. */
  only: Run | null;
  variants: { when: Limit[]; run: Run }[];
}

/** Rounding allowed at a closed limit, as in `compareWithLimit`. */
const ROUNDING = 1e-12;

/** Prepares the lines behind a sheet's answer, with `given` symbols (quantities or groups) taken as inputs. */
export function kernelFor(
  sheet: CompiledSheet,
  given: readonly string[],
  answer = sheet.answers.at(-1) ?? '',
): Kernel {
  const needed = neededLines(sheet, new Set(given), answer);
  const lines = sheet.order
    .filter((symbol) => needed.has(symbol))
    .flatMap((symbol) => kernelLine(sheet, symbol));
  const known = new Set([...given, ...needed]);
  const bounds = sheet.bounds
    .filter(({ on, stretches }) => known.has(on) && stretches.length > 0)
    .map(({ on, stretches }) =>
      limit(
        sheet,
        on,
        stretches.map(({ lo, hi }) => ({
          lo: lo?.value,
          hi: hi?.value,
          loClosed: lo?.closed ?? true,
          hiClosed: hi?.closed ?? true,
        })),
      ),
    );
  const values = new Float64Array(sheet.slots).fill(Number.NaN);
  const answerSlot = slotOf(sheet, answer) ?? -1;
  return {
    values,
    answerSlot,
    slotOf: (symbol) => slotOf(sheet, symbol) ?? -1,
    run: runner(values, lines, bounds, answerSlot),
  };
}

function runner(
  values: Float64Array,
  lines: KernelLine[],
  bounds: Limit[],
  answerSlot: number,
): () => PointStatus {
  return () => {
    for (const line of lines) {
      const run = line.only ?? pick(values, line);
      if (!run) return POINT.gap;
      values[line.slot] = run(values);
    }
    for (const bound of bounds) if (!inside(values, bound)) return POINT.outside;
    return Number.isFinite(values[answerSlot]) ? POINT.within : POINT.notFinite;
  };
}

function pick(values: Float64Array, { variants }: KernelLine): Run | undefined {
  return variants.find(({ when }) => when.every((condition) => inside(values, condition)))?.run;
}

function inside(values: Float64Array, limit: Limit): boolean {
  const value = values[limit.slot] ?? Number.NaN;
  if (value >= limit.lo && value <= limit.hi) return true;
  return limit.others.length > 0 && limit.others.some(({ lo, hi }) => value >= lo && value <= hi);
}

function neededLines(
  sheet: CompiledSheet,
  given: ReadonlySet<string>,
  symbol: string,
  found = new Set<string>(),
): Set<string> {
  const line = sheet.lines.get(symbol);
  if (!line || given.has(symbol) || found.has(symbol)) return found;
  found.add(symbol);
  for (const { needs, when } of line.variants)
    for (const need of [...needs, ...when.map(({ on }) => on)]) neededLines(sheet, given, need, found);
  return found;
}

function kernelLine(sheet: CompiledSheet, symbol: string): KernelLine[] {
  const line = sheet.lines.get(symbol);
  if (!line) return [];
  return [
    {
      slot: line.slot,
      only: line.variants.length === 1 && line.variants[0]?.when.length === 0 ? line.variants[0].run : null,
      variants: line.variants.map(({ when, run }) => ({
        run,
        when: when.map(({ on, interval }) => limit(sheet, on, [interval])),
      })),
    },
  ];
}

interface OpenInterval {
  lo?: number | undefined;
  hi?: number | undefined;
  loClosed: boolean;
  hiClosed: boolean;
}

function limit(sheet: CompiledSheet, on: string, intervals: readonly OpenInterval[]): Limit {
  const unit = unitOf(sheet, on);
  const [first, ...others] = intervals.map(({ lo, hi, loClosed, hiClosed }) => ({
    lo: lo === undefined ? -Infinity : edge(lo, unit, loClosed ? -1 : 1),
    hi: hi === undefined ? Infinity : edge(hi, unit, hiClosed ? 1 : -1),
  }));
  return { slot: slotOf(sheet, on) ?? -1, lo: first?.lo ?? -Infinity, hi: first?.hi ?? Infinity, others };
}

/** A limit in SI, moved by the rounding: outward where it is closed, inward where it is open. */
function edge(value: number, unit: Unit | undefined, outward: 1 | -1): number {
  const si = unit ? toSI(value, unit) : value;
  return si + outward * ROUNDING * Math.abs(si);
}
