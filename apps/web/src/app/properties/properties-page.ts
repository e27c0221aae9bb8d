import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { propertiesWords, safetyWords } from '@chargewright/wording';

/** Two look-ups under one roof. */
@Component({
  selector: 'app-properties-page',
  imports: [RouterLink, RouterLinkActive, RouterOutlet],
  template: `
    <main id="main">
      <h1 tabindex="-1">{{ words.title }}</h1>
      <nav [attr.aria-label]="words.parts">
        <a routerLink="refrigerant" routerLinkActive="here" ariaCurrentWhenActive="page">{{ words.refrigerant }}</a>
        <a routerLink="air" routerLinkActive="here" ariaCurrentWhenActive="page">{{ words.air }}</a>
      </nav>
      <router-outlet />
    </main>
    <footer>{{ standing }}</footer>
  `,
  styleUrl: './properties-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PropertiesPage {
  protected readonly words = propertiesWords;
  protected readonly standing = safetyWords.standing;
}
