import { Injectable } from '@angular/core';
import type { TypedValue } from '../loose-checks/check-draft';

const KEY = 'chargewright.elevation';

/** The elevation typed last: most of a technician's sites lie at one height, so it is asked once. Kept on this phone. */
@Injectable({ providedIn: 'root' })
export class RememberedElevation {
  recall(): TypedValue | undefined {
    try {
      const { text, unit } = JSON.parse(localStorage.getItem(KEY) ?? '{}') as Partial<TypedValue>;
      return typeof text === 'string' && typeof unit === 'string' && text.trim() !== '' ? { text, unit } : undefined;
    } catch {
      // Storage forbidden or its content damaged: the elevation is asked again.
      return undefined;
    }
  }

  remember(elevation: TypedValue): void {
    try {
      localStorage.setItem(KEY, JSON.stringify({ text: elevation.text, unit: elevation.unit }));
    } catch {
      // Storage forbidden: the elevation is asked again on the next check.
    }
  }
}
