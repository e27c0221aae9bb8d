import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import Database from 'better-sqlite3';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { MIGRATIONS_DIR } from '../testing/temporary-records';
import { openDatabase } from './open-database';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'data-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

const open = (dataDir = folder) => openDatabase({ dataDir, migrationsDir: MIGRATIONS_DIR });
const file = () => path.join(folder, 'chargewright.sqlite');

describe('opening the data', () => {
  it('makes the folder and a file that survives a power cut', () => {
    const nested = path.join(folder, 'a', 'b');
    const database = open(nested);
    expect(database.name).toBe(path.join(nested, 'chargewright.sqlite'));
    expect(database.pragma('foreign_keys', { simple: true })).toBe(1);
    expect(database.pragma('journal_mode', { simple: true })).toBe('wal');
    expect(database.pragma('synchronous', { simple: true })).toBe(2);
    expect(database.pragma('busy_timeout', { simple: true })).toBe(5_000);
    database.close();
  });

  it('refuses a file in which a row refers to one that is gone', () => {
    const older = new Database(file());
    older.pragma('foreign_keys = OFF');
    older.exec('CREATE TABLE unit (id TEXT PRIMARY KEY); CREATE TABLE "check" (unit TEXT REFERENCES unit (id));');
    older.exec(`INSERT INTO "check" VALUES ('gone')`);
    older.close();
    expect(() => open()).toThrow('1 rows refer to rows that do not exist');
    // the file is closed again
    expect(() => open()).toThrow('1 rows');
  });

  it('refuses a file that is no database', () => {
    writeFileSync(file(), 'not a database, but long enough to have a header of its own '.repeat(20));
    expect(() => open()).toThrow('file is not a database');
  });

  it('refuses a folder that is none, and says in one line how to name another', () => {
    writeFileSync(path.join(folder, 'file'), '');
    expect(() => open(path.join(folder, 'file'))).toThrow(/^Cannot use .*DATA_DIR\.$/);
  });

  it('refuses a file whose migration is not there', () => {
    expect(() => openDatabase({ dataDir: folder, migrationsDir: folder })).toThrow('meta/_journal.json');
  });
});
