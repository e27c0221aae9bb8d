import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CheckResult, CriterionResult, Known } from '@chargewright/engine';
import { checkPageWords, derivationLines, type UnitSystem } from '@chargewright/wording';
import { MathText } from './math-text';

/** Ids of every step behind these numbers. */
function stepsBehind(results: readonly (Known | null)[]): ReadonlySet<string> {
  const ids = new Set<string>();
  const visit = (result: Known): void => {
    const { step } = result;
    if (step.type === 'leaf' || ids.has(step.formula.id)) return;
    ids.add(step.formula.id);
    Object.values(step.from).forEach(visit);
  };
  for (const result of results) if (result) visit(result);
  return ids;
}

/** The derivation of one criterion, in the order a person would write it on paper. */
@Component({
  selector: 'app-math-lines',
  imports: [MathText],
  template: `
    @for (line of lines(); track line.id) {
      <dl>
        <dt>{{ line.name }}</dt>
        <dd class="formula"><app-math-text [text]="line.formula" /></dd>
        <dd class="working"><app-math-text [text]="'= ' + line.substitution" /></dd>
        <dd class="value">= {{ line.result }}</dd>
      </dl>
    } @empty {
      <p>{{ words.empty }}</p>
    }
    @if (sources()) {
      <p class="sources">{{ resultWords.sources }}: {{ sources() }}</p>
    }
  `,
  styleUrl: './math-lines.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MathLines {
  readonly result = input.required<CheckResult>();
  readonly criterion = input.required<CriterionResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = checkPageWords.math;
  protected readonly resultWords = checkPageWords.result;
  protected readonly lines = computed(() => {
    const { actual, target, deviation } = this.criterion();
    const ids = stepsBehind([actual, target, deviation]);
    return derivationLines(
      this.result().derivation.filter(({ id }) => ids.has(id)),
      this.system(),
    );
  });
  protected readonly sources = computed(() => [...new Set(this.lines().map(({ source }) => source))].join(' · '));
}
