import 'fake-indexeddb/auto';
import { Dexie } from 'dexie';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { CheckCommand } from './check-command';
import { draftOf } from './check-draft-reducer';
import { openLooseCheckDatabase } from './loose-check-database';
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
