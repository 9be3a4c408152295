import type { CompiledCorrelation, PropertyLibrary } from '../sheet/compiled.js';
import { fluidStateOf } from '../basis/fluid-state.js';
import { readDrivingForce, type ReadForce } from '../basis/flux.js';
import { checkDeviationForm, checkDeviationTargets, coveringDeviations } from './check-deviations.js';
import { checkPressures } from './check-pressures.js';
import { checkOverDetermined } from './check-over-determined.js';
import { findingsOf } from './findings-of.js';
import { readInputs, type GivenValues } from './given-values.js';
import { missingProblems } from './missing-problems.js';
import { numbersOf } from './numbers-of.js';
import {
  COEFFICIENT_BASES,
  PROVISIONAL,
  type Evaluation,
  type EvaluationRequest,
  type Finding,
  type Outcome,
  type Problem,
  type RefusalCode,
} from './outcome.js';
import { reckon, type Work } from './reckon.js';
import { checkChoices } from './supplies.js';

/**
 * Evaluates a correlation for a duty: resolves the inputs, computes the groups, holds them against the bounds, and
 * only then gives numbers. Outside a bound there is a refusal, unless each finding is one of data within reach and
 * is covered by a reasoned deviation.
 */
export function evaluate(
  compiled: CompiledCorrelation,
  request: EvaluationRequest,
  library: PropertyLibrary,
): Evaluation {
  const { sheet } = compiled;
  const inputs = readInputs(sheet, request, library);
  const force = request.drivingForce ? readDrivingForce(request.drivingForce) : { force: null, problems: [] };
  const problems = [
    ...inputs.problems,
    ...checkChoices(sheet, request, library),
    ...checkOverDetermined(sheet, request),
    ...checkDeviationForm(request),
    ...checkBases(request),
    ...force.problems,
  ];
  if (problems.length > 0) return { ok: false, problems };
  const work = reckon(sheet, request, inputs.values, library);
  if (work.missing.size > 0)
    return { ok: false, problems: missingProblems(sheet, request, library, work.missing) };
  return decide(compiled, request, work, force.force, inputs);
}

function decide(
  { definition, sheet }: CompiledCorrelation,
  request: EvaluationRequest,
  work: Work,
  force: ReadForce | null,
  { values: given, remarks }: GivenValues,
): Evaluation {
  const { reckoner, supplies } = work;
  // The state of the fluid serves conversions only; asked for here, so that what fills it is held against its bounds too.
  fluidStateOf(reckoner);
  const pressures = checkPressures(reckoner, given);
  if (pressures.length > 0) return { ok: false, problems: pressures };
  const findings = findingsOf(reckoner, supplies.filled, work.parts);
  const outside = findings.filter(
    ({ kind }) => kind === 'outside' || kind === 'past-reach' || kind === 'between',
  );
  const impossible = outside.filter(({ nature }) => nature === 'physical');
  if (impossible.length > 0)
    return {
      ok: false,
      problems: impossible.map((f): Problem => ({
        code: 'domain',
        field: `inputs.${f.symbol}`,
        message: f.message,
      })),
    };
  const misplaced = checkDeviationTargets(request, findings);
  if (misplaced.length > 0) return { ok: false, problems: misplaced };
  const deviations = coveringDeviations(request, outside);
  if (deviations === null) return { ok: true, outcome: refusal(findings, outside) };
  if (reckoner.faults.length > 0) return { ok: false, problems: reckoner.faults };
  const numbers = numbersOf(definition, sheet, work, request, force, findings, remarks);
  if (!numbers.ok) return numbers;
  return { ok: true, outcome: mark(numbers.numbers, deviations, findings) };
}

function mark(
  numbers: Extract<ReturnType<typeof numbersOf>, { ok: true }>['numbers'],
  deviations: { symbol: string; reason: string }[],
  findings: readonly Finding[],
): Outcome {
  if (deviations.length > 0) return { outcome: 'deviating', mark: PROVISIONAL, deviations, ...numbers };
  const unchecked = findings.some(({ kind }) => kind === 'unchecked');
  return { outcome: unchecked ? 'unchecked' : 'within', ...numbers };
}

function refusal(findings: Finding[], outside: Finding[]): Outcome {
  return {
    outcome: 'refused',
    code: refusalCode(outside),
    findings,
    message: outside.map(({ message }) => message).join(' '),
  };
}

function refusalCode(outside: readonly Finding[]): RefusalCode {
  if (outside.some(({ kind }) => kind === 'past-reach')) return 'past-reach';
  return outside.some(({ kind }) => kind === 'between') ? 'between-pieces' : 'out-of-bounds';
}

function checkBases({ bases = [] }: EvaluationRequest): Problem[] {
  const known = new Set<string>(COEFFICIENT_BASES);
  return bases.flatMap((basis, i): Problem[] =>
    known.has(basis)
      ? []
      : [
          {
            code: 'malformed',
            field: `bases[${i}]`,
            message: `"${basis}" is not a basis; there are ${COEFFICIENT_BASES.join(', ')}.`,
          },
        ],
  );
}
