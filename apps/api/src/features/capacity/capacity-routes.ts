import type { RequestHandler, Router } from 'express';
import { computationRoute } from '../../http/computation-route';
import { findCapacity } from './capacity-service';

export const capacityRoutes = (limit: RequestHandler): Router =>
  computationRoute('/api/v1/capacity', limit, findCapacity);
