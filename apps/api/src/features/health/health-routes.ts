import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { HttpProblem } from '../../http/http-problem';

export interface HealthDeps {
  /** Whether records can be read now. */
  isReady(): boolean;
}

const HEALTH = '/healthz';
const READY = '/readyz';

/** `/healthz`: the process answers. `/readyz`: it can also read its data. */
export function healthRoutes({ isReady }: HealthDeps): Router {
  const router = Router();
  router.get(HEALTH, (_req, res) => {
    res.set('Cache-Control', 'no-store').json({ service: 'chargewright', status: 'ok' });
  });
  router.get(READY, (_req, res) => {
    if (!isReady()) throw new HttpProblem('not-ready');
    res.set('Cache-Control', 'no-store').json({ service: 'chargewright', status: 'ready' });
  });
  for (const path of [HEALTH, READY]) router.all(path, allowMethods('GET', 'HEAD', 'OPTIONS'));
  return router;
}
