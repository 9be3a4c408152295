const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const MINUTE = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** `3 March 2026`, in the reader's time zone. */
export function formatDay(iso: string): string {
  return formatWith(DAY, iso);
}

/** `3 Mar 2026, 14:05`, in the reader's time zone. */
export function formatMinute(iso: string): string {
  return formatWith(MINUTE, iso);
}

function formatWith(format: Intl.DateTimeFormat, iso: string): string {
  const date = new Date(iso);
  return Number.isNaN(date.getTime()) ? iso : format.format(date);
}
