/** Codes of airflow, capacity and weigh-in as sentences. The last argument is the language; English when left out. */
import { isKnown } from '@chargewright/engine';
import type {
  AirflowCaution,
  AirflowReason,
  CapacityCaution,
  CapacityReason,
  DerivationStep,
  Fault,
  FieldFault,
  FieldFaultFigures,
  WeighInCaution,
  WeighInReason,
  WeighInResult,
} from '@chargewright/engine';
import { derivationLines } from './derivation-lines';
import type { DerivationLine } from './derivation-lines';
import { airflowWords } from './english/airflow';
import { faultWords } from './english/faults';
import { fieldFaultNaming, fieldFaultTexts } from './english/field-faults';
import { fieldInputName } from './english/field-inputs';
import { fieldStepName } from './english/field-steps';
import { findingPhrases } from './english/findings';
import { names } from './english/names';
import { structureFaultWords } from './english/structure-faults';
import { weighInWords } from './english/weigh-in';
import { faultText, structureFaultText } from './fault-sentences';
import { fieldName } from './field-name';
import { formatMass, formatMassBoth } from './format-mass';
import { formatStated, formatValue } from './format-value';
import type { Language } from './language';
import type { Print } from './message-texts';
import type { StructureFault } from './structure-fault';
import type { UnitSystem } from './unit-system';

const listed = (inputs: readonly string[]): string => names.list(inputs.map(fieldInputName));

type InAirflow = Pick<Language, 'airflow'>;
type InWeighIn = Pick<Language, 'weighIn'>;

export const airflowReasonText = (reason: AirflowReason, { airflow }: InAirflow = { airflow: airflowWords }): string =>
  reason.code === 'inputs-missing' ? airflow.missing(listed(reason.inputs)) : airflow.reasons[reason.code];

export const airflowCautionText = (
  caution: AirflowCaution,
  { airflow }: InAirflow = { airflow: airflowWords },
): string => airflow.cautions[caution];

export const capacityReasonText = (
  reason: CapacityReason,
  { airflow }: InAirflow = { airflow: airflowWords },
): string =>
  reason.code === 'inputs-missing' ? airflow.missing(listed(reason.inputs)) : airflow.capacityReasons[reason.code];

export const capacityCautionText = (
  caution: CapacityCaution,
  { airflow }: InAirflow = { airflow: airflowWords },
): string => airflow.capacityCautions[caution];

export const weighInReasonText = (reason: WeighInReason, { weighIn }: InWeighIn = { weighIn: weighInWords }): string =>
  reason.code === 'inputs-missing' ? weighIn.missing(listed(reason.inputs)) : weighIn.reasons[reason.code];

export const weighInCautionText = (
  caution: WeighInCaution,
  { weighIn }: InWeighIn = { weighIn: weighInWords },
): string => weighIn.cautions[caution];

export interface WeighInSays {
  readonly headline: string;
  readonly next: string;
}

/** How a weigh-in came out, or what is to be weighed in, and what to do. */
export function weighInSays(
  result: WeighInResult,
  system: UnitSystem,
  { weighIn }: InWeighIn = { weighIn: weighInWords },
): WeighInSays {
  const { headlines, next } = weighIn;
  const { finding, reason, difference } = result;
  const off = isKnown(difference) ? formatMass(Math.abs(difference.value), system) : '';
  switch (finding) {
    case 'within':
      return { headline: headlines.within, next: next.within };
    case 'above':
      return { headline: headlines.above(off), next: next.above(off) };
    case 'below':
      return { headline: headlines.below(off), next: next.below(off) };
    case 'too-close-to-call': {
      const side = isKnown(difference) && difference.value < 0 ? 'below' : 'above';
      return { headline: headlines.tooClose(off, side), next: next.tooClose };
    }
    case 'not-verifiable':
      return notVerifiable(result, weighIn);
    case 'not-judged': {
      const onlyToWeigh =
        reason?.code === 'inputs-missing' && reason.inputs.length === 1 && reason.inputs[0] === 'actualCharge';
      return onlyToWeigh ? toWeigh(result, system, weighIn) : { headline: headlines.notJudged, next: next.enter };
    }
  }
}

function notVerifiable({ reason }: WeighInResult, { headlines, next }: Language['weighIn']): WeighInSays {
  const code = reason?.code;
  if (code === 'above-label-maximum') return { headline: headlines.aboveLabel, next: next.label };
  if (code === 'vacuum-failed') return { headline: headlines.vacuumFails, next: next.vacuum };
  const unproven = code === 'vacuum-not-proven' || code === 'vacuum-not-recorded';
  return { headline: headlines.notVerifiable, next: unproven ? next.vacuumUnproven : next.rules };
}

/** Below this nobody weighs anything: rounding of a length times a rate. */
const NOTHING_KG = 1e-6;

function toWeigh({ method, required }: WeighInResult, system: UnitSystem, words: Language['weighIn']): WeighInSays {
  const { headlines, next } = words;
  if (!isKnown(required)) return { headline: headlines.notJudged, next: next.enter };
  const much = formatMassBoth(Math.abs(required.value), system);
  if (method === 'total') return { headline: headlines.whole(much), next: next.whole(much) };
  if (Math.abs(required.value) < NOTHING_KG) return { headline: headlines.nothing, next: next.nothing };
  return required.value > 0
    ? { headline: headlines.putIn(much), next: next.putIn(much) }
    : { headline: headlines.recover(much), next: next.recover(much) };
}

type InFaults = Pick<Language, 'faults' | 'names' | 'fieldFaults'>;
const ENGLISH_FAULTS: InFaults = {
  faults: faultWords,
  names,
  fieldFaults: { texts: fieldFaultTexts, naming: fieldFaultNaming },
};

const isOwn = (code: string, texts: object): code is keyof FieldFaultFigures => Object.hasOwn(texts, code);

/** What cannot be, said beside the field. */
export function fieldFaultText(
  fault: FieldFault,
  system: UnitSystem,
  { faults, names: figureNames, fieldFaults: { texts, naming } }: InFaults = ENGLISH_FAULTS,
): string {
  const { code, path } = fault;
  if (isOwn(code, texts)) return texts[code]({ field: fieldName(path, naming) });
  return faultText({ ...fault, code } as Fault, system, { names: figureNames, faults: { ...faults, naming } });
}

/** What is wrong with the shape of a request. */
export const fieldStructureFaultText = (
  fault: StructureFault,
  language: InFaults & Pick<Language, 'structureFaults'> = { ...ENGLISH_FAULTS, structureFaults: structureFaultWords },
): string =>
  structureFaultText(fault, {
    structureFaults: language.structureFaults,
    faults: { ...language.faults, naming: language.fieldFaults.naming },
  });

/** Lengths, rates and masses are said as they were entered: half a foot counts. */
const printEntered: Print = (kind, value, system) =>
  kind === 'lengthM' || kind === 'chargeRateKgPerM' || kind === 'massKg'
    ? formatStated(kind, value, system)
    : formatValue(kind, value, system);

/** The derivation of an airflow, a capacity or a weigh-in, a line a step. */
export const fieldDerivationLines = (
  steps: readonly DerivationStep[],
  system: UnitSystem,
  language: Pick<Language, 'findings'> = { findings: { ...findingPhrases, stepName: fieldStepName } },
): readonly DerivationLine[] => derivationLines(steps, system, language, printEntered);
