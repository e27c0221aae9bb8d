/**
 * The whole state of moist air from its pressure and the readings of the first page: dry bulb with wet bulb, relative humidity or dew point. Each door
 * turns its pair into dry bulb and vapour pressure and keeps the readings it was given. The other pairs: moist-air-pairs.ts.
 * Ideal-gas relations of ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI.
 */
import {
  vapourPressurePaFromDewPoint,
  vapourPressurePaFromHumidityRatio,
  vapourPressurePaFromRelativeHumidity,
} from './humidity-ratio';
import { assertMoistAirRange } from './moist-air-limits';
import { moistAir, type MoistAir } from './moist-air-state';
import { waterVapourSaturationPressurePa } from './saturation-pressure';
import { humidityRatioFromWetBulb, wetBulbSurface } from './wet-bulb';

export { enthalpyJPerKg } from './enthalpy';
export { specificVolumeM3PerKg, type MoistAir } from './moist-air-state';

/**
 * State from dry bulb and thermodynamic wet bulb; a wet bulb below 0 °C is an iced bulb.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa: `out-of-range`; wet bulb above the dry bulb, below that of
 * dry air, or boiling: `inconsistent-inputs`.
 */
export function moistAirFromDryBulbAndWetBulb(x: { dryBulbK: number; wetBulbK: number; pressurePa: number }): MoistAir {
  const { dryBulbK, wetBulbK, pressurePa } = x;
  const humidityRatio = humidityRatioFromWetBulb(x);
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  // below saturation by nature; the minimum takes away the rounding where wet bulb and dry bulb meet
  const vapourPressurePa = Math.min(vapourPressurePaFromHumidityRatio({ humidityRatio, pressurePa }), saturationPa);
  const wetBulb = { wetBulbK, wetBulbSurface: wetBulbSurface(wetBulbK) };
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { wetBulb });
}

/**
 * State from dry bulb and relative humidity (0 to 1, over ice below 0.01 °C dry bulb).
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, relative humidity outside 0 to 1: `out-of-range`; vapour pressure
 * not below the total: `inconsistent-inputs`.
 */
export function moistAirFromDryBulbAndRelativeHumidity(x: {
  dryBulbK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { dryBulbK, relativeHumidityRatio, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  const vapourPressurePa = vapourPressurePaFromRelativeHumidity(x);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { relativeHumidityRatio });
}

/**
 * State from dry bulb and dew point (frost point below 0.01 °C).
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, dew point below −100 °C: `out-of-range`; dew point above the dry
 * bulb or boiling: `inconsistent-inputs`.
 */
export function moistAirFromDryBulbAndDewPoint(x: {
  dryBulbK: number;
  dewPointK: number;
  pressurePa: number;
}): MoistAir {
  const { dryBulbK, dewPointK, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa: vapourPressurePaFromDewPoint(x) }, { dewPointK });
}
