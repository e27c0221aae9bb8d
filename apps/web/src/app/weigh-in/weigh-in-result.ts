import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { WeighInResult as Result } from '@chargewright/engine';
import {
  fieldDerivationLines,
  formatMass,
  weighInCautionText,
  weighInPageWords,
  weighInReasonText,
  weighInSays,
  weighInSum,
  weighInWords,
  worksheetWords,
  type UnitSystem,
} from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import { MathFold } from '../worksheets/math-fold';

/** What is required and how it came out, with the whole sum. */
@Component({
  selector: 'app-weigh-in-result',
  imports: [Glyph, MathFold],
  templateUrl: './weigh-in-result.html',
  styleUrls: ['../worksheets/sheet-result.scss', './weigh-in-result.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WeighInResult {
  /** Null until refrigerant, kind and method are chosen. */
  readonly result = input.required<Result | null>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = weighInPageWords.result;
  protected readonly sheetWords = worksheetWords;
  protected readonly said = computed(() => {
    const result = this.result();
    return result && weighInSays(result, this.system());
  });
  /** Nothing goes into such a system. */
  protected readonly isStop = computed(() => {
    const code = this.result()?.reason?.code;
    return code === 'above-label-maximum' || code === 'vacuum-failed';
  });
  /** What is to be weighed in is the headline; that it is not weighed yet goes without saying. */
  protected readonly reason = computed(() => {
    const reason = this.result()?.reason;
    if (!reason) return '';
    const onlyToWeigh = reason.code === 'inputs-missing' && reason.inputs.join() === 'actualCharge';
    return onlyToWeigh ? '' : weighInReasonText(reason);
  });
  protected readonly sum = computed(() => {
    const result = this.result();
    return result ? weighInSum(result, this.system()) : [];
  });
  protected readonly rule = computed(() => {
    const weight = this.result()?.weight;
    if (!weight) return '';
    const [required, actual] = [weight.requiredRoundedKg, weight.actualRoundedKg].map((kg) =>
      formatMass(kg, this.system()),
    );
    return this.words.rule[weight.byRule](required ?? '', actual ?? '');
  });
  protected readonly vacuum = computed(() => weighInWords.vacuum[this.result()?.vacuum ?? 'not-recorded']);
  protected readonly label = computed(() => {
    const label = this.result()?.label;
    return label === undefined || label === 'not-applicable' ? '' : weighInWords.label[label];
  });
  protected readonly cautions = computed(() => (this.result()?.cautions ?? []).map((code) => weighInCautionText(code)));
  protected readonly lines = computed(() => fieldDerivationLines(this.result()?.steps ?? [], this.system()));
}
