import { unitsFor, type DrivingForce } from '@merestone/engine';
import { QuantityField } from '../../../shared/ui/quantity-field/quantity-field';
import { FORCE_UNITS } from '../model/duty';
import { fieldId } from '../model/field-id';
import type { DutyControls } from './duty-controls';

const KINDS: Readonly<Record<DrivingForce['kind'], string>> = {
  concentration: 'concentrations',
  'partial-pressure': 'partial pressures',
  'mole-fraction': 'mole fractions',
};
const SIDES = { interface: 'At the interface', bulk: 'In the bulk' } as const;

/** The difference that drives the transfer, for whoever wants the flux as well. */
export function ForceSection({ controls }: { controls: DutyControls }) {
  const { duty, change, errorOf } = controls;
  const { force } = duty;
  return (
    <fieldset className="duty-section">
      <legend>Flux</legend>
      <label className="duty-source">
        <span>driving force</span>
        <select
          value={force?.kind ?? ''}
          onChange={(event) => change({ do: 'force-kind', kind: kindFrom(event.target.value) })}
        >
          <option value="">none, no flux is asked for</option>
          {Object.entries(KINDS).map(([kind, words]) => (
            <option key={kind} value={kind}>
              a difference of {words}
            </option>
          ))}
        </select>
      </label>
      {force ? (
        <div className="duty-grid duty-force">
          {(['interface', 'bulk'] as const).map((side) => (
            <div key={side} className="duty-item">
              <QuantityField
                id={fieldId(`drivingForce.${side}`)}
                label={SIDES[side]}
                typed={force[side]}
                units={unitsFor(FORCE_UNITS[force.kind], { fraction: force.kind === 'mole-fraction' })}
                error={errorOf(`drivingForce.${side}`)}
                onChange={(typed) => change({ do: 'type-force', side, typed })}
              />
            </div>
          ))}
        </div>
      ) : null}
    </fieldset>
  );
}

function kindFrom(value: string): DrivingForce['kind'] | null {
  return value === 'concentration' || value === 'partial-pressure' || value === 'mole-fraction'
    ? value
    : null;
}
