import type { DictionaryPart } from '../dictionary-entry.js';

/** Streams, basins and open water. */
export const openSurfaces: DictionaryPart = {
  'stream-velocity': { title: 'Mean velocity of the stream', unit: 'm/s', symbol: 'U', sign: 'positive' },
  'water-depth': { title: 'Mean depth of the water', unit: 'm', symbol: 'H', sign: 'positive' },
  fetch: {
    title: 'Fetch',
    unit: 'm',
    symbol: 'X',
    sign: 'positive',
    hint: 'Length of water along the wind; the effective diameter of a basin.',
  },
  'air-drift-velocity': {
    title: 'Air velocity over the water',
    unit: 'm/s',
    symbol: 'u',
    sign: 'non-negative',
    hint: 'At the surface, indoors.',
  },
  'latent-heat': {
    title: 'Latent heat of vaporisation',
    unit: 'J/kg',
    usual: 'kJ/kg',
    symbol: 'Y',
    sign: 'positive',
    hint: 'At the temperature of the surface.',
  },
};
