/** `POST /api/v1/evaluations`: what is asked and what is answered. */
import { PROCEDURES } from '@chargewright/engine';
import type { EvaluationRequest, PartialSetup, ReadingsInput, VisitInput } from '@chargewright/engine';
import * as z from 'zod';
import { evaluationAnswer } from './evaluation/answer';
import { LONGEST_TEXT, readings } from './evaluation/readings';
import { setup, setupRest } from './evaluation/setup';
import { visit } from './evaluation/visit';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import { isRecord } from './parsing/structure-fault';
import type { StructureFault } from './parsing/structure-fault';

export { ANSWER_UNITS } from './amounts/answer-amounts';
export type { AnswerUnit } from './amounts/answer-amounts';
export { evaluationAnswer };

const others = {
  procedure: z.exactOptional(
    z
      .string()
      .max(LONGEST_TEXT)
      .meta({ description: `One of ${PROCEDURES.map(({ id }) => id).join(', ')}. Left out: general-rules.` }),
  ),
  visit: z.exactOptional(visit),
  readings: readings.default({}),
};

export const evaluationRequest = object({ setup, ...others }).meta({ id: 'EvaluationRequest' });

const evaluationRest = object({ setup: setupRest.default({}), ...others });

export type EvaluationAnswer = z.infer<typeof evaluationAnswer>;

/** What parsed of a faulty request. */
export interface EvaluationRest {
  readonly procedure?: string;
  readonly setup: PartialSetup;
  readonly visit?: VisitInput;
  readonly readings: ReadingsInput;
}

export type ReadEvaluationRequest =
  | { readonly ok: true; readonly request: EvaluationRequest }
  | { readonly ok: false; readonly faults: readonly StructureFault[]; readonly rest: EvaluationRest };

/**
 * Reads the body of a request: its shape, all faults at once. Whether the values can be is the engine's to say.
 * Unknown keys are ignored; a `null` is a fault wherever a value is known.
 */
export function readEvaluationRequest(body: unknown): ReadEvaluationRequest {
  // without this, a body without a setup would hide which fields of it are required
  const input = isRecord(body) && body['setup'] === undefined ? { ...body, setup: {} } : body;
  const { whole, rest, faults } = parseByField<EvaluationRequest, EvaluationRest>(
    evaluationRequest,
    evaluationRest,
    input,
  );
  return whole === undefined ? { ok: false, faults, rest } : { ok: true, request: whole };
}
