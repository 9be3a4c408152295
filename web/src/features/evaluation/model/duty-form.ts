import type { TableRow } from './table-row';

/** One quantity or group to be typed. */
export interface FormField {
  kind: 'quantity' | 'group';
  /** Symbol on the sheet, or `rho.T` for what the equation that fills `rho` needs besides. */
  key: string;
  label: string;
  symbolTex: string;
  /** Unit on the sheet. */
  unit: string;
  units: string[];
  /** Unit the field starts with: what people have the value in, where that is not the sheet's. */
  startUnit: string;
  hint: string | null;
  optional: boolean;
  /** Property equations that may fill it. */
  equations: { slug: string; title: string; gives: string }[];
  filledBy: EquationInUse | null;
  /** What a chosen property equation finds from this field. */
  neededFor: string[];
}

/** A property equation that was chosen to fill a field, and what it takes its inputs from. */
export interface EquationInUse {
  slug: string;
  title: string;
  assumes: string | null;
  /** What it needs beyond the sheet's own quantities. */
  own: FormItem[];
  /** Its inputs that the sheet has already, by their label there. */
  served: { key: string; symbol: string; label: string }[];
}

/** A table one of whose rows fills several quantities at once. */
export interface RowPicker {
  kind: 'row';
  key: string;
  title: string;
  source: string | null;
  rows: readonly TableRow[];
  chosen: TableRow | null;
  /** What a row gives, in the order of the sheet. */
  columns: { symbol: string; symbolTex: string; label: string; unit: string }[];
}

export type FormItem = FormField | RowPicker;

export interface FormSection {
  key: string;
  title: string;
  items: FormItem[];
  /** Folded away unless something stands in it: nothing asked for so far needs it. */
  folded?: boolean;
}

/** All fields on show, those under an equation included. */
export function fieldsOf(sections: readonly FormSection[]): FormField[] {
  return sections.flatMap((section) => section.items.flatMap(fieldsIn));
}

/** All row pickers on show. */
export function pickersOf(sections: readonly FormSection[]): RowPicker[] {
  return sections.flatMap((section) => section.items.flatMap(pickersIn));
}

function fieldsIn(item: FormItem): FormField[] {
  return item.kind === 'row' ? [] : [item, ...(item.filledBy?.own ?? []).flatMap(fieldsIn)];
}

function pickersIn(item: FormItem): RowPicker[] {
  return item.kind === 'row' ? [item] : (item.filledBy?.own ?? []).flatMap(pickersIn);
}
