import type { RequestHandler } from 'express';

const ONE_DAY_S = 86_400;

/** Lets pages of any origin call the open routes, without credentials, and answers the browser's question beforehand. */
export const openCors: RequestHandler = (req, res, next) => {
  res.set({ 'Access-Control-Allow-Origin': '*', 'Cross-Origin-Resource-Policy': 'cross-origin' });
  if (req.method !== 'OPTIONS') {
    next();
    return;
  }
  res.set({
    'Access-Control-Allow-Methods': 'GET, HEAD, POST',
    'Access-Control-Allow-Headers': 'Content-Type',
    'Access-Control-Max-Age': String(ONE_DAY_S),
  });
  res.sendStatus(204);
};
