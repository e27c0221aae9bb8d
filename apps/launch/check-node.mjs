/** The Node releases this project is built and tested with: 20.19 up to, not including, 21. */
export const SUPPORTED_NODE = '>=20.19 <21';

/**
 * Says in one line what is wrong with a Node version, or gives null when it is supported.
 *
 * Kept in old syntax and without imports: it must run, and explain itself, on any Node that knows modules.
 */
export function nodeProblem(version) {
  const parts = /^v?(\d+)\.(\d+)\./.exec(version);
  const major = parts === null ? 0 : Number(parts[1]);
  const minor = parts === null ? 0 : Number(parts[2]);
  if (major === 20 && minor >= 19) return null;
  return 'Chargewright needs Node ' + SUPPORTED_NODE + ', this is ' + version + '. Install Node 20 and start again.';
}
