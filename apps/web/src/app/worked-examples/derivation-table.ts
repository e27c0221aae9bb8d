import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { workedExampleWords, type CheckedLine } from '@chargewright/wording';
import { MathText } from '../check-a-charge/math-text';

/** A derivation as a person would write it on paper, a row a step, and what its result is held against. */
@Component({
  selector: 'app-derivation-table',
  imports: [MathText],
  template: `
    <dl>
      @for (line of lines(); track line.id) {
        <div>
          <dt>{{ line.name }}</dt>
          <dd class="working">
            <i><app-math-text [text]="line.formula" /></i>&ngsp;<app-math-text [text]="'= ' + line.substitution" />
          </dd>
          <dd class="value">= {{ line.result }}</dd>
          @if (line.check; as check) {
            <dd class="check">{{ words.checked(check.printed, check.against) }}</dd>
          }
        </div>
      }
    </dl>
  `,
  styleUrl: './derivation-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DerivationTable {
  readonly lines = input.required<readonly CheckedLine[]>();

  protected readonly words = workedExampleWords.key;
}
