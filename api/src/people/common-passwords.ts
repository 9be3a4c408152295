import { dictionary } from '@zxcvbn-ts/language-common';

let known: ReadonlySet<string> | undefined;

/** Whether a password is among the some 49 000 most used ones of published leaks; capitals do not make it another. */
export function isCommonPassword(password: string): boolean {
  known ??= new Set(dictionary['passwords-common']);
  return known.has(password.toLowerCase());
}
