import type { RequestHandler, Router } from 'express';
import { computationRoute } from '../../http/computation-route';
import { evaluate } from './evaluation-service';

export const evaluationsRoutes = (limit: RequestHandler): Router =>
  computationRoute('/api/v1/evaluations', limit, evaluate);
