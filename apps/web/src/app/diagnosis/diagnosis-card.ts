import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { diagnoseCheck, type CauseFinding, type CheckInput, type CheckResult } from '@chargewright/engine';
import {
  causeText,
  diagnosisNoteText,
  evidenceText,
  measurementText,
  separatingTestWords,
  type UnitSystem,
} from '@chargewright/wording';
import type { StepPlace } from '../check-a-charge/next-step-place';
import { Glyph } from '../layout/glyph';
import { MEASUREMENT_PLACES } from './measurement-places';

/** Causes to check, each with what speaks for and against it and what would tell; never ranked. */
@Component({
  selector: 'app-diagnosis-card',
  imports: [Glyph],
  templateUrl: './diagnosis-card.html',
  styleUrl: './diagnosis-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DiagnosisCard {
  readonly input = input.required<CheckInput>();
  readonly result = input.required<CheckResult>();
  readonly system = input.required<UnitSystem>();

  readonly went = output<StepPlace>();

  protected readonly words = separatingTestWords;
  private readonly diagnosis = computed(() => diagnoseCheck(this.input(), this.result()));
  protected readonly notes = computed(() => this.diagnosis().notes.map((note) => diagnosisNoteText(note)));
  protected readonly causes = computed(() => this.diagnosis().causes.map((finding) => this.viewOf(finding)));

  private viewOf({ cause, fits, doesNotFit, nextMeasurement }: CauseFinding) {
    const system = this.system();
    return {
      cause,
      name: causeText(cause),
      fits: fits.map((evidence) => evidenceText(evidence, system)),
      doesNotFit: doesNotFit.map((evidence) => evidenceText(evidence, system)),
      next: nextMeasurement && measurementText(nextMeasurement),
      place: nextMeasurement && MEASUREMENT_PLACES[nextMeasurement],
    };
  }
}
