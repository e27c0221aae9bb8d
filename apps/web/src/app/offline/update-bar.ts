import { ChangeDetectionStrategy, Component, computed, DestroyRef, DOCUMENT, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { offlineWords } from '@chargewright/wording';
import { LooseChecks } from '../loose-checks/loose-checks';
import { AppUpdate } from './app-update';

const isField = (element: Element | null): boolean => element?.matches('input, select, textarea') ?? false;

/** Offers a newer version, once nobody is typing: never between a reading and its commit. */
@Component({
  selector: 'app-update-bar',
  imports: [MatButton],
  template: `
    <div role="status">
      @if (update.broken()) {
        <p>{{ words.updateBroken }}</p>
      } @else if (offered()) {
        <p>
          {{ words.updateAvailable }} <small>{{ words.updateNote }}</small>
        </p>
      }
    </div>
    @if (update.broken() || offered()) {
      <button matButton="outlined" type="button" (click)="update.take()">
        {{ update.broken() ? words.reload : words.updateNow }}
      </button>
      @if (!update.broken()) {
        <button matButton type="button" (click)="putOff()">{{ words.updateLater }}</button>
      }
    }
  `,
  styleUrl: './quiet-bar.scss',
  host: { '[class.shown]': 'update.broken() || offered()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UpdateBar {
  readonly #checks = inject(LooseChecks);
  readonly #page = inject(DOCUMENT);
  readonly #typing = signal(isField(this.#page.activeElement));
  readonly #putOff = signal(false);

  protected readonly words = offlineWords;
  protected readonly update = inject(AppUpdate);
  protected readonly offered = computed(
    () =>
      this.update.fetched() &&
      !this.#putOff() &&
      !this.#typing() &&
      Object.keys(this.#checks.current().edits).length === 0,
  );

  constructor() {
    const look = () => this.#typing.set(isField(this.#page.activeElement));
    // The element that gets the focus is known only after the event that takes it from another.
    const lookSoon = () => queueMicrotask(look);
    this.#page.addEventListener('focusin', look);
    this.#page.addEventListener('focusout', lookSoon);
    inject(DestroyRef).onDestroy(() => {
      this.#page.removeEventListener('focusin', look);
      this.#page.removeEventListener('focusout', lookSoon);
    });
  }

  protected putOff(): void {
    this.#putOff.set(true);
  }
}
