import { atmosphereOf } from './atmosphere';
import type { AtmosphereInput } from './atmosphere';
import type { Fault } from './codes';
import { Faults } from './value-faults';

export interface SiteAtmosphere {
  /** Absolute; null where a fault leaves it open. */
  readonly pressurePa: number | null;
  /** At `elevation` and `stationPressure`. */
  readonly faults: readonly Fault[];
}

/** Air pressure at the site of a look-up: the barometer's where it is given, else that of the standard atmosphere at the elevation, else at sea level. */
export function siteAtmosphere(input: AtmosphereInput): SiteAtmosphere {
  const faults = new Faults();
  const known = faults.atmosphere('', input);
  return { pressurePa: known ? atmosphereOf(input).value : null, faults: faults.list };
}
