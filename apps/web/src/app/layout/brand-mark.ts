import { ChangeDetectionStrategy, Component } from '@angular/core';

/** A mark above its tolerance band: what the product draws. */
@Component({
  selector: 'app-brand-mark',
  template: `
    <svg viewBox="0 0 28 28" width="28" height="28" aria-hidden="true" focusable="false">
      <rect x="1" y="1" width="26" height="26" rx="7" fill="var(--plum)" />
      <path d="M4 17.5h20" stroke="var(--on-plum)" stroke-width="1.6" stroke-linecap="round" />
      <rect x="8" y="14" width="12" height="7" rx="1.5" fill="var(--on-plum)" opacity="0.4" />
      <path d="M14 6.2l4.2 4.2-4.2 4.2-4.2-4.2z" fill="var(--on-plum)" />
    </svg>
  `,
  styles: `
    :host {
      display: block;
      line-height: 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BrandMark {}
