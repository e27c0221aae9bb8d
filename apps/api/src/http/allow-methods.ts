import type { RequestHandler } from 'express';
import { HttpProblem } from './http-problem';

/** Last handler of a path: refuses the methods that no earlier handler of it took. */
export const allowMethods =
  (...methods: readonly string[]): RequestHandler =>
  () => {
    throw new HttpProblem('method-not-allowed', { headers: { Allow: methods.join(', ') } });
  };
