import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { NextStep } from '@chargewright/engine';
import { checkPageWords, nextStepLines, type UnitSystem } from '@chargewright/wording';
import { firstSentence } from './first-sentence';

/** What not to do yet, then what to do, then why. */
@Component({
  selector: 'app-next-step-note',
  template: `
    <h2>{{ words.nextStep }}</h2>
    <p>
      @for (line of lines().notYet; track $index) {
        <strong class="not-yet">{{ line }} </strong>
      }
      <strong>{{ title() }}</strong> {{ rest() }}
    </p>
    <p class="why">{{ lines().why }}</p>
  `,
  styleUrl: './next-step-note.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NextStepNote {
  readonly step = input.required<NextStep>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = checkPageWords.result;
  protected readonly lines = computed(() => nextStepLines(this.step(), this.system()));
  protected readonly title = computed(() => firstSentence(this.lines().step));
  protected readonly rest = computed(() => this.lines().step.slice(this.title().length).trim());
}
