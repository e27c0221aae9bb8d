import { mkdirSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';

export type SqliteDatabase = Database.Database;

export interface DataPlaces {
  readonly dataDir: string;
  /** Folder of the migrations that drizzle-kit wrote. */
  readonly migrationsDir: string;
}

const BUSY_TIMEOUT_MS = 5_000;

/** Data that cannot be used; the message is one line for the person who starts the server. */
export class DataError extends Error {
  override readonly name = 'DataError';
}

/**
 * Opens (or makes) the file of all records and brings it to the present form. Throws `DataError` when the folder cannot be used, the file is no
 * database, a migration fails, or a reference is broken.
 */
export function openDatabase({ dataDir, migrationsDir }: DataPlaces): SqliteDatabase {
  const file = path.join(dataDir, 'chargewright.sqlite');
  try {
    mkdirSync(dataDir, { recursive: true });
    return openFile(file, migrationsDir);
  } catch (error) {
    // whatever it is, the person has to look at this file or name another folder
    throw new DataError(`Cannot use ${file}: ${innermostMessage(error as Error)}. The folder is set by DATA_DIR.`, {
      cause: error,
    });
  }
}

/** The query builder wraps what the driver says into the text of its query. */
const innermostMessage = (error: Error): string =>
  error.cause instanceof Error ? innermostMessage(error.cause) : error.message;

/**
 * The order keeps child rows safe: foreign keys are off while tables are rebuilt, their references are checked, and only then they are on.
 */
function openFile(file: string, migrationsFolder: string): SqliteDatabase {
  const database = new Database(file, { timeout: BUSY_TIMEOUT_MS });
  try {
    database.pragma('foreign_keys = OFF');
    migrate(drizzle(database), { migrationsFolder });
    const broken = database.pragma('foreign_key_check') as readonly unknown[];
    if (broken.length > 0) throw new Error(`${broken.length} rows refer to rows that do not exist`);
    database.pragma('foreign_keys = ON');
    database.pragma('journal_mode = WAL');
    // a record that was acknowledged survives a power cut
    database.pragma('synchronous = FULL');
    database.pragma(`busy_timeout = ${BUSY_TIMEOUT_MS}`);
    return database;
  } catch (error) {
    // not to leave the file locked; the error itself is the caller's
    database.close();
    throw error;
  }
}
