/// <reference lib="dom" />
import { readdirSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeBrowser, newPhone } from './harness/phone';
import { type RunningServer, startServer, WEB_ROOT } from './harness/server';
import { downloadBytes, staticGraph, textOf } from './harness/static-graph';

/** Everything that the first visit downloads, fonts and icon included. */
const LIMIT_BYTES = 180_000;

/** Names that survive minification, as they are property names or texts. */
const DEXIE = 'DexieError';
const ZOD = '~standard';
const CURVES = 'R-410A';
const JUDGEMENT = 'come-back-at-higher-target';

let server: RunningServer;

beforeAll(async () => {
  server = await startServer();
});

afterAll(async () => {
  await closeBrowser();
  await server.stop();
});

const sizeTable = (files: readonly string[]) =>
  files.map((file) => `${String(downloadBytes(file)).padStart(7)} ${file}`).join('\n');

describe('the first download', () => {
  it('has the refrigerants in it, and leaves the judgement, the store and its schemas for right after the first paint', () => {
    expect(textOf(staticGraph()).includes(CURVES)).toBe(true);
    const all = readdirSync(WEB_ROOT).filter((file) => file.endsWith('.js') && !/worker/.test(file));
    for (const mark of [DEXIE, ZOD, JUDGEMENT]) {
      expect(textOf(all).includes(mark), mark).toBe(true);
      expect(textOf(staticGraph()).includes(mark), mark).toBe(false);
    }
  });

  it('is at most 180 kB gzipped, with fonts and icon, and nothing else is asked for before the first paint', async () => {
    const phone = await newPhone(server.origin);
    const asked = new Set<string>();
    phone.page.on('request', (request) => {
      if (!request.serviceWorker()) asked.add(new URL(request.url()).pathname.slice(1) || 'index.html');
    });
    await phone.page.goto('/', { waitUntil: 'networkidle' });
    const { painted, started } = await phone.page.evaluate(() => ({
      painted: performance.getEntriesByName('first-contentful-paint')[0]?.startTime ?? 0,
      started: performance
        .getEntriesByType('resource')
        .map(({ name, startTime }) => ({ file: new URL(name).pathname.slice(1), startTime })),
    }));
    const graph = staticGraph();
    expect([...asked]).toEqual(expect.arrayContaining(graph));
    const isLazy = (file: string) => file.endsWith('.js') && !graph.includes(file);
    expect(painted).toBeGreaterThan(0);
    expect(started.filter(({ file, startTime }) => isLazy(file) && startTime < painted)).toEqual([]);
    // Unasked, so that a roof without a network still gets its answer.
    expect(textOf(started.map(({ file }) => file).filter(isLazy)).includes(JUDGEMENT)).toBe(true);
    // The worker asks for its manifest and its files once the page stands still; the page looks into the manifest.
    const files = [...asked].filter((file) => !isLazy(file) && file !== 'ngsw.json');
    const bytes = files.reduce((sum, file) => sum + downloadBytes(file), 0);
    expect(files.filter((file) => file.endsWith('.woff2')).length).toBeGreaterThan(0);
    expect(bytes, sizeTable(files)).toBeLessThanOrEqual(LIMIT_BYTES);
    expect(phone.faults).toEqual([]);
    await phone.close();
  });
});
