/**
 * Moist air from the enthalpy with dry bulb, dew point, relative humidity or humidity ratio. Eq. 30 is linear in W at a known t and linear in t at a known W.
 * At a known relative humidity W and with it the enthalpy rise with t, so each enthalpy has one dry bulb.
 * ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI, eq. 30. For the enthalpy with the wet bulb: moist-air-pairs.ts.
 */
import { assertInRange, EngineError } from '../errors';
import { bracketedNewton } from '../numerics/bracketed-newton';
import { dryBulbKByEnthalpy, enthalpyImbalance, enthalpyJPerKg, humidityRatioByEnthalpy } from './enthalpy';
import { DEW_POINT_LIMITS, PAIR_HUMIDITY_RATIO_LIMITS } from './humidity-pairs';
import {
  humidityRatioFromRelativeHumidity,
  humidityRatioFromVapourPressure,
  vapourPressurePaFromHumidityRatio,
} from './humidity-ratio';
import {
  assertMoistAirRange,
  DRY_BULB_LIMITS,
  PRESSURE_LIMITS,
  RELATIVE_HUMIDITY_LIMITS,
  SOLVED_K,
} from './moist-air-limits';
import { dewPointKOrNull, moistAir, type MoistAir } from './moist-air-state';
import { TRIPLE_POINT_K, waterVapourSaturationPressurePa } from './saturation-pressure';

/** Far below any sensor, far above the rounding of doubles (6e-14 K). */
const TOLERANCE_K = 1e-9;

/**
 * Enthalpies these pairs take: from dry air at −60 °C to 1 GJ/kg, 400 kg of vapour per kg of dry air, near which the solver's 1e-9 K begin to show
 * in the enthalpy (our choice).
 */
export const ENTHALPY_LIMITS = {
  quantity: 'enthalpyJPerKg',
  min: enthalpyJPerKg({ dryBulbK: DRY_BULB_LIMITS.min, humidityRatio: 0 }),
  max: 1e9,
  reason: 'outside-moist-air-range',
} as const;

/**
 * State from dry bulb and enthalpy.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, enthalpy outside −60.36 kJ/kg to 1 GJ/kg: `out-of-range`;
 * enthalpy below that of dry air (`min`) or above that of saturated air (`max`): `inconsistent-inputs`, reason `below-dry-air` or `above-saturation`.
 */
export function moistAirFromDryBulbAndEnthalpy(x: {
  dryBulbK: number;
  enthalpyJPerKg: number;
  pressurePa: number;
}): MoistAir {
  const { dryBulbK, enthalpyJPerKg: given, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  assertInRange(given, ENTHALPY_LIMITS);
  if (humidityRatioByEnthalpy({ dryBulbK: dryBulbK - SOLVED_K, enthalpyJPerKg: given }) < 0) {
    const min = enthalpyJPerKg({ dryBulbK, humidityRatio: 0 });
    const reason = 'below-dry-air';
    throw new EngineError('inconsistent-inputs', { quantity: 'enthalpyJPerKg', value: given, min, reason });
  }
  // what lies below dry air or above saturation by the solver's 1e-9 K is taken back to them
  const humidityRatio = Math.max(humidityRatioByEnthalpy(x), 0);
  const vapourPressurePa = vapourPressurePaFromHumidityRatio({ humidityRatio, pressurePa });
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  if (vapourPressurePa > waterVapourSaturationPressurePa(dryBulbK + SOLVED_K)) {
    const saturated = humidityRatioFromVapourPressure({ vapourPressurePa: saturationPa, pressurePa });
    const max = enthalpyJPerKg({ dryBulbK, humidityRatio: saturated });
    const reason = 'above-saturation';
    throw new EngineError('inconsistent-inputs', { quantity: 'enthalpyJPerKg', value: given, max, reason });
  }
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa: Math.min(vapourPressurePa, saturationPa) },
    { enthalpyJPerKg: given },
  );
}

/**
 * State from dew point (frost point below 0.01 °C) and enthalpy.
 * Throws `EngineError`: dew point outside −100 to 90 °C, pressure outside 50 to 110 kPa, enthalpy outside −60.36 kJ/kg to 1 GJ/kg, a dry bulb that comes out
 * outside −60 to 90 °C: `out-of-range`; enthalpy below that of air saturated at the dew point (`min`), reason `below-saturation`, or a dew point that
 * boils: `inconsistent-inputs`.
 */
export function moistAirFromDewPointAndEnthalpy(x: {
  dewPointK: number;
  enthalpyJPerKg: number;
  pressurePa: number;
}): MoistAir {
  const { dewPointK, enthalpyJPerKg: given, pressurePa } = x;
  assertInRange(pressurePa, PRESSURE_LIMITS);
  assertInRange(dewPointK, DEW_POINT_LIMITS);
  assertInRange(given, ENTHALPY_LIMITS);
  const vapourPressurePa = waterVapourSaturationPressurePa(dewPointK);
  const humidityRatio = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
  const dryBulbK = dryBulbKFromDewPoint({ ...x, humidityRatio });
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { dewPointK, enthalpyJPerKg: given });
}

/**
 * State from humidity ratio and enthalpy.
 * Throws `EngineError`: pressure outside 50 to 110 kPa, humidity ratio outside 0 to 400, enthalpy outside −60.36 kJ/kg to 1 GJ/kg, a dry bulb that
 * comes out outside −60 to 90 °C: `out-of-range`; enthalpy below that of saturated air of this humidity ratio (`min`): `inconsistent-inputs`, reason
 * `below-saturation`.
 */
export function moistAirFromHumidityRatioAndEnthalpy(x: {
  humidityRatio: number;
  enthalpyJPerKg: number;
  pressurePa: number;
}): MoistAir {
  const { humidityRatio, enthalpyJPerKg: given, pressurePa } = x;
  assertInRange(pressurePa, PRESSURE_LIMITS);
  assertInRange(humidityRatio, PAIR_HUMIDITY_RATIO_LIMITS);
  assertInRange(given, ENTHALPY_LIMITS);
  const vapourPressurePa = vapourPressurePaFromHumidityRatio(x);
  const dewPointK = dewPointKOrNull(vapourPressurePa, Infinity);
  const dryBulbK = dryBulbKFromDewPoint({ ...x, dewPointK });
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa: Math.min(vapourPressurePa, saturationPa) },
    { humidityRatio, enthalpyJPerKg: given },
  );
}

/** Dry bulb in K of air of a known humidity and enthalpy: not below the dew point, if it has one, but for the solver's 1e-9 K. */
function dryBulbKFromDewPoint(x: {
  dewPointK: number | null;
  humidityRatio: number;
  enthalpyJPerKg: number;
  pressurePa: number;
}): number {
  const { dewPointK, humidityRatio, pressurePa } = x;
  const warmK = dryBulbKByEnthalpy(x);
  const dryBulbK = Math.max(warmK, dewPointK ?? warmK);
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  if (dewPointK === null || warmK >= dewPointK) return dryBulbK;
  const justBelowK = dewPointK - SOLVED_K;
  const vapourPressurePa = waterVapourSaturationPressurePa(justBelowK);
  const justDrier = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
  if (dryBulbKByEnthalpy({ ...x, humidityRatio: justDrier }) >= justBelowK) return dryBulbK;
  const min = enthalpyJPerKg({ dryBulbK: dewPointK, humidityRatio });
  const reason = 'below-saturation';
  throw new EngineError('inconsistent-inputs', { quantity: 'enthalpyJPerKg', value: x.enthalpyJPerKg, min, reason });
}

/**
 * State from relative humidity (0 to 1, over ice where the dry bulb turns out below 0.01 °C) and enthalpy.
 * Throws `EngineError`: pressure outside 50 to 110 kPa, relative humidity outside 0 to 1, enthalpy outside that of this relative humidity from −60 to 90 °C
 * (`min`, `max`), or above 1 GJ/kg: `out-of-range`.
 */
export function moistAirFromRelativeHumidityAndEnthalpy(x: {
  relativeHumidityRatio: number;
  enthalpyJPerKg: number;
  pressurePa: number;
}): MoistAir {
  const { relativeHumidityRatio, enthalpyJPerKg: given, pressurePa } = x;
  assertInRange(pressurePa, PRESSURE_LIMITS);
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  assertInRange(given, { ...ENTHALPY_LIMITS, ...enthalpySpan(x) });
  // split where saturation has a kink that would slow Newton
  const [lower, upper] =
    enthalpyImbalance(x, TRIPLE_POINT_K)[0] > 0
      ? [TRIPLE_POINT_K, DRY_BULB_LIMITS.max]
      : [DRY_BULB_LIMITS.min, TRIPLE_POINT_K];
  const dryBulbK = bracketedNewton((trialK) => enthalpyImbalance(x, trialK), {
    lower,
    upper,
    start: dryBulbKByEnthalpy({ humidityRatio: 0, enthalpyJPerKg: given }),
    tolerance: TOLERANCE_K,
    quantity: 'dryBulbK',
  });
  const vapourPressurePa = relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { relativeHumidityRatio, enthalpyJPerKg: given });
}

/** Enthalpies of a relative humidity from −60 °C to 90 °C, or to 1 GJ/kg where the vapour boils before. */
function enthalpySpan(x: { relativeHumidityRatio: number; pressurePa: number }): { min: number; max: number } {
  const at = (dryBulbK: number) =>
    enthalpyJPerKg({ dryBulbK, humidityRatio: humidityRatioFromRelativeHumidity({ ...x, dryBulbK }) });
  const boils = x.relativeHumidityRatio * waterVapourSaturationPressurePa(DRY_BULB_LIMITS.max) >= x.pressurePa;
  return {
    min: at(DRY_BULB_LIMITS.min),
    max: boils ? ENTHALPY_LIMITS.max : Math.min(at(DRY_BULB_LIMITS.max), ENTHALPY_LIMITS.max),
  };
}
