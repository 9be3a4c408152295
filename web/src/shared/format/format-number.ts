/** A number ready to be set: the digits, and the power of ten where one is needed. */
export interface SetNumber {
  /** Digits with grouping, with a true minus sign: `52 300`, `−1.84`. */
  mantissa: string;
  /** Power of ten, or null. */
  exponent: number | null;
}

/**
 * Between groups of figures and before a unit. It must not break a line; the no-break space of Source Serif 4 is narrow
 * enough (0.24 em), its thin one so narrow that groups run together.
 */
export const NUMBER_SPACE = '\u00a0';
const MINUS = '\u2212';
const SUPERSCRIPTS: Record<string, string> = {
  '-': '\u207b',
  '0': '\u2070',
  '1': '\u00b9',
  '2': '\u00b2',
  '3': '\u00b3',
  '4': '\u2074',
  '5': '\u2075',
  '6': '\u2076',
  '7': '\u2077',
  '8': '\u2078',
  '9': '\u2079',
};

/**
 * Sets a number with `digits` significant figures (four unless told).
 * From a thousandth up to a million it is written out; outside that with a power of ten.
 */
export function setNumber(value: number, digits = 4): SetNumber {
  if (Number.isNaN(value)) return { mantissa: 'not a number', exponent: null };
  if (!Number.isFinite(value)) return { mantissa: value > 0 ? '∞' : `${MINUS}∞`, exponent: null };
  if (value === 0) return { mantissa: '0', exponent: null };
  return compose(Number(value.toPrecision(digits)).toPrecision(digits));
}

/** Sets a figure exactly as it is on record: a bound, an entered value. No digit is added or lost. */
export function setExactly(value: number): SetNumber {
  if (!Number.isFinite(value) || value === 0) return setNumber(value);
  const [digits = '', power = '0'] = value.toExponential().split('e');
  const places = digits.replace(/[-.]/g, '').length;
  const plain = Number(power) >= places ? String(value) : value.toPrecision(Math.max(places, 1));
  return compose(plain);
}

/** One line of text, for SVG, titles and plain copies: `1.84×10⁻⁹`. */
export function formatNumber(value: number, digits = 4): string {
  return inline(setNumber(value, digits));
}

/** One line of text, rounded, without closing zeros: `0.61`, where room is short. */
export function formatBriefly(value: number, digits = 4): string {
  return Number.isFinite(value) ? formatExactly(Number(value.toPrecision(digits))) : formatNumber(value);
}

/** One line of text with every digit on record: `35 000`. */
export function formatExactly(value: number): string {
  return inline(setExactly(value));
}

/** Every digit, in the form a spreadsheet reads back. */
export function fullPrecision(value: number): string {
  return String(value);
}

/** `-9` as superscript characters. */
export function superscript(exponent: number): string {
  return String(exponent)
    .split('')
    .map((char) => SUPERSCRIPTS[char] ?? char)
    .join('');
}

function inline({ mantissa, exponent }: SetNumber): string {
  if (exponent === null) return mantissa;
  return mantissa === '1'
    ? `10${superscript(exponent)}`
    : `${mantissa}${NUMBER_SPACE}×${NUMBER_SPACE}10${superscript(exponent)}`;
}

/** From JavaScript's own decimal text to a set number. */
function compose(text: string): SetNumber {
  const value = Number(text);
  const size = Math.abs(value);
  if (size >= 1e-3 && size < 1e6) return { mantissa: group(plainText(text)), exponent: null };
  const figures = text.replace(/e.*$/, '').replace(/[-.]/g, '').replace(/^0+/, '');
  const significant = size >= 1e6 && !/[e.]/.test(text) ? figures.replace(/0+$/, '') || '0' : figures;
  const [digits = '0', power = '0'] = value.toExponential(Math.max(significant.length - 1, 0)).split('e');
  return { mantissa: digits.replace('-', MINUS), exponent: Number(power) };
}

/** `5.231e+4` written out. */
function plainText(text: string): string {
  return text.includes('e') ? String(Number(text)) : text;
}

/** Groups of three on the left of the point, from four figures on; thin spaces, never commas. */
function group(text: string): string {
  const [whole = '', fraction] = text.replace('-', MINUS).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, NUMBER_SPACE);
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}
