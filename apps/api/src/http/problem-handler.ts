import { STATUS_CODES } from 'node:http';
import type { Problem, ProblemCode } from '@chargewright/contract/problem';
import { problemDetails } from '@chargewright/wording';
import type { ErrorRequestHandler, Request, RequestHandler, Response } from 'express';
import { HttpProblem, PROBLEM_STATUS } from './http-problem';

/** What the body parser calls its refusals. */
const BODY_PARSER_PROBLEMS: Readonly<Record<string, ProblemCode>> = {
  'entity.parse.failed': 'malformed-json',
  'entity.too.large': 'body-too-large',
  'charset.unsupported': 'not-json',
  'encoding.unsupported': 'not-json',
};

/** Any path that no route answers. */
export const notFound: RequestHandler = () => {
  throw new HttpProblem('not-found');
};

/** Answers every error as `application/problem+json`, with the id that the log has too; details of an unexpected one stay in the log. */
export const problemHandler: ErrorRequestHandler = (error: unknown, req, res, next) => {
  if (res.headersSent) {
    // too late for another answer: Express cuts the connection
    next(error);
    return;
  }
  const refusal = asHttpProblem(error);
  if (refusal.code === 'internal') req.log.error({ err: error }, 'unexpected error');
  sendProblem(req, res, refusal);
};

function sendProblem(req: Request, res: Response, { code, more }: HttpProblem): void {
  const status = PROBLEM_STATUS[code];
  const body: Problem = {
    type: 'about:blank',
    title: STATUS_CODES[status] ?? '',
    status,
    detail: problemDetails[code],
    code,
    id: typeof req.id === 'string' ? req.id : '',
    ...(more.errors === undefined ? {} : { errors: [...more.errors] }),
  };
  res.set({ 'Cache-Control': 'no-store', ...more.headers });
  res.status(status).type('application/problem+json').send(JSON.stringify(body));
}

function asHttpProblem(error: unknown): HttpProblem {
  if (error instanceof HttpProblem) return error;
  const { type, status } = error as { readonly type?: unknown; readonly status?: unknown };
  if (typeof type === 'string' && Object.hasOwn(BODY_PARSER_PROBLEMS, type)) {
    return new HttpProblem(BODY_PARSER_PROBLEMS[type] ?? 'malformed-request');
  }
  // a client's error of Express or its parsers: a path that does not decode, a body that ends too soon
  if (typeof status === 'number' && status >= 400 && status < 500) return new HttpProblem('malformed-request');
  return new HttpProblem('internal');
}
