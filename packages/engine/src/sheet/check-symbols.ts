import type { Problem } from '../evaluation/outcome.js';
import { isFunctionName } from '../expression/tree.js';
import { isConstant } from '../quantity/constants.js';
import { QUANTITIES } from '../quantity/dictionary.js';
import { dimensionText, sameDimension } from '../quantity/dimension.js';
import { measuresSame, readUnit } from '../quantity/unit.js';
import { memberPath, type Calculable } from './lines.js';

/** Every symbol is defined once, is not reserved, has a unit that can be read, and fits its dictionary entry. */
export function checkSymbols(calculable: Calculable): Problem[] {
  const places = [
    ...calculable.quantities.map(({ symbol }, i) => ({ symbol, field: `quantities[${i}].symbol` })),
    ...calculable.lines.map((line) => ({ symbol: line.symbol, field: memberPath(line, 'symbol') })),
  ];
  const seen = new Map<string, string>();
  const problems: Problem[] = [];
  for (const { symbol, field } of places) {
    const before = seen.get(symbol);
    if (before) problems.push(definition(field, `${symbol} is defined before, at ${before}.`));
    else seen.set(symbol, field);
    if (isConstant(symbol)) problems.push(definition(field, `${symbol} is reserved for a constant.`));
    if (isFunctionName(symbol)) problems.push(definition(field, `${symbol} is the name of a function.`));
  }
  return [...problems, ...checkUnits(calculable), ...checkTables(calculable)];
}

function checkUnits({ quantities, lines }: Calculable): Problem[] {
  const problems: Problem[] = [];
  for (const [i, { is, unit, symbol }] of quantities.entries()) {
    const entry = Object.hasOwn(QUANTITIES, is) ? QUANTITIES[is] : undefined;
    const reading = readUnit(unit);
    if (!entry)
      problems.push(definition(`quantities[${i}].is`, `"${is}" is not in the quantity dictionary.`));
    if (!reading.ok)
      problems.push({ code: 'unit', field: `quantities[${i}].unit`, message: `${reading.reason}.` });
    const own = entry ? readUnit(entry.unit) : undefined;
    if (reading.ok && own?.ok && !measuresSame(reading.unit, own.unit))
      problems.push({
        code: 'dimension',
        field: `quantities[${i}].unit`,
        message: sameDimension(reading.unit.dimension, own.unit.dimension)
          ? `${symbol} in ${unit} and ${is} in ${entry?.unit} differ: one is an angular speed, the other is none.`
          : `${symbol} in ${unit} is ${dimensionText(reading.unit.dimension)}; ${is} is ${dimensionText(own.unit.dimension)}.`,
      });
  }
  for (const line of lines) {
    const reading = readUnit(line.unit);
    if (!reading.ok)
      problems.push({ code: 'unit', field: memberPath(line, 'unit'), message: `${reading.reason}.` });
  }
  return problems;
}

function checkTables({ tables, quantities }: Calculable): Problem[] {
  const problems: Problem[] = [];
  const names = new Set<string>();
  for (const [i, table] of tables.entries()) {
    if (names.has(table.name))
      problems.push(definition(`tables[${i}].name`, `There are two tables "${table.name}".`));
    names.add(table.name);
    const filled = new Set(quantities.filter((q) => q.table === table.name).map((q) => q.symbol));
    const keys = new Set<string>();
    for (const [j, row] of table.rows.entries()) {
      const field = `tables[${i}].rows[${j}]`;
      if (keys.has(row.key)) problems.push(definition(`${field}.key`, `There are two rows "${row.key}".`));
      keys.add(row.key);
      for (const symbol of Object.keys(row.values))
        if (!filled.has(symbol))
          problems.push(
            definition(
              `${field}.values.${symbol}`,
              `No quantity ${symbol} is filled by table ${table.name}.`,
            ),
          );
    }
  }
  for (const [i, { table }] of quantities.entries())
    if (table && !names.has(table))
      problems.push(definition(`quantities[${i}].table`, `There is no table "${table}".`));
  return problems;
}

export function definition(field: string, message: string): Problem {
  return { code: 'definition', field, message };
}
