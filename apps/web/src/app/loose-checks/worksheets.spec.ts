import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { LooseChecks } from './loose-checks';
import { NEW_ID, NOW } from './time-and-ids';
import { EMPTY_WORKSHEET, isEmptySheet, patched, type Worksheet, type WorksheetPatch } from './worksheet';
import { OPEN_WORKSHEETS, type WorksheetPlace, type WorksheetStore } from './worksheet-store';
import { injectWorksheet, Worksheets, type OpenWorksheet } from './worksheets';

const AT = new Date('2026-06-01T12:00:00.000Z');
const VOLTS = { text: '240', unit: 'V' };

/** A store in memory that survives a new page. */
class FakeStore {
  readonly kept = new Map<string, Worksheet>();
  readonly places: WorksheetPlace[] = [];
  refuses = false;

  readonly open = (): Promise<WorksheetStore> =>
    this.refuses
      ? Promise.reject(new Error('denied'))
      : Promise.resolve({
          read: (checkId, page) => Promise.resolve(this.kept.get(`${checkId} ${page}`)),
          write: (place: WorksheetPlace, patches: readonly WorksheetPatch[]) => {
            if (this.refuses) return Promise.reject(new Error('full'));
            const key = `${place.checkId} ${place.page}`;
            this.places.push(place);
            this.kept.set(key, patches.reduce(patched, this.kept.get(key) ?? EMPTY_WORKSHEET));
            return Promise.resolve();
          },
          close: () => undefined,
        });
}

class FakeChecks {
  readonly state = signal<'loading' | 'ready'>('loading');
  readonly current = signal({ id: 'a' });
  kept = 0;

  keep(): void {
    this.kept += 1;
  }
}

let store: FakeStore;
let checks: FakeChecks;

function openPage(): OpenWorksheet {
  TestBed.resetTestingModule();
  TestBed.configureTestingModule({
    providers: [
      { provide: LooseChecks, useValue: checks },
      { provide: OPEN_WORKSHEETS, useValue: store.open },
      { provide: NOW, useValue: () => AT },
      { provide: NEW_ID, useValue: () => 'row' },
    ],
  });
  const sheet = TestBed.runInInjectionContext(() => injectWorksheet('airflow'));
  TestBed.tick();
  return sheet;
}

const settled = async (): Promise<void> => {
  TestBed.tick();
  await vi.advanceTimersByTimeAsync(300);
};

beforeEach(() => {
  vi.useFakeTimers();
  store = new FakeStore();
  checks = new FakeChecks();
});
afterEach(() => vi.useRealTimers());

describe('a sheet beside the open check', () => {
  it('waits for the check, then is read', async () => {
    store.kept.set('a airflow', { ...EMPTY_WORKSHEET, typed: { lineVoltage: VOLTS } });
    const page = openPage();
    expect(page.sheet()).toBeUndefined();
    // nothing to type into yet
    page.type('lineVoltage', { text: '1', unit: 'V' });
    checks.state.set('ready');
    await settled();
    expect(page.sheet()?.typed).toEqual({ lineVoltage: VOLTS });
    expect(store.places).toEqual([]);
  });

  it('has what is typed at once, and stores it within a second, several keys in one go', async () => {
    checks.state.set('ready');
    const page = openPage();
    await settled();
    for (const text of ['2', '24', '240']) page.type('lineVoltage', { text, unit: 'V' });
    page.choose('method', 'measured');
    page.setRows([['0.3', '1300']]);
    expect(page.sheet()).toEqual({
      typed: { lineVoltage: VOLTS },
      choices: { method: 'measured' },
      rows: [['0.3', '1300']],
    });
    expect(store.kept.size).toBe(0);
    await settled();
    expect(store.kept.get('a airflow')).toEqual(page.sheet());
    expect(store.places).toEqual([{ checkId: 'a', page: 'airflow', rowId: 'row', at: AT.toISOString() }]);
    expect(checks.kept).toBeGreaterThan(0);
  });

  it('goes with the check: another check has its own', async () => {
    checks.state.set('ready');
    const page = openPage();
    await settled();
    page.type('lineVoltage', VOLTS);
    checks.current.set({ id: 'b' });
    await settled();
    expect(page.sheet()).toEqual(EMPTY_WORKSHEET);
    checks.current.set({ id: 'a' });
    expect(page.sheet()?.typed).toEqual({ lineVoltage: VOLTS });
  });

  it('is flushed when the page is left', async () => {
    checks.state.set('ready');
    const page = openPage();
    await settled();
    page.type('lineVoltage', VOLTS);
    window.dispatchEvent(new Event('pagehide'));
    await vi.advanceTimersByTimeAsync(0);
    expect(store.kept.get('a airflow')?.typed).toEqual({ lineVoltage: VOLTS });
  });

  it('goes on in memory where nothing is stored, and is stored later when it can be', async () => {
    store.refuses = true;
    checks.state.set('ready');
    const page = openPage();
    await settled();
    page.type('lineVoltage', VOLTS);
    await settled();
    const worksheets = TestBed.inject(Worksheets);
    expect(worksheets.failing()).toBe(true);
    expect(page.sheet()?.typed).toEqual({ lineVoltage: VOLTS });
    store.refuses = false;
    page.choose('method', 'measured');
    await settled();
    expect(worksheets.failing()).toBe(false);
    expect(store.kept.get('a airflow')).toEqual(page.sheet());
  });

  it('can be emptied and put back', () => {
    checks.state.set('ready');
    const before = patched(EMPTY_WORKSHEET, { do: 'type', field: 'lineVoltage', value: VOLTS });
    expect(isEmptySheet(before)).toBe(false);
    const emptied = patched(before, { do: 'replace', sheet: EMPTY_WORKSHEET });
    expect(isEmptySheet(emptied)).toBe(true);
    expect(patched(emptied, { do: 'replace', sheet: before })).toEqual(before);
  });
});
