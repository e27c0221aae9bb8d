import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { workedExampleWords } from '@chargewright/wording';

/** An address without an example: a mistyped link, or one from another version. */
@Component({
  selector: 'app-unknown-example',
  imports: [RouterLink],
  template: `
    <h1 tabindex="-1">{{ words.unknownTitle }}</h1>
    <p>{{ words.unknown }}</p>
    <a class="button" routerLink="/examples">{{ words.toTheList }}</a>
  `,
  styles: `
    h1 {
      font-size: 1.5rem;
    }
    .button {
      display: inline-flex;
      align-items: center;
      margin-top: 12px;
      color: inherit;
      text-decoration: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UnknownExample {
  protected readonly words = workedExampleWords.example;
}
