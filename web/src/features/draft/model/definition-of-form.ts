import { SHEET_FORMAT } from '@merestone/engine';
import { citationOf } from './csl-form';
import type {
  BoundRow,
  CheckRow,
  Closing,
  CoefficientForm,
  DraftForm,
  EndForm,
  FormulaForm,
  PartRow,
  QuantityRow,
  TableForm,
  ValueForm,
} from './draft-form';
import { FormReading, compact, optional, optionalName, type FormProblem } from './form-reading';

export interface ReadForm {
  /** What the form says, in the shape of a definition; not checked, and with holes where something is missing. */
  value: unknown;
  /** What is missing or cannot be read. */
  problems: FormProblem[];
}

/** What the form comes to as a definition. Of a form made from a sheet it is that sheet. */
export function definitionOfForm(form: DraftForm): ReadForm {
  const read = new FormReading();
  const { head, accuracy } = form;
  const value = compact({
    format: SHEET_FORMAT,
    title: read.text('title', head.title),
    authors: authorsOf(read, head.authors),
    year: read.optionalNumber('year', head.year) ?? null,
    geometry: read.name('geometry', head.geometry),
    phase: read.name('phase', head.phase),
    summary: read.text('summary', head.summary),
    averaging: read.name('averaging', head.averaging),
    wall: read.name('wall', head.wall),
    drivingForce: read.name('drivingForce', head.drivingForce),
    propertyState: read.name('propertyState', head.propertyState),
    quantities: form.quantities.map((row, i) => quantityOf(read, row, `quantities[${i}]`)),
    tables: listOrNothing(form.tables.map((row, i) => tableOf(read, row, `tables[${i}]`))),
    groups: form.groups.map((row, i) =>
      compact({
        symbol: read.name(`groups[${i}].symbol`, row.symbol),
        name: read.text(`groups[${i}].name`, row.name),
        expression: read.text(`groups[${i}].expression`, row.expression),
        tex: optionalName(row.tex),
        note: optional(row.note),
      }),
    ),
    intermediates: listOrNothing(
      form.intermediates.map((row, i) => {
        const path = `intermediates[${i}]`;
        return compact({
          symbol: read.name(`${path}.symbol`, row.symbol),
          name: read.text(`${path}.name`, row.name),
          unit: read.name(`${path}.unit`, row.unit),
          tex: optionalName(row.tex),
          ...formulaOf(read, row, path),
          dimensional: row.dimensional || undefined,
          note: optional(row.note),
        });
      }),
    ),
    bounds: form.bounds.map((row, i) => boundOf(read, row, `bounds[${i}]`)),
    parts: form.parts.map((row, i) => partOf(read, row, `parts[${i}]`)),
    accuracy: accuracy.present
      ? compact({
          valuePercent: read.optionalNumber('accuracy.valuePercent', accuracy.valuePercent) ?? null,
          statistic: accuracy.statistic,
          of: optional(accuracy.of),
          text: read.text('accuracy.text', accuracy.text),
        })
      : null,
    restrictions: form.restrictions.map(({ text }, i) => read.text(`restrictions[${i}]`, text)),
    cautions: form.cautions.map(({ text }, i) => read.text(`cautions[${i}]`, text)),
    sources: form.sources.map((row, i) =>
      compact({
        csl: citationOf(row),
        place: read.text(`sources[${i}].place`, row.place),
        gives: optional(row.gives),
        read: read.name(`sources[${i}].read`, row.read),
      }),
    ),
    checks: form.checks.map((row, i) => checkOf(read, row, `checks[${i}]`)),
    verification: {
      status: read.name('verification.status', form.verification.status),
      note: read.text('verification.note', form.verification.note),
    },
  });
  return { value, problems: read.problems };
}

function authorsOf(read: FormReading, typed: string): string[] {
  const names = typed
    .split(/[,;\n]/)
    .map((name) => name.trim())
    .filter(Boolean);
  if (names.length === 0) read.text('authors', '');
  return names;
}

function quantityOf(read: FormReading, row: QuantityRow, path: string) {
  return compact({
    symbol: read.name(`${path}.symbol`, row.symbol),
    is: read.name(`${path}.is`, row.is),
    unit: read.name(`${path}.unit`, row.unit),
    tex: optionalName(row.tex),
    role: optionalName(row.role),
    at: optionalName(row.at),
    meaning: optional(row.meaning),
    equations: listOrNothing(row.equations),
    table: optionalName(row.table),
  });
}

function tableOf(read: FormReading, table: TableForm, path: string) {
  return compact({
    name: read.name(`${path}.name`, table.name),
    title: read.text(`${path}.title`, table.title),
    source: optional(table.source),
    rows: table.rows.map((row, j) => {
      const place = `${path}.rows[${j}]`;
      return compact({
        key: read.name(`${place}.key`, row.key),
        label: read.text(`${place}.label`, row.label),
        values: Object.fromEntries(
          row.values.flatMap(({ symbol, text }) => {
            const value = read.optionalNumber(`${place}.values.${symbol}`, text);
            return symbol === '' || value === undefined ? [] : [[symbol, value] as const];
          }),
        ),
        note: optional(row.note),
      });
    }),
  });
}

function formulaOf(read: FormReading, formula: FormulaForm, path: string) {
  if (!formula.inPieces) return { expression: read.text(`${path}.expression`, formula.expression) };
  return {
    pieces: formula.pieces.map((piece, i) => {
      const place = `${path}.pieces[${i}]`;
      return compact({
        title: optional(piece.title),
        when: piece.when.map((condition, j) =>
          compact({
            on: read.name(`${place}.when[${j}].on`, condition.on),
            lo: read.optionalNumber(`${place}.when[${j}].lo`, condition.lo),
            hi: read.optionalNumber(`${place}.when[${j}].hi`, condition.hi),
            loClosed: closedOf(condition.loClosed),
            hiClosed: closedOf(condition.hiClosed),
          }),
        ),
        expression: read.text(`${place}.expression`, piece.expression),
      });
    }),
  };
}

function boundOf(read: FormReading, row: BoundRow, path: string) {
  const stretches = row.basis === 'none' ? [] : row.stretches;
  return compact({
    on: read.name(`${path}.on`, row.on),
    stretches: stretches.map(({ lo, hi }, i) =>
      compact({
        lo: endOf(read, lo, `${path}.stretches[${i}].lo`),
        hi: endOf(read, hi, `${path}.stretches[${i}].hi`),
      }),
    ),
    basis: read.name(`${path}.basis`, row.basis),
    place: optional(row.place),
    note: optional(row.note),
  });
}

/** A limit whose value is empty is none. */
function endOf(read: FormReading, end: EndForm, path: string) {
  if (end.value.trim() === '') return undefined;
  return compact({
    value: read.optionalNumber(`${path}.value`, end.value),
    nature: end.nature,
    closed: closedOf(end.closed),
    reach: read.optionalNumber(`${path}.reach`, end.reach),
    beyond: listOrNothing(end.beyond),
  });
}

function partOf(read: FormReading, { key, title, phase, result, coefficient }: PartRow, path: string) {
  return compact({
    key: read.name(`${path}.key`, key),
    title: read.text(`${path}.title`, title),
    phase: optionalName(phase),
    result: compact({
      symbol: read.name(`${path}.result.symbol`, result.symbol),
      tex: optionalName(result.tex),
      kind: read.name(`${path}.result.kind`, result.kind),
      unit: read.name(`${path}.result.unit`, result.unit),
      ...formulaOf(read, result, `${path}.result`),
      dimensional: result.dimensional || undefined,
    }),
    coefficient: coefficient.present ? coefficientOf(read, coefficient, `${path}.coefficient`) : null,
  });
}

function coefficientOf(read: FormReading, coefficient: CoefficientForm, path: string) {
  return compact({
    symbol: read.name(`${path}.symbol`, coefficient.symbol),
    tex: optionalName(coefficient.tex),
    unit: read.name(`${path}.unit`, coefficient.unit),
    basis: read.name(`${path}.basis`, coefficient.basis),
    per: read.name(`${path}.per`, coefficient.per),
    rateForm: read.name(`${path}.rateForm`, coefficient.rateForm),
    expression: read.text(`${path}.expression`, coefficient.expression),
  });
}

function checkOf(read: FormReading, check: CheckRow, path: string) {
  if (check.expected.every(({ symbol }) => symbol.trim() === '')) read.text(`${path}.expected`, '');
  return compact({
    title: read.text(`${path}.title`, check.title),
    kind: check.kind,
    source: optional(check.source),
    inputs: valuesOf(read, check.inputs, `${path}.inputs`),
    rows: recordOrNothing(check.rows.map(({ name, key }) => [name.trim(), key.trim()])),
    equations: recordOrNothing(check.equations.map(({ symbol, slug }) => [symbol.trim(), slug.trim()])),
    expected: valuesOf(read, check.expected, `${path}.expected`),
    tolerancePercent: read.number(`${path}.tolerancePercent`, check.tolerancePercent),
    note: optional(check.note),
  });
}

/** Rows without a symbol or without a value so far are left out; a value without a symbol is told. */
function valuesOf(read: FormReading, rows: readonly ValueForm[], path: string) {
  return Object.fromEntries(
    rows.flatMap(({ symbol, value, unit }, i) => {
      const name = symbol.trim();
      if (name === '' && value.trim() !== '') read.text(`${path}[${i}].symbol`, '');
      if (name === '') return [];
      const number = read.number(`${path}.${name}`, value);
      return number === undefined
        ? []
        : [[name, compact({ value: number, unit: optionalName(unit) })] as const];
    }),
  );
}

function closedOf(closing: Closing): boolean | undefined {
  return closing === '' ? undefined : closing === 'closed';
}

function listOrNothing<T>(list: readonly T[]): readonly T[] | undefined {
  return list.length === 0 ? undefined : list;
}

function recordOrNothing(
  entries: readonly (readonly [string, string])[],
): Record<string, string> | undefined {
  const whole = entries.filter(([name, value]) => name !== '' && value !== '');
  return whole.length === 0 ? undefined : Object.fromEntries(whole);
}
