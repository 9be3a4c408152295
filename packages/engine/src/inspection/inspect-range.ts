import { kernelFor, POINT } from '../evaluation/kernel.js';
import type { Reckoner } from '../evaluation/reckoner.js';
import { formatNumber } from '../expression/number-text.js';
import { fromSI } from '../quantity/unit.js';
import { slotOf, unitOf, type CompiledSheet } from '../sheet/compiled.js';
import type { Remark } from './remark.js';
import { boxAround, samplePoint, type SampleBox } from './sample-points.js';

const SAMPLES = 512;
/** Symbols that hang together (hold-up below voidage) cannot fill their box: its far corners may have no value. */
const CORNER_SHARE = 0.05;

type Point = ReadonlyMap<string, number>;

/** Whether every part has a finite, positive value over the bounded box, by a sample of it. */
export function inspectRange(sheet: CompiledSheet, point: Reckoner): Remark[] {
  const box = boxAround(sheet, point);
  return sheet.answers.filter((answer) => point.has(answer)).map((answer) => rangeRemark(sheet, box, answer));
}

function rangeRemark(sheet: CompiledSheet, box: SampleBox, answer: string): Remark {
  const { bad, negative } = sample(sheet, box, answer);
  const remark = (verdict: Remark['verdict'], message: string): Remark => ({
    verdict,
    topic: 'range',
    field: `parts.${answer}`,
    message,
  });
  const [worst] = bad;
  if (worst) {
    const where = `${answer} has no finite value at ${placeText(sheet, box, worst)}, inside its bounds`;
    return bad.length > SAMPLES * CORNER_SHARE
      ? remark('error', `${where}, and at ${bad.length - 1} more of ${SAMPLES} points.`)
      : remark('warning', `${where}; elsewhere it has.`);
  }
  if (negative)
    return remark(
      'warning',
      `${answer} is not positive at ${placeText(sheet, box, negative)}, inside its bounds.`,
    );
  return remark('passed', `${answer} is finite and positive at ${SAMPLES} points over the bounded range.`);
}

function sample(
  sheet: CompiledSheet,
  box: SampleBox,
  answer: string,
): { bad: Point[]; negative: Point | null } {
  const kernel = kernelFor(sheet, [...box.held.keys(), ...box.sides.map(({ symbol }) => symbol)], answer);
  const bad: Point[] = [];
  let negative: Point | null = null;
  for (let i = 0; i < SAMPLES; i += 1) {
    const at = samplePoint(box, i);
    for (const [symbol, value] of at) kernel.values[slotOf(sheet, symbol) ?? 0] = value;
    const status = kernel.run();
    if (status === POINT.notFinite) bad.push(at);
    if (status === POINT.within && (kernel.values[kernel.answerSlot] ?? 0) <= 0) negative ??= at;
  }
  return { bad, negative };
}

function placeText(sheet: CompiledSheet, { sides }: SampleBox, at: Point): string {
  return sides
    .map(({ symbol }) => {
      const unit = unitOf(sheet, symbol);
      const value = at.get(symbol) ?? Number.NaN;
      return `${symbol} = ${formatNumber(unit ? fromSI(value, unit) : value)}`;
    })
    .join(', ');
}
