/**
 * The engine's benches compiled as the product is: tsx, which runs this program, gives every inner function its name at each call, which costs
 * more than some of our formulas.
 */
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'esbuild';
import type * as Benches from './engine-benches';

const ENTRY = fileURLToPath(new URL('./engine-benches.ts', import.meta.url));
/** Below node_modules, so that the packages we are compared with are found. */
const OUTPUT = fileURLToPath(
  new URL('../../node_modules/.cache/chargewright-bench/engine-benches.mjs', import.meta.url),
);

export async function compiledEngineBenches(): Promise<typeof Benches.engineBenches> {
  await build({
    entryPoints: [ENTRY],
    outfile: OUTPUT,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    external: ['fast-check'],
    logLevel: 'error',
  });
  const benches = (await import(pathToFileURL(OUTPUT).href)) as typeof Benches;
  return benches.engineBenches;
}
