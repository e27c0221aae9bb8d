import { assertInRange, EngineError } from '../errors';
import { AIR_PRESSURE_LIMITS, DRY_BULB_LIMITS } from './moist-air-range';

export const RELATIVE_HUMIDITY_LIMITS = {
  quantity: 'relativeHumidityRatio',
  min: 0,
  max: 1,
  reason: 'outside-0-to-1',
} as const;

export const VAPOUR_PRESSURE_LIMITS = {
  quantity: 'vapourPressurePa',
  min: 0,
  reason: 'negative-or-not-finite',
} as const;

export const HUMIDITY_RATIO_LIMITS = {
  quantity: 'humidityRatio',
  min: 0,
  max: Number.MAX_VALUE,
  reason: 'negative-or-not-finite',
} as const;

/**
 * What two readings of one state, each solved to 1e-9 K and put back, may contradict each other by, in K: rounding where the air is saturated or dry,
 * and no fault of the readings.
 */
export const SOLVED_K = 2e-9;

/** Refuses a dry bulb or a pressure outside the range of this layer, NaN included. */
export function assertMoistAirRange(dryBulbK: number, pressurePa: number): void {
  assertInRange(dryBulbK, DRY_BULB_LIMITS);
  assertInRange(pressurePa, AIR_PRESSURE_LIMITS);
}

/** Refuses water vapour that would leave no dry air: its pressure must stay below the total pressure. */
export function assertBelowTotalPressure(vapourPressurePa: number, pressurePa: number): void {
  if (vapourPressurePa < pressurePa) return;
  const reason = 'vapour-pressure-not-below-total';
  throw new EngineError('inconsistent-inputs', {
    quantity: 'vapourPressurePa',
    value: vapourPressurePa,
    max: pressurePa,
    reason,
  });
}
