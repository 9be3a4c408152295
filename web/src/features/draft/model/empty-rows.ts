import type {
  BoundRow,
  CheckRow,
  CoefficientForm,
  ConditionForm,
  DraftForm,
  DraftLists,
  EndForm,
  FormulaForm,
  GroupRow,
  IntermediateRow,
  ListName,
  PartRow,
  PieceForm,
  QuantityRow,
  SentenceRow,
  SourceRow,
  StretchForm,
  TableForm,
  TableRowForm,
} from './draft-form';

let rows = 0;

/** A name for a new row, unlike any other's in this page. */
export function newRowId(): string {
  rows += 1;
  return `row-${rows}`;
}

export function emptyQuantity(): QuantityRow {
  return {
    id: newRowId(),
    symbol: '',
    is: '',
    unit: '',
    tex: '',
    role: '',
    at: '',
    meaning: '',
    equations: [],
    table: '',
  };
}

export function emptyGroup(): GroupRow {
  return { id: newRowId(), symbol: '', name: '', expression: '', tex: '', note: '' };
}

export function emptyCondition(): ConditionForm {
  return { on: '', lo: '', hi: '', loClosed: '', hiClosed: '' };
}

export function emptyPiece(): PieceForm {
  return { id: newRowId(), title: '', when: [emptyCondition()], expression: '' };
}

function emptyFormula(): FormulaForm {
  return { inPieces: false, expression: '', pieces: [] };
}

export function emptyIntermediate(): IntermediateRow {
  return {
    id: newRowId(),
    symbol: '',
    name: '',
    unit: '',
    tex: '',
    dimensional: false,
    note: '',
    ...emptyFormula(),
  };
}

export function emptyEnd(): EndForm {
  return { value: '', nature: 'data', closed: '', reach: '', beyond: [] };
}

export function emptyStretch(): StretchForm {
  return { id: newRowId(), lo: emptyEnd(), hi: emptyEnd() };
}

export function emptyBound(): BoundRow {
  return { id: newRowId(), on: '', stretches: [emptyStretch()], basis: 'stated', place: '', note: '' };
}

export function emptyCoefficient(): CoefficientForm {
  return {
    present: true,
    symbol: '',
    tex: '',
    unit: '',
    basis: '',
    per: 'area',
    rateForm: '',
    expression: '',
  };
}

export function emptyPart(): PartRow {
  return {
    id: newRowId(),
    key: '',
    title: '',
    phase: '',
    result: { symbol: '', tex: '', kind: 'Sherwood', unit: '1', dimensional: false, ...emptyFormula() },
    coefficient: emptyCoefficient(),
  };
}

export function emptyTableRow(): TableRowForm {
  return { id: newRowId(), key: '', label: '', values: [], note: '' };
}

export function emptyTable(): TableForm {
  return { id: newRowId(), name: '', title: '', source: '', rows: [] };
}

export function emptySentence(): SentenceRow {
  return { id: newRowId(), text: '' };
}

export function emptySource(): SourceRow {
  return {
    id: newRowId(),
    kept: { type: 'article-journal' },
    type: 'article-journal',
    title: '',
    authors: '',
    issued: '',
    container: '',
    publisher: '',
    edition: '',
    volume: '',
    issue: '',
    page: '',
    doi: '',
    place: '',
    gives: '',
    read: '',
  };
}

export function emptyCheck(): CheckRow {
  return {
    id: newRowId(),
    title: '',
    kind: 'published',
    source: '',
    inputs: [],
    rows: [],
    equations: [],
    expected: [],
    tolerancePercent: '0.5',
    note: '',
  };
}

const EMPTY_ROWS: { readonly [L in ListName]: () => DraftLists[L][number] } = {
  quantities: emptyQuantity,
  tables: emptyTable,
  groups: emptyGroup,
  intermediates: emptyIntermediate,
  bounds: emptyBound,
  parts: emptyPart,
  restrictions: emptySentence,
  cautions: emptySentence,
  sources: emptySource,
  checks: emptyCheck,
};

/** A row with nothing in it, for the end of a list. */
export function emptyRow<L extends ListName>(list: L): DraftLists[L][number] {
  return EMPTY_ROWS[list]();
}

/** A new sheet's form: the lists that every sheet has hold one empty row to begin with. */
export function emptyForm(): DraftForm {
  return {
    slug: '',
    slugTyped: false,
    head: {
      title: '',
      authors: '',
      year: '',
      geometry: '',
      phase: '',
      summary: '',
      averaging: 'not-stated',
      wall: 'not-stated',
      drivingForce: 'not-stated',
      propertyState: 'not-stated',
    },
    quantities: [emptyQuantity()],
    tables: [],
    groups: [],
    intermediates: [],
    bounds: [],
    parts: [{ ...emptyPart(), key: 'main' }],
    accuracy: { present: false, valuePercent: '', statistic: 'not-stated', of: '', text: '' },
    restrictions: [],
    cautions: [],
    sources: [emptySource()],
    checks: [emptyCheck()],
    verification: { status: '', note: '' },
  };
}
