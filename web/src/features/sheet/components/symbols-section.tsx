import { symbolTex, type CorrelationDefinition, type DefinitionTex } from '@merestone/engine';
import { memo, type ReactNode } from 'react';
import { formatUnit } from '../../../shared/format/format-unit';
import { coefficientTitle, nameOfResult } from '../../../shared/format/part-words';
import { InlineEquation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarkedText } from '../../../shared/ui/marked-text';
import { QuantityMeaning } from '../../../shared/ui/on-sheet/quantity-meaning';
import { SetTable } from '../../../shared/ui/set-table';
import { MarginRow } from '../../../shared/ui/sheet-page';
import type { LiveReadings } from '../model/live-readings';
import {
  AVERAGING_WORDS,
  FORCE_WORDS,
  STATE_WORDS,
  WALL_WORDS,
  accuracyText,
} from '../../../shared/format/plain-words';
import '../../../shared/ui/on-sheet/symbol-note.css';

interface SymbolsSectionProps {
  definition: CorrelationDefinition;
  tex: DefinitionTex | null;
  live: LiveReadings;
}

interface SymbolRow {
  symbol: string;
  tex: string;
  meaning: ReactNode;
  unit: string;
}

/** Every symbol: what it means here, how it is defined, its unit, and its value in the duty above. */
export const SymbolsSection = memo(function SymbolsSection({ definition, tex, live }: SymbolsSectionProps) {
  return (
    <MarginRow heading={<h2>Symbols</h2>} notes={<SymbolNotes definition={definition} />}>
      <SetTable label="Symbols">
        <thead>
          <tr>
            <th scope="col">Symbol</th>
            <th scope="col">Meaning here</th>
            <th scope="col">Unit</th>
            <th scope="col" className="number">
              Value
            </th>
          </tr>
        </thead>
        <tbody>
          {rowsOf(definition, tex).map((row) => {
            const reading = live.values[row.symbol];
            return (
              <tr key={row.symbol}>
                <th scope="row">
                  <InlineEquation tex={row.tex} />
                </th>
                <td>{row.meaning}</td>
                <td className="unit">{formatUnit(row.unit) || '1'}</td>
                <td className="number">
                  {reading ? <Figure value={reading.value} exactly={reading.given ?? false} /> : null}
                </td>
              </tr>
            );
          })}
        </tbody>
      </SetTable>
    </MarginRow>
  );
});

function SymbolNotes({ definition }: { definition: CorrelationDefinition }) {
  const { averaging, wall, drivingForce, accuracy } = definition;
  const sentence = [AVERAGING_WORDS[averaging], WALL_WORDS[wall], FORCE_WORDS[drivingForce]].join('; ');
  return (
    <>
      <MarginNote title="Property state">{STATE_WORDS[definition.propertyState]}</MarginNote>
      <MarginNote title="Meant as">{`${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`}</MarginNote>
      <MarginNote title="Accuracy">
        <MarkedText text={accuracyText(accuracy)} />
      </MarginNote>
    </>
  );
}

function rowsOf(definition: CorrelationDefinition, tex: DefinitionTex | null): SymbolRow[] {
  const quantities = definition.quantities.map((quantity) => ({
    symbol: quantity.symbol,
    tex: symbolTex(quantity.symbol, quantity.tex),
    meaning: <QuantityMeaning quantity={quantity} />,
    unit: quantity.unit,
  }));
  const lines = [...(tex?.groups ?? []), ...(tex?.intermediates ?? [])].map((line) => {
    const group = definition.groups.find(({ symbol }) => symbol === line.symbol);
    const note = group?.note ?? definition.intermediates?.find(({ symbol }) => symbol === line.symbol)?.note;
    return {
      symbol: line.symbol,
      tex: line.symbolTex,
      meaning: (
        <>
          {line.name}
          {group && line.formulas[0] ? (
            <>
              , <InlineEquation tex={line.formulas[0].tex} />
            </>
          ) : null}
          {note ? <span className="symbol-note">{note}</span> : null}
        </>
      ),
      unit: line.unit,
    };
  });
  const results = (tex?.parts ?? []).flatMap(({ key, title, result, coefficient }) => [
    {
      symbol: result.symbol,
      tex: result.symbolTex,
      meaning: nameOfResult(definition, key) ?? title,
      unit: result.unit,
    },
    ...(coefficient
      ? [
          {
            symbol: coefficient.symbol,
            tex: coefficient.symbolTex,
            meaning: coefficientTitle({ title }),
            unit: coefficient.unit,
          },
        ]
      : []),
  ]);
  return [...lines, ...results, ...quantities];
}
