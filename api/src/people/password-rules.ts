import { isCommonPassword } from './common-passwords.js';

export const SHORTEST_PASSWORD = 8;
export const LONGEST_PASSWORD = 128;

/** Whom a password is for: it may not be their name or address. */
export interface PasswordOwner {
  readonly name: string;
  readonly email: string;
}

const PRODUCT = 'merestone';

/**
 * What is wrong with a password, as a sentence; undefined when it can be taken. Length and a list of those that are
 * tried first, but no rule on kinds of characters and no expiry (OWASP ASVS 5.0.0, 6.2.1, 6.2.4, 6.2.5, 6.2.10).
 */
export function passwordFault(password: string, owner: PasswordOwner): string | undefined {
  const characters = [...password];
  if (characters.length < SHORTEST_PASSWORD) {
    return `A password needs at least ${SHORTEST_PASSWORD} characters; 15 or more are better.`;
  }
  if (characters.length > LONGEST_PASSWORD) {
    return `A password can have ${LONGEST_PASSWORD} characters at most.`;
  }
  if (new Set(characters).size === 1) return 'One character again and again is guessed at once.';
  if (isCommonPassword(password)) {
    return 'This is among the passwords that are tried first; take another, such as several words.';
  }
  if (isAboutOwner(password, owner)) {
    return 'A password must not be the name, the address or the name of this program.';
  }
  return undefined;
}

/** Whether the password is a name or address and nothing more than digits and signs around it. */
function isAboutOwner(password: string, { name, email }: PasswordOwner): boolean {
  const core = bare(password);
  const [local = ''] = email.split('@');
  const backwards = name.split(' ').reverse().join(' ');
  return core !== '' && [name, backwards, email, local, PRODUCT].map(bare).includes(core);
}

/** Letters alone, in lower case. */
function bare(text: string): string {
  return text.toLowerCase().replaceAll(/[^\p{L}]/gu, '');
}
