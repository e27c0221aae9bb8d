import type { RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { HttpProblem } from './http-problem';

export interface Limits {
  /** Of one address to the API. A guard of cost, far above what a page, a class of apprentices or a script of look-ups needs. */
  readonly requestsPerSecond: number;
  /** Evaluations, airflows, capacities and weigh-ins whose bodies are read or judged at one time. */
  readonly evaluationsAtOnce: number;
  /** The share of them that one address may hold: a sender of slow bodies does not shut out the others. */
  readonly evaluationsAtOncePerAddress: number;
}

export const LIMITS: Limits = { requestsPerSecond: 1_000, evaluationsAtOnce: 400, evaluationsAtOncePerAddress: 100 };

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

/** Refuses an evaluation with 503 when as many are under way as the limits allow, of all addresses or of this one. */
export function limitEvaluations({ evaluationsAtOnce, evaluationsAtOncePerAddress }: Limits): RequestHandler {
  let underWay = 0;
  const underWayOf = new Map<string, number>();
  return (req, res, next) => {
    const address = ipKeyGenerator(req.ip ?? '');
    const ofAddress = underWayOf.get(address) ?? 0;
    if (underWay >= evaluationsAtOnce || ofAddress >= evaluationsAtOncePerAddress) {
      throw new HttpProblem('busy', { headers: { 'Retry-After': RETRY_AFTER_S } });
    }
    underWay += 1;
    underWayOf.set(address, ofAddress + 1);
    res.once('close', () => {
      underWay -= 1;
      const left = (underWayOf.get(address) ?? 1) - 1;
      if (left > 0) underWayOf.set(address, left);
      else underWayOf.delete(address);
    });
    next();
  };
}
