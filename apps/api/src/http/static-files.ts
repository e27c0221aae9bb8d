import path from 'node:path';
import express, { Router } from 'express';
import type { RequestHandler } from 'express';

/** Names that the build made from the content: `main-5QJ2KX7A.js`. */
const HASHED = /-[A-Z0-9]{8}\.\w+$/;
const FOREVER = 'public, max-age=31536000, immutable';
/** Asked anew each time and answered by 304: the page, the worker and its manifest must never be older than what they name. */
const ASK_FIRST = 'no-cache';

const ROBOTS = 'User-agent: *\nDisallow: /api/\n';

/** The built page: its files, and `index.html` for every address a browser navigates to. */
export function staticFiles(webRoot: string): Router {
  const root = path.resolve(webRoot);
  const router = Router();
  const files = express.static(root, {
    redirect: false,
    setHeaders: (res, file) => {
      res.setHeader('Cache-Control', HASHED.test(file) ? FOREVER : ASK_FIRST);
    },
  });
  router.use(files);
  router.get('/robots.txt', (_req, res) => {
    res.type('text/plain').send(ROBOTS);
  });
  router.get('/{*path}', pageForNavigation(root));
  return router;
}

/** A missing script or image is missing; only a navigation is answered by the page, which has the routes. */
const pageForNavigation =
  (root: string): RequestHandler =>
  (req, res, next) => {
    const isFile = path.posix.basename(req.path).includes('.');
    const isNavigation = req.get('Accept')?.includes('text/html') ?? false;
    if (isFile || !isNavigation) {
      next();
      return;
    }
    res.sendFile('index.html', { root, headers: { 'Cache-Control': ASK_FIRST } }, (error) => {
      // without a built page this address does not exist; a connection that broke meanwhile is nobody's error
      if (error !== undefined && !res.headersSent) next();
    });
  };
