import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { hashOfFiles, listFiles } from './hash.mjs';
import { withLock } from './lock.mjs';
import { ROOT, workFolder } from './paths.mjs';
import { mustRun } from './run.mjs';
import { step } from './say.mjs';
import { stampIs, writeStamp } from './stamp.mjs';

/** What the built app is made from. */
const SOURCES = [
  'apps/web',
  'apps/api',
  'packages',
  'angular.json',
  'tsconfig.json',
  'package-lock.json',
  'apps/launch/build.mjs',
];

const stampFile = (root) => path.join(root, 'dist/.sources');

/** Specs, installed packages and the generators of committed data are not built: changing them builds nothing anew. */
const isBuilt = (file) => !/\.spec\.[a-z]+$|(^|\/)(node_modules|generators)$/.test(file);

/** Hash of everything the build depends on. */
export const sourceHash = (root = ROOT) => hashOfFiles(root, listFiles(root, SOURCES, isBuilt), process.version);

async function buildWeb(root, folder) {
  const ng = path.join(root, 'node_modules/@angular/cli/bin/ng.js');
  const output = path.relative(root, path.join(folder, 'ng'));
  await mustRun('build-web', process.execPath, [ng, 'build', '--output-path', output], { root });
  // Given on the command line, the output path loses angular.json's `browser: ""`, and the app lies one folder deeper.
  renameSync(path.join(folder, 'ng/browser'), path.join(folder, 'web'));
  rmSync(path.join(folder, 'ng'), { recursive: true });
}

async function buildApi(root, folder) {
  const esbuild = path.join(root, 'node_modules/.bin/esbuild');
  const options = [
    '--bundle',
    '--platform=node',
    '--format=esm',
    '--target=node20',
    '--packages=external',
    '--sourcemap',
  ];
  const outfile = path.join(folder, 'api/main.js');
  await mustRun('build-api', esbuild, ['apps/api/src/main.ts', ...options, `--outfile=${outfile}`], { root });
}

/** Puts a finished build in the place of the old one; at no moment is there a half-made one. */
function replaceDist(root, folder) {
  const dist = path.join(root, 'dist');
  const old = `${folder}-old`;
  if (existsSync(dist)) renameSync(dist, old);
  renameSync(folder, dist);
  rmSync(old, { recursive: true, force: true });
}

/** An empty folder for the new build; what an interrupted build left behind is removed. */
function emptyBuildFolder(root) {
  const folder = path.join(workFolder(root), 'build');
  for (const left of [folder, `${folder}-old`]) rmSync(left, { recursive: true, force: true });
  mkdirSync(folder);
  return folder;
}

/** Builds app and API into `dist` when a source has changed since the last time. */
export async function ensureBuilt(root = ROOT) {
  const isDone = () => stampIs(stampFile(root), sourceHash(root));
  if (isDone()) return;
  await withLock(path.join(workFolder(root), 'prepare.lock'), async () => {
    if (isDone()) return;
    // Taken before building: a source changed meanwhile is then built the next time.
    const hash = sourceHash(root);
    const folder = emptyBuildFolder(root);
    await step('Building the app and the API', '10 to 30 s', async () => {
      await buildWeb(root, folder);
      await buildApi(root, folder);
    });
    writeStamp(path.join(folder, '.sources'), hash);
    replaceDist(root, folder);
  });
}
