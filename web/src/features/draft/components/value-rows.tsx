import { unitsFor } from '@merestone/engine';
import type { KeyboardEvent } from 'react';
import type { ValueForm } from '../model/draft-form';
import type { DraftSymbol } from '../model/draft-symbols';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { RowAct, focusSoon } from './row-list';
import { ValueCell } from './value-cell';

interface ValueRowsProps {
  title: string;
  path: string;
  rows: readonly ValueForm[];
  /** What may be written here. */
  symbols: readonly DraftSymbol[];
  /** What the button puts in at once. */
  listed: readonly DraftSymbol[];
  listWords: string;
  onChange: (rows: ValueForm[]) => void;
}

/** Values by symbol, one a line; Enter adds the next line. */
export function ValueRows(props: ValueRowsProps) {
  const { title, path, rows, symbols, listed, listWords, onChange } = props;
  const problem = useDraftTools().problemAt(path);
  const edit = (at: number, patch: Partial<ValueForm>) =>
    onChange(rows.map((row, i) => (i === at ? { ...row, ...patch } : row)));
  const add = () => {
    onChange([...rows, { symbol: '', value: '', unit: '' }]);
    focusSoon(draftFieldId(`${path}[${rows.length}].symbol`));
  };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.key !== 'Enter' || !(event.target instanceof HTMLInputElement)) return;
    event.preventDefault();
    event.stopPropagation();
    add();
  };
  const lacking = listed.filter(({ symbol }) => !rows.some((row) => row.symbol === symbol));
  const listId = `${draftFieldId(path)}-symbols`;
  return (
    <fieldset className="draft-values" id={draftFieldId(path)} tabIndex={-1}>
      <legend>{title}</legend>
      <datalist id={listId}>
        {symbols.map(({ symbol, name }) => (
          <option key={symbol} value={symbol}>
            {name}
          </option>
        ))}
      </datalist>
      {rows.map((row, at) => {
        const known = symbols.find(({ symbol }) => symbol === row.symbol);
        const id = draftFieldId(`${path}[${at}]`);
        return (
          <div className="draft-value" key={at} onKeyDown={onKeyDown}>
            <ValueCell
              path={`${path}[${at}].symbol`}
              label={`Symbol ${at + 1} of ${title.toLowerCase()}`}
              value={row.symbol}
              list={listId}
              onChange={(symbol) =>
                edit(at, {
                  symbol,
                  ...(row.unit === '' ? { unit: unitOf(symbols, symbol) } : {}),
                })
              }
            />
            <ValueCell
              path={row.symbol.trim() ? `${path}.${row.symbol.trim()}` : `${path}[${at}].value`}
              label={`Value of ${row.symbol || 'the symbol'}`}
              value={row.value}
              onChange={(value) => edit(at, { value })}
              number
            />
            <ValueCell
              path={`${path}[${at}].unit`}
              label={`Unit of ${row.symbol || 'the symbol'}`}
              value={row.unit}
              placeholder="1"
              list={`${id}-units`}
              onChange={(unit) => edit(at, { unit })}
            />
            <datalist id={`${id}-units`}>
              {(known && known.unit !== '' ? unitsFor(known.unit) : []).map((unit) => (
                <option key={unit} value={unit} />
              ))}
            </datalist>
            <RowAct
              what={`Remove ${row.symbol || `line ${at + 1}`} from ${title.toLowerCase()}`}
              onClick={() => onChange(rows.filter((_, i) => i !== at))}
            >
              remove
            </RowAct>
          </div>
        );
      })}
      {problem ? <p className="field-error">{problem.message}</p> : null}
      <div className="draft-row-acts">
        <RowAct what={`Add a line to ${title.toLowerCase()}`} onClick={add}>
          add a line
        </RowAct>
        {lacking.length > 0 ? (
          <RowAct
            what={`${title}: ${listWords}`}
            onClick={() =>
              onChange([
                ...rows.filter(({ symbol, value }) => symbol !== '' || value !== ''),
                ...lacking.map(({ symbol, unit }) => ({
                  symbol,
                  value: '',
                  unit: unit === '1' ? '' : unit,
                })),
              ])
            }
          >
            {listWords}
          </RowAct>
        ) : null}
      </div>
    </fieldset>
  );
}

function unitOf(symbols: readonly DraftSymbol[], symbol: string): string {
  const unit = symbols.find((one) => one.symbol === symbol)?.unit ?? '';
  return unit === '1' ? '' : unit;
}
