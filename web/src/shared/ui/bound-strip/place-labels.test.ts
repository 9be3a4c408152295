import { describe, expect, test } from 'vitest';
import { placeLabels, type LabelWish } from './place-labels';

const wish = (at: number, width = 40): LabelWish => ({ at, width });

/** Whether two labels of one row touch, or one leaves the strip. */
function isClean(wishes: LabelWish[], width: number): boolean {
  const placed = placeLabels(wishes, width).map((place, i) => ({ ...place, width: wishes[i]?.width ?? 0 }));
  const inside = placed.every(({ at, width: w }) => at - w / 2 >= -1e-9 && at + w / 2 <= width + 1e-9);
  const apart = placed.every((a, i) =>
    placed.slice(i + 1).every((b) => a.row !== b.row || Math.abs(a.at - b.at) >= (a.width + b.width) / 2),
  );
  return inside && apart;
}

describe('placeLabels', () => {
  test('leaves labels that have room under their stones', () => {
    expect(placeLabels([wish(100), wish(300)], 400)).toEqual([
      { at: 100, row: 0 },
      { at: 300, row: 0 },
    ]);
  });

  test('moves close neighbours apart by the same amount on both sides', () => {
    const [left, right] = placeLabels([wish(195), wish(205)], 400);
    expect((left!.at + right!.at) / 2).toBeCloseTo(200, 9);
    expect(right!.at - left!.at).toBeGreaterThanOrEqual(40);
  });

  test('keeps a label at the edge inside the strip', () => {
    expect(placeLabels([wish(2), wish(398)], 400).map(({ at }) => at)).toEqual([20, 380]);
  });

  test('takes a second row where one is too narrow', () => {
    const rows = placeLabels([wish(30, 90), wish(60, 90), wish(90, 90)], 200).map(({ row }) => row);
    expect(rows).toEqual([0, 1, 0]);
  });

  test.each([
    ['four stones close together', [wish(100), wish(104), wish(108), wish(112)], 400],
    ['eight stones over the width', Array.from({ length: 8 }, (_, i) => wish(20 + i * 50, 44)), 420],
    ['two wide labels on a phone', [wish(90, 100), wish(120, 100)], 260],
    ['all on one spot', Array.from({ length: 6 }, () => wish(200, 30)), 400],
  ])('overlaps nothing with %s', (_, wishes, width) => {
    expect(isClean(wishes, width)).toBe(true);
  });
});
