import type { CorrelationDefinition } from '@merestone/engine';
import type { ReportSeverity } from '../../common/problem-report.js';
import type { WithdrawalClass } from '../../common/standing.js';

/** A change of one place in a definition: another value, a text added to a list, or a text of it left out. */
export type Change =
  | { readonly at: readonly (string | number)[]; readonly to: string | number }
  | { readonly at: readonly (string | number)[]; readonly add: string }
  | { readonly at: readonly (string | number)[]; readonly without: string };

/** A part in a sheet's team, or somebody's address. */
export type By = string;

export type DemoAct =
  | { readonly do: 'next'; readonly by?: By; readonly library?: true; readonly changes?: readonly Change[] }
  | { readonly do: 'submit'; readonly reviewers: number; readonly note: string }
  | {
      readonly do: 'comment';
      readonly by: By;
      readonly field: string;
      readonly text: string;
      readonly answer?: string;
      readonly resolved?: true;
    }
  | { readonly do: 'recommend' | 'ask-for-changes'; readonly by: By; readonly note: string }
  | { readonly do: 'edit'; readonly changes: readonly Change[] }
  | { readonly do: 'put-forward'; readonly note: string }
  | { readonly do: 'approve'; readonly inDays?: number; readonly reviewDueInDays?: number }
  | { readonly do: 'decline'; readonly reason: string }
  | { readonly do: 'report'; readonly by: By; readonly severity: ReportSeverity; readonly text: string }
  | { readonly do: 'suspend'; readonly reason: string }
  | {
      readonly do: 'withdraw';
      readonly revision: number;
      readonly class: WithdrawalClass;
      readonly reason: string;
    };

/** What happens in the demo office after its library was brought in. */
export interface DemoLife {
  /** By slug: what revision 1 said otherwise than the library. */
  readonly firstRevisions: Readonly<Record<string, readonly Change[]>>;
  readonly life: readonly { readonly slug: string; readonly acts: readonly DemoAct[] }[];
  readonly appointment: {
    readonly person: string;
    readonly geometries: readonly string[];
    readonly days: number;
  };
}

/** The definition with the changes. Throws where a change finds nothing to change. */
export function changed(
  definition: CorrelationDefinition,
  changes: readonly Change[],
): CorrelationDefinition {
  const copy = structuredClone(definition);
  for (const change of changes) apply(copy, change);
  return copy;
}

function apply(definition: object, change: Change): void {
  const { at } = change;
  const fault = () => new Error(`The demo's change finds nothing at ${at.join('.')}.`);
  const place = at.slice(0, -1).reduce<unknown>((inner, name) => member(inner, name), definition);
  const last = at.at(-1);
  if (last === undefined || typeof place !== 'object' || place === null) throw fault();
  const before = member(place, last);
  const after = valueAfter(before, change);
  if (after === undefined) throw fault();
  Object.assign(place, { [last]: after });
}

function valueAfter(before: unknown, change: Change): unknown {
  if ('to' in change) return typeof before === typeof change.to ? change.to : undefined;
  if (!Array.isArray(before)) return undefined;
  const list = before as unknown[];
  if ('add' in change) return [...list, change.add];
  return list.includes(change.without) ? list.filter((text) => text !== change.without) : undefined;
}

function member(value: unknown, name: string | number): unknown {
  return typeof value === 'object' && value !== null && Object.hasOwn(value, name)
    ? (value as Record<string | number, unknown>)[name]
    : undefined;
}
