import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { isAppKept } from './kept-app';
import { WorkerClient } from './worker-client';

/** The worker fetches the app while the page is at rest, which takes some seconds. */
const LOOK_AFTER_MS = [500, 2_000, 5_000, 10_000, 20_000, 40_000];

/** Whether there is a network, and whether the page would open without one. */
@Injectable({ providedIn: 'root' })
export class Offline {
  readonly #window = inject(DOCUMENT).defaultView as Window & typeof globalThis;
  readonly #online = signal(this.#window.navigator.onLine);
  readonly #ready = signal(false);
  #timer: ReturnType<typeof setTimeout> | undefined;

  readonly online = this.#online.asReadonly();
  /** Every file of the app is on the phone. */
  readonly ready = this.#ready.asReadonly();

  constructor() {
    const look = () => this.#online.set(this.#window.navigator.onLine);
    this.#window.addEventListener('online', look);
    this.#window.addEventListener('offline', look);
    inject(DestroyRef).onDestroy(() => {
      this.#window.removeEventListener('online', look);
      this.#window.removeEventListener('offline', look);
      clearTimeout(this.#timer);
    });
    if (inject(WorkerClient).updates.isEnabled) {
      void this.#window.navigator.serviceWorker.ready.then(() => this.#lookLater(LOOK_AFTER_MS));
    }
  }

  #lookLater([delay, ...later]: readonly number[]): void {
    if (delay === undefined) return;
    this.#timer = setTimeout(() => {
      void this.#isReady().then((ready) => (ready ? this.#ready.set(true) : this.#lookLater(later)));
    }, delay);
  }

  async #isReady(): Promise<boolean> {
    const { caches, fetch } = this.#window;
    try {
      return await isAppKept({
        fetch: (url, init) => fetch(url, init),
        isCached: async (url) => (await caches.match(url)) !== undefined,
      });
    } catch {
      // Neither network nor worker answered: not ready yet.
      return false;
    }
  }
}
