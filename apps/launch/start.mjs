import { nodeProblem } from './check-node.mjs';

// Checked before anything else is loaded: the other modules may use what an old Node cannot even parse.
const problem = nodeProblem(process.version);
if (problem === null) {
  const { start } = await import('./start-app.mjs');
  await start();
} else {
  console.log(problem);
  process.exitCode = 1;
}
