/** What airflow and capacity are both given. */
import { AIR_READINGS, READING_DIMENSIONS } from '@chargewright/engine';
import type { AirReadingId } from '@chargewright/engine';
import * as z from 'zod';
import { length, power, pressure } from '../amounts/amounts';
import { READING_OF_DIMENSION } from '../evaluation/readings';

type AirReading = (typeof READING_OF_DIMENSION)['temperature' | 'humidity' | 'airflow'];

export const airFields = {
  ...(Object.fromEntries(
    AIR_READINGS.map((id) => [id, z.exactOptional(READING_OF_DIMENSION[READING_DIMENSIONS[id]])]),
  ) as Record<AirReadingId, z.ZodExactOptional<AirReading>>),
  elevation: z.exactOptional(length.meta({ description: 'Left out: sea level, with the caution elevation-assumed.' })),
  stationPressure: z.exactOptional(pressure),
  nominalCapacity: z.exactOptional(power),
};
