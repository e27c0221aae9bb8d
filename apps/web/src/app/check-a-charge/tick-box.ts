import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';

/** One thing that is so or not, with its box as large as a thumb. */
@Component({
  selector: 'app-tick-box',
  template: `
    <label>
      <input #box type="checkbox" [checked]="checked()" (change)="changed.emit(box.checked)" />
      <span>
        {{ label() }}
        @if (hint()) {
          <small>{{ hint() }}</small>
        }
      </span>
    </label>
  `,
  styles: `
    label {
      display: flex;
      align-items: center;
      min-height: 48px;
      gap: 12px;
      cursor: pointer;
    }
    input {
      flex: none;
      width: 24px;
      height: 24px;
      accent-color: var(--plum);
    }
    small {
      display: block;
      color: var(--soft);
      font-size: 0.875rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TickBox {
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly checked = input.required<boolean>();

  readonly changed = output<boolean>();
}
