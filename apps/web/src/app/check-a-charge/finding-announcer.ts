import { ChangeDetectionStrategy, Component, effect, input, signal } from '@angular/core';
import { checkPageWords } from '@chargewright/wording';

/** Long enough that a value being typed is not read out digit by digit. */
const QUIET_MS = 1200;

/** Reads a new finding out, politely, once it stands still. */
@Component({
  selector: 'app-finding-announcer',
  template: `<p class="seen-by-readers-only" role="status">{{ said() }}</p>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FindingAnnouncer {
  readonly finding = input.required<string>();

  protected readonly said = signal('');

  constructor() {
    effect((onCleanup) => {
      const text = checkPageWords.result.announce(this.finding());
      const timer = setTimeout(() => this.said.set(text), QUIET_MS);
      onCleanup(() => clearTimeout(timer));
    });
  }
}
