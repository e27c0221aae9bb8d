/// <reference lib="dom" />
import { readdirSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeBrowser, newPhone } from './harness/phone';
import { type RunningServer, startServer, WEB_ROOT } from './harness/server';
import { downloadBytes, staticGraph, textOf } from './harness/static-graph';

const LIMIT_BYTES = 180_000;

/** Names that survive minification, as they are property names or texts. */
const DEXIE = 'DexieError';
const ZOD = '~standard';
const CURVES = 'R-410A';

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
  it('is at most 180 kB gzipped, with engine, curves, tables and wording in it', () => {
    const files = staticGraph();
    const bytes = files.reduce((sum, file) => sum + downloadBytes(file), 0);
    expect(bytes, sizeTable(files)).toBeLessThanOrEqual(LIMIT_BYTES);
    expect(textOf(files)).toContain(CURVES);
  });

  it('leaves the store and its schemas for later', () => {
    const all = readdirSync(WEB_ROOT).filter((file) => file.endsWith('.js') && !/worker/.test(file));
    for (const mark of [DEXIE, ZOD]) {
      expect(textOf(all)).toContain(mark);
      expect(textOf(staticGraph())).not.toContain(mark);
    }
  });

  it('holds all that the browser asks for before the page is painted, fonts and icon included', async () => {
    const phone = await newPhone(server.origin);
    const asked = new Map<string, Promise<Buffer>>();
    phone.page.on('response', (response) => {
      if (response.request().serviceWorker()) return;
      const file = new URL(response.url()).pathname.slice(1) || 'index.html';
      asked.set(file, response.body());
    });
    await phone.page.goto('/', { waitUntil: 'networkidle' });
    const painted = await phone.page.evaluate(
      () => performance.getEntriesByName('first-contentful-paint')[0]?.startTime ?? 0,
    );
    const started = await phone.page.evaluate(() =>
      (performance.getEntriesByType('resource') as PerformanceResourceTiming[]).map(({ name, startTime }) => ({
        file: new URL(name).pathname.slice(1),
        startTime,
      })),
    );
    expect(painted).toBeGreaterThan(0);
    const graph = staticGraph();
    const late = new Set(started.filter(({ startTime }) => startTime > painted).map(({ file }) => file));
    const early = [...asked.keys()].filter((file) => !late.has(file) || graph.includes(file));
    expect(early).toEqual(expect.arrayContaining(graph));
    // What is not part of the first page was asked for after the first paint.
    const others = early.filter((file) => file.endsWith('.js') && !graph.includes(file));
    expect(others).toEqual([]);
    let bytes = 0;
    for (const file of early) bytes += downloadBytes(file, await asked.get(file));
    expect(bytes, early.join(' ')).toBeLessThanOrEqual(LIMIT_BYTES);
    expect(phone.faults).toEqual([]);
    await phone.close();
  });
});
