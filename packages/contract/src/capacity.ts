/** `POST /api/v1/capacity`: cooling delivered, from the air side. */
import { AIR_STATED_IN, CONDENSATE_RULES } from '@chargewright/engine';
import type { CapacityRequest } from '@chargewright/engine';
import * as z from 'zod';
import { codedText, derivationLine, orNull, uncertainAmount } from './amounts/answer-amounts';
import { airFields } from './field/air';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import type { StructureFault } from './parsing/structure-fault';

const everyField = {
  ...airFields,
  airflowIn: z.exactOptional(
    z.enum(AIR_STATED_IN).meta({ description: 'The air in which the airflow is stated. Left out: return.' }),
  ),
  condensate: z.exactOptional(
    z.enum(CONDENSATE_RULES).meta({
      description:
        'neglected, as the air-enthalpy method of testing does; counted, 0.3 to 1 % less. Left out: neglected.',
    }),
  ),
} satisfies Record<keyof CapacityRequest, z.ZodType>;

export const capacityRequest = object(everyField).meta({
  id: 'CapacityRequest',
  description: 'Airflow, and dry bulb with wet bulb or relative humidity of return and supply.',
});

export const capacityAnswer = object({
  engineVersion: z.string(),
  total: orNull(uncertainAmount),
  sensible: orNull(uncertainAmount),
  sensibleHeatRatio: orNull(uncertainAmount),
  ofNominal: orNull(uncertainAmount).meta({ description: 'Total over nominal capacity.' }),
  dryAirMassFlow: orNull(uncertainAmount),
  reason: orNull(codedText).meta({ description: 'Why there is no total.' }),
  missing: z.array(z.string()).meta({ description: 'Fields of the request that are missing for it.' }),
  cautions: z.array(codedText),
  derivation: z.array(derivationLine),
}).meta({ id: 'CapacityAnswer', description: 'In the unit system of the temperatures given. Numbers are unrounded.' });
export type CapacityAnswer = z.infer<typeof capacityAnswer>;

export type ParsedCapacityRequest =
  | { readonly ok: true; readonly request: CapacityRequest }
  | { readonly ok: false; readonly faults: readonly StructureFault[]; readonly rest: CapacityRequest };

/** Reads the body of a request: its shape, all faults at once. Whether the values can be is the engine's to say. */
export function parseCapacityRequest(body: unknown): ParsedCapacityRequest {
  const { whole, rest, faults } = parseByField<CapacityRequest, CapacityRequest>(
    capacityRequest,
    capacityRequest,
    body,
  );
  return whole === undefined ? { ok: false, faults, rest } : { ok: true, request: whole };
}
