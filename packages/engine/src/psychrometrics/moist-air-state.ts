/**
 * The whole state of moist air, derived from dry bulb and vapour pressure: what every door to it ends in.
 * Ideal-gas relations of ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI.
 */
import { assertInRange } from '../errors';
import { dewPointKFromVapourPressure, DEW_POINT_VAPOUR_PRESSURE_LIMITS } from './dew-point';
import { enthalpyJPerKg } from './enthalpy';
import { humidityRatioFromVapourPressure } from './humidity-ratio';
import { assertMoistAirRange, HUMIDITY_RATIO_LIMITS } from './moist-air-limits';
import type { WetBulbSurface } from './psychrometric-equation';
import { waterVapourSaturationPressurePa } from './saturation-pressure';
import { wetBulbFromHumidityRatio, type WetBulb } from './wet-bulb';

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
 * Volume of moist air in m³ per kg of dry air, R T (1 + 1.607858 W) / p (ASHRAE Fundamentals (2017) ch. 1, eq. 26).
 * Dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export function specificVolumeM3PerKg(x: { dryBulbK: number; humidityRatio: number; pressurePa: number }): number {
  assertMoistAirRange(x.dryBulbK, x.pressurePa);
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  return (DRY_AIR_GAS_CONSTANT * x.dryBulbK * (1 + 1.607858 * x.humidityRatio)) / x.pressurePa;
}

export interface GivenReadings {
  readonly wetBulb?: WetBulb;
  readonly dewPointK?: number;
  readonly relativeHumidityRatio?: number;
  readonly humidityRatio?: number;
  readonly enthalpyJPerKg?: number;
}

/** The state at a dry bulb and vapour pressure in range, with the readings it came from kept to the last digit. */
export function moistAir(
  air: { dryBulbK: number; pressurePa: number; vapourPressurePa: number },
  given: GivenReadings,
): MoistAir {
  const { dryBulbK, pressurePa, vapourPressurePa } = air;
  const humidityRatio = humidityRatioFromVapourPressure(air);
  const { wetBulbK, wetBulbSurface } =
    given.wetBulb ?? wetBulbFromHumidityRatio({ dryBulbK, humidityRatio, pressurePa });
  return {
    dryBulbK,
    wetBulbK,
    wetBulbSurface,
    dewPointK: given.dewPointK ?? dewPointKOrNull(vapourPressurePa, dryBulbK),
    // the minimum takes away the rounding of exp where the dew point lies an ulp below the dry bulb
    relativeHumidityRatio:
      given.relativeHumidityRatio ?? Math.min(vapourPressurePa / waterVapourSaturationPressurePa(dryBulbK), 1),
    humidityRatio: given.humidityRatio ?? humidityRatio,
    vapourPressurePa,
    enthalpyJPerKg: given.enthalpyJPerKg ?? enthalpyJPerKg({ dryBulbK, humidityRatio }),
    specificVolumeM3PerKg: specificVolumeM3PerKg({ dryBulbK, humidityRatio, pressurePa }),
    pressurePa,
  };
}

/** The minimum takes away the solver's 1e-9 K where the air is saturated. */
export function dewPointKOrNull(vapourPressurePa: number, dryBulbK: number): number | null {
  if (vapourPressurePa < DEW_POINT_VAPOUR_PRESSURE_LIMITS.min) return null;
  return Math.min(dewPointKFromVapourPressure(vapourPressurePa), dryBulbK);
}
