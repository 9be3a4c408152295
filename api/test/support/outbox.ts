import type { TestApp } from './create-test-app.js';

export interface KeptLetter {
  readonly to: string;
  readonly subject: string;
  readonly body: string;
  readonly link: string | null;
  readonly state: string;
}

/** The letters in the database, the oldest first; only those to an address when one is given. */
export function lettersIn({ connection }: TestApp, to?: string): KeptLetter[] {
  const rows = connection.sqlite
    .prepare<[], KeptLetter>('SELECT "to", subject, body, link, state FROM mail ORDER BY rowid')
    .all();
  return rows.filter((row) => to === undefined || row.to === to);
}

/** The token of the last link that was sent to an address. */
export function tokenFor(test: TestApp, to: string): string {
  const link = lettersIn(test, to).findLast((letter) => letter.link !== null)?.link ?? '';
  const token = link.split('/').at(-1) ?? '';
  if (token === '') throw new Error(`No link was sent to ${to}.`);
  return token;
}

/** The last entries of the journal, the latest first. */
export function journalTail(
  { connection }: TestApp,
  count: number,
): { act: string; actor: { id: string }; subject: string; detail: Record<string, unknown> }[] {
  return connection.sqlite
    .prepare<[number], { entry: string }>('SELECT entry FROM journal ORDER BY "index" DESC LIMIT ?')
    .all(count)
    .map(({ entry }) => JSON.parse(entry) as ReturnType<typeof journalTail>[number]);
}
