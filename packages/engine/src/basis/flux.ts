import { readValue, targetByName, type Target } from '../evaluation/given-values.js';
import type { CoefficientBasis, DrivingForce, Flux, Problem } from '../evaluation/outcome.js';
import { MOLAR_GAS_CONSTANT } from '../quantity/constants.js';
import { readUnit } from '../quantity/unit.js';
import { basisSymbol, convertBasis, type CoefficientInSI, type FluidState } from './convert-basis.js';

/** Mole fractions above this at the interface make the low-flux form err by more than a few per cent. */
const DILUTE = 0.05;
/** The p_BM used and the one of the driving force may differ by so much before it is said. */
const SAME_DRIFT = 0.01;

export interface ReadForce {
  kind: DrivingForce['kind'];
  interface: number;
  bulk: number;
}

/** Reads a driving force: both ends in one kind, with units of that kind. */
export function readDrivingForce(force: DrivingForce): { force: ReadForce | null; problems: Problem[] } {
  const ends = (['interface', 'bulk'] as const).map((end) =>
    readValue(force[end], forceTarget(force.kind, end), `drivingForce.${end}`),
  );
  const [at, bulk] = ends;
  if (at?.ok && bulk?.ok)
    return { force: { kind: force.kind, interface: at.value, bulk: bulk.value }, problems: [] };
  return { force: null, problems: ends.flatMap((end) => (end.ok ? [] : [end.problem])) };
}

function forceTarget(kind: DrivingForce['kind'], end: 'interface' | 'bulk'): Target {
  if (kind === 'partial-pressure') return targetByName(`partial-pressure-${end}`);
  const unit = readUnit(kind === 'concentration' ? 'mol/m^3' : '1');
  if (!unit.ok) throw new RangeError('a unit of the engine cannot be read');
  const title = kind === 'concentration' ? 'Concentration' : 'Mole fraction';
  return { unit: unit.unit, sign: 'non-negative', title, entry: null };
}

export interface FluxLine {
  flux: Flux;
  coefficientSymbol: string;
  coefficient: number;
  difference: number;
}

/** Flux = coefficient on the driving force's basis × difference, from interface to bulk. */
export function fluxFrom(
  coefficient: CoefficientInSI,
  force: ReadForce,
  state: FluidState,
): { ok: true; line: FluxLine } | { ok: false; problem: Problem } {
  const phase = coefficient.phase ?? phaseMeantBy(force.kind);
  if (phase === null)
    return fault(
      'missing',
      'It must be known whether the fluid is a gas or a liquid: give the total pressure of the gas, or the molar mass of the solvent.',
    );
  const basis = basisFor(force.kind, phase);
  if (!basis)
    return fault(
      'malformed',
      `A ${force.kind.replace('-', ' ')} difference has no coefficient in a liquid; use a concentration or mole fraction.`,
    );
  if (force.kind === 'mole-fraction' && Math.max(force.interface, force.bulk) > 1)
    return fault('domain', 'A mole fraction is at most 1.');
  if (
    force.kind === 'partial-pressure' &&
    Math.max(force.interface, force.bulk) > (state.pressure ?? Infinity)
  )
    return fault('domain', 'A partial pressure is at most the total pressure.');
  const converted = convertBasis({ ...coefficient, phase }, basis, state);
  if (converted.value === null)
    return fault(
      'missing',
      `For a flux on this driving force the ${converted.missing.join(' and the ')} must be known.`,
    );
  const difference = force.interface - force.bulk;
  return {
    ok: true,
    line: {
      coefficientSymbol: basisSymbol(basis, coefficient.per),
      coefficient: converted.value,
      difference,
      flux: {
        value: converted.value * difference,
        unit: coefficient.per === 'area' ? 'mol/(m^2 s)' : 'mol/(m^3 s)',
        basis: force.kind,
        warnings: driftWarnings({ ...coefficient, phase }, force, state),
      },
    },
  };
}

function fault(code: Problem['code'], message: string): { ok: false; problem: Problem } {
  return { ok: false, problem: { code, field: 'drivingForce', message } };
}

/** A partial pressure is of a gas; on concentrations k_c and k_L are one number. */
function phaseMeantBy(kind: DrivingForce['kind']): 'gas' | null {
  return kind === 'mole-fraction' ? null : 'gas';
}

function basisFor(kind: DrivingForce['kind'], phase: 'gas' | 'liquid'): CoefficientBasis | null {
  if (phase === 'liquid') return kind === 'concentration' ? 'k_L' : kind === 'mole-fraction' ? 'k_x' : null;
  return kind === 'concentration' ? 'k_c' : kind === 'partial-pressure' ? 'k_G' : 'k_y';
}

/** The drift of the inert gas belongs in once: said where it is left out, or where two p_BM disagree. */
function driftWarnings(coefficient: CoefficientInSI, force: ReadForce, state: FluidState): string[] {
  if (coefficient.phase !== 'gas') return [];
  const share = sharesOf(force, state);
  if (!share) return [];
  const [yi, yb] = share;
  const mean = logMean(1 - yi, 1 - yb);
  if (coefficient.rateForm === 'dilute-or-equimolar')
    return Math.max(yi, yb) > DILUTE
      ? [
          `The coefficient is the low-flux one and the mole fraction reaches ${Math.max(yi, yb).toPrecision(3)}: with stagnant inert gas the flux would be ${(1 / mean).toPrecision(3)} times as large. The drift factor is not applied here.`,
        ]
      : [];
  if (state.inertPressure === null || state.pressure === null) return [];
  const used = state.inertPressure / state.pressure;
  return Math.abs(used / mean - 1) > SAME_DRIFT
    ? [
        `p_BM/P is ${used.toPrecision(4)} in the coefficient, and ${mean.toPrecision(4)} by this driving force: make them agree.`,
      ]
    : [];
}

function sharesOf(force: ReadForce, { temperature, pressure }: FluidState): [number, number] | null {
  const scale = shareOf(force.kind, temperature, pressure);
  if (scale === null) return null;
  const [yi, yb] = [force.interface * scale, force.bulk * scale];
  return yi < 1 && yb < 1 ? [yi, yb] : null;
}

/** Factor from the driving force's own measure to a mole fraction of ideal gas. */
function shareOf(
  kind: DrivingForce['kind'],
  temperature: number | null,
  pressure: number | null,
): number | null {
  if (kind === 'mole-fraction') return 1;
  if (pressure === null) return null;
  if (kind === 'partial-pressure') return 1 / pressure;
  return temperature === null ? null : (MOLAR_GAS_CONSTANT * temperature) / pressure;
}

/** Logarithmic mean; the plain mean where the two ends agree, to which it tends. */
export function logMean(a: number, b: number): number {
  return Math.abs(a - b) <= 1e-6 * Math.abs(a) ? (a + b) / 2 : (a - b) / Math.log(a / b);
}
