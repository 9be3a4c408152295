import { randomUUID } from 'node:crypto';
import { HttpException } from '@nestjs/common';
import type { ProblemCode } from '../problem-codes.js';
import { ApiProblem } from '../problem.js';

/** An answer to send, and what only the log should hear. */
export interface ThrownProblem {
  readonly problem: ApiProblem;
  /** Names one unexpected failure in the answer and in the log alike. */
  readonly instance?: string;
}

const CODES_BY_STATUS: Partial<Record<number, ProblemCode>> = {
  400: 'malformed',
  401: 'not-signed-in',
  403: 'forbidden',
  404: 'not-found',
  413: 'too-large',
  415: 'unsupported-media-type',
  429: 'too-many-requests',
};

const DETAILS: Partial<Record<ProblemCode, string>> = {
  malformed: 'The request could not be read.',
  'not-found': 'There is nothing at this address.',
  'too-large': 'The body is larger than this server takes.',
  'unsupported-media-type': 'Send the body as application/json in UTF-8, not compressed.',
  'too-many-requests': 'There were too many attempts. Wait a minute and try again.',
};

/** Whatever was thrown, as a problem. What is not known to be the caller's doing tells the caller nothing. */
export function problemFrom(thrown: unknown): ThrownProblem {
  if (thrown instanceof ApiProblem) return { problem: thrown };
  const code = CODES_BY_STATUS[statusOf(thrown) ?? 500];
  if (code !== undefined) {
    return {
      problem: new ApiProblem(code, DETAILS[code] ?? 'The request was refused.', { log: logOf(thrown) }),
    };
  }
  if (isBusy(thrown)) {
    return {
      problem: new ApiProblem('unavailable', 'The database is busy. Try again.', { log: logOf(thrown) }),
    };
  }
  const id = randomUUID();
  const detail = `Nothing was changed. Whoever keeps this server finds the cause in the log under ${id}.`;
  return { problem: new ApiProblem('internal', detail, { log: logOf(thrown) }), instance: `urn:uuid:${id}` };
}

/** Nest's exceptions and the errors of Express's body parser carry a status of their own. */
function statusOf(thrown: unknown): number | undefined {
  if (thrown instanceof HttpException) return thrown.getStatus();
  if (!(thrown instanceof Error) || !('expose' in thrown) || !('status' in thrown)) return undefined;
  return thrown.expose === true && typeof thrown.status === 'number' ? thrown.status : undefined;
}

function isBusy(thrown: unknown): boolean {
  return thrown instanceof Error && 'code' in thrown && String(thrown.code).startsWith('SQLITE_BUSY');
}

function logOf(thrown: unknown): string {
  return thrown instanceof Error ? (thrown.stack ?? thrown.message) : String(thrown);
}
