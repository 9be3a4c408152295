import type { Run } from '../expression/compile-tree.js';
import type { Tree } from '../expression/tree.js';
import type { DictionaryEntry } from '../quantity/dictionary-entry.js';
import type { Unit } from '../quantity/unit.js';
import type { Interval } from '../bounds/interval.js';
import type { Bound, Quantity, Table } from './common-schema.js';
import type { CorrelationDefinition, PropertyEquationDefinition } from './definition.js';
import type { Line } from './lines.js';

export interface CompiledQuantity {
  definition: Quantity;
  entry: DictionaryEntry;
  unit: Unit;
  slot: number;
}

/** One formula with the conditions under which it is the one. */
export interface CompiledVariant {
  title: string | undefined;
  when: { on: string; interval: Interval }[];
  tree: Tree;
  needs: string[];
  run: Run;
}

export interface CompiledLine {
  line: Line;
  unit: Unit;
  slot: number;
  variants: CompiledVariant[];
}

/** A definition ready for evaluation. Values live in one vector, in SI, one slot a symbol. */
export interface CompiledSheet {
  quantities: ReadonlyMap<string, CompiledQuantity>;
  lines: ReadonlyMap<string, CompiledLine>;
  /** Symbols of the lines, each after those it needs. */
  order: readonly string[];
  tables: ReadonlyMap<string, Table>;
  bounds: readonly Bound[];
  slots: number;
  /** Symbols of the parts' results, the principal last. */
  answers: readonly string[];
}

export interface CompiledCorrelation {
  definition: CorrelationDefinition;
  sheet: CompiledSheet;
}

export interface CompiledEquation {
  key: string;
  definition: PropertyEquationDefinition;
  sheet: CompiledSheet;
}

/** Finds a property equation by slug; undefined where there is none in use. */
export type PropertyLibrary = (slug: string) => CompiledEquation | undefined;

export function unitOf(sheet: CompiledSheet, symbol: string): Unit | undefined {
  return sheet.quantities.get(symbol)?.unit ?? sheet.lines.get(symbol)?.unit;
}

export function slotOf(sheet: CompiledSheet, symbol: string): number | undefined {
  return sheet.quantities.get(symbol)?.slot ?? sheet.lines.get(symbol)?.slot;
}
