/** Loose checks in IndexedDB. The only file that knows Dexie and the row schemas at run time; loaded after the first paint. */
import {
  isNewerRow,
  STORED_WORKSHEET_SCHEMA,
  storedRow,
  type StoredCheckRow,
  type StoredRow,
  type StoredWorksheetRow,
  type WorksheetPage,
} from '@chargewright/contract/stored-check';
import { Dexie, type EntityTable } from 'dexie';
import type { CheckCommand, CheckState } from './check-command';
import type { CheckSummary } from './check-draft';
import { applyCommand, isEmpty } from './check-draft-reducer';
import { checkRow, rowChanges, stateFromRows } from './check-rows';
import type { LooseCheckStore, StoredChecks } from './loose-check-store';
import { EMPTY_WORKSHEET, patched, type Worksheet, type WorksheetPatch } from './worksheet';
import type { WorksheetStore } from './worksheet-store';

const NAME = 'chargewright-loose';
const KEEP_DELETED_MS = 30 * 24 * 60 * 60 * 1000;
const ROWS_AT_ONCE = 500;

interface QuarantinedRow {
  readonly n: number;
  readonly row: unknown;
  readonly reason: string;
}

const openDexie = () => {
  // Strict: a commit is on the flash memory, not in the system's cache, so that a dead battery takes nothing.
  const database = new Dexie(NAME, { chromeTransactionDurability: 'strict' }) as Dexie & {
    rows: EntityTable<StoredRow, 'id'>;
    quarantine: EntityTable<QuarantinedRow, 'n'>;
  };
  database.version(1).stores({ rows: 'id, kind, body.checkId', quarantine: '++n' });
  return database;
};

type Database = ReturnType<typeof openDexie>;

/** Parses what was found; damaged rows are moved out of the way. Runs in a transaction on both tables. */
async function parseRows({ rows, quarantine }: Database, found: readonly StoredRow[]): Promise<StoredRow[]> {
  const good: StoredRow[] = [];
  for (const row of found) {
    const parsed = storedRow.safeParse(row);
    if (parsed.success) good.push(parsed.data);
    else if (!isNewerRow(row)) {
      await quarantine.add({ row, reason: parsed.error.message });
      await rows.delete(row.id);
    }
  }
  return good;
}

const inTransaction = <Answer>(database: Database, work: () => Promise<Answer>): Promise<Answer> =>
  database.transaction('rw', database.rows, database.quarantine, work);

async function rowsOf(database: Database, checkId: string): Promise<StoredRow[]> {
  const check = await database.rows.get(checkId);
  const others = await database.rows.where('body.checkId').equals(checkId).toArray();
  return parseRows(database, check ? [check, ...others] : others);
}

const stateOf = async (database: Database, id: string) => stateFromRows(id, await rowsOf(database, id));

async function write(database: Database, checkId: string, commands: readonly CheckCommand[]): Promise<CheckState> {
  return inTransaction(database, async () => {
    const before = await stateOf(database, checkId);
    const after = commands.reduce<CheckState | undefined>(applyCommand, before);
    if (!after) throw new Error('a check is written by at least one command');
    const { puts, deletes } = rowChanges(before, after);
    await database.rows.bulkPut([...puts]);
    await database.rows.bulkDelete([...deletes]);
    return after;
  });
}

const summaryOfRow = ({ id, body }: StoredCheckRow): CheckSummary => ({
  id,
  createdAt: body.createdAt,
  updatedAt: body.updatedAt,
  ...(body.setup.refrigerant !== undefined && { refrigerant: body.setup.refrigerant }),
  ...(body.setup.meteringDevice !== undefined && { meteringDevice: body.setup.meteringDevice }),
  readingCount: body.readingCount,
});

async function isEmptyCheck(database: Database, row: StoredCheckRow): Promise<boolean> {
  const alone = stateFromRows(row.id, [row]);
  if (alone && !isEmpty(alone)) return false;
  return (await database.rows.where('body.checkId').equals(row.id).count()) === 0;
}

/** Writes a row for every check whose own row is lost while readings of it are left. */
async function salvageChecks(database: Database): Promise<StoredCheckRow[]> {
  const { rows } = database;
  const salvaged: StoredCheckRow[] = [];
  const known = new Set<unknown>(await rows.where('kind').equals('check').primaryKeys());
  for (const id of await rows.orderBy('body.checkId').uniqueKeys()) {
    if (typeof id !== 'string' || known.has(id)) continue;
    const state = await stateOf(database, id);
    if (state) salvaged.push(checkRow(state));
  }
  await rows.bulkPut(salvaged);
  return salvaged;
}

async function list(database: Database): Promise<StoredChecks> {
  return inTransaction(database, async () => {
    const found = await database.rows.where('kind').equals('check').toArray();
    const sound = (await parseRows(database, found)).filter((row) => row.kind === 'check');
    const checks = [...sound, ...(await salvageChecks(database))];
    const standing = checks.filter(({ body }) => body.deletedAt === undefined);
    const lastOpened = standing.sort((a, b) => (a.body.openedAt < b.body.openedAt ? 1 : -1))[0]?.id;
    const summaries: CheckSummary[] = [];
    for (const row of standing) if (!(await isEmptyCheck(database, row))) summaries.push(summaryOfRow(row));
    return { summaries, ...(lastOpened !== undefined && { lastOpened }) };
  });
}

async function deleteCheck({ rows }: Database, id: string): Promise<void> {
  await rows.where('body.checkId').equals(id).delete();
  await rows.delete(id);
}

/** Drops what nobody can want back: checks deleted long ago, and empty ones that are not the last opened. */
async function purge(database: Database, now: Date): Promise<void> {
  const { lastOpened } = await list(database);
  await inTransaction(database, async () => {
    for (const row of await database.rows.where('kind').equals('check').toArray()) {
      if (row.kind !== 'check' || isNewerRow(row)) continue;
      const { deletedAt } = row.body;
      const old = deletedAt !== undefined && now.getTime() - Date.parse(deletedAt) > KEEP_DELETED_MS;
      if (old || (row.id !== lastOpened && (await isEmptyCheck(database, row)))) await deleteCheck(database, row.id);
    }
  });
}

/** Looks through every row, a few at a time, so that a damaged one is found before somebody needs it. */
async function inspect(database: Database): Promise<void> {
  const ids = await database.rows.toCollection().primaryKeys();
  for (let start = 0; start < ids.length; start += ROWS_AT_ONCE) {
    const some = ids.slice(start, start + ROWS_AT_ONCE);
    await inTransaction(database, async () => {
      const found = await database.rows.bulkGet(some);
      await parseRows(
        database,
        found.filter((row) => row !== undefined),
      );
    });
  }
}

/** Opens the store; rejects where the browser has none to give. */
export async function openLooseCheckDatabase(onOtherTab: (checkId: string) => void): Promise<LooseCheckStore> {
  const database = openDexie();
  await database.open();
  const channel = new BroadcastChannel(NAME);
  channel.onmessage = ({ data }: MessageEvent<unknown>) => {
    if (typeof data === 'string') onOtherTab(data);
  };
  return {
    list: () => list(database),
    read: (id) => inTransaction(database, () => stateOf(database, id)),
    write: async (checkId, commands) => {
      const after = await write(database, checkId, commands);
      channel.postMessage(checkId);
      return after;
    },
    tidy: async (now) => {
      await inspect(database);
      await purge(database, now);
      return database.quarantine.count();
    },
    close: () => {
      channel.close();
      database.close();
    },
  };
}

async function worksheetRow(
  database: Database,
  checkId: string,
  page: WorksheetPage,
): Promise<StoredWorksheetRow | undefined> {
  const rows = (await rowsOf(database, checkId)).filter((row) => row.kind === 'worksheet');
  return rows.find(({ body }) => body.page === page);
}

const sheetOf = ({ body: { typed, choices, rows } }: StoredWorksheetRow): Worksheet => ({ typed, choices, rows });

/** Opens the sheets that pages keep beside the checks; rejects where the browser has no store to give. */
export async function openWorksheetDatabase(): Promise<WorksheetStore> {
  const database = openDexie();
  await database.open();
  return {
    read: (checkId, page) =>
      inTransaction(database, async () => {
        const row = await worksheetRow(database, checkId, page);
        return row && sheetOf(row);
      }),
    write: (place, patches: readonly WorksheetPatch[]) =>
      inTransaction(database, async () => {
        const { checkId, page, rowId, at } = place;
        const before = await worksheetRow(database, checkId, page);
        const { typed, choices, rows } = patches.reduce(patched, before ? sheetOf(before) : EMPTY_WORKSHEET);
        const body = {
          checkId,
          page,
          updatedAt: at,
          typed: { ...typed },
          choices: { ...choices },
          rows: rows.map((row) => [...row]),
        };
        await database.rows.put({ id: before?.id ?? rowId, kind: 'worksheet', schema: STORED_WORKSHEET_SCHEMA, body });
      }),
    close: () => database.close(),
  };
}
