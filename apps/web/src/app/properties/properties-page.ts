import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { propertiesWords, safetyWords } from '@chargewright/wording';

/** Two look-ups under one roof. */
@Component({
  selector: 'app-properties-page',
  imports: [RouterOutlet],
  template: `
    <main id="main">
      <h1 tabindex="-1">{{ words.title }}</h1>
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
