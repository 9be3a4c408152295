import {
  checkStructure,
  compileCorrelation,
  runChecks,
  type CheckReport,
  type CompiledCorrelation,
  type PropertyLibrary,
} from '@merestone/engine';

/** The mathematics of a draft as far as they run, whatever else of the sheet is missing. */
export interface WorkingSheet {
  compiled: CompiledCorrelation | null;
  /** What became of each worked check that can be run, by its place in the draft. */
  checks: ReadonlyMap<number, CheckReport>;
}

type Loose = Record<string, unknown>;

const NOTHING: WorkingSheet = { compiled: null, checks: new Map() };
const STAND_IN = 'not written yet';
const ROUNDS = 6;

/**
 * Compiles what a draft says so far, with stand-ins for title, sources and the like, and without the rows that do not
 * hold yet. For looking at while writing only: nothing of it leaves the page.
 */
export function workingSheet(value: unknown, library: PropertyLibrary): WorkingSheet {
  let sheet = withStandIns(value as Loose);
  for (let round = 0; round < ROUNDS; round += 1) {
    const structure = checkStructure(sheet);
    const compilation = structure.ok ? compileCorrelation(structure.definition) : null;
    if (compilation?.ok) {
      const reports = runChecks(compilation.compiled, library);
      // Stand-ins have no number for a title.
      const numbered = reports.map((report) => [Number(report.title), report] as const);
      return {
        compiled: compilation.compiled,
        checks: new Map(numbered.filter(([at]) => Number.isInteger(at))),
      };
    }
    const problems = structure.ok
      ? compilation?.ok === false
        ? compilation.problems
        : []
      : structure.problems;
    const next = withoutFaulty(
      sheet,
      problems.map(({ field }) => field),
    );
    if (next === null) return NOTHING;
    sheet = next;
  }
  return NOTHING;
}

function withStandIns(value: Loose): Loose {
  const groups = rowsOf(value.groups).filter(({ expression }) => expression !== '');
  const bounds = rowsOf(value.bounds);
  const bounded = new Set(bounds.map(({ on }) => on));
  return {
    ...value,
    title: STAND_IN,
    authors: [STAND_IN],
    year: null,
    geometry: 'any',
    phase: 'gas',
    summary: STAND_IN,
    averaging: 'not-stated',
    wall: 'not-stated',
    drivingForce: 'not-stated',
    propertyState: 'not-stated',
    quantities: rowsOf(value.quantities).filter(({ symbol }) => symbol !== ''),
    groups: groups.map((group) => ({ ...group, name: group.name === '' ? STAND_IN : group.name })),
    bounds: [
      ...bounds,
      ...groups
        .filter(({ symbol }) => !bounded.has(symbol))
        .map(({ symbol }) => ({ on: symbol, stretches: [], basis: 'none' })),
    ],
    parts: rowsOf(value.parts).map((part, i) => ({
      ...part,
      key: part.key === '' ? `part-${i + 1}` : part.key,
      title: part.title === '' ? STAND_IN : part.title,
    })),
    accuracy: null,
    restrictions: [],
    cautions: [],
    sources: [{ csl: { type: 'document' }, place: STAND_IN, read: 'memory' }],
    checks: rowsOf(value.checks).map((check, i) => ({ ...check, title: String(i), source: STAND_IN })),
    verification: { status: 'from-memory', note: STAND_IN },
  };
}

/** The lists of which a row that does not hold yet may be left out; where others stand on it, they tell. */
const LISTS = ['quantities', 'groups', 'intermediates', 'bounds', 'checks'] as const;
const ROW = new RegExp(`^(${LISTS.join('|')})\\[(\\d+)\\]`);

/** The sheet without the rows that faults are about; null where a fault is about anything else. */
function withoutFaulty(sheet: Loose, fields: readonly string[]): Loose | null {
  const bad = new Set<string>();
  for (const field of fields) {
    const row = ROW.exec(field)?.[0];
    if (row !== undefined) bad.add(row);
    else if (field !== 'checks') return null;
  }
  const kept = LISTS.map(
    (list) => [list, rowsOf(sheet[list]).filter((_, i) => !bad.has(`${list}[${i}]`))] as const,
  );
  const next: Loose = { ...sheet, ...Object.fromEntries(kept) };
  return rowsOf(next.checks).length > 0 ? next : { ...next, checks: [checkThatRuns(sheet)] };
}

/** A sheet has one check at least; this one asks for the first result and says nothing. */
function checkThatRuns(sheet: Loose): Loose {
  const [part] = rowsOf(sheet.parts);
  const symbol = (part?.result as Loose | undefined)?.symbol;
  return {
    title: STAND_IN,
    kind: 'computed',
    inputs: {},
    expected: { [typeof symbol === 'string' ? symbol : '']: { value: 1 } },
    tolerancePercent: 1,
  };
}

function rowsOf(list: unknown): Loose[] {
  return Array.isArray(list) ? (list as Loose[]) : [];
}
