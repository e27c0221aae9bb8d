/**
 * Access to all records: reads on one connection, writes one after the other on another. Every query is awaited, although this driver answers at
 * once: another, which does not, can take its place.
 */
import Database from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import type { BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';
import type { DataPlaces } from './open-database';
import { openDatabase } from './open-database';

export type Db = BetterSQLite3Database;

export interface Records {
  readonly read: Db;
  /**
   * Runs `work` in a transaction of its own, after those that were asked for before. All of it is stored, or none when it throws. No hashing, mail or
   * waiting for the network belongs in it: meanwhile nobody else can write.
   */
  write<T>(work: (db: Db) => Promise<T>): Promise<T>;
  isReadable(): boolean;
  /** After the writes that were asked for. */
  close(): Promise<void>;
}

export function openRecords(places: DataPlaces): Records {
  const writer = openDatabase(places);
  const reader = new Database(writer.name, { readonly: true, timeout: READ_TIMEOUT_MS });
  const db = drizzle(writer);
  let last: Promise<unknown> = Promise.resolve();

  const inTransaction = async <T>(work: (db: Db) => Promise<T>): Promise<T> => {
    writer.exec('BEGIN IMMEDIATE');
    try {
      const result = await work(db);
      writer.exec('COMMIT');
      return result;
    } catch (error) {
      // SQLite itself has rolled back after some errors, such as a full disk
      if (writer.inTransaction) writer.exec('ROLLBACK');
      throw error;
    }
  };

  return {
    read: drizzle(reader),
    write(work) {
      const mine = last.then(() => inTransaction(work));
      // the next waits for this one, however it ends
      last = mine.catch(() => undefined);
      return mine;
    },
    isReadable() {
      try {
        reader.prepare('SELECT count(*) FROM sqlite_schema').get();
        return true;
      } catch {
        // closed, moved away or damaged: whatever the reason, the answer is no
        return false;
      }
    },
    async close() {
      await last;
      reader.close();
      writer.close();
    },
  };
}

const READ_TIMEOUT_MS = 5_000;
