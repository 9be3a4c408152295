import type { FormItem } from '../model/duty-form';
import type { DutyControls } from './duty-controls';
import { DutyField } from './duty-field';
import { RowChoice } from './row-choice';

/** One thing the form asks for: a field, or a row of a table. */
export function DutyItem({ item, controls }: { item: FormItem; controls: DutyControls }) {
  return item.kind === 'row' ? (
    <RowChoice picker={item} controls={controls} />
  ) : (
    <DutyField field={item} controls={controls} />
  );
}
