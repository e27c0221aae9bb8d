import { mkdirSync, rmSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import path from 'node:path';
import { prepareChromium } from './chromium.mjs';
import { closingLine, countTests } from './count-tests.mjs';
import { ensureInstalled } from './install.mjs';
import { ROOT } from './paths.mjs';
import { logTail, run, stopWithTools, toolEnv } from './run.mjs';
import { LaunchError, say, sayFailure, seconds } from './say.mjs';
import { allSuites, chooseSuites } from './suites.mjs';

const SHOWN_LOG_LINES = 400;
const SHOWN_SLOWEST = 10;
const MOST_AT_ONCE = 2;

/** Never left out quietly: without a browser the suite fails, with the reason. */
async function chromiumFor(suite) {
  if (!suite.needsChromium) return {};
  return { CHROMIUM_PATH: await prepareChromium() };
}

async function runSuite(suite) {
  say(`${suite.name} (at most ${suite.budgetSeconds} s) …`);
  const start = performance.now();
  const logFile = path.join(ROOT, 'test-results', `${suite.name}.log`);
  const reportFile = suite.report && path.join(ROOT, suite.report);
  let result;
  try {
    const env = toolEnv(await chromiumFor(suite));
    const [command, ...args] = suite.command;
    const outcome = await run(command, args, { env, logFile, timeoutMs: suite.budgetSeconds * 1000 });
    result = countTests(outcome, suite.budgetSeconds, reportFile);
    if (result.failed > 0) say(logTail(logFile, SHOWN_LOG_LINES));
  } catch (error) {
    if (!(error instanceof LaunchError)) throw error;
    sayFailure(error);
    result = { passed: 0, failed: 1, skipped: 0, why: error.message, tests: [] };
  }
  const why = result.why === null ? '' : ` (${result.why})`;
  say(`  ${suite.name}: ${result.passed} passed, ${result.failed} failed${why}`);
  return { ...result, name: suite.name, budgetSeconds: suite.budgetSeconds, milliseconds: performance.now() - start };
}

/** Two at a time on two cores or more; those that need the machine for themselves after the others. */
async function runSuites(suites) {
  const results = new Map();
  const runNext = async (queue) => {
    for (let suite = queue.shift(); suite !== undefined; suite = queue.shift()) {
      results.set(suite.name, await runSuite(suite));
    }
  };
  const shared = suites.filter(({ alone }) => !alone);
  await Promise.all(Array.from({ length: Math.min(MOST_AT_ONCE, availableParallelism()) }, () => runNext(shared)));
  await runNext(suites.filter(({ alone }) => alone));
  return suites.map(({ name }) => results.get(name));
}

function report(results) {
  say('\nsuite        passed  failed  skipped  time / budget');
  for (const { name, passed, failed, skipped, milliseconds, budgetSeconds, why } of results) {
    const counts = `${String(passed).padStart(6)}  ${String(failed).padStart(6)}  ${String(skipped).padStart(7)}`;
    say(`${name.padEnd(12)} ${counts}  ${seconds(milliseconds)} / ${budgetSeconds} s${why === null ? '' : `  ${why}`}`);
  }
  const tests = results.flatMap((suite) => suite.tests.map((test) => ({ ...test, suite: suite.name })));
  say(`\nThe slowest ${SHOWN_SLOWEST}:`);
  for (const { suite, name, milliseconds } of tests
    .sort((a, b) => b.milliseconds - a.milliseconds)
    .slice(0, SHOWN_SLOWEST)) {
    say(`${seconds(milliseconds).padStart(8)}  ${suite}: ${name}`);
  }
  say();
}

/** `npm test`: prepares as `npm start` does, runs all suites (or the named ones) and ends with the closing line. */
export async function test(names) {
  const results = [];
  try {
    stopWithTools();
    const suites = chooseSuites(names, allSuites());
    await ensureInstalled();
    // So that no result of an earlier run is counted.
    rmSync(path.join(ROOT, 'test-results'), { recursive: true, force: true });
    mkdirSync(path.join(ROOT, 'test-results'));
    results.push(...(await runSuites(suites)));
    report(results);
  } catch (error) {
    sayFailure(error);
    results.push({ passed: 0, failed: 1, skipped: 0 });
  }
  say(closingLine(results));
  process.exitCode = results.some(({ failed }) => failed > 0) ? 1 : 0;
}
