import { readEvaluationRequest } from '@chargewright/contract/evaluation';
import type { EvaluationAnswer } from '@chargewright/contract/evaluation';
import type { ProblemError } from '@chargewright/contract/problem';
import { crossCheck, evaluateCheck, readRequest } from '@chargewright/engine';
import type { Fault } from '@chargewright/engine';
import { faultText } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { answerUnits } from '../../answers/answer-units';
import { HttpProblem } from '../../http/http-problem';
import { structureErrors } from '../../http/structure-errors';

import { evaluationAnswer } from './evaluation-answer';

/** Judges the check of a request's body. Throws `HttpProblem` `invalid-input` with every fault at once. Stores nothing. */
export function evaluate(body: unknown): EvaluationAnswer {
  const read = readEvaluationRequest(body);
  if (!read.ok) {
    const { faults, rest } = read;
    const errors = [...structureErrors(faults), ...valueErrors(crossCheck(rest), answerUnits(rest))];
    throw new HttpProblem('invalid-input', { errors });
  }
  const { request } = read;
  const system = answerUnits(request);
  const checked = readRequest(request);
  if (!checked.ok) throw new HttpProblem('invalid-input', { errors: valueErrors(checked.faults, system) });
  return evaluationAnswer(checked.input, evaluateCheck(checked.input), system);
}

const valueErrors = (faults: readonly Fault[], system: UnitSystem): readonly ProblemError[] =>
  faults.map((fault) => ({ path: fault.path, message: faultText(fault, system) }));
