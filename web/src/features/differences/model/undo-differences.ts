import type { CorrelationDefinition, Difference } from '@merestone/engine';
import { pathSteps, type PathStep } from './path-steps';

/** By what the entries of a list are known in a path; those of other lists go by their place. */
const KNOWN_BY: Readonly<Record<string, string>> = {
  quantities: 'symbol',
  groups: 'symbol',
  intermediates: 'symbol',
  bounds: 'on',
  parts: 'key',
  tables: 'name',
  rows: 'key',
  checks: 'title',
};

type Node = Record<string, unknown> | unknown[];

/**
 * The definition as it was before the differences that led to `after`; entries of named lists may stand in another
 * order. Null where a path leads nowhere.
 */
export function undoDifferences(
  after: CorrelationDefinition,
  differences: readonly Difference[],
): CorrelationDefinition | null {
  const definition = structuredClone(after);
  const put = differences.filter(({ change }) => change !== 'added');
  // What was added goes from the end, so that the places of the others stay.
  const taken = differences.filter(({ change }) => change === 'added').reverse();
  const done = [...put, ...taken].every((difference) => undo(definition, difference));
  return done ? definition : null;
}

function undo(definition: CorrelationDefinition, { path, change, before }: Difference): boolean {
  const steps = pathSteps(path);
  const last = steps?.at(-1);
  if (!steps || !last) return false;
  let here: unknown = definition;
  let name = '';
  for (const step of steps.slice(0, -1)) {
    if (!isNode(here)) return false;
    here = valueAt(here, step, name);
    name = 'member' in step ? step.member : '';
  }
  return isNode(here) && write(here, last, name, change === 'added' ? undefined : structuredClone(before));
}

function write(node: Node, step: PathStep, name: string, value: unknown): boolean {
  if (!Array.isArray(node)) {
    if (!('member' in step)) return writeKey(node, step.entry, value);
    return writeKey(node, step.member, value);
  }
  if ('member' in step) return false;
  const place = placeOf(node, step.entry, name);
  if (value === undefined) return place >= 0 && node.splice(place, 1).length === 1;
  if (place >= 0) node[place] = value;
  else node.push(value);
  return true;
}

function writeKey(record: Record<string, unknown>, key: string, value: unknown): boolean {
  if (key === '__proto__') return false;
  if (value === undefined) return Reflect.deleteProperty(record, key);
  record[key] = value;
  return true;
}

function valueAt(node: Node, step: PathStep, name: string): unknown {
  if (Array.isArray(node)) return 'entry' in step ? node[placeOf(node, step.entry, name)] : undefined;
  const key = 'member' in step ? step.member : step.entry;
  return Object.hasOwn(node, key) ? node[key] : undefined;
}

function placeOf(list: readonly unknown[], entry: string, name: string): number {
  const known = Object.hasOwn(KNOWN_BY, name) ? KNOWN_BY[name] : undefined;
  if (known !== undefined)
    return list.findIndex((one) => isNode(one) && !Array.isArray(one) && one[known] === entry);
  const place = Number(entry);
  return Number.isInteger(place) && place < list.length ? place : -1;
}

function isNode(value: unknown): value is Node {
  return typeof value === 'object' && value !== null;
}
