import { deriveQuantities } from '../../check/derived-quantities';
import type { DerivedQuantities } from '../../check/derived-quantities';
import { diagnoseCheck } from '../../check/diagnose-check';
import { evaluateCheck } from '../../check/evaluate-check';
import type { CheckInput } from '../../check/input';
import { readRequest } from '../../check/read-request';
import type { EvaluationRequest } from '../../check/request';
import type { CheckResult } from '../../check/result';
import type { Diagnosis } from '../../diagnosis/diagnosis-codes';

/** A request with all that comes of it, also what a result leaves out. */
export interface JudgedRequest {
  readonly input: CheckInput;
  readonly derived: DerivedQuantities;
  readonly result: CheckResult;
  readonly diagnosis: Diagnosis;
}

/** Requests of the catalogue can be read: a fault is a mistake in it. */
export function judgeRequest(request: EvaluationRequest): JudgedRequest {
  const read = readRequest(request);
  if (!read.ok) throw new RangeError(`an example cannot be read: ${JSON.stringify(read.faults)}`);
  const { input } = read;
  const result = evaluateCheck(input);
  return {
    input,
    derived: deriveQuantities(input.setup, input.readings),
    result,
    diagnosis: diagnoseCheck(input, result),
  };
}
