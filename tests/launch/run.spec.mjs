import { readFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { mustRun, run, toolEnv } from '../../apps/launch/run.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

it('keeps the output in the log and gives the code', async () => {
  const logFile = path.join(temporaryFolder(), 'logs/tool.log');
  const outcome = await run('sh', ['-c', 'echo out; echo err >&2; exit 3'], { logFile });
  expect(outcome).toMatchObject({ code: 3, timedOut: false });
  expect(readFileSync(logFile, 'utf8')).toBe('out\nerr\n');
});

it('ends a tool over its time together with what it started', async () => {
  const folder = temporaryFolder();
  const script = `sleep 60 & echo $! > ${folder}/pid; wait`;
  const outcome = await run('sh', ['-c', script], { logFile: path.join(folder, 'tool.log'), timeoutMs: 300 });
  expect(outcome).toMatchObject({ code: null, timedOut: true });
  const sleeper = Number(readFileSync(path.join(folder, 'pid'), 'utf8'));
  expect(sleeper).toBeGreaterThan(0);
  const isRunning = () => {
    try {
      // A killed process stays a zombie (Z) until its new parent collects it.
      return !/\) Z /.test(readFileSync(`/proc/${sleeper}/stat`, 'utf8'));
    } catch {
      return false;
    }
  };
  await expect.poll(isRunning).toBe(false);
});

it('shows the end of the output of a tool that failed', async () => {
  const root = temporaryFolder();
  const failure = mustRun('tool', 'sh', ['-c', 'seq 200; exit 1'], { root });
  await expect(failure).rejects.toMatchObject({
    message: `tool failed with code 1. The whole output is in ${root}/.launch/tool.log`,
    log: expect.stringMatching(/^121\n(.*\n)*200$/),
  });
});

it('gives tools no colours, no questions, and this Node first', () => {
  const env = toolEnv({ npm_config_nodedir: '/usr' });
  expect(env).toMatchObject({ NO_COLOR: '1', NG_CLI_ANALYTICS: 'false', npm_config_nodedir: '/usr' });
  expect(env.FORCE_COLOR).toBeUndefined();
  expect(env.PATH.split(path.delimiter)[0]).toBe(path.dirname(process.execPath));
});
