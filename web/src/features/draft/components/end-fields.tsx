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
          {end.nature === 'physical' ? null : (
            <details className="draft-more draft-beyond">
              <summary>{pastWords(end)}</summary>
              {end.nature === 'data' ? (
                <TextField
                  path={`${path}.reach`}
                  label="Reach (optional)"
                  value={end.reach}
                  onChange={(reach) => onChange({ reach })}
                  hint="Factor past the limit up to which a deviation may be recorded; 2 unless told."
                  number
                />
              ) : null}
              <SlugsField
                path={`${path}.beyond`}
                label="Sheets that hold beyond (optional)"
                value={end.beyond}
                onChange={(beyond) => onChange({ beyond })}
              />
            </details>
          )}
        </>
      ) : null}
    </div>
  );
}

/** What is said of the other side, so that nothing has to be unfolded to be known. */
function pastWords({ nature, reach, beyond }: EndForm): string {
  const said = [
    nature === 'data' && reach !== '' && `reach ${reach}`,
    beyond.length > 0 && `${beyond.length} ${beyond.length === 1 ? 'sheet holds' : 'sheets hold'} beyond`,
  ].filter(Boolean);
  if (said.length > 0) return said.join('; ');
  return nature === 'data' ? 'reach, sheets that hold beyond' : 'sheets that hold beyond';
}
