import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { checkPageWords } from '@chargewright/wording';
import type { FirstSet as KeptSet } from '../loose-checks/check-draft';

/** Two sets five minutes apart that agree show that the house has settled: the first is kept here while the second is read. */
@Component({
  selector: 'app-first-set',
  template: `
    @if (minutes() === undefined) {
      <button class="button" type="button" (click)="kept.emit()">{{ words.keepFirstSet }}</button>
    } @else {
      <p role="status">{{ words.firstSetNote(minutes() ?? 0) }}</p>
      <button class="button plain" type="button" (click)="forgotten.emit()">{{ words.forgetFirstSet }}</button>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 4px 16px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FirstSet {
  readonly firstSet = input<KeptSet>();
  readonly nowMs = input.required<number>();

  readonly kept = output<void>();
  readonly forgotten = output<void>();

  protected readonly words = checkPageWords.visit;
  protected readonly minutes = computed(() => {
    const set = this.firstSet();
    return set && Math.max(0, Math.floor((this.nowMs() - Date.parse(set.takenAt)) / 60_000));
  });
}
