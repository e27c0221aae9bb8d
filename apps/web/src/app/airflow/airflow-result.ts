import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { isKnown } from '@chargewright/engine';
import type { AirflowResult as Result } from '@chargewright/engine';
import {
  airflowCautionText,
  airflowPageWords,
  airflowReasonText,
  fieldDerivationLines,
  worksheetWords,
  type UnitSystem,
} from '@chargewright/wording';
import { shownFigure } from '../worksheets/figure-list';
import { MathFold } from '../worksheets/math-fold';

/** The airflow with its ±, in the ways the trade states it, and what it rests on. */
@Component({
  selector: 'app-airflow-result',
  imports: [MathFold],
  templateUrl: './airflow-result.html',
  styleUrl: '../worksheets/sheet-result.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AirflowResult {
  readonly result = input.required<Result | null>();
  readonly system = input.required<UnitSystem>();
  /** The person said that the blower ran at its cooling speed. */
  readonly atCoolingSpeed = input.required<boolean>();

  readonly used = output<void>();

  protected readonly words = airflowPageWords.result;
  protected readonly sheetWords = worksheetWords;
  protected readonly reason = computed(() => {
    const reason = this.result()?.reason;
    return reason ? airflowReasonText(reason) : '';
  });
  protected readonly main = computed(() => {
    const result = this.result();
    if (!result) return undefined;
    const { statedIn, airflow, airflowAsFound } = result;
    const note = this.words.statedIn[statedIn];
    return (
      shownFigure('', airflow, this.system(), { note }) ??
      shownFigure('', airflowAsFound, this.system(), { note: `${note}, ${this.words.asFound}` })
    );
  });
  protected readonly hasFigures = computed(() => this.main() !== undefined);
  protected readonly others = computed(() => {
    const result = this.result();
    if (!result) return [];
    const { perCapacity, standardAirflow, statedIn } = result;
    return [
      shownFigure(this.words.perCapacity, perCapacity, this.system()),
      ...(statedIn === 'standard' ? [] : [shownFigure(this.words.standard, standardAirflow, this.system())]),
    ].filter((figure) => figure !== undefined);
  });
  /** While something is missing, only that is said. */
  protected readonly cautions = computed(() =>
    this.hasFigures() ? (this.result()?.cautions ?? []).map((code) => airflowCautionText(code)) : [],
  );
  protected readonly lines = computed(() => fieldDerivationLines(this.result()?.steps ?? [], this.system()));
  private readonly counts = computed(() => {
    const result = this.result();
    return result !== null && isKnown(result.airflow);
  });
  protected readonly canUse = computed(() => this.counts() && this.atCoolingSpeed());
  protected readonly mustSaySpeed = computed(() => this.counts() && !this.atCoolingSpeed());
}
