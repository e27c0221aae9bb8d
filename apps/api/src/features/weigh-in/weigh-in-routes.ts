import type { RequestHandler, Router } from 'express';
import { computationRoute } from '../../http/computation-route';
import { judgeWeighIn } from './weigh-in-service';

export const weighInRoutes = (limit: RequestHandler): Router =>
  computationRoute('/api/v1/weigh-in', limit, judgeWeighIn);
