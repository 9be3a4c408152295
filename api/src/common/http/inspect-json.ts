import type { FieldProblem } from '../problem.js';

const DEEPEST = 64;
/** Enough to mend what is wrong; a hostile body could hold a million faults. */
const MOST_PROBLEMS = 100;
const FORBIDDEN_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * What no JSON given to this server may hold, wherever it stands: keys that reach into an object's prototype, numbers
 * too large to be held (1e400 is read as Infinity), characters that are no text, and nesting without end.
 */
export function inspectJson(value: unknown): FieldProblem[] {
  const problems: FieldProblem[] = [];
  inspect(value, [], problems);
  return problems;
}

type Path = (string | number)[];

/** Walks in place; the path is put into words only where something is wrong. */
function inspect(value: unknown, path: Path, problems: FieldProblem[]): void {
  if (problems.length >= MOST_PROBLEMS) return;
  const fault = faultOf(value, path.length);
  if (fault !== undefined) {
    problems.push({ field: path.join('.'), code: 'malformed', message: fault });
  } else if (Array.isArray(value)) {
    for (let index = 0; index < value.length; index += 1) step(value[index], index, path, problems);
  } else if (typeof value === 'object' && value !== null) {
    for (const [key, inner] of Object.entries(value)) {
      if (FORBIDDEN_KEYS.has(key) || !isText(key)) {
        const field = [...path, key].join('.');
        problems.push({ field, code: 'malformed', message: 'This name cannot be used for a field.' });
      } else {
        step(inner, key, path, problems);
      }
    }
  }
}

function step(inner: unknown, place: string | number, path: Path, problems: FieldProblem[]): void {
  path.push(place);
  inspect(inner, path, problems);
  path.pop();
}

function faultOf(value: unknown, depth: number): string | undefined {
  if (typeof value === 'number' && !Number.isFinite(value)) return 'This number is too large to be held.';
  if (typeof value === 'string' && !isText(value)) return 'This text holds a character that cannot be kept.';
  if (typeof value === 'object' && value !== null && depth >= DEEPEST) {
    return `This is nested deeper than ${DEEPEST} levels.`;
  }
  return undefined;
}

function isText(text: string): boolean {
  return !text.includes('\0') && !/\p{Surrogate}/u.test(text);
}
