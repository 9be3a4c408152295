import { describe, expect, test } from 'vitest';
import type { Stretch } from '../sheet/common-schema.js';
import { stripGeometry } from './strip.js';

const stretch = (lo?: number, hi?: number): Stretch => ({
  ...(lo === undefined ? {} : { lo: { value: lo, nature: 'data' } }),
  ...(hi === undefined ? {} : { hi: { value: hi, nature: 'data' } }),
});
const turbulent = [stretch(2000, 35000)];
const kinds = (input: Parameters<typeof stripGeometry>[0]) =>
  stripGeometry(input).runs.map((run) => run.kind);

describe('a bounded stretch', () => {
  test('stands between two stones with ground on both sides', () => {
    const strip = stripGeometry({ stretches: turbulent });
    expect(strip.scale).toBe('log');
    expect(strip.runs.map((run) => run.kind)).toEqual(['ground', 'permitted', 'ground']);
    expect(strip.stones.map(({ value, side }) => [value, side])).toEqual([
      [2000, 'lo'],
      [35000, 'hi'],
    ]);
    expect(strip.plumb).toBeNull();
  });

  test('is centred, since both sides have the same room', () => {
    const [lo, hi] = stripGeometry({ stretches: turbulent }).stones;
    expect(lo!.at + hi!.at).toBeCloseTo(1, 12);
  });

  test('keeps its axis while the value stays near, so that a live strip stands still', () => {
    const still = stripGeometry({ stretches: turbulent }).axis;
    expect(stripGeometry({ stretches: turbulent, value: 9000 }).axis).toEqual(still);
    expect(stripGeometry({ stretches: turbulent, value: 52300, state: 'outside' }).axis).toEqual(still);
  });

  test('places a value on the log axis: the geometric mean of the limits is half way', () => {
    const { plumb } = stripGeometry({ stretches: turbulent, value: Math.sqrt(2000 * 35000) });
    expect(plumb?.at).toBeCloseTo(0.5, 12);
  });

  test('stretches its axis for a value far outside', () => {
    const strip = stripGeometry({ stretches: turbulent, value: 1e9, state: 'past-reach' });
    expect(strip.axis.to).toBeGreaterThan(1e9);
    expect(strip.plumb?.offAxis).toBe(false);
  });

  test('fills most of the width where the limits lie close together, as temperatures do', () => {
    const [lo, hi] = stripGeometry({ stretches: [stretch(283, 323)] }).stones;
    expect(hi!.at - lo!.at).toBeGreaterThan(0.4);
  });
});

describe('hatching', () => {
  test('runs from the passed stone to the plumb line', () => {
    const strip = stripGeometry({ stretches: turbulent, value: 52300, state: 'outside' });
    const hatched = strip.runs.find((run) => run.kind === 'hatched');
    expect(hatched?.from).toBe(strip.stones[1]!.at);
    expect(hatched?.to).toBe(strip.plumb!.at);
  });

  test.each(['within', 'near', 'unchecked'] as const)('is absent where the value is %s', (state) => {
    expect(kinds({ stretches: turbulent, value: 9000, state })).not.toContain('hatched');
  });

  test('between two stretches starts at the nearer stone', () => {
    const stretches = [stretch(0.6, 2.5), stretch(1000, 3000)];
    const strip = stripGeometry({ stretches, value: 5, state: 'between' });
    expect(strip.runs.find((run) => run.kind === 'hatched')?.from).toBe(strip.stones[1]!.at);
    expect(strip.stones).toHaveLength(4);
    expect(strip.runs.filter((run) => run.kind === 'permitted')).toHaveLength(2);
  });
});

describe('sides without a stated limit', () => {
  test('run out dotted', () => {
    expect(kinds({ stretches: [stretch(undefined, 2100)] })).toEqual(['dotted', 'permitted', 'ground']);
    expect(kinds({ stretches: [stretch(4000)] })).toEqual(['ground', 'permitted', 'dotted']);
    expect(kinds({ stretches: [stretch()] })).toEqual(['dotted', 'permitted', 'dotted']);
  });

  test('of a symbol without any bound leave only dotted ground', () => {
    expect(stripGeometry({ stretches: [] }).runs).toEqual([{ kind: 'dotted', from: 0, to: 1 }]);
    expect(stripGeometry({ stretches: [], value: 7, state: 'unchecked' }).plumb?.at).toBeCloseTo(0.5, 12);
  });
});

describe('awkward values', () => {
  test('a value of zero or below leaves the log axis as it is and stands at its edge', () => {
    for (const value of [0, -5]) {
      const strip = stripGeometry({ stretches: turbulent, value, state: 'outside' });
      expect(strip.scale).toBe('log');
      expect(strip.plumb).toEqual({ at: 0, state: 'outside', offAxis: true });
    }
  });

  test.each([Number.NaN, Infinity, -Infinity, null, undefined])('%s draws no plumb line', (value) => {
    expect(stripGeometry({ stretches: turbulent, value }).plumb).toBeNull();
  });

  test('limits at zero or below take a linear axis', () => {
    const strip = stripGeometry({ stretches: [stretch(-20, 60)], value: 20 });
    expect(strip.scale).toBe('linear');
    expect(strip.plumb?.at).toBeCloseTo(0.5, 12);
    expect(strip.decades).toEqual([]);
  });

  test('every share lies between 0 and 1 and every run goes forward', () => {
    const inputs = [
      { stretches: [stretch(0, 2300)], axis: { from: 1e-3, to: 1e7 } },
      {
        stretches: [stretch(1e8, 1e9)],
        axis: { from: 1e-3, to: 1e7 },
        value: 1e12,
        state: 'outside' as const,
      },
      { stretches: [stretch(5, 5)], value: 5 },
    ];
    for (const input of inputs) {
      const strip = stripGeometry(input);
      const shares = [...strip.runs.flatMap((r) => [r.from, r.to]), ...strip.stones.map((s) => s.at)];
      expect(shares.every((share) => share >= 0 && share <= 1)).toBe(true);
      expect(strip.runs.every((run) => run.to > run.from)).toBe(true);
    }
  });
});

describe('a fixed axis', () => {
  const axis = { from: 1e-3, to: 1e7 };

  test('makes strips comparable and is marked with its decades', () => {
    const strip = stripGeometry({ stretches: turbulent, axis });
    expect(strip.axis).toEqual(axis);
    expect(strip.decades.map((decade) => decade.exponent)).toEqual([-3, -2, -1, 0, 1, 2, 3, 4, 5, 6, 7]);
    expect(strip.decades[3]?.at).toBeCloseTo(0.3, 12);
    expect(strip.stones[0]?.at).toBeCloseTo((Math.log10(2000) + 3) / 10, 12);
  });

  test('says which limits lie beyond it', () => {
    const strip = stripGeometry({ stretches: [stretch(0, 1e9)], axis });
    expect(strip.stones.map((stone) => stone.offAxis)).toEqual([true, true]);
  });
});
