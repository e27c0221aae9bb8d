/**
 * Moist air from the enthalpy with dry bulb, dew point, relative humidity or humidity ratio. Eq. 30 is linear in W at a known t and linear in t at a known W.
 * At a known relative humidity W and with it the enthalpy rise with t, so each enthalpy has one dry bulb.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, eq. 30, SI or inch-pound. For the enthalpy with the wet bulb: moist-air-pairs.ts.
 */
import { assertInRange, EngineError } from '../errors';
import { bracketedNewton } from '../numerics/bracketed-newton';
import { specificEnergyDifferenceToBtuPerLb } from '../units/moist-air';
import { dryBulbKByEnthalpy, enthalpyBy, enthalpyImbalance, humidityRatioByEnthalpy, SI_ENTHALPY } from './enthalpy';
import type { EnthalpyEquation } from './enthalpy';
import { DEW_POINT_LIMITS, PAIR_HUMIDITY_RATIO_LIMITS } from './humidity-pairs';
import {
  humidityRatioFromRelativeHumidity,
  humidityRatioFromVapourPressure,
  vapourPressurePaFromHumidityRatio,
} from './humidity-ratio';
import { assertMoistAirRange, RELATIVE_HUMIDITY_LIMITS, SOLVED_K } from './moist-air-limits';
import { AIR_PRESSURE_LIMITS, DRY_BULB_LIMITS } from './moist-air-range';
import { dewPointKOrNull, moistAir, type MoistAir } from './moist-air-state';
import { TRIPLE_POINT_K, waterVapourSaturationPressurePa } from './saturation-pressure';

/** Far below any sensor, far above the rounding of doubles (6e-14 K). */
const TOLERANCE_K = 1e-9;

const MOST_J_PER_KG = 1e9;

/**
 * Enthalpies these pairs take: from dry air at −60 °C to 1 GJ/kg, 400 kg of vapour per kg of dry air, near which the solver's 1e-9 K begin to show
 * in the enthalpy (our choice).
 */
export const enthalpyLimits = (equation: EnthalpyEquation) =>
  ({
    quantity: equation.quantity,
    min: enthalpyBy(equation, { dryBulbK: DRY_BULB_LIMITS.min, humidityRatio: 0 }),
    max: equation === SI_ENTHALPY ? MOST_J_PER_KG : specificEnergyDifferenceToBtuPerLb(MOST_J_PER_KG),
    reason: 'outside-moist-air-range',
  }) as const;

/** What an enthalpy of one equation gives back: the SI one to the last digit, the other by the state it leads to. */
const asGiven = (equation: EnthalpyEquation, enthalpy: number): { readonly enthalpyJPerKg?: number } =>
  equation === SI_ENTHALPY ? { enthalpyJPerKg: enthalpy } : {};

export interface WithEnthalpy {
  /** In the unit of the equation, per mass of dry air. */
  readonly enthalpy: number;
  readonly pressurePa: number;
}

/**
 * State from dry bulb and enthalpy.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, enthalpy outside −60.36 kJ/kg to 1 GJ/kg: `out-of-range`;
 * enthalpy below that of dry air (`min`) or above that of saturated air (`max`): `inconsistent-inputs`, reason `below-dry-air` or `above-saturation`.
 */
export function moistAirFromDryBulbAndEnthalpy(
  equation: EnthalpyEquation,
  x: WithEnthalpy & { readonly dryBulbK: number },
): MoistAir {
  const { dryBulbK, enthalpy, pressurePa } = x;
  const { quantity } = equation;
  assertMoistAirRange(dryBulbK, pressurePa);
  assertInRange(enthalpy, enthalpyLimits(equation));
  if (humidityRatioByEnthalpy(equation, { dryBulbK: dryBulbK - SOLVED_K, enthalpy }) < 0) {
    const min = enthalpyBy(equation, { dryBulbK, humidityRatio: 0 });
    throw new EngineError('inconsistent-inputs', { quantity, value: enthalpy, min, reason: 'below-dry-air' });
  }
  // what lies below dry air or above saturation by the solver's 1e-9 K is taken back to them
  const humidityRatio = Math.max(humidityRatioByEnthalpy(equation, x), 0);
  const vapourPressurePa = vapourPressurePaFromHumidityRatio({ humidityRatio, pressurePa });
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  if (vapourPressurePa > waterVapourSaturationPressurePa(dryBulbK + SOLVED_K)) {
    const saturated = humidityRatioFromVapourPressure({ vapourPressurePa: saturationPa, pressurePa });
    const max = enthalpyBy(equation, { dryBulbK, humidityRatio: saturated });
    throw new EngineError('inconsistent-inputs', { quantity, value: enthalpy, max, reason: 'above-saturation' });
  }
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa: Math.min(vapourPressurePa, saturationPa) },
    asGiven(equation, enthalpy),
  );
}

/**
 * State from dew point (frost point below 0.01 °C) and enthalpy.
 * Throws `EngineError`: dew point outside −100 to 90 °C, pressure outside 50 to 110 kPa, enthalpy outside −60.36 kJ/kg to 1 GJ/kg, a dry bulb that comes out
 * outside −60 to 90 °C: `out-of-range`; enthalpy below that of air saturated at the dew point (`min`), reason `below-saturation`, or a dew point that
 * boils: `inconsistent-inputs`.
 */
export function moistAirFromDewPointAndEnthalpy(
  equation: EnthalpyEquation,
  x: WithEnthalpy & { readonly dewPointK: number },
): MoistAir {
  const { dewPointK, enthalpy, pressurePa } = x;
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(dewPointK, DEW_POINT_LIMITS);
  assertInRange(enthalpy, enthalpyLimits(equation));
  const vapourPressurePa = waterVapourSaturationPressurePa(dewPointK);
  const humidityRatio = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
  const dryBulbK = dryBulbKFromDewPoint(equation, { ...x, humidityRatio });
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { dewPointK, ...asGiven(equation, enthalpy) });
}

/**
 * State from humidity ratio and enthalpy.
 * Throws `EngineError`: pressure outside 50 to 110 kPa, humidity ratio outside 0 to 400, enthalpy outside −60.36 kJ/kg to 1 GJ/kg, a dry bulb that
 * comes out outside −60 to 90 °C: `out-of-range`; enthalpy below that of saturated air of this humidity ratio (`min`): `inconsistent-inputs`, reason
 * `below-saturation`.
 */
export function moistAirFromHumidityRatioAndEnthalpy(
  equation: EnthalpyEquation,
  x: WithEnthalpy & { readonly humidityRatio: number },
): MoistAir {
  const { humidityRatio, enthalpy, pressurePa } = x;
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(humidityRatio, PAIR_HUMIDITY_RATIO_LIMITS);
  assertInRange(enthalpy, enthalpyLimits(equation));
  const vapourPressurePa = vapourPressurePaFromHumidityRatio(x);
  const dewPointK = dewPointKOrNull(vapourPressurePa, Infinity);
  const dryBulbK = dryBulbKFromDewPoint(equation, { ...x, dewPointK });
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa: Math.min(vapourPressurePa, saturationPa) },
    { humidityRatio, ...asGiven(equation, enthalpy) },
  );
}

/** Dry bulb in K of air of a known humidity and enthalpy: not below the dew point, if it has one, but for the solver's 1e-9 K. */
function dryBulbKFromDewPoint(
  equation: EnthalpyEquation,
  x: WithEnthalpy & { readonly dewPointK: number | null; readonly humidityRatio: number },
): number {
  const { dewPointK, humidityRatio, enthalpy, pressurePa } = x;
  const warmK = dryBulbKByEnthalpy(equation, x);
  const dryBulbK = Math.max(warmK, dewPointK ?? warmK);
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  if (dewPointK === null || warmK >= dewPointK) return dryBulbK;
  const justBelowK = dewPointK - SOLVED_K;
  const vapourPressurePa = waterVapourSaturationPressurePa(justBelowK);
  const justDrier = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
  if (dryBulbKByEnthalpy(equation, { ...x, humidityRatio: justDrier }) >= justBelowK) return dryBulbK;
  const { quantity } = equation;
  const min = enthalpyBy(equation, { dryBulbK: dewPointK, humidityRatio });
  throw new EngineError('inconsistent-inputs', { quantity, value: enthalpy, min, reason: 'below-saturation' });
}

/**
 * State from relative humidity (0 to 1, over ice where the dry bulb turns out below 0.01 °C) and enthalpy.
 * Throws `EngineError`: pressure outside 50 to 110 kPa, relative humidity outside 0 to 1, enthalpy outside that of this relative humidity from −60 to 90 °C
 * (`min`, `max`), or above 1 GJ/kg: `out-of-range`.
 */
export function moistAirFromRelativeHumidityAndEnthalpy(
  equation: EnthalpyEquation,
  x: WithEnthalpy & { readonly relativeHumidityRatio: number },
): MoistAir {
  const { relativeHumidityRatio, enthalpy, pressurePa } = x;
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  assertInRange(enthalpy, { ...enthalpyLimits(equation), ...enthalpySpan(equation, x) });
  // split where saturation has a kink that would slow Newton
  const [lower, upper] =
    enthalpyImbalance(equation, x, TRIPLE_POINT_K)[0] > 0
      ? [TRIPLE_POINT_K, DRY_BULB_LIMITS.max]
      : [DRY_BULB_LIMITS.min, TRIPLE_POINT_K];
  const dryBulbK = bracketedNewton((trialK) => enthalpyImbalance(equation, x, trialK), {
    lower,
    upper,
    start: dryBulbKByEnthalpy(equation, { humidityRatio: 0, enthalpy }),
    tolerance: TOLERANCE_K,
    quantity: 'dryBulbK',
  });
  const vapourPressurePa = relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK);
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa },
    { relativeHumidityRatio, ...asGiven(equation, enthalpy) },
  );
}

/** Enthalpies of a relative humidity from −60 °C to 90 °C, or to 1 GJ/kg where the vapour boils before. */
function enthalpySpan(
  equation: EnthalpyEquation,
  x: { relativeHumidityRatio: number; pressurePa: number },
): { min: number; max: number } {
  const { max: most } = enthalpyLimits(equation);
  const at = (dryBulbK: number) =>
    enthalpyBy(equation, { dryBulbK, humidityRatio: humidityRatioFromRelativeHumidity({ ...x, dryBulbK }) });
  const boils = x.relativeHumidityRatio * waterVapourSaturationPressurePa(DRY_BULB_LIMITS.max) >= x.pressurePa;
  return {
    min: at(DRY_BULB_LIMITS.min),
    max: boils ? most : Math.min(at(DRY_BULB_LIMITS.max), most),
  };
}
