import { ApiProblem } from '../common/problem.js';

/** Where a page of the register ended: what its last line was ordered by. */
export interface PageCursor {
  readonly rank: number;
  readonly title: string;
  readonly slug: string;
}

export function writeCursor({ rank, title, slug }: PageCursor): string {
  return Buffer.from(JSON.stringify([rank, title, slug]), 'utf8').toString('base64url');
}

/** Throws `malformed` at `cursor` for anything that `writeCursor` did not write. */
export function readCursor(text: string): PageCursor {
  const value = parse(Buffer.from(text, 'base64url').toString('utf8'));
  if (Array.isArray(value) && value.length === 3) {
    const [rank, title, slug] = value as unknown[];
    if (typeof rank === 'number' && typeof title === 'string' && typeof slug === 'string') {
      return { rank, title, slug };
    }
  }
  throw ApiProblem.ofField('malformed', 'cursor', 'This is not the cursor of a page; begin without one.');
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}
