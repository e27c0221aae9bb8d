import { parseCapacityRequest } from '@chargewright/contract/capacity';
import type { CapacityAnswer } from '@chargewright/contract/capacity';
import { crossCheckCapacity, evaluateCapacity, fieldVersion, readCapacityRequest } from '@chargewright/engine';
import type { CapacityResult } from '@chargewright/engine';
import { capacityCautionText, capacityReasonText, fieldDerivationLines } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { airAnswerUnits } from '../../answers/air-answer-units';
import { fieldStructureErrors, fieldValueErrors } from '../../answers/field-errors';
import { amountOrNull } from '../../answers/uncertain-amount';
import { HttpProblem } from '../../http/http-problem';

/** The cooling delivered, from a request's body. Throws `HttpProblem` `invalid-input` with every fault at once. Stores nothing. */
export function findCapacity(body: unknown): CapacityAnswer {
  const parsed = parseCapacityRequest(body);
  if (!parsed.ok) {
    const { faults, rest } = parsed;
    const errors = [
      ...fieldStructureErrors(faults),
      ...fieldValueErrors(crossCheckCapacity(rest), airAnswerUnits(rest)),
    ];
    throw new HttpProblem('invalid-input', { errors });
  }
  const system = airAnswerUnits(parsed.request);
  const read = readCapacityRequest(parsed.request);
  if (!read.ok) throw new HttpProblem('invalid-input', { errors: fieldValueErrors(read.faults, system) });
  return capacityAnswer(evaluateCapacity(read.input), system);
}

function capacityAnswer(result: CapacityResult, system: UnitSystem): CapacityAnswer {
  const { reason, cautions, steps } = result;
  return {
    engineVersion: fieldVersion(),
    total: amountOrNull(result.totalW, system),
    sensible: amountOrNull(result.sensibleW, system),
    sensibleHeatRatio: amountOrNull(result.sensibleHeatRatio, system),
    ofNominal: amountOrNull(result.ofNominal, system),
    dryAirMassFlow: amountOrNull(result.dryAirMassFlowKgPerS, system),
    reason: reason && { code: reason.code, text: capacityReasonText(reason) },
    missing: reason?.code === 'inputs-missing' ? [...reason.inputs] : [],
    cautions: cautions.map((code) => ({ code, text: capacityCautionText(code) })),
    derivation: [...fieldDerivationLines(steps, system)],
  };
}
