import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { lookUpMoistAir } from './psychrometrics-service';

const PATH = '/api/v1/psychrometrics';

export function psychrometricsRoutes(): Router {
  const router = Router();
  router.get(PATH, (req, res) => {
    res.set('Cache-Control', 'no-cache').json(lookUpMoistAir(req.query));
  });
  router.all(PATH, allowMethods('GET', 'HEAD', 'OPTIONS'));
  return router;
}
