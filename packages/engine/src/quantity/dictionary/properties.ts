import type { DictionaryPart } from '../dictionary-entry.js';

/** Fluid properties. */
export const properties: DictionaryPart = {
  'gas-density': { title: 'Gas density', unit: 'kg/m^3', symbol: 'rho', sign: 'positive' },
  'liquid-density': {
    title: 'Liquid density',
    unit: 'kg/m^3',
    symbol: 'rho',
    sign: 'positive',
  },
  'fluid-density': {
    title: 'Fluid density',
    unit: 'kg/m^3',
    symbol: 'rho',
    sign: 'positive',
    covers: ['gas-density', 'liquid-density'],
  },
  'gas-viscosity': {
    title: 'Gas viscosity',
    unit: 'Pa s',
    symbol: 'mu',
    sign: 'positive',
    hint: 'Dynamic viscosity.',
  },
  'liquid-viscosity': {
    title: 'Liquid viscosity',
    unit: 'Pa s',
    usual: 'mPa s',
    symbol: 'mu',
    sign: 'positive',
    hint: 'Dynamic viscosity.',
  },
  'fluid-viscosity': {
    title: 'Fluid viscosity',
    unit: 'Pa s',
    usual: 'mPa s',
    symbol: 'mu',
    sign: 'positive',
    hint: 'Dynamic viscosity.',
    covers: ['gas-viscosity', 'liquid-viscosity'],
  },
  'gas-diffusivity': {
    title: 'Diffusivity of the transferred species in the gas',
    unit: 'm^2/s',
    symbol: 'D',
    sign: 'positive',
  },
  'liquid-diffusivity': {
    title: 'Diffusivity of the transferred species in the liquid',
    unit: 'm^2/s',
    symbol: 'D',
    sign: 'positive',
  },
  'fluid-diffusivity': {
    title: 'Diffusivity of the transferred species in the fluid',
    unit: 'm^2/s',
    symbol: 'D',
    sign: 'positive',
    covers: ['gas-diffusivity', 'liquid-diffusivity'],
  },
  'surface-tension': {
    title: 'Surface tension of the liquid',
    unit: 'N/m',
    usual: 'mN/m',
    symbol: 'sigma',
    sign: 'positive',
  },
  'critical-surface-tension': {
    title: 'Critical surface tension of the packing material',
    unit: 'N/m',
    usual: 'mN/m',
    symbol: 'sigma_c',
    sign: 'positive',
  },
  'solvent-molar-mass': {
    title: 'Molar mass of the solvent',
    unit: 'kg/mol',
    usual: 'g/mol',
    symbol: 'M_S',
    sign: 'positive',
    hint: 'Of the liquid that carries the species: 18 g/mol for water.',
  },
};
