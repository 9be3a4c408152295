import { fromSI } from '../quantity/unit.js';
import { holds } from '../bounds/interval.js';
import {
  unitOf,
  type CompiledLine,
  type CompiledQuantity,
  type CompiledSheet,
  type CompiledVariant,
} from '../sheet/compiled.js';
import type { Problem } from './outcome.js';

/** Gives a quantity's value in SI, or null after adding what is missing to the set. */
export type Supply = (quantity: CompiledQuantity, missing: Set<string>) => number | null;

/**
 * Works out symbols on demand, each once, in the order in which they become possible.
 * It knows nothing of bounds: whether a number may be shown is decided afterwards.
 */
export class Reckoner {
  readonly values: Float64Array;
  /** Lines computed, in order. */
  readonly solved: string[] = [];
  /** The formula that was used, by symbol. */
  readonly used = new Map<string, CompiledVariant>();
  /** Lines of pieces of which none holds. */
  readonly gaps = new Set<string>();
  readonly faults: Problem[] = [];
  private readonly known = new Set<string>();
  /** Symbols that failed under the question at hand, with what they lack: each is tried once, however often it is needed. */
  private readonly failed = new Map<string, ReadonlySet<string>>();
  private depth = 0;

  constructor(
    readonly sheet: CompiledSheet,
    private readonly supply: Supply,
    givenGroups: ReadonlyMap<string, number> = new Map(),
  ) {
    this.values = new Float64Array(sheet.slots).fill(Number.NaN);
    for (const [symbol, value] of givenGroups) this.keep(symbol, value, sheet.lines.get(symbol)?.slot);
  }

  has(symbol: string): boolean {
    return this.known.has(symbol);
  }

  /** SI value; NaN when not solved. */
  valueOf(symbol: string): number {
    const slot = this.sheet.quantities.get(symbol)?.slot ?? this.sheet.lines.get(symbol)?.slot ?? -1;
    return this.values[slot] ?? Number.NaN;
  }

  /** Value in the symbol's own unit on the sheet. */
  shownValueOf(symbol: string): number {
    const unit = unitOf(this.sheet, symbol);
    return unit ? fromSI(this.valueOf(symbol), unit) : Number.NaN;
  }

  /** Makes a symbol's value known if that is possible; adds to `missing` what keeps it from being so. */
  solve(symbol: string, missing: Set<string> = new Set()): boolean {
    if (this.known.has(symbol)) return true;
    const lacking = this.failed.get(symbol) ?? this.attempt(symbol);
    for (const name of lacking ?? []) missing.add(name);
    return lacking === null;
  }

  /** Null where the symbol is now known, else what it lacks (nothing, where a gap or a fault is the reason). */
  private attempt(symbol: string): ReadonlySet<string> | null {
    const lacking = new Set<string>();
    this.depth += 1;
    const solved = this.solveAnew(symbol, lacking);
    this.depth -= 1;
    if (!solved) this.failed.set(symbol, lacking);
    if (this.depth === 0) this.failed.clear();
    return solved ? null : lacking;
  }

  private solveAnew(symbol: string, missing: Set<string>): boolean {
    const quantity = this.sheet.quantities.get(symbol);
    if (quantity) {
      const value = this.supply(quantity, missing);
      return value !== null && this.keep(symbol, value, quantity.slot);
    }
    const line = this.sheet.lines.get(symbol);
    return line !== undefined && this.solveLine(symbol, line, missing);
  }

  private solveLine(symbol: string, line: CompiledLine, missing: Set<string>): boolean {
    const conditions = new Set(line.variants.flatMap(({ when }) => when.map(({ on }) => on)));
    if (!this.solveAll(conditions, missing)) return false;
    const variant = line.variants.find(({ when }) =>
      when.every(({ on, interval }) => holds(this.shownValueOf(on), interval)),
    );
    if (!variant) {
      this.gaps.add(symbol);
      return false;
    }
    if (!this.solveAll(variant.needs, missing)) return false;
    const value = variant.run(this.values);
    if (!Number.isFinite(value)) {
      this.fault(symbol, line, variant);
      return false;
    }
    this.used.set(symbol, variant);
    this.solved.push(symbol);
    return this.keep(symbol, value, line.slot);
  }

  private solveAll(symbols: Iterable<string>, missing: Set<string>): boolean {
    let all = true;
    for (const symbol of symbols) all = this.solve(symbol, missing) && all;
    return all;
  }

  private keep(symbol: string, value: number, slot: number | undefined): true {
    if (slot !== undefined) this.values[slot] = value;
    this.known.add(symbol);
    return true;
  }

  private fault(symbol: string, { line }: CompiledLine, variant: CompiledVariant): void {
    const inputs = variant.needs
      .map((need) => `${need} = ${this.shownValueOf(need).toPrecision(4)}`)
      .join(', ');
    this.addFault({
      code: 'domain',
      field: symbol,
      message: `${line.name} (${symbol}) has no finite value at ${inputs}.`,
    });
  }

  /** Keeps a fault, once for each field. */
  addFault(problem: Problem): void {
    if (!this.faults.some(({ field }) => field === problem.field)) this.faults.push(problem);
  }
}
