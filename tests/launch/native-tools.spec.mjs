import path from 'node:path';
import { expect, it } from 'vitest';
import { findProgram, headersPrefix, missingTools } from '../../apps/launch/native-tools.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

const versionHeader = (major, minor, patch) =>
  `#define NODE_MAJOR_VERSION ${major}\n#define NODE_MINOR_VERSION ${minor}\n#define NODE_PATCH_VERSION ${patch}\n`;

it('names the programs that a PATH lacks', () => {
  const folder = temporaryFolder({ 'bin/make': '', 'other/python3': '' });
  const searchPath = [path.join(folder, 'bin'), path.join(folder, 'other')].join(path.delimiter);
  expect(missingTools(searchPath).map(({ program }) => program)).toEqual(['g++']);
});

it('takes the first program in a PATH', () => {
  const folder = temporaryFolder({ 'first/make': '', 'second/make': '' });
  const searchPath = [path.join(folder, 'first'), path.join(folder, 'second')].join(path.delimiter);
  expect(findProgram('make', searchPath)).toBe(path.join(folder, 'first/make'));
});

it('finds the headers beside the Node binary', () => {
  const prefix = temporaryFolder({
    'include/node/node.h': '',
    'include/node/node_version.h': versionHeader(20, 19, 4),
  });
  expect(headersPrefix(path.join(prefix, 'bin/node'), 'v20.19.4')).toBe(prefix);
});

it('counts headers of another Node as absent', () => {
  const prefix = temporaryFolder({
    'include/node/node.h': '',
    'include/node/node_version.h': versionHeader(20, 19, 4),
  });
  expect(headersPrefix(path.join(prefix, 'bin/node'), 'v20.19.5')).toBeNull();
});

it('finds no headers where there are none', () => {
  expect(headersPrefix(path.join(temporaryFolder(), 'bin/node'), 'v20.19.5')).toBeNull();
});
