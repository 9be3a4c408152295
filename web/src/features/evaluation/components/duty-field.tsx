import { inWords } from '../../../shared/format/in-words';
import { lowerFirst } from '../../../shared/format/lower-first';
import { InlineEquation } from '../../../shared/ui/equation';
import { QuantityField } from '../../../shared/ui/quantity-field/quantity-field';
import type { FormField, FormItem } from '../model/duty-form';
import { fieldId } from '../model/field-id';
import type { DutyControls } from './duty-controls';
import { FilledQuantity } from './filled-quantity';
import { RowChoice } from './row-choice';

interface DutyFieldProps {
  field: FormField;
  controls: DutyControls;
}

/** A quantity that is typed, or filled by a property equation where the sheet allows one. */
export function DutyField({ field, controls }: DutyFieldProps) {
  const { key, filledBy } = field;
  const id = fieldId(key);
  const symbol = <InlineEquation tex={field.symbolTex} />;
  return (
    <div className={filledBy && filledBy.own.length > 0 ? 'duty-item duty-item-wide' : 'duty-item'}>
      {filledBy ? (
        <FilledQuantity field={field} equation={filledBy} filled={controls.filledOf(key)} symbol={symbol} />
      ) : (
        <QuantityField
          id={id}
          label={field.label}
          symbol={symbol}
          typed={controls.duty.typed[key] ?? { text: '', unit: field.startUnit }}
          units={field.units}
          hint={field.hint}
          optional={field.optional}
          needed={neededWords(field, controls)}
          error={controls.errorOf(key)}
          onChange={(typed) => controls.change({ do: 'type', key, typed })}
        />
      )}
      {field.equations.length > 0 ? <SourceChoice field={field} controls={controls} /> : null}
      {filledBy && filledBy.own.length > 0 ? (
        <div className="duty-own" role="group" aria-label={`For ${filledBy.title}`}>
          {filledBy.own.map((item) => (
            <DutyItem key={item.key} item={item} controls={controls} />
          ))}
        </div>
      ) : null}
    </div>
  );
}

/** What waits for this value, as long as it is not there. */
function neededWords({ key, neededFor }: FormField, { duty }: DutyControls): string | undefined {
  const empty = (duty.typed[key]?.text ?? '').trim() === '';
  return empty && neededFor.length > 0
    ? `Needed now, for ${inWords(neededFor.map((name) => lowerFirst(name)))}.`
    : undefined;
}

/** Where the value comes from: typed in, or a published property equation. */
function SourceChoice({ field, controls }: DutyFieldProps) {
  return (
    <label className="duty-source">
      <span>
        <span className="heard-only">{field.label}: </span>taken from
      </span>
      <select
        value={field.filledBy?.slug ?? ''}
        onChange={(event) =>
          controls.change({ do: 'choose-equation', key: field.key, slug: event.target.value || null })
        }
      >
        <option value="">my own value</option>
        {field.equations.map(({ slug, title }) => (
          <option key={slug} value={slug}>
            {title}
          </option>
        ))}
      </select>
    </label>
  );
}

/** One thing the form asks for: a field, or a row of a table. A filled field asks for more such things. */
export function DutyItem({ item, controls }: { item: FormItem; controls: DutyControls }) {
  return item.kind === 'row' ? (
    <RowChoice picker={item} controls={controls} />
  ) : (
    <DutyField field={item} controls={controls} />
  );
}
