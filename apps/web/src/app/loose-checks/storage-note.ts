import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { looseChecksWords } from '@chargewright/wording';
import { LooseChecks } from './loose-checks';

/** Says when the phone keeps nothing, or when stored entries were found damaged; empty otherwise. */
@Component({
  selector: 'app-storage-note',
  template: `
    <div role="status">
      @for (note of notes(); track note) {
        <p>{{ note }}</p>
      }
    </div>
  `,
  styles: `
    p {
      margin-bottom: 8px;
      padding: 10px 14px;
      border-inline-start: 5px solid var(--brass);
      border-radius: var(--radius-small);
      background: var(--brass-wash);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StorageNote {
  readonly #checks = inject(LooseChecks);

  protected readonly notes = computed(() => [
    ...(this.#checks.state() === 'memory-only' ? [looseChecksWords.memoryOnly] : []),
    ...(this.#checks.setAside() > 0 ? [looseChecksWords.setAside(this.#checks.setAside())] : []),
  ]);
}
