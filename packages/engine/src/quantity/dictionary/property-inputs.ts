import type { DictionaryPart } from '../dictionary-entry.js';

/** What property equations are fed with, and properties at a second state. */
export const propertyInputs: DictionaryPart = {
  'fluid-viscosity-at-wall': {
    title: 'Viscosity of the fluid at the wall',
    unit: 'Pa s',
    symbol: 'mu_w',
    sign: 'positive',
    hint: 'Dynamic viscosity at wall temperature and composition.',
  },
  'density-difference': {
    title: 'Density difference that drives the motion',
    unit: 'kg/m^3',
    symbol: 'delta_rho',
    sign: 'non-negative',
    hint: 'Between surface and bulk, or between the phases: without sign.',
  },
  'reference-gas-diffusivity': {
    title: 'Tabulated diffusivity of the pair',
    unit: 'm^2/s',
    symbol: 'D_ref',
    sign: 'positive',
  },
  'reference-liquid-diffusivity': {
    title: 'Tabulated diffusivity of the solute',
    unit: 'm^2/s',
    symbol: 'D_ref',
    sign: 'positive',
  },
  'reference-liquid-viscosity': {
    title: 'Solvent viscosity at the temperature of the tabulated diffusivity',
    unit: 'Pa s',
    symbol: 'mu_ref',
    sign: 'positive',
  },
  'reference-temperature': {
    title: 'Temperature of the tabulated value',
    unit: 'K',
    symbol: 'T_ref',
    sign: 'positive',
  },
  'reference-pressure': {
    title: 'Pressure of the tabulated value',
    unit: 'Pa',
    symbol: 'P_ref',
    sign: 'positive',
  },
  'diffusion-volume-solute': {
    title: 'Diffusion volume of the transferred species',
    unit: 'm^3/mol',
    symbol: 'v_A',
    sign: 'positive',
    hint: 'The tabulated increment sum, not the molar volume.',
  },
  'diffusion-volume-carrier': {
    title: 'Diffusion volume of the carrier gas',
    unit: 'm^3/mol',
    symbol: 'v_B',
    sign: 'positive',
    hint: 'The tabulated increment sum, not the molar volume.',
  },
  'molar-mass-solute': {
    title: 'Molar mass of the transferred species',
    unit: 'kg/mol',
    symbol: 'M_A',
    sign: 'positive',
  },
  'molar-mass-carrier': {
    title: 'Molar mass of the carrier gas',
    unit: 'kg/mol',
    symbol: 'M_B',
    sign: 'positive',
  },
  'association-factor': {
    title: 'Association factor of the solvent',
    unit: '1',
    symbol: 'phi',
    sign: 'positive',
  },
  'solute-molar-volume': {
    title: 'Molar volume of the solute at its normal boiling point',
    unit: 'm^3/mol',
    symbol: 'V_A',
    sign: 'positive',
  },
  'hydrodynamic-radius': {
    title: 'Hydrodynamic radius of the solute',
    unit: 'm',
    symbol: 'r',
    sign: 'positive',
  },
};
