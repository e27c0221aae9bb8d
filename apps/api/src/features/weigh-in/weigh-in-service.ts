import { parseWeighInRequest } from '@chargewright/contract/weigh-in';
import type { WeighInAnswer } from '@chargewright/contract/weigh-in';
import { crossCheckWeighIn, evaluateWeighIn, fieldVersion, PROCEDURES, readWeighInRequest } from '@chargewright/engine';
import type { WeighInRequest, WeighInResult } from '@chargewright/engine';
import {
  fieldDerivationLines,
  presentValue,
  weighInCautionText,
  weighInReasonText,
  weighInSays,
  weighInSum,
} from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { fieldStructureErrors, fieldValueErrors } from '../../answers/field-errors';
import { amountOrNull } from '../../answers/uncertain-amount';
import { HttpProblem } from '../../http/http-problem';
import { weighInUnits } from './weigh-in-units';

/** Judges the weigh-in of a request's body. Throws `HttpProblem` `invalid-input` with every fault at once. Stores nothing. */
export function judgeWeighIn(body: unknown): WeighInAnswer {
  const parsed = parseWeighInRequest(body);
  if (!parsed.ok) {
    const { faults, rest } = parsed;
    const errors = [...fieldStructureErrors(faults), ...fieldValueErrors(crossCheckWeighIn(rest), weighInUnits(rest))];
    throw new HttpProblem('invalid-input', { errors });
  }
  const { request } = parsed;
  const system = weighInUnits(request);
  const read = readWeighInRequest(request);
  if (!read.ok) throw new HttpProblem('invalid-input', { errors: fieldValueErrors(read.faults, system) });
  return { ...procedureOf(request), ...weighInAnswer(evaluateWeighIn(read.input), system) };
}

function procedureOf({ procedure = 'general-rules' }: WeighInRequest): Pick<WeighInAnswer, 'procedure'> {
  const found = PROCEDURES.find(({ id }) => id === procedure);
  // readWeighInRequest has refused any other id
  if (found === undefined) throw new RangeError(`no procedure ${procedure}`);
  return { procedure: { id: found.id, version: found.version } };
}

function weighInAnswer(result: WeighInResult, system: UnitSystem): Omit<WeighInAnswer, 'procedure'> {
  const { weight, scale, reason, cautions, steps } = result;
  const mass = (kg: number) => presentValue('massKg', kg, system);
  return {
    engineVersion: fieldVersion(),
    rate: rateAnswer(result.rate, system),
    includedRate: rateAnswer(result.includedRate, system),
    lineAdjustment: amountOrNull(result.lineAdjustment, system),
    requiredAdjustment: amountOrNull(result.requiredAdjustment, system),
    requiredTotal: amountOrNull(result.requiredTotal, system),
    actualTotal: amountOrNull(result.actualTotal, system),
    required: amountOrNull(result.required, system),
    actual: amountOrNull(result.actual, system),
    difference: amountOrNull(result.difference, system),
    rounded: weight && { required: mass(weight.requiredRoundedKg), actual: mass(weight.actualRoundedKg) },
    byRule: weight && weight.byRule,
    scale: { resolution: mass(scale.resolutionKg), plusMinus: mass(scale.limitKg) },
    vacuum: result.vacuum,
    label: result.label,
    finding: result.finding,
    reason: reason && { code: reason.code, text: weighInReasonText(reason) },
    missing: reason?.code === 'inputs-missing' ? [...reason.inputs] : [],
    ...weighInSays(result, system),
    sum: [...weighInSum(result, system)],
    cautions: cautions.map((code) => ({ code, text: weighInCautionText(code) })),
    derivation: [...fieldDerivationLines(steps, system)],
  };
}

const rateAnswer = (rate: WeighInResult['rate'], system: UnitSystem): WeighInAnswer['rate'] =>
  rate && { rate: amountOrNull(rate.rate, system), origin: rate.origin, source: rate.source };
