import type { DictionaryPart } from '../dictionary-entry.js';

/** Lengths, areas and the shape of the apparatus. */
export const lengths: DictionaryPart = {
  'tube-inside-diameter': {
    title: 'Tube inside diameter',
    unit: 'm',
    usual: 'mm',
    symbol: 'd',
    sign: 'positive',
  },
  'tube-length': {
    title: 'Tube length',
    unit: 'm',
    symbol: 'L',
    sign: 'positive',
    hint: 'The length over which transfer takes place.',
  },
  'particle-diameter': {
    title: 'Particle diameter',
    unit: 'm',
    usual: 'mm',
    symbol: 'd_p',
    sign: 'positive',
    covers: ['particle-diameter-equal-surface', 'particle-diameter-equal-volume'],
  },
  'packing-specific-surface': {
    title: 'Dry specific surface of the packing',
    unit: '1/m',
    symbol: 'a_t',
    sign: 'positive',
  },
  'packing-nominal-size': {
    title: 'Nominal size of the packing',
    unit: 'm',
    usual: 'mm',
    symbol: 'd_p',
    sign: 'positive',
    hint: 'The size on the label, not a sphere-equivalent diameter.',
  },
};
