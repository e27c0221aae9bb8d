import { expect, it } from 'vitest';
import { nodeProblem } from '../../apps/launch/check-node.mjs';

it.each(['v20.19.0', 'v20.19.5', 'v20.20.2', 'v20.99.0'])('accepts Node %s', (version) => {
  expect(nodeProblem(version)).toBeNull();
});

it.each(['v20.18.3', 'v18.20.4', 'v21.0.0', 'v22.12.0', 'v2.20.0', 'unknown'])('refuses Node %s', (version) => {
  const problem = nodeProblem(version);
  expect(problem).toContain('>=20.19 <21');
  expect(problem).toContain(version);
  expect(problem).not.toContain('\n');
});
