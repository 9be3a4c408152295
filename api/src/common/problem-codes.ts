/**
 * One code per meaning, and the one table from code to HTTP status. The code becomes the problem's type,
 * `urn:merestone:problem:<code>`.
 */
export const PROBLEM_CODES = {
  malformed: { status: 400, title: 'The request is not of the form asked for' },
  missing: { status: 400, title: 'Something needed was not given' },
  'unknown-symbol': { status: 400, title: 'A symbol is not on the sheet' },
  'unknown-row': { status: 400, title: 'A row is not in the table' },
  'unknown-equation': { status: 400, title: 'A property equation is not offered here' },
  'over-determined': { status: 400, title: 'More was given than there are unknowns' },
  unit: { status: 400, title: 'A unit does not fit its quantity' },
  expression: { status: 400, title: 'An expression cannot be used' },
  definition: { status: 400, title: 'The definition of the sheet does not hold' },
  dimension: { status: 400, title: 'The dimensions do not close' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'sign-in-refused': { status: 401, title: 'The sign-in was refused' },
  forbidden: { status: 403, title: 'Not allowed' },
  'foreign-origin': { status: 403, title: 'The request comes from another site' },
  'password-refused': { status: 403, title: 'The password was refused' },
  'not-found': { status: 404, title: 'Not found' },
  'not-in-use': { status: 409, title: 'This revision is not in use' },
  stale: { status: 409, title: 'Somebody else changed this in the meantime' },
  conflict: { status: 409, title: 'This cannot be done in the present state' },
  duplicate: { status: 409, title: 'This exists already' },
  'too-large': { status: 413, title: 'The request is too large' },
  'unsupported-media-type': { status: 415, title: 'The body is not JSON' },
  'out-of-bounds': { status: 422, title: 'A value is outside a bound' },
  'past-reach': { status: 422, title: 'A value is too far outside a bound' },
  'between-pieces': { status: 422, title: 'A value falls between the stated ranges' },
  domain: { status: 422, title: 'The formula has no value here' },
  'checks-failed': { status: 422, title: 'The sheet does not pass its own checks' },
  'if-match-needed': { status: 428, title: 'The version being edited must be named' },
  'too-many-requests': { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something went wrong here' },
  unavailable: { status: 503, title: 'Not available at the moment' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof PROBLEM_CODES;
