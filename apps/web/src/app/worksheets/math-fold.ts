import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import { worksheetWords, type DerivationLine } from '@chargewright/wording';
import { WorkingLines } from '../check-a-charge/working-lines';

/** The math, opening in place. */
@Component({
  selector: 'app-math-fold',
  imports: [WorkingLines],
  template: `
    <button
      type="button"
      class="button"
      [attr.aria-expanded]="open()"
      [attr.aria-controls]="open() ? foldId() : null"
      (click)="open.set(!open())"
    >
      {{ open() ? words.hideMath : words.showMath }}
    </button>
    @if (open()) {
      <app-working-lines [id]="foldId()" [lines]="lines()" />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 10px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MathFold {
  readonly lines = input.required<readonly DerivationLine[]>();
  /** Unique on the page. */
  readonly foldId = input.required<string>();

  protected readonly open = signal(false);
  protected readonly words = worksheetWords;
}
