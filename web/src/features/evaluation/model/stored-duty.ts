import { EMPTY_DUTY, FORCE_UNITS, type Duty } from './duty';
import type { TypedQuantity } from '../../../shared/ui/quantity-field/typed-quantity';

const MAX_STORED = 64_000;

/** Where a person's duty for one sheet is kept in this browser. */
export function dutyKey(personId: string, slug: string): string {
  return `merestone:duty:1:${personId}:${slug}`;
}

/** What was typed before, or an empty duty. Whatever is not of the expected form is left out. */
export function readStoredDuty(store: Storage, key: string): Duty {
  try {
    const text = store.getItem(key);
    return text === null || text.length > MAX_STORED ? EMPTY_DUTY : dutyFrom(JSON.parse(text));
  } catch {
    return EMPTY_DUTY;
  }
}

/** Keeps the duty; a full or blocked store only means that a reload starts empty. */
export function storeDuty(store: Storage, key: string, duty: Duty): void {
  try {
    if (duty === EMPTY_DUTY) store.removeItem(key);
    else store.setItem(key, JSON.stringify(duty));
  } catch {
    return;
  }
}

function dutyFrom(value: unknown): Duty {
  if (!isRecord(value)) return EMPTY_DUTY;
  return {
    mode: value.mode === 'groups' ? 'groups' : 'quantities',
    typed: entries(value.typed, typedFrom),
    equations: entries(value.equations, textFrom),
    rows: entries(value.rows, textFrom),
    force: forceFrom(value.force),
    reasons: entries(value.reasons, textFrom),
  };
}

function forceFrom(value: unknown): Duty['force'] {
  if (!isRecord(value) || !isForceKind(value.kind)) return null;
  const sides = { interface: typedFrom(value.interface), bulk: typedFrom(value.bulk) };
  return sides.interface && sides.bulk
    ? { kind: value.kind, interface: sides.interface, bulk: sides.bulk }
    : null;
}

function isForceKind(value: unknown): value is keyof typeof FORCE_UNITS {
  return typeof value === 'string' && Object.hasOwn(FORCE_UNITS, value);
}

function typedFrom(value: unknown): TypedQuantity | null {
  if (!isRecord(value) || typeof value.text !== 'string' || typeof value.unit !== 'string') return null;
  const { text, unit, unitBefore } = value;
  return typeof unitBefore === 'string' ? { text, unit, unitBefore } : { text, unit };
}

function textFrom(value: unknown): string | null {
  return typeof value === 'string' ? value : null;
}

function entries<T>(value: unknown, read: (entry: unknown) => T | null): Record<string, T> {
  if (!isRecord(value)) return {};
  const found: [string, T][] = [];
  for (const [key, entry] of Object.entries(value)) {
    const good = read(entry);
    if (good !== null && key !== '__proto__') found.push([key, good]);
  }
  return Object.fromEntries(found);
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
