import { signal } from '@angular/core';
import type { CheckCommand, CheckState } from './check-command';
import type { LooseCheckStore } from './loose-check-store';

/** Well under the second within which every keystroke has to be stored. */
const TYPING_DELAY_MS = 250;
/** A browser's store may hang at opening, without an error; the page then goes on in memory. */
const OPEN_LIMIT_MS = 5000;

const inTime = <Answer>(work: Promise<Answer>): Promise<Answer> =>
  new Promise((resolve, reject) => {
    const timer = setTimeout(() => reject(new Error('the store did not open in time')), OPEN_LIMIT_MS);
    work.then(resolve, reject).finally(() => clearTimeout(timer));
  });

/**
 * Commands on their way to the phone's store, in their order. Keystrokes wait a moment for the next ones; everything else is written at
 * once. What could not be written stays here and is tried again with the next command.
 */
export class CheckQueue {
  readonly #open: () => Promise<LooseCheckStore>;
  readonly #onStored: (state: CheckState) => void;
  #pending: readonly CheckCommand[] = [];
  #store: Promise<LooseCheckStore> | undefined;
  #writing: Promise<void> = Promise.resolve();
  #timer: ReturnType<typeof setTimeout> | undefined;

  /** The last attempt to open or write the store failed. */
  readonly failing = signal(false);

  constructor(open: () => Promise<LooseCheckStore>, onStored: (state: CheckState) => void) {
    this.#open = open;
    this.#onStored = onStored;
  }

  pendingOf(checkId: string): readonly CheckCommand[] {
    return this.#pending.filter((command) => command.checkId === checkId);
  }

  push(command: CheckCommand): void {
    this.#pending = [...this.#pending, command];
    if (command.do !== 'type') void this.flush();
    else this.#timer ??= setTimeout(() => void this.flush(), TYPING_DELAY_MS);
  }

  /** Runs work on the open store; answers `undefined` where the store fails. */
  async use<Answer>(work: (store: LooseCheckStore) => Promise<Answer>): Promise<Answer | undefined> {
    try {
      this.#store ??= inTime(this.#open());
      const answer = await work(await this.#store);
      this.failing.set(false);
      return answer;
    } catch {
      // Any failure of the browser's store (denied, full, closed by a newer version) has one answer: go on in memory, open it anew next time.
      const failed = this.#store;
      this.#store = undefined;
      this.failing.set(true);
      void failed?.then((store) => store.close()).catch(() => undefined);
      return undefined;
    }
  }

  /** Writes everything that waits; resolves when it is stored or the attempt failed. */
  flush(): Promise<void> {
    clearTimeout(this.#timer);
    this.#timer = undefined;
    this.#writing = this.#writing.then(() => this.#writePending());
    return this.#writing;
  }

  async #writePending(): Promise<void> {
    for (let checkId = this.#pending[0]?.checkId; checkId !== undefined; checkId = this.#pending[0]?.checkId) {
      const id = checkId;
      const commands = this.pendingOf(id);
      const stored = await this.use((store) => store.write(id, commands));
      if (!stored) return;
      this.#pending = this.#pending.filter((command) => !commands.includes(command));
      this.#onStored(stored);
    }
  }

  /** Reads a check that another tab has written, in turn with this tab's own writing, so that no older state overtakes a newer one. */
  readAgain(checkId: string): void {
    this.#writing = this.#writing.then(async () => {
      const stored = await this.use((store) => store.read(checkId));
      if (stored) this.#onStored(stored);
    });
  }

  close(): void {
    clearTimeout(this.#timer);
    void this.#store?.then((store) => store.close()).catch(() => undefined);
  }
}
