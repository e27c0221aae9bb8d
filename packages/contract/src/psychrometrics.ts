/** `GET /api/v1/psychrometrics`. */
import { TEMPERATURE_UNITS } from '@chargewright/engine';
import type { Amount, LengthUnit, TemperatureUnit } from '@chargewright/engine';
import * as z from 'zod';
import { answerAmount, orNull } from './amounts/answer-amounts';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import { elevationFaults, elevationOf, elevationParameters, exactlyOneOf, withNumbers } from './parsing/query';
import type { ElevationParameters } from './parsing/query';
import { isRecord } from './parsing/structure-fault';
import type { StructureFault } from './parsing/structure-fault';

export const psychrometricsAnswer = object({
  dryBulb: answerAmount,
  wetBulb: answerAmount,
  wetBulbSurface: z.enum(['water', 'ice']).meta({ description: 'What wets the bulb; below freezing both can exist.' }),
  dewPoint: orNull(answerAmount).meta({ description: 'Null for air too dry to have one above −100 °C.' }),
  relativeHumidity: answerAmount,
  humidityRatio: answerAmount,
  vaporPressure: answerAmount,
  enthalpy: answerAmount,
  specificVolume: answerAmount,
  atmosphere: answerAmount,
}).meta({ id: 'PsychrometricsAnswer', description: 'Enthalpy and volume per mass of dry air.' });
export type PsychrometricsAnswer = z.infer<typeof psychrometricsAnswer>;

const HUMIDITY = ['wetBulb', 'relativeHumidity', 'dewPoint'] as const;
export type HumidityGiven = (typeof HUMIDITY)[number];

const humidity = {
  wetBulb: z.exactOptional(z.number()),
  relativeHumidity: z.exactOptional(z.number().meta({ description: 'In %.' })),
  dewPoint: z.exactOptional(z.number()),
};
const dryBulb = z.number();
const unit = z.enum(TEMPERATURE_UNITS).meta({ description: 'Of all temperatures.' });

export const psychrometricsParameters = object({ dryBulb, ...humidity, unit, ...elevationParameters });
const psychrometricsRest = object({
  dryBulb: z.exactOptional(dryBulb),
  ...humidity,
  unit: z.exactOptional(unit),
  ...elevationParameters,
});

export interface PsychrometricsQuery {
  readonly dryBulb: number;
  readonly unit: TemperatureUnit;
  /** A temperature in `unit`, or the relative humidity in %. */
  readonly humidity: { readonly by: HumidityGiven; readonly value: number };
  readonly elevation?: Amount<LengthUnit>;
}

export type ReadPsychrometricsQuery =
  | { readonly ok: true; readonly query: PsychrometricsQuery }
  | { readonly ok: false; readonly faults: readonly StructureFault[] };

interface Flat extends ElevationParameters, Partial<Record<HumidityGiven, number>> {
  readonly dryBulb: number;
  readonly unit: TemperatureUnit;
}

/** Reads the query of a moist-air look-up; all faults at once. Whether such air exists is the engine's to say. */
export function readPsychrometricsQuery(query: unknown): ReadPsychrometricsQuery {
  const parsed = parseByField<Flat, Partial<Flat>>(
    psychrometricsParameters,
    psychrometricsRest,
    withNumbers(query, ['dryBulb', ...HUMIDITY, 'elevation']),
  );
  const given = HUMIDITY.filter((name) => isRecord(query) && query[name] !== undefined);
  const faulty = new Set(parsed.faults.map(({ path }) => path));
  const faults = [...parsed.faults, ...exactlyOneOf(HUMIDITY, given), ...elevationFaults(parsed.rest, faulty)];
  const [by] = given;
  const value = by === undefined ? undefined : parsed.whole?.[by];
  if (faults.length > 0 || parsed.whole === undefined || by === undefined || value === undefined) {
    return { ok: false, faults };
  }
  const elevation = elevationOf(parsed.whole);
  const { dryBulb: dryBulbGiven, unit: unitGiven } = parsed.whole;
  return {
    ok: true,
    query: {
      dryBulb: dryBulbGiven,
      unit: unitGiven,
      humidity: { by, value },
      ...(elevation === undefined ? {} : { elevation }),
    },
  };
}
