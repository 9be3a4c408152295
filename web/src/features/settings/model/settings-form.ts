import type { Settings, SettingsChange } from '../../../shared/api/types';
import type { FieldErrors } from '../../../shared/form/use-form-act';

/** The settings as they are typed. */
export interface SettingsForm {
  officeName: string;
  reviewsNeeded: string;
  /** Id of a person; empty for nobody. */
  principal: string;
  reviewDueMonths: string;
}

export const REVIEWS_NEEDED = ['1', '2', '3', '4', '5'] as const;
const MOST_MONTHS = 120;

export function formOf({ officeName, reviewsNeeded, principal, reviewDueMonths }: Settings): SettingsForm {
  return {
    officeName,
    reviewsNeeded: String(reviewsNeeded),
    principal: principal?.id ?? '',
    reviewDueMonths: String(reviewDueMonths),
  };
}

export function settingsErrors({ officeName, reviewDueMonths }: SettingsForm): FieldErrors {
  return {
    officeName: officeName.trim() ? undefined : 'Write the name of the office.',
    reviewDueMonths: isMonths(reviewDueMonths)
      ? undefined
      : `Write a whole number of months, from 1 to ${MOST_MONTHS}.`,
  };
}

export function changeOf(form: SettingsForm): SettingsChange {
  return {
    officeName: form.officeName.trim(),
    reviewsNeeded: Number(form.reviewsNeeded),
    principal: form.principal || null,
    reviewDueMonths: Number(form.reviewDueMonths),
  };
}

function isMonths(text: string): boolean {
  return /^\d{1,3}$/.test(text.trim()) && Number(text) >= 1 && Number(text) <= MOST_MONTHS;
}
