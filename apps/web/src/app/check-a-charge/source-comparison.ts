import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import {
  compareSplitTargets,
  compareTargets,
  type CheckInput,
  type CheckResult,
  type ComparedTarget,
  type CriterionResult,
} from '@chargewright/engine';
import { formatValue, targetComparisonWords, type UnitSystem } from '@chargewright/wording';

/** What each source has as the target at this check's own conditions; a dash is a dash in all of them. */
@Component({
  selector: 'app-source-comparison',
  template: `
    <table>
      <caption>
        {{
          words.caption
        }}
      </caption>
      <thead>
        <tr>
          <th scope="col">{{ words.source }}</th>
          <th scope="col">{{ words.target }}</th>
        </tr>
      </thead>
      <tbody>
        @for (row of rows(); track row.id) {
          <tr [class.used]="row.used">
            <th scope="row">
              {{ row.name }}
              @if (row.used) {
                <b>({{ words.used }})</b>
              }
              <small>{{ row.standing }}</small>
            </th>
            <td>{{ row.target }}</td>
          </tr>
        }
      </tbody>
    </table>
  `,
  styleUrl: './source-comparison.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourceComparison {
  readonly input = input.required<CheckInput>();
  readonly result = input.required<CheckResult>();
  readonly criterion = input.required<CriterionResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = targetComparisonWords;
  protected readonly rows = computed(() =>
    comparedTargets(this.criterion(), this.input(), this.result()).map((compared) => ({
      id: compared.id,
      name: this.words.names[compared.id],
      standing: this.words.standings[compared.standing],
      used: compared.id === this.criterion().targetSource,
      target: this.print(compared),
    })),
  );

  private print({ id, target }: ComparedTarget): string {
    if (target.ok) return formatValue('differenceK', target.value, this.system());
    if (id === 'short-formula') return this.words.formulaRefused;
    return target.error.details.reason === 'dash' ? this.words.dash : this.words.outside;
  }
}

/** Empty where the conditions are not read, or the criterion has no table to compare. */
export function comparedTargets(
  { criterion }: CriterionResult,
  { readings }: CheckInput,
  { derived }: CheckResult,
): readonly ComparedTarget[] {
  const { returnWetBulb } = derived;
  if (returnWetBulb === undefined) return [];
  const outdoor = readings.outdoorDryBulb?.quantity;
  const dryBulb = readings.returnDryBulb?.quantity;
  if (criterion === 'superheat' && outdoor) {
    return compareTargets({ wetBulbK: returnWetBulb.value, outdoorK: outdoor.value });
  }
  if (criterion === 'temperature-split' && dryBulb) {
    return compareSplitTargets({ dryBulbK: dryBulb.value, wetBulbK: returnWetBulb.value });
  }
  return [];
}
