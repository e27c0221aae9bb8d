import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's root. */
export const ROOT = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/**
 * Folder for locks, logs and half-made builds. It lies in the repository so that a finished build can be renamed
 * into place (renaming works within one file system only), and ignores itself for git.
 */
export function workFolder(root = ROOT) {
  const folder = path.join(root, '.launch');
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, '.gitignore'), '*\n');
  return folder;
}
