import type { CslItem } from '@merestone/engine';

/*
 * A sheet as it stands in the form while somebody writes it. It mirrors the definition member by member, so that a
 * path in the definition names the same place here; but every value is the text that was typed, and nothing has to
 * be complete or right.
 */

/** What every row of a list carries: a name of its own, so that it stays the same row when others move. */
export interface Row {
  id: string;
}

export interface QuantityRow extends Row {
  symbol: string;
  is: string;
  unit: string;
  tex: string;
  role: string;
  at: string;
  meaning: string;
  equations: string[];
  table: string;
}

export interface TableRowForm extends Row {
  key: string;
  label: string;
  values: { symbol: string; text: string }[];
  note: string;
}
export interface TableForm extends Row {
  name: string;
  title: string;
  source: string;
  rows: TableRowForm[];
}

export interface GroupRow extends Row {
  symbol: string;
  name: string;
  expression: string;
  tex: string;
  note: string;
}

/** Whether a limit itself belongs to the range; empty leaves it to the format's default. */
export type Closing = '' | 'closed' | 'open';

export interface ConditionForm {
  on: string;
  lo: string;
  hi: string;
  loClosed: Closing;
  hiClosed: Closing;
}
export interface PieceForm extends Row {
  title: string;
  when: ConditionForm[];
  expression: string;
}
/** One expression, or pieces of one; what is not chosen stays typed. */
export interface FormulaForm {
  inPieces: boolean;
  expression: string;
  pieces: PieceForm[];
}

export interface IntermediateRow extends Row, FormulaForm {
  symbol: string;
  name: string;
  unit: string;
  tex: string;
  dimensional: boolean;
  note: string;
}

export interface EndForm {
  value: string;
  nature: string;
  closed: Closing;
  reach: string;
  beyond: string[];
}
export interface StretchForm extends Row {
  lo: EndForm;
  hi: EndForm;
}
export interface BoundRow extends Row {
  on: string;
  stretches: StretchForm[];
  basis: string;
  place: string;
  note: string;
}

export interface ResultForm extends FormulaForm {
  symbol: string;
  tex: string;
  kind: string;
  unit: string;
  dimensional: boolean;
}
export interface CoefficientForm {
  /** Whether a coefficient follows from the result at all. */
  present: boolean;
  symbol: string;
  tex: string;
  unit: string;
  basis: string;
  per: string;
  rateForm: string;
  expression: string;
}
export interface PartRow extends Row {
  key: string;
  title: string;
  phase: string;
  result: ResultForm;
  coefficient: CoefficientForm;
}

export interface AccuracyForm {
  /** Whether any accuracy is on record. */
  present: boolean;
  valuePercent: string;
  statistic: string;
  of: string;
  text: string;
}

export interface SourceRow extends Row {
  /** The citation as it came, with every member that the form has no field for. */
  kept: CslItem;
  type: string;
  title: string;
  /** One a line: `Family, Given`; a body in braces: `{Institute of …}`. */
  authors: string;
  issued: string;
  container: string;
  publisher: string;
  edition: string;
  volume: string;
  issue: string;
  page: string;
  doi: string;
  place: string;
  gives: string;
  read: string;
}

export interface ValueForm {
  symbol: string;
  value: string;
  unit: string;
}
export interface CheckRow extends Row {
  title: string;
  kind: string;
  source: string;
  inputs: ValueForm[];
  /** Chosen row by table. */
  rows: { name: string; key: string }[];
  /** Property equation by the symbol it fills. */
  equations: { symbol: string; slug: string }[];
  expected: ValueForm[];
  tolerancePercent: string;
  note: string;
}

export interface SentenceRow extends Row {
  text: string;
}

/** The lists of a sheet, by their name in the definition. */
export interface DraftLists {
  quantities: QuantityRow[];
  tables: TableForm[];
  groups: GroupRow[];
  intermediates: IntermediateRow[];
  bounds: BoundRow[];
  parts: PartRow[];
  restrictions: SentenceRow[];
  cautions: SentenceRow[];
  sources: SourceRow[];
  checks: CheckRow[];
}
export type ListName = keyof DraftLists;

/** What the sheet is, as single fields. */
export interface DraftHead {
  title: string;
  /** Surnames, separated by commas. */
  authors: string;
  year: string;
  geometry: string;
  phase: string;
  summary: string;
  averaging: string;
  wall: string;
  drivingForce: string;
  propertyState: string;
}

export interface DraftForm extends DraftLists {
  /** Name of a new sheet in the register; of a revision it is fixed. */
  slug: string;
  /** Whether somebody has written the slug; until then it follows the title. */
  slugTyped: boolean;
  head: DraftHead;
  accuracy: AccuracyForm;
  verification: { status: string; note: string };
}
