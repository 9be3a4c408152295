import type { Checklist } from '../../../shared/api/types';
import { pointId } from '../model/verdict-faults';

interface CheckpointsProps {
  points: readonly { point: keyof Checklist; text: string }[];
  checklist: Checklist;
  /** Ids of the points that a verdict was refused for. */
  missing: readonly string[];
  onTick: (point: keyof Checklist, done: boolean) => void;
}

/** What a reviewer has looked at, point by point. */
export function Checkpoints({ points, checklist, missing, onTick }: CheckpointsProps) {
  return (
    <fieldset className="choice-list checkpoints">
      <legend className="field-label">I have checked against the source</legend>
      {points.map(({ point, text }) => {
        const id = pointId(point);
        const lacking = missing.includes(id) && !checklist[point];
        return (
          <label key={point} className={lacking ? 'choice-line checkpoint-missing' : 'choice-line'}>
            <input
              type="checkbox"
              id={id}
              checked={checklist[point]}
              aria-invalid={lacking}
              onChange={(event) => onTick(point, event.target.checked)}
            />
            <span>
              {text}
              {lacking ? <span className="choice-hint"> Not checked yet.</span> : null}
            </span>
          </label>
        );
      })}
    </fieldset>
  );
}
