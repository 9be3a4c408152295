import type { FieldProblem } from '../problem.js';

const DEEPEST = 64;
const FORBIDDEN_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * What no JSON given to this server may hold, wherever it stands: keys that reach into an object's prototype, numbers
 * too large to be held (1e400 is read as Infinity), characters that are no text, and nesting without end.
 */
export function inspectJson(value: unknown): FieldProblem[] {
  const problems: FieldProblem[] = [];
  inspect(value, '', 0, problems);
  return problems;
}

function inspect(value: unknown, field: string, depth: number, problems: FieldProblem[]): void {
  const refuse = (message: string): void => {
    problems.push({ field, code: 'malformed', message });
  };
  if (typeof value === 'number' && !Number.isFinite(value)) refuse('This number is too large to be held.');
  if (typeof value === 'string' && !isText(value)) refuse('This text holds a character that cannot be kept.');
  if (typeof value !== 'object' || value === null) return;
  if (depth >= DEEPEST) {
    refuse(`This is nested deeper than ${DEEPEST} levels.`);
    return;
  }
  for (const [key, inner] of Object.entries(value)) {
    const path = field === '' ? key : `${field}.${key}`;
    if (FORBIDDEN_KEYS.has(key) || !isText(key)) {
      problems.push({ field: path, code: 'malformed', message: 'This name cannot be used for a field.' });
    } else {
      inspect(inner, path, depth + 1, problems);
    }
  }
}

function isText(text: string): boolean {
  return !text.includes('\0') && !/\p{Surrogate}/u.test(text);
}
