import 'fake-indexeddb/auto';
import { Dexie } from 'dexie';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { CheckCommand } from './check-command';
import { draftOf } from './check-draft-reducer';
import { openLooseCheckDatabase, openWorksheetDatabase } from './loose-check-database';
import type { LooseCheckStore } from './loose-check-store';

const id = (n: number) => `01900000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;
const at = '2026-06-01T12:00:00.000Z';
const TODAY = new Date('2026-06-02T12:00:00.000Z');
const typing = (checkId: string, text: string, n = 50): CheckCommand => ({
  checkId,
  at,
  do: 'type',
  field: 'reading:outdoorDryBulb',
  value: { text, unit: 'degF' },
  editId: id(n),
});
const committing = (checkId: string, readingId: string): CheckCommand => ({
  checkId,
  at,
  do: 'commit',
  field: 'reading:outdoorDryBulb',
  readingId,
});

let store: LooseCheckStore;
/** The tables as another program would see them. */
let raw: Dexie;

beforeEach(async () => {
  store = await openLooseCheckDatabase(() => undefined);
  raw = await new Dexie('chargewright-loose').open();
});

afterEach(async () => {
  store.close();
  raw.close();
  await Dexie.delete('chargewright-loose');
});

describe('the store of loose checks', () => {
  it('lists and reads what was written', async () => {
    await store.write(id(1), [typing(id(1), '95'), committing(id(1), id(60))]);
    const { summaries, lastOpened } = await store.list();
    expect(summaries).toEqual([{ id: id(1), createdAt: at, updatedAt: at, readingCount: 1 }]);
    expect(lastOpened).toBe(id(1));
    const state = await store.read(id(1));
    expect(state && draftOf(state).readings.outdoorDryBulb?.text).toBe('95');
  });

  it('applies commands to what another tab has written meanwhile', async () => {
    const other = await openLooseCheckDatabase(() => undefined);
    await store.write(id(1), [typing(id(1), '95'), committing(id(1), id(60))]);
    await other.write(id(1), [{ checkId: id(1), at, do: 'choose', setup: { refrigerant: 'R-32' } }]);
    const state = await store.write(id(1), [typing(id(1), '94', 51), committing(id(1), id(61))]);
    other.close();
    expect(draftOf(state).setup).toEqual({ refrigerant: 'R-32' });
    expect(state.readings.map(({ supersedes }) => supersedes)).toEqual([undefined, id(60)]);
  });

  it('tells the other tabs', async () => {
    const told = new Promise<string>((resolve) => {
      void openLooseCheckDatabase(resolve).then(async (other) => {
        await store.write(id(1), [typing(id(1), '95')]);
        await told;
        other.close();
      });
    });
    expect(await told).toBe(id(1));
  });

  it('puts damaged rows aside, counts them and goes on', async () => {
    await store.write(id(1), [typing(id(1), '95'), committing(id(1), id(60))]);
    await raw
      .table('rows')
      .bulkPut([
        { id: id(70), kind: 'reading', schema: 1, body: { checkId: id(1), quantity: 'shoeSize', text: '44' } },
        { id: 7, kind: 'check', schema: 1 },
        { id: id(71), kind: 'edit', schema: 1, body: 'torn' },
        { id: 'no-kind' },
      ]);
    expect((await store.list()).summaries).toHaveLength(1);
    expect((await store.read(id(1)))?.readings).toHaveLength(1);
    expect(await store.tidy(TODAY)).toBe(4);
    expect(await raw.table('quarantine').count()).toBe(4);
    expect(await store.tidy(TODAY)).toBe(4);
    const kept = (await raw.table('quarantine').toArray()) as { row: { id: unknown } }[];
    expect(kept.map(({ row }) => row.id)).toContain(id(71));
  });

  it('keeps the readings of a check whose own row is damaged', async () => {
    await store.write(id(1), [typing(id(1), '95'), committing(id(1), id(60))]);
    await raw.table('rows').put({ id: id(1), kind: 'check', schema: 1, body: { setup: { refrigerant: 5 } } });
    expect(await store.tidy(TODAY)).toBe(1);
    expect((await store.read(id(1)))?.readings.map(({ text }) => text)).toEqual(['95']);
    expect((await store.list()).summaries.map(({ id: listed, readingCount }) => [listed, readingCount])).toEqual([
      [id(1), 1],
    ]);
  });

  it('leaves the rows of a newer version alone', async () => {
    await raw.table('rows').put({ id: id(80), kind: 'check', schema: 2, body: {} });
    expect(await store.tidy(TODAY)).toBe(0);
    expect(await raw.table('rows').get(id(80))).toBeDefined();
    expect(await store.list()).toEqual({ summaries: [] });
  });

  it('drops checks deleted more than 30 days ago, and empty ones but the last opened', async () => {
    const remove = (checkId: string, time: string): CheckCommand => ({ checkId, at: time, do: 'remove' });
    await store.write(id(1), [typing(id(1), '1', 51), remove(id(1), '2026-05-01T12:00:00.000Z')]);
    await store.write(id(2), [typing(id(2), '2', 52), remove(id(2), '2026-05-20T12:00:00.000Z')]);
    await store.write(id(3), [{ checkId: id(3), at, do: 'open' }]);
    await store.write(id(4), [{ checkId: id(4), at: '2026-06-01T13:00:00.000Z', do: 'open' }]);
    await store.tidy(TODAY);
    expect(await raw.table('rows').where('kind').equals('check').primaryKeys()).toEqual([id(2), id(4)]);
    expect(await raw.table('rows').get(id(51))).toBeUndefined();
    expect(await raw.table('rows').get(id(52))).toBeDefined();
    expect(await store.list()).toEqual({ summaries: [], lastOpened: id(4) });
  });
});

describe('the sheets beside the checks', () => {
  const place = (checkId: string, page: 'airflow' | 'weigh-in', n: number) => ({ checkId, page, rowId: id(n), at });
  const volts = (text: string) => ({ do: 'type', field: 'lineVoltage', value: { text, unit: 'V' } }) as const;

  it('are kept by check and page, and changed in place', async () => {
    const sheets = await openWorksheetDatabase();
    await sheets.write(place(id(1), 'airflow', 90), [volts('24'), volts('240')]);
    await sheets.write(place(id(1), 'airflow', 91), [{ do: 'choose', name: 'method', value: 'measured' }]);
    await sheets.write(place(id(1), 'weigh-in', 92), [{ do: 'set-rows', rows: [['0.3', '–']] }]);
    expect(await sheets.read(id(1), 'airflow')).toEqual({
      typed: { lineVoltage: { text: '240', unit: 'V' } },
      choices: { method: 'measured' },
      rows: [],
    });
    expect((await sheets.read(id(1), 'weigh-in'))?.rows).toEqual([['0.3', '–']]);
    expect(await sheets.read(id(2), 'airflow')).toBeUndefined();
    expect(await raw.table('rows').count()).toBe(2);
    sheets.close();
  });

  it('add what two tabs typed', async () => {
    const [one, other] = [await openWorksheetDatabase(), await openWorksheetDatabase()];
    await one.write(place(id(1), 'airflow', 90), [volts('240')]);
    await other.write(place(id(1), 'airflow', 91), [
      { do: 'type', field: 'heaterCurrent', value: { text: '41', unit: 'A' } },
    ]);
    expect(Object.keys((await one.read(id(1), 'airflow'))?.typed ?? {}).sort()).toEqual([
      'heaterCurrent',
      'lineVoltage',
    ]);
    one.close();
    other.close();
  });

  it('that are damaged are put aside, those of a newer version left alone', async () => {
    const sheets = await openWorksheetDatabase();
    const body = { checkId: id(1), page: 'airflow', updatedAt: at, typed: { lineVoltage: 240 }, choices: {}, rows: [] };
    await raw.table('rows').bulkPut([
      { id: id(90), kind: 'worksheet', schema: 2, body },
      { id: id(91), kind: 'worksheet', schema: 3, body: { ...body, page: 'weigh-in' } },
    ]);
    expect(await sheets.read(id(1), 'airflow')).toBeUndefined();
    expect(await raw.table('quarantine').count()).toBe(1);
    expect(await raw.table('rows').get(id(91))).toBeDefined();
    await sheets.write(place(id(1), 'airflow', 92), [volts('240')]);
    expect(await store.tidy(TODAY)).toBe(1);
    expect((await sheets.read(id(1), 'airflow'))?.typed).toEqual({ lineVoltage: { text: '240', unit: 'V' } });
    sheets.close();
  });

  it('keep an empty check, leave it as it is, and go with it', async () => {
    const sheets = await openWorksheetDatabase();
    await store.write(id(3), [{ checkId: id(3), at, do: 'open' }]);
    await sheets.write(place(id(3), 'airflow', 90), [volts('240')]);
    await store.write(id(4), [{ checkId: id(4), at: '2026-06-01T13:00:00.000Z', do: 'open' }]);
    await store.tidy(TODAY);
    expect(await sheets.read(id(3), 'airflow')).toBeDefined();
    expect((await store.read(id(3)))?.readings).toEqual([]);
    await store.write(id(3), [{ checkId: id(3), at: '2026-04-01T12:00:00.000Z', do: 'remove' }]);
    await store.tidy(TODAY);
    expect(await sheets.read(id(3), 'airflow')).toBeUndefined();
    sheets.close();
  });
});
