import { DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import type { CheckResult } from '@chargewright/engine';
import { ownersText, ownerWords, type UnitSystem } from '@chargewright/wording';
import { NOW } from '../loose-checks/time-and-ids';

const DATE = new Intl.DateTimeFormat('en', { day: 'numeric', month: 'long', year: 'numeric' });

/** The finding in plain words, to be handed on at once by whatever the phone shares with. */
@Component({
  selector: 'app-owners-note',
  template: `
    <button class="button" type="button" [attr.aria-expanded]="open()" aria-controls="owners-text" (click)="toggle()">
      {{ open() ? words.hide : words.open }}
    </button>
    <div id="owners-text" [hidden]="!open()">
      <h3>{{ words.title }}</h3>
      <p class="text">{{ text() }}</p>
      <div class="actions">
        @if (canShare) {
          <button class="button filled" type="button" (click)="share()">{{ words.share }}</button>
        }
        <button class="button" type="button" (click)="copy()">{{ words.copy }}</button>
      </div>
      <p role="status">{{ told() }}</p>
    </div>
  `,
  styles: `
    #owners-text {
      margin-top: 10px;
      padding: 14px 16px;
      border: 1px solid var(--line);
      border-radius: var(--radius);
      background: var(--sheet);
    }
    h3 {
      font-size: 1rem;
    }
    .text {
      margin: 6px 0 12px;
      user-select: all;
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 10px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OwnersNote {
  private readonly now = inject(NOW);
  private readonly navigator = inject(DOCUMENT).defaultView?.navigator as Partial<Navigator> | undefined;

  readonly result = input.required<CheckResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = ownerWords;
  protected readonly canShare = this.navigator?.share !== undefined;
  protected readonly open = signal(false);
  protected readonly told = signal('');
  protected readonly text = computed(() =>
    ownersText(this.result(), { date: DATE.format(this.now()), system: this.system() }),
  );

  protected toggle(): void {
    this.open.update((open) => !open);
    this.told.set('');
  }

  protected async share(): Promise<void> {
    try {
      await this.navigator?.share?.({ title: this.words.subject, text: this.text() });
    } catch {
      // Closed without sharing: nothing to say.
    }
  }

  protected async copy(): Promise<void> {
    try {
      if (!this.navigator?.clipboard) throw new Error('no clipboard');
      await this.navigator.clipboard.writeText(this.text());
      this.told.set(this.words.copied);
    } catch {
      this.told.set(this.words.notCopied);
    }
  }
}
