import { ApiProblem } from '../common/problem.js';

/** A letter in plain text to one person. */
export interface Letter {
  readonly to: string;
  readonly subject: string;
  readonly body: string;
  /** A link that lets somebody in, put under the text. It is forgotten once the letter is sent. */
  readonly link?: string | null;
}

const ONE_ADDRESS = /^[^\s\p{C}"(),:;<>[\\\]@]+@[A-Za-z0-9.-]+$/u;

/** Throws at the field `email` unless it is one plain address: a line break in it would be a header of its own. */
export function assertAddress(to: string): void {
  if (ONE_ADDRESS.test(to)) return;
  throw ApiProblem.ofField('malformed', 'email', 'Mail cannot be sent to this address.');
}

/** A subject in one line. */
export function oneLine(subject: string): string {
  return subject.replaceAll(/[\s\p{C}]+/gu, ' ').trim();
}

export function wholeText({ body, link }: Letter): string {
  return link === undefined || link === null ? body : `${body}\n\n${link}\n`;
}
