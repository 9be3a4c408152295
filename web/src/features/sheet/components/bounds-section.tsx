import {
  QUANTITIES,
  symbolTex,
  type Bound,
  type CorrelationDefinition,
  type Finding,
} from '@merestone/engine';
import { Fragment } from 'react';
import type { Sheet } from '../../../shared/api/types';
import { BoundStrip } from '../../../shared/ui/bound-strip/bound-strip';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarkedText } from '../../../shared/ui/marked-text';
import { MarginRow } from '../../../shared/ui/sheet-page';
import type { LiveReadings } from '../model/live-readings';
import { boundWords } from '../model/plain-words';
import { sentence } from '../model/sentence';

interface BoundsSectionProps {
  sheet: Sheet;
  live: LiveReadings;
}

/** Where the sheet holds: a strip for each bounded symbol, with the value of the duty on it as it is typed. */
export function BoundsSection({ sheet, live }: BoundsSectionProps) {
  const { definition } = sheet;
  return (
    <MarginRow heading={<h2>Where it holds</h2>} notes={<BoundNotes definition={definition} />}>
      <ul className="bounds">
        {definition.bounds.map((bound) => (
          <BoundLine
            key={bound.on}
            bound={bound}
            definition={definition}
            finding={live.findings.find((finding) => finding.symbol === bound.on)}
          />
        ))}
      </ul>
    </MarginRow>
  );
}

function BoundNotes({ definition }: { definition: CorrelationDefinition }) {
  const { restrictions, cautions } = definition;
  const told = placesOf(definition.bounds);
  return (
    <>
      {told.length > 0 ? (
        <MarginNote title="Bounds">
          {told.map(([text, symbols]) => (
            <p key={text}>
              {symbols.map((on, i) => (
                <Fragment key={on}>
                  {i > 0 ? ', ' : ''}
                  <InlineEquation tex={symbolOf(definition, on).tex} />
                </Fragment>
              ))}
              : <MarkedText text={text} />
            </p>
          ))}
        </MarginNote>
      ) : null}
      {restrictions.length > 0 ? (
        <MarginNote title="Only for">
          {restrictions.map((restriction) => (
            <p key={restriction}>
              <MarkedText text={sentence(restriction)} />
            </p>
          ))}
        </MarginNote>
      ) : null}
      {cautions.map((caution) => (
        <MarginNote key={caution} title="Mind">
          <MarkedText text={sentence(caution)} />
        </MarginNote>
      ))}
    </>
  );
}

/** Where the bounds stand in their sources; the same words once for all symbols they are about. */
function placesOf(bounds: readonly Bound[]): [string, string[]][] {
  const told = new Map<string, string[]>();
  for (const { on, basis, place, note } of bounds) {
    const text = [place, note].filter(Boolean).map(sentence).join(' ');
    if (text && basis !== 'none') told.set(text, [...(told.get(text) ?? []), on]);
  }
  return [...told];
}

interface BoundLineProps {
  bound: Bound;
  definition: CorrelationDefinition;
  finding: Finding | undefined;
}

function BoundLine({ bound, definition, finding }: BoundLineProps) {
  const { tex, name, unit } = symbolOf(definition, bound.on);
  return (
    <li>
      <BoundStrip
        symbol={<InlineEquation tex={tex} />}
        label={`${name}, ${bound.on}`}
        stretches={bound.stretches}
        unit={unit}
        reading={finding ?? null}
        note={boundWords(bound)}
      />
    </li>
  );
}

function symbolOf(
  definition: CorrelationDefinition,
  on: string,
): { tex: string; name: string; unit: string } {
  const quantity = definition.quantities.find(({ symbol }) => symbol === on);
  if (quantity)
    return {
      tex: symbolTex(on, quantity.tex),
      name: QUANTITIES[quantity.is]?.title ?? quantity.is.replaceAll('-', ' '),
      unit: quantity.unit,
    };
  const group = definition.groups.find(({ symbol }) => symbol === on);
  if (group) return { tex: symbolTex(on, group.tex), name: group.name, unit: '1' };
  const line = definition.intermediates?.find(({ symbol }) => symbol === on);
  return { tex: symbolTex(on, line?.tex), name: line?.name ?? on, unit: line?.unit ?? '1' };
}
