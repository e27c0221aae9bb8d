import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { jsonBody } from '../../http/json-body';
import { limitEvaluations } from '../../http/limits';
import type { Limits } from '../../http/limits';
import { evaluate } from './evaluation-service';

const PATH = '/api/v1/evaluations';

export function evaluationsRoutes(limits: Limits): Router {
  const router = Router();
  router.post(PATH, limitEvaluations(limits), ...jsonBody, (req, res) => {
    res.set('Cache-Control', 'no-store').json(evaluate(req.body));
  });
  router.all(PATH, allowMethods('POST', 'OPTIONS'));
  return router;
}
