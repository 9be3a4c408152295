import {
  QUANTITIES,
  serves,
  symbolTex,
  unitsFor,
  usualUnitFor,
  type Group,
  type PropertyEquationDefinition,
  type Quantity,
  type Table,
} from '@merestone/engine';
import { quantityName } from '../../../shared/format/symbol-on-sheet';
import { quantityWords } from '../../../shared/format/quantity-words';
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

/** Quantities of the sheet that a chosen property equation takes as inputs, with what is found from each. */
function neededByEquations({ definition, equations }: EvaluatedSheet, duty: DutyChoices): Needed {
  const needed = new Map<string, string[]>();
  for (const [symbol, slug] of Object.entries(duty.equations)) {
    const filled = definition.quantities.find((q) => q.symbol === symbol && q.equations?.includes(slug));
    const equation = filled ? equations.find((e) => e.slug === slug) : undefined;
    if (!filled || !equation) continue;
    for (const input of equation.definition.quantities) {
      const serving = servingQuantity(definition.quantities, input.is)?.symbol;
      if (serving === undefined || serving === symbol) continue;
      needed.set(serving, [...new Set([...(needed.get(serving) ?? []), quantityName(filled.is)])]);
    }
  }
  return needed;
}

/** By symbol on the sheet: the titles of the quantities that chosen equations find from it. */
type Needed = ReadonlyMap<string, string[]>;

/** What other bases are made from; worth asking for beside the quantities of the formula. */
const SERVES_BASES = ['gas-temperature', 'total-pressure', 'log-mean-inert-pressure', 'solvent-molar-mass'];

/** A state that no formula, bound, basis or chosen equation uses. */
function isIdle({ role, is, symbol }: Quantity, sheet: EvaluatedSheet, needed: Needed): boolean {
  if (role !== 'state' || needed.has(symbol)) return false;
  const bounded = sheet.definition.bounds.some((bound) => bound.on === symbol);
  return !bounded && !SERVES_BASES.some((name) => serves(is, name));
}

/** A quantity of the sheet; only these may be filled by a property equation. */
function sheetField(quantity: Quantity, sheet: EvaluatedSheet, duty: DutyChoices, needed: Needed): FormField {
  const { symbol } = quantity;
  const choices = sheet.equations.filter(({ slug }) => quantity.equations?.includes(slug));
  const chosen = choices.find(({ slug }) => slug === duty.equations[symbol]);
  return {
    ...quantityField(quantity, symbol),
    optional: quantity.role === 'state' && !needed.has(symbol),
    neededFor: needed.get(symbol) ?? [],
    equations: choices.map(({ slug, definition }) => ({
      slug,
      title: definition.title,
      gives: definition.gives,
    })),
    filledBy: chosen ? equationInUse(chosen.slug, chosen.definition, symbol, sheet, duty) : null,
  };
}

function quantityField(quantity: Quantity, key: string): FormField {
  const entry = QUANTITIES[quantity.is];
  return {
    kind: 'quantity',
    key,
    label: quantityWords(quantity),
    symbolTex: symbolTex(quantity.symbol, quantity.tex),
    unit: quantity.unit,
    units: unitsFor(quantity.unit, entry),
    startUnit: usualUnitFor(quantity.unit, entry),
    hint: quantity.meaning ?? entry?.hint ?? null,
    optional: quantity.role === 'state',
    equations: [],
    filledBy: null,
    neededFor: [],
  };
}

function groupField(group: Group): FormField {
  return {
    kind: 'group',
    key: group.symbol,
    label: group.name,
    symbolTex: symbolTex(group.symbol, group.tex),
    unit: '1',
    units: ['1'],
    startUnit: '1',
    hint: group.note ?? null,
    optional: false,
    equations: [],
    filledBy: null,
    neededFor: [],
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
      served.push({ key: onSheet.symbol, symbol: quantity.symbol, label: quantityWords(onSheet) });
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
        label: quantityWords(quantity),
        unit: quantity.unit,
      })),
  };
}
