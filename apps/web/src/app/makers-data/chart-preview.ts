import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { MakersChartInput } from '@chargewright/engine';
import { makersChartWords, makersDataWords, unitLabel } from '@chargewright/wording';
import { chartPicture } from './chart-picture';

/** The table as a picture: what goes the wrong way is seen before it is read. */
@Component({
  selector: 'app-chart-preview',
  template: `
    @if (picture(); as at) {
      <svg role="img" [attr.aria-label]="text()" [attr.viewBox]="'0 0 ' + at.width + ' ' + at.height">
        @for (mark of at.up; track mark.at) {
          <line class="grid" x1="40" [attr.x2]="at.width - 40" [attr.y1]="mark.at" [attr.y2]="mark.at" />
          <text x="34" [attr.y]="mark.at + 4" text-anchor="end">{{ mark.text }}</text>
        }
        @for (mark of at.across; track mark.at) {
          <text [attr.x]="mark.at" [attr.y]="at.height - 6" text-anchor="middle">{{ mark.text }}</text>
        }
        @for (drawn of at.lines; track $index) {
          <path [attr.d]="drawn.path" />
          <text class="name" [attr.x]="drawn.end.x + 6" [attr.y]="drawn.end.y + 4">{{ drawn.name }}</text>
        }
        @for (point of at.points; track $index) {
          <circle [attr.cx]="point.x" [attr.cy]="point.y" r="2.5" />
        }
      </svg>
      <p>{{ axes() }}</p>
    }
  `,
  styles: `
    svg {
      display: block;
      width: 100%;
      max-width: 560px;
    }
    .grid {
      stroke: var(--line);
    }
    path {
      fill: none;
      stroke: var(--plum);
      stroke-width: 2;
    }
    circle {
      fill: var(--ink);
    }
    text {
      fill: var(--soft);
      font-size: 12px;
    }
    .name {
      fill: var(--ink);
      font-weight: 600;
    }
    p {
      color: var(--soft);
      font-size: 0.9375rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChartPreview {
  readonly chart = input.required<MakersChartInput>();
  readonly acrossName = input.required<string>();
  readonly columnName = input('');

  protected readonly picture = computed(() => chartPicture(this.chart()));
  protected readonly text = computed(() => {
    const { kind, rows, columns, cells } = this.chart();
    const dashes = cells.flat().filter((cell) => cell === null).length;
    const width = columns?.values.length ?? 1;
    return makersDataWords.previewText(makersChartWords.kinds[kind].label, rows?.values.length ?? 1, width, dashes);
  });
  protected readonly axes = computed(() => {
    const { rows, columns, unit } = this.chart();
    const names = [`${makersDataWords.target}, ${unitLabel(unit)}`];
    if (rows) names.push(`${this.acrossName()}, ${unitLabel(rows.unit)}`);
    if (columns) names.push(`${this.columnName()}, ${unitLabel(columns.unit)}`);
    return names.join(' · ');
  });
}
