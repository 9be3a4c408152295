const SHORTEST = 10;

/** What the office's record asks of a reason. */
export function reasonError(reason: string): string | undefined {
  const { length } = reason.trim();
  if (length >= SHORTEST) return undefined;
  return length === 0
    ? 'Write the reason; it stands on record with your name.'
    : `Write the reason in ${SHORTEST} characters at least.`;
}
