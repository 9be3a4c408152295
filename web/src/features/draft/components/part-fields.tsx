import { memo } from 'react';
import { PART_PHASES, RESULT_KINDS } from '../model/choices';
import type { PartRow, ResultForm } from '../model/draft-form';
import { suggestSlug } from '../model/suggest-slug';
import { CoefficientFields } from './coefficient-fields';
import { useDraftTools } from './draft-context';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';
import { FormulaFields } from './formula-fields';

interface PartFieldsProps {
  row: PartRow;
  at: number;
  path: string;
  /** Whether the sheet has no other part. */
  alone: boolean;
}

/** Usual symbol and unit of each kind of result, offered while none is written. */
const USUAL: Readonly<Record<string, { symbol: string; unit: string }>> = {
  Sherwood: { symbol: 'Sh', unit: '1' },
  Stanton: { symbol: 'St', unit: '1' },
  'j-factor': { symbol: 'j_D', unit: '1' },
  coefficient: { symbol: 'k_c', unit: 'm/s' },
  'volumetric-coefficient': { symbol: 'k_La', unit: '1/s' },
  'interfacial-area': { symbol: 'a', unit: '1/m' },
};

/** One equation with its result and the coefficient that follows from it. */
export const PartFields = memo(function PartFields({ row, at, path, alone }: PartFieldsProps) {
  const { change } = useDraftTools();
  const edit = (patch: Partial<PartRow>) => change({ do: 'edit-row', list: 'parts', at, patch });
  const { result } = row;
  const editResult = (patch: Partial<ResultForm>) => edit({ result: { ...result, ...patch } });
  const chooseKind = (kind: string) => {
    const before = USUAL[result.kind];
    const usual = USUAL[kind];
    const untouched = result.symbol === '' || result.symbol === before?.symbol;
    editResult({
      kind,
      ...(usual && untouched ? { symbol: usual.symbol } : {}),
      ...(usual && (result.unit === '' || result.unit === before?.unit) ? { unit: usual.unit } : {}),
    });
  };
  const followsTitle = row.key === '' || row.key === suggestSlug(row);
  return (
    <>
      <div className="draft-grid draft-grid-wide">
        <TextField
          path={`${path}.title`}
          label="What it gives"
          value={row.title}
          onChange={(title) =>
            edit({ title, ...(followsTitle && !alone ? { key: suggestSlug({ title }) } : {}) })
          }
          placeholder="Wall coefficient, mean over the length; gas side …"
        />
        <TextField
          path={`${path}.key`}
          label="Key"
          value={row.key}
          onChange={(key) => edit({ key })}
          hint={alone ? 'Of the only part: main.' : 'Names the part for scripts.'}
          code
        />
      </div>
      <div className="draft-result">
        <PickField
          path={`${path}.result.kind`}
          label="Result"
          value={result.kind}
          choices={RESULT_KINDS}
          onChange={chooseKind}
        />
        <TextField
          path={`${path}.result.symbol`}
          label="Symbol"
          value={result.symbol}
          onChange={(symbol) => editResult({ symbol })}
          code
        />
        <TextField
          path={`${path}.result.unit`}
          label="Unit"
          value={result.unit}
          onChange={(unit) => editResult({ unit })}
          hint="1 for none"
          code
        />
        <PickField
          path={`${path}.phase`}
          label="Phase"
          value={row.phase}
          choices={PART_PHASES}
          onChange={(phase) => edit({ phase })}
        />
      </div>
      <FormulaFields path={`${path}.result`} formula={result} onChange={editResult} label="Expression" />
      <TickField
        path={`${path}.result.dimensional`}
        label="A dimensional formula: its constant carries units"
        checked={result.dimensional}
        onChange={(dimensional) => editResult({ dimensional })}
        hint="Numbers then go in and come out in the units written on this sheet; no dimension is proved."
      />
      <CoefficientFields
        path={`${path}.coefficient`}
        coefficient={row.coefficient}
        onChange={(patch) => edit({ coefficient: { ...row.coefficient, ...patch } })}
      />
    </>
  );
});
