import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import type { CheckResult } from '@chargewright/engine';
import { checkPageWords, glanceWords, type UnitSystem } from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import { MathLines } from './math-lines';
import type { ResultSummary } from './result-summary';
import { ToleranceRuler } from './tolerance-ruler';

/** The result within a thumb's reach on a phone. While a field is in use it is one line. */
@Component({
  selector: 'app-result-sheet',
  imports: [Glyph, MathLines, ToleranceRuler],
  templateUrl: './result-sheet.html',
  styleUrl: './result-sheet.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'region',
    '[attr.aria-label]': 'words.title',
    '[class.brief]': 'brief()',
    '[class.open]': 'open() && !brief()',
  },
})
export class ResultSheet {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly summary = input.required<ResultSummary>();
  readonly result = input<CheckResult | null>(null);
  readonly system = input.required<UnitSystem>();
  /** A field is in use. */
  readonly brief = input(false);
  /** Name of the reading that comes next; none when all are there. */
  readonly nextReading = input<string>();
  /** In place of the next reading, while something else comes first. */
  readonly mainButton = input<string>();

  readonly goNext = output<void>();
  readonly mainPressed = output<void>();
  readonly glanced = output<void>();

  protected readonly open = signal(false);

  protected readonly words = checkPageWords.result;
  protected readonly glance = glanceWords;
  protected readonly hasMath = computed(() => this.result() !== null && this.summary().leading !== null);

  constructor() {
    const destroyRef = inject(DestroyRef);
    const page = document.documentElement;
    afterNextRender(() => {
      if (typeof ResizeObserver === 'undefined') return;
      // The page keeps this much room at its end, so that the last field can be scrolled clear of the sheet.
      const observer = new ResizeObserver(() =>
        page.style.setProperty('--sheet-height', `${this.host.nativeElement.offsetHeight}px`),
      );
      observer.observe(this.host.nativeElement);
      destroyRef.onDestroy(() => {
        observer.disconnect();
        page.style.removeProperty('--sheet-height');
      });
    });
  }

  protected toggle(): void {
    this.open.update((open) => !open);
  }
}
