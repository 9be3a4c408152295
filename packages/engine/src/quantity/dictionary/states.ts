import type { DictionaryPart } from '../dictionary-entry.js';

/** Temperatures, pressures and compositions. */
export const states: DictionaryPart = {
  'gas-temperature': { title: 'Gas temperature', unit: 'K', usual: 'degC', symbol: 'T', sign: 'positive' },
  'liquid-temperature': {
    title: 'Liquid temperature',
    unit: 'K',
    usual: 'degC',
    symbol: 'T',
    sign: 'positive',
  },
  'fluid-temperature': {
    title: 'Fluid temperature',
    unit: 'K',
    usual: 'degC',
    symbol: 'T',
    sign: 'positive',
    covers: ['gas-temperature', 'liquid-temperature'],
  },
  'total-pressure': {
    title: 'Total pressure',
    unit: 'Pa',
    usual: 'kPa',
    symbol: 'P',
    sign: 'positive',
    absolutePressure: true,
    hint: 'Absolute, not gauge.',
  },
  'partial-pressure-interface': {
    title: 'Partial pressure of the transferred species at the interface',
    unit: 'Pa',
    usual: 'kPa',
    symbol: 'p_Ai',
    sign: 'non-negative',
  },
  'partial-pressure-bulk': {
    title: 'Partial pressure of the transferred species in the bulk gas',
    unit: 'Pa',
    usual: 'kPa',
    symbol: 'p_Ab',
    sign: 'non-negative',
  },
  'log-mean-inert-pressure': {
    title: 'Log-mean partial pressure of the inert gas',
    unit: 'Pa',
    usual: 'kPa',
    symbol: 'p_BM',
    sign: 'positive',
    hint: 'Over the film, from interface to bulk, of the gas that is not transferred.',
  },
};
