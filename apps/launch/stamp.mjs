import { readFileSync, writeFileSync } from 'node:fs';

/** Whether the stamp file holds exactly this hash. */
export function stampIs(file, hash) {
  try {
    return readFileSync(file, 'utf8').trim() === hash;
  } catch (error) {
    // No stamp: whatever it would vouch for has to be made.
    if (error.code === 'ENOENT') return false;
    throw error;
  }
}

export const writeStamp = (file, hash) => writeFileSync(file, `${hash}\n`);
