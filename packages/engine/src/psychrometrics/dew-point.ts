import { assertInRange } from '../errors';
import { bracketedNewton } from '../numerics/bracketed-newton';
import {
  lnSaturationPressureOverIce,
  lnSaturationPressureOverWater,
  lnSlopeOverIce,
  lnSlopeOverWater,
  SATURATION_LIMITS,
  saturationPressureAndSlope,
  TRIPLE_POINT_K,
} from './saturation-pressure';

/** 1e-9 K: far below any sensor, far above the rounding of doubles (6e-14 K), so that secant slopes stay clean. */
const TOLERANCE_K = 1e-9;

/** Vapour pressures whose dew point lies within eqs. 5 and 6, −100 to 200 °C. */
export const DEW_POINT_VAPOUR_PRESSURE_LIMITS = {
  quantity: 'vapourPressurePa',
  min: saturationPressureAndSlope(SATURATION_LIMITS.min)[0],
  max: saturationPressureAndSlope(SATURATION_LIMITS.max)[0],
  reason: 'outside-saturation-equation',
  source: SATURATION_LIMITS.source,
} as const;

const LN_TRIPLE_OVER_ICE = lnSaturationPressureOverIce(TRIPLE_POINT_K);
const LN_TRIPLE_OVER_WATER = lnSaturationPressureOverWater(TRIPLE_POINT_K);

/** Bound of |(ln p)″ / 2 (ln p)′| from −100 to 200 °C: 0.0059 per K at −100 °C. */
const CURVATURE_PER_K = 0.006;

/** Coefficients a, b, c of T − T₃ = L (a + b L) / (1 + c L), L = ln(p / p₃) from the triple point. */
type FirstGuess = readonly [a: number, b: number, c: number];

/**
 * Where Newton starts: our own fits to eqs. 5 and 6, within 0.0003 K from 0.01 to 90 °C and 0.0005 K from −60 °C, so near that the first step is
 * mostly the last. Only the speed depends on them.
 */
const GUESS_OVER_WATER: FirstGuess = [13.7678, -0.0698685, -0.0615417];
const GUESS_OVER_ICE: FirstGuess = [12.1437, -0.0100634, -0.0456356];

const firstGuessK = ([a, b, c]: FirstGuess, lnRatioToTriple: number): number =>
  TRIPLE_POINT_K + (lnRatioToTriple * (a + b * lnRatioToTriple)) / (1 + c * lnRatioToTriple);

/**
 * Dew point (frost point below 0.01 °C) in K of water vapour at a partial pressure: the temperature whose saturation pressure it is
 * (ASHRAE Fundamentals (2017) ch. 1, eq. 36, with eqs. 5 and 6), solved on ln p to 1e-9 K.
 * Within the step of 4 µPa between ice and water at the triple point it is 273.16 K. Vapour pressures outside 1.4 mPa to 1.55 MPa, zero and
 * NaN among them: `EngineError` `out-of-range`.
 */
export function dewPointKFromVapourPressure(vapourPressurePa: number): number {
  assertInRange(vapourPressurePa, DEW_POINT_VAPOUR_PRESSURE_LIMITS);
  const lnPa = Math.log(vapourPressurePa);
  if (lnPa < LN_TRIPLE_OVER_ICE) {
    return bracketedNewton((T) => [lnSaturationPressureOverIce(T) - lnPa, lnSlopeOverIce(T)], {
      lower: SATURATION_LIMITS.min,
      upper: TRIPLE_POINT_K,
      start: firstGuessK(GUESS_OVER_ICE, lnPa - LN_TRIPLE_OVER_ICE),
      tolerance: TOLERANCE_K,
      curvature: CURVATURE_PER_K,
      quantity: 'dewPointK',
    });
  }
  if (lnPa < LN_TRIPLE_OVER_WATER) return TRIPLE_POINT_K;
  return bracketedNewton((T) => [lnSaturationPressureOverWater(T) - lnPa, lnSlopeOverWater(T)], {
    lower: TRIPLE_POINT_K,
    upper: SATURATION_LIMITS.max,
    start: firstGuessK(GUESS_OVER_WATER, lnPa - LN_TRIPLE_OVER_WATER),
    tolerance: TOLERANCE_K,
    curvature: CURVATURE_PER_K,
    quantity: 'dewPointK',
  });
}
