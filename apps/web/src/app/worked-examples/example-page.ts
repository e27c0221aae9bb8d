import { ChangeDetectionStrategy, Component, computed, DOCUMENT, inject } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { WORKED_EXAMPLES } from '@chargewright/engine/training';
import { safetyWords, workedExampleWords } from '@chargewright/wording';
import { LooseChecks } from '../loose-checks/loose-checks';
import { NOW } from '../loose-checks/time-and-ids';
import { UnitPreference } from '../quantities/unit-preference';
import { checkOfExample } from './check-of-example';
import { chosenExample } from './chosen-example';
import { givensOf } from './example-givens';
import { GivensTable } from './givens-table';
import { PrintSheet } from './print-sheet';
import { UnknownExample } from './unknown-example';

/** One worked example as it is set: what is given and what is asked, on one sheet. The key is a page of its own. */
@Component({
  selector: 'app-example-page',
  imports: [GivensTable, PrintSheet, RouterLink, UnknownExample],
  templateUrl: './example-page.html',
  styleUrls: ['./sheet.scss', './example-page.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ExamplePage {
  private readonly router = inject(Router);
  private readonly checks = inject(LooseChecks);
  private readonly units = inject(UnitPreference);
  private readonly now = inject(NOW);
  private readonly window = inject(DOCUMENT).defaultView;

  protected readonly words = workedExampleWords.example;
  protected readonly pages = { 'moist-air': '/properties/air', 'weigh-in': '/weigh-in' } as const;
  protected readonly standing = safetyWords.standing;
  protected readonly count = WORKED_EXAMPLES.length;
  protected readonly chosen = chosenExample();
  protected readonly givens = computed(() => {
    const chosen = this.chosen();
    return chosen === undefined ? [] : givensOf(chosen.example, this.units.system());
  });

  /** Into a check of its own, so that nothing of the person's is touched. */
  protected async openCheck(): Promise<void> {
    const example = this.chosen()?.example;
    if (example?.kind !== 'check') return;
    this.checks.fillWithExample(checkOfExample(example, this.now().getTime()));
    await this.router.navigateByUrl('/');
  }

  protected print(): void {
    this.window?.print();
  }
}
