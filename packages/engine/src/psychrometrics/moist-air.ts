/**
 * The whole state of moist air from its pressure and two readings. Each door turns its pair into dry bulb and vapour pressure, keeps the
 * readings it was given, and `moistAir` derives the rest: a further pair is one more door.
 * Ideal-gas relations of ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI.
 */
import { assertInRange } from '../errors';
import { dewPointKFromVapourPressure, DEW_POINT_VAPOUR_PRESSURE_LIMITS } from './dew-point';
import {
  humidityRatioFromVapourPressure,
  vapourPressurePaFromDewPoint,
  vapourPressurePaFromHumidityRatio,
  vapourPressurePaFromRelativeHumidity,
} from './humidity-ratio';
import { assertMoistAirRange, DRY_BULB_LIMITS, HUMIDITY_RATIO_LIMITS } from './moist-air-limits';
import { FREEZING_K, type WetBulbSurface } from './psychrometric-equation';
import { waterVapourSaturationPressurePa } from './saturation-pressure';
import { humidityRatioFromWetBulb, wetBulbFromHumidityRatio, wetBulbSurface, type WetBulb } from './wet-bulb';

export interface MoistAir {
  readonly dryBulbK: number;
  readonly wetBulbK: number;
  readonly wetBulbSurface: WetBulbSurface;
  /** Frost point below 0.01 °C. Null for air so dry (relative humidity 0, or vapour below 1.4 mPa) that it lies below −100 °C, where eq. 5 ends. */
  readonly dewPointK: number | null;
  /** 0 to 1, over ice below 0.01 °C dry bulb. */
  readonly relativeHumidityRatio: number;
  /** kg of water vapour per kg of dry air. */
  readonly humidityRatio: number;
  readonly vapourPressurePa: number;
  /** Per kg of dry air; zero is dry air at 0 °C with liquid water at 0 °C. */
  readonly enthalpyJPerKg: number;
  /** Per kg of dry air. */
  readonly specificVolumeM3PerKg: number;
  readonly pressurePa: number;
}

/** J/(kg K) of dry air (ASHRAE Fundamentals (2017) ch. 1, eq. 26, there kJ). */
const DRY_AIR_GAS_CONSTANT = 287.042;

/**
 * Enthalpy of moist air in J per kg of dry air, 1.006 t + W (2501 + 1.86 t) in kJ (ASHRAE Fundamentals (2017) ch. 1, eq. 30).
 * Dry bulb outside −60 to 90 °C, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export function enthalpyJPerKg(x: { dryBulbK: number; humidityRatio: number }): number {
  assertInRange(x.dryBulbK, DRY_BULB_LIMITS);
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  const t = x.dryBulbK - FREEZING_K;
  return 1e3 * (1.006 * t + x.humidityRatio * (2501 + 1.86 * t));
}

/**
 * Volume of moist air in m³ per kg of dry air, R T (1 + 1.607858 W) / p (ASHRAE Fundamentals (2017) ch. 1, eq. 26).
 * Dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export function specificVolumeM3PerKg(x: { dryBulbK: number; humidityRatio: number; pressurePa: number }): number {
  assertMoistAirRange(x.dryBulbK, x.pressurePa);
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  return (DRY_AIR_GAS_CONSTANT * x.dryBulbK * (1 + 1.607858 * x.humidityRatio)) / x.pressurePa;
}

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

interface Given {
  readonly wetBulb?: WetBulb;
  readonly dewPointK?: number;
  readonly relativeHumidityRatio?: number;
}

/** The state at a dry bulb and vapour pressure in range, with the readings it came from kept to the last digit. */
function moistAir(air: { dryBulbK: number; pressurePa: number; vapourPressurePa: number }, given: Given): MoistAir {
  const { dryBulbK, pressurePa, vapourPressurePa } = air;
  const humidityRatio = humidityRatioFromVapourPressure(air);
  const { wetBulbK, wetBulbSurface } =
    given.wetBulb ?? wetBulbFromHumidityRatio({ dryBulbK, humidityRatio, pressurePa });
  return {
    dryBulbK,
    wetBulbK,
    wetBulbSurface,
    dewPointK: given.dewPointK ?? dewPointKOrNull(vapourPressurePa, dryBulbK),
    relativeHumidityRatio: given.relativeHumidityRatio ?? vapourPressurePa / waterVapourSaturationPressurePa(dryBulbK),
    humidityRatio,
    vapourPressurePa,
    enthalpyJPerKg: enthalpyJPerKg({ dryBulbK, humidityRatio }),
    specificVolumeM3PerKg: specificVolumeM3PerKg({ dryBulbK, humidityRatio, pressurePa }),
    pressurePa,
  };
}

/** The minimum takes away the solver's 1e-9 K where the air is saturated. */
function dewPointKOrNull(vapourPressurePa: number, dryBulbK: number): number | null {
  if (vapourPressurePa < DEW_POINT_VAPOUR_PRESSURE_LIMITS.min) return null;
  return Math.min(dewPointKFromVapourPressure(vapourPressurePa), dryBulbK);
}
