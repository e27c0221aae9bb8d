import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { NOW } from '../loose-checks/time-and-ids';

const TICK_MS = 10_000;

/** The present moment for ages and the visit clock: ticks while the page is looked at, and at once when it is looked at again. */
@Injectable()
export class PageClock {
  private readonly now = inject(NOW);
  private readonly moment = signal(this.now().getTime());
  readonly nowMs = this.moment.asReadonly();

  private timer: ReturnType<typeof setInterval> | undefined;

  constructor() {
    const page = inject(DOCUMENT);
    const follow = () => {
      clearInterval(this.timer);
      this.tick();
      if (page.visibilityState !== 'hidden') this.timer = setInterval(() => this.tick(), TICK_MS);
    };
    follow();
    page.addEventListener('visibilitychange', follow);
    inject(DestroyRef).onDestroy(() => {
      page.removeEventListener('visibilitychange', follow);
      clearInterval(this.timer);
    });
  }

  /** After an act that is timed, so that its age is shown as new. */
  tick(): void {
    this.moment.set(this.now().getTime());
  }
}
