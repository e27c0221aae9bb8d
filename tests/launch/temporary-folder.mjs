import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { onTestFinished } from 'vitest';

/** A folder with the given files (name → text), removed after the test. */
export function temporaryFolder(files = {}) {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'chargewright-launch-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  for (const [name, text] of Object.entries(files)) {
    const file = path.join(folder, name);
    mkdirSync(path.dirname(file), { recursive: true });
    writeFileSync(file, text, { mode: 0o755 });
  }
  return folder;
}
