import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { checkPageWords } from '@chargewright/wording';

export interface Choice<Value extends string = string> {
  readonly value: Value;
  readonly label: string;
  readonly hint?: string;
}

/** One of a few, each a tap. What is only assumed is outlined and named, not chosen, until the person says so. */
@Component({
  selector: 'app-choice-group',
  template: `
    <fieldset>
      <legend [class.seen-by-readers-only]="legendHidden()">
        {{ legend() }}
        @if (assumed() && !chosen()) {
          <span class="assumed">{{ words.assumed }}</span>
        }
      </legend>
      @if (hint()) {
        <p class="hint">{{ hint() }}</p>
      }
      <div class="choices" [class.stacked]="stacked()" [class.tabled]="tabled()">
        @for (choice of choices(); track choice.value) {
          <label [class.supposed]="!chosen() && choice.value === assumed()">
            <input
              type="radio"
              [name]="name()"
              [value]="choice.value"
              [checked]="choice.value === chosen()"
              (change)="chose.emit(choice.value)"
            />
            <span class="text">
              <span>{{ choice.label }}</span>
              @if (choice.hint) {
                <span class="hint">{{ choice.hint }}</span>
              }
            </span>
          </label>
        }
      </div>
    </fieldset>
  `,
  styleUrl: './choice-group.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceGroup<Value extends string> {
  /** Unique on the page. */
  readonly name = input.required<string>();
  readonly legend = input.required<string>();
  readonly legendHidden = input(false);
  readonly hint = input('');
  readonly choices = input.required<readonly Choice<Value>[]>();
  readonly chosen = input<Value>();
  readonly assumed = input<Value>();
  /** One below the other, where each has a sentence. */
  readonly stacked = input(false);
  /** In equal columns, where the labels are short and many. */
  readonly tabled = input(false);

  readonly chose = output<Value>();

  protected readonly words = checkPageWords.setup;
}
