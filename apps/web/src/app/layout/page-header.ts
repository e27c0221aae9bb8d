import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { checkPageWords, looseChecksWords } from '@chargewright/wording';
import { LooseChecks } from '../loose-checks/loose-checks';
import { BrandMark } from './brand-mark';
import { Glyph } from './glyph';
import { PageMenu } from './page-menu';
import { UnitsChoice } from './units-choice';

/** The frame's upper edge: where one is, the checks on this phone, the units. */
@Component({
  selector: 'app-page-header',
  imports: [BrandMark, Glyph, PageMenu, RouterLink, UnitsChoice],
  template: `
    <a class="home" routerLink="/" [attr.aria-label]="words.home">
      <app-brand-mark />
      <b>{{ words.product }}</b>
    </a>
    <a class="checks" routerLink="/checks" [attr.aria-label]="checksLabel()">
      <app-glyph name="list" />
      @if (count() > 0) {
        <span>{{ count() }}</span>
      }
    </a>
    <app-units-choice />
    @defer (on idle) {
      <app-page-menu />
    } @placeholder {
      <span class="menu-room"></span>
    }
  `,
  styleUrl: './page-header.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PageHeader {
  private readonly checks = inject(LooseChecks);

  protected readonly words = checkPageWords.shell;
  protected readonly count = computed(() => this.checks.list().length);
  protected readonly checksLabel = computed(() => looseChecksWords.openLabel(this.count()));
}
