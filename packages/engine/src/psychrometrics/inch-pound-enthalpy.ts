/**
 * Moist air from an enthalpy in Btu/lb. The inch-pound datum is dry air at 0 °F and eq. 30 IP has constants of its own, so the state is found by that
 * equation, not by a factor on the SI enthalpy (ASHRAE Handbook - Fundamentals (2017) ch. 1, eq. 30 IP).
 */
import { EngineError } from '../errors';
import { INCH_POUND_ENTHALPY } from './enthalpy';
import {
  moistAirFromDewPointAndEnthalpy,
  moistAirFromDryBulbAndEnthalpy,
  moistAirFromHumidityRatioAndEnthalpy,
  moistAirFromRelativeHumidityAndEnthalpy,
} from './enthalpy-pairs';
import type { MoistAirReading, MoistAirReadings } from './moist-air-pairs';
import type { MoistAir } from './moist-air-state';

type Partner = Exclude<MoistAirReading, 'enthalpyJPerKg'>;

/** An enthalpy in Btu per lb of dry air and exactly one reading beside it. */
export type InchPoundEnthalpyPair = {
  [Name in Partner]: Pick<MoistAirReadings, Name> & { readonly [Other in Exclude<Partner, Name>]?: never };
}[Partner] & { readonly enthalpyBtuPerLb: number };

/**
 * The state of moist air from an inch-pound enthalpy, as `moistAirFromPair` answers for an SI one; `moistAirEnthalpyBtuPerLb` of the state is the one given.
 * Refuses as `moistAirFromPair` does, with `enthalpyBtuPerLb` in place of `enthalpyJPerKg`.
 */
export function moistAirFromInchPoundEnthalpy(x: InchPoundEnthalpyPair & { readonly pressurePa: number }): MoistAir {
  const { enthalpyBtuPerLb: enthalpy, pressurePa } = x;
  if (x.dryBulbK !== undefined) {
    return moistAirFromDryBulbAndEnthalpy(INCH_POUND_ENTHALPY, { dryBulbK: x.dryBulbK, enthalpy, pressurePa });
  }
  if (x.dewPointK !== undefined) {
    return moistAirFromDewPointAndEnthalpy(INCH_POUND_ENTHALPY, { dewPointK: x.dewPointK, enthalpy, pressurePa });
  }
  if (x.relativeHumidityRatio !== undefined) {
    const { relativeHumidityRatio } = x;
    return moistAirFromRelativeHumidityAndEnthalpy(INCH_POUND_ENTHALPY, {
      relativeHumidityRatio,
      enthalpy,
      pressurePa,
    });
  }
  if (x.humidityRatio !== undefined) {
    const { humidityRatio } = x;
    return moistAirFromHumidityRatioAndEnthalpy(INCH_POUND_ENTHALPY, { humidityRatio, enthalpy, pressurePa });
  }
  const reason = 'near-parallel-pair';
  throw new EngineError('not-supported', { quantity: 'enthalpyBtuPerLb', value: enthalpy, reason });
}
