import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import pino from 'pino';
import { createApp } from '../app';
import type { AppDeps } from '../app';
import { LIMITS } from '../http/limits';
import type { Records } from '../db/records';
import { openSessions } from '../features/sign-in/sessions';
import { signInWaits } from '../features/sign-in/sign-in-waits';
import { createServer } from '../server';
import { temporaryRecords } from './temporary-records';

export interface TestServer {
  readonly url: string;
  readonly app: Express;
  /** Lines of the log, oldest first. */
  readonly log: readonly Readonly<Record<string, unknown>>[];
  /** `fetch` of a path of this server. */
  ask(path: string, init?: RequestInit): Promise<Response>;
  postJson(path: string, body: unknown): Promise<Response>;
  readonly records: Records;
  close(): Promise<void>;
}

/** The server in this process on a free port; `deps` shows what matters to the test. */
export async function startTestServer(deps: Partial<AppDeps> = {}): Promise<TestServer> {
  const log: Readonly<Record<string, unknown>>[] = [];
  const logger = pino(
    { level: 'debug', base: null },
    { write: (line: string) => log.push(JSON.parse(line) as Readonly<Record<string, unknown>>) },
  );
  const records = temporaryRecords();
  const sessions = openSessions(records, { secure: false });
  const app = createApp({
    logger,
    records,
    sessions,
    waits: signInWaits(),
    publicUrl: undefined,
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
    app,
    records,
    close: async () => {
      await new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      });
      await records.discard();
    },
  };
}
