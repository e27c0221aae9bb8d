import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { CheckInput, CheckResult } from '@chargewright/engine';
import {
  cautionText,
  checkPageWords,
  glanceWords,
  safetyWords,
  stopText,
  type UnitSystem,
} from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import { CriterionCard } from './criterion-card';
import { NextStepNote } from './next-step-note';
import { OwnersNote } from './owners-note';
import type { ResultSummary } from './result-summary';

/** The whole result: stops, the sentence, the next step, what to keep in mind, and each criterion. */
@Component({
  selector: 'app-result-column',
  imports: [CriterionCard, Glyph, NextStepNote, OwnersNote],
  templateUrl: './result-column.html',
  styleUrl: './result-column.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResultColumn {
  readonly input = input.required<CheckInput>();
  readonly summary = input.required<ResultSummary>();
  readonly result = input.required<CheckResult>();
  readonly system = input.required<UnitSystem>();
  readonly hasReadings = input.required<boolean>();

  readonly glanced = output<void>();

  protected readonly words = checkPageWords.result;
  protected readonly glance = glanceWords;
  protected readonly limits = safetyWords.limits;
  protected readonly stops = computed(() =>
    this.result().overall.stops.map((stop) => ({ code: stop.code, text: stopText(stop, this.system()) })),
  );
  protected readonly cautions = computed(() =>
    this.result().overall.cautions.map((caution) => cautionText(caution, this.system())),
  );
  /** The record of conditions is a criterion of the procedure; it is shown once it has something to say. */
  protected readonly criteria = computed(() =>
    this.result().criteria.filter(
      ({ required, actual, finding }) => required || actual !== null || finding !== 'not-judged',
    ),
  );
}
