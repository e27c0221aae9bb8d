import { parseAirflowRequest } from '@chargewright/contract/airflow';
import type { AirflowAnswer } from '@chargewright/contract/airflow';
import { crossCheckAirflow, evaluateAirflow, fieldVersion, readAirflowRequest } from '@chargewright/engine';
import type { AirflowResult } from '@chargewright/engine';
import { airflowCautionText, airflowReasonText, fieldDerivationLines } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { airAnswerUnits } from '../../answers/air-answer-units';
import { fieldStructureErrors, fieldValueErrors } from '../../answers/field-errors';
import { amountOrNull } from '../../answers/uncertain-amount';
import { HttpProblem } from '../../http/http-problem';

/** The airflow of a request's body. Throws `HttpProblem` `invalid-input` with every fault at once. Stores nothing. */
export function findAirflow(body: unknown): AirflowAnswer {
  const parsed = parseAirflowRequest(body);
  if (!parsed.ok) {
    const { faults, rest } = parsed;
    const errors = [
      ...fieldStructureErrors(faults),
      ...fieldValueErrors(crossCheckAirflow(rest), airAnswerUnits(rest)),
    ];
    throw new HttpProblem('invalid-input', { errors });
  }
  const system = airAnswerUnits(parsed.request);
  const read = readAirflowRequest(parsed.request);
  if (!read.ok) throw new HttpProblem('invalid-input', { errors: fieldValueErrors(read.faults, system) });
  return airflowAnswer(evaluateAirflow(read.input), system);
}

function airflowAnswer(result: AirflowResult, system: UnitSystem): AirflowAnswer {
  const { method, statedIn, reason, cautions, steps } = result;
  return {
    engineVersion: fieldVersion(),
    method,
    statedIn,
    airflow: amountOrNull(result.airflow, system),
    airflowAsFound: amountOrNull(result.airflowAsFound, system),
    standardAirflow: amountOrNull(result.standardAirflow, system),
    airflowPerCapacity: amountOrNull(result.perCapacity, system),
    reason: reason && { code: reason.code, text: airflowReasonText(reason) },
    missing: reason?.code === 'inputs-missing' ? [...reason.inputs] : [],
    cautions: cautions.map((code) => ({ code, text: airflowCautionText(code) })),
    derivation: [...fieldDerivationLines(steps, system)],
  };
}
