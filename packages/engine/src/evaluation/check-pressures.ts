import { serves } from '../quantity/dictionary.js';
import { formatNumber } from '../expression/number-text.js';
import type { Problem } from './outcome.js';
import type { Reckoner } from './reckoner.js';

/** Pressures of one constituent of the gas. */
const PARTS = ['log-mean-inert-pressure', 'partial-pressure-interface', 'partial-pressure-bulk'];
/** Room for the noise of a change of unit. */
const NOISE = 1 + 1e-9;

/** No constituent of a gas has more than the total pressure. What an equation fills has bounds of its own for that. */
export function checkPressures(reckoner: Reckoner, given: ReadonlyMap<string, number>): Problem[] {
  const quantities = [...reckoner.sheet.quantities.values()];
  const whole = quantities.find(({ definition }) => serves(definition.is, 'total-pressure'));
  const total =
    whole && reckoner.solve(whole.definition.symbol) ? reckoner.valueOf(whole.definition.symbol) : null;
  if (total === null) return [];
  return quantities.flatMap(({ definition: { symbol, is }, entry }): Problem[] => {
    const value = PARTS.includes(is) ? given.get(symbol) : undefined;
    return value === undefined || value <= total * NOISE
      ? []
      : [
          {
            code: 'domain',
            field: `inputs.${symbol}`,
            message: `${entry.title} is at most the total pressure, which is ${formatNumber(total / 1000)} kPa here.`,
          },
        ];
  });
}
