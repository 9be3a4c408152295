import { Button } from 'antd';
import type { FormulaForm, PieceForm } from '../model/draft-form';
import { emptyPiece } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { ExpressionField } from './fields/expression-field';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';
import { ConditionFields } from './condition-fields';
import { RowAct, focusSoon } from './row-list';

interface FormulaFieldsProps {
  /** Place of the line that the formula belongs to. */
  path: string;
  formula: FormulaForm;
  onChange: (patch: Partial<FormulaForm>) => void;
  label: string;
}

/** One expression, or pieces of one, each with the conditions it holds under. */
export function FormulaFields({ path, formula, onChange, label }: FormulaFieldsProps) {
  const { inPieces, pieces } = formula;
  const editPiece = (at: number, patch: Partial<PieceForm>) =>
    onChange({ pieces: pieces.map((piece, i) => (i === at ? { ...piece, ...patch } : piece)) });
  const split = (on: boolean) =>
    onChange({
      inPieces: on,
      pieces:
        on && pieces.length === 0
          ? [{ ...emptyPiece(), expression: formula.expression }, emptyPiece()]
          : pieces,
    });
  return (
    <>
      {inPieces ? (
        <div id={draftFieldId(`${path}.pieces`)} tabIndex={-1} className="draft-pieces">
          {pieces.map((piece, at) => (
            <PieceFields
              key={piece.id}
              piece={piece}
              number={at + 1}
              path={`${path}.pieces[${at}]`}
              onChange={(patch) => editPiece(at, patch)}
              onRemove={() => onChange({ pieces: pieces.filter((_, i) => i !== at) })}
            />
          ))}
          <Button
            size="small"
            onClick={() => {
              onChange({ pieces: [...pieces, emptyPiece()] });
              focusSoon(draftFieldId(`${path}.pieces[${pieces.length}].expression`));
            }}
          >
            Add a piece
          </Button>
        </div>
      ) : (
        <ExpressionField
          path={`${path}.expression`}
          label={label}
          value={formula.expression}
          onChange={(expression) => onChange({ expression })}
          hint={
            formula.expression === ''
              ? '+ - * / ^ and brackets; sqrt, exp, ln, log10, min, max and others: 0.023*Re^0.83*Sc^(1/3).'
              : undefined
          }
        />
      )}
      <TickField
        path={`${path}.inPieces`}
        label="The expression changes with a range: write it in pieces"
        checked={inPieces}
        onChange={split}
      />
    </>
  );
}

interface PieceFieldsProps {
  piece: PieceForm;
  number: number;
  path: string;
  onChange: (patch: Partial<PieceForm>) => void;
  onRemove: () => void;
}

function PieceFields({ piece, number, path, onChange, onRemove }: PieceFieldsProps) {
  return (
    <div
      role="group"
      aria-label={`piece ${number}`}
      className="draft-piece"
      id={draftFieldId(path)}
      tabIndex={-1}
    >
      <ExpressionField
        path={`${path}.expression`}
        label={`Piece ${number}`}
        value={piece.expression}
        onChange={(expression) => onChange({ expression })}
      />
      <ConditionFields path={path} when={piece.when} onChange={(when) => onChange({ when })} />
      <TextField
        path={`${path}.title`}
        label="Called (optional)"
        value={piece.title}
        onChange={(title) => onChange({ title })}
        hint="Laminar, transition …"
      />
      <RowAct what={`Remove this piece, ${number}`} onClick={onRemove}>
        remove this piece
      </RowAct>
    </div>
  );
}
