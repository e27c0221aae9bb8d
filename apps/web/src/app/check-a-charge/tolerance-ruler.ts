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
import type { CriterionResult } from '@chargewright/engine';
import { checkPageWords, criterionParts, formatFigure, rulerText, type UnitSystem } from '@chargewright/wording';
import { isClear, placePair, rulerGeometry, type RulerLabel } from './ruler-geometry';
import { markOf } from './ruler-mark';
import { rulerValues } from './ruler-scale';

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
  protected readonly mark = computed(() => markOf(this.result().finding));
  protected readonly geometry = computed(() => {
    const values = rulerValues(this.result());
    return values && rulerGeometry(values, this.width());
  });
  private readonly parts = computed(() => criterionParts(this.result(), this.system()));
  private readonly figure = computed(() => {
    const { actual } = this.result();
    return actual === null ? '' : formatFigure(actual.kind, actual.value, this.system());
  });
  private readonly plusMinus = computed(() => {
    const { plusMinus } = this.parts();
    return plusMinus === null ? '' : this.words.plusMinus(plusMinus);
  });
  private readonly limits = computed<readonly RulerLabel[]>(() => {
    const { lowBare, highBare, floored } = this.parts();
    const labels = (this.geometry()?.band?.limits ?? []).flatMap(({ x, side }) => {
      const bare = side === 'low' ? lowBare : highBare;
      if (bare === null) return [];
      return [{ x, text: side === 'low' && floored ? this.words.floor(bare) : bare, fontPx: LABEL_PX }];
    });
    const [low, high] = labels;
    return low && high ? placePair(low, high, this.width()) : labels;
  });
  /** The ± stands under its mark if there is room, else beside the value. */
  private readonly plusMinusBelow = computed<readonly RulerLabel[]>(() => {
    const mark = this.geometry()?.mark;
    if (!mark || !this.plusMinus()) return [];
    const label = { x: mark.x, text: this.plusMinus(), fontPx: LABEL_PX };
    return isClear(label, this.limits()) ? [label] : [];
  });
  protected readonly below = computed(() => [...this.limits(), ...this.plusMinusBelow()]);
  protected readonly above = computed<readonly RulerLabel[]>(() => {
    const { mark = null, target = null } = this.geometry() ?? {};
    const { actual, targetBare } = this.parts();
    const text = this.plusMinusBelow().length > 0 ? actual : `${this.figure()} ${this.plusMinus()}`;
    const value = mark && text ? { x: mark.x, text, fontPx: VALUE_PX } : null;
    const aim =
      target !== null && targetBare ? { x: target, text: this.words.target(targetBare), fontPx: LABEL_PX } : null;
    if (value && aim) return placePair(value, aim, this.width());
    return [value, aim].filter((label) => label !== null);
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
