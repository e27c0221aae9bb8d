import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { pageMenuWords } from '@chargewright/wording';
import { Glyph } from './glyph';

/** The way to the other pages. The browser's own popover closes on Escape and on a tap beside it. */
@Component({
  selector: 'app-page-menu',
  imports: [Glyph, RouterLink, RouterLinkActive],
  templateUrl: './page-menu.html',
  styleUrl: './page-menu.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PageMenu {
  protected readonly words = pageMenuWords;
  protected readonly pages = [
    { path: '/', ...pageMenuWords.check },
    { path: '/airflow', ...pageMenuWords.airflow },
    { path: '/weigh-in', ...pageMenuWords.weighIn },
    { path: '/properties', ...pageMenuWords.properties },
    { path: '/examples', ...pageMenuWords.examples },
    { path: '/sources', ...pageMenuWords.sources },
  ] as const;
}
