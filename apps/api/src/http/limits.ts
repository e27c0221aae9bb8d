import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import { HttpProblem } from './http-problem';

export interface Limits {
  /** Of one address to the API. A guard of cost, far above what a page, a class of apprentices or a script of look-ups needs. */
  readonly requestsPerSecond: number;
  /** Evaluations whose bodies are read or judged at one time. */
  readonly evaluationsAtOnce: number;
}

export const LIMITS: Limits = { requestsPerSecond: 1_000, evaluationsAtOnce: 100 };

const RETRY_AFTER_S = '1';

/** Refuses with 429 what one address asks beyond the limit within a second. */
export function limitRate({ requestsPerSecond }: Limits): RequestHandler {
  return rateLimit({
    windowMs: 1_000,
    limit: requestsPerSecond,
    standardHeaders: false,
    legacyHeaders: false,
    // which proxies are believed is the server's own setting; its warnings would go past the log
    validate: false,
    handler: (_req, _res, next) => {
      next(new HttpProblem('too-many-requests', { headers: { 'Retry-After': RETRY_AFTER_S } }));
    },
  });
}

/** Refuses with 503 when as many requests as `most` are under way. */
export function limitConcurrency(most: number): RequestHandler {
  let underWay = 0;
  return (_req, res, next) => {
    if (underWay >= most) throw new HttpProblem('busy', { headers: { 'Retry-After': RETRY_AFTER_S } });
    underWay += 1;
    res.once('close', () => {
      underWay -= 1;
    });
    next();
  };
}
