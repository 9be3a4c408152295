import { fieldsOf, type FormSection } from '../model/duty-form';
import type { DutyControls } from './duty-controls';
import { DutyItem } from './duty-field';

interface DutySectionProps {
  section: FormSection;
  controls: DutyControls;
}

/** The fields that belong together; what nothing needs so far is folded away. */
export function DutySection({ section, controls }: DutySectionProps) {
  const grid = (
    <div className="duty-grid">
      {section.items.map((item) => (
        <DutyItem key={item.key} item={item} controls={controls} />
      ))}
    </div>
  );
  if (!section.folded)
    return (
      <fieldset className="duty-section">
        <legend>{section.title}</legend>
        {grid}
      </fieldset>
    );
  const typed = fieldsOf([section]).some(({ key }) => (controls.duty.typed[key]?.text ?? '') !== '');
  return (
    <details className="duty-more" open={typed || undefined}>
      <summary>{section.title}</summary>
      {grid}
    </details>
  );
}
