import { serves } from '../quantity/dictionary.js';
import type { Reckoner } from '../evaluation/reckoner.js';
import type { FluidState } from './convert-basis.js';

/** Reads temperature, pressures and the liquid's density off a sheet's quantities, by dictionary name. */
export function fluidStateOf(reckoner: Reckoner): FluidState {
  const find = (name: string): number | null => {
    for (const { definition } of reckoner.sheet.quantities.values())
      if (serves(definition.is, name) && reckoner.solve(definition.symbol))
        return reckoner.valueOf(definition.symbol);
    return null;
  };
  return {
    temperature: find('gas-temperature'),
    pressure: find('total-pressure'),
    inertPressure: find('log-mean-inert-pressure'),
    liquidDensity: find('liquid-density'),
    molarMass: find('solvent-molar-mass'),
  };
}
