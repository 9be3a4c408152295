import type { DictionaryPart } from '../dictionary-entry.js';

/** States of the phase boundary and of moist air. */
export const interfaceStates: DictionaryPart = {
  'interface-temperature': {
    title: 'Temperature of the phase boundary',
    unit: 'K',
    usual: 'degC',
    symbol: 'T_i',
    sign: 'positive',
  },
  'relative-humidity': {
    title: 'Relative humidity',
    unit: '1',
    usual: '%',
    fraction: true,
    symbol: 'phi',
    sign: 'non-negative',
    hint: 'As a fraction of saturation over liquid water.',
  },
};
