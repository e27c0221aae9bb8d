import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  signal,
} from '@angular/core';
import type { CriterionResult, Finding } from '@chargewright/engine';
import { checkPageWords, criterionParts, rulerText, type UnitSystem } from '@chargewright/wording';
import { placeLabels, rulerGeometry, type RulerLabel } from './ruler-geometry';
import { rulerValues } from './ruler-scale';

export type RulerMark = 'diamond' | 'circle' | 'hollow' | 'dash';

/** Shape carries the finding; colour only supports it. */
const MARKS: Readonly<Record<Finding, RulerMark>> = {
  above: 'diamond',
  below: 'diamond',
  within: 'circle',
  'too-close-to-call': 'hollow',
  'not-verifiable': 'dash',
  'not-judged': 'dash',
};

const VALUE_PX = 16;
const LABEL_PX = 13;

/** One straight scale: band, target, measured mark and its uncertainty. Drawn in px of its own width, so that its text keeps its size. */
@Component({
  selector: 'app-tolerance-ruler',
  templateUrl: './tolerance-ruler.html',
  styleUrl: './tolerance-ruler.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ToleranceRuler {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly result = input.required<CriterionResult>();
  readonly system = input.required<UnitSystem>();

  protected readonly width = signal(358);

  protected readonly words = checkPageWords.ruler;
  protected readonly text = computed(() => rulerText(this.result(), this.system()));
  protected readonly mark = computed(() => MARKS[this.result().finding]);
  protected readonly geometry = computed(() => {
    const values = rulerValues(this.result());
    return values && rulerGeometry(values, this.width());
  });
  private readonly parts = computed(() => criterionParts(this.result(), this.system()));
  private readonly plusMinus = computed(() => {
    const { plusMinus } = this.parts();
    return plusMinus === null ? '' : this.words.plusMinus(plusMinus);
  });
  /** Below the axis: the limits first, then the ± under its mark if there is room. */
  protected readonly below = computed<readonly RulerLabel[]>(() => {
    const { band, mark } = this.geometry() ?? {};
    const { lowBare, highBare, floored } = this.parts();
    const limits = (band?.limits ?? []).flatMap(({ x, side }) => {
      const bare = side === 'low' ? lowBare : highBare;
      if (bare === null) return [];
      return [{ x, text: side === 'low' && floored ? this.words.floor(bare) : bare, fontPx: LABEL_PX }];
    });
    const plusMinus = this.plusMinus();
    const under = mark && plusMinus ? [{ x: mark.x, text: plusMinus, fontPx: LABEL_PX, fixed: true }] : [];
    return placeLabels([...limits, ...under], this.width());
  });
  /** Above the axis: the value first, with its ± where that found no room below; the target gives way. */
  protected readonly above = computed<readonly RulerLabel[]>(() => {
    const { mark, target } = this.geometry() ?? {};
    const { actual, actualBare, targetBare } = this.parts();
    const isBelow = this.below().some(({ text }) => text === this.plusMinus());
    const value = isBelow ? actual : `${actualBare} ${this.plusMinus()}`;
    return placeLabels(
      [
        ...(mark && value ? [{ x: mark.x, text: value, fontPx: VALUE_PX }] : []),
        ...(typeof target === 'number' && targetBare
          ? [{ x: target, text: this.words.target(targetBare), fontPx: LABEL_PX }]
          : []),
      ],
      this.width(),
    );
  });

  constructor() {
    const destroyRef = inject(DestroyRef);
    afterNextRender(() => {
      if (typeof ResizeObserver === 'undefined') return;
      const observer = new ResizeObserver(([entry]) => {
        const width = Math.round(entry?.contentRect.width ?? 0);
        if (width > 0) this.width.set(width);
      });
      observer.observe(this.host.nativeElement);
      destroyRef.onDestroy(() => observer.disconnect());
    });
  }

  protected isValue({ fontPx }: RulerLabel): boolean {
    return fontPx === VALUE_PX;
  }
}
