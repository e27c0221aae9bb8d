import { ChangeDetectionStrategy, Component, computed, input, output, viewChild, type ElementRef } from '@angular/core';
import { checkPageWords, unitLabel } from '@chargewright/wording';
import type { TypedValue } from '../loose-checks/check-draft';
import { withSignTurned } from './parse-number';

/** One number as a person types it. What stands in it is never rewritten: text and unit leave it as they were typed. */
@Component({
  selector: 'app-number-field',
  templateUrl: './number-field.html',
  styleUrl: './number-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.stale]': 'stale()', '[class.faulty]': 'faulty()' },
})
export class NumberField {
  /** Id of the input, for its label. */
  readonly fieldId = input.required<string>();
  /** Name of what is typed, for the keys beside the input. */
  readonly name = input.required<string>();
  readonly value = input<TypedValue>();
  /** Units offered; the first is that of an empty field. */
  readonly units = input.required<readonly [string, ...string[]]>();
  readonly signed = input(false);
  readonly stale = input(false);
  readonly faulty = input(false);
  /** Ids of what explains the field. */
  readonly describedBy = input('');

  /** Every keystroke. */
  readonly typed = output<TypedValue>();
  /** The person is done with the field. */
  readonly committed = output<void>();
  /** Enter: on to the next field. */
  readonly advanced = output<void>();

  private readonly box = viewChild.required<ElementRef<HTMLInputElement>>('box');

  protected readonly words = checkPageWords.readings;
  protected readonly unitLabel = unitLabel;
  protected readonly text = computed(() => this.value()?.text ?? '');
  protected readonly blank = computed(() => this.text().trim() === '');
  protected readonly unit = computed(() => {
    const units = this.units();
    const unit = this.value()?.unit ?? units[0];
    return this.blank() && !units.includes(unit) ? units[0] : unit;
  });
  /** A typed value keeps its unit when the person switches systems. */
  protected readonly offered = computed(() => {
    const units = this.units();
    return units.includes(this.unit()) ? units : [this.unit(), ...units];
  });
  protected readonly choosesUnit = computed(() => this.units().length > 1);
  protected readonly unitId = computed(() => `${this.fieldId()}-unit`);

  focus(): void {
    this.box().nativeElement.focus();
  }

  protected type(text: string): void {
    this.typed.emit({ text, unit: this.unit() });
  }

  protected chooseUnit(unit: string): void {
    this.typed.emit({ text: this.text(), unit });
    // A blank field stays open, so that the unit chosen first is kept for what follows.
    if (!this.blank()) this.committed.emit();
  }

  protected turnSign(): void {
    this.type(withSignTurned(this.text()));
    this.focus();
  }

  /** Typing replaces what is there, as on an instrument's keypad; a second tap sets the cursor. */
  protected selectAll(): void {
    this.box().nativeElement.select();
  }

  protected advance(): void {
    this.committed.emit();
    this.advanced.emit();
  }
}
