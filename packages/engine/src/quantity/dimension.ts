/** Exponents of the base units; an absent one is zero. The radian counts as a plain number. */
export type BaseUnit = 'kg' | 'm' | 's' | 'K' | 'mol' | 'A' | 'cd';
export type Dimension = Readonly<Partial<Record<BaseUnit, number>>>;

export const DIMENSIONLESS: Dimension = Object.freeze({});
const BASE: readonly BaseUnit[] = ['kg', 'm', 's', 'K', 'mol', 'A', 'cd'];
/** Exponents such as 1/3 come as doubles; closer than this they are the same. */
const SAME = 1e-9;

export function power(dimension: Dimension, exponent: number): Dimension {
  return combine(dimension, DIMENSIONLESS, (a) => a * exponent);
}

export function product(left: Dimension, right: Dimension): Dimension {
  return combine(left, right, (a, b) => a + b);
}

export function quotient(left: Dimension, right: Dimension): Dimension {
  return combine(left, right, (a, b) => a - b);
}

export function sameDimension(left: Dimension, right: Dimension): boolean {
  return BASE.every((unit) => Math.abs((left[unit] ?? 0) - (right[unit] ?? 0)) < SAME);
}

export function isDimensionless(dimension: Dimension): boolean {
  return sameDimension(dimension, DIMENSIONLESS);
}

/** In words for a message: `m^2/s`, `1` for none. */
export function dimensionText(dimension: Dimension): string {
  const part = (sign: 1 | -1): string[] =>
    BASE.filter((unit) => sign * (dimension[unit] ?? 0) > SAME).map((unit) => {
      const exponent = Math.abs(dimension[unit] ?? 0);
      return exponent === 1 ? unit : `${unit}^${Number(exponent.toFixed(4))}`;
    });
  const over = part(1);
  const under = part(-1);
  const top = over.length > 0 ? over.join(' ') : '1';
  if (under.length === 0) return top;
  return `${top}/${under.length > 1 ? `(${under.join(' ')})` : under[0]}`;
}

function combine(left: Dimension, right: Dimension, rule: (a: number, b: number) => number): Dimension {
  const result: Partial<Record<BaseUnit, number>> = {};
  for (const unit of BASE) {
    const exponent = rule(left[unit] ?? 0, right[unit] ?? 0);
    if (Math.abs(exponent) > SAME) result[unit] = exponent;
  }
  return result;
}
