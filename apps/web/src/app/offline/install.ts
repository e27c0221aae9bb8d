import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';

/** What Chromium's browsers send when the page may be installed; in no standard, so not among TypeScript's own types. */
interface InstallEvent extends Event {
  prompt(): Promise<unknown>;
}

/** Installing the page like an app, where the browser offers it. */
@Injectable({ providedIn: 'root' })
export class Install {
  readonly #window = inject(DOCUMENT).defaultView as Window;
  readonly #event = signal<InstallEvent | undefined>(undefined);

  /** The browser would install the page now. */
  readonly offered = () => this.#event() !== undefined;

  constructor() {
    const keep = (event: Event) => {
      // The browser's own banner would cover the readings.
      event.preventDefault();
      this.#event.set(event as InstallEvent);
    };
    const installed = () => {
      this.#event.set(undefined);
      // An installed app may ask the browser not to drop its store when room gets short.
      void this.#window.navigator.storage?.persist();
    };
    this.#window.addEventListener('beforeinstallprompt', keep);
    this.#window.addEventListener('appinstalled', installed);
    inject(DestroyRef).onDestroy(() => {
      this.#window.removeEventListener('beforeinstallprompt', keep);
      this.#window.removeEventListener('appinstalled', installed);
    });
  }

  /** Shows the browser's question; it can be asked once per event. */
  async ask(): Promise<void> {
    const event = this.#event();
    this.#event.set(undefined);
    await event?.prompt();
  }
}
