import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** `T_dew(p)` as on paper: what follows an underscore stands low. */
@Component({
  selector: 'app-math-text',
  template: `
    @for (part of parts(); track $index) {
      @if (part.low) {
        <sub>{{ part.text }}</sub>
      } @else {
        <span>{{ part.text }}</span>
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MathText {
  readonly text = input.required<string>();

  protected readonly parts = computed(() =>
    this.text()
      .split(/_(\w+)/)
      .map((text, index) => ({ text, low: index % 2 === 1 }))
      .filter(({ text }) => text !== ''),
  );
}
