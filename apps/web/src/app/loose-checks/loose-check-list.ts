import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  inject,
  Injector,
  output,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { looseChecksWords } from '@chargewright/wording';
import type { CheckSummary } from './check-draft';
import { checkName } from './check-name';
import { LooseChecks } from './loose-checks';
import { StorageNote } from './storage-note';

const TIME = new Intl.DateTimeFormat(undefined, { dateStyle: 'medium', timeStyle: 'short' });

/** The checks on this phone: open one, start a new one, delete with undo. Loaded when it is asked for. */
@Component({
  selector: 'app-loose-check-list',
  imports: [MatButton, StorageNote],
  templateUrl: './loose-check-list.html',
  styleUrl: './loose-check-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LooseCheckList {
  readonly #injector = inject(Injector);
  protected readonly checks = inject(LooseChecks);

  /** A check was opened or started: the page shows it. */
  readonly opened = output<void>();

  protected readonly undoButton = viewChild('undo', { read: MatButton });
  protected readonly words = looseChecksWords;
  protected readonly titleId = 'loose-checks-title';
  protected readonly nameOf = checkName;
  protected readonly timeOf = ({ updatedAt }: CheckSummary): string => TIME.format(new Date(updatedAt));

  protected startNew(): void {
    this.checks.startNew();
    this.opened.emit();
  }

  protected async open({ id }: CheckSummary): Promise<void> {
    await this.checks.open(id);
    this.opened.emit();
  }

  protected async remove({ id }: CheckSummary): Promise<void> {
    await this.checks.remove(id);
    // The pressed button is gone; the one that takes it back is next.
    afterNextRender(() => this.undoButton()?.focus(), { injector: this.#injector });
  }

  protected async undoRemove(): Promise<void> {
    await this.checks.undoRemove();
  }
}
