import { ChangeDetectionStrategy, Component, ViewEncapsulation } from '@angular/core';

/**
 * A page that prints onto one sheet of paper, A4 or Letter, in black on white. What belongs to the frame around it, and what is pressed, is left out:
 * the frame is another component's, so these rules are not kept to this one.
 */
@Component({
  selector: 'app-print-sheet',
  template: `<ng-content />`,
  styles: `
    app-print-sheet {
      display: block;
    }
    @media print {
      @page {
        margin: 11mm 14mm;
      }
      html {
        color-scheme: light;
        font-size: 69%;
      }
      body {
        background: #fff;
      }
      app-root > header,
      app-root > .skip,
      app-update-bar,
      app-print-sheet .not-printed {
        /* over whatever its own component says */
        display: none !important;
      }
    }
  `,
  encapsulation: ViewEncapsulation.None,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PrintSheet {}
