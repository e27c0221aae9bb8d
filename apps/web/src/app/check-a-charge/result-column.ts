import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { RouterLink } from '@angular/router';
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
import { pathOfPlace } from './next-step-place';
import { OwnersNote } from './owners-note';
import type { ResultSummary } from './result-summary';

/** The whole result: stops, the sentence, the next step, what to keep in mind, and each criterion. */
@Component({
  selector: 'app-result-column',
  imports: [CriterionCard, Glyph, NextStepNote, NgTemplateOutlet, OwnersNote, RouterLink],
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
  /** A page where the next step is done. */
  protected readonly page = computed(() => {
    const { place } = this.summary();
    const path = pathOfPlace(place);
    return place && path === null ? null : place && { path, label: checkPageWords.result.placeButton[place.view] };
  });
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
