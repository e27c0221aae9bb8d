import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { checkPageWords } from '@chargewright/wording';
import { LooseCheckList } from '../loose-checks/loose-check-list';

/** The checks on this phone, on a page of their own, so that the phone's back key leads home. */
@Component({
  selector: 'app-checks-page',
  imports: [LooseCheckList, RouterLink],
  template: `
    <main id="main">
      <h1 class="seen-by-readers-only">{{ words.product }}</h1>
      <a routerLink="/">{{ words.toTheCheck }}</a>
      <app-loose-check-list (opened)="toTheCheck()" />
    </main>
  `,
  styles: `
    main {
      max-width: 720px;
      margin: 0 auto;
      padding: 0 16px 40px;
    }
    a {
      display: inline-flex;
      align-items: center;
      min-height: 48px;
      color: var(--plum);
      font-weight: 600;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChecksPage {
  private readonly router = inject(Router);

  protected readonly words = checkPageWords.shell;

  protected toTheCheck(): void {
    void this.router.navigateByUrl('/');
  }
}
