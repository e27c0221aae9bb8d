import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { refrigerantsList } from './refrigerants-list';
import { lookUpSaturation } from './saturation-service';

const LIST = '/api/v1/refrigerants';
const SATURATION = '/api/v1/refrigerants/:id/saturation';

export function refrigerantsRoutes(): Router {
  const router = Router();
  const list = JSON.stringify(refrigerantsList());
  router.get(LIST, (_req, res) => {
    res.set('Cache-Control', 'no-cache').type('application/json').send(list);
  });
  router.get(SATURATION, (req, res) => {
    res.set('Cache-Control', 'no-cache').json(lookUpSaturation(req.params.id, req.query));
  });
  for (const path of [LIST, SATURATION]) router.all(path, allowMethods('GET', 'HEAD', 'OPTIONS'));
  return router;
}
