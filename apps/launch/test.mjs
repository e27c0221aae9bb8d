import { nodeProblem } from './check-node.mjs';

// Checked before anything else is loaded: the other modules may use what an old Node cannot even parse.
const problem = nodeProblem(process.version);
if (problem === null) {
  const { test } = await import('./test-app.mjs');
  await test(process.argv.slice(2));
} else {
  console.log(problem + '\n0 passed, 1 failed');
  process.exitCode = 1;
}
