import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Finding } from '@chargewright/engine';
import { markOf } from './ruler-mark';

/** The ruler's mark beside words: the same shape means the same everywhere. */
@Component({
  selector: 'app-finding-mark',
  template: `
    <svg viewBox="-12 -12 24 24" aria-hidden="true" focusable="false" [class]="mark()">
      @switch (mark()) {
        @case ('diamond') {
          <path d="M0-10L10 0 0 10-10 0z" />
        }
        @case ('circle') {
          <circle r="8.5" />
        }
        @case ('hollow') {
          <circle class="open" r="7.5" />
        }
        @case ('dash') {
          <rect x="-11" y="-3.5" width="22" height="7" rx="2" />
        }
      }
    </svg>
  `,
  styles: `
    svg {
      width: 1em;
      height: 1em;
      vertical-align: -0.12em;
      fill: var(--plum);
    }
    .diamond {
      fill: var(--brass);
    }
    .dash {
      fill: var(--soft);
    }
    .open {
      fill: none;
      stroke: var(--plum);
      stroke-width: 3.5;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FindingMark {
  readonly finding = input.required<Finding>();

  protected readonly mark = computed(() => markOf(this.finding()));
}
