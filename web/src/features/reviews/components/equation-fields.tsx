import { formatUnit } from '../../../shared/format/format-unit';
import { EquationLine } from '../../../shared/ui/on-sheet/equation-line';
import type { FieldParts, SheetField } from './sheet-field';

/** The intermediates of a sheet and, of each of its parts, result and coefficient. */
export function equationFields({ definition, tex }: FieldParts): SheetField[] {
  const broken = <p>This equation cannot be set: the definition does not hold together.</p>;
  const lines = (definition.intermediates ?? []).map(({ symbol, name }, i) => {
    const line = tex?.intermediates.find((one) => one.symbol === symbol);
    return {
      path: `intermediates[${i}]`,
      label: name,
      content: line ? <EquationLine line={line} /> : broken,
    };
  });
  const parts = definition.parts.flatMap(({ key, title, coefficient }, i) => {
    const part = tex?.parts.find((one) => one.key === key);
    const result = {
      path: `parts[${i}].result`,
      label: `${title}: result`,
      content: part ? <EquationLine line={part.result} /> : broken,
    };
    if (!coefficient) return [result];
    const set = part?.coefficient ? <EquationLine line={part.coefficient} /> : broken;
    const words = `In ${formatUnit(coefficient.unit)}, on ${coefficient.basis.replaceAll('-', ' ')}, per unit ${coefficient.per}; ${coefficient.rateForm.replaceAll('-', ' ')}.`;
    return [
      result,
      {
        path: `parts[${i}].coefficient`,
        label: `${title}: coefficient`,
        content: (
          <>
            {set}
            <p className="field-note">{words}</p>
          </>
        ),
      },
    ];
  });
  return [...lines, ...parts];
}
