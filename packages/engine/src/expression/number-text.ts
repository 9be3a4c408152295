/** A number in few significant digits, as plain text: `52 300`, `0.61`, `1.84e-5`. */
export function formatNumber(value: number, digits = 4): string {
  const { mantissa, exponent } = parts(value, digits);
  return exponent === null ? group(mantissa, '\u2009') : `${mantissa}e${exponent}`;
}

/** The same for TeX, with thin spaces and a power of ten. */
export function numberTex(value: number, digits = 4): string {
  const { mantissa, exponent } = parts(value, digits);
  if (exponent === null) return group(mantissa, '\\,');
  return `${mantissa}\\times 10^{${exponent}}`;
}

/** A value put into a formula: whole where it has few digits (101 325, 298.15), else in four. */
export function putInTex(value: number): { tex: string; compound: boolean } {
  const short = Math.abs(Number(value.toPrecision(6)) - value) <= 1e-12 * Math.abs(value);
  const tex = numberTex(value, short ? 6 : 4);
  return { tex, compound: tex.includes('times') || value < 0 };
}

/** Plain decimals from 0.001 to below a million, a power of ten outside. */
function parts(value: number, digits: number): { mantissa: string; exponent: number | null } {
  if (value === 0) return { mantissa: '0', exponent: null };
  if (!Number.isFinite(value)) return { mantissa: String(value), exponent: null };
  const [mantissa = '0', exponent = '0'] = value.toExponential(digits - 1).split('e');
  const power = Number(exponent);
  if (power < -3 || power >= 6) return { mantissa: trimmed(mantissa), exponent: power };
  return {
    mantissa: trimmed(Number(value.toPrecision(digits)).toFixed(Math.max(0, digits - 1 - power))),
    exponent: null,
  };
}

/** Constants such as 0.83 or 2.000 are shown without idle zeros. */
function trimmed(text: string): string {
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

function group(text: string, space: string): string {
  const [whole = '', fraction] = text.split('.');
  const grouped = /^-?\d{5,}$/.test(whole) ? whole.replace(/\B(?=(\d{3})+$)/g, space) : whole;
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}
