import type { Duty, DutyChange } from '../model/duty';
import type { FilledValue } from '../model/filled-values';

/** What every part of the form needs at hand. */
export interface DutyControls {
  duty: Duty;
  change: (change: DutyChange) => void;
  /** What is wrong with a field, by its key. */
  errorOf: (key: string) => string | undefined;
  /** The value that an equation has put in, once it could be computed. */
  filledOf: (key: string) => FilledValue | undefined;
}
