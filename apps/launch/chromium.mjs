import { existsSync } from 'node:fs';
import { installDebianPackages } from './apt.mjs';
import { LaunchError } from './say.mjs';

const DEBIAN_CHROMIUM = '/usr/bin/chromium';

/** The browser for the browser tests: CHROMIUM_PATH, or Debian's chromium, installed when it is missing. */
export async function prepareChromium(chosen = process.env.CHROMIUM_PATH) {
  if (chosen) {
    if (existsSync(chosen)) return chosen;
    throw new LaunchError(`CHROMIUM_PATH names ${chosen}, which does not exist.`);
  }
  if (!existsSync(DEBIAN_CHROMIUM)) {
    await installDebianPackages(['chromium'], 'The browser tests need chromium.');
  }
  return DEBIAN_CHROMIUM;
}
