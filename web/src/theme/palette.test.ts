import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { NIGHT, PAPER, type Palette } from './palette';

/** Relative luminance and contrast as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((v) => (v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

const inks = ['ink', 'faded', 'lichen', 'ochre', 'madder', 'slate'] as const;
const sheets: [string, Palette][] = [
  ['paper', PAPER],
  ['night', NIGHT],
];

test('contrast is reckoned as in the standard: black on white is 21', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 5);
});

test.each(sheets.flatMap(([name, sheet]) => inks.map((ink) => [name, ink, sheet] as const)))(
  'on the %s sheet %s reaches 4.5:1 as text',
  (_, ink, sheet) => {
    expect(contrast(sheet[ink], sheet.paper)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(sheet[ink], sheet.raised)).toBeGreaterThanOrEqual(4.5);
  },
);

test.each(sheets)('on the %s sheet buttons and outlines can be told', (_, sheet) => {
  expect(contrast(sheet.onLichen, sheet.lichen)).toBeGreaterThanOrEqual(4.5);
  expect(contrast(sheet.outline, sheet.paper)).toBeGreaterThanOrEqual(3);
});

test('the style sheet has the same inks', () => {
  const css = readFileSync('web/src/theme/base.css', 'utf8');
  const [paper = '', night = ''] = css.split('@media (prefers-color-scheme: dark)');
  const name = (key: string) => key.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
  for (const [key, hex] of Object.entries(PAPER)) expect(paper).toContain(`--${name(key)}: ${String(hex)};`);
  for (const [key, hex] of Object.entries(NIGHT)) expect(night).toContain(`--${name(key)}: ${String(hex)};`);
});
