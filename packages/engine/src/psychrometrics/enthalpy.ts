/**
 * Enthalpy of moist air and the ways back from it, per mass of dry air; zero is dry air at 0 °C (SI) or 0 °F (inch-pound) with liquid water at 0 °C.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, eq. 30; SI, t in °C: h = 1.006 t + W (2501 + 1.86 t) kJ/kg
 */
import { assertInRange } from '../errors';
import { MOLAR_MASS_RATIO } from './humidity-ratio';
import { HUMIDITY_RATIO_LIMITS } from './moist-air-limits';
import { DRY_BULB_LIMITS } from './moist-air-range';
import { FREEZING_K } from './psychrometric-equation';
import { saturationPressureAndSlope } from './saturation-pressure';

/** Eq. 30 in one system of units, h = dryAirAtFreezing + dryAirHeat t + W (vapourAtFreezing + vapourHeat t) with t in °C. */
export interface EnthalpyEquation {
  readonly quantity: 'enthalpyJPerKg' | 'enthalpyBtuPerLb';
  /** Of `quantity` in one unit of the printed equation. */
  readonly scale: number;
  readonly dryAirAtFreezing: number;
  readonly dryAirHeat: number;
  readonly vapourAtFreezing: number;
  readonly vapourHeat: number;
}

/** Eq. 30 SI, in kJ/kg. */
export const SI_ENTHALPY: EnthalpyEquation = {
  quantity: 'enthalpyJPerKg',
  scale: 1e3,
  dryAirAtFreezing: 0,
  dryAirHeat: 1.006,
  vapourAtFreezing: 2501,
  vapourHeat: 1.86,
};

/**
 * Eq. 30 IP, 0.240 t + W (1061 + 0.444 t) in Btu/lb with t in °F, written for °C. Zero is dry air at 0 °F. Its constants are rounded by themselves, so that
 * no factor leads from one equation to the other: they are up to 0.04 Btu/lb apart from 0 to 120 °F.
 */
export const INCH_POUND_ENTHALPY: EnthalpyEquation = {
  quantity: 'enthalpyBtuPerLb',
  scale: 1,
  dryAirAtFreezing: 0.24 * 32,
  dryAirHeat: 0.24 * 1.8,
  vapourAtFreezing: 1061 + 0.444 * 32,
  vapourHeat: 0.444 * 1.8,
};

/**
 * Enthalpy of moist air by one equation, per mass of dry air.
 * Dry bulb outside −60 to 90 °C, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export function enthalpyBy(equation: EnthalpyEquation, x: { dryBulbK: number; humidityRatio: number }): number {
  assertInRange(x.dryBulbK, DRY_BULB_LIMITS);
  assertInRange(x.humidityRatio, HUMIDITY_RATIO_LIMITS);
  const { scale, dryAirAtFreezing, dryAirHeat, vapourAtFreezing, vapourHeat } = equation;
  const t = x.dryBulbK - FREEZING_K;
  return scale * (dryAirAtFreezing + dryAirHeat * t + x.humidityRatio * (vapourAtFreezing + vapourHeat * t));
}

/**
 * Enthalpy of moist air in J per kg of dry air, 1.006 t + W (2501 + 1.86 t) in kJ (ASHRAE Fundamentals (2017) ch. 1, eq. 30).
 * Dry bulb outside −60 to 90 °C, humidity ratio negative or not finite: `EngineError` `out-of-range`.
 */
export const enthalpyJPerKg = (x: { dryBulbK: number; humidityRatio: number }): number => enthalpyBy(SI_ENTHALPY, x);

/** What the enthalpy holds above dry air at 0 °C, in the units of the printed equation. */
const aboveFreezing = ({ scale, dryAirAtFreezing }: EnthalpyEquation, enthalpy: number): number =>
  enthalpy / scale - dryAirAtFreezing;

/** Eq. 30 solved for the humidity ratio: negative where even dry air would hold more. The caller has checked the ranges. */
export function humidityRatioByEnthalpy(equation: EnthalpyEquation, x: { dryBulbK: number; enthalpy: number }): number {
  const { dryAirHeat, vapourAtFreezing, vapourHeat } = equation;
  const t = x.dryBulbK - FREEZING_K;
  return (aboveFreezing(equation, x.enthalpy) - dryAirHeat * t) / (vapourAtFreezing + vapourHeat * t);
}

/** Eq. 30 solved for the dry bulb in K, wherever it may lie. */
export function dryBulbKByEnthalpy(equation: EnthalpyEquation, x: { humidityRatio: number; enthalpy: number }): number {
  const { dryAirHeat, vapourAtFreezing, vapourHeat } = equation;
  const sensible = aboveFreezing(equation, x.enthalpy) - x.humidityRatio * vapourAtFreezing;
  return FREEZING_K + sensible / (dryAirHeat + x.humidityRatio * vapourHeat);
}

/**
 * What an enthalpy has too much for air of a relative humidity at a trial dry bulb, and the analytic slope per K: zero at the dry bulb, falling
 * throughout, so that there is only one. Written, in SI, as (h − 1.006 t) (p − p_w) − ε p_w (2501 + 1.86 t), which has no pole where the vapour boils.
 */
export function enthalpyImbalance(
  equation: EnthalpyEquation,
  air: { relativeHumidityRatio: number; enthalpy: number; pressurePa: number },
  dryBulbK: number,
): readonly [value: number, slope: number] {
  const { dryAirHeat, vapourAtFreezing, vapourHeat } = equation;
  const t = dryBulbK - FREEZING_K;
  const [saturationPa, saturationSlope] = saturationPressureAndSlope(dryBulbK);
  const vapourPa = air.relativeHumidityRatio * saturationPa;
  const dryAirPa = air.pressurePa - vapourPa;
  const latent = MOLAR_MASS_RATIO * (vapourAtFreezing + vapourHeat * t);
  const left = aboveFreezing(equation, air.enthalpy) - dryAirHeat * t;
  return [
    left * dryAirPa - latent * vapourPa,
    -dryAirHeat * dryAirPa -
      (left + latent) * air.relativeHumidityRatio * saturationSlope -
      MOLAR_MASS_RATIO * vapourHeat * vapourPa,
  ];
}
