import type { FieldProblem } from '../../common/problem.js';

/** Most entries of one map; no sheet has more symbols. */
export const MOST_ENTRIES = 60;
export const LONGEST_UNIT = 40;

const SYMBOL = /^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?(\.[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?)?$/;
const NAME = /^([A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?|[a-z0-9]+(-[a-z0-9]+)*)(\.[a-z0-9]+(-[a-z0-9]+)*)?$/;
const SLUG = /^[a-z0-9]+(-[a-z0-9]+)*$/;
const LONGEST_KEY = 80;

/** Faults of a map of values `{symbol: {value, unit?}}`, each at its path. */
export function inputMapProblems(field: string, value: unknown, keys: 'symbols' | 'names'): FieldProblem[] {
  const pattern = keys === 'symbols' ? SYMBOL : SLUG;
  return mapProblems(field, value, pattern, (path, entry) => inputProblems(path, entry));
}

/** Faults of a map of names `{key: name}`, such as rows by table or equations by symbol. */
export function nameMapProblems(field: string, value: unknown): FieldProblem[] {
  return mapProblems(field, value, NAME, (path, entry) =>
    typeof entry === 'string' && entry.length <= LONGEST_KEY && SLUG.test(entry)
      ? []
      : [malformed(path, 'must be a name of small letters, digits and hyphens.')],
  );
}

function mapProblems(
  field: string,
  value: unknown,
  pattern: RegExp,
  check: (path: string, entry: unknown) => FieldProblem[],
): FieldProblem[] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return [{ field, code: value === undefined ? 'missing' : 'malformed', message: 'must be an object.' }];
  }
  const entries = Object.entries(value);
  if (entries.length > MOST_ENTRIES) return [malformed(field, `must have at most ${MOST_ENTRIES} entries.`)];
  return entries.flatMap(([key, entry]) => {
    const path = `${field}.${key.slice(0, LONGEST_KEY)}`;
    if (key.length > LONGEST_KEY || !pattern.test(key)) {
      return [{ field: path, code: 'unknown-symbol', message: 'is not a name that anything here can have.' }];
    }
    return check(path, entry);
  });
}

function inputProblems(path: string, entry: unknown): FieldProblem[] {
  if (typeof entry !== 'object' || entry === null || Array.isArray(entry)) {
    return [malformed(path, 'must be an object {value, unit}.')];
  }
  const problems: FieldProblem[] = [];
  const { value, unit, ...others } = entry as Record<string, unknown>;
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    problems.push(malformed(`${path}.value`, 'must be a finite number.'));
  }
  if (unit !== undefined && (typeof unit !== 'string' || unit.length === 0 || unit.length > LONGEST_UNIT)) {
    problems.push(malformed(`${path}.unit`, `must be a unit of at most ${LONGEST_UNIT} characters.`));
  }
  for (const other of Object.keys(others)) {
    problems.push({
      field: `${path}.${other}`,
      code: 'unknown-field',
      message: 'There is no such field here.',
    });
  }
  return problems;
}

function malformed(field: string, message: string): FieldProblem {
  return { field, code: 'malformed', message };
}
