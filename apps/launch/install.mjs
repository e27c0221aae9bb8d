import { existsSync, readdirSync, readFileSync, realpathSync } from 'node:fs';
import path from 'node:path';
import { hashOfFiles } from './hash.mjs';
import { withLock } from './lock.mjs';
import { findProgram, prepareNativeTools } from './native-tools.mjs';
import { ROOT, workFolder } from './paths.mjs';
import { mustRun, toolEnv } from './run.mjs';
import { LaunchError, step } from './say.mjs';
import { stampIs, writeStamp } from './stamp.mjs';

/** The fields of a package.json that decide what is installed; a change of scripts or doors installs nothing anew. */
const INSTALL_FIELDS = [
  'workspaces',
  'dependencies',
  'devDependencies',
  'optionalDependencies',
  'peerDependencies',
  'overrides',
  'allowScripts',
];

const stampFile = (root) => path.join(root, 'node_modules/.chargewright-installed');

/** The root's package.json and those of the workspaces. */
function manifests(root) {
  const below = (folder) => readdirSync(path.join(root, folder)).map((name) => path.join(folder, name, 'package.json'));
  const workspaces = ['packages', 'apps'].flatMap(below).filter((file) => existsSync(path.join(root, file)));
  return ['package.json', ...workspaces.sort()];
}

/** Hash of everything the installed packages depend on. */
export function installHash(root = ROOT) {
  const wanted = manifests(root).map((file) => {
    const manifest = JSON.parse(readFileSync(path.join(root, file), 'utf8'));
    return JSON.stringify([file, ...INSTALL_FIELDS.map((field) => manifest[field] ?? null)]);
  });
  return hashOfFiles(root, ['package-lock.json'], process.version, process.arch, ...wanted);
}

/**
 * The npm that belongs to this Node, as [command, ...first arguments]: the one that started this script, else the one
 * beside the Node binary, else the first in PATH.
 */
export function npmCommand() {
  const started = process.env.npm_execpath;
  if (started !== undefined && /npm-cli\.c?js$/.test(started)) return [process.execPath, started];
  const beside = findProgram('npm', path.dirname(process.execPath)) ?? findProgram('npm');
  if (beside === null) throw new LaunchError('npm was not found beside Node or in PATH. Install npm and start again.');
  return [process.execPath, realpathSync(beside)];
}

/** Installs the packages when the lock file, a manifest or Node itself has changed since the last time. */
export async function ensureInstalled(root = ROOT) {
  const isDone = () => stampIs(stampFile(root), installHash(root));
  if (isDone()) return;
  await withLock(path.join(workFolder(root), 'prepare.lock'), async () => {
    if (isDone()) return;
    const nativeEnv = await prepareNativeTools();
    const [command, ...first] = npmCommand();
    await step('Installing packages (npm ci; the SQLite driver is compiled)', '2 minutes', () =>
      mustRun('npm-ci', command, [...first, 'ci', '--include=dev', '--no-audit', '--no-fund'], {
        root,
        env: toolEnv(nativeEnv),
      }),
    );
    // Last, because npm ci empties node_modules first: an interrupted installation leaves no stamp.
    writeStamp(stampFile(root), installHash(root));
  });
}
