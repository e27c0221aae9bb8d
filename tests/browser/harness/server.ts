import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

export const ROOT = path.resolve(import.meta.dirname, '../../..');
/** Where the build is; another folder than `dist` lets the tests run beside a build. */
const DIST = path.resolve(ROOT, process.env['DIST_DIR'] ?? 'dist');
export const WEB_ROOT = path.join(DIST, 'web');
const SERVER = path.join(DIST, 'api/main.js');
const START_LIMIT_MS = 20_000;

/** The built server with the built page, as `npm start` runs it, on a port that is free. */
export interface RunningServer {
  readonly origin: string;
  /** Ends it, as a lost network does for the page. */
  stop(): Promise<void>;
  /** Starts it again at the same address. */
  restart(): Promise<void>;
}

export async function startServer(webRoot = WEB_ROOT): Promise<RunningServer> {
  for (const file of [SERVER, path.join(webRoot, 'index.html')]) {
    if (!existsSync(file))
      throw new Error(`${file} is missing: run "npm run build" first ("npm test" does it itself).`);
  }
  const dataDir = mkdtempSync(path.join(tmpdir(), 'chargewright-browser-'));
  let child = spawnServer(0, dataDir, webRoot);
  const port = await listeningPort(child);
  return {
    origin: `http://127.0.0.1:${port}`,
    async stop() {
      await end(child);
      rmSync(dataDir, { recursive: true, force: true });
    },
    async restart() {
      child = spawnServer(port, dataDir, webRoot);
      await listeningPort(child);
    },
  };
}

const spawnServer = (port: number, dataDir: string, webRoot: string): ChildProcess =>
  spawn(process.execPath, [SERVER], {
    cwd: ROOT,
    env: {
      PATH: process.env['PATH'],
      PORT: String(port),
      HOST: '127.0.0.1',
      DATA_DIR: dataDir,
      WEB_ROOT: webRoot,
      LOG_LEVEL: 'info',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });

/** The port that the server's first log line names. */
function listeningPort(child: ChildProcess): Promise<number> {
  return new Promise((resolve, reject) => {
    let said = '';
    const timer = setTimeout(
      () => reject(new Error(`The server did not listen in time. It said:\n${said}`)),
      START_LIMIT_MS,
    );
    const hear = (chunk: Buffer) => {
      said += chunk.toString();
      const port = /"port":(\d+)[^\n]*"msg":"listening"/.exec(said)?.[1];
      if (port === undefined) return;
      clearTimeout(timer);
      resolve(Number(port));
    };
    child.stdout?.on('data', hear);
    child.stderr?.on('data', hear);
    child.once('exit', (code) => {
      clearTimeout(timer);
      reject(new Error(`The server ended with ${code}. It said:\n${said}`));
    });
  });
}

function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((resolve) => {
    child.once('exit', () => resolve());
    child.kill('SIGTERM');
  });
}
