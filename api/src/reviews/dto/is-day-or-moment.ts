import { ValidateBy } from 'class-validator';

const DAY = /^\d{4}-\d{2}-\d{2}$/;
const MOMENT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d{1,3})?)?Z$/;

/** A day as 2027-01-31, or a moment in UTC as 2027-01-31T08:00:00Z; one that the calendar has. */
export function IsDayOrMoment() {
  return ValidateBy({
    name: 'isDayOrMoment',
    validator: {
      validate: (value: unknown) => typeof value === 'string' && isDayOrMoment(value),
      defaultMessage: () =>
        'must be a day such as 2027-01-31, or a moment in UTC such as 2027-01-31T08:00:00Z',
    },
  });
}

function isDayOrMoment(text: string): boolean {
  if (!DAY.test(text) && !MOMENT.test(text)) return false;
  const moment = new Date(text);
  // The 31st of a shorter month is read as a day of the next one.
  return !Number.isNaN(moment.getTime()) && moment.toISOString().slice(0, 10) === text.slice(0, 10);
}
