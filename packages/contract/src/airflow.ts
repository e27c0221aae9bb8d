/** `POST /api/v1/airflow`: the airflow by one of the methods, with what it rests on. */
import {
  AIR_PLACES,
  AIR_STATED_IN,
  AIRFLOW_METHODS,
  COOLING_SPEED_ANSWERS,
  EFFICIENCY_KINDS,
  FLOW_UNITS,
  HEAT_UNITS,
  HEATING_VALUE_UNITS,
  STATIC_PRESSURE_UNITS,
  VOLUME_UNITS,
} from '@chargewright/engine';
import type { AirflowRequest } from '@chargewright/engine';
import * as z from 'zod';
import { codedText, derivationLine, orNull, uncertainAmount } from './amounts/answer-amounts';
import { LONGEST_TEXT, READING_OF_DIMENSION, stated } from './evaluation/readings';
import { airFields } from './field/air';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import type { StructureFault } from './parsing/structure-fault';

/** Far above any printed table. */
const MOST_ROWS = 100;

const fanTable = object({
  source: z.exactOptional(z.string().max(LONGEST_TEXT).meta({ description: 'Document and page.' })),
  blowerTap: z.exactOptional(
    z.string().max(LONGEST_TEXT).meta({ description: 'Speed tap or setting the rows are for.' }),
  ),
  staticPressureUnit: z.enum(STATIC_PRESSURE_UNITS),
  airflowUnit: z.enum(FLOW_UNITS),
  rows: z
    .array(object({ staticPressure: z.number(), airflow: z.number().nullable() }))
    .max(MOST_ROWS)
    .meta({ description: 'Static pressure ascending; an airflow of null is a dash of the print.' }),
}).meta({ id: 'FanTable', description: 'The maker’s airflow by external static pressure, for one blower speed.' });

const required = { method: z.enum(AIRFLOW_METHODS) };

const optional = {
  ...airFields,
  atCoolingSpeed: z.exactOptional(
    z.enum(COOLING_SPEED_ANSWERS).meta({
      description: 'Whether the blower ran at its cooling speed. no: the airflow does not count. Left out: unknown.',
    }),
  ),
  airflowIn: z.exactOptional(
    z.enum(AIR_STATED_IN).meta({ description: 'What the instrument of a measured airflow shows. Left out: return.' }),
  ),
  statedAt: z.exactOptional(
    z
      .enum(AIR_PLACES)
      .meta({ description: 'Which air the blower moves. Left out: return, a blower before the heater.' }),
  ),
  lineVoltage: z.exactOptional(READING_OF_DIMENSION.voltage),
  heaterCurrent: z.exactOptional(READING_OF_DIMENSION.current),
  blowerHeat: z.exactOptional(
    stated(HEAT_UNITS, [...HEAT_UNITS, '%']).meta({ description: 'Only where it is not in the amps already.' }),
  ),
  dialVolume: z.exactOptional(
    stated(VOLUME_UNITS, [...VOLUME_UNITS, '%']).meta({ description: 'Of one turn of the meter’s dial.' }),
  ),
  gasRevolution: z.exactOptional(stated(['s'], ['s', '%']).meta({ description: 'Of one turn.' })),
  gasHeatingValue: z.exactOptional(
    stated(HEATING_VALUE_UNITS, [...HEATING_VALUE_UNITS, '%']).meta({
      description: 'Of the gas as the meter counts it: the supplier’s figure for the elevation and the pressure.',
    }),
  ),
  furnaceEfficiency: z.exactOptional(
    stated(['%'], ['%']).meta({ description: 'Output over input; its ± in points of percent.' }),
  ),
  efficiencyIs: z.exactOptional(z.enum(EFFICIENCY_KINDS).meta({ description: 'Left out: steady-state.' })),
  returnStaticPressure: z.exactOptional(READING_OF_DIMENSION.staticPressure),
  supplyStaticPressure: z.exactOptional(READING_OF_DIMENSION.staticPressure),
  fanTable: z.exactOptional(fanTable),
};

// Both directions: a field the engine does not know, or one that is forgotten here, does not compile.
const everyField = { ...required, ...optional } satisfies Record<keyof AirflowRequest, z.ZodType>;

export const airflowRequest = object(everyField).meta({
  id: 'AirflowRequest',
  description: 'Only what the method needs; the answer names what is missing.',
});

const airflowRest = object({ method: z.exactOptional(required.method), ...optional });

export const airflowAnswer = object({
  engineVersion: z.string(),
  method: required.method,
  statedIn: z.enum(AIR_STATED_IN).meta({ description: 'The air `airflow` is stated in.' }),
  airflow: orNull(uncertainAmount).meta({ description: 'What counts for cooling.' }),
  airflowAsFound: orNull(uncertainAmount).meta({ description: 'Whatever the blower speed.' }),
  standardAirflow: orNull(uncertainAmount).meta({ description: 'As standard air of 0.075 lb/ft³.' }),
  airflowPerCapacity: orNull(uncertainAmount).meta({ description: 'Per nominal capacity.' }),
  reason: orNull(codedText).meta({ description: 'Why no airflow counts.' }),
  missing: z.array(z.string()).meta({ description: 'Fields of the request that are missing for it.' }),
  cautions: z.array(codedText),
  derivation: z.array(derivationLine),
}).meta({ id: 'AirflowAnswer', description: 'In the unit system of the temperatures given. Numbers are unrounded.' });
export type AirflowAnswer = z.infer<typeof airflowAnswer>;

export type ParsedAirflowRequest =
  | { readonly ok: true; readonly request: AirflowRequest }
  | { readonly ok: false; readonly faults: readonly StructureFault[]; readonly rest: Partial<AirflowRequest> };

/** Reads the body of a request: its shape, all faults at once. Whether the values can be is the engine's to say. */
export function parseAirflowRequest(body: unknown): ParsedAirflowRequest {
  const { whole, rest, faults } = parseByField<AirflowRequest, Partial<AirflowRequest>>(
    airflowRequest,
    airflowRest,
    body,
  );
  return whole === undefined ? { ok: false, faults, rest } : { ok: true, request: whole };
}
