import { COEFFICIENT_BASES, PER, RATE_FORMS } from '../model/choices';
import type { CoefficientForm } from '../model/draft-form';
import { draftFieldId } from '../model/field-id';
import { ExpressionField } from './fields/expression-field';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';

interface CoefficientFieldsProps {
  path: string;
  coefficient: CoefficientForm;
  onChange: (patch: Partial<CoefficientForm>) => void;
}

/** The coefficient that follows from the result, and what exactly it is counted in. */
export function CoefficientFields({ path, coefficient, onChange }: CoefficientFieldsProps) {
  return (
    <div id={draftFieldId(path)} tabIndex={-1} className="draft-coefficient">
      <TickField
        path={`${path}.present`}
        label="A coefficient follows from the result"
        checked={coefficient.present}
        onChange={(present) => onChange({ present })}
        hint="Not where the result is itself the coefficient, or only an area."
      />
      {coefficient.present ? (
        <>
          <div className="draft-result">
            <TextField
              path={`${path}.symbol`}
              label="Coefficient"
              value={coefficient.symbol}
              onChange={(symbol) => onChange({ symbol })}
              hint="k_c, k_G …"
              code
            />
            <TextField
              path={`${path}.unit`}
              label="Unit"
              value={coefficient.unit}
              onChange={(unit) => onChange({ unit })}
              hint="m/s for k_c"
              code
            />
            <PickField
              path={`${path}.basis`}
              label="Driving force in"
              value={coefficient.basis}
              choices={COEFFICIENT_BASES}
              onChange={(basis) => onChange({ basis })}
            />
            <PickField
              path={`${path}.per`}
              label="Per"
              value={coefficient.per}
              choices={PER}
              onChange={(per) => onChange({ per })}
            />
          </div>
          <PickField
            path={`${path}.rateForm`}
            label="Rate form"
            value={coefficient.rateForm}
            choices={RATE_FORMS}
            onChange={(rateForm) => onChange({ rateForm })}
            hint="Whether the drift of the gas is in it: through a stagnant inert the factor P/p_BM stands in the expression."
          />
          <ExpressionField
            path={`${path}.expression`}
            label="Expression of the coefficient"
            value={coefficient.expression}
            onChange={(expression) => onChange({ expression })}
            hint={coefficient.expression === '' ? 'From the result: Sh*D/d.' : undefined}
          />
        </>
      ) : null}
    </div>
  );
}
