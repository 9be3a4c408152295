import {
  PROPERTY_FORMAT,
  SHEET_FORMAT,
  type CorrelationDefinition,
  type PropertyEquationDefinition,
} from '@merestone/engine';
import { SYSTEM_ACTOR } from '../../src/common/actor.js';
import { GeometriesService } from '../../src/geometries/geometries.service.js';
import type { TestApp } from './create-test-app.js';

const SOURCE = {
  csl: { type: 'book', title: 'Invented for tests' },
  place: 'nowhere',
  read: 'seen' as const,
};

/** Two geometries, so that a sheet can be put on the wrong one. */
export function addGeometries({ app }: TestApp): void {
  const geometry = (slug: string, name: string) => ({
    slug,
    name,
    summary: `${name}, for tests`,
    characteristicLength: 'diameter',
    velocity: 'mean velocity',
    cautions: ['Not for design.'],
  });
  app.get(GeometriesService).add(SYSTEM_ACTOR, [geometry('tube', 'Tube'), geometry('ball', 'Ball')]);
}

/**
 * Sh = 2 Re^0.5, for Re from 100 to 10 000 (data, reach 2), and no limit on record for Sc.
 * At Re = 400: Sh = 2 * 20 = 40.
 */
export function tubeSheet(overrides: Partial<CorrelationDefinition> = {}): CorrelationDefinition {
  return {
    format: SHEET_FORMAT,
    title: 'Tube, square-root law',
    authors: ['Nobody'],
    year: 2001,
    geometry: 'tube',
    phase: 'gas',
    summary: 'An invented law for tests of the register.',
    averaging: 'average',
    wall: 'not-stated',
    drivingForce: 'log-mean',
    propertyState: 'bulk',
    quantities: [
      { symbol: 'u', is: 'mean-velocity-in-tube', unit: 'm/s', role: 'velocity' },
      { symbol: 'd', is: 'tube-inside-diameter', unit: 'm', role: 'characteristic-length' },
      { symbol: 'rho', is: 'gas-density', unit: 'kg/m^3', equations: ['test-gas-density'] },
      { symbol: 'mu', is: 'gas-viscosity', unit: 'Pa s' },
      { symbol: 'D', is: 'gas-diffusivity', unit: 'm^2/s' },
      { symbol: 'T', is: 'gas-temperature', unit: 'K', role: 'state' },
      { symbol: 'P', is: 'total-pressure', unit: 'Pa', role: 'state' },
    ],
    groups: [{ symbol: 'Re', name: 'Reynolds number', expression: 'rho*u*d/mu' }],
    bounds: [
      {
        on: 'Re',
        stretches: [{ lo: { value: 100, nature: 'data' }, hi: { value: 10_000, nature: 'data' } }],
        basis: 'stated',
      },
    ],
    parts: [
      {
        key: 'main',
        title: 'Gas side',
        result: { symbol: 'Sh', kind: 'Sherwood', unit: '1', expression: '2*Re^0.5' },
        coefficient: {
          symbol: 'k_c',
          unit: 'm/s',
          basis: 'concentration',
          per: 'area',
          rateForm: 'dilute-or-equimolar',
          expression: 'Sh*D/d',
        },
      },
    ],
    accuracy: null,
    restrictions: [],
    cautions: ['Watch the inlet.'],
    sources: [SOURCE],
    checks: [
      {
        title: 'Re 400',
        kind: 'computed',
        inputs: { Re: { value: 400 } },
        expected: { Sh: { value: 40 } },
        tolerancePercent: 0.01,
      },
    ],
    verification: { status: 'expression-seen', note: 'Invented.' },
    ...overrides,
  };
}

/** rho = P M/(R T) of a gas of 0.029 kg/mol: 1.1931 kg/m^3 at 101 325 Pa and 296.15 K. */
export function gasDensity(overrides: Partial<PropertyEquationDefinition> = {}): PropertyEquationDefinition {
  return {
    format: PROPERTY_FORMAT,
    title: 'Ideal gas of 29 g/mol',
    fluid: 'Test gas',
    gives: 'gas-density',
    unit: 'kg/m^3',
    quantities: [
      { symbol: 'P', is: 'total-pressure', unit: 'Pa' },
      { symbol: 'T', is: 'gas-temperature', unit: 'K' },
    ],
    bounds: [
      {
        on: 'T',
        stretches: [{ lo: { value: 200, nature: 'data' }, hi: { value: 1000, nature: 'data' } }],
        basis: 'handbook',
      },
    ],
    expression: 'P*0.029/(R*T)',
    dimensional: true,
    accuracy: null,
    cautions: [],
    sources: [SOURCE],
    checks: [
      {
        title: 'Room',
        kind: 'computed',
        inputs: { P: { value: 101_325 }, T: { value: 296.15 } },
        expected: { value: { value: 1.19335 } },
        tolerancePercent: 0.1,
      },
    ],
    verification: { status: 'expression-seen', note: 'Invented.' },
    ...overrides,
  };
}

/** Inputs at which Re = 1.2 * 2 * 0.05 / 1.8e-5 = 6 666.7, within the bounds of the tube's sheet. */
export const TUBE_INPUTS = {
  u: { value: 2, unit: 'm/s' },
  d: { value: 5, unit: 'cm' },
  rho: { value: 1.2, unit: 'kg/m^3' },
  mu: { value: 1.8e-5, unit: 'Pa s' },
  D: { value: 2.4e-5, unit: 'm^2/s' },
} as const;
