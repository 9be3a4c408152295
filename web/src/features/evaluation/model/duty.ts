import type { DrivingForce } from '@merestone/engine';
import type { TypedQuantity } from '../../../shared/ui/quantity-field/typed-quantity';

/** Whether the quantities are typed in, or the groups in their place. */
export type DutyMode = 'quantities' | 'groups';

export interface TypedForce {
  kind: DrivingForce['kind'];
  interface: TypedQuantity;
  bulk: TypedQuantity;
}

/** The operating point as somebody is typing it, kept word for word. */
export interface Duty {
  mode: DutyMode;
  /** By field key: a symbol of the sheet, or `rho.T` for what a property equation needs besides. */
  typed: Record<string, TypedQuantity>;
  /** Property equation by the field key it fills. */
  equations: Record<string, string>;
  /** Chosen row by table key: a table of the sheet, or `rho.solute` for one of a property equation. */
  rows: Record<string, string>;
  force: TypedForce | null;
  /** Reasons for using the sheet outside a bound, by symbol. */
  reasons: Record<string, string>;
}

/** What decides which fields there are; what is typed into them does not. */
export type DutyChoices = Pick<Duty, 'mode' | 'equations' | 'rows'>;

export const EMPTY_DUTY: Duty = {
  mode: 'quantities',
  typed: {},
  equations: {},
  rows: {},
  force: null,
  reasons: {},
};

export const FORCE_UNITS: Readonly<Record<DrivingForce['kind'], string>> = {
  concentration: 'mol/m^3',
  'partial-pressure': 'kPa',
  'mole-fraction': '1',
};

export type DutyChange =
  | { do: 'type'; key: string; typed: TypedQuantity }
  | { do: 'choose-equation'; key: string; slug: string | null }
  | { do: 'choose-equations'; equations: Readonly<Record<string, string>> }
  | { do: 'drop-equations'; equations: Readonly<Record<string, string>> }
  | { do: 'choose-row'; key: string; row: string | null }
  | { do: 'switch-mode'; mode: DutyMode }
  | { do: 'force-kind'; kind: DrivingForce['kind'] | null }
  | { do: 'type-force'; side: 'interface' | 'bulk'; typed: TypedQuantity }
  | { do: 'give-reason'; symbol: string; reason: string }
  | { do: 'start-anew' };

/** The duty after one act of the person at the form. What a choice hides stays typed, in case it is taken back. */
export function changeDuty(duty: Duty, change: DutyChange): Duty {
  switch (change.do) {
    case 'type':
      return { ...duty, typed: { ...duty.typed, [change.key]: change.typed } };
    case 'choose-equation':
      return { ...duty, equations: withOrWithout(duty.equations, change.key, change.slug) };
    case 'choose-equations':
      return { ...duty, equations: { ...duty.equations, ...change.equations } };
    case 'drop-equations':
      return { ...duty, equations: withoutChosen(duty.equations, change.equations) };
    case 'choose-row':
      return { ...duty, rows: withOrWithout(duty.rows, change.key, change.row) };
    case 'switch-mode':
      return { ...duty, mode: change.mode };
    case 'force-kind':
      return { ...duty, force: change.kind === null ? null : forceOf(change.kind) };
    case 'type-force':
      return duty.force === null ? duty : { ...duty, force: { ...duty.force, [change.side]: change.typed } };
    case 'give-reason':
      return { ...duty, reasons: { ...duty.reasons, [change.symbol]: change.reason } };
    case 'start-anew':
      return EMPTY_DUTY;
  }
}

function forceOf(kind: DrivingForce['kind']): TypedForce {
  const empty = { text: '', unit: FORCE_UNITS[kind] };
  return { kind, interface: empty, bulk: empty };
}

/** What was chosen for a field since then stays. */
function withoutChosen(
  equations: Readonly<Record<string, string>>,
  dropped: Readonly<Record<string, string>>,
): Record<string, string> {
  return Object.fromEntries(Object.entries(equations).filter(([key, slug]) => dropped[key] !== slug));
}

function withOrWithout(
  record: Record<string, string>,
  key: string,
  value: string | null,
): Record<string, string> {
  const { [key]: _dropped, ...rest } = record;
  return value === null ? rest : { ...rest, [key]: value };
}
