import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { isKnown } from '@chargewright/engine';
import type { CapacityResult as Result } from '@chargewright/engine';
import {
  airflowPageWords,
  capacityCautionText,
  capacityReasonText,
  fieldDerivationLines,
  worksheetWords,
  type UnitSystem,
} from '@chargewright/wording';
import { shownFigure } from '../worksheets/figure-list';
import { MathFold } from '../worksheets/math-fold';

/** Cooling delivered to the air, with its ±. */
@Component({
  selector: 'app-capacity-result',
  imports: [MathFold],
  template: `
    <h2>{{ sheetWords.result }}</h2>
    @if (figures().length > 0) {
      <dl class="figures">
        @for (figure of figures(); track figure.label) {
          <dt>{{ figure.label }}</dt>
          <dd>
            {{ figure.value }}
            <small>{{ figure.plusMinus }}</small>
          </dd>
        }
      </dl>
      @if (hasNominal()) {
        <p class="soft">{{ words.note }}</p>
      }
    }
    @if (reason()) {
      <p>{{ reason() }}</p>
    }
    @if (cautions().length > 0) {
      <div>
        <h3>{{ sheetWords.keepInMind }}</h3>
        <ul>
          @for (caution of cautions(); track caution) {
            <li>{{ caution }}</li>
          }
        </ul>
      </div>
    }
    @if (lines().length > 0) {
      <app-math-fold foldId="capacity-math" [lines]="lines()" />
    }
  `,
  styleUrl: '../worksheets/sheet-result.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CapacityResult {
  /** Null while there is no airflow that counts. */
  readonly result = input.required<Result | null>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = airflowPageWords.capacity;
  protected readonly sheetWords = worksheetWords;
  protected readonly reason = computed(() => {
    const result = this.result();
    if (result === null) return this.words.needsAirflow;
    return result.reason ? capacityReasonText(result.reason) : '';
  });
  /** In Btu/h where the trade counts in it, and in tons beside it. */
  protected readonly figures = computed(() => {
    const result = this.result();
    const system = this.system();
    if (result === null) return [];
    const { totalW, sensibleW, sensibleHeatRatio, ofNominal } = result;
    return [
      shownFigure(this.words.total, totalW, system, { as: 'heatRateW' }),
      shownFigure(this.words.sensible, sensibleW, system, { as: 'heatRateW' }),
      shownFigure(this.words.ratio, sensibleHeatRatio, system),
      shownFigure(this.words.ofNominal, ofNominal, system),
    ].filter((figure) => figure !== undefined);
  });
  protected readonly hasNominal = computed(() => {
    const result = this.result();
    return result !== null && isKnown(result.ofNominal);
  });
  protected readonly cautions = computed(() =>
    this.figures().length > 0 ? (this.result()?.cautions ?? []).map((code) => capacityCautionText(code)) : [],
  );
  protected readonly lines = computed(() => fieldDerivationLines(this.result()?.steps ?? [], this.system()));
}
