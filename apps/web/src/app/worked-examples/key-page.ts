import { ChangeDetectionStrategy, Component, computed, DOCUMENT, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { safetyWords, workedExampleWords } from '@chargewright/wording';
import { NextStepNote } from '../check-a-charge/next-step-note';
import { UnitPreference } from '../quantities/unit-preference';
import { chosenExample } from './chosen-example';
import { DerivationTable } from './derivation-table';
import { keyOf } from './key-of-example';
import { PrintSheet } from './print-sheet';
import { UnknownExample } from './unknown-example';

/** The key of one worked example, on a sheet of its own: answers, math, finding, and what each number is held against. */
@Component({
  selector: 'app-key-page',
  imports: [DerivationTable, NextStepNote, PrintSheet, RouterLink, UnknownExample],
  templateUrl: './key-page.html',
  styleUrls: ['./sheet.scss', './key-page.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KeyPage {
  private readonly units = inject(UnitPreference);
  private readonly window = inject(DOCUMENT).defaultView;

  protected readonly words = workedExampleWords.key;
  protected readonly exampleWords = workedExampleWords.example;
  protected readonly standing = safetyWords.standing;
  protected readonly system = this.units.system;
  protected readonly chosen = chosenExample();
  protected readonly key = computed(() => {
    const chosen = this.chosen();
    return chosen && keyOf(chosen.example, this.system());
  });

  protected print(): void {
    this.window?.print();
  }
}
