import { TestBed } from '@angular/core/testing';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { CheckCommand, CheckState } from './check-command';
import { applyCommand, isEmpty, summaryOf } from './check-draft-reducer';
import { type LooseCheckStore, OPEN_STORE } from './loose-check-store';
import { LooseChecks } from './loose-checks';
import { NEW_ID, NOW } from './time-and-ids';

/** A store in memory that survives a new page, can be closed to all, and can speak as another tab. */
class FakePhone {
  readonly kept = new Map<string, CheckState>();
  refuses = false;
  opened = 0;
  #onOtherTab: (id: string) => void = () => undefined;

  readonly open = (onOtherTab: (id: string) => void): Promise<LooseCheckStore> => {
    this.opened += 1;
    this.#onOtherTab = onOtherTab;
    if (this.refuses) return Promise.reject(new Error('denied'));
    return Promise.resolve({
      list: () => {
        const standing = [...this.kept.values()].filter(({ deletedAt }) => deletedAt === undefined);
        const last = [...standing].sort((a, b) => (a.openedAt < b.openedAt ? 1 : -1))[0];
        const summaries = standing.filter((state) => !isEmpty(state)).map(summaryOf);
        return Promise.resolve({ summaries, ...(last && { lastOpened: last.id }) });
      },
      read: (id) => Promise.resolve(this.kept.get(id)),
      write: (id, commands) => {
        if (this.refuses) return Promise.reject(new Error('full'));
        return Promise.resolve(this.write(id, commands));
      },
      tidy: () => Promise.resolve(2),
      close: () => undefined,
    });
  };

  write(id: string, commands: readonly CheckCommand[]): CheckState {
    const state = commands.reduce<CheckState | undefined>(applyCommand, this.kept.get(id)) as CheckState;
    this.kept.set(id, state);
    return state;
  }

  byOtherTab(id: string, commands: readonly CheckCommand[]): void {
    this.write(id, commands);
    this.#onOtherTab(id);
  }
}

let phone: FakePhone;
let tick = 0;
const nextTime = () => new Date(Date.UTC(2026, 5, 1, 12, 0, tick++));

const ONE_FRAME_MS = 20;
const settled = () => vi.advanceTimersByTimeAsync(0);

/** A page that was just opened on the phone. */
async function openPage(): Promise<LooseChecks> {
  TestBed.resetTestingModule();
  TestBed.configureTestingModule({
    providers: [
      { provide: OPEN_STORE, useValue: (onOtherTab: (id: string) => void) => phone.open(onOtherTab) },
      { provide: NOW, useValue: nextTime },
      { provide: NEW_ID, useValue: () => `01900000-0000-7000-8000-${(tick++).toString(16).padStart(12, '0')}` },
    ],
  });
  const checks = TestBed.inject(LooseChecks);
  TestBed.tick();
  await vi.advanceTimersByTimeAsync(ONE_FRAME_MS);
  return checks;
}

const outdoor = 'reading:outdoorDryBulb';
const degF = (text: string) => ({ text, unit: 'degF' });

beforeEach(() => {
  vi.useFakeTimers();
  phone = new FakePhone();
});

afterEach(() => {
  TestBed.resetTestingModule();
  vi.useRealTimers();
});

describe('LooseChecks', () => {
  it('begins with an empty check and an empty list', async () => {
    const checks = await openPage();
    expect(checks.current()).toMatchObject({ setup: {}, readings: {}, edits: {} });
    expect(checks.list()).toEqual([]);
    expect(checks.state()).toBe('ready');
    expect(checks.setAside()).toBe(2);
  });

  it('shows a keystroke at once and stores it within a second, also while keys keep coming', async () => {
    const checks = await openPage();
    checks.type(outdoor, degF('9'));
    expect(checks.current().edits[outdoor]).toMatchObject(degF('9'));
    for (let ms = 0; ms < 900; ms += 100) {
      await vi.advanceTimersByTimeAsync(100);
      checks.type(outdoor, degF(`9${ms}`));
    }
    await vi.advanceTimersByTimeAsync(0);
    expect(phone.kept.get(checks.current().id)?.edits[outdoor]?.text).toMatch(/^9[5-8]00$/);
  });

  it('opens the check of the last visit, with what was typed and not committed', async () => {
    const before = await openPage();
    before.type(outdoor, degF('95'));
    before.commit(outdoor);
    before.type('typed:elevation', { text: '65', unit: 'ft' });
    await before.stored();
    const checks = await openPage();
    expect(checks.current()).toEqual(before.current());
    expect(checks.list()).toEqual(before.list());
  });

  it('does not open the last customer’s check after a new one was started', async () => {
    const before = await openPage();
    before.type(outdoor, degF('95'));
    before.startNew();
    await before.stored();
    const checks = await openPage();
    expect(checks.current()).toMatchObject({ id: before.current().id, readings: {}, edits: {} });
    expect(checks.list()).toHaveLength(1);
  });

  it('keeps what is typed before the store is open, beside the check of the last visit', async () => {
    const before = await openPage();
    before.choose({ refrigerant: 'R-22' });
    await before.stored();
    TestBed.resetTestingModule();
    TestBed.configureTestingModule({ providers: [{ provide: OPEN_STORE, useValue: phone.open }] });
    const checks = TestBed.inject(LooseChecks);
    checks.type(outdoor, degF('95'));
    expect(checks.state()).toBe('loading');
    TestBed.tick();
    await vi.advanceTimersByTimeAsync(1000);
    expect(checks.current().edits[outdoor]).toMatchObject(degF('95'));
    expect(phone.kept.size).toBe(2);
    expect(checks.list()).toHaveLength(2);
  });

  it('goes on in memory where the phone stores nothing, says so, and stores all once it can', async () => {
    phone.refuses = true;
    const checks = await openPage();
    expect(checks.state()).toBe('memory-only');
    checks.type(outdoor, degF('95'));
    checks.commit(outdoor);
    await settled();
    expect(checks.current().readings.outdoorDryBulb?.text).toBe('95');
    expect(phone.kept.size).toBe(0);
    phone.refuses = false;
    checks.choose({ refrigerant: 'R-32' });
    await settled();
    expect(checks.state()).toBe('ready');
    expect(phone.kept.get(checks.current().id)).toMatchObject({
      setup: { refrigerant: 'R-32' },
      readings: [{ text: '95' }],
    });
  });

  it('goes on in memory where the store hangs', async () => {
    const hanging = vi.spyOn(phone, 'open').mockReturnValue(new Promise(() => undefined));
    const checks = await openPage();
    expect(checks.state()).toBe('loading');
    await vi.advanceTimersByTimeAsync(5000);
    expect(checks.state()).toBe('memory-only');
    hanging.mockRestore();
  });

  it('takes over what another tab has done to the open check and loses nothing of its own', async () => {
    const checks = await openPage();
    const { id } = checks.current();
    checks.choose({ refrigerant: 'R-32' });
    await checks.stored();
    checks.type(outdoor, degF('95'));
    phone.byOtherTab(id, [
      { checkId: id, at: nextTime().toISOString(), do: 'choose', setup: { meteringDevice: 'txv' } },
    ]);
    await settled();
    expect(checks.current().setup).toEqual({ refrigerant: 'R-32', meteringDevice: 'txv' });
    expect(checks.current().edits[outdoor]).toMatchObject(degF('95'));
    await vi.advanceTimersByTimeAsync(1000);
    expect(phone.kept.get(id)).toMatchObject({
      setup: { meteringDevice: 'txv' },
      edits: { [outdoor]: { text: '95' } },
    });
  });

  it('lists a check that another tab made', async () => {
    const checks = await openPage();
    const id = '01900000-0000-7000-8000-00000000ffff';
    phone.byOtherTab(id, [{ checkId: id, at: nextTime().toISOString(), do: 'choose', setup: { refrigerant: 'R-22' } }]);
    await settled();
    expect(checks.list().map((check) => check.id)).toEqual([id]);
  });

  it('deletes the open check and brings it back whole', async () => {
    const checks = await openPage();
    checks.type(outdoor, degF('95'));
    checks.commit(outdoor);
    const before = checks.current();
    await checks.remove(before.id);
    expect(checks.list()).toEqual([]);
    expect(checks.current().readings).toEqual({});
    expect(checks.removed()).toBe(before.id);
    await checks.undoRemove();
    expect(checks.current().readings).toEqual(before.readings);
    expect(checks.removed()).toBeUndefined();
    await checks.stored();
    expect(phone.kept.get(before.id)?.deletedAt).toBeUndefined();
  });

  it('opens and deletes checks of earlier visits', async () => {
    const before = await openPage();
    before.choose({ refrigerant: 'R-22' });
    const old = before.current().id;
    before.startNew();
    before.choose({ refrigerant: 'R-32' });
    await before.stored();
    const checks = await openPage();
    expect(checks.current().setup.refrigerant).toBe('R-32');
    await checks.open(old);
    expect(checks.current().setup.refrigerant).toBe('R-22');
    await checks.stored();
    expect((await openPage()).current().setup.refrigerant).toBe('R-22');
    const again = TestBed.inject(LooseChecks);
    await again.remove(before.current().id);
    expect(again.list().map(({ refrigerant }) => refrigerant)).toEqual(['R-22']);
    expect(again.current().setup.refrigerant).toBe('R-22');
  });

  it('never mixes an example with readings', async () => {
    const checks = await openPage();
    const example = {
      setup: { refrigerant: 'R-410A' },
      readings: { outdoorDryBulb: degF('95'), suctionPressure: { text: '118', unit: 'psig' } },
    };
    const first = checks.current().id;
    checks.fillWithExample(example);
    expect(checks.current().id).toBe(first);
    expect(checks.current().readings.suctionPressure).toMatchObject({ text: '118', source: 'example' });
    checks.fillWithExample(example);
    expect(checks.current().id).not.toBe(first);
    expect(checks.list()).toHaveLength(2);
  });

  it('asks for every reading again after an adjustment, also for what was being typed', async () => {
    const checks = await openPage();
    checks.type(outdoor, degF('95'));
    checks.type('typed:elevation', { text: '65', unit: 'ft' });
    checks.retakeAll();
    expect(checks.current().readings).toEqual({});
    expect(Object.keys(checks.current().edits)).toEqual(['typed:elevation']);
    await checks.stored();
    expect(phone.kept.get(checks.current().id)?.readings).toMatchObject([{ text: '95' }]);
  });

  it('brings readings and clock back when there was no adjustment', async () => {
    const checks = await openPage();
    const runningSince = '2026-06-01T11:30:00.000Z';
    checks.visit({ runningSince });
    checks.type(outdoor, degF('95'));
    checks.commit(outdoor);
    checks.retakeAll();
    expect(checks.retaken()).toBe(true);
    expect(checks.current().visit.runningSince).not.toBe(runningSince);
    checks.undoRetake();
    expect(checks.retaken()).toBe(false);
    expect(checks.current()).toMatchObject({
      readings: { outdoorDryBulb: degF('95') },
      visit: { runningSince },
    });
    await checks.stored();
    expect(phone.kept.get(checks.current().id)?.retired).toEqual([]);
  });
});
