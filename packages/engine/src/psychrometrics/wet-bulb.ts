/**
 * Thermodynamic wet bulb of moist air and the humidity ratio it stands for (ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, eqs. 33, 35).
 *
 * Which branch: eq. 33 (water, from 0 °C up) and eq. 35 (ice, below) do not join. An iced bulb just below 0 °C stands for more humidity than a
 * wet bulb at 0 °C, so some humidity ratios have two wet bulbs. The rule: the liquid-water wet bulb wherever one ≥ 0 °C exists, else the
 * iced one; the result names it. As the humidity falls the wet bulb sinks to 0 °C and then steps onto the ice branch: at
 * 5 °C dry bulb and 101.325 kPa from 0 to −0.353 °C.
 * A measured wet bulb below 0 °C is taken at its word: an iced bulb, also where a liquid one would exist.
 */
import { assertInRange, EngineError } from '../errors';
import { bracketedNewton } from '../numerics/bracketed-newton';
import { humidityRatioFromVapourPressure, relativeHumidityFromHumidityRatio } from './humidity-ratio';
import { assertMoistAirRange, RELATIVE_HUMIDITY_LIMITS } from './moist-air-limits';
import {
  bulbEquation,
  FREEZING_K,
  humidityRatioByPsychrometricEquation,
  ICE_BULB,
  WATER_BULB,
  WET_BULB_CURVATURE_PER_K,
  wetBulbGuessK,
  wetBulbImbalance,
  type BulbEquation,
  type HumidAir,
  type WetBulbSurface,
} from './psychrometric-equation';
import {
  SATURATION_LIMITS,
  saturationPressureAndSlope,
  TRIPLE_POINT_K,
  type SaturationPressure,
} from './saturation-pressure';

export interface WetBulb {
  readonly wetBulbK: number;
  readonly wetBulbSurface: WetBulbSurface;
}

/** Far below any sensor, far above the rounding of doubles (6e-14 K), so that secant slopes over a reading's ± stay clean. */
const TOLERANCE_K = 1e-9;

/** Deficit of humidity ratio that a wet bulb of dry air, solved to 1e-9 K and given back, may show: the worth of about 1e-8 K. */
const DRY_ROUNDING = 1e-11;

const AT_FREEZING = saturationPressureAndSlope(FREEZING_K);
const AT_TRIPLE_POINT = saturationPressureAndSlope(TRIPLE_POINT_K);

/** What wets a bulb of this temperature: water from 0 °C up, ice below. */
export const wetBulbSurface = (wetBulbK: number): WetBulbSurface => (wetBulbK >= FREEZING_K ? 'water' : 'ice');

/**
 * Humidity ratio from dry bulb and wet bulb (ASHRAE Fundamentals (2017) ch. 1, eq. 33 from 0 °C up, eq. 35 for the iced bulb below).
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, or NaN: `out-of-range`; `inconsistent-inputs` with
 * reason `wet-bulb-above-dry-bulb`; `wet-bulb-too-low` (`min` is the wet bulb of dry air) where even dry air would show more;
 * `vapour-pressure-not-below-total` where the wet bulb would boil at this pressure.
 */
export function humidityRatioFromWetBulb(x: { dryBulbK: number; wetBulbK: number; pressurePa: number }): number {
  const { dryBulbK, wetBulbK, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  assertInRange(wetBulbK, { quantity: 'wetBulbK', reason: 'not-a-number' });
  if (wetBulbK > dryBulbK) {
    const reason = 'wet-bulb-above-dry-bulb';
    throw new EngineError('inconsistent-inputs', { quantity: 'wetBulbK', value: wetBulbK, max: dryBulbK, reason });
  }
  // eq. 5 ends at −100 °C, far below the wet bulb of any air in range (dry air at −60 °C: −60.02 °C)
  if (wetBulbK >= SATURATION_LIMITS.min) {
    const humidityRatio = humidityRatioByPsychrometricEquation(bulbEquation(wetBulbK), x);
    if (humidityRatio >= 0) return humidityRatio;
    if (humidityRatio > -DRY_ROUNDING) return 0;
  }
  const min = wetBulbKOfDryAir({ dryBulbK, humidityRatio: 0, pressurePa }, wetBulbK);
  throw new EngineError('inconsistent-inputs', {
    quantity: 'wetBulbK',
    value: wetBulbK,
    min,
    reason: 'wet-bulb-too-low',
  });
}

/**
 * Wet bulb in K, to 1e-9 K, and what wets it, from dry bulb and humidity ratio (eqs. 33 and 35 solved for t*; branch rule in the file's header).
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, negative or not finite humidity ratio: `out-of-range`;
 * humidity ratio above saturation: `inconsistent-inputs`.
 */
export function wetBulbFromHumidityRatio(x: { dryBulbK: number; humidityRatio: number; pressurePa: number }): WetBulb {
  const { dryBulbK } = x;
  if (relativeHumidityFromHumidityRatio(x) === 1)
    return { wetBulbK: dryBulbK, wetBulbSurface: wetBulbSurface(dryBulbK) };
  return wetBulb(x, saturationPressureAndSlope(dryBulbK));
}

/**
 * Wet bulb in K, to 1e-9 K, from dry bulb and relative humidity (eqs. 22 and 20, then 33 or 35). Works for dry air (0) too.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, relative humidity outside 0 to 1: `out-of-range`;
 * vapour pressure not below the total: `inconsistent-inputs`.
 */
export function wetBulbKFromRelativeHumidity(x: {
  dryBulbK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): number {
  const { dryBulbK, relativeHumidityRatio, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  const atDryBulb = saturationPressureAndSlope(dryBulbK);
  const humidityRatio = humidityRatioFromVapourPressure({
    vapourPressurePa: relativeHumidityRatio * atDryBulb[0],
    pressurePa,
  });
  return relativeHumidityRatio === 1 ? dryBulbK : wetBulb({ dryBulbK, humidityRatio, pressurePa }, atDryBulb).wetBulbK;
}

/** Wet bulb of air that is known to be in range and not above saturation. */
function wetBulb(air: HumidAir, atDryBulb: SaturationPressure): WetBulb {
  // Without a liquid one there is an iced one: at 0 °C eq. 35 stands for at least the humidity of eq. 33, so the two overlap and leave no gap.
  const wetBulbK = liquidWetBulbK(air, atDryBulb) ?? icedBulbK(air, atDryBulb);
  return { wetBulbK, wetBulbSurface: wetBulbSurface(wetBulbK) };
}

/** The lowest wet bulb of dry air on the branch of a refused one, or on the other where that branch has none. */
function wetBulbKOfDryAir(dryAir: HumidAir, refusedK: number): number {
  const atDryBulb = saturationPressureAndSlope(dryAir.dryBulbK);
  const iced = refusedK < FREEZING_K && wetBulbImbalance(ICE_BULB, dryAir, FREEZING_K, AT_FREEZING)[0] >= 0;
  return iced ? icedBulbK(dryAir, atDryBulb) : wetBulb(dryAir, atDryBulb).wetBulbK;
}

/** The wet bulb ≥ 0 °C on eq. 33, if there is one. Split at the triple point, where saturation has a kink that would slow Newton. */
function liquidWetBulbK(air: HumidAir, atDryBulb: SaturationPressure): number | undefined {
  if (air.dryBulbK > TRIPLE_POINT_K && wetBulbImbalance(WATER_BULB, air, TRIPLE_POINT_K, AT_TRIPLE_POINT)[0] <= 0) {
    const start = wetBulbGuessK(WATER_BULB, air, air.dryBulbK, atDryBulb);
    return solve(WATER_BULB, air, { lower: TRIPLE_POINT_K, upper: air.dryBulbK, start });
  }
  if (air.dryBulbK < FREEZING_K || wetBulbImbalance(WATER_BULB, air, FREEZING_K, AT_FREEZING)[0] > 0) return undefined;
  // from below: a step that began at the triple point would have the slope over water, and end on it unaware
  const upper = Math.min(air.dryBulbK, TRIPLE_POINT_K);
  return solve(WATER_BULB, air, { lower: FREEZING_K, upper, start: FREEZING_K });
}

/** The iced bulb ≤ 0 °C on eq. 35, for air that has one. */
function icedBulbK(air: HumidAir, atDryBulb: SaturationPressure): number {
  const [upper, atUpper] = air.dryBulbK < FREEZING_K ? [air.dryBulbK, atDryBulb] : [FREEZING_K, AT_FREEZING];
  const start = wetBulbGuessK(ICE_BULB, air, upper, atUpper);
  return solve(ICE_BULB, air, { lower: SATURATION_LIMITS.min, upper, start });
}

function solve(bulb: BulbEquation, air: HumidAir, within: { lower: number; upper: number; start: number }): number {
  const { lower, upper, start } = within;
  // named one by one: a spread takes ten times as long as the whole solution
  return bracketedNewton((wetBulbK) => wetBulbImbalance(bulb, air, wetBulbK), {
    lower,
    upper,
    start,
    tolerance: TOLERANCE_K,
    curvature: WET_BULB_CURVATURE_PER_K,
    quantity: 'wetBulbK',
  });
}
