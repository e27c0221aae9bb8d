import { ChangeDetectionStrategy, Component, computed, inject, input, output, signal } from '@angular/core';
import { checkPageWords, readingWords } from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import type { TypedValue } from '../loose-checks/check-draft';
import { NumberField } from '../quantities/number-field';
import { ReadingHelpTexts } from './reading-help-texts';
import type { RowView } from './reading-rows';

/** One field with its name, where its value comes from, what is wrong with it, and how to take it. */
@Component({
  selector: 'app-reading-row',
  imports: [Glyph, NumberField],
  templateUrl: './reading-row.html',
  styleUrl: './reading-row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReadingRow {
  private readonly helpTexts = inject(ReadingHelpTexts);

  readonly view = input.required<RowView>();
  readonly optional = input(false);

  readonly typed = output<TypedValue>();
  readonly committed = output<void>();
  readonly advanced = output<void>();

  protected readonly open = signal(false);

  protected readonly words = checkPageWords.readings;
  protected readonly noteId = computed(() => `${this.view().id}-note`);
  protected readonly helpId = computed(() => `${this.view().id}-help`);
  protected readonly complaintId = computed(() => `${this.view().id}-complaint`);
  protected readonly describedBy = computed(() =>
    this.view().complaints.length > 0 ? `${this.complaintId()} ${this.noteId()}` : this.noteId(),
  );

  protected readonly place = computed(() => {
    const { reading } = this.view();
    return reading && readingWords[reading].place;
  });
  protected readonly help = computed(() => {
    const { reading } = this.view();
    return reading && this.helpTexts.texts()?.[reading];
  });

  protected toggleHelp(): void {
    void this.helpTexts.load();
    this.open.update((open) => !open);
  }
}
