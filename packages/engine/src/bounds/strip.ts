import type { Finding } from '../evaluation/outcome.js';
import type { Stretch } from '../sheet/common-schema.js';

export type StripRunKind = 'permitted' | 'ground' | 'dotted' | 'hatched';

export interface StripRun {
  kind: StripRunKind;
  from: number;
  to: number;
}

/** The picture of a bound in shares of its width (0 left, 1 right): the same for screen, table and PDF. */
export interface StripGeometry {
  scale: 'log' | 'linear';
  runs: StripRun[];
  stones: { at: number; value: number; side: 'lo' | 'hi'; closed: boolean }[];
  plumb: { at: number; state: Finding['kind'] } | null;
  /** The values at the two ends of the axis. */
  axis: { from: number; to: number };
}

export interface StripInput {
  stretches: readonly Stretch[];
  value?: number | null;
  state?: Finding['kind'];
  /** Fix the axis so that several strips can be compared; else it follows limits and value. */
  axis?: { from: number; to: number };
}

/** Lays out a bound strip. Log axis where all figures are positive, else linear. */
export function stripGeometry(input: StripInput): StripGeometry {
  const figures = limitsOf(input.stretches);
  const value = input.value ?? null;
  const all = value === null || !Number.isFinite(value) ? figures : [...figures, value];
  const scale = [...all, ...(input.axis ? [input.axis.from] : [])].every((v) => v > 0) ? 'log' : 'linear';
  const axis = input.axis ?? naturalAxis(all, scale);
  const place = placer(axis, scale);
  return {
    scale,
    axis,
    runs: runsOf(input.stretches, place, value, input.state),
    stones: input.stretches.flatMap(({ lo, hi }) => [
      ...(lo
        ? [{ at: place(lo.value), value: lo.value, side: 'lo' as const, closed: lo.closed ?? true }]
        : []),
      ...(hi
        ? [{ at: place(hi.value), value: hi.value, side: 'hi' as const, closed: hi.closed ?? true }]
        : []),
    ]),
    plumb: value === null ? null : { at: place(value), state: input.state ?? 'within' },
  };
}

function limitsOf(stretches: readonly Stretch[]): number[] {
  return stretches.flatMap(({ lo, hi }) => [lo?.value, hi?.value]).filter((v) => v !== undefined);
}

/** A margin of half a decade (log) or a quarter of the span (linear) beyond the outermost figure. */
function naturalAxis(figures: number[], scale: 'log' | 'linear'): { from: number; to: number } {
  if (figures.length === 0) return scale === 'log' ? { from: 0.1, to: 10 } : { from: 0, to: 1 };
  const low = Math.min(...figures);
  const high = Math.max(...figures);
  if (scale === 'log') {
    const pad = Math.max(0.3, Math.log10(high / low) * 0.28);
    return { from: low / 10 ** pad, to: high * 10 ** pad };
  }
  const pad = Math.max((high - low) * 0.25, Math.abs(high) * 0.25, 1e-12);
  return { from: low - pad, to: high + pad };
}

function placer(axis: { from: number; to: number }, scale: 'log' | 'linear'): (value: number) => number {
  const map = scale === 'log' ? Math.log : (v: number) => v;
  const a = map(axis.from);
  const span = map(axis.to) - a || 1;
  return (value) => Math.min(1, Math.max(0, (map(value) - a) / span));
}

function runsOf(
  stretches: readonly Stretch[],
  place: (value: number) => number,
  value: number | null,
  state: Finding['kind'] | undefined,
): StripRun[] {
  if (stretches.length === 0) return [{ kind: 'dotted', from: 0, to: 1 }];
  const runs: StripRun[] = [];
  let end = 0;
  for (const { lo, hi } of stretches) {
    const from = lo ? place(lo.value) : 0;
    const to = hi ? place(hi.value) : 1;
    if (lo && from > end) runs.push({ kind: 'ground', from: end, to: from });
    runs.push({ kind: 'permitted', from, to });
    end = to;
  }
  const last = stretches.at(-1);
  if (last?.hi && end < 1) runs.push({ kind: 'ground', from: end, to: 1 });
  openEnds(stretches, runs);
  if (value !== null && state !== 'within' && state !== 'near' && state !== 'unchecked')
    runs.push(...hatch(stretches, place, value));
  return runs;
}

/** Where no limit is stated on a side, the permitted stretch runs out dotted. */
function openEnds(stretches: readonly Stretch[], runs: StripRun[]): void {
  const OUT = 0.12;
  const first = runs.find((run) => run.kind === 'permitted');
  if (first && !stretches[0]?.lo) {
    first.from = Math.min(OUT, first.to);
    runs.unshift({ kind: 'dotted', from: 0, to: first.from });
  }
  const last = runs.filter((run) => run.kind === 'permitted').at(-1);
  if (last && !stretches.at(-1)?.hi) {
    last.to = Math.max(1 - OUT, last.from);
    runs.push({ kind: 'dotted', from: last.to, to: 1 });
  }
}

/** From the nearest stone to the plumb line. */
function hatch(stretches: readonly Stretch[], place: (v: number) => number, value: number): StripRun[] {
  const at = place(value);
  const stones = limitsOf(stretches).map(place);
  if (stones.length === 0) return [];
  const nearest = stones.reduce((best, s) => (Math.abs(s - at) < Math.abs(best - at) ? s : best));
  return [{ kind: 'hatched', from: Math.min(nearest, at), to: Math.max(nearest, at) }];
}
