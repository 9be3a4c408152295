import type { BoundBasis, BoundNature } from '../sheet/common-schema.js';

/** A number as given by a person or a script. Without a unit it is in the symbol's own unit on the sheet. */
export interface InputValue {
  value: number;
  unit?: string | undefined;
}

/** The bases a coefficient can be put on. Of a volumetric coefficient each is meant times a. */
export const COEFFICIENT_BASES = ['k_c', 'k_G', 'k_y', 'F', 'k_L', 'k_x'] as const;
export type CoefficientBasis = (typeof COEFFICIENT_BASES)[number];

export interface DeviationRequest {
  /** Symbol of the finding it answers. */
  symbol: string;
  /** Why the sheet may be used outside the bound: at least 20 characters. */
  reason: string;
}

/** The difference that drives the transfer, from the phase boundary to the bulk. */
export interface DrivingForce {
  kind: 'concentration' | 'partial-pressure' | 'mole-fraction';
  interface: InputValue;
  bulk: InputValue;
}

export interface EvaluationRequest {
  /** By symbol: quantities, or groups in their place. */
  inputs: Record<string, InputValue>;
  /** Chosen row by table name. */
  rows?: Record<string, string> | undefined;
  /** Property equation by the symbol it fills. */
  equations?: Record<string, string> | undefined;
  /** Bases to convert to; all that the inputs allow when left out. */
  bases?: CoefficientBasis[] | undefined;
  deviations?: DeviationRequest[] | undefined;
  drivingForce?: DrivingForce | undefined;
}

export type FindingKind = 'within' | 'near' | 'outside' | 'past-reach' | 'between' | 'unchecked';

/** The result of holding one value against its bound. */
export interface Finding {
  /** Symbol on the sheet; of a property equation that fills `rho` from `T` it is `rho.T`. */
  symbol: string;
  kind: FindingKind;
  value: number | null;
  unit: string;
  /** Limits of the stretch concerned; of a gap, the ends of the stretches on its two sides. */
  lo: number | null;
  hi: number | null;
  loClosed: boolean;
  hiClosed: boolean;
  /** Nature of the limit that is concerned; null where none is. */
  nature: BoundNature | null;
  basis: BoundBasis;
  /** Value over the upper limit, or the lower limit over the value: how many times past the bound. */
  ratio: number | null;
  /** Whether a reasoned deviation may be recorded. */
  deviable: boolean;
  /** Sheets named as holding on the other side. */
  beyond: string[];
  /** One sentence a person can act on. */
  message: string;
}

export type StepKind =
  'quantity' | 'property' | 'group' | 'intermediate' | 'result' | 'coefficient' | 'conversion' | 'flux';

/** One numbered line of the written-out calculation. */
export interface Step {
  kind: StepKind;
  symbol: string;
  symbolTex: string;
  /** The formula in symbols. */
  tex: string;
  /** The same with the values put in. */
  texWithNumbers: string;
  value: number;
  unit: string;
  /** What the line is, in words; of a filled-in value also which equation gave it. */
  note?: string;
}

export interface ResultValue {
  symbol: string;
  value: number;
  unit: string;
}

export interface CoefficientValue {
  symbol: string;
  value: number;
  unit: string;
  basis: 'concentration' | 'partial-pressure' | 'mole-fraction';
  per: 'area' | 'volume';
  rateForm: 'dilute-or-equimolar' | 'stagnant-inert' | 'drift-free';
}

/** A coefficient on another basis, or what is missing to get it. */
export interface Conversion {
  basis: CoefficientBasis;
  symbol: string;
  value: number | null;
  unit: string;
  /** What must be known first, in words; empty when there is a value. */
  missing: string[];
  assumes?: string;
}

export interface Flux {
  value: number;
  unit: string;
  basis: DrivingForce['kind'];
  /** Cautions that belong to the number, such as a low-flux form at a high mole fraction. */
  warnings: string[];
}

export interface PartOutcome {
  key: string;
  title: string;
  result: ResultValue;
  coefficient: CoefficientValue | null;
  conversions: Conversion[];
}

export interface UsedEquation {
  /** The symbol that was filled. */
  symbol: string;
  key: string;
  value: number;
  unit: string;
  title: string;
  assumes?: string;
}

/** The words that travel with every number from outside a bound. */
export const PROVISIONAL = 'provisional, not for design';

export interface Numbers {
  /** The groups that the result, the coefficient or a bound needed, computed or given. */
  groups: Record<string, number>;
  intermediates: Record<string, { value: number; unit: string }>;
  /** Of the principal (last) part. */
  result: ResultValue;
  coefficient: CoefficientValue | null;
  conversions: Conversion[];
  parts: PartOutcome[];
  flux: Flux | null;
  findings: Finding[];
  steps: Step[];
  equations: UsedEquation[];
  rows: Record<string, string>;
  /** Remarks on what was assumed, such as the atmosphere under a gauge pressure. */
  remarks: string[];
}

export type RefusalCode = 'out-of-bounds' | 'past-reach' | 'between-pieces';

/** Never a number with a flag somebody can forget to read: a refusal has none. */
export type Outcome =
  | ({ outcome: 'within' } & Numbers)
  | ({ outcome: 'unchecked' } & Numbers)
  | ({ outcome: 'deviating'; mark: typeof PROVISIONAL; deviations: DeviationRequest[] } & Numbers)
  | { outcome: 'refused'; code: RefusalCode; findings: Finding[]; message: string };

/**
 * What keeps an input from being used.
 * `malformed`: not of the form asked for; `missing`, `unknown-symbol`, `over-determined`, `unit`: of the request;
 * `domain`: a value that cannot be, or at which the formula has no finite value.
 */
export type ProblemCode =
  | 'malformed'
  | 'missing'
  | 'unknown-symbol'
  | 'unknown-row'
  | 'unknown-equation'
  | 'over-determined'
  | 'unit'
  | 'domain'
  | 'expression'
  | 'definition'
  | 'dimension';

export interface Problem {
  code: ProblemCode;
  /** Path to the field, such as `inputs.u` or `groups.Re.expression`. */
  field: string;
  message: string;
}

export type Evaluation = { ok: true; outcome: Outcome } | { ok: false; problems: Problem[] };
