import {
  computed,
  DestroyRef,
  DOCUMENT,
  effect,
  inject,
  Injectable,
  signal,
  untracked,
  type Signal,
} from '@angular/core';
import type { WorksheetPage } from '@chargewright/contract/stored-check';
import type { TypedValue } from './check-draft';
import { LooseChecks } from './loose-checks';
import { NEW_ID, NOW } from './time-and-ids';
import { EMPTY_WORKSHEET, patched, type Worksheet, type WorksheetPatch } from './worksheet';
import { OPEN_WORKSHEETS, type WorksheetStore } from './worksheet-store';

/** Well under the second within which every keystroke has to be stored. */
const TYPING_DELAY_MS = 250;

interface Waiting {
  readonly checkId: string;
  readonly page: WorksheetPage;
  readonly patches: readonly WorksheetPatch[];
}

const keyOf = (checkId: string, page: WorksheetPage): string => `${checkId} ${page}`;

/** The sheets of the pages beside the checks: in memory at once, stored right after. */
@Injectable({ providedIn: 'root' })
export class Worksheets {
  readonly #checks = inject(LooseChecks);
  readonly #open = inject(OPEN_WORKSHEETS);
  readonly #now = inject(NOW);
  readonly #newId = inject(NEW_ID);
  readonly #sheets = signal<ReadonlyMap<string, Worksheet>>(new Map());
  readonly #failing = signal(false);
  #waiting: ReadonlyMap<string, Waiting> = new Map();
  #store: Promise<WorksheetStore> | undefined;
  #writing: Promise<void> = Promise.resolve();
  #timer: ReturnType<typeof setTimeout> | undefined;

  /** The store cannot be opened or written: what is typed lasts as long as the page. */
  readonly failing = this.#failing.asReadonly();

  constructor() {
    const page = inject(DOCUMENT);
    const flush = () => void this.stored();
    page.addEventListener('visibilitychange', flush);
    page.defaultView?.addEventListener('pagehide', flush);
    inject(DestroyRef).onDestroy(() => {
      page.removeEventListener('visibilitychange', flush);
      page.defaultView?.removeEventListener('pagehide', flush);
      clearTimeout(this.#timer);
      void this.#store?.then((store) => store.close()).catch(() => undefined);
    });
  }

  /** The sheet of a check and a page; undefined until it was read. */
  sheet(checkId: string, page: WorksheetPage): Worksheet | undefined {
    return this.#sheets().get(keyOf(checkId, page));
  }

  async load(checkId: string, page: WorksheetPage): Promise<void> {
    const key = keyOf(checkId, page);
    if (this.#sheets().has(key)) return;
    const stored = await this.#use((store) => store.read(checkId, page));
    if (!this.#sheets().has(key)) this.#set(key, stored ?? EMPTY_WORKSHEET);
  }

  change(checkId: string, page: WorksheetPage, patch: WorksheetPatch): void {
    const key = keyOf(checkId, page);
    this.#set(key, patched(this.#sheets().get(key) ?? EMPTY_WORKSHEET, patch));
    const patches = [...(this.#waiting.get(key)?.patches ?? []), patch];
    this.#waiting = new Map(this.#waiting).set(key, { checkId, page, patches });
    // what hangs on a check keeps it: an empty one would have another id after a reload
    if (this.#checks.current().id === checkId) this.#checks.keep();
    this.#timer ??= setTimeout(() => void this.stored(), TYPING_DELAY_MS);
  }

  /** Resolves when everything typed until now is stored, or cannot be. */
  stored(): Promise<void> {
    clearTimeout(this.#timer);
    this.#timer = undefined;
    this.#writing = this.#writing.then(() => this.#writeWaiting());
    return this.#writing;
  }

  async #writeWaiting(): Promise<void> {
    for (const [key, { checkId, page, patches }] of this.#waiting) {
      const place = { checkId, page, rowId: this.#newId(), at: this.#now().toISOString() };
      const written = await this.#use(async (store) => {
        await store.write(place, patches);
        return true;
      });
      // tried again with the next change
      if (!written) return;
      const later = this.#waiting.get(key)?.patches.slice(patches.length) ?? [];
      const waiting = new Map(this.#waiting);
      if (later.length > 0) waiting.set(key, { checkId, page, patches: later });
      else waiting.delete(key);
      this.#waiting = waiting;
    }
  }

  #set(key: string, sheet: Worksheet): void {
    this.#sheets.update((sheets) => new Map(sheets).set(key, sheet));
  }

  async #use<Answer>(work: (store: WorksheetStore) => Promise<Answer>): Promise<Answer | undefined> {
    try {
      this.#store ??= this.#open();
      const answer = await work(await this.#store);
      this.#failing.set(false);
      return answer;
    } catch {
      // Any failure of the browser's store has one answer: go on in memory, open it anew next time.
      this.#store = undefined;
      this.#failing.set(true);
      return undefined;
    }
  }
}

/** One page's sheet of the check that is open. */
export interface OpenWorksheet {
  /** Undefined until it was read. */
  readonly sheet: Signal<Worksheet | undefined>;
  type(field: string, value: TypedValue): void;
  choose(name: string, value: string): void;
  setRows(rows: Worksheet['rows']): void;
  replace(sheet: Worksheet): void;
}

/** The sheet that follows the open check. Call in an injection context. */
export function injectWorksheet(page: WorksheetPage): OpenWorksheet {
  const checks = inject(LooseChecks);
  const worksheets = inject(Worksheets);
  const checkId = computed(() => (checks.state() === 'loading' ? undefined : checks.current().id));
  effect(() => {
    const id = checkId();
    if (id !== undefined) untracked(() => void worksheets.load(id, page));
  });
  const change = (patch: WorksheetPatch): void => {
    const id = checkId();
    if (id !== undefined) worksheets.change(id, page, patch);
  };
  return {
    sheet: computed(() => {
      const id = checkId();
      return id === undefined ? undefined : worksheets.sheet(id, page);
    }),
    type: (field, { text, unit }) => change({ do: 'type', field, value: { text, unit } }),
    choose: (name, value) => change({ do: 'choose', name, value }),
    setRows: (rows) => change({ do: 'set-rows', rows }),
    replace: (sheet) => change({ do: 'replace', sheet }),
  };
}
