import type { Bound, CorrelationDefinition } from '@merestone/engine';
import { Fragment } from 'react';
import type { Sheet } from '../../../shared/api/types';
import { sentence } from '../../../shared/format/sentence';
import { symbolOnSheet } from '../../../shared/format/symbol-on-sheet';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarkedText } from '../../../shared/ui/marked-text';
import { BoundOnSheet } from '../../../shared/ui/on-sheet/bound-on-sheet';
import { MarginRow } from '../../../shared/ui/sheet-page';
import type { LiveReadings } from '../model/live-readings';

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
          <li key={bound.on}>
            <BoundOnSheet
              bound={bound}
              definition={definition}
              finding={live.findings.find((finding) => finding.symbol === bound.on)}
            />
          </li>
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
                  <InlineEquation tex={symbolOnSheet(definition, on).tex} />
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
