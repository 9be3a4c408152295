import { ApiProblem } from '../common/problem.js';

const LONGEST_YEARS = 10;

/** The moments that an approval names, in ISO 8601. */
export interface EffectiveDates {
  readonly effectiveFrom: string;
  readonly reviewDue: string;
}

/**
 * From when on an approval holds, and when the sheet is due to be looked at again. A day begins at midnight UTC; today
 * means at once. Without a date of its own the review is due the office's number of months after the approval holds.
 */
export function effectiveDates(
  given: { readonly effectiveFrom?: string | undefined; readonly reviewDue?: string | undefined },
  at: string,
  reviewDueMonths: number,
): EffectiveDates {
  const effectiveFrom = given.effectiveFrom === undefined ? at : beginning(given.effectiveFrom, at);
  if (effectiveFrom < at) {
    throw ApiProblem.ofField(
      'malformed',
      'effectiveFrom',
      'An approval cannot hold from a day that is over.',
    );
  }
  assertWithinReach('effectiveFrom', effectiveFrom, at);
  const reviewDue =
    given.reviewDue === undefined ? monthsAfter(effectiveFrom, reviewDueMonths) : momentOf(given.reviewDue);
  if (reviewDue <= effectiveFrom) {
    throw ApiProblem.ofField(
      'malformed',
      'reviewDue',
      'The next review must be due after the approval holds.',
    );
  }
  assertWithinReach('reviewDue', reviewDue, effectiveFrom);
  return { effectiveFrom, reviewDue };
}

/** The same day of the month so many months later, or the last day of that month; at midnight UTC. */
export function monthsAfter(at: string, months: number): string {
  const from = new Date(at);
  const month = from.getUTCMonth() + months;
  const lastDay = new Date(Date.UTC(from.getUTCFullYear(), month + 1, 0)).getUTCDate();
  return new Date(Date.UTC(from.getUTCFullYear(), month, Math.min(from.getUTCDate(), lastDay))).toISOString();
}

function beginning(given: string, at: string): string {
  return given.slice(0, 10) === at.slice(0, 10) && given.length === 10 ? at : momentOf(given);
}

function momentOf(given: string): string {
  return new Date(given).toISOString();
}

function assertWithinReach(field: string, moment: string, from: string): void {
  if (moment <= monthsAfter(from, LONGEST_YEARS * 12 + 1)) return;
  throw ApiProblem.ofField('malformed', field, `This is more than ${LONGEST_YEARS} years ahead.`);
}
