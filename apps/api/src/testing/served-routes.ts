import type { Express, Router } from 'express';

interface Layer {
  readonly route?: { readonly path: string; readonly stack: readonly { readonly method?: string }[] };
  readonly handle: { readonly stack?: readonly Layer[] };
}

/** Files of the page are no part of the API. */
const PAGE_ROUTES = ['/robots.txt', '/{*path}'];

/** Every route that an app serves, as "get /api/v1/refrigerants/:id/saturation". */
export function servedRoutes(app: Express): readonly string[] {
  const routes = (layers: readonly Layer[]): readonly string[] =>
    layers.flatMap(({ route, handle }) => {
      if (route === undefined) return routes(handle.stack ?? []);
      if (PAGE_ROUTES.includes(route.path)) return [];
      const methods = route.stack.flatMap(({ method }) => (method === undefined ? [] : [method]));
      return methods.map((method) => `${method} ${route.path}`);
    });
  return [...new Set(routes((app.router as Router as unknown as { readonly stack: readonly Layer[] }).stack))];
}
