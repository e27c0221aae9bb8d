import { Router } from 'express';
import type { RequestHandler } from 'express';
import { allowMethods } from './allow-methods';
import { jsonBody } from './json-body';

/** A path that answers what is computed from a body, and stores nothing. `limit` guards all such paths together. */
export function computationRoute(path: string, limit: RequestHandler, compute: (body: unknown) => object): Router {
  const router = Router();
  router.post(path, limit, ...jsonBody, (req, res) => {
    res.set('Cache-Control', 'no-store').json(compute(req.body));
  });
  router.all(path, allowMethods('POST', 'OPTIONS'));
  return router;
}
