import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

/** All files below the given files and folders that `keep` accepts, as sorted paths relative to `root`. */
export function listFiles(root, entries, keep = () => true) {
  const found = [];
  const visit = (relative) => {
    if (!keep(relative)) return;
    const full = path.join(root, relative);
    const stat = statSync(full, { throwIfNoEntry: false });
    if (stat === undefined) return;
    if (stat.isDirectory()) for (const name of readdirSync(full)) visit(path.join(relative, name));
    else found.push(relative);
  };
  for (const entry of entries) visit(entry);
  return found.sort();
}

/** SHA-256 over the names and contents of files, and over further texts that decide the result. */
export function hashOfFiles(root, files, ...texts) {
  const hash = createHash('sha256');
  // Each part is preceded by its length, so that no two different inputs run together into the same bytes.
  const add = (part) => hash.update(`${part.length}:`).update(part);
  for (const text of texts) add(text);
  for (const file of files) {
    add(file);
    add(readFileSync(path.join(root, file)));
  }
  return hash.digest('hex');
}
