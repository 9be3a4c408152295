import type { CorrelationDefinition } from '../sheet/definition.js';

/** One field in which two definitions differ. */
export interface Difference {
  /** Path with names instead of places: `bounds[Re].stretches[0].hi.value`. */
  path: string;
  /** Top-level field it belongs to, for grouping on a page. */
  section: keyof CorrelationDefinition;
  change: 'added' | 'removed' | 'changed';
  /** Null where there was nothing. */
  before: unknown;
  /** Null where there is nothing any more. */
  after: unknown;
}

/** By what the members of a list are the same from one revision to the next; others go by their place. */
const IDENTITY: Readonly<Record<string, string>> = {
  quantities: 'symbol',
  groups: 'symbol',
  intermediates: 'symbol',
  bounds: 'on',
  parts: 'key',
  tables: 'name',
  rows: 'key',
  checks: 'title',
};

/** Field by field, what a later definition changed. Order of named members does not matter; order of texts does. */
export function compareDefinitions(
  before: CorrelationDefinition,
  after: CorrelationDefinition,
): Difference[] {
  const sections = [
    ...new Set([...Object.keys(before), ...Object.keys(after)]),
  ] as (keyof CorrelationDefinition)[];
  return sections.flatMap((section) =>
    compare(before[section], after[section], section, section).map((difference) => ({
      ...difference,
      section,
    })),
  );
}

type Found = Omit<Difference, 'section'>;

function compare(before: unknown, after: unknown, path: string, name: string): Found[] {
  if (before === undefined && after === undefined) return [];
  if (before === undefined) return [{ path, change: 'added', before: null, after }];
  if (after === undefined) return [{ path, change: 'removed', before, after: null }];
  if (Array.isArray(before) && Array.isArray(after)) return compareLists(before, after, path, name);
  if (isRecord(before) && isRecord(after)) return compareRecords(before, after, path);
  return Object.is(before, after) ? [] : [{ path, change: 'changed', before, after }];
}

function compareRecords(
  before: Record<string, unknown>,
  after: Record<string, unknown>,
  path: string,
): Found[] {
  const names = new Set([...Object.keys(before), ...Object.keys(after)]);
  return [...names].flatMap((name) => compare(own(before, name), own(after, name), `${path}.${name}`, name));
}

function compareLists(before: unknown[], after: unknown[], path: string, name: string): Found[] {
  const identity = Object.hasOwn(IDENTITY, name) ? IDENTITY[name] : undefined;
  const [left, right] = [byIdentity(before, identity), byIdentity(after, identity)];
  const keys = new Set([...left.keys(), ...right.keys()]);
  return [...keys].flatMap((key) => compare(left.get(key), right.get(key), `${path}[${key}]`, ''));
}

function byIdentity(list: readonly unknown[], identity: string | undefined): Map<string, unknown> {
  return new Map(
    list.map((member, place): [string, unknown] => {
      const key = identity !== undefined && isRecord(member) ? own(member, identity) : undefined;
      return [typeof key === 'string' ? key : String(place), member];
    }),
  );
}

function own(record: Record<string, unknown>, name: string): unknown {
  return Object.hasOwn(record, name) ? record[name] : undefined;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
