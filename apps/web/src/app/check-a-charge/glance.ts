import { DOCUMENT } from '@angular/common';
import type { ElementRef } from '@angular/core';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  afterNextRender,
  inject,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import type { CheckResult, CriterionResult } from '@chargewright/engine';
import { criterionName, criterionParts, findingWord, glanceWords, type UnitSystem } from '@chargewright/wording';
import { FindingMark } from './finding-mark';
import { keepAwake } from './keep-awake';
import type { ResultSummary } from './result-summary';

/** One number over the whole screen: for one hand, at arm's length, with the other on a valve. It follows the readings while it is open. */
@Component({
  selector: 'app-glance',
  imports: [FindingMark],
  templateUrl: './glance.html',
  styleUrl: './glance.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Glance {
  readonly result = input.required<CheckResult>();
  readonly summary = input.required<ResultSummary>();
  readonly system = input.required<UnitSystem>();

  readonly closed = output<void>();

  private readonly dialog = viewChild.required<ElementRef<HTMLDialogElement>>('dialog');
  /** By name, so that a new reading does not change which number is looked at. */
  private readonly chosen = signal<string | undefined>(undefined);

  protected readonly words = glanceWords;
  protected readonly awake = signal(false);
  /** What decides comes first. */
  private readonly numbers = computed<readonly CriterionResult[]>(() => {
    const { leading } = this.summary();
    const others = this.result().criteria.filter(({ actual, criterion }) => actual && criterion !== leading?.criterion);
    return leading === null || leading.actual === null ? others : [leading, ...others];
  });
  protected readonly several = computed(() => this.numbers().length > 1);
  private readonly shown = computed(
    () => this.numbers().find(({ criterion }) => criterion === this.chosen()) ?? this.numbers()[0],
  );
  protected readonly view = computed(() => {
    const shown = this.shown();
    if (!shown) return null;
    const parts = criterionParts(shown, this.system());
    return {
      name: criterionName(shown.criterion),
      number: parts.actualBare ?? '',
      unit: parts.actual?.slice(parts.actualBare?.length ?? 0).trim() ?? '',
      plusMinus: parts.plusMinus,
      target: parts.target,
      finding: shown.finding,
      word: findingWord(shown.finding, shown.criterion),
    };
  });

  constructor() {
    const release = keepAwake(inject(DOCUMENT), this.awake);
    inject(DestroyRef).onDestroy(release);
    afterNextRender(() => this.dialog().nativeElement.showModal());
  }

  protected showNext(): void {
    const numbers = this.numbers();
    const at = numbers.findIndex(({ criterion }) => criterion === this.shown()?.criterion);
    this.chosen.set(numbers[(at + 1) % numbers.length]?.criterion);
  }
}
