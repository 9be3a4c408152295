import { kernelFor, POINT } from '../evaluation/kernel.js';
import type { Reckoner } from '../evaluation/reckoner.js';
import { formatNumber } from '../expression/number-text.js';
import { fromSI } from '../quantity/unit.js';
import { slotOf, unitOf, type CompiledSheet } from '../sheet/compiled.js';
import type { Remark } from './remark.js';
import { boxAround, samplePoint } from './sample-points.js';

const SAMPLES = 512;

/** Whether every part has a finite, positive value all over the bounded box, by a sample of it. */
export function inspectRange(sheet: CompiledSheet, point: Reckoner): Remark[] {
  const box = boxAround(sheet, point);
  return sheet.answers.flatMap((answer): Remark[] => {
    if (!point.has(answer)) return [];
    const kernel = kernelFor(sheet, [...box.held.keys(), ...box.sides.map(({ symbol }) => symbol)], answer);
    let negative: Map<string, number> | null = null;
    for (let i = 0; i < SAMPLES; i += 1) {
      const at = samplePoint(box, i);
      for (const [symbol, value] of at) kernel.values[slotOf(sheet, symbol) ?? 0] = value;
      const status = kernel.run();
      const value = kernel.values[kernel.answerSlot] ?? Number.NaN;
      if (status === POINT.notFinite || (status !== POINT.gap && !Number.isFinite(value)))
        return [
          {
            verdict: 'error',
            topic: 'range',
            field: `parts.${answer}`,
            message: `${answer} has no finite value at ${placeText(
              sheet,
              box.sides.map((s) => s.symbol),
              at,
            )}, inside its bounds.`,
          },
        ];
      if (status === POINT.within && value <= 0) negative ??= at;
    }
    if (negative)
      return [
        {
          verdict: 'warning',
          topic: 'range',
          field: `parts.${answer}`,
          message: `${answer} is not positive at ${placeText(
            sheet,
            box.sides.map((s) => s.symbol),
            negative,
          )}, inside its bounds.`,
        },
      ];
    return [
      {
        verdict: 'passed',
        topic: 'range',
        field: `parts.${answer}`,
        message: `${answer} is finite and positive at ${SAMPLES} points over the bounded range.`,
      },
    ];
  });
}

function placeText(
  sheet: CompiledSheet,
  symbols: readonly string[],
  at: ReadonlyMap<string, number>,
): string {
  return symbols
    .map((symbol) => {
      const unit = unitOf(sheet, symbol);
      const value = at.get(symbol) ?? Number.NaN;
      return `${symbol} = ${formatNumber(unit ? fromSI(value, unit) : value)}`;
    })
    .join(', ');
}
