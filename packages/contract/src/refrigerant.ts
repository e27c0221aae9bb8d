/** `GET /api/v1/refrigerants` and `GET /api/v1/refrigerants/{id}/saturation`. */
import { PRESSURE_UNITS, TEMPERATURE_UNITS } from '@chargewright/engine';
import type { Amount, LengthUnit, PressureUnit, TemperatureUnit } from '@chargewright/engine';
import * as z from 'zod';
import { answerAmount, orNull } from './amounts/answer-amounts';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import { elevationFaults, elevationOf, elevationParameters, exactlyOneOf, fault, withNumbers } from './parsing/query';
import type { ElevationParameters } from './parsing/query';
import { isRecord } from './parsing/structure-fault';
import type { StructureFault } from './parsing/structure-fault';

const MODEL_GRADES = ['A', 'B', 'C'] as const;
const gradeMeaning = 'Of the property model; C: at least one pair of the blend is estimated, not fitted.';

const refrigerant = object({
  id: z.string(),
  safetyClass: z.string().meta({ description: 'ASHRAE 34.' }),
  criticalPoint: object({ temperature: answerAmount, pressure: answerAmount }),
  glide: object({
    value: z.number(),
    unit: z.literal('deltaC'),
    atDewTemperature: answerAmount.meta({
      description: 'The glide depends on the pressure; it is given for this one.',
    }),
  }),
  composition: z.array(object({ id: z.string(), massFraction: z.number() })),
  modelGrade: z.enum(MODEL_GRADES).meta({ description: gradeMeaning }),
}).meta({ id: 'Refrigerant' });

export const refrigerantsAnswer = object({ refrigerants: z.array(refrigerant) }).meta({ id: 'RefrigerantsAnswer' });
export type RefrigerantsAnswer = z.infer<typeof refrigerantsAnswer>;

const common = {
  refrigerant: z.string(),
  modelGrade: z.enum(MODEL_GRADES),
  atmosphere: answerAmount.meta({ description: 'Absolute; what gauge pressures count from.' }),
  reason: z.literal('outside-curve').nullable().meta({
    description: 'Why a number is null: below the start of the curve, or between its end and the critical point.',
  }),
};

export const saturationByPressure = object({
  ...common,
  bubbleTemperature: orNull(answerAmount),
  dewTemperature: orNull(answerAmount),
  glide: orNull(answerAmount),
}).meta({ id: 'SaturationByPressure' });
export type SaturationByPressure = z.infer<typeof saturationByPressure>;

const gaugeAndAbsolute = object({ gauge: answerAmount, absolute: answerAmount }).meta({ id: 'GaugeAndAbsolute' });

export const saturationByTemperature = object({
  ...common,
  bubblePressure: orNull(gaugeAndAbsolute),
  dewPressure: orNull(gaugeAndAbsolute),
}).meta({ id: 'SaturationByTemperature' });
export type SaturationByTemperature = z.infer<typeof saturationByTemperature>;

const GIVEN = ['pressure', 'temperature'] as const;

const pressureOrTemperature = {
  pressure: z.exactOptional(z.number()),
  temperature: z.exactOptional(z.number().meta({ description: 'Instead of pressure.' })),
  ...elevationParameters,
};
const unit = z
  .enum([...PRESSURE_UNITS, ...TEMPERATURE_UNITS])
  .meta({ description: 'Of the pressure or the temperature.' });

export const saturationParameters = object({ ...pressureOrTemperature, unit });
const saturationRest = object({ ...pressureOrTemperature, unit: z.exactOptional(unit) });

export type SaturationQuery = { readonly elevation?: Amount<LengthUnit> } & (
  { readonly pressure: Amount<PressureUnit> } | { readonly temperature: Amount<TemperatureUnit> }
);

export type ReadSaturationQuery =
  | { readonly ok: true; readonly query: SaturationQuery }
  | { readonly ok: false; readonly faults: readonly StructureFault[] };

/** Reads the query of a saturation look-up; all faults at once. Whether the refrigerant has such a state is the engine's to say. */
export function readSaturationQuery(query: unknown): ReadSaturationQuery {
  const parsed = parseByField<Flat, Partial<Flat>>(
    saturationParameters,
    saturationRest,
    withNumbers(query, [...GIVEN, 'elevation']),
  );
  const given = GIVEN.filter((name) => isRecord(query) && query[name] !== undefined);
  const faulty = new Set(parsed.faults.map(({ path }) => path));
  const faults = [
    ...parsed.faults,
    ...exactlyOneOf(GIVEN, given),
    ...elevationFaults(parsed.rest, faulty),
    ...(given.length === 1 ? unitFaults(given[0], parsed.rest.unit) : []),
  ];
  if (faults.length > 0 || parsed.whole === undefined) return { ok: false, faults };
  return { ok: true, query: saturationQuery(parsed.whole) };
}

interface Flat extends ElevationParameters {
  readonly pressure?: number;
  readonly temperature?: number;
  readonly unit: PressureUnit | TemperatureUnit;
}

const isPressureUnit = (text: string): text is PressureUnit => (PRESSURE_UNITS as readonly string[]).includes(text);

function unitFaults(
  given: (typeof GIVEN)[number] | undefined,
  unitGiven: string | undefined,
): readonly StructureFault[] {
  if (unitGiven === undefined || (given === 'pressure') === isPressureUnit(unitGiven)) return [];
  return [fault('wrong-unit', 'unit', given === 'pressure' ? PRESSURE_UNITS : TEMPERATURE_UNITS)];
}

function saturationQuery(flat: Flat): SaturationQuery {
  const elevation = elevationOf(flat);
  const place = elevation === undefined ? {} : { elevation };
  const { pressure, temperature, unit: given } = flat;
  if (pressure !== undefined && isPressureUnit(given)) return { ...place, pressure: { value: pressure, unit: given } };
  if (temperature !== undefined && !isPressureUnit(given))
    return { ...place, temperature: { value: temperature, unit: given } };
  throw new TypeError('the query of a saturation look-up was not checked');
}
