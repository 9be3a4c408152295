import type {
  Bound,
  BoundEnd,
  Condition,
  CorrelationDefinition,
  GivenValue,
  Part,
  Piece,
  Quantity,
  Source,
  Table,
  WorkedCheck,
} from '@merestone/engine';
import { citationFields } from './csl-form';
import type {
  BoundRow,
  CheckRow,
  Closing,
  ConditionForm,
  DraftForm,
  EndForm,
  FormulaForm,
  PartRow,
  QuantityRow,
  SentenceRow,
  SourceRow,
  TableForm,
  ValueForm,
} from './draft-form';
import { emptyCoefficient, emptyEnd, newRowId } from './empty-rows';

/** A sheet put into the form. `definitionOfForm` gives the very same sheet back. */
export function formOfDefinition(definition: CorrelationDefinition, slug: string): DraftForm {
  const { accuracy } = definition;
  return {
    slug,
    slugTyped: slug !== '',
    head: {
      title: definition.title,
      authors: definition.authors.join(', '),
      year: numberText(definition.year),
      geometry: definition.geometry,
      phase: definition.phase,
      summary: definition.summary,
      averaging: definition.averaging,
      wall: definition.wall,
      drivingForce: definition.drivingForce,
      propertyState: definition.propertyState,
    },
    quantities: definition.quantities.map(quantityRow),
    tables: (definition.tables ?? []).map(tableForm),
    groups: definition.groups.map(({ tex = '', note = '', ...group }) => ({
      id: newRowId(),
      ...group,
      tex,
      note,
    })),
    intermediates: (definition.intermediates ?? []).map(
      ({ symbol, name, unit, tex = '', dimensional = false, note = '', ...formula }) => ({
        id: newRowId(),
        symbol,
        name,
        unit,
        tex,
        dimensional,
        note,
        ...formulaForm(formula),
      }),
    ),
    bounds: definition.bounds.map(boundRow),
    parts: definition.parts.map(partRow),
    accuracy: {
      present: accuracy !== null,
      valuePercent: numberText(accuracy?.valuePercent),
      statistic: accuracy?.statistic ?? 'not-stated',
      of: accuracy?.of ?? '',
      text: accuracy?.text ?? '',
    },
    restrictions: definition.restrictions.map(sentenceRow),
    cautions: definition.cautions.map(sentenceRow),
    sources: definition.sources.map(sourceRow),
    checks: definition.checks.map(checkRow),
    verification: { ...definition.verification },
  };
}

function quantityRow(quantity: Quantity): QuantityRow {
  const {
    symbol,
    is,
    unit,
    tex = '',
    role = '',
    at = '',
    meaning = '',
    equations = [],
    table = '',
  } = quantity;
  return { id: newRowId(), symbol, is, unit, tex, role, at, meaning, equations: [...equations], table };
}

function tableForm({ name, title, source = '', rows }: Table): TableForm {
  return {
    id: newRowId(),
    name,
    title,
    source,
    rows: rows.map(({ key, label, values, note = '' }) => ({
      id: newRowId(),
      key,
      label,
      values: Object.entries(values).map(([symbol, value]) => ({ symbol, text: numberText(value) })),
      note,
    })),
  };
}

function formulaForm({ expression = '', pieces }: { expression?: string; pieces?: Piece[] }): FormulaForm {
  return {
    inPieces: pieces !== undefined,
    expression,
    pieces: (pieces ?? []).map(({ title = '', when, expression: own }) => ({
      id: newRowId(),
      title,
      when: when.map(conditionForm),
      expression: own,
    })),
  };
}

function conditionForm({ on, lo, hi, loClosed, hiClosed }: Condition): ConditionForm {
  return {
    on,
    lo: numberText(lo),
    hi: numberText(hi),
    loClosed: closing(loClosed),
    hiClosed: closing(hiClosed),
  };
}

function boundRow({ on, stretches, basis, place = '', note = '' }: Bound): BoundRow {
  return {
    id: newRowId(),
    on,
    stretches: stretches.map(({ lo, hi }) => ({ id: newRowId(), lo: endForm(lo), hi: endForm(hi) })),
    basis,
    place,
    note,
  };
}

function endForm(end: BoundEnd | undefined): EndForm {
  if (end === undefined) return emptyEnd();
  const { value, nature, closed, reach, beyond = [] } = end;
  return {
    value: numberText(value),
    nature,
    closed: closing(closed),
    reach: numberText(reach),
    beyond: [...beyond],
  };
}

function partRow({ key, title, phase, result, coefficient }: Part): PartRow {
  const { symbol, tex = '', kind, unit, dimensional = false, ...formula } = result;
  return {
    id: newRowId(),
    key,
    title,
    phase: phase ?? '',
    result: { symbol, tex, kind, unit, dimensional, ...formulaForm(formula) },
    coefficient:
      coefficient === null
        ? { ...emptyCoefficient(), present: false }
        : { ...coefficient, present: true, tex: coefficient.tex ?? '' },
  };
}

function sentenceRow(text: string): SentenceRow {
  return { id: newRowId(), text };
}

function sourceRow({ csl, place, gives = '', read }: Source): SourceRow {
  return { id: newRowId(), ...citationFields(csl), place, gives, read };
}

function checkRow(check: WorkedCheck): CheckRow {
  const { title, kind, source = '', inputs, rows = {}, equations = {}, expected, note = '' } = check;
  return {
    id: newRowId(),
    title,
    kind,
    source,
    inputs: valueForms(inputs),
    rows: Object.entries(rows).map(([name, key]) => ({ name, key })),
    equations: Object.entries(equations).map(([symbol, slug]) => ({ symbol, slug })),
    expected: valueForms(expected),
    tolerancePercent: numberText(check.tolerancePercent),
    note,
  };
}

function valueForms(values: Readonly<Record<string, GivenValue>>): ValueForm[] {
  return Object.entries(values).map(([symbol, { value, unit = '' }]) => ({
    symbol,
    value: numberText(value),
    unit,
  }));
}

function closing(closed: boolean | undefined): Closing {
  if (closed === undefined) return '';
  return closed ? 'closed' : 'open';
}

function numberText(value: number | null | undefined): string {
  return value === null || value === undefined ? '' : String(value);
}
