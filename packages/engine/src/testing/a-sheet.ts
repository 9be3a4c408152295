import type { EvaluationRequest, InputValue, Outcome, Problem } from '../evaluation/outcome.js';
import { evaluate } from '../evaluation/evaluate.js';
import { checkPropertyStructure, checkStructure } from '../sheet/check-structure.js';
import { compileCorrelation, compilePropertyEquation } from '../sheet/compile-sheet.js';
import type { CompiledCorrelation, CompiledEquation, PropertyLibrary } from '../sheet/compiled.js';
import type { Quantity } from '../sheet/common-schema.js';
import type { CorrelationDefinition, Part, PropertyEquationDefinition } from '../sheet/definition.js';

const source = {
  csl: { type: 'book', title: 'Made up for a test' },
  place: 'nowhere',
  read: 'memory',
} as const;

/** A check that needs next to nothing, for sheets whose checks are not the point. */
const check = {
  title: 'Identity',
  kind: 'computed',
  inputs: { Re: { value: 10000 }, Sc: { value: 1 } },
  expected: { Sh: { value: 0.023 * 10000 ** 0.83 } },
  tolerancePercent: 0.001,
} as const;

export const GAS_PART: Part = {
  key: 'gas-side',
  title: 'Gas side',
  result: { symbol: 'Sh', kind: 'Sherwood', unit: '1', expression: '0.023*Re^0.83*Sc^0.44' },
  coefficient: {
    symbol: 'k_g',
    unit: 'm/s',
    basis: 'concentration',
    per: 'area',
    rateForm: 'dilute-or-equimolar',
    expression: 'Sh*D/d',
  },
};

/** The same with the drift of the inert gas in the coefficient. */
export const STAGNANT_PART: Part = {
  ...GAS_PART,
  coefficient: {
    symbol: 'k_g',
    unit: 'm/s',
    basis: 'concentration',
    per: 'area',
    rateForm: 'stagnant-inert',
    expression: 'Sh*D/d*P/p_BM',
  },
};

/** A wetted-wall sheet in the manner of Gilliland and Sherwood, to be changed where a test needs it. */
export function aSheet(changes: Partial<CorrelationDefinition> = {}): CorrelationDefinition {
  return {
    format: 'merestone-sheet/1',
    title: 'Gas in a wetted tube',
    authors: ['Nobody'],
    year: 1934,
    geometry: 'wetted-wall',
    phase: 'gas',
    summary: 'A sheet for tests.',
    averaging: 'average',
    wall: 'constant-concentration',
    drivingForce: 'log-mean',
    propertyState: 'film',
    quantities: [
      { symbol: 'u', is: 'gas-velocity-relative-to-wall', unit: 'm/s', role: 'velocity' },
      { symbol: 'd', is: 'tube-inside-diameter', unit: 'm', role: 'characteristic-length' },
      { symbol: 'rho', is: 'gas-density', unit: 'kg/m^3', equations: ['ideal-density'] },
      { symbol: 'mu', is: 'gas-viscosity', unit: 'Pa s', equations: ['straight-viscosity'] },
      { symbol: 'D', is: 'gas-diffusivity', unit: 'm^2/s' },
      { symbol: 'T', is: 'gas-temperature', unit: 'K', role: 'state' },
      { symbol: 'P', is: 'total-pressure', unit: 'Pa', role: 'state' },
      { symbol: 'p_BM', is: 'log-mean-inert-pressure', unit: 'Pa', role: 'state' },
    ],
    groups: [
      { symbol: 'Re', name: 'Reynolds number', expression: 'rho*u*d/mu' },
      { symbol: 'Sc', name: 'Schmidt number', expression: 'mu/(rho*D)' },
    ],
    bounds: [
      {
        on: 'Re',
        basis: 'stated',
        stretches: [{ lo: { value: 2000, nature: 'regime' }, hi: { value: 35000, nature: 'data' } }],
      },
      {
        on: 'Sc',
        basis: 'stated',
        stretches: [{ lo: { value: 0.6, nature: 'data' }, hi: { value: 2.5, nature: 'data' } }],
      },
    ],
    parts: [GAS_PART],
    accuracy: null,
    restrictions: [],
    cautions: [],
    sources: [source],
    checks: [check],
    verification: { status: 'from-memory', note: 'For tests.' },
    ...changes,
  };
}

/** ρ = P M/(R T) of dry air, dimensions proved. */
export function idealDensity(changes: Partial<PropertyEquationDefinition> = {}): PropertyEquationDefinition {
  return {
    format: 'merestone-property/1',
    title: 'Ideal gas density of dry air',
    fluid: 'Dry air',
    gives: 'gas-density',
    unit: 'kg/m^3',
    assumes: 'The gas is dry air.',
    quantities: [
      { symbol: 'T', is: 'gas-temperature', unit: 'K' },
      { symbol: 'P', is: 'total-pressure', unit: 'Pa' },
      { symbol: 'M', is: 'molar-mass-carrier', unit: 'kg/mol', table: 'gas' },
    ],
    tables: [
      {
        name: 'gas',
        title: 'Gas',
        rows: [
          { key: 'air', label: 'Air', values: { M: 0.0289647 } },
          { key: 'helium', label: 'Helium', values: { M: 0.0040026 } },
        ],
      },
    ],
    bounds: [
      {
        on: 'T',
        basis: 'stated',
        stretches: [{ lo: { value: 200, nature: 'data' }, hi: { value: 400, nature: 'data' } }],
      },
    ],
    expression: 'P*M/(R*T)',
    accuracy: null,
    cautions: [],
    sources: [source],
    checks: [
      {
        title: 'Round',
        kind: 'computed',
        inputs: { T: { value: 300 }, P: { value: 100000 }, M: { value: 0.029 } },
        expected: { value: { value: 1.16265 } },
        tolerancePercent: 0.01,
      },
    ],
    verification: { status: 'from-memory', note: 'For tests.' },
    ...changes,
  };
}

/** A viscosity that is a straight line in °C, in the units of its formula. */
export function straightViscosity(
  changes: Partial<PropertyEquationDefinition> = {},
): PropertyEquationDefinition {
  return {
    ...idealDensity(),
    title: 'Viscosity of air, a straight line',
    gives: 'gas-viscosity',
    unit: 'uPa s',
    assumes: undefined,
    quantities: [{ symbol: 't', is: 'fluid-temperature', unit: 'degC' }],
    tables: undefined,
    bounds: [{ on: 't', basis: 'none', stretches: [] }],
    expression: '17.2 + 0.048*t',
    dimensional: true,
    checks: [
      {
        title: 'At zero',
        kind: 'computed',
        inputs: { t: { value: 0 } },
        expected: { value: { value: 17.2 } },
        tolerancePercent: 0.01,
      },
    ],
    ...changes,
  };
}

/** Passes the structure check and compiles, or throws with the problems. */
export function compiled(definition: CorrelationDefinition): CompiledCorrelation {
  const plain: unknown = JSON.parse(JSON.stringify(definition));
  const structure = checkStructure(plain);
  if (!structure.ok) throw new Error(problemText(structure.problems));
  const result = compileCorrelation(structure.definition);
  if (!result.ok) throw new Error(problemText(result.problems));
  return result.compiled;
}

export function compiledEquation(key: string, definition: PropertyEquationDefinition): CompiledEquation {
  const plain: unknown = JSON.parse(JSON.stringify(definition));
  const structure = checkPropertyStructure(plain);
  if (!structure.ok) throw new Error(problemText(structure.problems));
  const result = compilePropertyEquation(key, structure.definition);
  if (!result.ok) throw new Error(problemText(result.problems));
  return result.compiled;
}

/** What keeps the changed sheet from compiling. */
export function definitionProblems(changes: Partial<CorrelationDefinition>): Problem[] {
  const result = compileCorrelation(aSheet(changes));
  return result.ok ? [] : result.problems;
}

/** The one part of the sheet with its result changed. */
export function partWith(result: Partial<Part['result']>): Part {
  return { ...GAS_PART, result: { ...GAS_PART.result, ...result } };
}

/** The sheet's quantities with one of them changed. */
export function quantitiesWith(symbol: string, change: Partial<Quantity>): Quantity[] {
  return aSheet().quantities.map((q) => (q.symbol === symbol ? { ...q, ...change } : q));
}

function problemText(problems: readonly Problem[]): string {
  return problems.map(({ field, message }) => `${field}: ${message}`).join('\n');
}

export function libraryOf(equations: Record<string, PropertyEquationDefinition>): PropertyLibrary {
  const known = new Map(
    Object.entries(equations).map(([key, definition]) => [key, compiledEquation(key, definition)]),
  );
  return (slug) => known.get(slug);
}

export const LIBRARY = libraryOf({
  'ideal-density': idealDensity(),
  'straight-viscosity': straightViscosity(),
});

/** Inputs of the wetted-wall sheet: Re about 13 200, Sc 0.69. */
export const DUTY: Record<string, InputValue> = {
  u: { value: 8.72, unit: 'm/s' },
  d: { value: 0.0254, unit: 'm' },
  rho: { value: 1.147, unit: 'kg/m^3' },
  mu: { value: 1.92e-5, unit: 'Pa s' },
  D: { value: 2.42e-5, unit: 'm^2/s' },
};

/** A request on the usual duty, changed where a test needs it; an input set to null is left out. */
export function aRequest(
  inputs: Record<string, InputValue | null> = {},
  rest: Omit<EvaluationRequest, 'inputs'> = {},
): EvaluationRequest {
  const all = Object.entries<InputValue | null>({ ...DUTY, ...inputs });
  return {
    inputs: Object.fromEntries(all.flatMap(([symbol, input]) => (input ? [[symbol, input]] : []))),
    ...rest,
  };
}

/** Evaluates and gives the outcome, or throws with the problems. */
export function outcomeOf(
  sheet: CorrelationDefinition | CompiledCorrelation,
  request: EvaluationRequest,
  library: PropertyLibrary = LIBRARY,
): Outcome {
  const evaluation = evaluate('format' in sheet ? compiled(sheet) : sheet, request, library);
  if (!evaluation.ok) throw new Error(problemText(evaluation.problems));
  return evaluation.outcome;
}

/** The numbers of an outcome that has some; throws on a refusal. */
export function numbersOf(
  sheet: CorrelationDefinition | CompiledCorrelation,
  request: EvaluationRequest,
  library: PropertyLibrary = LIBRARY,
): Exclude<Outcome, { outcome: 'refused' }> {
  const outcome = outcomeOf(sheet, request, library);
  if (outcome.outcome === 'refused') throw new Error(outcome.message);
  return outcome;
}

/** The problems of a request, as pairs of code and field. */
export function problemsOf(
  sheet: CorrelationDefinition | CompiledCorrelation,
  request: EvaluationRequest,
  library: PropertyLibrary = LIBRARY,
): Problem[] {
  const evaluation = evaluate('format' in sheet ? compiled(sheet) : sheet, request, library);
  return evaluation.ok ? [] : evaluation.problems;
}
