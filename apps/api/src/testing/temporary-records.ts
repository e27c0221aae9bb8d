import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Records } from '../db/records';
import { openRecords } from '../db/records';

export const MIGRATIONS_DIR = path.resolve(import.meta.dirname, '../../drizzle');

export interface TemporaryRecords extends Records {
  /** Closes the records and removes their file. */
  discard(): Promise<void>;
}

/** Empty records in a folder of their own. */
export function temporaryRecords(): TemporaryRecords {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'records-'));
  const records = openRecords({ dataDir, migrationsDir: MIGRATIONS_DIR });
  return {
    ...records,
    discard: async () => {
      await records.close();
      rmSync(dataDir, { recursive: true });
    },
  };
}
