import {
  DIFFERENCE_UNITS,
  FLOW_UNITS,
  LENGTH_UNITS,
  MASS_UNITS,
  POWER_UNITS,
  PRESSURE_UNITS,
  TEMPERATURE_UNITS,
} from '@chargewright/engine';
import type { DifferenceUnit } from '@chargewright/engine';
import * as z from 'zod';
import { object } from '../parsing/object';

/** A number and the unit it is in. */
export const amount = <const Units extends readonly string[]>(units: Units) =>
  object({ value: z.number(), unit: z.enum(units) });

/** Kelvin is left to temperatures, so that a slip of scale is caught. */
export const DIFFERENCE_UNITS_GIVEN = DIFFERENCE_UNITS.filter(
  (unit): unit is Exclude<DifferenceUnit, 'K'> => unit !== 'K',
);

export const temperature = amount(TEMPERATURE_UNITS).meta({ id: 'Temperature' });
export const difference = amount(DIFFERENCE_UNITS_GIVEN).meta({
  id: 'TemperatureDifference',
  description: 'A difference of two temperatures, such as a superheat.',
});
export const pressure = amount(PRESSURE_UNITS).meta({
  id: 'Pressure',
  description: 'g: gauge, a: absolute; inHgVac counts inches of mercury below the local atmosphere.',
});
export const length = amount(LENGTH_UNITS).meta({ id: 'Length' });
export const flow = amount(FLOW_UNITS).meta({ id: 'Airflow' });
export const power = amount(POWER_UNITS).meta({ id: 'Capacity' });
export const current = amount(['A']);
export const mass = amount(MASS_UNITS).meta({ id: 'Mass' });
