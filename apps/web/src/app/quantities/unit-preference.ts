import { Injectable, signal } from '@angular/core';
import { UNIT_SYSTEMS, type UnitSystem } from '@chargewright/wording';

const KEY = 'chargewright.units';

function stored(): UnitSystem {
  try {
    const text = localStorage.getItem(KEY);
    return UNIT_SYSTEMS.find((system) => system === text) ?? 'F-psi';
  } catch {
    // The browser forbids storage (private mode, policy): the choice then lasts as long as the page.
    return 'F-psi';
  }
}

/** The units results are shown in and empty fields start with; kept on this phone. */
@Injectable({ providedIn: 'root' })
export class UnitPreference {
  private readonly chosen = signal(stored());
  readonly system = this.chosen.asReadonly();

  choose(system: UnitSystem): void {
    this.chosen.set(system);
    try {
      localStorage.setItem(KEY, system);
    } catch {
      // As above: nothing is lost but the memory of the choice.
    }
  }
}
