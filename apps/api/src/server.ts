import http from 'node:http';
import https from 'node:https';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import type { Config } from './config';

/** A sender that takes longer holds a place others need; a phone in a basement still manages 100 kB. */
const HEADERS_WITHIN_MS = 10_000;
const REQUEST_WITHIN_MS = 30_000;
const MOST_CONNECTIONS = 2_000;
/** What is under way may finish; streams would never. */
const FINISH_WITHIN_MS = 2_000;

/** A port or address that cannot be listened on; the message is one line that says how to change it. */
export class ListenError extends Error {
  override readonly name = 'ListenError';
}

export function createServer(app: Express, tls: Config['tls']): http.Server | https.Server {
  const limits = { headersTimeout: HEADERS_WITHIN_MS, requestTimeout: REQUEST_WITHIN_MS };
  const server = tls === undefined ? http.createServer(limits, app) : https.createServer({ ...tls, ...limits }, app);
  server.maxConnections = MOST_CONNECTIONS;
  return server;
}

/** Listens and answers the port, which the system chose if 0 was asked for. */
export async function listen(server: http.Server, { host, port }: Pick<Config, 'host' | 'port'>): Promise<number> {
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => reject(listenError(error, host, port)));
    server.listen(port, host, resolve);
  });
  return (server.address() as AddressInfo).port;
}

function listenError({ code = '', message }: NodeJS.ErrnoException, host: string, port: number): ListenError {
  const other = port < 65_535 ? port + 1 : 4000;
  const known: Readonly<Record<string, string>> = {
    EADDRINUSE: `Port ${port} on ${host} is in use by another program. Choose another: PORT=${other}`,
    EACCES: `Port ${port} on ${host} is not allowed for this user. Choose another: PORT=4000`,
    EADDRNOTAVAIL: `${host} is not an address of this computer. Choose another: HOST=127.0.0.1`,
  };
  return new ListenError(known[code] ?? `Cannot listen on ${host}, port ${port} (${message}). Set HOST and PORT.`);
}

/** Stops accepting, lets requests under way finish for a moment, then ends every connection. */
export async function closeServer(server: http.Server): Promise<void> {
  const cut = setTimeout(() => server.closeAllConnections(), FINISH_WITHIN_MS);
  await new Promise<void>((resolve) => {
    server.close(() => resolve());
  });
  clearTimeout(cut);
}
