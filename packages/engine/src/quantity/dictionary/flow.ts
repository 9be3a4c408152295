import type { DictionaryPart } from '../dictionary-entry.js';

/** Velocities, rates and powers. */
export const flow: DictionaryPart = {
  'gas-velocity-relative-to-wall': {
    title: 'Mean gas velocity relative to the wall',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Relative to the tube wall, not to the moving film.',
  },
  'mean-velocity-in-tube': { title: 'Mean velocity in the tube', unit: 'm/s', symbol: 'u', sign: 'positive' },
  'liquid-superficial-mass-velocity': {
    title: 'Superficial mass velocity of the liquid',
    unit: 'kg/(m^2 s)',
    symbol: 'L',
    sign: 'positive',
    hint: 'Mass flow over the empty cross-section.',
  },
  'gas-superficial-mass-velocity': {
    title: 'Superficial mass velocity of the gas',
    unit: 'kg/(m^2 s)',
    symbol: 'G',
    sign: 'positive',
    hint: 'Mass flow over the empty cross-section.',
  },
  'superficial-gas-velocity': {
    title: 'Superficial gas velocity',
    unit: 'm/s',
    symbol: 'u_G',
    sign: 'positive',
    hint: 'Gas volume flow over the empty cross-section.',
  },
  'superficial-liquid-velocity': {
    title: 'Superficial liquid velocity',
    unit: 'm/s',
    symbol: 'u_L',
    sign: 'positive',
    hint: 'Liquid volume flow over the empty cross-section.',
  },
  'superficial-fluid-velocity': {
    title: 'Superficial velocity',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Volume flow over the empty cross-section, not the velocity between the particles.',
    covers: ['superficial-gas-velocity', 'superficial-liquid-velocity'],
  },
};
