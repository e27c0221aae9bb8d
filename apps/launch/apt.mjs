import { existsSync } from 'node:fs';
import path from 'node:path';
import { mustRun, run, toolEnv } from './run.mjs';
import { workFolder } from './paths.mjs';
import { LaunchError, step } from './say.mjs';

/** The line a person can paste to get the packages. */
export const aptCommand = (packages) =>
  `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${packages.join(' ')}`;

/**
 * How packages can be installed here: `'root'`, `'sudo'` (without a password), or null when a person has to do it.
 */
export async function aptAccess({ uid = process.getuid(), env = toolEnv(), aptPath = '/usr/bin/apt-get' } = {}) {
  if (!existsSync(aptPath)) return null;
  if (uid === 0) return 'root';
  try {
    const probe = await run('sudo', ['-n', 'true'], { env, logFile: path.join(workFolder(), 'sudo.log') });
    return probe.code === 0 ? 'sudo' : null;
  } catch (error) {
    // ENOENT: there is no sudo; a person has to install the packages.
    if (error.code === 'ENOENT') return null;
    throw error;
  }
}

/** The two apt-get calls that install `packages`, as [command, ...arguments], for a kind of access. */
export function aptCalls(access, packages) {
  const apt = ['env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-o', 'DPkg::Lock::Timeout=300'];
  const prefix = access === 'sudo' ? ['sudo', '-n', ...apt] : apt;
  return [
    [...prefix, 'update'],
    [...prefix, 'install', '-y', '--no-install-recommends', ...packages],
  ];
}

/** Installs Debian packages, or ends with the one line that says what to run. `why` completes "… is needed". */
export async function installDebianPackages(packages, why, access) {
  const how = access === undefined ? await aptAccess() : access;
  if (how === null) {
    throw new LaunchError(`${why} Run: ${aptCommand(packages)}`);
  }
  const [update, install] = aptCalls(how, packages);
  await step(`Installing from Debian: ${packages.join(' ')}`, '10 to 60 s', async () => {
    await mustRun('apt-update', update[0], update.slice(1));
    await mustRun('apt-install', install[0], install.slice(1));
  });
}
