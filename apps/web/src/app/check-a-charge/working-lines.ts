import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { checkPageWords, type DerivationLine } from '@chargewright/wording';
import { MathText } from './math-text';

/** A derivation in the order a person would write it on paper. */
@Component({
  selector: 'app-working-lines',
  imports: [MathText, RouterLink],
  template: `
    @for (line of lines(); track line.id) {
      <dl>
        <dt>{{ line.name }}</dt>
        <dd class="formula"><app-math-text [text]="line.formula" /></dd>
        <dd class="working"><app-math-text [text]="'= ' + line.substitution" /></dd>
        <dd class="value">= {{ line.result }}</dd>
      </dl>
    } @empty {
      <p>{{ words.empty }}</p>
    }
    @if (sources()) {
      <p class="sources">
        <a routerLink="/sources">{{ resultWords.sources }}</a>: {{ sources() }}
      </p>
    }
  `,
  styleUrl: './math-lines.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WorkingLines {
  readonly lines = input.required<readonly DerivationLine[]>();

  protected readonly words = checkPageWords.math;
  protected readonly resultWords = checkPageWords.result;
  protected readonly sources = computed(() => [...new Set(this.lines().map(({ source }) => source))].join(' · '));
}
