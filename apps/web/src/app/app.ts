import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { checkPageWords } from '@chargewright/wording';
import { PageHeader } from './layout/page-header';
import { Install } from './offline/install';
import { UpdateBar } from './offline/update-bar';

/** The frame around every page. */
@Component({
  selector: 'app-root',
  imports: [PageHeader, RouterOutlet, UpdateBar],
  template: `
    <button type="button" class="skip" (click)="skip()">{{ words.skip }}</button>
    @defer (on idle) {
      <app-update-bar />
    }
    <header><app-page-header /></header>
    <router-outlet />
  `,
  styles: `
    .skip {
      position: absolute;
      z-index: 10;
      inset: 8px auto auto 8px;
      min-height: 48px;
      padding: 0 16px;
      border: 2px solid var(--plum);
      border-radius: 12px;
      background: var(--sheet);
      translate: 0 -200%;
    }
    .skip:focus {
      translate: 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {
  protected readonly words = checkPageWords.shell;

  constructor() {
    // The browser offers the installation once, before the button that asks for it is loaded.
    inject(Install);
  }

  /** A link to a fragment would go through the page's base and load it anew. */
  protected skip(): void {
    const main = document.getElementById('main');
    main?.setAttribute('tabindex', '-1');
    main?.focus();
  }
}
