import type { Conversion, Numbers } from '@merestone/engine';
import { lowerFirst } from '../../../shared/format/lower-first';
import { InlineEquation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { SetTable } from '../../../shared/ui/set-table';
import { setBasis } from '../model/set-symbol';
import { Mark } from './mark';

const MEANT: Readonly<Record<Conversion['basis'], string>> = {
  k_c: 'gas, concentration',
  k_G: 'gas, partial pressure',
  k_y: 'gas, mole fraction',
  F: 'free of drift',
  k_L: 'liquid, concentration',
  k_x: 'liquid, mole fraction',
};

/** The coefficient on the other bases, or what has to be known first. */
export function BasesTable({ numbers, mark }: { numbers: Numbers; mark: string | null }) {
  const parts = numbers.parts.filter((part) => part.conversions.length > 0);
  return parts.map((part) => (
    <SetTable key={part.key} label={`Other bases, ${part.title}`}>
      <thead>
        <tr>
          <th scope="col">{parts.length > 1 ? `Other bases, ${part.title.toLowerCase()}` : 'Other bases'}</th>
          <th scope="col">Driving force</th>
          <th scope="col" className="number">
            Value
          </th>
        </tr>
      </thead>
      <tbody>
        {part.conversions.map((conversion) => (
          <BasisRow key={conversion.basis} conversion={conversion} mark={mark} />
        ))}
      </tbody>
    </SetTable>
  ));
}

function BasisRow({ conversion, mark }: { conversion: Conversion; mark: string | null }) {
  const { basis, symbol, value, unit, missing, assumes } = conversion;
  return (
    <tr>
      <th scope="row">
        <InlineEquation tex={setBasis(symbol)} />
      </th>
      <td>
        {MEANT[basis]}
        {assumes ? <span className="table-words">takes for granted: {lowerFirst(assumes)}</span> : null}
      </td>
      <td className="number">
        {value === null ? (
          <span className="table-words">needs {missing.join(', ')}</span>
        ) : (
          <>
            <Figure value={value} unit={unit} /> <Mark words={mark} />
          </>
        )}
      </td>
    </tr>
  );
}
