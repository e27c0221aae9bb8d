import { readFileSync } from 'node:fs';

const allFailed = (why) => ({ passed: 0, failed: 1, skipped: 0, why, tests: [] });

function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    // Absent, or cut off when the run was ended: both mean that there is no result to count.
    if (error.code === 'ENOENT' || error instanceof SyntaxError) return null;
    throw error;
  }
}

/** A file that could not even be loaded has no tests of its own in the report, and is counted as one failed test. */
const unloadedFiles = (report) =>
  report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  );

/**
 * The result of a suite: `{ passed, failed, skipped, why, tests }`, `why` being null or the reason of a failure that is
 * not a failed test. `outcome` is what `run` resolved to, `reportFile` Vitest's JSON report, or null for a command that
 * counts as one test.
 */
export function countTests(outcome, budgetSeconds, reportFile) {
  if (outcome.timedOut) return allFailed(`over its budget of ${budgetSeconds} s`);
  if (reportFile === null) {
    if (outcome.code !== 0) return allFailed(`ended with code ${outcome.code}`);
    return { passed: 1, failed: 0, skipped: 0, why: null, tests: [] };
  }
  const report = readReport(reportFile);
  if (report === null) return allFailed(`wrote no report ${reportFile}`);
  if (report.numTotalTests === 0) return allFailed('ran no test');
  const unloaded = unloadedFiles(report);
  const failed = report.numFailedTests + unloaded.length;
  const onlyByCode = failed === 0 && outcome.code !== 0;
  return {
    passed: report.numPassedTests,
    failed: failed + (onlyByCode ? 1 : 0),
    skipped: report.numPendingTests + report.numTodoTests,
    why: onlyByCode ? `ended with code ${outcome.code}` : unloaded.length > 0 ? 'a file could not be loaded' : null,
    tests: report.testResults
      .flatMap(({ assertionResults }) => assertionResults)
      .map(({ fullName, duration }) => ({ name: fullName, milliseconds: duration ?? 0 })),
  };
}

/** The last line of a run, which is read by machines. */
export function closingLine(results) {
  const sum = (key) => results.reduce((total, result) => total + result[key], 0);
  const skipped = sum('skipped');
  return `${sum('passed')} passed, ${sum('failed')} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
}
