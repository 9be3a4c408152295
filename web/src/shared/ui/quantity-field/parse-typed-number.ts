/** One way to read a typed text: as it would be written plainly, and its value. */
export interface Reading {
  text: string;
  value: number;
}

/** What a typed text comes to. A comma is never taken without asking: it separates decimals in half the world. */
export type TypedNumber =
  | { kind: 'empty' }
  | { kind: 'number'; value: number }
  | { kind: 'ask'; readings: Reading[] }
  | { kind: 'refused'; message: string };

const MAX_LENGTH = 60;
const SPACES = /[\u0020\u00a0\u2007-\u200a\u202f]/g;
const GROUP_MARKS = /(?<=\d)['\u2019](?=\d)/g;
const PLAIN =
  /^[+-]?(?:(?:\d+|\d{1,3}(?: \d{3})+)(?:\.(?:\d*|(?:\d{3} )+\d{1,3}))?|\.(?:\d+|(?:\d{3} )+\d{1,3}))(?:[eE][+-]?\d{1,4})?$/;
const TIMES_TEN = /^(.*\d\.?)\s*[×x*·⋅]\s*10(?:\s*\^?\s*([+-]?\d{1,4})|([⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]{1,4}))$/;
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * Reads a number as people type one: `0.05`, `1e-7`, `3.20`, ` 2 000`, `1.2×10⁻⁵`, a true minus sign.
 * Anything that could be read in two ways is asked about, anything else refused with a sentence.
 */
export function parseTypedNumber(typed: string): TypedNumber {
  const text = tidy(typed);
  if (text === '') return { kind: 'empty' };
  if (text.length > MAX_LENGTH) return refused(`A number of more than ${MAX_LENGTH} characters is not read.`);
  if (text.includes(',')) return askAboutComma(text);
  const value = plainNumber(text);
  return value === null ? refused(reasonFor(text)) : checked(text, value);
}

/** The value where the text has exactly one, else null. */
export function typedValue(typed: string): number | null {
  const parsed = parseTypedNumber(typed);
  return parsed.kind === 'number' ? parsed.value : null;
}

function tidy(typed: string): string {
  const text = typed
    .replace(SPACES, ' ')
    .trim()
    .replace(/ +/g, ' ')
    .replace(/[\u2212\u2013]/g, '-')
    .replace(GROUP_MARKS, ' ');
  const power = TIMES_TEN.exec(text);
  if (!power) return text;
  return `${(power[1] ?? '').trimEnd()}e${power[2] ?? fromSuperscript(power[3] ?? '')}`;
}

function fromSuperscript(text: string): string {
  return [...text].map((c) => (c === '⁻' ? '-' : c === '⁺' ? '+' : String(SUPERSCRIPTS.indexOf(c)))).join('');
}

function plainNumber(text: string): number | null {
  return PLAIN.test(text) ? Number(text.replace(/ /g, '')) : null;
}

function checked(text: string, value: number): TypedNumber {
  if (!Number.isFinite(value)) return refused(`${text} is larger than any number that can be worked with.`);
  const mantissa = text.split(/[eE]/)[0] ?? '';
  if (value === 0 && /[1-9]/.test(mantissa)) return refused(`${text} is too small to be told from zero.`);
  return { kind: 'number', value };
}

function askAboutComma(text: string): TypedNumber {
  const readings: Reading[] = [];
  for (const candidate of [decimalComma(text), groupingComma(text)]) {
    const value = candidate === null ? null : plainNumber(candidate);
    if (candidate === null || value === null || checked(candidate, value).kind !== 'number') continue;
    const plain = tidyReading(candidate);
    if (!readings.some((r) => r.value === value)) readings.push({ text: plain, value });
  }
  return readings.length > 0
    ? { kind: 'ask', readings }
    : refused('The commas cannot be read. Write a point as the decimal sign, and no sign between thousands.');
}

function decimalComma(text: string): string | null {
  if (text.split(',').length !== 2) return null;
  const [before = '', after = ''] = text.split(',');
  if (after.includes('.')) return null;
  if (before.includes('.') && !/^[+-]?\d{1,3}(\.\d{3})+$/.test(before)) return null;
  return `${before.replaceAll('.', '')}.${after}`;
}

function groupingComma(text: string): string | null {
  return /^[+-]?[1-9]\d{0,2}(,\d{3})+(\.\d*)?([eE][+-]?\d{1,4})?$/.test(text)
    ? text.replaceAll(',', '')
    : null;
}

/** `1.500` from `1,500` is offered as `1.5`: trailing zeros would look like thousands again. */
function tidyReading(text: string): string {
  if (/[eE ]/.test(text) || !text.includes('.')) return text;
  return text
    .replace(/0+$/, '')
    .replace(/\.$/, '')
    .replace(/^([+-]?)\./, '$10.');
}

function reasonFor(text: string): string {
  if (/^[+-]?(nan|null|undefined)$/i.test(text))
    return `“${text}” is not a number. Write digits, such as 0.05 or 1.2e-5.`;
  if (/^[+-]?(inf(inity)?|∞)$/i.test(text)) return 'A value must be finite.';
  if (/^[+-]?0[xob]/i.test(text)) return 'Only decimal digits are read, such as 31 or 3.1e1.';
  if (/^[+-]?[\d. ]+$/.test(text) && text.includes(' '))
    return 'A space may stand only between groups of three digits, as in 2 000.';
  if (/^[+-]?\d[\d. ]*(?![eE][+-]?\d|[eE]$)([a-zA-Zµ°%Ω]|\/)/.test(text))
    return 'Only the number belongs here; its unit is chosen beside it.';
  if (/^[+-]?[\d.]+[eE]/.test(text))
    return `The power of ten in “${text}” is not complete. Write it as in 1.2e-5.`;
  return `“${text}” is not read as a number. Write digits, such as 0.05 or 1.2e-5.`;
}

function refused(message: string): TypedNumber {
  return { kind: 'refused', message };
}
