import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  input,
  output,
  signal,
} from '@angular/core';
import { checkPageWords } from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import { parseNumber } from '../quantities/parse-number';

/** RA3.2 (2008): readings count after 15 minutes; at 12 one gets ready. */
const READY_AFTER_MIN = 15;
const SOON_AFTER_MIN = 12;

/** How long the system has run since its start or the last adjustment. */
@Component({
  selector: 'app-visit-clock',
  imports: [Glyph],
  templateUrl: './visit-clock.html',
  styleUrl: './visit-clock.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class VisitClock {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  /** Undefined before it was started. */
  readonly minutes = input<number>();

  /** Started so many minutes ago. */
  readonly started = output<number>();
  readonly adjusted = output<void>();

  protected readonly asking = signal(false);
  protected readonly refused = signal(false);

  protected readonly words = checkPageWords.visit;
  protected readonly shell = checkPageWords.shell;
  protected readonly notANumber = checkPageWords.readings.notANumber;
  protected readonly whole = computed(() => {
    const minutes = this.minutes();
    return minutes === undefined ? undefined : Math.floor(minutes);
  });
  protected readonly ready = computed(() => (this.whole() ?? 0) >= READY_AFTER_MIN);
  protected readonly notice = computed(() => {
    const minutes = this.whole() ?? 0;
    if (minutes >= READY_AFTER_MIN) return this.words.counts;
    return minutes >= SOON_AFTER_MIN ? this.words.soon : this.words.toGo(READY_AFTER_MIN - minutes);
  });
  /** Read out when it changes, so not at every minute. */
  protected readonly announcement = computed(() => {
    const minutes = this.whole() ?? 0;
    if (minutes >= READY_AFTER_MIN) return this.words.ready;
    return minutes >= SOON_AFTER_MIN ? this.words.soon : '';
  });

  protected setMinutes(text: string): void {
    const parsed = parseNumber(text);
    const sound = parsed.state === 'number' && parsed.number.value >= 0;
    this.refused.set(!sound);
    if (sound) this.started.emit(parsed.number.value);
  }

  protected ask(): void {
    this.asking.set(true);
    this.focusOnceShown();
  }

  protected keepRunning(): void {
    this.asking.set(false);
    this.focusOnceShown();
  }

  protected adjust(): void {
    this.asking.set(false);
    this.adjusted.emit();
    this.focusOnceShown();
  }

  /** The button pressed gives its place to another. */
  private focusOnceShown(): void {
    const button = () => this.host.nativeElement.querySelector<HTMLElement>('button');
    afterNextRender(() => button()?.focus(), { injector: this.injector });
  }
}
