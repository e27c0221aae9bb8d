import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { checkPageWords, UNIT_SYSTEMS, type UnitSystem } from '@chargewright/wording';
import { UnitPreference } from '../quantities/unit-preference';

/** The units results are shown in. What was typed keeps its own. */
@Component({
  selector: 'app-units-choice',
  template: `
    <label>
      <span class="seen-by-readers-only">{{ words.choose }}</span>
      <select #box [value]="preference.system()" (change)="choose(box.value)">
        @for (system of systems; track system) {
          <option [value]="system" [selected]="system === preference.system()">{{ words.button(system) }}</option>
        }
      </select>
    </label>
  `,
  styles: `
    select {
      min-height: 48px;
      padding: 0 14px;
      border: 1px solid var(--edge);
      border-radius: 999px;
      background: var(--sheet);
      font-size: 0.9375rem;
      appearance: none;
      cursor: pointer;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UnitsChoice {
  protected readonly preference = inject(UnitPreference);

  protected readonly words = checkPageWords.units;
  protected readonly systems = UNIT_SYSTEMS;

  protected choose(text: string): void {
    const system = UNIT_SYSTEMS.find((each): each is UnitSystem => each === text);
    if (system) this.preference.choose(system);
  }
}
