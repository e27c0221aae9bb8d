import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { TypedValue } from '../loose-checks/check-draft';
import { NumberField } from '../quantities/number-field';

/** A number to type, with its name, a note and what is wrong with it. */
@Component({
  selector: 'app-value-row',
  imports: [NumberField],
  template: `
    <div class="line">
      <div>
        <label [for]="fieldId()" [class.seen-by-readers-only]="labelHidden()">{{ label() }}</label>
        <ng-content />
        @if (note()) {
          <span class="note" [id]="noteId()">{{ note() }}</span>
        }
      </div>
      <app-number-field
        [fieldId]="fieldId()"
        [name]="label()"
        [value]="value()"
        [units]="units()"
        [signed]="signed()"
        [faulty]="complaint() !== ''"
        [describedBy]="describedBy()"
        (typed)="typed.emit($event)"
        (committed)="committed.emit()"
      />
    </div>
    @if (complaint()) {
      <p class="complaint" [id]="complaintId()">{{ complaint() }}</p>
    }
  `,
  styleUrl: './value-row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ValueRow {
  readonly fieldId = input.required<string>();
  readonly label = input.required<string>();
  /** Where what is projected in its place says the same. */
  readonly labelHidden = input(false);
  readonly note = input('');
  readonly value = input<TypedValue>();
  readonly units = input.required<readonly [string, ...string[]]>();
  readonly signed = input(false);
  /** Empty when nothing is wrong. */
  readonly complaint = input('');

  readonly typed = output<TypedValue>();
  readonly committed = output<void>();

  protected readonly noteId = computed(() => `${this.fieldId()}-note`);
  protected readonly complaintId = computed(() => `${this.fieldId()}-complaint`);
  protected readonly describedBy = computed(() =>
    [this.complaint() && this.complaintId(), this.note() && this.noteId()].filter(Boolean).join(' '),
  );
}
