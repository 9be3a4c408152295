import type { CorrelationDefinition, Numbers } from '@merestone/engine';
import { nameOfResult } from '../../../shared/format/part-words';
import { InlineEquation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { SetTable } from '../../../shared/ui/set-table';
import { setSymbol } from '../model/set-symbol';
import { Mark } from './mark';

interface GroupsTableProps {
  numbers: Numbers;
  mark: string | null;
  definition: CorrelationDefinition;
}

interface Row {
  symbol: string;
  name: string;
  value: number;
  unit: string;
  /** Whether it rests on the formula, and so on a deviation where there is one. */
  derived: boolean;
}

/** Groups, named steps and results with their values. */
export function GroupsTable({ numbers, mark, definition }: GroupsTableProps) {
  const rows = rowsOf(numbers, definition);
  return (
    <SetTable label="Groups and results">
      <thead>
        <tr>
          <th scope="col">Symbol</th>
          <th scope="col">Groups and results</th>
          <th scope="col" className="number">
            Value
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ symbol, name, value, unit, derived }) => (
          <tr key={symbol}>
            <th scope="row">
              <InlineEquation tex={setSymbol(definition, symbol)} />
            </th>
            <td>{name}</td>
            <td className="number">
              <Figure value={value} unit={unit} /> {derived ? <Mark words={mark} /> : null}
            </td>
          </tr>
        ))}
      </tbody>
    </SetTable>
  );
}

function rowsOf(numbers: Numbers, definition: CorrelationDefinition): Row[] {
  const groups = Object.entries(numbers.groups).map(([symbol, value]) => ({
    symbol,
    name: definition.groups.find((group) => group.symbol === symbol)?.name ?? 'group',
    value,
    unit: '1',
    derived: false,
  }));
  const steps = Object.entries(numbers.intermediates).map(([symbol, { value, unit }]) => ({
    symbol,
    name: definition.intermediates?.find((line) => line.symbol === symbol)?.name ?? 'step',
    value,
    unit,
    derived: true,
  }));
  const results = numbers.parts.map(({ key, title, result }) => ({
    symbol: result.symbol,
    name: nameOfResult(definition, key) ?? title,
    value: result.value,
    unit: result.unit,
    derived: true,
  }));
  return [...groups, ...steps, ...results];
}
