import express from 'express';
import type { RequestHandler } from 'express';
import { HttpProblem } from './http-problem';

const JSON_TYPES = ['application/json', 'application/*+json'];

const parse = express.json({
  limit: '100kb',
  type: JSON_TYPES,
  // a bare null or number is valid JSON: the contract says what is wrong with it
  strict: false,
  // the parser takes no text at all for an empty object
  verify: (_req, _res, text) => {
    if (text.length === 0) throw new HttpProblem('malformed-json');
  },
});

const requireBody: RequestHandler = (req, _res, next) => {
  if (req.body !== undefined) {
    next();
    return;
  }
  throw new HttpProblem(req.is(JSON_TYPES) === false ? 'not-json' : 'malformed-json');
};

/** Reads the body as JSON: 415 for another type, 400 for malformed or none, 413 over 100 kB. */
export const jsonBody: readonly RequestHandler[] = [parse, requireBody];
