import { compileTree, type Run, type SymbolReading } from '../expression/compile-tree.js';
import type { Problem } from '../evaluation/outcome.js';
import { CONSTANTS, isConstant } from '../quantity/constants.js';
import { QUANTITIES } from '../quantity/dictionary.js';
import { measuresSame, readUnit, type Unit } from '../quantity/unit.js';
import { checkBounds } from './check-bounds.js';
import { checkDimensions } from './check-dimensions.js';
import { checkSymbols, definition } from './check-symbols.js';
import { checkWorkedChecks } from './check-worked-checks.js';
import type {
  CompiledCorrelation,
  CompiledEquation,
  CompiledLine,
  CompiledQuantity,
  CompiledSheet,
} from './compiled.js';
import type { CorrelationDefinition, PropertyEquationDefinition } from './definition.js';
import { linesOfCorrelation, linesOfPropertyEquation, type Calculable } from './lines.js';
import { intervalOf } from './piece-intervals.js';
import { needsOf, readFormulas, type ReadLine } from './read-formulas.js';

export type Compilation<T> = { ok: true; compiled: T } | { ok: false; problems: Problem[] };

/** Checks a sheet's definition and makes it ready for evaluation. The value must have passed `checkStructure`. */
export function compileCorrelation(sheet: CorrelationDefinition): Compilation<CompiledCorrelation> {
  const calculable = linesOfCorrelation(sheet);
  const result = compileSheet(calculable, repeatedParts(sheet));
  return result.ok ? { ok: true, compiled: { definition: sheet, sheet: result.compiled } } : result;
}

/** The same for a property equation; `key` is its slug. */
export function compilePropertyEquation(
  key: string,
  equation: PropertyEquationDefinition,
): Compilation<CompiledEquation> {
  const result = compileSheet(linesOfPropertyEquation(equation), giftProblems(equation));
  return result.ok ? { ok: true, compiled: { key, definition: equation, sheet: result.compiled } } : result;
}

function compileSheet(calculable: Calculable, found: Problem[]): Compilation<CompiledSheet> {
  const problems = [
    ...found,
    ...checkSymbols(calculable),
    ...checkBounds(calculable),
    ...checkWorkedChecks(calculable),
  ];
  const formulas = readFormulas(calculable);
  problems.push(...formulas.problems);
  if (formulas.problems.length === 0)
    problems.push(
      ...checkDimensions(calculable, formulas.lines),
      ...missingBounds(calculable, formulas.lines),
    );
  if (problems.length > 0) return { ok: false, problems };
  return { ok: true, compiled: assemble(calculable, formulas.lines) };
}

function assemble(calculable: Calculable, lines: readonly ReadLine[]): CompiledSheet {
  const quantities = new Map<string, CompiledQuantity>();
  for (const [slot, quantity] of calculable.quantities.entries()) {
    const entry = QUANTITIES[quantity.is];
    if (entry)
      quantities.set(quantity.symbol, { definition: quantity, entry, unit: unitAt(quantity.unit), slot });
  }
  const slots = new Map<string, { slot: number; unit: Unit }>(quantities);
  for (const [i, { line }] of lines.entries())
    slots.set(line.symbol, { slot: quantities.size + i, unit: unitAt(line.unit) });
  const compiled = lines.map((read): [string, CompiledLine] => [read.line.symbol, compileLine(read, slots)]);
  return {
    quantities,
    lines: new Map(compiled),
    order: lines.map(({ line }) => line.symbol),
    tables: new Map(calculable.tables.map((table) => [table.name, table])),
    bounds: calculable.bounds,
    slots: slots.size,
    answers: calculable.answers,
  };
}

function compileLine(
  { line, formulas }: ReadLine,
  slots: ReadonlyMap<string, { slot: number; unit: Unit }>,
): CompiledLine {
  const unit = unitAt(line.unit);
  const symbol = symbolReader(slots, line.dimensional);
  return {
    line,
    unit,
    slot: slots.get(line.symbol)?.slot ?? 0,
    variants: formulas.map(({ title, when, tree, needs }) => {
      const run = compileTree(tree, symbol);
      return {
        title,
        when: when.map((condition) => ({ on: condition.on, interval: intervalOf(condition) })),
        tree,
        needs,
        run: line.dimensional ? inSI(run, unit) : run,
      };
    }),
  };
}

/** Slots hold SI; a dimensional formula reads and gives the sheet's own units. */
function symbolReader(slots: ReadonlyMap<string, { slot: number; unit: Unit }>, dimensional: boolean) {
  return (name: string): SymbolReading => {
    if (isConstant(name)) return { fixed: CONSTANTS[name]?.value ?? Number.NaN };
    const place = slots.get(name);
    const slot = place?.slot ?? -1;
    const { factor, offset } = place?.unit ?? { factor: 1, offset: 0 };
    if (!dimensional || (factor === 1 && offset === 0)) return { slot };
    return { run: (values) => ((values[slot] ?? Number.NaN) - offset) / factor };
  };
}

function inSI(run: Run, { factor, offset }: Unit): Run {
  if (factor === 1 && offset === 0) return run;
  return (slots) => run(slots) * factor + offset;
}

function unitAt(text: string): Unit {
  const reading = readUnit(text);
  if (!reading.ok) throw new RangeError(`unit ${text} passed the check and cannot be read`);
  return reading.unit;
}

/** A group that an equation stands on, itself or through intermediates and conditions, says how far it goes, or that nobody says so. */
function missingBounds({ lines, bounds }: Calculable, read: readonly ReadLine[]): Problem[] {
  const bounded = new Set(bounds.map(({ on }) => on));
  const groups = new Set(lines.filter(({ kind }) => kind === 'group').map(({ symbol }) => symbol));
  const bySymbol = new Map(read.map((line) => [line.line.symbol, line]));
  const used = new Set<string>();
  const walk = (line: ReadLine | undefined): void => {
    for (const need of line ? needsOf(line) : []) {
      if (used.has(need)) continue;
      used.add(need);
      // A group's own bound stands for what it is made of; an intermediate has none and passes on.
      if (!groups.has(need)) walk(bySymbol.get(need));
    }
  };
  for (const line of read) if (line.line.kind === 'result' || line.line.kind === 'coefficient') walk(line);
  return [...used]
    .filter((symbol) => groups.has(symbol) && !bounded.has(symbol))
    .map((symbol) =>
      definition('bounds', `${symbol} has no bound; where none is on record say so with the basis "none".`),
    );
}

/** What an equation gives is in the dictionary, and measured as it is there. */
function giftProblems({ gives, unit }: PropertyEquationDefinition): Problem[] {
  const entry = QUANTITIES[gives];
  if (!entry) return [definition('gives', `"${gives}" is not in the quantity dictionary.`)];
  const [own, needed] = [readUnit(unit), readUnit(entry.unit)];
  return !own.ok || !needed.ok || measuresSame(own.unit, needed.unit)
    ? []
    : [
        {
          code: 'dimension',
          field: 'unit',
          message: `${gives} is in ${entry.unit}; "${unit}" does not fit.`,
        },
      ];
}

function repeatedParts({ parts }: CorrelationDefinition): Problem[] {
  const keys = parts.map(({ key }) => key);
  return keys.flatMap((key, i) =>
    keys.indexOf(key) < i ? [definition(`parts[${i}].key`, `There are two parts "${key}".`)] : [],
  );
}
