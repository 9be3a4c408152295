import type { Problem } from '../evaluation/outcome.js';
import { dimensionOf } from '../expression/dimension-of.js';
import { CONSTANTS } from '../quantity/constants.js';
import {
  DIMENSIONLESS,
  dimensionText,
  quotient,
  sameDimension,
  type Dimension,
} from '../quantity/dimension.js';
import { readUnit } from '../quantity/unit.js';
import type { Calculable } from './lines.js';
import type { ReadLine } from './read-formulas.js';

/**
 * Proves that every group is dimensionless and every other line has the unit it claims.
 * A fault names the surplus dimension. Dimensional formulas are taken at their word.
 */
export function checkDimensions(calculable: Calculable, lines: readonly ReadLine[]): Problem[] {
  const known = new Map<string, Dimension>(
    Object.entries(CONSTANTS).map(([symbol, { dimension }]) => [symbol, dimension]),
  );
  for (const { symbol, unit } of [...calculable.quantities, ...calculable.lines])
    known.set(symbol, dimensionOfUnit(unit));
  return lines.flatMap(({ line, formulas }) => {
    if (line.dimensional) return [];
    const claimed = dimensionOfUnit(line.unit);
    return formulas.flatMap(({ tree, path }): Problem[] => {
      const verdict = dimensionOf(tree, (symbol) => known.get(symbol) ?? DIMENSIONLESS);
      if (!verdict.ok)
        return [
          { code: 'dimension', field: path, message: `${line.symbol} does not close: ${verdict.reason}.` },
        ];
      if (sameDimension(verdict.dimension, claimed)) return [];
      return [
        {
          code: 'dimension',
          field: path,
          message: surplusText(line.symbol, line.unit, verdict.dimension, claimed),
        },
      ];
    });
  });
}

function surplusText(symbol: string, unit: string, found: Dimension, claimed: Dimension): string {
  const surplus = dimensionText(quotient(found, claimed));
  return unit === '1'
    ? `${symbol} is not dimensionless: ${surplus} is left over.`
    : `${symbol} should be in ${unit} but comes out in ${dimensionText(found)}: ${surplus} is left over.`;
}

function dimensionOfUnit(unit: string): Dimension {
  const reading = readUnit(unit);
  return reading.ok ? reading.unit.dimension : DIMENSIONLESS;
}
