import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { GivenRow } from '@chargewright/wording';

/** Givens as on paper: a name, the value in the units of the example, and the same in others, softer. */
@Component({
  selector: 'app-givens-table',
  template: `
    <table>
      <caption [textContent]="caption()"></caption>
      <tbody>
        @for (row of rows(); track row.name) {
          <tr>
            <th scope="row">{{ row.name }}</th>
            <td>
              <span>{{ row.own }}</span>
              @if (row.other) {
                &ngsp;<small>{{ row.other }}</small>
              }
            </td>
          </tr>
        }
      </tbody>
    </table>
  `,
  styles: `
    table {
      width: 100%;
      border-collapse: collapse;
    }
    caption {
      padding-bottom: 4px;
      font-weight: 600;
      text-align: start;
    }
    tr {
      border-top: 1px solid var(--line);
    }
    th,
    td {
      padding: 6px 0;
      font-weight: 400;
      text-align: start;
      vertical-align: baseline;
    }
    th {
      padding-inline-end: 12px;
    }
    td {
      text-align: end;
    }
    span {
      font-weight: 600;
    }
    small {
      display: inline-block;
      min-width: 5.5em;
      margin-inline-start: 8px;
      color: var(--soft);
      font-size: 0.875rem;
    }
    @media print {
      th,
      td {
        padding: 1.5pt 0;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GivensTable {
  readonly caption = input.required<string>();
  readonly rows = input.required<readonly GivenRow[]>();
}
