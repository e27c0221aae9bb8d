import path from 'node:path';
import { expect, it } from 'vitest';
import { aptAccess, aptCalls, installDebianPackages } from '../../apps/launch/apt.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

/** An environment whose PATH holds only this `sudo` (or none), and a file in the place of apt-get. */
function machine(sudo) {
  const folder = temporaryFolder({ 'apt-get': '', ...(sudo === null ? {} : { sudo }) });
  return { env: { PATH: folder }, aptPath: path.join(folder, 'apt-get') };
}

it('uses apt-get as root', async () => {
  await expect(aptAccess({ uid: 0, ...machine(null) })).resolves.toBe('root');
});

it('uses sudo when it asks for no password', async () => {
  await expect(aptAccess({ uid: 1000, ...machine('#!/bin/sh\nexit 0\n') })).resolves.toBe('sudo');
});

it.each([
  ['sudo asks for a password', '#!/bin/sh\nexit 1\n'],
  ['there is no sudo', null],
])('leaves it to a person when %s', async (_, sudo) => {
  await expect(aptAccess({ uid: 1000, ...machine(sudo) })).resolves.toBeNull();
});

it('leaves it to a person where there is no apt-get', async () => {
  await expect(aptAccess({ uid: 0, aptPath: path.join(temporaryFolder(), 'apt-get') })).resolves.toBeNull();
});

it('asks nothing, and gets sudo to set the environment', () => {
  const [update, install] = aptCalls('sudo', ['make', 'g++']);
  expect(update.slice(0, 5)).toEqual(['sudo', '-n', 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get']);
  expect(update.at(-1)).toBe('update');
  expect(install.slice(-5)).toEqual(['install', '-y', '--no-install-recommends', 'make', 'g++']);
  expect(aptCalls('root', ['make'])[0]).not.toContain('sudo');
});

it('says in one line what to run when it may not install', async () => {
  const failure = installDebianPackages(['chromium'], 'The browser tests need chromium.', null);
  await expect(failure).rejects.toThrow(
    /^The browser tests need chromium\. Run: sudo apt-get update && sudo apt-get install [^\n]* chromium$/,
  );
});
