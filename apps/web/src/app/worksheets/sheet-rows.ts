import { ChangeDetectionStrategy, Component, ElementRef, inject, input, output } from '@angular/core';
import { ReadingRow } from '../check-a-charge/reading-row';
import type { TypedValue } from '../loose-checks/check-draft';
import { goToNextField } from '../quantities/next-field';
import type { SheetRow } from './sheet-fields';

export interface SheetTyped {
  readonly key: string;
  readonly value: TypedValue;
}

/** Fields of a sheet, one below the other. */
@Component({
  selector: 'app-sheet-rows',
  imports: [ReadingRow],
  template: `
    @for (row of rows(); track row.key) {
      <app-reading-row
        [view]="row"
        [optional]="row.optional"
        (typed)="typed.emit({ key: row.key, value: $event })"
        (advanced)="advanceFrom(row.id)"
      />
    }
  `,
  styles: `
    :host {
      display: block;
      overflow: hidden;
      border: 1px solid var(--line);
      border-radius: var(--radius);
      background: var(--sheet);
    }
    app-reading-row + app-reading-row {
      border-top: 1px solid var(--line);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SheetRows {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly rows = input.required<readonly SheetRow[]>();

  readonly typed = output<SheetTyped>();

  protected advanceFrom(id: string): void {
    goToNextField(this.host.nativeElement.closest('main') ?? this.host.nativeElement, id);
  }
}
