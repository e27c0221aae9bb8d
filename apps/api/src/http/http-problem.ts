import type { ProblemCode, ProblemError } from '@chargewright/contract/problem';

export const PROBLEM_STATUS: Readonly<Record<ProblemCode, number>> = {
  'invalid-input': 422,
  'malformed-json': 400,
  'malformed-request': 400,
  'body-too-large': 413,
  'not-json': 415,
  'unknown-refrigerant': 404,
  'not-found': 404,
  'sign-in-refused': 401,
  'signed-out': 401,
  'wrong-origin': 403,
  forbidden: 403,
  wait: 429,
  'method-not-allowed': 405,
  'too-many-requests': 429,
  busy: 503,
  'not-ready': 503,
  internal: 500,
};

/** A refusal that a route throws; `problem-handler.ts` writes it. */
export class HttpProblem extends Error {
  override readonly name = 'HttpProblem';

  constructor(
    readonly code: ProblemCode,
    readonly more: {
      readonly errors?: readonly ProblemError[];
      readonly headers?: Readonly<Record<string, string>>;
    } = {},
  ) {
    super(code);
  }
}
