import { afterNextRender, computed, DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { afterPaint } from './after-paint';
import type { CheckCommand, CheckState, ExampleCheck } from './check-command';
import type { CheckDraft, CheckSummary, DraftSetup, DraftVisit, FieldKey, TypedValue, WorkedOut } from './check-draft';
import { applyCommand, draftOf, emptyCheck, isEmpty, summaryOf } from './check-draft-reducer';
import { CheckQueue } from './check-queue';
import { OPEN_STORE } from './loose-check-store';
import { NEW_ID, NOW } from './time-and-ids';

/** A command without what every command has. */
type Deed = CheckCommand extends infer Each
  ? Each extends CheckCommand
    ? Omit<Each, 'checkId' | 'at'>
    : never
  : never;

const withEntry = <Value>(map: ReadonlyMap<string, Value>, id: string, value: Value | undefined) => {
  const copy = new Map(map);
  if (value === undefined) copy.delete(id);
  else copy.set(id, value);
  return copy;
};

/**
 * The checks kept on this phone, without an account. Everything happens in memory at once and is stored right after; where the phone
 * stores nothing (a private window, no room left), the page goes on in memory and says so.
 */
@Injectable({ providedIn: 'root' })
export class LooseChecks {
  readonly #now = inject(NOW);
  readonly #newId = inject(NEW_ID);
  readonly #openStore = inject(OPEN_STORE);
  readonly #queue = new CheckQueue(
    () => this.#openStore((checkId) => this.#queue.readAgain(checkId)),
    (stored) => this.#receive(stored),
  );

  readonly #loaded = signal(false);
  #loading = false;
  readonly #currentId = signal(this.#newId());
  readonly #bornAt = this.#now().toISOString();
  /** Checks made or opened in this tab, with what is not stored yet. */
  readonly #states = signal<ReadonlyMap<string, CheckState>>(new Map());
  /** The other checks of the store. */
  readonly #stored = signal<ReadonlyMap<string, CheckSummary>>(new Map());
  /** What stood before the last adjustment. */
  readonly #retaken = signal<
    | {
        readonly id: string;
        readonly retired: readonly string[];
        readonly runningSince: string | undefined;
        readonly tests: DraftVisit['tests'];
      }
    | undefined
  >(undefined);
  readonly #removed = signal<{ readonly id: string; readonly wasCurrent: boolean } | undefined>(undefined);
  readonly #setAside = signal(0);
  readonly #state = computed(
    () => this.#states().get(this.#currentId()) ?? emptyCheck(this.#currentId(), this.#bornAt),
  );

  /** The open check; an empty one at the first visit. */
  readonly current = computed<CheckDraft>(() => draftOf(this.#state()));
  /** All checks in which something was entered, the last changed first. */
  readonly list = computed<readonly CheckSummary[]>(() => {
    const all = new Map(this.#stored());
    for (const [id, state] of this.#states()) {
      if (state.deletedAt !== undefined || isEmpty(state)) all.delete(id);
      else all.set(id, summaryOf(state));
    }
    return [...all.values()].sort((a, b) => (a.updatedAt < b.updatedAt ? 1 : -1));
  });
  /** `memory-only`: the phone's store cannot be opened or written. */
  readonly state = computed<'loading' | 'ready' | 'memory-only'>(() => {
    if (this.#queue.failing()) return 'memory-only';
    return this.#loaded() ? 'ready' : 'loading';
  });
  /** How many damaged rows of the store were put aside. */
  readonly setAside = this.#setAside.asReadonly();
  /** The open check's readings were all asked again, and `undoRetake` can bring them back. */
  readonly retaken = computed(() => this.#retaken()?.id === this.#currentId());
  /** The id of the check that `undoRemove` brings back. */
  readonly removed = computed(() => this.#removed()?.id);

  constructor() {
    const page = inject(DOCUMENT);
    const flush = () => void this.#queue.flush();
    page.addEventListener('visibilitychange', flush);
    page.defaultView?.addEventListener('pagehide', flush);
    inject(DestroyRef).onDestroy(() => {
      page.removeEventListener('visibilitychange', flush);
      page.defaultView?.removeEventListener('pagehide', flush);
      this.#queue.close();
    });
    afterNextRender(() => afterPaint(page, () => void this.#load()));
  }

  /** Every keystroke: kept beside the committed value, stored within a second. */
  type(field: FieldKey, { text, unit }: TypedValue): void {
    this.#tell({ do: 'type', field, value: { text, unit }, editId: this.#newId() });
  }

  /** What stands in the field becomes a reading, or a number of setup or visit; a blank text takes the value away. */
  commit(field: FieldKey): void {
    if (this.#state().edits[field]) this.#tell({ do: 'commit', field, readingId: this.#newId() });
  }

  /** An airflow that was worked out becomes the check's; what is being typed in its field gives way. */
  bringAirflow(value: TypedValue, workedOut: WorkedOut): void {
    this.#tell({ do: 'bring', value, workedOut, readingId: this.#newId() });
  }

  /** Stores the open check even while nothing is entered, for what hangs on it. */
  keep(): void {
    if (!this.#states().has(this.#currentId())) this.#tell({ do: 'open' });
  }

  choose(setup: Partial<DraftSetup>): void {
    this.#tell({ do: 'choose', setup });
  }

  /** Merged into the visit; the pre-flight item by item. */
  visit(patch: Partial<DraftVisit>): void {
    this.#tell({ do: 'visit', patch });
  }

  /** Fills the open check if nothing is entered yet, else a new one: an example is never mixed with real readings. */
  fillWithExample(example: ExampleCheck): void {
    this.startNew();
    this.#tell({ do: 'fill', example, readingIds: Object.keys(example.readings).map(() => this.#newId()) });
  }

  /** After an adjustment of the system: the clock starts anew and every reading is asked again; the old ones stay in the history. */
  retakeAll(): void {
    this.#commitReadings();
    const { id, retired, visit } = this.#state();
    this.#retaken.set({ id, retired, runningSince: visit.runningSince, tests: visit.tests });
    this.#tell({ do: 'retake' });
    this.visit({ runningSince: this.#now().toISOString() });
  }

  /** The readings that stand become the first of two sets; all are asked again, the clock runs on. */
  keepFirstSet(): void {
    this.#commitReadings();
    this.#tell({ do: 'keep-first-set' });
  }

  forgetFirstSet(): void {
    this.#tell({ do: 'forget-first-set' });
  }

  /** There was no adjustment: clock and readings stand as before. What was read meanwhile stays, too. */
  undoRetake(): void {
    const before = this.#retaken();
    if (!before) return;
    this.#retaken.set(undefined);
    const { id, retired, runningSince, tests } = before;
    this.#tell({ do: 'take-back-retake', retired, runningSince, tests }, id);
  }

  #commitReadings(): void {
    for (const field of Object.keys(this.#state().edits) as FieldKey[]) {
      if (field.startsWith('reading:')) this.commit(field);
    }
  }

  /** Opens an empty check, unless the open one is empty. */
  startNew(): void {
    if (isEmpty(this.#state())) return;
    this.#openEmpty();
  }

  async open(id: string): Promise<void> {
    if (!(await this.#know(id))) return;
    this.#currentId.set(id);
    this.#tell({ do: 'open' });
  }

  /** Takes a check off the list; `undoRemove` brings it back. */
  async remove(id: string): Promise<void> {
    if (!(await this.#know(id))) return;
    const wasCurrent = id === this.#currentId();
    this.#tell({ do: 'remove' }, id);
    this.#removed.set({ id, wasCurrent });
    if (wasCurrent) this.#openEmpty();
  }

  async undoRemove(): Promise<void> {
    const removed = this.#removed();
    if (!removed) return;
    this.#removed.set(undefined);
    this.#tell({ do: 'restore' }, removed.id);
    if (removed.wasCurrent) await this.open(removed.id);
  }

  /** Resolves when everything entered until now is stored, or cannot be. */
  stored(): Promise<void> {
    return this.#queue.flush();
  }

  #openEmpty(): void {
    this.#currentId.set(this.#newId());
    // Stored at once, so that a reload does not show another customer's check.
    this.#tell({ do: 'open' });
  }

  #tell(deed: Deed, checkId = this.#currentId()): void {
    const command = { ...deed, checkId, at: this.#now().toISOString() } as CheckCommand;
    this.#states.update((states) => withEntry(states, checkId, applyCommand(states.get(checkId), command)));
    this.#queue.push(command);
  }

  /** The store's state of a check replaces the one in memory; what is not written yet is applied on top. */
  #settle(stored: CheckState): void {
    const state = this.#queue.pendingOf(stored.id).reduce<CheckState>(applyCommand, stored);
    this.#states.update((states) => withEntry(states, stored.id, state));
  }

  async #know(id: string): Promise<boolean> {
    if (!this.#states().has(id)) {
      const stored = await this.#queue.use((store) => store.read(id));
      if (stored && !this.#states().has(id)) this.#settle(stored);
    }
    return this.#states().has(id);
  }

  /** A check as it was just written, by this tab or another. */
  #receive(stored: CheckState): void {
    // The store did not open at the start, and does now.
    if (!this.#loaded()) void this.#load();
    if (this.#states().has(stored.id)) this.#settle(stored);
    else {
      const listed = stored.deletedAt === undefined && !isEmpty(stored);
      this.#stored.update((all) => withEntry(all, stored.id, listed ? summaryOf(stored) : undefined));
    }
  }

  async #load(): Promise<void> {
    if (this.#loading) return;
    this.#loading = true;
    await this.#queue.use(async (store) => {
      const { summaries, lastOpened } = await store.list();
      this.#stored.set(new Map(summaries.map((summary) => [summary.id, summary])));
      if (lastOpened !== undefined && !this.#states().has(this.#currentId()) && (await this.#know(lastOpened))) {
        // What was typed meanwhile stays in sight, as a check of its own.
        if (!this.#states().has(this.#currentId())) this.#currentId.set(lastOpened);
      }
      this.#loaded.set(true);
    });
    this.#loading = false;
    if (!this.#loaded()) return;
    const setAside = await this.#queue.use((store) => store.tidy(this.#now()));
    if (setAside !== undefined) this.#setAside.set(setAside);
  }
}
