import type { CheckReport } from '@merestone/engine';
import { memo } from 'react';
import { CHECK_KINDS } from '../model/choices';
import type { CheckRow, TableForm } from '../model/draft-form';
import type { DraftSymbol } from '../model/draft-symbols';
import { CheckReportLines } from './check-report-lines';
import { useDraftTools } from './draft-context';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';
import { ValueRows } from './value-rows';

interface CheckFieldsProps {
  row: CheckRow;
  at: number;
  path: string;
  symbols: readonly DraftSymbol[];
  tables: readonly TableForm[];
  report: CheckReport | undefined;
}

/** One worked check with what becomes of it. */
export const CheckFields = memo(function CheckFields(props: CheckFieldsProps) {
  const { row, at, path, symbols, tables, report } = props;
  const { change } = useDraftTools();
  const edit = (patch: Partial<CheckRow>) => change({ do: 'edit-row', list: 'checks', at, patch });
  return (
    <>
      <div className="draft-grid">
        <TextField
          path={`${path}.title`}
          label="What it works out"
          value={row.title}
          onChange={(title) => edit({ title })}
        />
        <PickField
          path={`${path}.kind`}
          label="Kind"
          value={row.kind}
          choices={CHECK_KINDS}
          onChange={(kind) => edit({ kind })}
        />
      </div>
      <TextField
        path={`${path}.source`}
        label={row.kind === 'published' ? 'Where it is printed' : 'Who computed it (optional)'}
        value={row.source}
        onChange={(source) => edit({ source })}
        hint={row.kind === 'published' ? 'Book or paper, example or table, page.' : undefined}
      />
      <ValueRows
        title="Inputs"
        path={`${path}.inputs`}
        rows={row.inputs}
        symbols={symbols.filter(({ kind }) => kind === 'quantity' || kind === 'group')}
        listed={symbols.filter(({ kind }) => kind === 'quantity')}
        listWords="list every quantity"
        onChange={(inputs) => edit({ inputs })}
      />
      {tables
        .filter(({ name }) => name !== '')
        .map(({ name, title, rows }) => (
          <PickField
            key={name}
            path={`${path}.rows.${name}`}
            label={`Row of ${title || name}`}
            value={row.rows.find((chosen) => chosen.name === name)?.key ?? ''}
            choices={[
              { value: '', label: 'none' },
              ...rows.map(({ key, label }) => ({ value: key, label: label || key })),
            ]}
            onChange={(key) =>
              edit({ rows: [...row.rows.filter((chosen) => chosen.name !== name), { name, key }] })
            }
          />
        ))}
      <CheckEquations row={row} path={path} onChange={(equations) => edit({ equations })} />
      <ValueRows
        title="Expected"
        path={`${path}.expected`}
        rows={row.expected}
        symbols={symbols.filter(({ kind }) => kind !== 'quantity')}
        listed={symbols.filter(({ kind }) => kind === 'result' || kind === 'coefficient')}
        listWords="list the results"
        onChange={(expected) => edit({ expected })}
      />
      <div className="draft-grid">
        <TextField
          path={`${path}.tolerancePercent`}
          label="Tolerance, %"
          value={row.tolerancePercent}
          onChange={(tolerancePercent) => edit({ tolerancePercent })}
          hint="As far as the printed figures are rounded."
          number
        />
        <LongTextField
          path={`${path}.note`}
          label="Note (optional)"
          value={row.note}
          onChange={(note) => edit({ note })}
          rows={1}
        />
      </div>
      <CheckReportLines report={report} />
    </>
  );
});

interface CheckEquationsProps {
  row: CheckRow;
  path: string;
  onChange: (equations: CheckRow['equations']) => void;
}

/** Inputs of the check that a property equation fills; its own inputs are then given as rho.T. */
function CheckEquations({ row, path, onChange }: CheckEquationsProps) {
  const { live } = useDraftTools();
  const fillable = live.form.quantities.filter(({ equations }) => equations.length > 0);
  if (fillable.length === 0 && row.equations.length === 0) return null;
  return (
    <details className="draft-more" open={row.equations.length > 0 || undefined}>
      <summary>Inputs that a property equation fills</summary>
      <div className="draft-grid">
        {fillable.map(({ symbol, equations }) => (
          <PickField
            key={symbol}
            path={`${path}.equations.${symbol}`}
            label={`${symbol} is`}
            value={row.equations.find((one) => one.symbol === symbol)?.slug ?? ''}
            choices={[
              { value: '', label: 'given above' },
              ...equations.map((slug) => ({ value: slug, label: slug })),
            ]}
            onChange={(slug) =>
              onChange([...row.equations.filter((one) => one.symbol !== symbol), { symbol, slug }])
            }
          />
        ))}
      </div>
    </details>
  );
}
