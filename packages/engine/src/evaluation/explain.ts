import { formatNumber, numberTex, putInTex } from '../expression/number-text.js';
import { isCompoundTex } from '../expression/is-compound-tex.js';
import { symbolTex } from '../expression/symbol-tex.js';
import { treeTex } from '../expression/tree-tex.js';
import { CONSTANTS } from '../quantity/constants.js';
import { fromSI } from '../quantity/unit.js';
import { unitOf, type CompiledSheet } from '../sheet/compiled.js';
import { PROPERTY_ANSWER } from '../sheet/lines.js';
import type { Step } from './outcome.js';
import type { Reckoner } from './reckoner.js';
import { filledValue, type FilledQuantity } from './supplies.js';

/** TeX of a symbol as its sheet sets it. */
export function sheetSymbolTex(sheet: CompiledSheet, symbol: string): string {
  const override = sheet.quantities.get(symbol)?.definition.tex ?? sheet.lines.get(symbol)?.line.tex;
  return symbolTex(symbol, override);
}

/** A formula in symbols. */
export function formulaTex(sheet: CompiledSheet, tree: Parameters<typeof treeTex>[0]): string {
  return treeTex(tree, (name) => {
    const tex = sheetSymbolTex(sheet, name);
    return { tex, compound: isCompoundTex(tex) };
  });
}

/** Writes out the lines that were computed, in the order in which they were. */
export function lineSteps(reckoner: Reckoner): Step[] {
  return reckoner.solved.flatMap((symbol) => {
    const compiled = reckoner.sheet.lines.get(symbol);
    const used = reckoner.used.get(symbol);
    if (!compiled || !used) return [];
    const { line, unit } = compiled;
    const letter = sheetSymbolTex(reckoner.sheet, symbol);
    const value = fromSI(reckoner.valueOf(symbol), unit);
    const note = used.title ? `${line.name}; ${used.title}` : line.name;
    return [
      {
        kind: line.kind,
        symbol,
        symbolTex: letter,
        tex: `${letter} = ${formulaTex(reckoner.sheet, used.tree)}`,
        texWithNumbers: `${letter} = ${numbersTex(reckoner, used.tree, line.dimensional)} = ${valueTex(value, unit.text)}`,
        value,
        unit: unit.text,
        note,
      },
    ];
  });
}

/** A property equation as one step of the sheet it serves. */
export function propertyStep(sheet: CompiledSheet, filled: FilledQuantity): Step {
  const { symbol, equation, reckoner } = filled;
  const { definition } = equation;
  const used = reckoner.used.get(PROPERTY_ANSWER);
  const letter = sheetSymbolTex(sheet, symbol);
  const { value, unit } = filledValue(sheet, filled);
  const formula = used ? formulaTex(reckoner.sheet, used.tree) : '';
  const numbers = used ? numbersTex(reckoner, used.tree, definition.dimensional ?? false) : '';
  return {
    kind: 'property',
    symbol,
    symbolTex: letter,
    tex: `${letter} = ${formula}`,
    texWithNumbers: `${letter} = ${numbers} = ${valueTex(value, unit)}`,
    value,
    unit,
    note: definition.assumes ? `${definition.title}. Assumes: ${definition.assumes}` : definition.title,
  };
}

/** Values put in for symbols: in SI, or in the sheet's units where the formula is dimensional. */
function numbersTex(reckoner: Reckoner, tree: Parameters<typeof treeTex>[0], dimensional: boolean): string {
  return treeTex(tree, (name) => {
    const constant = CONSTANTS[name];
    if (constant) return name === 'pi' ? { tex: '\\pi', compound: false } : putInTex(constant.value);
    const unit = unitOf(reckoner.sheet, name);
    const si = reckoner.valueOf(name);
    return putInTex(dimensional && unit ? fromSI(si, unit) : si);
  });
}

/** A value with its unit upright behind a thin space. */
export function valueTex(value: number, unit: string): string {
  return unit === '1' ? numberTex(value) : `${numberTex(value)}\\,${unitTex(unit)}`;
}

/** `kg/(m^2 s)` as kg/(m² s) in upright TeX. */
export function unitTex(unit: string): string {
  const body = unit
    .replaceAll('%', '\\%')
    .replaceAll(' ', '\\,')
    .replace(/deg([CF])/g, '{}^{\\circ}$1')
    .replace(/(?<![A-Za-z])[uµμ](?=(?:m|g|l|L|s|mol|Pa|bar|J|W|N|A|V)(?![A-Za-z]))/g, '\\mu ')
    .replace(/\^(-?\d+(?:\.\d+)?)/g, '^{$1}');
  return `\\mathrm{${body}}`;
}

/** A value with its unit in plain text, for copies and messages. */
export function valueText(value: number, unit: string, digits = 4): string {
  return unit === '1' ? formatNumber(value, digits) : `${formatNumber(value, digits)} ${unit}`;
}
