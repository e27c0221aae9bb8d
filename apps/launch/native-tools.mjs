import { accessSync, constants, readFileSync } from 'node:fs';
import path from 'node:path';
import { installDebianPackages } from './apt.mjs';
import { LaunchError, say } from './say.mjs';

/** What compiling the SQLite driver needs: the program, and the Debian package that has it. */
const NEEDED = [
  { program: 'python3', debianPackage: 'python3' },
  { program: 'make', debianPackage: 'make' },
  { program: 'g++', debianPackage: 'g++' },
];

/** The full path of a program in a PATH, or null. */
export function findProgram(program, searchPath = process.env.PATH ?? '/usr/bin:/bin') {
  for (const folder of searchPath.split(path.delimiter)) {
    const file = path.join(folder, program);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {
      // Not in this folder, or not executable: look in the next one.
    }
  }
  return null;
}

/** The needed programs that a PATH lacks. */
export const missingTools = (searchPath) => NEEDED.filter(({ program }) => findProgram(program, searchPath) === null);

/**
 * The prefix whose include/node holds the headers of exactly this Node, or null. Headers of another version would
 * compile and then fail when loaded, so they count as absent.
 */
export function headersPrefix(execPath = process.execPath, version = process.version) {
  const prefix = path.dirname(path.dirname(execPath));
  try {
    const header = readFileSync(path.join(prefix, 'include/node/node_version.h'), 'utf8');
    accessSync(path.join(prefix, 'include/node/node.h'));
    const part = (name) => new RegExp(`#define NODE_${name}_VERSION (\\d+)`).exec(header)?.[1];
    return `v${part('MAJOR')}.${part('MINOR')}.${part('PATCH')}` === version ? prefix : null;
  } catch (error) {
    if (error.code === 'ENOENT') return null;
    throw error;
  }
}

/**
 * Makes sure the SQLite driver can be compiled, installing what is missing where that is allowed.
 * Returns the settings npm needs for it, as environment variables.
 */
export async function prepareNativeTools() {
  const missing = missingTools();
  if (missing.length > 0) {
    const names = missing.map(({ program }) => program).join(', ');
    await installDebianPackages(
      missing.map(({ debianPackage }) => debianPackage),
      `Missing for compiling the SQLite driver: ${names}.`,
    );
    const still = missingTools();
    if (still.length > 0)
      throw new LaunchError(`Still missing after installing: ${still.map((t) => t.program).join(', ')}.`);
  }
  const prefix = headersPrefix();
  if (prefix !== null) return { npm_config_nodedir: prefix };
  say(`No headers of Node ${process.version} beside ${process.execPath}: npm will look for them by its own default.`);
  return {};
}
