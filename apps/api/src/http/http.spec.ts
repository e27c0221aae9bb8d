import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import http from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { problem } from '@chargewright/contract/problem';
import express from 'express';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { EVALUATION_EXAMPLE } from '../testing/evaluation-example';
import { startTestServer } from '../testing/test-server';
import type { TestServer } from '../testing/test-server';
import { compress } from './compress';
import { LIMITS } from './limits';

const OPEN_PATHS = [
  '/api/v1/refrigerants',
  '/api/v1/refrigerants/R-410A/saturation?pressure=118&unit=psig',
  '/api/v1/psychrometrics?dryBulb=80&wetBulb=67&unit=degF',
  '/api/v1/sources',
  '/api/v1/openapi.json',
  '/healthz',
  '/readyz',
];

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

describe('health', () => {
  it('names the service', async () => {
    expect(await (await server.ask('/healthz')).json()).toEqual({ service: 'chargewright', status: 'ok' });
    expect(await (await server.ask('/readyz')).json()).toEqual({ service: 'chargewright', status: 'ready' });
  });

  it('is not ready while the data cannot be read, and alive all the same', async () => {
    const unready = await startTestServer({ isReady: () => false });
    const response = await unready.ask('/readyz');
    expect(response.status).toBe(503);
    expect(problem.parse(await response.json()).code).toBe('not-ready');
    expect((await unready.ask('/healthz')).status).toBe(200);
    await unready.close();
  });
});

describe('other origins', () => {
  it.each(OPEN_PATHS)('may read %s, without credentials', async (address) => {
    const response = await server.ask(address, { headers: { Origin: 'https://elsewhere.example' } });
    expect(response.status).toBe(200);
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
    expect(response.headers.has('access-control-allow-credentials')).toBe(false);
    expect(response.headers.get('cross-origin-resource-policy')).toBe('cross-origin');
  });

  it('may ask before they send JSON', async () => {
    const response = await server.ask('/api/v1/evaluations', {
      method: 'OPTIONS',
      headers: {
        Origin: 'https://elsewhere.example',
        'Access-Control-Request-Method': 'POST',
        'Access-Control-Request-Headers': 'content-type',
      },
    });
    expect(response.status).toBe(204);
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
    expect(response.headers.get('access-control-allow-methods')).toContain('POST');
    expect(response.headers.get('access-control-allow-headers')).toBe('Content-Type');
  });

  it('may read why they were refused', async () => {
    const response = await server.postJson('/api/v1/evaluations', {});
    expect(response.status).toBe(422);
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
  });

  it.each(['/', '/api/v1/shops', '/api/v2/evaluations'])('may not read %s', async (address) => {
    const response = await server.ask(address, { headers: { Origin: 'https://elsewhere.example' } });
    expect(response.headers.has('access-control-allow-origin')).toBe(false);
    expect(response.headers.get('cross-origin-resource-policy')).toBe('same-origin');
  });
});

describe('headers', () => {
  const policyOf = (response: Response) =>
    Object.fromEntries(
      (response.headers.get('content-security-policy') ?? '')
        .split(';')
        .map((directive) => directive.trim().split(/ (.*)/, 2)),
    ) as Readonly<Record<string, string>>;

  it.each(['/', '/healthz', '/api/v1/refrigerants', '/api/nowhere'])(
    'confine %s to its own origin',
    async (address) => {
      const response = await server.ask(address);
      expect(policyOf(response)).toMatchObject({
        'default-src': "'self'",
        'script-src': "'self'",
        'object-src': "'none'",
        'frame-ancestors': "'none'",
        'worker-src': "'self'",
        'manifest-src': "'self'",
      });
      expect(response.headers.get('x-content-type-options')).toBe('nosniff');
      expect(response.headers.get('x-frame-options')).toBe('DENY');
      expect(response.headers.has('x-powered-by')).toBe(false);
    },
  );

  it('demand HTTPS only where there is HTTPS', async () => {
    const plain = await server.ask('/healthz');
    expect(plain.headers.has('strict-transport-security')).toBe(false);
    expect(policyOf(plain)).not.toHaveProperty('upgrade-insecure-requests');
    const secure = await startTestServer({ secure: true });
    const response = await secure.ask('/healthz');
    expect(response.headers.get('strict-transport-security')).toMatch(/^max-age=\d{8}/);
    expect(policyOf(response)).toHaveProperty('upgrade-insecure-requests');
    await secure.close();
  });
});

describe('errors', () => {
  it('are problem+json with an id that the log has too', async () => {
    const response = await server.ask('/api/v1/nowhere?token=secret');
    expect(response.status).toBe(404);
    expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8');
    const body = problem.parse(await response.json());
    expect(body).toMatchObject({ type: 'about:blank', title: 'Not Found', status: 404, code: 'not-found' });
    expect(server.log.some((line) => line['reqId'] === body.id && line['status'] === 404)).toBe(true);
  });

  it('of the server keep their details in the log', async () => {
    const broken = await startTestServer({
      isReady: () => {
        throw new Error('the disk is on fire');
      },
    });
    const response = await broken.ask('/readyz');
    const text = await response.text();
    expect(response.status).toBe(500);
    expect(text).not.toContain('fire');
    const { id } = problem.parse(JSON.parse(text));
    const line = broken.log.find((entry) => entry['reqId'] === id && entry['level'] === 50);
    expect(JSON.stringify(line)).toContain('the disk is on fire');
    await broken.close();
  });
});

describe('the log', () => {
  it('has the pattern of the route, and nothing a person or a token is known by', async () => {
    await server.ask('/api/v1/refrigerants/R-22/saturation?pressure=68&unit=psig&note=jane', {
      headers: { 'User-Agent': 'janes-phone', 'X-Forwarded-For': '203.0.113.9' },
    });
    await server.ask('/reports/jane-token', { headers: { Cookie: 'session=jane' } });
    await server.ask('/api/v1/refrigerants/jane/saturation?pressure=68&unit=psig');
    const text = server.log.map((line) => JSON.stringify(line)).join('\n');
    expect(text).toContain('"route":"/api/v1/refrigerants/:id/saturation"');
    for (const personal of ['jane', '203.0.113.9', '127.0.0.1', 'pressure=']) expect(text).not.toContain(personal);
  });
});

describe('limits', () => {
  let limited: TestServer;
  afterEach(() => limited.close());

  it('let hundreds of look-ups a second from one address pass', async () => {
    limited = await startTestServer();
    const answers = await Promise.all(Array.from({ length: 500 }, () => limited.ask('/api/v1/openapi.json')));
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([200]));
  });

  it('refuse more than that with 429, but not the page and health', async () => {
    limited = await startTestServer({ limits: { ...LIMITS, requestsPerSecond: 20 } });
    const answers = await Promise.all(Array.from({ length: 60 }, () => limited.ask('/api/v1/openapi.json')));
    const refused = answers.filter(({ status }) => status === 429);
    expect(refused.length).toBeGreaterThan(0);
    expect(refused[0]?.headers.get('retry-after')).toBe('1');
    expect(problem.parse(await refused[0]?.json()).code).toBe('too-many-requests');
    expect((await limited.ask('/healthz')).status).toBe(200);
  });

  const EVALUATIONS = '/api/v1/evaluations';
  const JSON_FROM = (address: string) => ({ 'Content-Type': 'application/json', 'X-Forwarded-For': address });

  /** A sender that starts a body and never ends it. */
  const startSlowBody = (address: string) => {
    const { port } = new URL(limited.url);
    const slow = http.request({ port, path: EVALUATIONS, method: 'POST', headers: JSON_FROM(address) });
    slow.on('error', () => undefined);
    slow.write('{');
    return slow;
  };
  const statusFor = async (address: string) =>
    (await limited.ask(EVALUATIONS, { method: 'POST', headers: JSON_FROM(address), body: '{}' })).status;

  it('refuse evaluations beyond those under way, and take them again afterwards', async () => {
    limited = await startTestServer({ trustProxy: 'loopback', limits: { ...LIMITS, evaluationsAtOnce: 1 } });
    const slow = startSlowBody('203.0.113.1');
    await expect.poll(() => statusFor('203.0.113.2')).toBe(503);
    slow.destroy();
    await expect.poll(() => statusFor('203.0.113.2')).toBe(422);
  });

  it('leave other addresses their places when one fills its own with slow bodies', async () => {
    limited = await startTestServer({ trustProxy: 'loopback', limits: { ...LIMITS, evaluationsAtOncePerAddress: 1 } });
    const slow = startSlowBody('203.0.113.1');
    await expect.poll(() => statusFor('203.0.113.1')).toBe(503);
    expect(await statusFor('203.0.113.2')).toBe(422);
    slow.destroy();
    await expect.poll(() => statusFor('203.0.113.1')).toBe(422);
  });

  it('hold for one address each when a proxy is trusted to name them', async () => {
    limited = await startTestServer({ trustProxy: 'loopback', limits: { ...LIMITS, requestsPerSecond: 3 } });
    const from = (address: string) => limited.ask('/api/v1/openapi.json', { headers: { 'X-Forwarded-For': address } });
    const answers = await Promise.all(Array.from({ length: 12 }, (_, at) => from(`203.0.113.${at}`)));
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([200]));
  });
});

describe('compression', () => {
  it('is brotli where the client takes it', async () => {
    const response = await server.ask('/api/v1/refrigerants', { headers: { 'Accept-Encoding': 'gzip, br' } });
    expect(response.headers.get('content-encoding')).toBe('br');
  });

  it('leaves event streams alone: their events must not wait', async () => {
    const app = express();
    app.use(compress);
    app.get('/', (_req, res) => {
      res.type('text/event-stream');
      res.write(`data: ${'x'.repeat(5_000)}\n\n`);
      res.end();
    });
    const stream = http.createServer(app);
    await new Promise<void>((resolve) => stream.listen(0, '127.0.0.1', resolve));
    const response = await fetch(`http://127.0.0.1:${(stream.address() as AddressInfo).port}/`);
    expect(response.headers.has('content-encoding')).toBe(false);
    await response.text();
    stream.close();
  });
});

describe('the page', () => {
  let folder: string;
  let site: TestServer;
  beforeAll(async () => {
    folder = mkdtempSync(path.join(tmpdir(), 'web-'));
    mkdirSync(path.join(folder, 'media'));
    const files = {
      'index.html': '<!doctype html><title>the page</title>',
      'main-5QJ2KX7A.js': 'export {};',
      'media/noto-sans-latin-400-normal-ABCD2345.woff2': 'font',
      'ngsw.json': '{}',
      'ngsw-worker.js': '//',
      'manifest.webmanifest': '{}',
      '.secret': 'hidden',
    };
    for (const [name, text] of Object.entries(files)) writeFileSync(path.join(folder, name), text);
    site = await startTestServer({ webRoot: folder });
  });
  afterAll(async () => {
    await site.close();
    rmSync(folder, { recursive: true });
  });

  /** Not by fetch, which asks for a fresh answer as soon as it is given an ETag. */
  const statusWithEtag = (address: string, etag: string) =>
    new Promise((resolve, reject) => {
      const request = http.get(address, { headers: { 'If-None-Match': etag } }, (response) => {
        response.resume();
        resolve(response.statusCode);
      });
      request.on('error', reject);
    });

  const navigate = (address: string) => site.ask(address, { headers: { Accept: 'text/html,*/*;q=0.8' } });

  it.each(['/', '/index.html', '/ngsw.json', '/ngsw-worker.js', '/manifest.webmanifest'])(
    'asks first whether %s has changed',
    async (address) => {
      const response = await site.ask(address);
      expect(response.status).toBe(200);
      expect(response.headers.get('cache-control')).toBe('no-cache');
      expect(await statusWithEtag(site.url + address, response.headers.get('etag') ?? '')).toBe(304);
    },
  );

  it.each(['/main-5QJ2KX7A.js', '/media/noto-sans-latin-400-normal-ABCD2345.woff2'])(
    'keeps %s, whose name changes with its content',
    async (address) => {
      const response = await site.ask(address);
      expect(response.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    },
  );

  it.each(['/checks/7', '/properties', '/a/b/c?d=e'])('answers a navigation to %s', async (address) => {
    const response = await navigate(address);
    expect(response.status).toBe(200);
    expect(await response.text()).toContain('the page');
    expect(response.headers.get('cache-control')).toBe('no-cache');
  });

  it.each(['/chunk-GONE2345.js', '/.secret', '/../package.json', '/%2e%2e/package.json', '/favicon.ico'])(
    'is not given for the missing file %s',
    async (address) => {
      const response = await navigate(address);
      expect(response.status).toBe(404);
      expect(problem.parse(await response.json()).code).toBe('not-found');
    },
  );

  it('is not given to a program that asks for data, nor under /api', async () => {
    expect((await site.ask('/checks/7', { headers: { Accept: 'application/json' } })).status).toBe(404);
    expect((await navigate('/api/v1/checks')).status).toBe(404);
    expect((await navigate('/api')).status).toBe(404);
  });

  it('does not take what is sent to it', async () => {
    expect((await site.postJson('/checks/7', {})).status).toBe(404);
  });

  it('asks robots to leave the API alone', async () => {
    expect(await (await site.ask('/robots.txt')).text()).toContain('Disallow: /api/');
  });

  it('may be missing: the API answers all the same', async () => {
    expect((await server.ask('/', { headers: { Accept: 'text/html' } })).status).toBe(404);
    expect((await server.postJson('/api/v1/evaluations', EVALUATION_EXAMPLE)).status).toBe(200);
  });
});
