import type { Finding, InspectionReport } from '@merestone/engine';
import { PROBLEM_CODES, type ProblemCode } from './problem-codes.js';

/** What is wrong with one field: its path in the request, a code, and a sentence a person can act on. */
export interface FieldProblem {
  readonly field: string;
  readonly code: string;
  readonly message: string;
}

/** A sheet to turn to instead. */
export interface Alternative {
  readonly slug: string;
  readonly title: string;
  readonly geometry: string;
}

export interface ProblemExtras {
  readonly fields?: readonly FieldProblem[] | undefined;
  readonly findings?: readonly Finding[] | undefined;
  readonly alternatives?: readonly Alternative[] | undefined;
  /** What the machine found on a submitted sheet. */
  readonly inspection?: InspectionReport | undefined;
  /** Sent as Retry-After. */
  readonly retryAfterSeconds?: number | undefined;
  /** For the log alone: never leaves the server. */
  readonly log?: string | undefined;
}

/** The body of an `application/problem+json` answer (RFC 9457). */
export interface ProblemBody {
  readonly type: `urn:merestone:problem:${ProblemCode}`;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly instance?: string;
  readonly fields?: readonly FieldProblem[];
  readonly findings?: readonly Finding[];
  readonly alternatives?: readonly Alternative[];
  readonly inspection?: InspectionReport;
}

/**
 * A request that cannot be met, for a reason the caller is told. `detail` is for people; what only the log should
 * know goes into `log`. Thrown anywhere, turned into an answer by the problem filter.
 */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';

  constructor(
    readonly code: ProblemCode,
    readonly detail: string,
    readonly extras: ProblemExtras = {},
  ) {
    super(`${code}: ${detail}`);
  }

  /** A problem of one field. */
  static ofField(code: ProblemCode, field: string, message: string): ApiProblem {
    return new ApiProblem(code, message, { fields: [{ field, code, message }] });
  }

  get status(): number {
    return PROBLEM_CODES[this.code].status;
  }

  toBody(instance?: string): ProblemBody {
    const { fields, findings, alternatives, inspection } = this.extras;
    return {
      type: `urn:merestone:problem:${this.code}`,
      title: PROBLEM_CODES[this.code].title,
      status: this.status,
      detail: this.detail,
      ...(instance === undefined ? {} : { instance }),
      ...(fields === undefined ? {} : { fields }),
      ...(findings === undefined ? {} : { findings }),
      ...(alternatives === undefined ? {} : { alternatives }),
      ...(inspection === undefined ? {} : { inspection }),
    };
  }
}
