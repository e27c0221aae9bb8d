import { Router } from 'express';
import { allowMethods } from '../../http/allow-methods';
import { openApiDocument } from './openapi-document';

const PATH = '/api/v1/openapi.json';

export function openApiRoutes(): Router {
  const router = Router();
  const document = JSON.stringify(openApiDocument());
  router.get(PATH, (_req, res) => {
    res.set('Cache-Control', 'no-cache').type('application/json').send(document);
  });
  router.all(PATH, allowMethods('GET', 'HEAD', 'OPTIONS'));
  return router;
}
