import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { LooseChecks } from '../loose-checks/loose-checks';
import { WorkerClient } from './worker-client';

/** A page that stays open for days asks for a newer version at most this often, when it comes back into view. */
const ASK_EVERY_MS = 60 * 60 * 1000;

/** Newer versions of the app: fetched in the background, taken only when the person says so. */
@Injectable({ providedIn: 'root' })
export class AppUpdate {
  readonly #updates = inject(WorkerClient).updates;
  readonly #page = inject(DOCUMENT);
  readonly #checks = inject(LooseChecks);
  readonly #fetched = signal(false);
  readonly #broken = signal(false);
  #askedAt = performance.now();

  /** A newer version lies on the phone. */
  readonly fetched = this.#fetched.asReadonly();
  /** The stored app is damaged and can only be loaded anew. */
  readonly broken = this.#broken.asReadonly();

  constructor() {
    if (!this.#updates.isEnabled) return;
    this.#updates.versionUpdates.pipe(takeUntilDestroyed()).subscribe(({ type }) => {
      if (type === 'VERSION_READY') this.#fetched.set(true);
    });
    this.#updates.unrecoverable.pipe(takeUntilDestroyed()).subscribe(() => this.#broken.set(true));
    const ask = () => void this.#askAgain();
    this.#page.addEventListener('visibilitychange', ask);
    inject(DestroyRef).onDestroy(() => this.#page.removeEventListener('visibilitychange', ask));
  }

  /** Loads the page anew, after everything typed is stored. */
  async take(): Promise<void> {
    await this.#checks.stored();
    this.#page.location.reload();
  }

  async #askAgain(): Promise<void> {
    if (this.#page.visibilityState !== 'visible' || performance.now() - this.#askedAt < ASK_EVERY_MS) return;
    this.#askedAt = performance.now();
    try {
      if (await this.#updates.checkForUpdate()) this.#fetched.set(true);
    } catch {
      // No network; the next time it comes into view is soon enough.
    }
  }
}
