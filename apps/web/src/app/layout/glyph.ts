import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** Drawn for this product on a 24 × 24 grid, strokes only. */
const PATHS = {
  chevron: 'M6 9.5l6 6 6-6',
  check: 'M5 12.5l4.5 4.5L19 7.5',
  cross: 'M6.5 6.5l11 11M17.5 6.5l-11 11',
  hand: 'M12 3.5l9.2 16.5H2.8zM12 10v4.5M12 17.2v.4',
  clock: 'M12 3.5a8.5 8.5 0 1 0 .01 0M12 7.5V12l3.2 2',
  grid: 'M5 5h5v5H5zM14 5h5v5h-5zM5 14h5v5H5zM14 14h5v5h-5z',
  probe: 'M10 6a2 2 0 0 1 4 0v8.2a4 4 0 1 1-4 0zM12 9.5v7.5',
  list: 'M4 7h16M4 12h16M4 17h10',
} as const;

export type GlyphName = keyof typeof PATHS;

/** A sign beside a text that says the same: never alone, so readers skip it. */
@Component({
  selector: 'app-glyph',
  template: `<svg viewBox="0 0 24 24" aria-hidden="true" focusable="false"><path [attr.d]="path()" /></svg>`,
  styles: `
    :host {
      display: inline-block;
      width: 1.25em;
      height: 1.25em;
      vertical-align: -0.25em;
      transition: rotate 120ms;
    }
    :host(.turned) {
      rotate: 180deg;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
    path {
      fill: none;
      stroke: currentColor;
      stroke-width: 2;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.turned]': 'turned()' },
})
export class Glyph {
  readonly name = input.required<GlyphName>();
  readonly turned = input(false);

  protected readonly path = computed(() => PATHS[this.name()]);
}
