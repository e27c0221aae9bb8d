import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { closingLine, countTests } from '../../apps/launch/count-tests.mjs';
import { chooseSuites } from '../../apps/launch/suites.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

const ended = (code) => ({ code, timedOut: false });
const file = (status, ...assertionResults) => ({ status, assertionResults });
const test = (status, duration) => ({ status, duration, fullName: `a ${status} test` });

const report = (counts, testResults) => {
  const zero = { numTotalTests: 0, numPassedTests: 0, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0 };
  const folder = temporaryFolder({ 'report.json': JSON.stringify({ ...zero, ...counts, testResults }) });
  return path.join(folder, 'report.json');
};
const count = (code, counts, ...testResults) => countTests(ended(code), 60, report(counts, testResults));

describe('a suite with a report', () => {
  it('counts its tests', () => {
    const counts = { numTotalTests: 4, numPassedTests: 1, numFailedTests: 1, numPendingTests: 1, numTodoTests: 1 };
    const result = count(1, counts, file('failed', test('passed', 3), test('failed', 5), test('pending')));
    expect(result).toMatchObject({ passed: 1, failed: 1, skipped: 2, why: null });
    expect(result.tests).toContainEqual({ name: 'a failed test', milliseconds: 5 });
  });

  it('counts a file that could not be loaded as failed', () => {
    const counts = { numTotalTests: 1, numPassedTests: 1 };
    const result = count(1, counts, file('passed', test('passed', 3)), file('failed'));
    expect(result).toMatchObject({ passed: 1, failed: 1, why: 'a file could not be loaded' });
  });

  it('counts an error outside of the tests as failed', () => {
    const result = count(1, { numTotalTests: 1, numPassedTests: 1 }, file('passed', test('passed', 3)));
    expect(result).toMatchObject({ passed: 1, failed: 1, why: 'ended with code 1' });
  });

  it('fails without any test', () => {
    expect(count(0, {})).toMatchObject({ passed: 0, failed: 1, why: 'ran no test' });
  });

  it('fails without the report, or with half of it', () => {
    const folder = temporaryFolder({ 'half.json': '{"numTotal' });
    for (const name of ['none.json', 'half.json']) {
      expect(countTests(ended(0), 60, path.join(folder, name))).toMatchObject({ passed: 0, failed: 1 });
    }
  });

  it('fails over its budget, whatever it has written', () => {
    const reportFile = report({ numTotalTests: 1, numPassedTests: 1 }, [file('passed', test('passed', 3))]);
    const result = countTests({ code: null, timedOut: true }, 60, reportFile);
    expect(result).toMatchObject({ passed: 0, failed: 1, why: 'over its budget of 60 s' });
  });
});

it('counts a command as one test', () => {
  expect(countTests(ended(0), 60, null)).toMatchObject({ passed: 1, failed: 0, skipped: 0 });
  expect(countTests(ended(2), 60, null)).toMatchObject({ passed: 0, failed: 1, why: 'ended with code 2' });
});

it('closes with a plain line, naming skipped tests only if there are any', () => {
  const result = (passed, failed, skipped) => ({ passed, failed, skipped });
  expect(closingLine([result(3, 0, 0), result(4, 1, 0)])).toBe('7 passed, 1 failed');
  expect(closingLine([result(3, 0, 2), result(4, 0, 0)])).toBe('7 passed, 0 failed, 2 skipped');
});

describe('the suites to run', () => {
  const suites = ['engine', 'build', 'browser'].map((name) => ({ name }));
  const chosen = (...names) => chooseSuites(names, suites).map(({ name }) => name);

  it('are all of them without names', () => expect(chosen()).toEqual(['engine', 'build', 'browser']));
  it('are the named ones in their own order', () => expect(chosen('build', 'engine')).toEqual(['engine', 'build']));
  it('have the build before the browser', () => expect(chosen('browser')).toEqual(['build', 'browser']));
  it('are refused when unknown', () => expect(() => chosen('nothing')).toThrow('No suite nothing. There are: engine'));
});
