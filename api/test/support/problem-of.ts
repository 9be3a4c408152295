import type { Response } from 'supertest';
import type { ProblemBody } from '../../src/common/problem.js';

/** The problem in an answer, after making sure that it is one. */
export function problemOf(response: Response): ProblemBody {
  if (response.type !== 'application/problem+json') {
    throw new Error(`Not a problem but ${response.status} ${response.type}: ${response.text}`);
  }
  const body = response.body as ProblemBody;
  if (body.status !== response.status)
    throw new Error(`The problem says ${body.status}, not ${response.status}`);
  return body;
}

/** The code of the problem in an answer. */
export function codeOf(response: Response): string {
  return problemOf(response).type.replace('urn:merestone:problem:', '');
}
