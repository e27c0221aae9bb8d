/** `GET /api/v1/psychrometrics`. */
import { ENTHALPY_UNITS, TEMPERATURE_UNITS } from '@chargewright/engine';
import type { Amount, EnthalpyUnit, LengthUnit, TemperatureUnit } from '@chargewright/engine';
import * as z from 'zod';
import { answerAmount, orNull } from './amounts/answer-amounts';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import { elevationFaults, elevationOf, elevationParameters, exactlyTwoOf, withNumbers } from './parsing/query';
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

/** What air can be described by; any two but a dew point with a humidity ratio, and a wet bulb with an enthalpy. */
export const AIR_QUANTITIES = [
  'dryBulb',
  'wetBulb',
  'relativeHumidity',
  'dewPoint',
  'humidityRatio',
  'enthalpy',
] as const;
export type AirQuantity = (typeof AIR_QUANTITIES)[number];

const given = {
  dryBulb: z.exactOptional(z.number()),
  wetBulb: z.exactOptional(z.number()),
  relativeHumidity: z.exactOptional(z.number().meta({ description: 'In %.' })),
  dewPoint: z.exactOptional(z.number()),
  humidityRatio: z.exactOptional(z.number().meta({ description: 'Water per dry air, kg/kg or lb/lb.' })),
  enthalpy: z.exactOptional(z.number().meta({ description: 'In enthalpyUnit, per mass of dry air.' })),
};
const unit = z.enum(TEMPERATURE_UNITS).meta({ description: 'Of all temperatures.' });
const enthalpyUnit = z.exactOptional(
  z.enum(ENTHALPY_UNITS).meta({
    description:
      'Of the enthalpy, given or answered. Btu/lb counts from dry air at 0 °F, kJ/kg from 0 °C. Left out: Btu/lb for degF, else kJ/kg.',
  }),
);

export const psychrometricsParameters = object({ ...given, unit, enthalpyUnit, ...elevationParameters });
const psychrometricsRest = object({ ...given, unit: z.exactOptional(unit), enthalpyUnit, ...elevationParameters });

export interface GivenAir {
  readonly by: AirQuantity;
  /** A temperature in `unit`, a relative humidity in %, a humidity ratio in kg/kg or an enthalpy in `enthalpyUnit`. */
  readonly value: number;
}

export interface PsychrometricsQuery {
  readonly given: readonly [GivenAir, GivenAir];
  readonly unit: TemperatureUnit;
  readonly enthalpyUnit: EnthalpyUnit;
  readonly elevation?: Amount<LengthUnit>;
}

export type ReadPsychrometricsQuery =
  | { readonly ok: true; readonly query: PsychrometricsQuery }
  | { readonly ok: false; readonly faults: readonly StructureFault[] };

interface Flat extends ElevationParameters, Partial<Record<AirQuantity, number>> {
  readonly unit: TemperatureUnit;
  readonly enthalpyUnit?: EnthalpyUnit;
}

/** Reads the query of a moist-air look-up; all faults at once. Whether such air exists is the engine's to say. */
export function readPsychrometricsQuery(query: unknown): ReadPsychrometricsQuery {
  const parsed = parseByField<Flat, Partial<Flat>>(
    psychrometricsParameters,
    psychrometricsRest,
    withNumbers(query, [...AIR_QUANTITIES, 'elevation']),
  );
  const names = AIR_QUANTITIES.filter((name) => isRecord(query) && query[name] !== undefined);
  const faulty = new Set(parsed.faults.map(({ path }) => path));
  const faults = [...parsed.faults, ...exactlyTwoOf(AIR_QUANTITIES, names), ...elevationFaults(parsed.rest, faulty)];
  const { whole } = parsed;
  const [first, second] = names.flatMap((by): readonly GivenAir[] => {
    const value = whole?.[by];
    return value === undefined ? [] : [{ by, value }];
  });
  if (faults.length > 0 || whole === undefined || first === undefined || second === undefined) {
    return { ok: false, faults };
  }
  const elevation = elevationOf(whole);
  return {
    ok: true,
    query: {
      given: [first, second],
      unit: whole.unit,
      enthalpyUnit: whole.enthalpyUnit ?? (whole.unit === 'degF' ? 'Btu/lb' : 'kJ/kg'),
      ...(elevation === undefined ? {} : { elevation }),
    },
  };
}
