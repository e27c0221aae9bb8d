/**
 * Moist air from a wet bulb without the dry bulb: with dew point, relative humidity or humidity ratio.
 *
 * A wet bulb is taken at its word, as everywhere: from 0 °C up a wet one (eq. 33), below an iced one (eq. 35). With its equation fixed each pair has one
 * dry bulb. For a known humidity the equation is linear in t. For a relative humidity: along a wet bulb the vapour pressure falls with the dry bulb while
 * saturation rises, so the relative humidity falls from 1 at the wet bulb to 0 where the air is dry, and takes each value once.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI, eqs. 33 and 35. For the wet bulb with the enthalpy: moist-air-pairs.ts.
 */
import { assertInRange, EngineError } from '../errors';
import { bracketedNewton } from '../numerics/bracketed-newton';
import { humidityRatioFromVapourPressure } from './humidity-ratio';
import { DEW_POINT_LIMITS, vapourPressurePaUpToSaturation } from './humidity-pairs';
import { RELATIVE_HUMIDITY_LIMITS, SOLVED_K } from './moist-air-limits';
import { AIR_PRESSURE_LIMITS, DRY_BULB_LIMITS } from './moist-air-range';
import { moistAir, type MoistAir } from './moist-air-state';
import {
  bulbEquation,
  dryBulbKByPsychrometricEquation,
  vapourPressureByPsychrometricEquation,
} from './psychrometric-equation';
import { saturationPressureAndSlope, TRIPLE_POINT_K, waterVapourSaturationPressurePa } from './saturation-pressure';
import { wetBulbSurface } from './wet-bulb';

/** Far below any sensor, far above the rounding of doubles (6e-14 K). */
const TOLERANCE_K = 1e-9;

/** The span of the dry bulb: a wet bulb of air at −60 °C lies less than 0.05 K below it. */
const WET_BULB_LIMITS = { ...DRY_BULB_LIMITS, quantity: 'wetBulbK' } as const;

function assertWetBulbRange({ wetBulbK, pressurePa }: { wetBulbK: number; pressurePa: number }): void {
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(wetBulbK, WET_BULB_LIMITS);
}

const wetBulbOf = (wetBulbK: number) => ({ wetBulbK, wetBulbSurface: wetBulbSurface(wetBulbK) });

/**
 * State from wet bulb and dew point (frost point below 0.01 °C).
 * Throws `EngineError`: wet bulb outside −60 to 90 °C, dew point outside −100 to 90 °C, pressure outside 50 to 110 kPa, a dry bulb that comes out above
 * 90 °C: `out-of-range`; dew point above the wet bulb, or a wet bulb that boils: `inconsistent-inputs`.
 */
export function moistAirFromWetBulbAndDewPoint(x: {
  wetBulbK: number;
  dewPointK: number;
  pressurePa: number;
}): MoistAir {
  const { wetBulbK, dewPointK, pressurePa } = x;
  assertWetBulbRange(x);
  assertInRange(dewPointK, DEW_POINT_LIMITS);
  if (dewPointK > wetBulbK + SOLVED_K) {
    const reason = 'dew-point-above-wet-bulb';
    throw new EngineError('inconsistent-inputs', { quantity: 'dewPointK', value: dewPointK, max: wetBulbK, reason });
  }
  const vapourPressurePa = waterVapourSaturationPressurePa(dewPointK);
  const humidityRatio = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
  const dryBulbK = Math.max(dryBulbKFromWetBulb({ wetBulbK, humidityRatio, pressurePa }), dewPointK);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { wetBulb: wetBulbOf(wetBulbK), dewPointK });
}

/**
 * State from wet bulb and humidity ratio.
 * Throws `EngineError`: wet bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, humidity ratio outside 0 to 400, a dry bulb that comes out
 * above 90 °C: `out-of-range`; humidity ratio above that of air saturated at the wet bulb (`max`), or a wet bulb that boils: `inconsistent-inputs`.
 */
export function moistAirFromWetBulbAndHumidityRatio(x: {
  wetBulbK: number;
  humidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { wetBulbK, humidityRatio, pressurePa } = x;
  assertWetBulbRange(x);
  const vapourPressurePa = vapourPressurePaUpToSaturation(x, wetBulbK);
  const dryBulbK = dryBulbKFromWetBulb(x);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { wetBulb: wetBulbOf(wetBulbK), humidityRatio });
}

/** The dry bulb is not below the wet bulb: the maximum takes away the rounding where they meet. */
function dryBulbKFromWetBulb(x: { wetBulbK: number; humidityRatio: number; pressurePa: number }): number {
  const dryBulbK = Math.max(dryBulbKByPsychrometricEquation(bulbEquation(x.wetBulbK), x), x.wetBulbK);
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  return dryBulbK;
}

/**
 * State from wet bulb and relative humidity (0 to 1, over ice where the dry bulb turns out below 0.01 °C).
 * Throws `EngineError`: wet bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, relative humidity outside 0 to 1, or below the `min` at which the
 * dry bulb is 90 °C: `out-of-range`; a wet bulb that boils: `inconsistent-inputs`.
 */
export function moistAirFromWetBulbAndRelativeHumidity(x: {
  wetBulbK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { wetBulbK, relativeHumidityRatio, pressurePa } = x;
  assertWetBulbRange(x);
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  const dryBulbK = dryBulbKFromRelativeHumidity(x);
  const vapourPressurePa = relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { wetBulb: wetBulbOf(wetBulbK), relativeHumidityRatio });
}

function dryBulbKFromRelativeHumidity(x: {
  wetBulbK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): number {
  const { wetBulbK, relativeHumidityRatio, pressurePa } = x;
  const bulb = bulbEquation(wetBulbK);
  const ofDryAirK = dryBulbKByPsychrometricEquation(bulb, { wetBulbK, humidityRatio: 0, pressurePa });
  if (relativeHumidityRatio === 1) return wetBulbK;
  const highestK = Math.min(ofDryAirK, DRY_BULB_LIMITS.max);
  const imbalance = (dryBulbK: number): readonly [number, number] => {
    const [saturationPa, saturationSlope] = saturationPressureAndSlope(dryBulbK);
    const [vapourPa, vapourSlope] = vapourPressureByPsychrometricEquation(bulb, { dryBulbK, wetBulbK, pressurePa });
    return [relativeHumidityRatio * saturationPa - vapourPa, relativeHumidityRatio * saturationSlope - vapourSlope];
  };
  if (ofDryAirK > highestK) {
    const [vapourPa] = vapourPressureByPsychrometricEquation(bulb, { dryBulbK: highestK, wetBulbK, pressurePa });
    const min = vapourPa / waterVapourSaturationPressurePa(highestK);
    assertInRange(relativeHumidityRatio, { ...RELATIVE_HUMIDITY_LIMITS, min, reason: 'outside-moist-air-range' });
  }
  // split where saturation has a kink that would slow Newton
  const [lower, upper] =
    imbalance(TRIPLE_POINT_K)[0] < 0
      ? [Math.max(wetBulbK, TRIPLE_POINT_K), highestK]
      : [wetBulbK, Math.min(highestK, TRIPLE_POINT_K)];
  return bracketedNewton(imbalance, {
    lower,
    upper,
    start: lower,
    tolerance: TOLERANCE_K,
    quantity: 'dryBulbK',
  });
}
