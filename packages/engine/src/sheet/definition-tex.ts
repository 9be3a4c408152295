import { formulaTex, sheetSymbolTex } from '../evaluation/explain.js';
import { numberTex } from '../expression/number-text.js';
import type {
  CompiledCorrelation,
  CompiledEquation,
  CompiledLine,
  CompiledSheet,
  CompiledVariant,
} from './compiled.js';
import { PROPERTY_ANSWER } from './lines.js';

export interface LineTex {
  symbol: string;
  name: string;
  symbolTex: string;
  unit: string;
  /** One formula, or one for each piece with the conditions it holds under. */
  formulas: { tex: string; whenTex: string | null; title: string | null }[];
}

export interface PartTex {
  key: string;
  title: string;
  result: LineTex;
  coefficient: LineTex | null;
}

export interface DefinitionTex {
  groups: LineTex[];
  intermediates: LineTex[];
  parts: PartTex[];
}

/** A sheet's equations in symbols, for typesetting. TeX comes from the parsed expressions only. */
export function definitionTex({ definition, sheet }: CompiledCorrelation): DefinitionTex {
  const lineOf = (symbol: string): LineTex[] => {
    const compiled = sheet.lines.get(symbol);
    return compiled ? [lineTex(sheet, compiled)] : [];
  };
  return {
    groups: definition.groups.flatMap(({ symbol }) => lineOf(symbol)),
    intermediates: (definition.intermediates ?? []).flatMap(({ symbol }) => lineOf(symbol)),
    parts: definition.parts.flatMap(({ key, title, result, coefficient }) =>
      lineOf(result.symbol).map((line) => ({
        key,
        title,
        result: line,
        coefficient: coefficient ? (lineOf(coefficient.symbol)[0] ?? null) : null,
      })),
    ),
  };
}

/** The same for a property equation; its answer is set as the symbol it usually has. */
export function propertyTex({ sheet }: CompiledEquation): {
  intermediates: LineTex[];
  answer: LineTex | null;
} {
  const lines = [...sheet.lines.values()].map((compiled) => lineTex(sheet, compiled));
  return {
    intermediates: lines.filter(({ symbol }) => symbol !== PROPERTY_ANSWER),
    answer: lines.find(({ symbol }) => symbol === PROPERTY_ANSWER) ?? null,
  };
}

function lineTex(sheet: CompiledSheet, { line, unit, variants }: CompiledLine): LineTex {
  return {
    symbol: line.symbol,
    name: line.name,
    symbolTex: sheetSymbolTex(sheet, line.symbol),
    unit: unit.text,
    formulas: variants.map((variant) => ({
      tex: formulaTex(sheet, variant.tree),
      whenTex: variant.when.length === 0 ? null : whenTex(sheet, variant),
      title: variant.title ?? null,
    })),
  };
}

function whenTex(sheet: CompiledSheet, { when }: CompiledVariant): string {
  return when
    .map(({ on, interval: { lo, hi, loClosed, hiClosed } }) => {
      const below = lo === undefined ? '' : `${numberTex(lo, 6)} ${loClosed ? '\\le' : '<'} `;
      const above = hi === undefined ? '' : ` ${hiClosed ? '\\le' : '<'} ${numberTex(hi, 6)}`;
      const letter = sheetSymbolTex(sheet, on);
      if (hi === undefined && lo !== undefined)
        return `${letter} ${loClosed ? '\\ge' : '>'} ${numberTex(lo, 6)}`;
      return `${below}${letter}${above}`;
    })
    .join(',\\ ');
}
