import { parse } from '../expression/parse.js';
import { symbolsOf } from '../expression/tree.js';
import type { Quantity } from '../sheet/common-schema.js';
import { isConstant } from './constants.js';
import { sameDimension } from './dimension.js';
import { GROUP_SLOTS, type GroupEntry, type GroupSlot } from './group-dictionary.js';
import { readUnit } from './unit.js';

/** A group's usual definition in the symbols of one sheet. */
export interface GroupForSheet {
  expression: string;
  /** What the sheet has nothing for, or more than one of: the usual symbol stands there, for a person to settle. */
  open: { symbol: string; words: string; candidates: string[] }[];
}

type OfSheet = Pick<Quantity, 'symbol' | 'is' | 'unit' | 'role'>;
const SLOTS: Readonly<Record<string, GroupSlot>> = GROUP_SLOTS;

/**
 * Writes a named group with the sheet's own symbols. A symbol is put in only where exactly one quantity fits; between
 * two densities nobody but a person can say which is meant.
 */
export function groupForSheet({ expression }: GroupEntry, quantities: readonly OfSheet[]): GroupForSheet {
  const parsed = parse(expression);
  const needs = parsed.ok ? [...symbolsOf(parsed.tree)].filter((symbol) => !isConstant(symbol)) : [];
  const put = new Map<string, string>();
  const open: GroupForSheet['open'] = [];
  for (const symbol of needs) {
    const slot = SLOTS[symbol];
    const candidates = slot ? quantities.filter((quantity) => fits(quantity, slot)).map((q) => q.symbol) : [];
    const [only, ...others] = candidates;
    if (only !== undefined && others.length === 0) put.set(symbol, only);
    else open.push({ symbol, words: slot?.words ?? symbol, candidates });
  }
  return {
    expression: expression.replace(
      /[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)?/g,
      (name) => put.get(name) ?? name,
    ),
    open,
  };
}

function fits({ is, unit, role }: OfSheet, slot: GroupSlot): boolean {
  const [own, asked] = [readUnit(unit), readUnit(slot.unit)];
  if (!own.ok || !asked.ok || !sameDimension(own.unit.dimension, asked.unit.dimension)) return false;
  return (slot.role !== undefined && role === slot.role) || slot.names.includes(is);
}
