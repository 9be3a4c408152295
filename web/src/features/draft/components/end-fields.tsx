import { CLOSINGS, NATURES } from '../model/choices';
import type { EndForm } from '../model/draft-form';
import { PickField } from './fields/pick-field';
import { SlugsField } from './fields/slugs-field';
import { TextField } from './fields/text-field';

interface EndFieldsProps {
  path: string;
  label: string;
  end: EndForm;
  onChange: (patch: Partial<EndForm>) => void;
}

/** One limit: its value, what it protects, and what lies beyond it. Without a value there is no limit on that side. */
export function EndFields({ path, label, end, onChange }: EndFieldsProps) {
  const given = end.value.trim() !== '';
  return (
    <div className="draft-end">
      <TextField
        path={`${path}.value`}
        label={label}
        value={end.value}
        onChange={(value) => onChange({ value })}
        placeholder="none stated"
        number
      />
      {given ? (
        <>
          <PickField
            path={`${path}.nature`}
            label="where"
            value={end.nature}
            choices={NATURES}
            onChange={(nature) => onChange({ nature })}
          />
          <PickField
            path={`${path}.closed`}
            label="itself is"
            value={end.closed || 'closed'}
            choices={CLOSINGS}
            onChange={(closed) => onChange({ closed: closed === 'open' ? 'open' : '' })}
          />
          {end.nature === 'data' ? (
            <TextField
              path={`${path}.reach`}
              label="Reach"
              value={end.reach}
              onChange={(reach) => onChange({ reach })}
              hint="Factor past it for a deviation; 2 unless told."
              number
            />
          ) : null}
          {end.nature === 'physical' ? null : (
            <SlugsField
              path={`${path}.beyond`}
              label="Sheets that hold beyond (optional)"
              value={end.beyond}
              onChange={(beyond) => onChange({ beyond })}
            />
          )}
        </>
      ) : null}
    </div>
  );
}
