import { symbolTex, type Bound, type CorrelationDefinition, type Finding } from '@merestone/engine';
import type { Sheet } from '../../../shared/api/types';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarginRow } from '../../../shared/ui/sheet-page';
import type { LiveReadings } from '../model/live-readings';
import { boundWords } from '../model/plain-words';

interface BoundsSectionProps {
  sheet: Sheet;
  live: LiveReadings;
}

/** Where the sheet holds: a strip for each bounded symbol, with the value of the duty on it as it is typed. */
export function BoundsSection({ sheet, live }: BoundsSectionProps) {
  const { definition } = sheet;
  return (
    <MarginRow notes={<BoundNotes definition={definition} />}>
      <h2>Where it holds</h2>
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
  if (definition.restrictions.length === 0) return null;
  return (
    <div className="notes-beside-heading">
      {definition.restrictions.map((restriction) => (
        <MarginNote key={restriction} title="Only for">
          {restriction}
        </MarginNote>
      ))}
    </div>
  );
}

interface BoundLineProps {
  bound: Bound;
  definition: CorrelationDefinition;
  finding: Finding | undefined;
}

function BoundLine({ bound, definition, finding }: BoundLineProps) {
  const { tex, name } = symbolOf(definition, bound.on);
  return (
    <li className="bound-line">
      <span className="bound-symbol" title={name}>
        <InlineEquation tex={tex} />
      </span>
      <span className="bound-strip">{finding?.message}</span>
      <span className="bound-words">
        {boundWords(bound)}
        {bound.note ? ` ${bound.note}` : ''}
      </span>
    </li>
  );
}

function symbolOf(
  definition: CorrelationDefinition,
  on: string,
): { tex: string; name: string; unit: string } {
  const quantity = definition.quantities.find(({ symbol }) => symbol === on);
  if (quantity)
    return { tex: symbolTex(on, quantity.tex), name: quantity.is.replaceAll('-', ' '), unit: quantity.unit };
  const group = definition.groups.find(({ symbol }) => symbol === on);
  if (group) return { tex: symbolTex(on, group.tex), name: group.name, unit: '1' };
  const line = definition.intermediates?.find(({ symbol }) => symbol === on);
  return { tex: symbolTex(on, line?.tex), name: line?.name ?? on, unit: line?.unit ?? '1' };
}
