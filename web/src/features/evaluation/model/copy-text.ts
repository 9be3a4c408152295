import type { Finding, Numbers, UsedEquation } from '@merestone/engine';
import { symbolText } from '../../../shared/format/symbol-parts';
import { formatUnit } from '../../../shared/format/format-unit';
import { NUMBER_SPACE } from '../../../shared/format/format-number';
import { accuracyOfResult } from '../../../shared/format/plain-words';
import { coefficientWords } from './coefficient-words';
import { firstSentence } from './first-sentence';
import type { EvaluatedSheet } from './evaluated-sheet';
import { findingLabel } from './finding-label';
import { notableFindings } from './refusing-findings';
import { unboundedWords } from './unbounded-words';
import type { Shown } from './shown-outcome';

interface CopyTextInput {
  sheet: EvaluatedSheet;
  shown: Extract<Shown, { kind: 'preview' | 'kept' }>;
}

/** The result as plain text with everything that must travel with it: mark, findings, provenance, caution. */
export function copyText({ sheet, shown }: CopyTextInput): string {
  const { outcome } = shown;
  const unbounded = unboundedWords(outcome.findings);
  const mark = outcome.outcome === 'deviating' ? outcome.mark : null;
  const blocks = [
    [
      sheet.title,
      `${sheet.slug}, rev ${sheet.revision}, ${sheet.standing}, content ${sheet.hash}`,
      recordLine(shown),
    ],
    mark ? [mark.toUpperCase(), ...deviationLines(shown)] : [],
    block('Given', inputLines(shown)),
    block(
      'Groups',
      Object.entries(outcome.groups).map(([symbol, value]) => line(symbol, value, '1')),
    ),
    block('Result', resultLines(outcome, mark)),
    block('Accuracy of the sheet', [accuracyOfResult(sheet.definition.accuracy)]),
    block('Other bases', basisLines(outcome, mark)),
    outcome.flux
      ? block('Flux', [
          `${line('N', outcome.flux.value, outcome.flux.unit)}${suffix(mark)}`,
          ...outcome.flux.warnings,
        ])
      : [],
    block('Findings', [
      ...notableFindings(outcome.findings).map((finding) => toldIn(finding, shown)),
      ...(unbounded ? [unbounded] : []),
    ]),
    block('Remarks', outcome.remarks),
    provenanceLines(shown),
    [shown.kind === 'kept' ? shown.outcome.caution : sheet.caution],
  ];
  return blocks
    .filter((lines) => lines.length > 0)
    .map((lines) => lines.join('\n'))
    .join('\n\n');
}

function block(title: string, lines: readonly string[]): string[] {
  return lines.length === 0 ? [] : [title, ...lines.map((text) => `  ${text}`)];
}

function recordLine(shown: CopyTextInput['shown']): string {
  return shown.kind === 'kept'
    ? `Kept ${shown.outcome.at} as ${shown.outcome.id}`
    : 'Preview, not on record: computed in the browser';
}

/** A finding in its words; where a deviation is on record for it, without the advice to record one. */
function toldIn({ symbol, message }: Finding, { outcome }: CopyTextInput['shown']): string {
  const recorded = outcome.outcome === 'deviating' && outcome.deviations.some((d) => d.symbol === symbol);
  const told = recorded ? firstSentence(message) : message;
  return told.startsWith(`${symbol} `) ? `${findingLabel(symbol)}${told.slice(symbol.length)}` : told;
}

function deviationLines(shown: CopyTextInput['shown']): string[] {
  return shown.outcome.outcome === 'deviating'
    ? shown.outcome.deviations.map(({ symbol, reason }) => `Deviation on ${findingLabel(symbol)}: ${reason}`)
    : [];
}

function inputLines({ request, outcome }: CopyTextInput['shown']): string[] {
  return [
    ...Object.entries(request.inputs).map(([symbol, { value, unit }]) => line(symbol, value, unit ?? '1')),
    ...Object.entries(outcome.rows).map(([table, key]) => `${table}: ${key}`),
    ...outcome.equations.map(
      (filled) => `${line(filled.symbol, filled.value, filled.unit)}${fromEquation(filled)}`,
    ),
  ];
}

function fromEquation({ title, assumes }: UsedEquation): string {
  return `  (filled by ${title}${assumes ? `; takes for granted: ${assumes}` : ''})`;
}

function resultLines({ parts, intermediates }: Numbers, mark: string | null): string[] {
  return [
    ...Object.entries(intermediates).map(
      ([symbol, { value, unit }]) => `${line(symbol, value, unit)}${suffix(mark)}`,
    ),
    ...parts.flatMap(({ result, coefficient }) => [
      `${line(result.symbol, result.value, result.unit)}${suffix(mark)}`,
      ...(coefficient
        ? [
            `${line(coefficient.symbol, coefficient.value, coefficient.unit)}${suffix(mark)}`,
            `  ${coefficientWords(coefficient)}`,
          ]
        : []),
    ]),
  ];
}

function basisLines({ parts }: Numbers, mark: string | null): string[] {
  return parts.flatMap(({ conversions }) =>
    conversions.map(({ symbol, value, unit, missing, assumes }) =>
      value === null
        ? `${symbolText(symbol)}: needs ${missing.join(', ')}`
        : `${line(symbol, value, unit)}${suffix(mark)}${assumes ? `  (takes for granted: ${assumes})` : ''}`,
    ),
  );
}

function provenanceLines(shown: CopyTextInput['shown']): string[] {
  if (shown.kind === 'preview') return [];
  const { slug, revision, hash, engine, equations, rows } = shown.outcome.provenance;
  return [
    `Computed with ${slug} rev ${revision} (${hash}), engine ${engine}`,
    ...equations.map((e) => `  ${e.key} rev ${e.revision} (${e.hash})`),
    ...Object.entries(rows).map(([table, key]) => `  ${table}: ${key}`),
  ];
}

/** Every digit: what is pasted elsewhere is not rounded twice. */
function line(symbol: string, value: number, unit: string): string {
  const set = formatUnit(unit).replaceAll(NUMBER_SPACE, ' ');
  return `${symbolText(symbol)} = ${value}${set ? ` ${set}` : ''}`;
}

function suffix(mark: string | null): string {
  return mark ? `  [${mark}]` : '';
}
