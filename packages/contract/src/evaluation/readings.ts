import {
  FLOW_UNITS,
  PRESSURE_DIFFERENCE_UNITS,
  PRESSURE_UNITS,
  READING_DIMENSIONS,
  READING_IDS,
  STATIC_PRESSURE_UNITS,
  TEMPERATURE_UNITS,
} from '@chargewright/engine';
import type { Dimension, ReadingId } from '@chargewright/engine';
import * as z from 'zod';
import { object } from '../parsing/object';
import { DIFFERENCE_UNITS_GIVEN } from '../amounts/amounts';

/** Instrument names and the like; far above what a person types. */
export const LONGEST_TEXT = 100;

const plusMinus = <const Units extends readonly string[]>(units: Units) =>
  object({ value: z.number(), unit: z.enum(units), kind: z.exactOptional(z.enum(['limit', 'k2'])) }).meta({
    description: 'limit: the maker’s ±, rectangular (the default); k2: an expanded uncertainty, normal.',
  });

const statedShape = <const Units extends readonly string[], const PlusMinusUnits extends readonly string[]>(
  units: Units,
  plusMinusUnits: PlusMinusUnits,
) => ({
  value: z.number(),
  unit: z.enum(units),
  plusMinus: z.exactOptional(plusMinus(plusMinusUnits)),
  instrumentId: z.exactOptional(
    z.string().max(LONGEST_TEXT).meta({ description: 'Readings by one instrument share its error.' }),
  ),
  resolution: z.exactOptional(
    z.number().meta({ description: 'Smallest step the instrument shows, in the unit of the reading.' }),
  ),
});

/** What an instrument shows, or a figure with its ±. */
export const stated = <const Units extends readonly string[], const PlusMinusUnits extends readonly string[]>(
  units: Units,
  plusMinusUnits: PlusMinusUnits,
) => object(statedShape(units, plusMinusUnits));

const reading = <const Units extends readonly string[], const PlusMinusUnits extends readonly string[]>(
  units: Units,
  plusMinusUnits: PlusMinusUnits,
) =>
  object({
    ...statedShape(units, plusMinusUnits),
    ageSeconds: z.exactOptional(z.number().meta({ description: 'How long ago the reading was taken.' })),
  });

export const READING_OF_DIMENSION = {
  temperature: reading(TEMPERATURE_UNITS, DIFFERENCE_UNITS_GIVEN).meta({ id: 'TemperatureReading' }),
  pressure: reading(PRESSURE_UNITS, PRESSURE_DIFFERENCE_UNITS).meta({ id: 'PressureReading' }),
  humidity: reading(['%'], ['%']).meta({ id: 'HumidityReading' }),
  airflow: reading(FLOW_UNITS, [...FLOW_UNITS, '%']).meta({ id: 'AirflowReading' }),
  staticPressure: reading(STATIC_PRESSURE_UNITS, STATIC_PRESSURE_UNITS).meta({ id: 'StaticPressureReading' }),
  current: reading(['A'], ['A']).meta({ id: 'CurrentReading' }),
  voltage: reading(['V'], ['V']).meta({ id: 'VoltageReading' }),
} as const satisfies Record<Dimension, z.ZodType>;

type AnyReading = (typeof READING_OF_DIMENSION)[Dimension];

export const readings = object(
  Object.fromEntries(
    READING_IDS.map((id) => [id, z.exactOptional(READING_OF_DIMENSION[READING_DIMENSIONS[id]])]),
  ) as Record<ReadingId, z.ZodExactOptional<AnyReading>>,
).meta({ id: 'Readings', description: 'What the instruments show. Only the readings at hand.' });
