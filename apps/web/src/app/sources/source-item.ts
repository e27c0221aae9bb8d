import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { sourcesWords } from '@chargewright/wording';
import { MathText } from '../check-a-charge/math-text';
import type { SourceRow } from './source-rows';

/** One entry: what it is, on what it stands, where it is from and where it is used. */
@Component({
  selector: 'app-source-item',
  imports: [MathText, RouterLink],
  template: `
    <div class="what">
      <p class="name">{{ row().name }}</p>
      @if (row().value) {
        <p>
          <b>{{ row().value }}</b>
          @if (row().printed) {
            <small>{{ words.printed(row().printed) }}</small>
          }
        </p>
      }
      @if (row().text) {
        <p class="text" [class.formula]="row().isFormula">
          @if (row().isFormula) {
            <app-math-text [text]="row().text" />
          } @else {
            {{ row().text }}
          }
        </p>
      }
    </div>
    <div class="whence">
      <p>
        <span class="standing" [class.weak]="row().standing === 'memory'">{{ words.standings[row().standing] }}</span>
      </p>
      @for (citation of row().citations; track citation.text) {
        <p class="source">
          {{ citation.text }}
          @if (citation.edition) {
            <small>{{ citation.edition }}</small>
          }
        </p>
      }
      <p class="used">
        <span>{{ words.usedIn }}</span>
        @for (place of row().places; track place.path) {
          <a [routerLink]="place.path">{{ place.name }}</a>
        }
        @if (row().procedures) {
          <span>{{ row().procedures }}</span>
        }
      </p>
    </div>
  `,
  styleUrl: './source-item.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SourceItem {
  readonly row = input.required<SourceRow>();

  protected readonly words = sourcesWords;
}
