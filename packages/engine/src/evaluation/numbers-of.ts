import { conversionStep } from '../basis/conversion-steps.js';
import { convertBasis, BASES, type CoefficientInSI, type FluidState } from '../basis/convert-basis.js';
import { fluidStateOf } from '../basis/fluid-state.js';
import { fluxFrom, type FluxLine, type ReadForce } from '../basis/flux.js';
import { symbolTex } from '../expression/symbol-tex.js';
import { numberTex } from '../expression/number-text.js';
import type { CompiledSheet } from '../sheet/compiled.js';
import type { Coefficient, CorrelationDefinition, Part } from '../sheet/definition.js';
import type { Work } from './reckon.js';
import { lineSteps, propertyStep, valueTex } from './explain.js';
import {
  COEFFICIENT_BASES,
  type CoefficientBasis,
  type Conversion,
  type EvaluationRequest,
  type Finding,
  type Numbers,
  type PartOutcome,
  type Problem,
  type Step,
} from './outcome.js';
import { filledValue } from './supplies.js';

type NumbersResult = { ok: true; numbers: Numbers } | { ok: false; problems: Problem[] };

/** Puts together everything an evaluation may show once it has passed the bounds. */
export function numbersOf(
  definition: CorrelationDefinition,
  sheet: CompiledSheet,
  work: Work,
  request: EvaluationRequest,
  force: ReadForce | null,
  findings: Finding[],
  remarks: string[],
): NumbersResult {
  const { reckoner, supplies } = work;
  const state = fluidStateOf(reckoner);
  const parts = definition.parts
    .filter(({ key }) => work.parts.has(key))
    .map((part) => partOutcome(definition, part, work, request.bases, state));
  const principal = parts.at(-1);
  if (!principal)
    return {
      ok: false,
      problems: [{ code: 'definition', field: 'parts', message: 'No part could be worked out.' }],
    };
  const flux = fluxOf(definition, work, force, state);
  if (flux && !flux.ok) return { ok: false, problems: [flux.problem] };
  const ofKind = (kind: string) =>
    [...sheet.lines].filter(([s, { line }]) => line.kind === kind && reckoner.has(s));
  return {
    ok: true,
    numbers: {
      groups: Object.fromEntries(ofKind('group').map(([symbol]) => [symbol, reckoner.valueOf(symbol)])),
      intermediates: Object.fromEntries(
        ofKind('intermediate').map(([s, { unit }]) => [
          s,
          { value: reckoner.shownValueOf(s), unit: unit.text },
        ]),
      ),
      result: principal.result,
      coefficient: principal.coefficient,
      conversions: principal.conversions,
      parts,
      flux: flux?.line.flux ?? null,
      findings,
      steps: [
        ...supplies.filled.map((filled) => propertyStep(sheet, filled)),
        ...lineSteps(reckoner),
        ...definition.parts.flatMap((part) => conversionSteps(definition, part, work, parts, state)),
        ...(flux ? [fluxStep(flux.line)] : []),
      ],
      equations: supplies.filled.map((filled) => ({
        symbol: filled.symbol,
        key: filled.equation.key,
        title: filled.equation.definition.title,
        ...filledValue(sheet, filled),
        ...(filled.equation.definition.assumes ? { assumes: filled.equation.definition.assumes } : {}),
      })),
      rows: Object.fromEntries(supplies.rows),
      remarks: [...remarks, ...lackingRemarks(work)],
    },
  };
}

function lackingRemarks({ lacking }: Work): string[] {
  return [...lacking].map(
    ([title, missing]) => `${title} is left out: ${[...missing].join(', ')} not given.`,
  );
}

function partOutcome(
  definition: CorrelationDefinition,
  part: Part,
  work: Work,
  bases: CoefficientBasis[] | undefined,
  state: FluidState,
): PartOutcome {
  const { reckoner } = work;
  const { result, coefficient } = part;
  const solved = coefficient && reckoner.has(coefficient.symbol) ? coefficient : null;
  const inSI = coefficientInSI(definition, part, work);
  return {
    key: part.key,
    title: part.title,
    result: { symbol: result.symbol, value: reckoner.shownValueOf(result.symbol), unit: result.unit },
    coefficient: solved
      ? {
          symbol: solved.symbol,
          value: reckoner.shownValueOf(solved.symbol),
          unit: solved.unit,
          basis: solved.basis,
          per: solved.per,
          rateForm: solved.rateForm,
        }
      : null,
    conversions: inSI ? conversionsOf(inSI, coefficient?.symbol ?? result.symbol, bases, state) : [],
  };
}

/** The coefficient of a part in SI; a result that is itself a coefficient counts as on concentration. */
function coefficientInSI(definition: CorrelationDefinition, part: Part, work: Work): CoefficientInSI | null {
  const read = readingOf(part);
  if (!read || !work.reckoner.has(read.symbol)) return null;
  const { basis, per, rateForm } = read;
  return {
    value: work.reckoner.valueOf(read.symbol),
    basis,
    per,
    rateForm,
    phase: phaseOf(definition, part, work),
  };
}

/**
 * The phase of a part. On a sheet for gas or liquid the property equations in use tell it; else a pressure is taken
 * to mean a gas and a molar mass of the solvent a liquid. Null where nothing tells.
 */
function phaseOf({ phase }: CorrelationDefinition, part: Part, { reckoner, supplies }: Work): Phase | null {
  if (part.phase) return part.phase;
  if (phase === 'gas' || phase === 'liquid') return phase;
  for (const { equation } of supplies.filled)
    for (const told of ['gas', 'liquid'] as const)
      if (equation.definition.gives.startsWith(`${told}-`)) return told;
  const { pressure, molarMass } = fluidStateOf(reckoner);
  if (pressure !== null) return 'gas';
  return molarMass === null ? null : 'liquid';
}

type Phase = CoefficientInSI['phase'];
type Reading = Pick<Coefficient, 'symbol' | 'basis' | 'per' | 'rateForm'>;

function readingOf({ result, coefficient }: Part): Reading | null {
  if (coefficient) return coefficient;
  const common = { symbol: result.symbol, basis: 'concentration', rateForm: 'dilute-or-equimolar' } as const;
  if (result.kind === 'coefficient') return { ...common, per: 'area' };
  if (result.kind === 'volumetric-coefficient') return { ...common, per: 'volume' };
  return null;
}

function conversionSteps(
  definition: CorrelationDefinition,
  part: Part,
  work: Work,
  outcomes: readonly PartOutcome[],
  state: FluidState,
): Step[] {
  const outcome = outcomes.find(({ key }) => key === part.key);
  const inSI = coefficientInSI(definition, part, work);
  if (!outcome || !inSI) return [];
  const own = readingOf(part)?.symbol ?? part.result.symbol;
  return outcome.conversions.flatMap(
    (conversion) => conversionStep(part.title, own, inSI, state, conversion) ?? [],
  );
}

function conversionsOf(
  from: CoefficientInSI,
  own: string,
  bases: CoefficientBasis[] | undefined,
  state: FluidState,
): Conversion[] {
  const wanted = bases ?? COEFFICIENT_BASES.filter((basis) => BASES[basis].phase === from.phase);
  return wanted
    .map((basis) => convertBasis(from, basis, state))
    .filter(({ symbol }) => bases !== undefined || symbol !== own);
}

function fluxOf(definition: CorrelationDefinition, work: Work, force: ReadForce | null, state: FluidState) {
  const principal = definition.parts.filter(({ key }) => work.parts.has(key)).at(-1);
  const inSI = principal ? coefficientInSI(definition, principal, work) : null;
  if (!force) return null;
  if (!inSI)
    return {
      ok: false as const,
      problem: {
        code: 'missing' as const,
        field: 'drivingForce',
        message: 'There is no coefficient here for a flux to be made from.',
      },
    };
  return fluxFrom(inSI, force, state);
}

function fluxStep({ flux, coefficient, coefficientSymbol, difference }: FluxLine): Step {
  const k = symbolTex(coefficientSymbol);
  const letter = { concentration: 'c', 'partial-pressure': 'p', 'mole-fraction': 'y' }[flux.basis];
  return {
    kind: 'flux',
    symbol: 'N_A',
    symbolTex: 'N_A',
    tex: `N_A = ${k}\\,(${letter}_{A,i} - ${letter}_{A,b})`,
    texWithNumbers: `N_A = ${numberTex(coefficient)} \\times ${numberTex(difference)} = ${valueTex(flux.value, flux.unit)}`,
    value: flux.value,
    unit: flux.unit,
    note: 'Flux from the interface into the bulk',
  };
}
