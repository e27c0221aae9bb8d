import path from 'node:path';
import { npmCommand } from './install.mjs';
import { ROOT } from './paths.mjs';
import { LaunchError } from './say.mjs';

const node = (file, ...args) => [process.execPath, path.join(ROOT, file), ...args];

/** A command that passes or fails as a whole and counts as one test. */
const whole = (name, budgetSeconds, command) => ({ name, budgetSeconds, command, report: null });

/** A Vitest project; its tests are counted from the report it writes. */
const vitest = (name, budgetSeconds) => {
  const report = `test-results/${name}.json`;
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const command = node('node_modules/vitest/vitest.mjs', 'run', '--project', name, ...reporters);
  return { name, budgetSeconds, command, report };
};

/** All suites, the longest first, each with the time it may take: over it, it fails, so that slowness is noticed. */
export const allSuites = () => [
  vitest('property', 300),
  whole('lint', 300, node('node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0')),
  whole('typecheck', 240, [...npmCommand(), 'run', 'typecheck']),
  vitest('engine', 180),
  vitest('api', 180),
  {
    name: 'web',
    budgetSeconds: 180,
    command: node('node_modules/@angular/cli/bin/ng.js', 'test'),
    report: 'test-results/web.json',
  },
  vitest('reference', 120),
  whole('format', 120, node('node_modules/prettier/bin/prettier.cjs', '--check', '.')),
  vitest('wording', 60),
  vitest('launch', 60),
  vitest('contract', 60),
  { ...whole('build', 120, node('apps/launch/build-app.mjs')), alone: true },
  { ...vitest('browser', 780), needsChromium: true, alone: true },
];

/** The suites with these names, in their order; all without names. The browser's tests run on the built app. */
export function chooseSuites(names, suites) {
  const unknown = names.filter((name) => !suites.some((suite) => suite.name === name));
  if (unknown.length > 0) {
    throw new LaunchError(`No suite ${unknown.join(', ')}. There are: ${suites.map(({ name }) => name).join(' ')}`);
  }
  if (names.length === 0) return suites;
  const wanted = new Set(names);
  if (wanted.has('browser')) wanted.add('build');
  return suites.filter(({ name }) => wanted.has(name));
}
