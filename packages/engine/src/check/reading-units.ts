/** The units each dimension is read in, and those its ± is stated in: a temperature unit on a pressure, or on a difference, cannot be. */
import {
  FLOW_UNITS,
  PRESSURE_DIFFERENCE_UNITS,
  PRESSURE_UNITS,
  STATIC_PRESSURE_UNITS,
  TEMPERATURE_UNITS,
} from '../units';
import type { Dimension } from './readings';
import type { PlusMinusUnit, ReadingUnit } from './request';

interface Units {
  readonly reading: readonly ReadingUnit[];
  readonly plusMinus: readonly PlusMinusUnit[];
}

export const UNITS_OF_DIMENSION: Readonly<Record<Dimension, Units>> = {
  temperature: { reading: TEMPERATURE_UNITS, plusMinus: ['deltaF', 'deltaC'] },
  pressure: { reading: PRESSURE_UNITS, plusMinus: PRESSURE_DIFFERENCE_UNITS },
  humidity: { reading: ['%'], plusMinus: ['%'] },
  airflow: { reading: FLOW_UNITS, plusMinus: [...FLOW_UNITS, '%'] },
  staticPressure: { reading: STATIC_PRESSURE_UNITS, plusMinus: STATIC_PRESSURE_UNITS },
  current: { reading: ['A'], plusMinus: ['A'] },
  voltage: { reading: ['V'], plusMinus: ['V'] },
};
