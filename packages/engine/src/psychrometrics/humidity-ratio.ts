/**
 * Humidity ratio (kg of water vapour per kg of dry air) and vapour pressure from what instruments show; from a wet bulb: wet-bulb.ts.
 * Ideal-gas relations of ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI. Against the real-gas model of ASHRAE RP-1485 the humidity
 * ratio is 0.4 to 1 % low, because the enhancement factor is left out.
 */
import { assertInRange, EngineError } from '../errors';
import {
  assertBelowTotalPressure,
  assertMoistAirRange,
  HUMIDITY_RATIO_LIMITS,
  RELATIVE_HUMIDITY_LIMITS,
  VAPOUR_PRESSURE_LIMITS,
} from './moist-air-limits';
import { DRY_BULB_LIMITS } from './moist-air-range';
import { SATURATION_LIMITS, waterVapourSaturationPressurePa } from './saturation-pressure';

/** Ratio of the molar masses of water and dry air (ASHRAE Fundamentals (2017) ch. 1, eq. 20). */
export const MOLAR_MASS_RATIO = 0.621945;

/**
 * Humidity ratio from the vapour pressure, W = 0.621945 p_w / (p − p_w) (ASHRAE Fundamentals (2017) ch. 1, eq. 20).
 * Throws `EngineError`: negative or NaN vapour pressure `out-of-range`; vapour pressure not below the total `inconsistent-inputs`.
 */
export function humidityRatioFromVapourPressure(x: { vapourPressurePa: number; pressurePa: number }): number {
  assertInRange(x.vapourPressurePa, VAPOUR_PRESSURE_LIMITS);
  assertBelowTotalPressure(x.vapourPressurePa, x.pressurePa);
  return (MOLAR_MASS_RATIO * x.vapourPressurePa) / (x.pressurePa - x.vapourPressurePa);
}

/** Vapour pressure in Pa from the humidity ratio (eq. 20 solved for p_w). Humidity ratio negative, infinite or NaN: `EngineError` `out-of-range`. */
export function vapourPressurePaFromHumidityRatio(x: { humidityRatio: number; pressurePa: number }): number {
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  return (x.pressurePa * x.humidityRatio) / (MOLAR_MASS_RATIO + x.humidityRatio);
}

/** Relative excess over saturation that is the rounding of doubles and no contradiction between inputs. */
const SATURATION_ROUNDING = 1e-12;

/**
 * Relative humidity, 0 to 1, from dry bulb and humidity ratio (ASHRAE Fundamentals (2017) ch. 1, eqs. 20 and 22); over ice below 0.01 °C.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, humidity ratio negative or not finite: `out-of-range`;
 * humidity ratio above saturation: `inconsistent-inputs`, reason `above-saturation`.
 */
export function relativeHumidityFromHumidityRatio(x: {
  dryBulbK: number;
  humidityRatio: number;
  pressurePa: number;
}): number {
  const { dryBulbK, humidityRatio, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  const relativeHumidityRatio = vapourPressurePaFromHumidityRatio(x) / saturationPa;
  if (relativeHumidityRatio <= 1) return relativeHumidityRatio;
  if (relativeHumidityRatio <= 1 + SATURATION_ROUNDING) return 1;
  const max = humidityRatioFromVapourPressure({ vapourPressurePa: saturationPa, pressurePa });
  const reason = 'above-saturation';
  throw new EngineError('inconsistent-inputs', { quantity: 'humidityRatio', value: humidityRatio, max, reason });
}

/**
 * Vapour pressure in Pa from dry bulb and relative humidity, p_w = φ p_ws(t) (ASHRAE Fundamentals (2017) ch. 1, eq. 22).
 * Dry bulb outside −60 to 90 °C or φ outside 0 to 1: `EngineError` `out-of-range`.
 */
export function vapourPressurePaFromRelativeHumidity(x: { dryBulbK: number; relativeHumidityRatio: number }): number {
  assertInRange(x.dryBulbK, DRY_BULB_LIMITS);
  assertInRange(x.relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  return x.relativeHumidityRatio * waterVapourSaturationPressurePa(x.dryBulbK);
}

/**
 * Vapour pressure in Pa from dry bulb and dew point, p_w = p_ws(t_d) (ASHRAE Fundamentals (2017) ch. 1, eq. 36).
 * Throws `EngineError`: dry bulb outside −60 to 90 °C or dew point below −100 °C `out-of-range`; dew point above the dry bulb
 * `inconsistent-inputs`, reason `dew-point-above-dry-bulb`.
 */
export function vapourPressurePaFromDewPoint(x: { dryBulbK: number; dewPointK: number }): number {
  const { dryBulbK, dewPointK } = x;
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  assertInRange(dewPointK, { ...SATURATION_LIMITS, quantity: 'dewPointK', max: Infinity });
  if (dewPointK > dryBulbK) {
    const reason = 'dew-point-above-dry-bulb';
    throw new EngineError('inconsistent-inputs', { quantity: 'dewPointK', value: dewPointK, max: dryBulbK, reason });
  }
  return waterVapourSaturationPressurePa(dewPointK);
}

/** Humidity ratio from dry bulb and relative humidity (eqs. 22 and 20). Refuses as its two steps do, and outside 50 to 110 kPa. */
export function humidityRatioFromRelativeHumidity(x: {
  dryBulbK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): number {
  assertMoistAirRange(x.dryBulbK, x.pressurePa);
  return humidityRatioFromVapourPressure({
    vapourPressurePa: vapourPressurePaFromRelativeHumidity(x),
    pressurePa: x.pressurePa,
  });
}
