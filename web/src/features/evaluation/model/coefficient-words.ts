import type { CoefficientValue } from '@merestone/engine';

const BASIS = {
  concentration: 'on a concentration difference',
  'partial-pressure': 'on a partial-pressure difference',
  'mole-fraction': 'on a mole-fraction difference',
} as const;
const PER = { area: 'per unit area', volume: 'per unit volume' } as const;
const RATE_FORM = {
  'dilute-or-equimolar': 'low-flux form, for dilute or equimolar transfer',
  'stagnant-inert': 'through a stagnant inert gas, the drift factor included',
  'drift-free': 'free of drift, for the logarithmic flux law',
} as const;

/** What a coefficient is meant with: its driving force, its reference and its rate form. */
export function coefficientWords({
  basis,
  per,
  rateForm,
}: Pick<CoefficientValue, 'basis' | 'per' | 'rateForm'>): string {
  return `${BASIS[basis]}, ${PER[per]}; ${RATE_FORM[rateForm]}`;
}
