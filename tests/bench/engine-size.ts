/** What the engine adds to a page: the phone's door, bundled, minified and compressed as the server sends it. */
import { fileURLToPath } from 'node:url';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { build } from 'esbuild';
import type { BenchRow } from './engine-benches';

const ENTRY = fileURLToPath(new URL('../../packages/engine/src/index.ts', import.meta.url));

export async function engineSize(): Promise<BenchRow> {
  const { outputFiles } = await build({
    entryPoints: [ENTRY],
    bundle: true,
    minify: true,
    format: 'esm',
    target: 'es2022',
    write: false,
    logLevel: 'silent',
  });
  const code = outputFiles[0]!.contents;
  const kilobytes = (bytes: number): string => `${(bytes / 1000).toFixed(1)} kB`;
  return {
    what: 'engine with every curve and table, minified, gzip',
    measured: kilobytes(gzipSync(code, { level: 9 }).length),
    comparedWith: `brotli ${kilobytes(brotliCompressSync(code).length)}, unpacked ${kilobytes(code.length)}`,
    goal: '',
    met: null,
  };
}
