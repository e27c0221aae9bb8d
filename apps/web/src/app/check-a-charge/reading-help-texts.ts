import { Injectable, signal } from '@angular/core';
import type { ReadingId } from '@chargewright/engine';
import { loadReadingHelp, type ReadingHelp } from '@chargewright/wording';

/** How to take each reading, and the usual mistake; not in the first download. */
@Injectable({ providedIn: 'root' })
export class ReadingHelpTexts {
  private readonly loaded = signal<Readonly<Record<ReadingId, ReadingHelp>> | undefined>(undefined);
  readonly texts = this.loaded.asReadonly();

  async load(): Promise<void> {
    if (this.loaded()) return;
    try {
      this.loaded.set(await loadReadingHelp());
    } catch {
      // No network, and the app is not kept on the phone yet: asked for again when somebody opens the help of a reading.
    }
  }
}
