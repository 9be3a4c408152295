import {
  QUANTITIES,
  serves,
  symbolTex,
  unitsFor,
  type Group,
  type PropertyEquationDefinition,
  type Quantity,
  type Table,
} from '@merestone/engine';
import type { DutyChoices } from './duty';
import type { EquationInUse, FormField, FormItem, FormSection, RowPicker } from './duty-form';
import type { EvaluatedSheet } from './evaluated-sheet';
import { inFieldOrder, type SectionKey } from './field-order';
import { givenGroups } from './given-groups';
import { servingQuantity } from './serving-quantity';

const TITLES: Readonly<Record<SectionKey, string>> = {
  geometry: 'Geometry',
  conditions: 'Fluid and conditions',
  rest: 'The rest',
};

/** The form for a duty, made from the sheet's definition and what has been chosen so far. */
export function buildForm(sheet: EvaluatedSheet, duty: DutyChoices): FormSection[] {
  const { definition } = sheet;
  const given =
    duty.mode === 'groups' ? givenGroups(definition) : { groups: [], replaced: new Set<string>() };
  const pickers = (definition.tables ?? []).map((table) =>
    rowPicker(table, table.name, definition.quantities, duty),
  );
  const filledByRow = new Set(pickers.flatMap((picker) => Object.keys(picker.chosen?.values ?? {})));
  const asked = definition.quantities.filter(
    (q) => !given.replaced.has(q.symbol) && !filledByRow.has(q.symbol),
  );
  const needed = neededByEquations(sheet, duty);
  const idle = asked.filter((quantity) => isIdle(quantity, sheet, needed));
  const fieldOf = (quantity: Quantity) => sheetField(quantity, sheet, duty, needed);
  const sections: FormSection[] = inFieldOrder(asked.filter((quantity) => !idle.includes(quantity))).map(
    ({ section, quantities }) => ({ key: section, title: TITLES[section], items: quantities.map(fieldOf) }),
  );
  if (idle.length > 0)
    sections.push({ key: 'idle', title: 'More that may be given', items: idle.map(fieldOf), folded: true });
  if (given.groups.length > 0)
    sections.unshift({ key: 'groups', title: 'Groups', items: given.groups.map(groupField) });
  return withPickers(sections, pickers);
}

/** Tables describe the apparatus, so their pickers head the geometry. */
function withPickers(sections: FormSection[], pickers: RowPicker[]): FormSection[] {
  if (pickers.length === 0) return sections;
  const geometry = sections.find((section) => section.key === 'geometry');
  if (geometry) {
    geometry.items.unshift(...pickers);
    return sections;
  }
  return [{ key: 'geometry', title: TITLES.geometry, items: pickers }, ...sections];
}

/** Quantities of the sheet that a chosen property equation takes as inputs. */
function neededByEquations({ definition, equations }: EvaluatedSheet, duty: DutyChoices): Set<string> {
  const chosen = Object.entries(duty.equations).flatMap(([symbol, slug]) => {
    const listed = definition.quantities.find((q) => q.symbol === symbol)?.equations?.includes(slug);
    const equation = listed ? equations.find((e) => e.slug === slug) : undefined;
    return equation ? equation.definition.quantities : [];
  });
  return new Set(chosen.flatMap((input) => servingQuantity(definition.quantities, input.is)?.symbol ?? []));
}

/** What other bases are made from; worth asking for beside the quantities of the formula. */
const SERVES_BASES = ['gas-temperature', 'total-pressure', 'log-mean-inert-pressure', 'solvent-molar-mass'];

/** A state that no formula, bound, basis or chosen equation uses. */
function isIdle({ role, is, symbol }: Quantity, sheet: EvaluatedSheet, needed: ReadonlySet<string>): boolean {
  if (role !== 'state' || needed.has(symbol)) return false;
  const bounded = sheet.definition.bounds.some((bound) => bound.on === symbol);
  return !bounded && !SERVES_BASES.some((name) => serves(is, name));
}

/** A quantity of the sheet; only these may be filled by a property equation. */
function sheetField(
  quantity: Quantity,
  sheet: EvaluatedSheet,
  duty: DutyChoices,
  needed: ReadonlySet<string>,
): FormField {
  const { symbol } = quantity;
  const choices = sheet.equations.filter(({ slug }) => quantity.equations?.includes(slug));
  const chosen = choices.find(({ slug }) => slug === duty.equations[symbol]);
  return {
    ...quantityField(quantity, symbol),
    optional: quantity.role === 'state' && !needed.has(symbol),
    equations: choices.map(({ slug, definition }) => ({ slug, title: definition.title })),
    filledBy: chosen ? equationInUse(chosen.slug, chosen.definition, symbol, sheet, duty) : null,
  };
}

function quantityField(quantity: Quantity, key: string): FormField {
  const entry = QUANTITIES[quantity.is];
  return {
    kind: 'quantity',
    key,
    label: labelOf(quantity),
    symbolTex: symbolTex(quantity.symbol, quantity.tex),
    unit: quantity.unit,
    units: unitsFor(quantity.unit, entry),
    hint: quantity.meaning ?? entry?.hint ?? null,
    optional: quantity.role === 'state',
    equations: [],
    filledBy: null,
  };
}

function labelOf(quantity: Quantity): string {
  const title = QUANTITIES[quantity.is]?.title ?? quantity.is.replaceAll('-', ' ');
  return quantity.at ? `${title}, ${quantity.at}` : title;
}

function groupField(group: Group): FormField {
  return {
    kind: 'group',
    key: group.symbol,
    label: group.name,
    symbolTex: symbolTex(group.symbol, group.tex),
    unit: '1',
    units: ['1'],
    hint: group.note ?? null,
    optional: false,
    equations: [],
    filledBy: null,
  };
}

function equationInUse(
  slug: string,
  definition: PropertyEquationDefinition,
  key: string,
  sheet: EvaluatedSheet,
  duty: DutyChoices,
): EquationInUse {
  const pickers = (definition.tables ?? []).map((table) =>
    rowPicker(table, `${key}.${table.name}`, definition.quantities, duty),
  );
  const fromRow = new Set(pickers.flatMap((picker) => Object.keys(picker.chosen?.values ?? {})));
  const own: FormItem[] = [...pickers];
  const served: EquationInUse['served'] = [];
  for (const quantity of definition.quantities) {
    if (fromRow.has(quantity.symbol)) continue;
    const onSheet = servingQuantity(sheet.definition.quantities, quantity.is);
    if (onSheet && onSheet.symbol !== key)
      served.push({ key: onSheet.symbol, symbol: quantity.symbol, label: labelOf(onSheet) });
    else own.push(quantityField(quantity, `${key}.${quantity.symbol}`));
  }
  return { slug, title: definition.title, assumes: definition.assumes ?? null, own, served };
}

function rowPicker(table: Table, key: string, quantities: readonly Quantity[], duty: DutyChoices): RowPicker {
  const given = new Set(table.rows.flatMap((row) => Object.keys(row.values)));
  return {
    kind: 'row',
    key,
    title: table.title,
    source: table.source ?? null,
    rows: table.rows,
    chosen: table.rows.find((row) => row.key === duty.rows[key]) ?? null,
    columns: quantities
      .filter((quantity) => given.has(quantity.symbol))
      .map((quantity) => ({
        symbol: quantity.symbol,
        symbolTex: symbolTex(quantity.symbol, quantity.tex),
        label: labelOf(quantity),
        unit: quantity.unit,
      })),
  };
}
