/**
 * Saturation pressure of pure water over liquid and over ice.
 * Hyland & Wexler (1983), as printed in ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI, eqs. 5 and 6, coefficients C1 to C13.
 * Within 300 ppm of the Handbook's own table, except near -60 °C where the table prints three digits.
 *
 * Which curve: ice below the triple point, 0.01 °C, liquid from there on. The Handbook prints eq. 5 to 0 °C only, but there the two curves
 * differ by 97 ppm (1.2 mK of dew point), while at the triple point, where ice and water do coexist, they meet within 0.006 ppm. Eq. 5 is
 * therefore used 0.01 K beyond its printed end, and the dew point is continuous.
 */
import { assertInRange } from '../errors';
import { temperatureToK } from '../units/temperature';

const SOURCE = 'ASHRAE Handbook - Fundamentals (2017) ch. 1, eqs. 5 and 6';

/** Below it saturation is over ice, from it on over liquid water. */
export const TRIPLE_POINT_K = 273.16;

/** Printed range of eqs. 5 and 6, −100 to 200 °C. */
export const SATURATION_LIMITS = {
  quantity: 'temperatureK',
  min: temperatureToK(-100, 'degC'),
  max: temperatureToK(200, 'degC'),
  reason: 'outside-saturation-equation',
  source: SOURCE,
} as const;

/** Natural logarithm of the saturation pressure over ice in Pa. The caller keeps to −100 to 0.01 °C. */
export const lnSaturationPressureOverIce = (T: number): number =>
  -5.6745359e3 / T +
  6.3925247 +
  T * (-9.677843e-3 + T * (6.2215701e-7 + T * (2.0747825e-9 + T * -9.484024e-13))) +
  4.1635019 * Math.log(T); // eq. 5

/** Analytic derivative of `lnSaturationPressureOverIce`, per K. */
export const lnSlopeOverIce = (T: number): number =>
  (5.6745359e3 / T + 4.1635019) / T -
  9.677843e-3 +
  T * (2 * 6.2215701e-7 + T * (3 * 2.0747825e-9 + T * 4 * -9.484024e-13));

/** Natural logarithm of the saturation pressure over liquid water in Pa. The caller keeps to 0.01 to 200 °C. */
export const lnSaturationPressureOverWater = (T: number): number =>
  -5.8002206e3 / T + 1.3914993 + T * (-4.8640239e-2 + T * (4.1764768e-5 + T * -1.4452093e-8)) + 6.5459673 * Math.log(T); // eq. 6

/** Analytic derivative of `lnSaturationPressureOverWater`, per K. */
export const lnSlopeOverWater = (T: number): number =>
  (5.8002206e3 / T + 6.5459673) / T - 4.8640239e-2 + T * (2 * 4.1764768e-5 + T * 3 * -1.4452093e-8);

/** Saturation pressure in Pa and its slope in Pa/K. */
export type SaturationPressure = readonly [pressurePa: number, slopePaPerK: number];

/** As `waterVapourSaturationPressurePa`, with its slope (the analytic derivative of eqs. 5 and 6), without the check of the range. */
export function saturationPressureAndSlope(temperatureK: number): SaturationPressure {
  if (temperatureK < TRIPLE_POINT_K) {
    const pressurePa = Math.exp(lnSaturationPressureOverIce(temperatureK));
    return [pressurePa, pressurePa * lnSlopeOverIce(temperatureK)];
  }
  const pressurePa = Math.exp(lnSaturationPressureOverWater(temperatureK));
  return [pressurePa, pressurePa * lnSlopeOverWater(temperatureK)];
}

/**
 * Saturation pressure of pure water in Pa, over ice below 273.16 K and over liquid from there on (ASHRAE Fundamentals (2017) ch. 1, eqs. 5, 6).
 * Range −100 to 200 °C, else `EngineError` `out-of-range`.
 */
export function waterVapourSaturationPressurePa(temperatureK: number): number {
  assertInRange(temperatureK, SATURATION_LIMITS);
  return saturationPressureAndSlope(temperatureK)[0];
}
