import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CheckResult, CriterionResult, Known } from '@chargewright/engine';
import { derivationLines, type UnitSystem } from '@chargewright/wording';
import { WorkingLines } from './working-lines';

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
  imports: [WorkingLines],
  template: `<app-working-lines [lines]="lines()" />`,
  styles: `
    :host {
      display: block;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MathLines {
  readonly result = input.required<CheckResult>();
  readonly criterion = input.required<CriterionResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly lines = computed(() => {
    const { actual, target, deviation } = this.criterion();
    const ids = stepsBehind([actual, target, deviation]);
    return derivationLines(
      this.result().derivation.filter(({ id }) => ids.has(id)),
      this.system(),
    );
  });
}
