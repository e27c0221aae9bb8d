import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import type { IncomingHttpHeaders } from 'node:http';
import https from 'node:https';
import net from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';

const ROOT = path.resolve(import.meta.dirname, '../../..');

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'main-'));
});
afterAll(() => rmSync(folder, { recursive: true }));

interface Running {
  readonly process: ChildProcess;
  readonly ended: Promise<number | null>;
  output(): string;
}

const running: ChildProcess[] = [];
afterEach(() => {
  for (const child of running.splice(0)) child.kill('SIGKILL');
});

function start(env: Readonly<Record<string, string>>): Running {
  const child = spawn(process.execPath, ['--import', 'tsx', path.join(ROOT, 'apps/api/src/main.ts')], {
    cwd: ROOT,
    env: { PATH: process.env['PATH'], DATA_DIR: folder, WEB_ROOT: folder, PORT: '0', ...env },
  });
  running.push(child);
  let output = '';
  const collect = (chunk: Buffer) => {
    output += String(chunk);
  };
  child.stdout.on('data', collect);
  child.stderr.on('data', collect);
  return {
    process: child,
    ended: new Promise((resolve) => child.once('exit', resolve)),
    output: () => output,
  };
}

async function portOf({ output }: Running): Promise<number> {
  await expect.poll(output, { timeout: 20_000 }).toContain('"listening"');
  return Number(/"port":(\d+)/.exec(output())?.[1]);
}

describe('the server', () => {
  it('answers, and on SIGTERM ends well although a connection is open', async () => {
    const server = start({});
    const port = await portOf(server);
    expect((await fetch(`http://127.0.0.1:${port}/readyz`)).status).toBe(200);
    const idle = net.connect(port, '127.0.0.1').on('error', () => undefined);
    await new Promise((resolve) => idle.once('connect', resolve));
    server.process.kill('SIGTERM');
    expect(await server.ended).toBe(0);
    expect(server.output()).toContain('"stopped"');
    idle.destroy();
  }, 30_000);

  it('speaks HTTPS with the certificate it is given', async () => {
    const pem = (name: string) => path.join(ROOT, `apps/api/src/testing/localhost-${name}.pem`);
    const server = start({ TLS_CERT: pem('cert'), TLS_KEY: pem('key') });
    const port = await portOf(server);
    const headers = await new Promise<IncomingHttpHeaders>((resolve, reject) => {
      https
        .get({ host: '127.0.0.1', port, path: '/healthz', ca: readFileSync(pem('cert')) }, (response) => {
          response.resume();
          resolve(response.headers);
        })
        .on('error', reject);
    });
    expect(headers['strict-transport-security']).toContain('max-age');
  }, 30_000);

  it('says in one line when the port is taken, and how to take another', async () => {
    const other = net.createServer();
    await new Promise<void>((resolve) => other.listen(0, '127.0.0.1', resolve));
    const { port } = other.address() as AddressInfo;
    const server = start({ PORT: String(port) });
    expect(await server.ended).toBe(1);
    expect(server.output()).toMatch(new RegExp(`^Port ${port} on 127.0.0.1 is in use.*PORT=${port + 1}\n$`));
    other.close();
  }, 30_000);

  it('says in one line which setting cannot be used', async () => {
    const server = start({ PORT: 'http' });
    expect(await server.ended).toBe(1);
    expect(server.output()).toBe('PORT has to be a whole number from 0 to 65535\n');
  }, 30_000);
});
