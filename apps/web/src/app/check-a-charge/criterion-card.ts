import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import type { CheckInput, CheckResult, CriterionResult } from '@chargewright/engine';
import {
  checkPageWords,
  criterionDetail,
  criterionName,
  criterionParts,
  findingWord,
  formatFigure,
  targetComparisonWords,
  type UnitSystem,
} from '@chargewright/wording';
import { MathLines } from './math-lines';
import { comparedTargets, SourceComparison } from './source-comparison';
import { ToleranceRuler } from './tolerance-ruler';

/** One thing judged: a sentence, the picture, the numbers. */
@Component({
  selector: 'app-criterion-card',
  imports: [MathLines, SourceComparison, ToleranceRuler],
  templateUrl: './criterion-card.html',
  styleUrl: './criterion-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CriterionCard {
  readonly input = input.required<CheckInput>();
  readonly result = input.required<CheckResult>();
  readonly criterion = input.required<CriterionResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly open = signal(false);
  protected readonly comparing = signal(false);

  protected readonly words = checkPageWords.result;
  protected readonly ruler = checkPageWords.ruler;
  protected readonly name = computed(() => criterionName(this.criterion().criterion));
  protected readonly finding = computed(() => findingWord(this.criterion().finding, this.criterion().criterion));
  protected readonly outside = computed(() => ['above', 'below'].includes(this.criterion().finding));
  protected readonly detail = computed(() => criterionDetail(this.criterion(), this.system()));
  protected readonly figure = computed(() => {
    const { actual } = this.criterion();
    return actual && formatFigure(actual.kind, actual.value, this.system());
  });
  protected readonly plusMinus = computed(() => criterionParts(this.criterion(), this.system()).plusMinus);
  protected readonly hasMath = computed(() => this.criterion().actual !== null || this.criterion().target !== null);
  protected readonly mathId = computed(() => `math-${this.criterion().criterion}`);

  protected readonly comparison = targetComparisonWords;
  protected readonly canCompare = computed(
    () => comparedTargets(this.criterion(), this.input(), this.result()).length > 0,
  );
  protected readonly comparisonId = computed(() => `comparison-${this.criterion().criterion}`);

  protected toggleComparison(): void {
    this.comparing.update((comparing) => !comparing);
  }

  protected toggleMath(): void {
    this.open.update((open) => !open);
  }
}
