import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { cpSync, writeFileSync } from 'node:fs';
import net from 'node:net';
import path from 'node:path';
import { expect, it, onTestFinished } from 'vitest';
import { sourceHash } from '../../apps/launch/build.mjs';
import { installHash } from '../../apps/launch/install.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

const LAUNCH = path.resolve(import.meta.dirname, '../../apps/launch');

const server = (onSignal) => `
  import http from 'node:http';
  const { PORT, HOST, DATA_DIR, WEB_ROOT } = process.env;
  const server = http.createServer((request, response) => response.end(JSON.stringify({ service: 'chargewright' })));
  server.listen(Number(PORT), HOST, () => console.log(JSON.stringify({ PORT, HOST, DATA_DIR, WEB_ROOT })));
  process.on('SIGTERM', () => ${onSignal});
`;
const ENDS_WELL = "{ console.log('server closed'); server.close(); }";

/** A repository in which everything is installed and built, so that only serving is left. */
function builtRepository(main = server(ENDS_WELL)) {
  const root = temporaryFolder({
    'package.json': '{}',
    'package-lock.json': '{}',
    'apps/api/package.json': '{ "type": "module" }',
    'packages/engine/package.json': '{}',
    'dist/package.json': '{ "type": "module" }',
    'dist/api/main.js': main,
    'node_modules/.chargewright-installed': '',
    'dist/.sources': '',
  });
  cpSync(LAUNCH, path.join(root, 'apps/launch'), { recursive: true });
  writeFileSync(path.join(root, 'node_modules/.chargewright-installed'), installHash(root));
  writeFileSync(path.join(root, 'dist/.sources'), sourceHash(root));
  return root;
}

async function freePort() {
  const probe = net.createServer().listen(0, '127.0.0.1');
  await once(probe, 'listening');
  const { port } = probe.address();
  probe.close();
  await once(probe, 'close');
  return port;
}

/** Starts with an empty environment; gives the output so far, waiting for a text in it, and the exit code. */
function start(root, port) {
  const env = { PATH: '/usr/bin:/bin', HOME: root, PORT: String(port) };
  const child = spawn(process.execPath, [path.join(root, 'apps/launch/start.mjs')], { cwd: '/', env });
  onTestFinished(() => void child.kill('SIGKILL'));
  let output = '';
  child.stdout.on('data', (chunk) => (output += chunk));
  child.stderr.on('data', (chunk) => (output += chunk));
  const ended = once(child, 'close').then(([code]) => code);
  const until = (text) => expect.poll(() => output, { timeout: 10_000 }).toContain(text);
  return { child, ended, until, output: () => output };
}

it('serves what is built, says where, and ends cleanly on SIGTERM', async () => {
  const root = builtRepository();
  const port = await freePort();
  const begun = performance.now();
  const app = start(root, port);
  await app.until('Secure context on this computer');
  expect(performance.now() - begun).toBeLessThan(5_000);
  expect(app.output()).toContain(`Chargewright is ready: http://127.0.0.1:${port}/\n`);
  const given = { PORT: String(port), HOST: '127.0.0.1', DATA_DIR: `${root}/data`, WEB_ROOT: `${root}/dist/web` };
  expect(app.output()).toContain(JSON.stringify(given));
  app.child.kill('SIGTERM');
  await expect(app.ended).resolves.toBe(0);
  expect(app.output()).toContain('server closed');
});

it('ends with the code of a server that fails, and says so', async () => {
  const app = start(builtRepository('process.exit(7);'), await freePort());
  await expect(app.ended).resolves.toBe(7);
  expect(app.output()).toContain('The server ended with code 7.');
  expect(app.output()).not.toContain('ready');
});

it('says that another Chargewright holds the port, which one, and how to take another port', async () => {
  const root = builtRepository();
  const port = await freePort();
  const first = start(root, port);
  await first.until('ready');
  const second = start(root, port);
  await expect(second.ended).resolves.toBe(1);
  expect(second.output()).toMatch(
    new RegExp(
      `^Port ${port} is held by another Chargewright, process \\d+: .*dist/api/main\\.js\\. ` +
        `Stop it, or choose another: PORT=${port + 1} npm start\n$`,
    ),
  );
  first.child.kill('SIGTERM');
  await first.ended;
});

it('says which other program holds the port', async () => {
  const other = net.createServer((socket) => socket.end()).listen(0, '127.0.0.1');
  await once(other, 'listening');
  onTestFinished(() => void other.close());
  const { port } = other.address();
  const app = start(builtRepository(), port);
  await expect(app.ended).resolves.toBe(1);
  expect(app.output()).toContain(`Port ${port} is held by another program, process ${process.pid}: `);
});
