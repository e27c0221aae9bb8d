import type { AddressInfo } from 'node:net';
import pino from 'pino';
import { createApp } from '../app';
import type { AppDeps } from '../app';
import { LIMITS } from '../http/limits';
import { createServer } from '../server';

export interface TestServer {
  readonly url: string;
  /** Lines of the log, oldest first. */
  readonly log: readonly Readonly<Record<string, unknown>>[];
  /** `fetch` of a path of this server. */
  ask(path: string, init?: RequestInit): Promise<Response>;
  postJson(path: string, body: unknown): Promise<Response>;
  close(): Promise<void>;
}

/** The server in this process on a free port; `deps` shows what matters to the test. */
export async function startTestServer(deps: Partial<AppDeps> = {}): Promise<TestServer> {
  const log: Readonly<Record<string, unknown>>[] = [];
  const logger = pino(
    { level: 'debug', base: null },
    { write: (line: string) => log.push(JSON.parse(line) as Readonly<Record<string, unknown>>) },
  );
  const app = createApp({
    logger,
    limits: LIMITS,
    trustProxy: false,
    secure: false,
    webRoot: 'no-such-folder',
    isReady: () => true,
    ...deps,
  });
  const server = createServer(app, undefined);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const ask = (path: string, init?: RequestInit) => fetch(url + path, init);
  return {
    url,
    log,
    ask,
    postJson: (path, body) =>
      ask(path, { method: 'POST', headers: { 'Content-Type': 'application/json' }, body: JSON.stringify(body) }),
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}
