/**
 * Pressure of the standard atmosphere below 11 km, p = 101 325 Pa (1 − 0.0065 H / 288.15)^5.25588.
 * ICAO Doc 7488/3 (1993), constants g₀ 9.806 65 m/s², R 287.052 87 J/(kg K), 0.0065 K/m, 288.15 K, 101 325 Pa (from memory). ASHRAE Handbook -
 * Fundamentals (2017) ch. 1, eq. 3 is the same curve with rounded constants, 3e-6 apart at most here. H is geopotential; taking an
 * elevation over ground for it costs 0.03 kPa at 18,000 ft. The weather moves the real pressure by far more.
 */
import { assertInRange } from '../errors';
import { lengthToM } from '../units/flow';

const SEA_LEVEL_PA = 101_325;
const SEA_LEVEL_K = 288.15;
const LAPSE_K_PER_M = 0.0065;
const EXPONENT = 9.80665 / (287.05287 * LAPSE_K_PER_M);

/** Where people and equipment are: −1,500 to 18,000 ft (our choice). */
export const ELEVATION_LIMITS = {
  quantity: 'elevationM',
  min: lengthToM(-1500, 'ft'),
  max: lengthToM(18_000, 'ft'),
  reason: 'outside-elevation-range',
} as const;

const pressurePaAt = (elevationM: number): number =>
  SEA_LEVEL_PA * (1 - (LAPSE_K_PER_M * elevationM) / SEA_LEVEL_K) ** EXPONENT;

const PRESSURE_LIMITS = {
  quantity: 'pressurePa',
  min: pressurePaAt(ELEVATION_LIMITS.max),
  max: pressurePaAt(ELEVATION_LIMITS.min),
  reason: 'outside-elevation-range',
} as const;

/** Standard atmospheric pressure in Pa, absolute, at an elevation of −457.2 to 5486.4 m above sea level, else `EngineError` `out-of-range`. */
export function standardAtmospherePressurePa(elevationM: number): number {
  assertInRange(elevationM, ELEVATION_LIMITS);
  return pressurePaAt(elevationM);
}

/** Elevation in m with that standard pressure; the inverse of `standardAtmospherePressurePa`, for 50.6 to 107.0 kPa, else `EngineError` `out-of-range`. */
export function standardAtmosphereElevationM(pressurePa: number): number {
  assertInRange(pressurePa, PRESSURE_LIMITS);
  return (SEA_LEVEL_K / LAPSE_K_PER_M) * (1 - (pressurePa / SEA_LEVEL_PA) ** (1 / EXPONENT));
}
