import type { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';

/** Gilliland and Sherwood's wetted-wall correlation as the tests and the screens' own checks use it. */
export const gillilandSherwood: CorrelationDefinition = {
  format: 'merestone-sheet/1',
  title: 'Gas-side coefficient in a wetted-wall column',
  authors: ['Gilliland', 'Sherwood'],
  year: 1934,
  geometry: 'wetted-wall',
  phase: 'gas',
  summary:
    'Turbulent gas inside a vertical tube whose wall carries a falling liquid film; mean over the wetted height.',
  averaging: 'average',
  wall: 'constant-concentration',
  drivingForce: 'log-mean',
  propertyState: 'bulk',
  quantities: [
    { symbol: 'rho', is: 'gas-density', unit: 'kg/m^3', equations: ['ideal-gas-dry-air'] },
    { symbol: 'mu', is: 'gas-viscosity', unit: 'Pa s' },
    { symbol: 'p_BM', is: 'log-mean-inert-pressure', unit: 'Pa' },
    { symbol: 'D', is: 'gas-diffusivity', unit: 'm^2/s' },
    { symbol: 'u', is: 'gas-velocity-relative-to-wall', unit: 'm/s', role: 'velocity' },
    { symbol: 'P', is: 'total-pressure', unit: 'Pa' },
    { symbol: 'd', is: 'tube-inside-diameter', unit: 'm', role: 'characteristic-length' },
    { symbol: 'T', is: 'gas-temperature', unit: 'K', role: 'state' },
  ],
  groups: [
    {
      symbol: 'Re',
      name: 'Reynolds number',
      expression: 'rho*u*d/mu',
      note: "On the tube's inside diameter.",
    },
    { symbol: 'Sc', name: 'Schmidt number', expression: 'mu/(rho*D)' },
  ],
  bounds: [
    {
      on: 'Re',
      stretches: [
        {
          lo: { value: 2000, nature: 'regime', beyond: ['pipe-laminar'] },
          hi: { value: 35000, nature: 'data', reach: 2 },
        },
      ],
      basis: 'stated',
      place: 'p. 516, range of the runs',
    },
    {
      on: 'Sc',
      stretches: [{ lo: { value: 0.6, nature: 'data' }, hi: { value: 2.5, nature: 'data' } }],
      basis: 'handbook',
    },
  ],
  parts: [
    {
      key: 'gas-side',
      title: 'Gas side',
      result: { symbol: 'Sh', kind: 'Sherwood', unit: '1', expression: '0.023*Re^0.83*Sc^0.44' },
      coefficient: {
        symbol: 'k_c',
        unit: 'm/s',
        basis: 'concentration',
        per: 'area',
        rateForm: 'stagnant-inert',
        expression: 'Sh*D/d*P/p_BM',
      },
    },
  ],
  accuracy: null,
  restrictions: ['Smooth tube, not flooded; the film thin against the diameter.'],
  cautions: [
    'The factor p_BM/P belongs to the result. Leave it out only for a dilute vapour, and say so.',
    'Books differ on the velocity: relative to the wall here, relative to the film surface elsewhere.',
  ],
  sources: [
    {
      csl: {
        type: 'article-journal',
        title: 'Diffusion of Vapors into Air Streams',
        author: [
          { family: 'Gilliland', given: 'E. R.' },
          { family: 'Sherwood', given: 'T. K.' },
        ],
        issued: { 'date-parts': [[1934]] },
        'container-title': 'Industrial & Engineering Chemistry',
        volume: 26,
        issue: 5,
        page: '516-523',
      },
      place: 'p. 516',
      gives: 'Expression and ranges.',
      read: 'memory',
    },
  ],
  checks: [
    {
      title: 'Mid range, from the groups',
      kind: 'computed',
      inputs: { Re: { value: 10000 }, Sc: { value: 0.6 } },
      expected: { Sh: { value: 38.3808 } },
      tolerancePercent: 0.01,
    },
  ],
  verification: { status: 'from-memory', note: 'The paper itself has not been read for this sheet.' },
};

/** Density of dry air as an ideal gas, from molar mass 28.9647 g/mol (U.S. Standard Atmosphere 1976: 28.9644). */
export const idealGasDryAir: PropertyEquationDefinition = {
  format: 'merestone-property/1',
  title: 'Dry air as an ideal gas',
  fluid: 'dry air',
  gives: 'gas-density',
  unit: 'kg/m^3',
  assumes: 'dry air, ideal gas',
  quantities: [
    { symbol: 'P', is: 'total-pressure', unit: 'Pa' },
    { symbol: 'T', is: 'gas-temperature', unit: 'K' },
  ],
  bounds: [
    {
      on: 'T',
      stretches: [{ lo: { value: 200, nature: 'data' }, hi: { value: 500, nature: 'data' } }],
      basis: 'common-practice',
    },
  ],
  expression: 'P*0.0289647/(8.314462618*T)',
  dimensional: true,
  accuracy: null,
  cautions: [],
  sources: [
    {
      csl: {
        type: 'book',
        title: 'U.S. Standard Atmosphere',
        issued: { 'date-parts': [[1976]] },
        publisher: 'NOAA',
      },
      place: 'table 3',
      read: 'memory',
    },
  ],
  checks: [
    {
      title: 'Standard conditions',
      kind: 'published',
      source: 'U.S. Standard Atmosphere 1976: 1.2250 kg/m³ at 288.15 K and 101 325 Pa',
      inputs: { P: { value: 101325 }, T: { value: 288.15 } },
      expected: { value: { value: 1.225 } },
      tolerancePercent: 0.05,
    },
  ],
  verification: { status: 'from-memory', note: 'From the standard, as remembered.' },
};
