import type { ConditionForm } from '../model/draft-form';
import { CLOSINGS } from '../model/choices';
import { emptyCondition } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';
import { RowAct } from './row-list';

interface ConditionFieldsProps {
  /** Place of the piece. */
  path: string;
  when: readonly ConditionForm[];
  onChange: (when: ConditionForm[]) => void;
}

/** When a piece holds: one symbol between limits, or several at once. Neighbours meet without overlap by default. */
export function ConditionFields({ path, when, onChange }: ConditionFieldsProps) {
  const { live, problemAt } = useDraftTools();
  const symbols = live.symbols
    .filter(({ kind }) => kind !== 'coefficient')
    .map(({ symbol }) => ({ value: symbol, label: symbol }));
  const edit = (at: number, patch: Partial<ConditionForm>) =>
    onChange(when.map((condition, i) => (i === at ? { ...condition, ...patch } : condition)));
  const overlap = problemAt(`${path}.when`);
  return (
    <div id={draftFieldId(`${path}.when`)} tabIndex={-1}>
      {when.map((condition, at) => {
        const place = `${path}.when[${at}]`;
        return (
          <div key={at} className="draft-condition" id={draftFieldId(place)} tabIndex={-1}>
            <PickField
              path={`${place}.on`}
              label={at === 0 ? 'Holds for' : 'and for'}
              value={condition.on}
              choices={symbols}
              onChange={(on) => edit(at, { on })}
            />
            <TextField
              path={`${place}.lo`}
              label="from"
              value={condition.lo}
              onChange={(lo) => edit(at, { lo })}
              number
            />
            <PickField
              path={`${place}.loClosed`}
              label="which is"
              value={condition.loClosed || 'closed'}
              choices={CLOSINGS}
              onChange={(closed) => edit(at, { loClosed: closed === 'open' ? 'open' : '' })}
            />
            <TextField
              path={`${place}.hi`}
              label="up to"
              value={condition.hi}
              onChange={(hi) => edit(at, { hi })}
              number
            />
            <PickField
              path={`${place}.hiClosed`}
              label="which is"
              value={condition.hiClosed || 'open'}
              choices={CLOSINGS}
              onChange={(closed) => edit(at, { hiClosed: closed === 'closed' ? 'closed' : '' })}
            />
            {when.length > 1 ? (
              <RowAct
                what={`Remove condition ${at + 1}`}
                onClick={() => onChange(when.filter((_, i) => i !== at))}
              >
                remove
              </RowAct>
            ) : null}
          </div>
        );
      })}
      {overlap ? <p className="field-error">{overlap.message}</p> : null}
      <RowAct what="And another condition" onClick={() => onChange([...when, emptyCondition()])}>
        and another condition
      </RowAct>
    </div>
  );
}
