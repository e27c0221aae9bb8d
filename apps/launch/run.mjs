import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, readFileSync } from 'node:fs';
import { constants } from 'node:os';
import path from 'node:path';
import { ROOT, workFolder } from './paths.mjs';
import { LaunchError } from './say.mjs';

const LOG_TAIL_LINES = 80;
const KILL_AFTER_MS = 5_000;
const running = new Set();

/** Environment for every tool: no colours, no questions, no telemetry, and the Node that runs this script first in PATH. */
export function toolEnv(extra = {}) {
  const env = { ...process.env, CI: 'true', NO_COLOR: '1', NG_CLI_ANALYTICS: 'false', ...extra };
  delete env.FORCE_COLOR;
  delete env.NODE_ENV;
  env.PATH = [path.dirname(process.execPath), process.env.PATH ?? '/usr/bin:/bin'].join(path.delimiter);
  return env;
}

function killGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch (error) {
    // ESRCH: the group ended between the decision and the call, which is what was wanted.
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * From now on SIGTERM and SIGINT end this script together with every tool still running and all its children.
 * Returns the function that takes this back.
 */
export function stopWithTools() {
  const stop = (signal) => {
    for (const child of running) killGroup(child, 'SIGTERM');
    process.exit(128 + constants.signals[signal]);
  };
  process.on('SIGTERM', stop).on('SIGINT', stop);
  return () => process.off('SIGTERM', stop).off('SIGINT', stop);
}

/**
 * Runs a command with its output in a log file; resolves to `{ code, timedOut, logFile, milliseconds }`.
 * `code` is null when it was ended by a signal or could not be started (the log then says why).
 */
export async function run(command, args, { logFile, timeoutMs, env = toolEnv(), cwd = ROOT } = {}) {
  mkdirSync(path.dirname(logFile), { recursive: true });
  const log = openSync(logFile, 'w');
  const start = performance.now();
  // Its own process group: a tool over its time is ended together with the workers it started.
  const child = spawn(command, args, { cwd, env, stdio: ['ignore', log, log], detached: true });
  let timedOut = false;
  let timer;
  try {
    const code = await new Promise((resolve, reject) => {
      child.once('error', reject);
      child.once('exit', resolve);
      if (child.pid === undefined) return;
      running.add(child);
      if (timeoutMs === undefined) return;
      timer = setTimeout(() => {
        timedOut = true;
        killGroup(child, 'SIGTERM');
        timer = setTimeout(() => killGroup(child, 'SIGKILL'), KILL_AFTER_MS);
      }, timeoutMs);
    });
    return { code, timedOut, logFile, milliseconds: performance.now() - start };
  } finally {
    clearTimeout(timer);
    running.delete(child);
    closeSync(log);
  }
}

/** The last lines of a log, for showing after a failure. */
export function logTail(logFile, lines = LOG_TAIL_LINES) {
  const all = readFileSync(logFile, 'utf8').trimEnd().split('\n');
  return all.slice(-lines).join('\n');
}

/** Runs a command that has to succeed; its output is shown only when it does not. */
export async function mustRun(name, command, args, options = {}) {
  const logFile = path.join(workFolder(options.root), `${name}.log`);
  const result = await run(command, args, { ...options, cwd: options.root ?? ROOT, logFile });
  if (result.code === 0) return;
  const how = result.code === null ? 'was ended by a signal' : `failed with code ${result.code}`;
  throw new LaunchError(`${name} ${how}. The whole output is in ${logFile}`, { log: logTail(logFile) });
}
