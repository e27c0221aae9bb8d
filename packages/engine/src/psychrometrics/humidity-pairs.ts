/**
 * Moist air from the pairs of humidity that need no wet bulb and no enthalpy: dry bulb with humidity ratio, relative humidity with dew point or
 * humidity ratio. Saturation pressure rises with temperature, so the last two have one dry bulb, where p_ws = p_w / φ.
 * Ideal-gas relations of ASHRAE Handbook - Fundamentals (2017, 2021), ch. 1, SI.
 */
import { assertInRange, EngineError } from '../errors';
import { dewPointKFromVapourPressure } from './dew-point';
import { humidityRatioFromVapourPressure, vapourPressurePaFromHumidityRatio } from './humidity-ratio';
import { assertMoistAirRange, RELATIVE_HUMIDITY_LIMITS, SOLVED_K } from './moist-air-limits';
import { AIR_PRESSURE_LIMITS, DRY_BULB_LIMITS } from './moist-air-range';
import { moistAir, type MoistAir } from './moist-air-state';
import { SATURATION_LIMITS, waterVapourSaturationPressurePa } from './saturation-pressure';

/** Dew points of air in the range of this layer: from where eq. 5 ends to the highest dry bulb. */
export const DEW_POINT_LIMITS = {
  quantity: 'dewPointK',
  min: SATURATION_LIMITS.min,
  max: DRY_BULB_LIMITS.max,
  reason: 'outside-moist-air-range',
} as const;

/**
 * Humidity ratios the pairs take, 0 to 400: hardly any air is left in 400 kg of vapour per kg, and far beyond it the vapour pressure can no longer
 * hold the humidity ratio that was given (our choice).
 */
export const PAIR_HUMIDITY_RATIO_LIMITS = {
  quantity: 'humidityRatio',
  min: 0,
  max: 400,
  reason: 'outside-moist-air-range',
} as const;

const COLDEST_PA = waterVapourSaturationPressurePa(DRY_BULB_LIMITS.min);
const HOTTEST_PA = waterVapourSaturationPressurePa(DRY_BULB_LIMITS.max);

/**
 * Vapour pressure in Pa of a humidity ratio, 0 to 400, that air saturated at a temperature can hold; where it cannot, `EngineError`
 * `inconsistent-inputs`, reason `above-saturation`. What is above by the solver's 1e-9 K is saturated.
 */
export function vapourPressurePaUpToSaturation(
  x: { humidityRatio: number; pressurePa: number },
  saturatedK: number,
): number {
  assertInRange(x.humidityRatio, PAIR_HUMIDITY_RATIO_LIMITS);
  const vapourPressurePa = vapourPressurePaFromHumidityRatio(x);
  const saturationPa = waterVapourSaturationPressurePa(saturatedK);
  if (vapourPressurePa <= waterVapourSaturationPressurePa(saturatedK + SOLVED_K)) {
    return Math.min(vapourPressurePa, saturationPa);
  }
  const max = humidityRatioFromVapourPressure({ vapourPressurePa: saturationPa, pressurePa: x.pressurePa });
  const reason = 'above-saturation';
  throw new EngineError('inconsistent-inputs', { quantity: 'humidityRatio', value: x.humidityRatio, max, reason });
}

/**
 * State from dry bulb and humidity ratio.
 * Throws `EngineError`: dry bulb outside −60 to 90 °C, pressure outside 50 to 110 kPa, humidity ratio outside 0 to 400: `out-of-range`;
 * humidity ratio above saturation (`max`): `inconsistent-inputs`.
 */
export function moistAirFromDryBulbAndHumidityRatio(x: {
  dryBulbK: number;
  humidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { dryBulbK, humidityRatio, pressurePa } = x;
  assertMoistAirRange(dryBulbK, pressurePa);
  const vapourPressurePa = vapourPressurePaUpToSaturation(x, dryBulbK);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { humidityRatio });
}

/**
 * State from dew point (frost point below 0.01 °C) and relative humidity (over ice where the dry bulb turns out below 0.01 °C).
 * Throws `EngineError`: dew point outside −100 to 90 °C, pressure outside 50 to 110 kPa, relative humidity outside 0 to 1, or outside the `min` and `max`
 * between which the dry bulb is −60 to 90 °C (so 0 is refused: dry air has no dew point): `out-of-range`; dew point boiling: `inconsistent-inputs`.
 */
export function moistAirFromDewPointAndRelativeHumidity(x: {
  dewPointK: number;
  relativeHumidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { dewPointK, relativeHumidityRatio, pressurePa } = x;
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(dewPointK, DEW_POINT_LIMITS);
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  const vapourPressurePa = waterVapourSaturationPressurePa(dewPointK);
  // at saturation the two are one and the solver's 1e-9 K are spared
  const solvedK = relativeHumidityRatio === 1 ? dewPointK : dryBulbKFromVapour(vapourPressurePa, relativeHumidityRatio);
  const dryBulbK = Math.max(solvedK, dewPointK);
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  return moistAir({ dryBulbK, pressurePa, vapourPressurePa }, { dewPointK, relativeHumidityRatio });
}

/**
 * State from relative humidity (over ice where the dry bulb turns out below 0.01 °C) and humidity ratio.
 * Throws `EngineError`: pressure outside 50 to 110 kPa, humidity ratio outside 0 to 400 or above that of saturated air at 90 °C, relative humidity
 * outside 0 to 1, or outside the `min` and `max` between which the dry bulb is −60 to 90 °C: `out-of-range`; both 0, which is dry air of any
 * temperature: `not-supported`, reason `dependent-pair`.
 */
export function moistAirFromRelativeHumidityAndHumidityRatio(x: {
  relativeHumidityRatio: number;
  humidityRatio: number;
  pressurePa: number;
}): MoistAir {
  const { relativeHumidityRatio, humidityRatio, pressurePa } = x;
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
  assertInRange(humidityRatio, { ...PAIR_HUMIDITY_RATIO_LIMITS, max: mostHumidityRatio(pressurePa) });
  assertInRange(relativeHumidityRatio, RELATIVE_HUMIDITY_LIMITS);
  if (relativeHumidityRatio === 0 && humidityRatio === 0) {
    throw new EngineError('not-supported', { quantity: 'humidityRatio', value: 0, reason: 'dependent-pair' });
  }
  const vapourPressurePa = vapourPressurePaFromHumidityRatio(x);
  const dryBulbK = dryBulbKFromVapour(vapourPressurePa, relativeHumidityRatio);
  const saturationPa = waterVapourSaturationPressurePa(dryBulbK);
  // the minimum takes away the solver's 1e-9 K where the air is saturated
  return moistAir(
    { dryBulbK, pressurePa, vapourPressurePa: Math.min(vapourPressurePa, saturationPa) },
    { relativeHumidityRatio, humidityRatio },
  );
}

/** Where saturation at 90 °C leaves no dry air, any humidity is possible below it. */
const mostHumidityRatio = (pressurePa: number): number => {
  const { max } = PAIR_HUMIDITY_RATIO_LIMITS;
  if (HOTTEST_PA >= pressurePa) return max;
  return Math.min(humidityRatioFromVapourPressure({ vapourPressurePa: HOTTEST_PA, pressurePa }), max);
};

/** Dry bulb in K, −60 to 90 °C, where vapour has a relative humidity; else `EngineError` `out-of-range` for the relative humidity. */
function dryBulbKFromVapour(vapourPressurePa: number, relativeHumidityRatio: number): number {
  const min = vapourPressurePa / HOTTEST_PA;
  const max = Math.min(vapourPressurePa / COLDEST_PA, 1);
  assertInRange(relativeHumidityRatio, {
    quantity: 'relativeHumidityRatio',
    min,
    max,
    reason: 'outside-moist-air-range',
  });
  const dryBulbK = dewPointKFromVapourPressure(vapourPressurePa / relativeHumidityRatio);
  // in range by the check above: only the solver's 1e-9 K are taken away
  return Math.min(Math.max(dryBulbK, DRY_BULB_LIMITS.min), DRY_BULB_LIMITS.max);
}
