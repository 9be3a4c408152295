import type { CoefficientValue, Part } from '@merestone/engine';

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

/** What a result is that the source gives as such, with no coefficient made from it. */
export const RESULT_MEANT: Readonly<Partial<Record<Part['result']['kind'], string>>> = {
  coefficient: 'as the source gives it: on a concentration difference, per unit area; low-flux form',
  'volumetric-coefficient':
    'as the source gives it: on a concentration difference, per unit volume; low-flux form',
  'interfacial-area': 'area of the interface per unit volume',
};

/** What a coefficient is meant with: its driving force, its reference and its rate form. */
export function coefficientWords({
  basis,
  per,
  rateForm,
}: Pick<CoefficientValue, 'basis' | 'per' | 'rateForm'>): string {
  return `${BASIS[basis]}, ${PER[per]}; ${RATE_FORM[rateForm]}`;
}
