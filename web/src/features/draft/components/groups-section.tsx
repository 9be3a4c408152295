import { GROUPS, groupForSheet, type Quantity } from '@merestone/engine';
import { memo, useState } from 'react';
import { GROUP_CHOICES } from '../model/dictionary-choices';
import type { GroupRow, QuantityRow } from '../model/draft-form';
import { emptyGroup } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { ExpressionField } from './fields/expression-field';
import { SearchField } from './fields/search-field';
import { TextField } from './fields/text-field';
import { RowList, focusSoon } from './row-list';

interface GroupsSectionProps {
  rows: readonly GroupRow[];
  quantities: readonly QuantityRow[];
}

/** The dimensionless numbers, picked from the dictionary or defined anew. */
export const GroupsSection = memo(function GroupsSection({ rows, quantities }: GroupsSectionProps) {
  return (
    <DraftSection
      section="groups"
      about="Dimensionless numbers over the symbols above and over each other. Each has to close: nothing may be left over."
    >
      <GroupPicker rows={rows} quantities={quantities} />
      <RowList
        list="groups"
        rows={rows}
        noun="group"
        first="symbol"
        titleOf={(row) => row.symbol}
        empty="No group so far. A formula in its own units can do without."
      >
        {(row, at, path) => <GroupFields row={row} at={at} path={path} />}
      </RowList>
    </DraftSection>
  );
});

/** Puts a group of the dictionary in the sheet's own symbols, and says what is left for a person to settle. */
function GroupPicker({ rows, quantities }: GroupsSectionProps) {
  const { change } = useDraftTools();
  const [told, setTold] = useState('');
  const pick = (symbol: string) => {
    const entry = GROUPS.find((group) => group.symbol === symbol);
    if (!entry) return;
    const { expression, open } = groupForSheet(entry, quantities as readonly Quantity[]);
    const row = { ...emptyGroup(), symbol: entry.symbol, name: entry.name, expression };
    change({ do: 'add-row', list: 'groups', row });
    setTold([entry.hint, ...open.map(openWords)].join(' '));
    focusSoon(draftFieldId(`groups[${rows.length}].${open.length > 0 ? 'expression' : 'symbol'}`));
  };
  return (
    <div className="draft-picker">
      <SearchField
        id="draft-pick-group"
        label="Pick a named group"
        value=""
        choices={GROUP_CHOICES}
        onChoose={pick}
        hint="Re, Sc, Gz … with its usual definition, in the symbols of this sheet."
      />
      <p role="status" className="draft-told">
        {told}
      </p>
    </div>
  );
}

function openWords({ symbol, words, candidates }: ReturnType<typeof groupForSheet>['open'][number]): string {
  return candidates.length === 0
    ? `The sheet has no ${words}: ${symbol} stands in its place.`
    : `The ${words} can be ${candidates.join(' or ')}: write the one that is meant for ${symbol}.`;
}

interface GroupFieldsProps {
  row: GroupRow;
  at: number;
  path: string;
}

const GroupFields = memo(function GroupFields({ row, at, path }: GroupFieldsProps) {
  const { change } = useDraftTools();
  const edit = (patch: Partial<GroupRow>) => change({ do: 'edit-row', list: 'groups', at, patch });
  return (
    <>
      <div className="draft-named">
        <TextField
          path={`${path}.symbol`}
          label="Symbol"
          value={row.symbol}
          onChange={(symbol) => edit({ symbol })}
          code
        />
        <TextField
          path={`${path}.name`}
          label="Name"
          value={row.name}
          onChange={(name) => edit({ name })}
          placeholder="with the length it stands on, where several could be meant"
        />
      </div>
      <ExpressionField
        path={`${path}.expression`}
        label="Definition"
        value={row.expression}
        onChange={(expression) => edit({ expression })}
      />
      <details className="draft-more">
        <summary>{row.note || 'note, typeset form'}</summary>
        <div className="draft-grid">
          <TextField
            path={`${path}.note`}
            label="Note (optional)"
            value={row.note}
            onChange={(note) => edit({ note })}
          />
          <TextField
            path={`${path}.tex`}
            label="Typeset as (optional)"
            value={row.tex}
            onChange={(tex) => edit({ tex })}
            code
          />
        </div>
      </details>
    </>
  );
});
