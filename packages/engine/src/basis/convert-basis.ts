import { MOLAR_GAS_CONSTANT as R } from '../quantity/constants.js';
import type { CoefficientBasis, Conversion } from '../evaluation/outcome.js';

/** A coefficient in SI with what says how to read it. */
export interface CoefficientInSI {
  value: number;
  basis: 'concentration' | 'partial-pressure' | 'mole-fraction';
  per: 'area' | 'volume';
  rateForm: 'dilute-or-equimolar' | 'stagnant-inert' | 'drift-free';
  /** Null where the sheet serves both and nothing tells which it is here. */
  phase: 'gas' | 'liquid' | null;
}

/** State of the fluid in SI, as far as it is known. */
export interface FluidState {
  temperature: number | null;
  pressure: number | null;
  inertPressure: number | null;
  liquidDensity: number | null;
  /** Of the liquid that carries the species. */
  molarMass: number | null;
}

/** Molar concentration of the liquid, ρ/M, mol/m³; null where it is not known. */
export function liquidConcentration({ liquidDensity, molarMass }: FluidState): number | null {
  return liquidDensity === null || molarMass === null ? null : liquidDensity / molarMass;
}

interface BasisRule {
  phase: 'gas' | 'liquid';
  unit: string;
  kind: 'concentration' | 'partial-pressure' | 'mole-fraction' | 'drift-free';
  words: string;
}

/** The bases and their coherent units per area. */
export const BASES: Readonly<Record<CoefficientBasis, BasisRule>> = {
  k_c: { phase: 'gas', unit: 'm/s', kind: 'concentration', words: 'on gas concentration' },
  k_G: { phase: 'gas', unit: 'mol/(m^2 s Pa)', kind: 'partial-pressure', words: 'on partial pressure' },
  k_y: { phase: 'gas', unit: 'mol/(m^2 s)', kind: 'mole-fraction', words: 'on gas mole fraction' },
  F: {
    phase: 'gas',
    unit: 'mol/(m^2 s)',
    kind: 'drift-free',
    words: 'free of the drift factor, for the logarithmic flux law',
  },
  k_L: { phase: 'liquid', unit: 'm/s', kind: 'concentration', words: 'on liquid concentration' },
  k_x: { phase: 'liquid', unit: 'mol/(m^2 s)', kind: 'mole-fraction', words: 'on liquid mole fraction' },
};

/** Units of a volumetric coefficient: per volume where the other is per area. */
export function basisUnit(basis: CoefficientBasis, per: 'area' | 'volume'): string {
  const { unit } = BASES[basis];
  if (per === 'area') return unit;
  return unit === 'm/s' ? '1/s' : unit.replace('m^2', 'm^3');
}

export function basisSymbol(basis: CoefficientBasis, per: 'area' | 'volume'): string {
  return per === 'area' ? basis : `${basis}a`;
}

/**
 * Puts a coefficient on another basis. Gases are ideal: k_c = k_G R T = k_y R T/P (k_y = k_G P);
 * liquids: k_x = k_L c. F = k_y p_BM/P for a coefficient through stagnant gas, and k_y itself for the low-flux one.
 * Source: R. E. Treybal, Mass-Transfer Operations, 3rd ed., Table 3.1 (from memory).
 */
export function convertBasis(from: CoefficientInSI, to: CoefficientBasis, state: FluidState): Conversion {
  const rule = BASES[to];
  const symbol = basisSymbol(to, from.per);
  const unit = basisUnit(to, from.per);
  const missing = missingState(from, to, state);
  if (missing.length > 0) return { basis: to, symbol, value: null, unit, missing };
  const conversion = {
    basis: to,
    symbol,
    unit,
    missing: [],
    value: rule.phase === 'gas' ? gasValue(from, to, state) : liquidValue(from, to, state),
  };
  if (to === 'F' && from.rateForm === 'dilute-or-equimolar')
    return { ...conversion, assumes: 'the coefficient is the low-flux one, for which F = k_y' };
  return conversion;
}

function missingState(from: CoefficientInSI, to: CoefficientBasis, state: FluidState): string[] {
  if (from.phase === null) return ['whether the fluid is a gas or a liquid'];
  if (BASES[to].phase !== from.phase) return ['another phase'];
  const missing: string[] = [];
  const kind = BASES[to].kind;
  if (from.phase === 'liquid') {
    return kind === from.basis ? [] : lackingOfLiquid(state);
  }
  const needs = needOf(from, kind);
  if (needs.temperature && state.temperature === null) missing.push('gas temperature');
  if (needs.pressure && state.pressure === null) missing.push('total pressure');
  if (needs.inert && state.inertPressure === null) missing.push('log-mean inert pressure');
  return missing;
}

/** What a concentration of the liquid is still made from. */
function lackingOfLiquid({ liquidDensity, molarMass }: FluidState): string[] {
  return [
    ...(liquidDensity === null ? ['liquid density'] : []),
    ...(molarMass === null ? ['molar mass of the solvent'] : []),
  ];
}

function needOf(from: CoefficientInSI, kind: BasisRule['kind']) {
  const target = kind === 'drift-free' ? 'mole-fraction' : kind;
  const pair = new Set([from.basis, target]);
  const drift = (kind === 'drift-free') !== (from.rateForm === 'drift-free');
  const inert = drift && (from.rateForm === 'stagnant-inert' || from.rateForm === 'drift-free');
  return {
    temperature: pair.size > 1 && pair.has('concentration'),
    pressure: (pair.size > 1 && pair.has('mole-fraction')) || inert,
    inert,
  };
}

/** By way of k_y, which all others are simple multiples of. */
function gasValue(from: CoefficientInSI, to: CoefficientBasis, state: FluidState): number {
  const { kind } = BASES[to];
  const drift = (state.pressure ?? 1) / (state.inertPressure ?? state.pressure ?? 1);
  const through = from.rateForm === 'drift-free' && kind !== 'drift-free' ? drift : 1;
  const back = from.rateForm === 'stagnant-inert' && kind === 'drift-free' ? 1 / drift : 1;
  if (kind === from.basis) return from.value * through;
  const onMoleFraction = from.value * toMoleFraction(from.basis, state) * through * back;
  const target = kind === 'drift-free' ? 'mole-fraction' : kind;
  if (target === from.basis) return from.value * through * back;
  return onMoleFraction / toMoleFraction(target, state);
}

function toMoleFraction(basis: CoefficientInSI['basis'], { temperature, pressure }: FluidState): number {
  if (basis === 'mole-fraction') return 1;
  // Without a pressure only the ratio of concentration and partial pressure is asked for, and it cancels.
  const p = pressure ?? 1;
  return basis === 'partial-pressure' ? p : p / (R * (temperature ?? Number.NaN));
}

function liquidValue(from: CoefficientInSI, to: CoefficientBasis, state: FluidState): number {
  const { kind } = BASES[to];
  if (kind === from.basis) return from.value;
  const c = liquidConcentration(state) ?? Number.NaN;
  return kind === 'mole-fraction' ? from.value * c : from.value / c;
}
