import type { DictionaryPart } from '../dictionary-entry.js';

/** Arrays of nozzles, stirred cells and coiled tubes. */
export const jetsAndCoils: DictionaryPart = {
  'slot-width': {
    title: 'Width of the slot nozzle',
    unit: 'm',
    usual: 'mm',
    symbol: 'B',
    sign: 'positive',
    hint: 'The hydraulic diameter is twice the width.',
  },
  'slot-pitch': { title: 'Pitch of the slots', unit: 'm', usual: 'mm', symbol: 'S', sign: 'positive' },
  'surface-per-nozzle': {
    title: 'Surface served by one nozzle',
    unit: 'm^2',
    symbol: 'A_n',
    sign: 'positive',
    hint: 'Pitch squared for a square array.',
  },
  'cell-radius': {
    title: 'Radius of the stirred cell',
    unit: 'm',
    usual: 'mm',
    symbol: 'r_c',
    sign: 'positive',
    hint: 'The radius of the membrane, not its diameter.',
  },
  'coil-diameter': {
    title: 'Mean diameter of the coil',
    unit: 'm',
    usual: 'mm',
    symbol: 'd_c',
    sign: 'positive',
    hint: 'Of curvature: somewhat more than the winding diameter where the pitch is large.',
  },
};
