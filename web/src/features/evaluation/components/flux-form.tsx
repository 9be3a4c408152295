import type { DrivingForce, Flux } from '@merestone/engine';
import { unitsFor } from '@merestone/engine';
import { Figure } from '../../../shared/ui/figure';
import { QuantityField } from '../../../shared/ui/quantity-field/quantity-field';
import { FORCE_UNITS, type DutyChange, type TypedForce } from '../model/duty';
import type { FieldError } from '../model/field-error';
import { fieldId } from '../model/field-id';
import { Mark } from './mark';

interface FluxFormProps {
  force: TypedForce | null;
  flux: Flux | null;
  mark: string | null;
  errors: readonly FieldError[];
  change: (change: DutyChange) => void;
}

const KINDS: Readonly<Record<DrivingForce['kind'], string>> = {
  concentration: 'concentrations',
  'partial-pressure': 'partial pressures',
  'mole-fraction': 'mole fractions',
};
const SIDES = { interface: 'At the interface', bulk: 'In the bulk' } as const;

/** The flux that a driving force gives: from the phase boundary to the bulk. */
export function FluxForm({ force, flux, mark, errors, change }: FluxFormProps) {
  return (
    <div className="flux" role="group" aria-label="Flux from a driving force">
      <label className="duty-source">
        Flux from
        <select
          value={force?.kind ?? ''}
          onChange={(event) => change({ do: 'force-kind', kind: kindFrom(event.target.value) })}
        >
          <option value="">no driving force yet</option>
          {Object.entries(KINDS).map(([kind, words]) => (
            <option key={kind} value={kind}>
              {words}
            </option>
          ))}
        </select>
      </label>
      {force ? (
        <div className="duty-grid">
          {(['interface', 'bulk'] as const).map((side) => (
            <QuantityField
              key={side}
              id={fieldId(`drivingForce.${side}`)}
              label={SIDES[side]}
              typed={force[side]}
              units={unitsFor(FORCE_UNITS[force.kind])}
              error={errors.find((error) => error.field === `drivingForce.${side}`)?.message}
              onChange={(typed) => change({ do: 'type-force', side, typed })}
            />
          ))}
        </div>
      ) : null}
      {flux ? (
        <>
          <p className="flux-number">
            Flux from interface to bulk = <Figure value={flux.value} unit={flux.unit} /> <Mark words={mark} />
          </p>
          {flux.warnings.map((warning) => (
            <p key={warning}>{warning}</p>
          ))}
        </>
      ) : null}
    </div>
  );
}

function kindFrom(value: string): DrivingForce['kind'] | null {
  return value === 'concentration' || value === 'partial-pressure' || value === 'mole-fraction'
    ? value
    : null;
}
