import type { DictionaryPart } from '../dictionary-entry.js';

/** Stirred and sparged vessels, bubble columns, drops and bubbles in motion. */
export const dispersions: DictionaryPart = {
  'power-per-volume': {
    title: 'Power drawn per volume of liquid',
    unit: 'W/m^3',
    symbol: 'P_V',
    sign: 'positive',
    hint: 'Gassed power where gas is sparged; it is lower than the ungassed.',
  },
  'power-per-mass': {
    title: 'Mean power per mass of liquid',
    unit: 'W/kg',
    symbol: 'e_m',
    sign: 'positive',
    hint: 'Per mass, not per volume.',
  },
  'impeller-diameter': { title: 'Impeller diameter', unit: 'm', symbol: 'd_i', sign: 'positive' },
  'impeller-speed': {
    title: 'Impeller speed',
    unit: '1/s',
    usual: '1/min',
    symbol: 'N',
    sign: 'positive',
    hint: 'Revolutions per time, not radians.',
  },
  'tank-diameter': { title: 'Tank diameter', unit: 'm', symbol: 'd_T', sign: 'positive' },
  'column-diameter': { title: 'Column diameter', unit: 'm', symbol: 'd_c', sign: 'positive' },
  'gas-hold-up': {
    title: 'Gas hold-up as a fraction of the dispersion',
    unit: '1',
    fraction: true,
    symbol: 'eps_G',
    sign: 'positive',
  },
  'bubble-rise-velocity': {
    title: 'Terminal rise velocity of a bubble',
    unit: 'm/s',
    symbol: 'u_t',
    sign: 'positive',
    hint: 'About 0.25 m/s for bubbles of 2 to 5 mm in water.',
  },
  'ionic-strength': {
    title: 'Ionic strength of the liquid',
    unit: 'mol/m^3',
    usual: 'mol/l',
    symbol: 'I',
    sign: 'non-negative',
    hint: '0 for a liquid without electrolyte.',
  },
};
