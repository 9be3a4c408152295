const YEARS = 10;

/** The days an appointment may end on, seen from a moment: from tomorrow for ten years, as the date field wants them. */
export function lastDays(now: Date): { first: string; last: string } {
  const tomorrow = new Date(now);
  tomorrow.setUTCDate(now.getUTCDate() + 1);
  const furthest = new Date(now);
  furthest.setUTCFullYear(now.getUTCFullYear() + YEARS);
  return { first: day(tomorrow), last: day(furthest) };
}

/** What is wrong with a last day. */
export function lastDayError(until: string, now: Date): string | undefined {
  if (!until) return 'Say until which day.';
  const { first, last } = lastDays(now);
  if (until < first) return 'The last day must be after today.';
  return until > last ? `An appointment is for ${YEARS} years at most.` : undefined;
}

function day(date: Date): string {
  return date.toISOString().slice(0, 10);
}
