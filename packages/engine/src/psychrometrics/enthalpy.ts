/**
 * Enthalpy of moist air and the ways back from it, per kg of dry air; zero is dry air at 0 °C with liquid water at 0 °C.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI, eq. 30, t in °C: h = 1.006 t + W (2501 + 1.86 t) kJ/kg
 */
import { assertInRange } from '../errors';
import { MOLAR_MASS_RATIO } from './humidity-ratio';
import { DRY_BULB_LIMITS, HUMIDITY_RATIO_LIMITS } from './moist-air-limits';
import { FREEZING_K } from './psychrometric-equation';
import { saturationPressureAndSlope } from './saturation-pressure';

const DRY_AIR_HEAT = 1.006; // kJ/(kg K)
const VAPOUR_AT_FREEZING = 2501; // kJ/kg
const VAPOUR_HEAT = 1.86; // kJ/(kg K)

/**
 * Enthalpy of moist air in J per kg of dry air, 1.006 t + W (2501 + 1.86 t) in kJ (ASHRAE Fundamentals (2017) ch. 1, eq. 30).
 * Dry bulb outside −60 to 90 °C, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export function enthalpyJPerKg(x: { dryBulbK: number; humidityRatio: number }): number {
  assertInRange(x.dryBulbK, DRY_BULB_LIMITS);
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  const t = x.dryBulbK - FREEZING_K;
  return 1e3 * (DRY_AIR_HEAT * t + x.humidityRatio * (VAPOUR_AT_FREEZING + VAPOUR_HEAT * t));
}

/** Eq. 30 solved for the humidity ratio: negative where even dry air would hold more. The caller has checked the ranges. */
export function humidityRatioByEnthalpy(x: { dryBulbK: number; enthalpyJPerKg: number }): number {
  const t = x.dryBulbK - FREEZING_K;
  return (1e-3 * x.enthalpyJPerKg - DRY_AIR_HEAT * t) / (VAPOUR_AT_FREEZING + VAPOUR_HEAT * t);
}

/** Eq. 30 solved for the dry bulb in K, wherever it may lie. */
export const dryBulbKByEnthalpy = (x: { humidityRatio: number; enthalpyJPerKg: number }): number =>
  FREEZING_K +
  (1e-3 * x.enthalpyJPerKg - x.humidityRatio * VAPOUR_AT_FREEZING) / (DRY_AIR_HEAT + x.humidityRatio * VAPOUR_HEAT);

/**
 * What an enthalpy has too much for air of a relative humidity at a trial dry bulb, and the analytic slope per K: zero at the dry bulb, falling
 * throughout, so that there is only one. Written as (h − 1.006 t) (p − p_w) − ε p_w (2501 + 1.86 t), which has no pole where the vapour boils.
 */
export function enthalpyImbalance(
  air: { relativeHumidityRatio: number; enthalpyJPerKg: number; pressurePa: number },
  dryBulbK: number,
): readonly [value: number, slope: number] {
  const t = dryBulbK - FREEZING_K;
  const [saturationPa, saturationSlope] = saturationPressureAndSlope(dryBulbK);
  const vapourPa = air.relativeHumidityRatio * saturationPa;
  const dryAirPa = air.pressurePa - vapourPa;
  const latent = MOLAR_MASS_RATIO * (VAPOUR_AT_FREEZING + VAPOUR_HEAT * t);
  const left = 1e-3 * air.enthalpyJPerKg - DRY_AIR_HEAT * t;
  return [
    left * dryAirPa - latent * vapourPa,
    -DRY_AIR_HEAT * dryAirPa -
      (left + latent) * air.relativeHumidityRatio * saturationSlope -
      MOLAR_MASS_RATIO * VAPOUR_HEAT * vapourPa,
  ];
}
