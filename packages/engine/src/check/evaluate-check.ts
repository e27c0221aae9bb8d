/** The judgement of one check: pure, deterministic and total for every input that `readRequest` lets through. */
import type { Known } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import { derivationSteps } from '../derivation/steps';
import { findCautions } from './cautions';
import { chargeMethod, otherMethods, ownMethod } from './charge-method';
import type { Caution, OverallFinding, Reason, Stop } from './codes';
import {
  airflowCriterion,
  airflowEvidence,
  airflowGate,
  airflowNearLimit,
  judgeAirflow,
  judgeSplit,
  splitCautions,
  splitCriterion,
  splitEvidence,
  splitTarget,
} from './criteria/air';
import type { ChargeJudgement } from './criteria/charge';
import { judgeSubcooling, judgeSuperheat, judgeSuperheatWindow } from './criteria/charge';
import { chargeTarget } from './criteria/charge-target';
import { conditionsGate, judgeConditions, judgeInstruments, recordGate } from './criteria/conditions';
import { judgeMakersMethod } from './criteria/makers-methods';
import type { DerivedQuantities } from './derived-quantities';
import { deriveQuantities } from './derived-quantities';
import { engineVersion } from './engine-version';
import { staleReason } from './evidence';
import { unfitReason, unstatedReason } from './fit-for-test';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';
import { findNextStep } from './next-step/next-step';
import type { CheckResult, CriterionResult, DerivedId } from './result';
import { DERIVED_IDS } from './result';
import { impossibleReadings } from './saturation-plausibility';
import { findStops } from './stops';

export function evaluateCheck(input: CheckInput): CheckResult {
  const { setup, readings, procedure } = input;
  const derived = deriveQuantities(setup, readings);
  const unfit = unfitReason(input);
  const impossible = impossibleReadings(input, derived);
  const stops = findStops(input, derived);

  const cooling = setup.mode === 'cooling';
  const targetSplit = splitTarget(input, derived);
  const split = judgeSplit(input, derived, targetSplit, cooling ? unfit : HEATING);
  const measured = judgeAirflow(input);
  const splitShows = splitEvidence(input, derived, { split, target: targetSplit });
  const evidence = airflowEvidence(input, { airflow: measured, split: splitShows });
  const airflow = airflowCriterion(input, measured, evidence);
  const method = chargeMethod(input);
  const charge = judgeCharge({
    input,
    derived,
    unfit,
    unstated: unstatedReason(input),
    method: method ?? ownMethod(input),
    gates: (judgedBy) => (from) => [
      impossible?.reason ?? null,
      frozen(stops),
      conditionsGate(input, judgedBy),
      recordGate(input),
      staleReason(input, from),
      airflowGate(procedure, evidence),
    ],
  });
  const criteria = [
    ...charge,
    ...(cooling ? [splitCriterion(input, split)] : []),
    ...(airflow === null ? [] : [airflow]),
    judgeConditions(input),
    judgeInstruments(input),
  ];

  const finding = overallFinding(stops, criteria);
  const cautions = [
    ...(impossible === null ? [] : [impossible.caution]),
    ...findCautions(input, derived, evidence),
    ...(cooling ? [...splitCautions(input, splitShows), ...airflowNearLimit(input, measured, split)] : []),
    ...hiddenFaults(input, derived, finding),
  ];
  const nextStep = findNextStep({
    input,
    derived,
    criteria,
    method,
    target: method && chargeTarget(input, derived, method),
    unfit,
    impossible: impossible?.reason ?? null,
    stops,
    cautions,
    airflow: evidence,
    split: splitShows,
    overall: finding,
  });

  return {
    engineVersion: engineVersion(),
    procedure: { id: procedure.id, version: procedure.version },
    derived: knownOnly(derived),
    criteria,
    overall: { finding, nextStep, stops, cautions },
    derivation: derivationSteps(resultsToExplain(derived, criteria)),
  };
}

const HEATING: Reason = { code: 'heating-mode', figures: {} };

/**
 * Subcooling of a fixed orifice is shown and looked at by the next step, but decides nothing; so are the maker's further methods beside the one that
 * decides. In heating no cooling target holds: only the maker's heating tables are judged, where there are any.
 */
function judgeCharge(judgement: ChargeJudgement): readonly CriterionResult[] {
  const { input } = judgement;
  const others = otherMethods(input).map((other) => judgeMakersMethod(judgement, other));
  if (input.setup.mode === 'heating' && others.length > 0) return others;
  return isFixedOrifice(input.setup)
    ? [judgeSuperheat(judgement), judgeSubcooling(judgement), ...others]
    : [judgeSubcooling(judgement), judgeSuperheatWindow(judgement), ...others];
}

/** Ice falsifies every reading of the cycle: they stay for diagnosis, without a finding on the charge. */
const frozen = (stops: readonly Stop[]): Reason | null =>
  stops.some(({ code }) => code === 'freezing') ? { code: 'freezing', figures: {} } : null;

/** The first that applies: stop, not verifiable, not judged, outside, too close to call, within. */
function overallFinding(stops: readonly Stop[], criteria: readonly CriterionResult[]): OverallFinding {
  if (stops.length > 0) return 'stop';
  const findings = criteria.filter(({ required }) => required).map(({ finding }) => finding);
  if (findings.includes('not-verifiable')) return 'not-verifiable';
  if (findings.includes('not-judged')) return 'not-judged';
  const outside = findings.find((finding) => finding === 'above' || finding === 'below');
  if (outside !== undefined) return outside;
  return findings.includes('too-close-to-call') ? 'too-close-to-call' : 'within';
}

/** On a fixed orifice low charge and low airflow can hide each other behind a superheat that is within. */
function hiddenFaults(
  { setup }: CheckInput,
  { subcooling }: DerivedQuantities,
  finding: OverallFinding,
): readonly Caution[] {
  const judged = setup.mode === 'cooling' && finding === 'within';
  const hidden = isFixedOrifice(setup) && judged && !isKnown(subcooling);
  return hidden ? [{ code: 'faults-may-hide', figures: {} }] : [];
}

function knownOnly(derived: DerivedQuantities): CheckResult['derived'] {
  const found: Partial<Record<DerivedId, Known>> = {};
  for (const id of DERIVED_IDS) {
    const quantity = derived[id];
    if (isKnown(quantity)) found[id] = quantity;
  }
  return found;
}

/** What the math shows: the results first needed, each with what it came from. */
function resultsToExplain(derived: DerivedQuantities, criteria: readonly CriterionResult[]): readonly Known[] {
  const results = criteria.flatMap(({ actual, target, deviation }) => [actual, target, deviation]);
  const others = [derived.superheat, derived.subcooling, derived.temperatureSplit, derived.returnRelativeHumidity];
  return [...results, ...others].filter((quantity): quantity is Known => isKnown(quantity));
}
