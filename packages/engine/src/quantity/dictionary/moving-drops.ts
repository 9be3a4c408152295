import type { DictionaryPart } from '../dictionary-entry.js';

/** Drops, bubbles and spheres: constants that go with a state, and what happens inside a drop. */
export const movingDrops: DictionaryPart = {
  'contact-time': { title: 'Contact time', unit: 's', symbol: 't', sign: 'positive' },
  'dispersed-diffusivity': {
    title: 'Diffusivity of the transferred species in the drop',
    unit: 'm^2/s',
    symbol: 'D_d',
    sign: 'positive',
    hint: 'The molecular value; an enhancement is a factor of its own.',
  },
  'dispersed-viscosity': {
    title: 'Viscosity of the drop liquid',
    unit: 'Pa s',
    usual: 'mPa s',
    symbol: 'mu_d',
    sign: 'positive',
    hint: 'Dynamic viscosity.',
  },
  'dispersed-hold-up': {
    title: 'Hold-up of the dispersed phase',
    unit: '1',
    fraction: true,
    symbol: 'phi',
    sign: 'non-negative',
    hint: 'Volume of drops over the volume of both liquids.',
  },
  'drop-circulation-factor': {
    title: 'Factor on the diffusivity for circulation in the drop',
    unit: '1',
    symbol: 'f_c',
    sign: 'positive',
    hint: '1 rigid, 2.25 circulating.',
  },
  'bubble-crowd-constant': {
    title: 'Constant for a single bubble or a swarm',
    unit: '1',
    symbol: 'b',
    sign: 'positive',
  },
  'sphere-fluid-constant': {
    title: 'Constant for gas or liquid around the sphere',
    unit: '1',
    symbol: 'B',
    sign: 'positive',
  },
  'vapour-mass-fraction-surface': {
    title: 'Mass fraction of vapour at the surface',
    unit: '1',
    fraction: true,
    symbol: 'Y_s',
    sign: 'positive',
  },
  'vapour-mass-fraction-far': {
    title: 'Mass fraction of vapour far from the surface',
    unit: '1',
    fraction: true,
    symbol: 'Y_inf',
    sign: 'non-negative',
  },
};
