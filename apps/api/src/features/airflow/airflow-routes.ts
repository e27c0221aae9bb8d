import type { RequestHandler, Router } from 'express';
import { computationRoute } from '../../http/computation-route';
import { findAirflow } from './airflow-service';

export const airflowRoutes = (limit: RequestHandler): Router => computationRoute('/api/v1/airflow', limit, findAirflow);
