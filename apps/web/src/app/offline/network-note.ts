import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { offlineWords } from '@chargewright/wording';
import { Offline } from './offline';

/** One line: whether the page works without a network, and whether there is one. */
@Component({
  selector: 'app-network-note',
  template: `<span role="status">{{ note() }}</span>`,
  styles: `
    :host {
      color: var(--soft);
      font-size: 0.9375rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NetworkNote {
  readonly #offline = inject(Offline);

  protected readonly note = computed(() => {
    if (!this.#offline.online()) return `${offlineWords.offline}. ${offlineWords.offlineNote}`;
    return this.#offline.ready() ? offlineWords.ready : '';
  });
}
