import { renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';
import { sourceHash } from '../../apps/launch/build.mjs';
import { installHash } from '../../apps/launch/install.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

const repository = () =>
  temporaryFolder({
    'package.json': JSON.stringify({ scripts: { a: 'b' }, devDependencies: { x: '1.0.0' } }),
    'package-lock.json': '{}',
    'angular.json': '{}',
    'packages/engine/package.json': JSON.stringify({ name: 'engine' }),
    'packages/engine/src/units/pressure.ts': 'export {}',
    'packages/engine/src/units/pressure.spec.ts': 'export {}',
    'apps/api/package.json': JSON.stringify({ dependencies: { y: '1.0.0' } }),
    'apps/web/src/main.ts': 'export {}',
  });

const changes = (hash, change) => {
  const root = repository();
  const before = hash(root);
  expect(hash(root)).toBe(before);
  change(root);
  return hash(root) !== before;
};
const write = (file, text) => (root) => writeFileSync(path.join(root, file), text);

it.each([
  ['the lock file', write('package-lock.json', '{ }')],
  ['a dependency of the root', write('package.json', JSON.stringify({ devDependencies: { x: '1.0.1' } }))],
  ['a dependency of a workspace', write('apps/api/package.json', JSON.stringify({ dependencies: { y: '2.0.0' } }))],
])('installs anew after a change of %s', (_, change) => {
  expect(changes(installHash, change)).toBe(true);
});

it.each([
  ['a script', write('package.json', JSON.stringify({ scripts: { a: 'c' }, devDependencies: { x: '1.0.0' } }))],
  ['a source', write('apps/web/src/main.ts', 'export const a = 1')],
])('installs nothing after a change of %s', (_, change) => {
  expect(changes(installHash, change)).toBe(false);
});

it.each([
  ['a change of a source', write('packages/engine/src/units/pressure.ts', 'export const a = 1')],
  ['a new source', write('apps/web/src/other.ts', '')],
  ['a change of the settings', write('angular.json', '{ }')],
  [
    'a new name of a source',
    (root) => renameSync(path.join(root, 'apps/web/src/main.ts'), path.join(root, 'apps/web/src/start.ts')),
  ],
])('builds anew after %s', (_, change) => {
  expect(changes(sourceHash, change)).toBe(true);
});

it('builds nothing after a change of a spec', () => {
  expect(changes(sourceHash, write('packages/engine/src/units/pressure.spec.ts', 'export const a = 1'))).toBe(false);
});
