import type { components } from './schema.generated.js';

export type ProblemBody = components['schemas']['ProblemResponse'];

/** The server's refusal as an error: its code, the status, and the fields or findings concerned. */
export class Problem extends Error {
  override readonly name = 'Problem';

  constructor(
    readonly status: number,
    readonly body: ProblemBody,
  ) {
    super(body.detail);
  }

  /** The last part of the problem's type, such as `out-of-bounds`. */
  get code(): string {
    return this.body.type.replace(/^urn:merestone:problem:/, '');
  }

  get fields(): NonNullable<ProblemBody['fields']> {
    return this.body.fields ?? [];
  }
}

/** Whatever came back instead of an answer, as a problem; also what a proxy or a broken line made of it. */
export function problemFrom(status: number, body: unknown): Problem {
  if (isProblemBody(body)) return new Problem(status, body);
  return new Problem(status, {
    type: 'urn:merestone:problem:unreadable',
    title: 'The answer could not be read',
    status,
    detail:
      status === 0
        ? 'The server cannot be reached.'
        : `The server answered ${status} in a form not expected.`,
  });
}

function isProblemBody(body: unknown): body is ProblemBody {
  return (
    typeof body === 'object' &&
    body !== null &&
    'type' in body &&
    typeof body.type === 'string' &&
    'title' in body &&
    typeof body.title === 'string' &&
    'detail' in body &&
    typeof body.detail === 'string'
  );
}
