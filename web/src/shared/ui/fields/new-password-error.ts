const SHORTEST = 8;
const LONGEST = 128;

/** What is wrong with a new password at first sight; what else may be, the server says. */
export function newPasswordError(password: string): string | undefined {
  const { length } = [...password];
  if (length === 0) return 'Choose a password.';
  if (length < SHORTEST) return `A password needs at least ${SHORTEST} characters; 15 or more are better.`;
  if (length > LONGEST) return `A password can have ${LONGEST} characters at most.`;
  return undefined;
}
