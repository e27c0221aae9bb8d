import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { sourcesList } from './sources-list';

const SOURCES = '/api/v1/sources';

export function sourcesRoutes(): Router {
  const router = Router();
  const list = JSON.stringify(sourcesList());
  router.get(SOURCES, (_req, res) => {
    res.set('Cache-Control', 'no-cache').type('application/json').send(list);
  });
  router.all(SOURCES, allowMethods('GET', 'HEAD', 'OPTIONS'));
  return router;
}
