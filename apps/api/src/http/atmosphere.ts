import type { ProblemError } from '@chargewright/contract/problem';
import { attempt, lengthToM, standardAtmospherePressurePa } from '@chargewright/engine';
import type { Amount, LengthUnit } from '@chargewright/engine';
import { lookUpFaultText } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';

export type Atmosphere =
  { readonly ok: true; readonly pressurePa: number } | { readonly ok: false; readonly errors: readonly ProblemError[] };

/** The air pressure (Pa) of a look-up's elevation, sea level when it gives none. */
export function atmosphereAt(elevation: Amount<LengthUnit> | undefined, system: UnitSystem): Atmosphere {
  const elevationM = elevation === undefined ? 0 : lengthToM(elevation.value, elevation.unit);
  const result = attempt(() => standardAtmospherePressurePa(elevationM));
  if (result.ok) return { ok: true, pressurePa: result.value };
  const { min = -Infinity, max = Infinity } = result.error.details;
  const figures = {
    actual: { kind: 'lengthM', value: elevationM },
    least: { kind: 'lengthM', value: min },
    most: { kind: 'lengthM', value: max },
  } as const;
  const message = lookUpFaultText({ code: 'elevation-outside-range', figures }, system);
  return { ok: false, errors: [{ path: 'elevation', message }] };
}
