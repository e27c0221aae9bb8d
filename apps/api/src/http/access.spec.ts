import { problem } from '@chargewright/contract/problem';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { servedRoutes } from '../testing/served-routes';
import type { TestServer } from '../testing/test-server';
import { startTestServer } from '../testing/test-server';
import { ACCESS } from './access';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const ROUTES = Object.entries(ACCESS).map(([route, access]) => {
  const [method = '', path = ''] = route.split(' ');
  return { route, method, path: path.replace(/:\w+/g, 'x'), access };
});

describe('the table of who may ask what', () => {
  it('has every route that is served, and no other', () => {
    const served = servedRoutes(server.app)
      .filter((route) => route.includes(' /api/'))
      .map((route) => route.replace(/^\w+/, (method) => method.toUpperCase()));
    expect([...served].sort()).toEqual(Object.keys(ACCESS).sort());
  });

  it.each(ROUTES)('$route: answers who is signed out as $access says', async ({ method, path, access }) => {
    const response = await server.ask(path, { method });
    if (access === 'open') expect([200, 400, 404, 415, 422]).toContain(response.status);
    else {
      expect(response.status).toBe(401);
      expect(problem.parse(await response.json()).code).toBe('signed-out');
    }
  });

  it('lets no address through that it does not have', async () => {
    for (const path of ['/api/v1/session/x', '/api/v2/session', '/api/v1/sessions/a/b', '/api/v1/refrigerants/R-22']) {
      expect((await server.ask(path)).status, path).toBe(404);
    }
  });

  it('leaves the methods of a path to its route', async () => {
    const response = await server.ask('/api/v1/password', { method: 'PATCH' });
    expect(response.status).toBe(405);
    expect(response.headers.get('allow')).toBe('PUT, OPTIONS');
  });
});
