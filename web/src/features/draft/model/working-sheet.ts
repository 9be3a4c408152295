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
 * Compiles what a draft says so far, with stand-ins for title, sources and the like, and without the rows of bounds
 * and checks that do not hold yet. For looking at while writing only: nothing of it leaves the page.
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

/** The sheet without the bounds and checks that faults are about; null where a fault is about anything else. */
function withoutFaulty(sheet: Loose, fields: readonly string[]): Loose | null {
  const bad = { bounds: new Set<number>(), checks: new Set<number>() };
  for (const field of fields) {
    const [, list, at] = /^(bounds|checks)\[(\d+)\]/.exec(field) ?? [];
    if (list === 'bounds' || list === 'checks') bad[list].add(Number(at));
    else if (field !== 'checks') return null;
  }
  const checks = rowsOf(sheet.checks).filter((_, i) => !bad.checks.has(i));
  const bounds = rowsOf(sheet.bounds).filter((_, i) => !bad.bounds.has(i));
  return { ...sheet, bounds, checks: checks.length > 0 ? checks : [checkThatRuns(sheet)] };
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
