import type { Finding } from '../evaluation/outcome.js';
import type { Stretch } from '../sheet/common-schema.js';
import { naturalAxis, placer, type StripAxis, type StripScale } from './strip-axis.js';

export type StripRunKind = 'permitted' | 'ground' | 'dotted' | 'hatched';

export interface StripRun {
  kind: StripRunKind;
  from: number;
  to: number;
}

export interface StripStone {
  at: number;
  value: number;
  side: 'lo' | 'hi';
  /** Whether the limit itself still belongs to the range. */
  closed: boolean;
  /** The limit lies beyond the axis and is drawn at its edge. */
  offAxis: boolean;
}

/** The picture of a bound in shares of its width (0 left, 1 right): the same for screen, table and PDF. */
export interface StripGeometry {
  scale: StripScale;
  runs: StripRun[];
  stones: StripStone[];
  plumb: { at: number; state: Finding['kind']; offAxis: boolean } | null;
  /** Whole powers of ten on a log axis. */
  decades: { at: number; exponent: number }[];
  /** The values at the two ends of the axis. */
  axis: StripAxis;
}

export interface StripInput {
  stretches: readonly Stretch[];
  /** Null and what is not finite draw no plumb line. */
  value?: number | null;
  state?: Finding['kind'];
  /** Fix the axis so that several strips can be compared; else it follows limits and value. */
  axis?: StripAxis;
}

const PAST_A_BOUND: readonly Finding['kind'][] = ['outside', 'past-reach', 'between'];

/** Lays out a bound strip. Log axis where all limits are positive, else linear. */
export function stripGeometry(input: StripInput): StripGeometry {
  const { stretches } = input;
  const limits = limitsOf(stretches);
  const value = input.value != null && Number.isFinite(input.value) ? input.value : null;
  const scale = scaleOf(limits, value, input.axis);
  const axis = input.axis ?? naturalAxis(stretches, scale, value);
  const place = placer(axis, scale);
  const off = (v: number) => v < axis.from || v > axis.to;
  const state = input.state ?? 'within';
  return {
    scale,
    axis,
    runs: [
      ...groundRuns(stretches, place),
      ...(value !== null && PAST_A_BOUND.includes(state) ? hatch(limits.map(place), place(value)) : []),
    ],
    stones: stretches.flatMap(({ lo, hi }) =>
      (['lo', 'hi'] as const).flatMap((side) => {
        const end = side === 'lo' ? lo : hi;
        if (!end) return [];
        return [
          {
            at: place(end.value),
            value: end.value,
            side,
            closed: end.closed ?? true,
            offAxis: off(end.value),
          },
        ];
      }),
    ),
    plumb: value === null ? null : { at: place(value), state, offAxis: off(value) },
    decades: scale === 'log' ? decadesOf(axis, place) : [],
  };
}

function limitsOf(stretches: readonly Stretch[]): number[] {
  return stretches.flatMap(({ lo, hi }) => [lo?.value, hi?.value]).filter((v) => v !== undefined);
}

/** The limits decide; a value that cannot be, such as Re = 0, must not turn the axis over. */
function scaleOf(limits: number[], value: number | null, axis: StripAxis | undefined): StripScale {
  if (axis) return axis.from > 0 ? 'log' : 'linear';
  if (limits.length === 0) return value === null || value > 0 ? 'log' : 'linear';
  return limits.every((v) => v > 0) ? 'log' : 'linear';
}

function decadesOf(axis: StripAxis, place: (value: number) => number): StripGeometry['decades'] {
  const first = Math.ceil(Math.log10(axis.from) - 1e-9);
  const last = Math.floor(Math.log10(axis.to) + 1e-9);
  const exponents = Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => first + index);
  return exponents.map((exponent) => ({ at: place(10 ** exponent), exponent }));
}

/** Ground between the stretches, and each stretch; a side without a stated limit runs out dotted. */
function groundRuns(stretches: readonly Stretch[], place: (value: number) => number): StripRun[] {
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
  if (stretches.at(-1)?.hi && end < 1) runs.push({ kind: 'ground', from: end, to: 1 });
  return runOut(stretches, runs);
}

/** Share of the width over which an open side runs out. */
const RUN_OUT = 0.12;

function runOut(stretches: readonly Stretch[], runs: StripRun[]): StripRun[] {
  const before: StripRun[] = [];
  const after: StripRun[] = [];
  const permitted = runs.filter((run) => run.kind === 'permitted');
  const first = permitted[0];
  if (first && !stretches[0]?.lo) {
    first.from = Math.min(RUN_OUT, first.to);
    before.push({ kind: 'dotted', from: 0, to: first.from });
  }
  const last = permitted.at(-1);
  if (last && !stretches.at(-1)?.hi) {
    last.to = Math.max(1 - RUN_OUT, last.from);
    after.push({ kind: 'dotted', from: last.to, to: 1 });
  }
  return [...before, ...runs, ...after].filter((run) => run.to > run.from);
}

/** From the nearest stone to the plumb line. */
function hatch(stones: number[], at: number): StripRun[] {
  if (stones.length === 0) return [];
  const nearest = stones.reduce((best, s) => (Math.abs(s - at) < Math.abs(best - at) ? s : best));
  return nearest === at ? [] : [{ kind: 'hatched', from: Math.min(nearest, at), to: Math.max(nearest, at) }];
}
