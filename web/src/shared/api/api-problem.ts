import { Problem } from '@merestone/api-client';
import type { Finding } from '@merestone/engine';
import type { FieldProblem, OtherSheet, ProblemBody } from './types';

/** What the server answered instead of what was asked for, or that it could not be reached (status 0). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  readonly status: number;
  readonly code: string;
  readonly title: string;
  readonly detail: string;
  readonly fields: FieldProblem[];
  readonly findings: Finding[];
  readonly alternatives: OtherSheet[];

  constructor(status: number, body: ProblemBody) {
    super(body.detail ?? body.title);
    this.status = status;
    this.code = body.type?.split(':').at(-1) ?? 'unknown';
    this.title = body.title;
    this.detail = body.detail ?? '';
    this.fields = body.fields ?? [];
    this.findings = body.findings ?? [];
    this.alternatives = body.alternatives ?? [];
  }
}

const UNREACHABLE: ProblemBody = {
  type: 'urn:merestone:problem:unreachable',
  title: 'The server cannot be reached',
  detail: 'Check the connection and try again. Nothing that you typed is lost.',
};
const UNREADABLE: ProblemBody = {
  type: 'urn:merestone:problem:unreadable',
  title: 'The server is not answering as it should',
  detail: 'Try again in a moment.',
};

/** Any thrown value as a problem that a screen can show. */
export function asApiProblem(thrown: unknown): ApiProblem {
  if (thrown instanceof ApiProblem) return thrown;
  if (thrown instanceof Problem) {
    if (thrown.status === 0) return new ApiProblem(0, UNREACHABLE);
    if (thrown.code === 'unreadable') return new ApiProblem(thrown.status, UNREADABLE);
    // The contract leaves findings open; they are the engine's own.
    return new ApiProblem(thrown.status, thrown.body as ProblemBody);
  }
  return new ApiProblem(0, {
    type: 'urn:merestone:problem:unexpected',
    title: 'Something unexpected happened',
    detail: thrown instanceof Error ? thrown.message : 'The answer could not be read.',
  });
}
