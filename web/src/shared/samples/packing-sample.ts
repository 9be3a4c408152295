import type { CorrelationDefinition } from '@merestone/engine';
import { gillilandSherwood } from './gilliland-sherwood';

/**
 * A sheet with a table and an area as its result: Onda, Takeuchi and Okumoto, J. Chem. Eng. Japan 1 (1968) 56,
 * wetted area only. Constants from memory; packing data are common practice, no source.
 */
export const wettedArea: CorrelationDefinition = {
  ...gillilandSherwood,
  title: 'Wetted area of a random packing',
  authors: ['Onda', 'Takeuchi', 'Okumoto'],
  year: 1968,
  geometry: 'packed-column',
  phase: 'liquid',
  summary: 'Area of a random packing that is wetted by the running liquid.',
  quantities: [
    { symbol: 'L', is: 'liquid-superficial-mass-velocity', unit: 'kg/(m^2 s)' },
    { symbol: 'rho', is: 'liquid-density', unit: 'kg/m^3' },
    { symbol: 'mu', is: 'liquid-viscosity', unit: 'Pa s' },
    { symbol: 'sigma', is: 'surface-tension', unit: 'N/m' },
    { symbol: 'a_t', is: 'packing-specific-surface', unit: '1/m', table: 'packing' },
    { symbol: 'sigma_c', is: 'critical-surface-tension', unit: 'N/m', table: 'packing' },
  ],
  tables: [
    {
      name: 'packing',
      title: 'Packing',
      rows: [
        {
          key: 'raschig-ceramic-25',
          label: 'Raschig rings, ceramic, 25 mm',
          values: { a_t: 190, sigma_c: 0.061 },
        },
        { key: 'pall-steel-25', label: 'Pall rings, steel, 25 mm', values: { a_t: 205, sigma_c: 0.075 } },
      ],
    },
  ],
  groups: [
    { symbol: 'Re', name: 'Reynolds number of the liquid', expression: 'L/(a_t*mu)' },
    { symbol: 'Fr', name: 'Froude number of the liquid', expression: 'L^2*a_t/(rho^2*g)' },
    { symbol: 'We', name: 'Weber number of the liquid', expression: 'L^2/(rho*sigma*a_t)' },
    { symbol: 'S', name: 'Ratio of surface tensions', expression: 'sigma_c/sigma' },
  ],
  bounds: ['Re', 'Fr', 'We', 'S'].map((on) => ({ on, stretches: [], basis: 'none' as const })),
  parts: [
    {
      key: 'wetted-area',
      title: 'Wetted area',
      result: {
        symbol: 'a_w',
        kind: 'interfacial-area',
        unit: '1/m',
        expression: 'a_t*(1-exp(-1.45*S^0.75*Re^0.1*Fr^(-0.05)*We^0.2))',
      },
      coefficient: null,
    },
  ],
  cautions: [],
  restrictions: [],
  checks: [
    {
      title: 'Water on rings',
      kind: 'computed',
      inputs: {
        L: { value: 5 },
        rho: { value: 998 },
        mu: { value: 0.001 },
        sigma: { value: 0.0728 },
      },
      rows: { packing: 'raschig-ceramic-25' },
      expected: { Re: { value: 26.3158 } },
      tolerancePercent: 0.01,
    },
  ],
};
