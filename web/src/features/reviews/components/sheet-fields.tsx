import type { CorrelationDefinition } from '@merestone/engine';
import {
  AVERAGING_WORDS,
  FORCE_WORDS,
  READ_WORDS,
  STATE_WORDS,
  VERIFICATION_WORDS,
  WALL_WORDS,
  accuracyText,
} from '../../../shared/format/plain-words';
import { formatUnit } from '../../../shared/format/format-unit';
import { sentence } from '../../../shared/format/sentence';
import { quantityName, symbolOnSheet } from '../../../shared/format/symbol-on-sheet';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarkedText } from '../../../shared/ui/marked-text';
import { BoundOnSheet } from '../../../shared/ui/on-sheet/bound-on-sheet';
import { Citation } from '../../../shared/ui/on-sheet/citation';
import { EquationLine } from '../../../shared/ui/on-sheet/equation-line';
import { QuantityMeaning } from '../../../shared/ui/on-sheet/quantity-meaning';
import { equationFields } from './equation-fields';
import type { FieldGroup, FieldParts, SheetField } from './sheet-field';
import { TableOnSheet } from './table-on-sheet';

/** Every field of a sheet, in the order of its page. */
export function sheetFields(parts: FieldParts): FieldGroup[] {
  const { definition } = parts;
  const groups: FieldGroup[] = [
    { title: 'What it is about', fields: aboutFields(definition) },
    { title: 'Equations', fields: equationFields(parts) },
    { title: 'Where it holds', fields: boundFields(definition) },
    { title: 'Groups', fields: groupFields(parts) },
    { title: 'Quantities', fields: quantityFields(definition) },
    { title: 'Accuracy, restrictions and cautions', fields: trustFields(definition) },
    { title: 'Sources', fields: sourceFields(definition) },
    {
      title: 'Worked checks',
      fields: definition.checks.map(({ title }, i) => ({
        path: `checks[${i}]`,
        label: `Check: ${title}`,
        content: parts.check(i),
      })),
    },
  ];
  return groups.filter(({ fields }) => fields.length > 0);
}

function text(path: string, label: string, words: string): SheetField {
  return {
    path,
    label,
    content: (
      <p>
        <MarkedText text={words} />
      </p>
    ),
  };
}

function aboutFields(definition: CorrelationDefinition): SheetField[] {
  return [
    text('title', 'Title', definition.title),
    text('authors', 'Authors', definition.authors.join(', ')),
    text('year', 'Year', definition.year === null ? 'none on record' : String(definition.year)),
    text('geometry', 'Geometry', definition.geometry.replaceAll('-', ' ')),
    text('phase', 'Phase', definition.phase.replaceAll('-', ' ')),
    text('summary', 'Summary', definition.summary),
    text('averaging', 'Averaging', sentence(AVERAGING_WORDS[definition.averaging])),
    text('wall', 'Condition at the wall', sentence(WALL_WORDS[definition.wall])),
    text('drivingForce', 'Driving force of the data', sentence(FORCE_WORDS[definition.drivingForce])),
    text('propertyState', 'State of the properties', STATE_WORDS[definition.propertyState]),
  ];
}

function boundFields(definition: CorrelationDefinition): SheetField[] {
  return definition.bounds.map((bound, i) => {
    const place = [bound.place, bound.note].filter(Boolean).map(sentence).join(' ');
    return {
      path: `bounds[${i}]`,
      label: `Bound on ${symbolOnSheet(definition, bound.on).name}`,
      content: (
        <>
          <BoundOnSheet bound={bound} definition={definition} />
          {place ? (
            <p className="field-note">
              <MarkedText text={place} />
            </p>
          ) : null}
        </>
      ),
    };
  });
}

function groupFields({ definition, tex }: FieldParts): SheetField[] {
  return definition.groups.map(({ symbol, name, note }, i) => {
    const line = tex?.groups.find((one) => one.symbol === symbol);
    return {
      path: `groups[${i}]`,
      label: name,
      content: (
        <>
          {line ? <EquationLine line={line} /> : <p>{name}</p>}
          {note ? <p className="field-note">{note}</p> : null}
        </>
      ),
    };
  });
}

function quantityFields(definition: CorrelationDefinition): SheetField[] {
  const quantities = definition.quantities.map((quantity, i) => ({
    path: `quantities[${i}]`,
    label: quantityName(quantity.is),
    ownLabel: true,
    content: (
      <div className="field-quantity">
        <InlineEquation tex={symbolOnSheet(definition, quantity.symbol).tex} />
        <div>
          <QuantityMeaning quantity={quantity} />
          {quantity.equations?.length ? (
            <span className="symbol-note">
              May be filled by: {quantity.equations.join(', ').replaceAll('-', ' ')}.
            </span>
          ) : null}
        </div>
        <span className="field-unit">{formatUnit(quantity.unit) || '1'}</span>
      </div>
    ),
  }));
  const tables = (definition.tables ?? []).map((table, i) => ({
    path: `tables[${i}]`,
    label: `Table: ${table.title}`,
    content: <TableOnSheet table={table} definition={definition} />,
  }));
  return [...quantities, ...tables];
}

function trustFields({
  accuracy,
  restrictions,
  cautions,
  verification,
}: CorrelationDefinition): SheetField[] {
  return [
    text('accuracy', 'Accuracy', accuracyText(accuracy)),
    ...restrictions.map((words, i) => text(`restrictions[${i}]`, `Restriction ${i + 1}`, sentence(words))),
    ...cautions.map((words, i) => text(`cautions[${i}]`, `Caution ${i + 1}`, sentence(words))),
    text('verification', 'Verification', `${VERIFICATION_WORDS[verification.status]} ${verification.note}`),
  ];
}

function sourceFields({ sources }: CorrelationDefinition): SheetField[] {
  return sources.map((source, i) => ({
    path: `sources[${i}]`,
    label: sources.length === 1 ? 'Source' : `Source ${i + 1}`,
    content: (
      <p>
        <Citation source={source} /> {sentence(source.gives)} {READ_WORDS[source.read]}
      </p>
    ),
  }));
}
