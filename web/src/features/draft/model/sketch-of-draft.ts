import { sketchLines, type LineSketch, type SketchLine } from '@merestone/engine';
import type { DraftForm, FormulaForm } from './draft-form';

/** The equations of a draft as far as they can be typeset and proved, by their path in the definition. */
export function sketchOfDraft(form: DraftForm): ReadonlyMap<string, LineSketch> {
  const lines: SketchLine[] = [
    ...form.groups.map((group, i) => ({
      path: `groups[${i}].expression`,
      symbol: group.symbol.trim(),
      unit: '1',
      tex: group.tex.trim() || undefined,
      expression: group.expression,
    })),
    ...form.intermediates.flatMap((step, i) => formulaLines(step, step, `intermediates[${i}]`)),
    ...form.parts.flatMap(({ result, coefficient }, i) => [
      ...formulaLines(result, result, `parts[${i}].result`),
      ...(coefficient.present
        ? [
            {
              path: `parts[${i}].coefficient.expression`,
              symbol: coefficient.symbol.trim(),
              unit: coefficient.unit,
              tex: coefficient.tex.trim() || undefined,
              expression: coefficient.expression,
            },
          ]
        : []),
    ]),
  ];
  const quantities = form.quantities.map(({ symbol, unit, tex }) => ({
    symbol: symbol.trim(),
    unit,
    tex: tex.trim() || undefined,
  }));
  return new Map(sketchLines(quantities, lines).map((sketch) => [sketch.path, sketch]));
}

function formulaLines(
  formula: FormulaForm,
  { symbol, unit, tex, dimensional }: { symbol: string; unit: string; tex: string; dimensional: boolean },
  path: string,
): SketchLine[] {
  const line = { symbol: symbol.trim(), unit, tex: tex.trim() || undefined, dimensional };
  if (!formula.inPieces) return [{ ...line, path: `${path}.expression`, expression: formula.expression }];
  return formula.pieces.map(({ expression }, i) => ({
    ...line,
    path: `${path}.pieces[${i}].expression`,
    expression,
  }));
}
