import type { EvaluationAnswer } from '@chargewright/contract/evaluation';
import { DERIVED_IDS, diagnoseCheck, moistAirEnthalpyBtuPerLb, temperatureFromK } from '@chargewright/engine';
import type {
  CheckInput,
  CheckResult,
  CriterionId,
  CriterionResult,
  Diagnosis,
  QuantityKind,
  Tolerance,
} from '@chargewright/engine';
import {
  causeText,
  cautionText,
  derivationLines,
  diagnosisNoteText,
  evidenceText,
  measurementText,
  nextStepText,
  notYetText,
  presentValue,
  reasonText,
  stopText,
} from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { uncertainAmount } from '../../answers/uncertain-amount';

type Criterion = EvaluationAnswer['criteria'][number];

/** The result of a check in the units and words of the contract; numbers unrounded. */
export function evaluationAnswer(input: CheckInput, result: CheckResult, system: UnitSystem): EvaluationAnswer {
  const { engineVersion, procedure, criteria, overall, derivation } = result;
  const { nextStep } = overall;
  return {
    engineVersion,
    procedure: { id: procedure.id, version: procedure.version },
    derived: derivedAmounts(input, result, system),
    criteria: criteria.map((criterion) => criterionAnswer(criterion, system)),
    overall: {
      finding: overall.finding,
      nextStep: {
        code: nextStep.code,
        text: nextStepText(nextStep, system),
        notYet: nextStep.notYet.map((code) => ({ code, text: notYetText(code) })),
      },
      stops: overall.stops.map((stop) => ({ code: stop.code, text: stopText(stop, system) })),
      cautions: overall.cautions.map((caution) => ({ code: caution.code, text: cautionText(caution, system) })),
    },
    ...diagnosisAnswer(diagnoseCheck(input, result), system),
    derivation: [...derivationLines(derivation, system)],
  };
}

function diagnosisAnswer(
  { causes, notes }: Diagnosis,
  system: UnitSystem,
): Pick<EvaluationAnswer, 'diagnosis' | 'diagnosisNotes'> {
  return {
    diagnosis: causes.map(({ cause, fits, doesNotFit, nextMeasurement }) => ({
      cause,
      text: causeText(cause),
      fits: fits.map((evidence) => ({ code: evidence.code, text: evidenceText(evidence, system) })),
      doesNotFit: doesNotFit.map((evidence) => ({ code: evidence.code, text: evidenceText(evidence, system) })),
      nextMeasurement: nextMeasurement && { code: nextMeasurement, text: measurementText(nextMeasurement) },
    })),
    diagnosisNotes: notes.map((code) => ({ code, text: diagnosisNoteText(code) })),
  };
}

function derivedAmounts(input: CheckInput, { derived }: CheckResult, system: UnitSystem): EvaluationAnswer['derived'] {
  const amounts: EvaluationAnswer['derived'] = {};
  for (const id of DERIVED_IDS) {
    const quantity = derived[id];
    if (quantity !== undefined) amounts[id] = uncertainAmount(quantity, system);
  }
  const dryBulb = input.readings.returnDryBulb?.quantity;
  const { returnHumidityRatio } = derived;
  if (system === 'F-psi' && amounts.returnEnthalpy && dryBulb && returnHumidityRatio) {
    // the inch-pound datum needs the state, not only the SI enthalpy
    const dryBulbF = temperatureFromK(dryBulb.value, 'degF');
    amounts.returnEnthalpy.value = moistAirEnthalpyBtuPerLb(dryBulbF, returnHumidityRatio.value);
  }
  return amounts;
}

function criterionAnswer(criterion: CriterionResult, system: UnitSystem): Criterion {
  const { actual, target, deviation, tolerance, reason } = criterion;
  return {
    criterion: criterion.criterion,
    required: criterion.required,
    actual: actual && uncertainAmount(actual, system),
    target: target && uncertainAmount(target, system),
    targetSource: criterion.targetSource,
    deviation: deviation && uncertainAmount(deviation, system),
    tolerance: tolerance && toleranceAnswer(tolerance, KIND_OF_TOLERANCE[criterion.criterion] ?? 'differenceK', system),
    toleranceSource: tolerance && tolerance.source,
    byRule: criterion.byRule,
    probabilityWithin: criterion.probabilityWithin,
    onlyJust: criterion.onlyJust,
    finding: criterion.finding,
    reason: reason && reason.code,
    reasonText: reason && reasonText(reason, system),
  };
}

/** A tolerance stands without an actual value, so its unit cannot come from one; the others judge a temperature difference. */
const KIND_OF_TOLERANCE: Readonly<Partial<Record<CriterionId, QuantityKind>>> = {
  airflow: 'flowM3PerS',
  'liquid-pressure': 'pressureDifferencePa',
  'heating-discharge-pressure': 'pressureDifferencePa',
};

function toleranceAnswer({ low, high }: Tolerance, kind: QuantityKind, system: UnitSystem): Criterion['tolerance'] {
  const limit = (value: number | null) => (value === null ? null : presentValue(kind, value, system).value);
  return { low: limit(low), high: limit(high), unit: presentValue(kind, 0, system).unit };
}
