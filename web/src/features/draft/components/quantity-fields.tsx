import { QUANTITIES, serves, unitsFor } from '@merestone/engine';
import { memo } from 'react';
import { formatUnit } from '../../../shared/format/format-unit';
import { QUANTITY_STATES, ROLES } from '../model/choices';
import { DICTIONARY_CHOICES } from '../model/dictionary-choices';
import type { QuantityRow } from '../model/draft-form';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { PickField } from './fields/pick-field';
import { SearchField } from './fields/search-field';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';

interface QuantityFieldsProps {
  row: QuantityRow;
  at: number;
  path: string;
  tables: readonly string[];
}

/** One quantity: its letter, what it stands for, its unit; what is rarely needed is folded away. */
export const QuantityFields = memo(function QuantityFields({ row, at, path, tables }: QuantityFieldsProps) {
  const { change, problemAt } = useDraftTools();
  const edit = (patch: Partial<QuantityRow>) => change({ do: 'edit-row', list: 'quantities', at, patch });
  const entry = QUANTITIES[row.is];
  const units = entry ? unitsFor(entry.unit, entry) : [];
  const choose = (is: string) => {
    const chosen = QUANTITIES[is];
    edit({
      is,
      ...(row.symbol.trim() === '' && chosen ? { symbol: chosen.symbol } : {}),
      ...(row.unit.trim() === '' && chosen ? { unit: chosen.unit } : {}),
    });
  };
  return (
    <>
      <div className="draft-quantity">
        <TextField
          path={`${path}.symbol`}
          label="Symbol"
          value={row.symbol}
          onChange={(symbol) => edit({ symbol })}
          code
        />
        <SearchField
          id={draftFieldId(`${path}.is`)}
          label="Stands for"
          value={row.is}
          choices={DICTIONARY_CHOICES}
          onChoose={choose}
          error={problemAt(`${path}.is`)?.message}
          hint={entry?.hint}
          placeholder="words of its name"
        />
        <TextField
          path={`${path}.unit`}
          label="Unit"
          value={row.unit}
          onChange={(unit) => edit({ unit })}
          list={`${draftFieldId(path)}-units`}
          code
        />
        <datalist id={`${draftFieldId(path)}-units`}>
          {units.map((unit) => (
            <option key={unit} value={unit}>
              {formatUnit(unit)}
            </option>
          ))}
        </datalist>
      </div>
      <details className="draft-more">
        <summary>{moreWords(row)}</summary>
        <div className="draft-grid">
          <PickField
            path={`${path}.role`}
            label="Role"
            value={row.role}
            choices={ROLES}
            onChange={(role) => edit({ role })}
          />
          <PickField
            path={`${path}.at`}
            label="Taken at"
            value={row.at}
            choices={QUANTITY_STATES}
            onChange={(state) => edit({ at: state })}
          />
          <TextField
            path={`${path}.meaning`}
            label="Meaning here (optional)"
            value={row.meaning}
            onChange={(meaning) => edit({ meaning })}
            hint="Where the dictionary’s words are not enough."
          />
          <TextField
            path={`${path}.tex`}
            label="Typeset as (optional)"
            value={row.tex}
            onChange={(tex) => edit({ tex })}
            hint="TeX, where the symbol itself would be set wrongly."
            code
          />
          {tables.length > 0 ? (
            <PickField
              path={`${path}.table`}
              label="Filled by table"
              value={row.table}
              choices={[
                { value: '', label: 'none' },
                ...tables.map((name) => ({ value: name, label: name })),
              ]}
              onChange={(table) => edit({ table })}
            />
          ) : null}
        </div>
        <EquationTicks row={row} path={path} onChange={(equations) => edit({ equations })} />
      </details>
    </>
  );
});

interface EquationTicksProps {
  row: QuantityRow;
  path: string;
  onChange: (equations: string[]) => void;
}

/** The property equations that may fill the quantity; one that the register no longer has stays listed. */
function EquationTicks({ row, path, onChange }: EquationTicksProps) {
  const { equations, problemAt } = useDraftTools();
  const fitting = equations.filter(({ gives }) => row.is !== '' && serves(gives, row.is));
  const gone = row.equations.filter((slug) => !fitting.some((equation) => equation.slug === slug));
  if (fitting.length === 0 && gone.length === 0) return null;
  const problem = problemAt(`${path}.equations`);
  return (
    <fieldset className="draft-ticks" id={draftFieldId(`${path}.equations`)} tabIndex={-1}>
      <legend>Property equations that may fill it</legend>
      {[...fitting, ...gone.map((slug) => ({ slug, title: `${slug} (does not give this)` }))].map(
        ({ slug, title }) => (
          <TickField
            key={slug}
            path={`${path}.equations.${slug}`}
            label={title}
            checked={row.equations.includes(slug)}
            onChange={(ticked) =>
              onChange(ticked ? [...row.equations, slug] : row.equations.filter((one) => one !== slug))
            }
          />
        ),
      )}
      {problem ? <p className="field-error">{problem.message}</p> : null}
    </fieldset>
  );
}

/** What is folded away, so that nothing has to be unfolded to be known. */
function moreWords({ role, at, meaning, table, equations }: QuantityRow): string {
  const said = [
    ROLES.find(({ value }) => role !== '' && value === role)?.label,
    at && `taken at ${at}`,
    meaning,
    table && `filled by table ${table}`,
    equations.length > 0 &&
      `${equations.length} property ${equations.length === 1 ? 'equation' : 'equations'}`,
  ].filter(Boolean);
  return said.length > 0 ? said.join('; ') : 'role, state, meaning, where its value may come from';
}
