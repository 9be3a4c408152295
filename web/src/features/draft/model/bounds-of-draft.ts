import type { BoundNature, Stretch } from '@merestone/engine';
import { typedValue } from '../../../shared/ui/quantity-field/parse-typed-number';
import type { DraftForm, EndForm } from './draft-form';

/** A bound as far as it can be drawn. */
export interface DrawnBound {
  on: string;
  stretches: Stretch[];
}

/** The bounds of a draft with the limits that can be read; a limit half typed is none yet. */
export function boundsOfDraft({ bounds }: Pick<DraftForm, 'bounds'>): DrawnBound[] {
  return bounds
    .filter(({ on }) => on.trim() !== '')
    .map(({ on, basis, stretches }) => ({
      on: on.trim(),
      stretches:
        basis === 'none'
          ? []
          : stretches
              .map(({ lo, hi }): Stretch => ({ ...limit('lo', lo), ...limit('hi', hi) }))
              .filter(({ lo, hi }) => (lo || hi) && (!lo || !hi || lo.value < hi.value)),
    }));
}

function limit(side: 'lo' | 'hi', { value, nature, closed }: EndForm): Stretch {
  const number = typedValue(value);
  if (number === null) return {};
  return { [side]: { value: number, nature: nature as BoundNature, closed: closed !== 'open' } };
}
