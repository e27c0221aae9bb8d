import { temperatureToK } from '../units/temperature';

/** Dry bulbs this layer answers for, −60 to 90 °C: the span of Table 2 of ASHRAE Fundamentals (2017) ch. 1 (span from memory). */
export const DRY_BULB_LIMITS = {
  quantity: 'dryBulbK',
  min: temperatureToK(-60, 'degC'),
  max: temperatureToK(90, 'degC'),
  reason: 'outside-moist-air-range',
} as const;

/** Total pressures this layer answers for, 50 to 110 kPa: elevations of about −700 to 5,500 m (our choice). */
export const AIR_PRESSURE_LIMITS = {
  quantity: 'pressurePa',
  min: 50e3,
  max: 110e3,
  reason: 'outside-moist-air-range',
} as const;
