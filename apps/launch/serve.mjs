import { spawn } from 'node:child_process';
import http from 'node:http';
import https from 'node:https';
import net from 'node:net';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { ROOT } from './paths.mjs';
import { portHolder } from './port-holder.mjs';
import { LaunchError, say } from './say.mjs';
import { addresses, featureLine, ownAddress } from './settings.mjs';

const READY_WITHIN_MS = 30_000;
const POLL_MS = 50;
const STOP_WITHIN_MS = 10_000;
const LOOK_OUT_MS = 500;

/** The answer of /healthz as text, or null when nothing answers with 200. */
function healthz(settings) {
  const client = settings.secure ? https : http;
  // The certificate may be for another name, and is not what is asked about here.
  const options = { timeout: 1_000, rejectUnauthorized: false };
  return new Promise((resolve) => {
    const request = client.get(new URL('healthz', ownAddress(settings)), options, (response) => {
      let body = '';
      response.setEncoding('utf8');
      response.on('data', (chunk) => (body += chunk));
      response.on('end', () => resolve(response.statusCode === 200 ? body : null));
    });
    request.on('timeout', () => request.destroy());
    request.on('error', () => resolve(null));
  });
}

const tryListen = ({ host, port }) =>
  new Promise((resolve) => {
    const probe = net.createServer();
    probe.once('error', resolve);
    probe.listen({ host, port, exclusive: true }, () => probe.close(() => resolve(null)));
  });

/** Ends with one line if the server could not listen: who holds the port, and how to take another. */
export async function requireFreePort(settings) {
  const error = await tryListen(settings);
  if (error === null) return;
  const { host, port } = settings;
  if (error.code !== 'EADDRINUSE') {
    throw new LaunchError(
      `Cannot listen on ${host}, port ${port} (${error.code}). Choose another: PORT=4001 npm start`,
    );
  }
  const holder = portHolder(port);
  const isOurs = (await healthz(settings))?.toLowerCase().includes('chargewright') ?? false;
  const who = [
    isOurs ? 'another Chargewright' : 'another program',
    holder && `process ${holder.pid}: ${holder.command}`,
  ];
  const other = port === 65_535 ? 4000 : port + 1;
  throw new LaunchError(
    `Port ${port} is held by ${who.filter(Boolean).join(', ')}. Stop it, or choose another: PORT=${other} npm start`,
  );
}

async function waitUntilReady(settings, signal) {
  const start = performance.now();
  while (!signal.aborted) {
    if ((await healthz(settings)) !== null) return;
    if (performance.now() - start > READY_WITHIN_MS) {
      throw new LaunchError(`The server did not answer at ${ownAddress(settings)}healthz within 30 s.`);
    }
    await sleep(POLL_MS);
  }
}

function announce(settings) {
  say(`Chargewright is ready: ${addresses(settings).join('  ')}`);
  say(featureLine(settings));
}

function spawnServer(settings, root) {
  const env = {
    ...process.env,
    PORT: String(settings.port),
    HOST: settings.host,
    DATA_DIR: settings.dataFolder,
    WEB_ROOT: settings.webFolder,
  };
  const server = spawn(process.execPath, [path.join(root, 'dist/api/main.js')], { cwd: root, env, stdio: 'inherit' });
  const ended = new Promise((resolve, reject) => {
    server.once('error', reject);
    server.once('exit', (code, signal) => resolve({ code, signal }));
  });
  return { server, ended };
}

/**
 * npm passes a signal on, but not its own sudden end: without this look-out the server would live on and hold its port.
 * Only under npm, since a person may well start this script from a shell that ends.
 */
function whenNpmIsGone(stop) {
  if (process.env.npm_lifecycle_event === undefined) return () => {};
  const parent = process.ppid;
  const lookOut = setInterval(() => process.ppid === parent || stop('SIGTERM'), LOOK_OUT_MS);
  return () => clearInterval(lookOut);
}

/** Runs the built server until it is told to end by SIGTERM or SIGINT, or ends by itself; resolves to the exit code. */
export async function serve(settings, root = ROOT) {
  const { server, ended } = spawnServer(settings, root);
  const over = new AbortController();
  let toldToEnd = false;
  const stop = (signal) => {
    if (toldToEnd) return;
    toldToEnd = true;
    server.kill(signal);
    setTimeout(() => server.kill('SIGKILL'), STOP_WITHIN_MS).unref();
  };
  process.on('SIGTERM', stop).on('SIGINT', stop);
  const endLookOut = whenNpmIsGone(stop);
  const ready = waitUntilReady(settings, over.signal).then(() => over.signal.aborted || announce(settings));
  try {
    await Promise.race([ready, ended]);
    const { code, signal } = await ended;
    return exitCode(code, signal, toldToEnd);
  } finally {
    over.abort();
    endLookOut();
    server.kill('SIGTERM');
    process.off('SIGTERM', stop).off('SIGINT', stop);
  }
}

/** A server that was told to end and did so in time ended well, also when the signal itself ended it. */
function exitCode(code, signal, toldToEnd) {
  if (toldToEnd && signal !== 'SIGKILL' && !code) {
    say('Chargewright has stopped.');
    return 0;
  }
  say(`The server ended ${signal === null ? `with code ${code}` : `by ${signal}`}.`);
  return code || 1;
}
