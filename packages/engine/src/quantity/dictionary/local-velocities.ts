import type { DictionaryPart } from '../dictionary-entry.js';

/** Velocities, speeds and rates around channels, films and single bodies. */
export const localVelocities: DictionaryPart = {
  'free-stream-velocity': {
    title: 'Free-stream velocity',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Outside the boundary layer.',
  },
  'approach-velocity': {
    title: 'Approach velocity',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Undisturbed, ahead of the body.',
  },
  'slip-velocity': {
    title: 'Velocity relative to the particle, drop or bubble',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
  },
  'mean-velocity-in-channel': {
    title: 'Mean velocity in the channel',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Inside the open channel, not superficial.',
  },
  'mean-velocity-in-annulus': {
    title: 'Mean velocity in the annulus',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
  },
  'mean-velocity-in-fibre': {
    title: 'Mean velocity in the fibre bore',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
  },
  'shell-interstitial-velocity': {
    title: 'Interstitial velocity in the shell',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Over the free cross-section between the fibres.',
  },
  'spacer-channel-velocity': {
    title: 'Velocity in the free cross-section of the spacer-filled channel',
    unit: 'm/s',
    symbol: 'u',
    sign: 'positive',
    hint: 'Flow over width, height and void fraction.',
  },
  'film-rate-per-width': {
    title: 'Liquid rate per wetted perimeter',
    unit: 'kg/(m s)',
    offered: ['kg/(m s)', 'kg/(m h)', 'g/(cm s)'],
    symbol: 'Gamma',
    sign: 'positive',
    hint: 'Mass flow over the width of the film.',
  },
  'angular-speed': { title: 'Angular speed', unit: 'rad/s', usual: 'rpm', symbol: 'omega', sign: 'positive' },
  'peripheral-velocity': {
    title: 'Peripheral velocity of the rotor',
    unit: 'm/s',
    symbol: 'v',
    sign: 'positive',
    hint: 'Half the diameter times the angular speed.',
  },
  'nozzle-exit-velocity': {
    title: 'Mean velocity at the nozzle exit',
    unit: 'm/s',
    symbol: 'w',
    sign: 'positive',
  },
  'wind-speed': {
    title: 'Wind speed',
    unit: 'm/s',
    symbol: 'U',
    sign: 'positive',
    hint: 'At the height that the sheet names.',
  },
  'laminar-run-constant': {
    title: 'Constant for the laminar run ahead of transition',
    unit: '1',
    symbol: 'A',
    sign: 'non-negative',
    hint: 'Zero where the layer is tripped at the edge.',
  },
};
