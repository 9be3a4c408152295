import { Button } from 'antd';
import type { KeyboardEvent, ReactNode } from 'react';
import type { ListChange } from '../model/change-draft';
import type { ListName, Row } from '../model/draft-form';
import { emptyRow } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';

interface RowListProps<R extends Row> {
  list: ListName;
  rows: readonly R[];
  /** What one row is called: `group`. */
  noun: string;
  /** The member that is typed first; empty where the row is itself the field. */
  first: string;
  /** What stands here while there is no row. */
  empty?: ReactNode;
  /** What a row is called by, beside its number. */
  titleOf?: (row: R) => string;
  children: (row: R, at: number, path: string) => ReactNode;
}

/** Rows that are added, moved and taken out, all of it by keyboard as well: Enter adds the next, Alt and an arrow moves. */
export function RowList<R extends Row>(props: RowListProps<R>) {
  const { list, rows, noun, first, empty, titleOf, children } = props;
  const { change } = useDraftTools();
  const focusOn = (at: number) =>
    focusSoon(draftFieldId(first ? `${list}[${at}].${first}` : `${list}[${at}]`));
  const add = (at: number) => {
    change(rowAdded(list, at));
    focusOn(at);
  };
  const remove = (at: number) => {
    change({ do: 'remove-row', list, at });
    if (rows.length > 1) focusOn(Math.max(0, at - 1));
    else focusSoon(addButtonId(list));
  };
  const move = (at: number, by: -1 | 1) => {
    if (at + by < 0 || at + by >= rows.length) return;
    change({ do: 'move-row', list, at, by });
    focusOn(at + by);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>, at: number) => {
    const inLine = event.target instanceof HTMLInputElement && event.target.type !== 'checkbox';
    if (event.key === 'Enter' && inLine && !event.ctrlKey && !event.metaKey) add(at + 1);
    else if (event.altKey && event.key === 'ArrowUp') move(at, -1);
    else if (event.altKey && event.key === 'ArrowDown') move(at, 1);
    else return;
    event.preventDefault();
  };
  return (
    <>
      {rows.length === 0 && empty ? <p className="draft-empty">{empty}</p> : null}
      {rows.map((row, at) => {
        const path = `${list}[${at}]`;
        const name = titleOf?.(row).trim() || String(at + 1);
        return (
          <div
            key={row.id}
            role="group"
            aria-label={`${noun} ${name}`}
            className="draft-row"
            id={first ? draftFieldId(path) : undefined}
            tabIndex={-1}
            onKeyDown={(event) => onKeyDown(event, at)}
          >
            {children(row, at, path)}
            <div className="draft-row-acts">
              <RowAct what={`Move ${noun} ${name} up`} disabled={at === 0} onClick={() => move(at, -1)}>
                up
              </RowAct>
              <RowAct
                what={`Move ${noun} ${name} down`}
                disabled={at === rows.length - 1}
                onClick={() => move(at, 1)}
              >
                down
              </RowAct>
              <RowAct what={`Remove ${noun} ${name}`} onClick={() => remove(at)}>
                remove
              </RowAct>
            </div>
          </div>
        );
      })}
      <Button id={addButtonId(list)} onClick={() => add(rows.length)}>
        Add a {noun}
      </Button>
    </>
  );
}

interface RowActProps {
  what: string;
  disabled?: boolean;
  onClick: () => void;
  children: string;
}

/** A small act in words, told in full to those who do not see the row it stands in. */
export function RowAct({ what, disabled = false, onClick, children }: RowActProps) {
  return (
    <button type="button" className="draft-act" aria-label={what} disabled={disabled} onClick={onClick}>
      {children}
    </button>
  );
}

function addButtonId(list: ListName): string {
  return `draft-add-${list}`;
}

function rowAdded(list: ListName, at: number): ListChange {
  // The list and its row are of one kind, which the union of all lists cannot see.
  return { do: 'add-row', list, at, row: emptyRow(list) } as ListChange;
}

/** After the change has been drawn. */
export function focusSoon(id: string): void {
  window.setTimeout(() => document.getElementById(id)?.focus());
}
