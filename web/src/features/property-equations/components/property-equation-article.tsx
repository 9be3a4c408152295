import { compilePropertyEquation, propertyTex, symbolTex, QUANTITIES, type LineTex } from '@merestone/engine';
import { useMemo, type ReactNode } from 'react';
import type { PropertyEquationSheet } from '../../../shared/api/types';
import { formatUnit } from '../../../shared/format/format-unit';
import { lowerFirst } from '../../../shared/format/lower-first';
import { BoundStrip } from '../../../shared/ui/bound-strip/bound-strip';
import { Equation, InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import { RunningHead } from '../../../shared/ui/running-head';
import { SetTable } from '../../../shared/ui/set-table';
import { MarginRow, SheetPage } from '../../../shared/ui/sheet-page';
import { givenName } from '../model/given-name';
import './property-equations.css';

interface PropertyEquationArticleProps {
  equation: PropertyEquationSheet;
  sources: ReactNode;
  checks: ReactNode;
}

/** A property equation as a page: the formula, where it holds, its symbols and its checks. */
export function PropertyEquationArticle({ equation, sources, checks }: PropertyEquationArticleProps) {
  const { definition } = equation;
  return (
    <SheetPage
      title={equation.title}
      subtitle={`For ${lowerFirst(equation.fluid)}.`}
      runningHead={
        <RunningHead
          geometry="Property equation"
          correlation={givenName(equation.gives)}
          revision={equation.revision}
          standing={equation.standing}
          hash={equation.hash}
        />
      }
    >
      <MarginRow
        notes={
          <>
            {sources}
            {definition.assumes ? (
              <MarginNote title="Takes for granted">{definition.assumes}</MarginNote>
            ) : null}
            {definition.cautions.map((caution) => (
              <MarginNote key={caution} title="Mind">
                {caution}
              </MarginNote>
            ))}
          </>
        }
      >
        <Formulas equation={equation} />
      </MarginRow>
      <Bounds equation={equation} />
      <Symbols equation={equation} />
      {definition.accuracy ? (
        <>
          <h2>Accuracy</h2>
          <p>{definition.accuracy.text}</p>
        </>
      ) : null}
      {checks}
    </SheetPage>
  );
}

function Formulas({ equation: { slug, definition, gives, unit } }: { equation: PropertyEquationSheet }) {
  const tex = useMemo(() => {
    const compilation = compilePropertyEquation(slug, definition);
    return compilation.ok ? propertyTex(compilation.compiled) : null;
  }, [slug, definition]);
  const lines = [...(tex?.intermediates ?? []), ...(tex?.answer ? [answerLine(tex.answer, gives)] : [])];
  if (lines.length === 0) return <p>The equation cannot be set: its definition does not hold together.</p>;
  return (
    <div className="property-formulas">
      {lines.map((line, index) =>
        line.formulas.map(({ tex: formula, whenTex }) => (
          <Equation key={line.symbol + formula} tex={`${line.symbolTex} = ${formula}`} number={index + 1}>
            {whenTex ? (
              <>
                for <InlineEquation tex={whenTex} />
              </>
            ) : null}
          </Equation>
        )),
      )}
      {definition.dimensional ? (
        <p className="property-units">
          A dimensional formula: each quantity goes in as a number in the unit given below; the answer is in{' '}
          {formatUnit(unit) || 'no unit'}.
        </p>
      ) : null}
    </div>
  );
}

/** The answer under the symbol that the dictionary has for it. */
function answerLine(answer: LineTex, gives: string): LineTex {
  const entry = QUANTITIES[gives];
  return entry ? { ...answer, symbolTex: symbolTex(entry.symbol) } : answer;
}

function Bounds({ equation: { definition } }: { equation: PropertyEquationSheet }) {
  const { bounds, quantities } = definition;
  if (bounds.length === 0) return null;
  return (
    <>
      <h2>Where it holds</h2>
      {bounds.map(({ on, stretches, place }) => {
        const quantity = quantities.find(({ symbol }) => symbol === on);
        return (
          <BoundStrip
            key={on}
            symbol={<InlineEquation tex={symbolTex(on, quantity?.tex)} />}
            label={`${quantity ? givenName(quantity.is) : on}, ${on}`}
            stretches={stretches}
            unit={quantity?.unit ?? '1'}
            note={place}
          />
        );
      })}
    </>
  );
}

function Symbols({ equation: { definition } }: { equation: PropertyEquationSheet }) {
  if (definition.quantities.length === 0) return null;
  return (
    <>
      <h2>Symbols</h2>
      <SetTable label="Symbols">
        <thead>
          <tr>
            <th scope="col">Symbol</th>
            <th scope="col">Meaning here</th>
            <th scope="col">Unit</th>
          </tr>
        </thead>
        <tbody>
          {definition.quantities.map(({ symbol, tex, is, meaning, unit }) => (
            <tr key={symbol}>
              <th scope="row">
                <InlineEquation tex={symbolTex(symbol, tex)} />
              </th>
              <td>
                {givenName(is)}
                {meaning ? <span className="property-meaning">{meaning}</span> : null}
              </td>
              <td className="unit">{formatUnit(unit) || '1'}</td>
            </tr>
          ))}
        </tbody>
      </SetTable>
    </>
  );
}
