/**
 * The psychrometric equation: adiabatic saturation of air by a wet or an iced bulb.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI, eqs. 33 (liquid, t* ≥ 0 °C) and 35 (ice, t* < 0 °C), t and t* in °C:
 *   W = [(a − b t*) Ws* − 1.006 (t − t*)] / (a + 1.86 t − c t*)
 */
import { temperatureToK } from '../units/temperature';
import { humidityRatioFromVapourPressure, MOLAR_MASS_RATIO } from './humidity-ratio';
import { saturationPressureAndSlope, type SaturationPressure } from './saturation-pressure';

/** What wets the bulb: liquid water from 0 °C up, ice below. */
export type WetBulbSurface = 'water' | 'ice';

/** Printed constants of one bulb, in kJ/kg and kJ/(kg K). */
export interface BulbEquation {
  readonly a: number;
  readonly b: number;
  readonly c: number;
}

export const WATER_BULB: BulbEquation = { a: 2501, b: 2.326, c: 4.186 }; // eq. 33
export const ICE_BULB: BulbEquation = { a: 2830, b: 0.24, c: 2.1 }; // eq. 35

/** kJ/(kg K) of dry air and of water vapour in eqs. 33 and 35. */
const DRY_AIR_HEAT = 1.006;
const VAPOUR_HEAT = 1.86;

/** Where t and t* count from, and where the bulb freezes. */
export const FREEZING_K = temperatureToK(0, 'degC');

/** The equation of a measured bulb, taken at its word: eq. 33 from 0 °C up, eq. 35 below. */
export const bulbEquation = (wetBulbK: number): BulbEquation => (wetBulbK >= FREEZING_K ? WATER_BULB : ICE_BULB);

/**
 * Humidity ratio by eq. 33 or 35 as printed. The caller has checked the ranges and that the wet bulb is not above the dry bulb.
 * Negative where even dry air would show more; `EngineError` `inconsistent-inputs` where the wet bulb would boil at this pressure.
 */
export function humidityRatioByPsychrometricEquation(
  { a, b, c }: BulbEquation,
  x: { dryBulbK: number; wetBulbK: number; pressurePa: number },
): number {
  const [vapourPressurePa] = saturationPressureAndSlope(x.wetBulbK);
  const saturated = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa: x.pressurePa });
  const t = x.dryBulbK - FREEZING_K;
  const tStar = x.wetBulbK - FREEZING_K;
  return ((a - b * tStar) * saturated - DRY_AIR_HEAT * (t - tStar)) / (a + VAPOUR_HEAT * t - c * tStar);
}

/**
 * Dry bulb in K at which a wet bulb stands for a humidity ratio: eq. 33 or 35 solved for t, wherever it may lie. It is the wet bulb itself at
 * saturation, where b = c − 1.86, and the drier the air the higher. `EngineError` `inconsistent-inputs` where the wet bulb would boil.
 */
export function dryBulbKByPsychrometricEquation(
  { a, b, c }: BulbEquation,
  x: { wetBulbK: number; humidityRatio: number; pressurePa: number },
): number {
  const [vapourPressurePa] = saturationPressureAndSlope(x.wetBulbK);
  const saturated = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa: x.pressurePa });
  const W = x.humidityRatio;
  const tStar = x.wetBulbK - FREEZING_K;
  const heat = (a - b * tStar) * saturated + DRY_AIR_HEAT * tStar - W * (a - c * tStar);
  return FREEZING_K + heat / (DRY_AIR_HEAT + W * VAPOUR_HEAT);
}

/**
 * Vapour pressure in Pa that a wet bulb stands for at a trial dry bulb, by eq. 33 or 35 and eq. 20, and its analytic slope per K of dry bulb, which is
 * negative throughout.
 */
export function vapourPressureByPsychrometricEquation(
  bulb: BulbEquation,
  x: { dryBulbK: number; wetBulbK: number; pressurePa: number },
): readonly [pressurePa: number, slopePaPerK: number] {
  const W = humidityRatioByPsychrometricEquation(bulb, x);
  const denominator = bulb.a + VAPOUR_HEAT * (x.dryBulbK - FREEZING_K) - bulb.c * (x.wetBulbK - FREEZING_K);
  const slope = -(DRY_AIR_HEAT + VAPOUR_HEAT * W) / denominator;
  const moles = MOLAR_MASS_RATIO + W;
  return [(x.pressurePa * W) / moles, (x.pressurePa * MOLAR_MASS_RATIO * slope) / (moles * moles)];
}

export interface HumidAir {
  readonly dryBulbK: number;
  readonly humidityRatio: number;
  readonly pressurePa: number;
}

/**
 * Imbalance of eq. 33 or 35 at a trial wet bulb, and its analytic slope per K: negative below the wet bulb, zero there, rising throughout.
 * Written as (a − b t*) ε ps* − [W (a + 1.86 t − c t*) + 1.006 (t − t*)] (p − ps*), which has no pole where ps* reaches the total pressure.
 * `saturation` is that at the wet bulb, for callers that have it already.
 */
export function wetBulbImbalance(
  bulb: BulbEquation,
  air: HumidAir,
  wetBulbK: number,
  saturation: SaturationPressure = saturationPressureAndSlope(wetBulbK),
): readonly [value: number, slope: number] {
  const W = air.humidityRatio;
  const t = air.dryBulbK - FREEZING_K;
  const tStar = wetBulbK - FREEZING_K;
  const saturationPa = saturation[0];
  const dryAirPa = air.pressurePa - saturationPa;
  const latent = (bulb.a - bulb.b * tStar) * MOLAR_MASS_RATIO;
  const sensible = W * (bulb.a + VAPOUR_HEAT * t - bulb.c * tStar) + DRY_AIR_HEAT * (t - tStar);
  return [
    latent * saturationPa - sensible * dryAirPa,
    (latent + sensible) * saturation[1] -
      bulb.b * MOLAR_MASS_RATIO * saturationPa +
      (W * bulb.c + DRY_AIR_HEAT) * dryAirPa,
  ];
}

/** Bound of |f″ / 2f′| of `wetBulbImbalance` over the range of this layer (largest found 0.024); a spec checks it. */
export const WET_BULB_CURVATURE_PER_K = 0.03;

/** Relative fall of d ln ps / dT per K, −(ln ps)″ / (ln ps)′: 0.0078 over water at 20 °C. Serves the first guess only. */
const LN_SLOPE_FALL = 0.0078;

/**
 * First guess of the wet bulb: one step of Halley's method from the upper end of its branch, mostly within 0.1 K for room air where a
 * Newton step misses by up to 10 K. Only the speed of the solution depends on it.
 */
export function wetBulbGuessK(
  bulb: BulbEquation,
  air: HumidAir,
  upperK: number,
  saturation: SaturationPressure,
): number {
  const [value, slope] = wetBulbImbalance(bulb, air, upperK, saturation);
  const [pressurePa, slopePaPerK] = saturation;
  const bend = slopePaPerK / pressurePa - LN_SLOPE_FALL;
  const heat =
    bulb.a * (MOLAR_MASS_RATIO + air.humidityRatio) * bend -
    2 * (bulb.b * MOLAR_MASS_RATIO + air.humidityRatio * bulb.c + DRY_AIR_HEAT);
  return upperK - (2 * value * slope) / (2 * slope * slope - value * heat * slopePaPerK);
}
