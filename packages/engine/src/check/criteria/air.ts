/** Airflow before charge: the temperature split and the measured airflow, and what they allow. */
import type { Known, Quantity } from '../../derivation/quantity';
import { bareValue, expandedUncertainty, isKnown, leaf, missing } from '../../derivation/quantity';
import { derive } from '../../derivation/derive';
import { probabilityOfNoTarget } from '../../methods/target-existence';
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { chartRounding, targetTemperatureSplit } from '../../methods/targets';
import type { Caution, Figure, Reason, ReasonCode } from '../codes';
import { LIMIT_SLACK_K } from '../conformance';
import { staleReason } from '../evidence';
import type { DerivedQuantities } from '../derived-quantities';
import type { CheckInput } from '../input';
import type { CriterionResult, TargetSource } from '../result';
import { conditionsGate } from './conditions';
import { judgeCriterion, unjudged } from './criterion';

/** What is known about the airflow; only the first two and `split-above` change what may be judged. */
export type AirflowEvidence =
  'measured-low' | 'measured-enough' | 'split-above' | 'split-within' | 'split-too-close' | 'split-below' | 'nothing';

/** Target of the split, for its criterion and for the gate. */
export function splitTarget({ readings }: CheckInput, { returnWetBulb }: DerivedQuantities): Quantity {
  const returnDryBulbK: Quantity = readings.returnDryBulb?.quantity ?? missing('returnDryBulb');
  return derive(targetTemperatureSplit, { returnDryBulbK, wetBulbK: returnWetBulb }, [chartRounding(SPLIT_TABLE)]);
}

export function judgeSplit(
  input: CheckInput,
  derived: DerivedQuantities,
  target: Quantity,
  unfit: Reason | null,
): CriterionResult {
  const actual = derived.temperatureSplit;
  if (unfit !== null) return unjudged('temperature-split', false, 'not-verifiable', unfit, actual);
  const { procedure } = input;
  const tolerance = procedure.temperatureSplit.toleranceK.value;
  return judgeCriterion({
    criterion: 'temperature-split',
    required: false,
    actual,
    target,
    targetSource: 'split-table',
    tolerance: () => ({ low: -tolerance, high: tolerance, floored: false }),
    guard: procedure.guardProbability.value,
    probabilityOfNoTarget: isKnown(target) ? noSplitTarget(input, derived) : 0,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: (evidence) => [conditionsGate(input), staleReason(input, evidence)],
  });
}

function noSplitTarget({ readings }: CheckInput, { returnWetBulb }: DerivedQuantities): number {
  const dryBulb = readings.returnDryBulb?.quantity;
  if (dryBulb === undefined || !isKnown(returnWetBulb)) return 0;
  return probabilityOfNoTarget(SPLIT_TABLE, {
    rowK: dryBulb.value,
    rowUK: dryBulb.u,
    columnK: returnWetBulb.value,
    columnUK: returnWetBulb.u,
  });
}

/** The measured airflow against the least the procedure asks for; `null` when none was measured. */
export function judgeAirflow(input: CheckInput): CriterionResult | null {
  const { procedure, readings } = input;
  const measured = readings.airflow;
  if (measured === undefined) return null;
  const least = leastAirflow(input);
  if (least === null) {
    return unjudged('airflow', false, 'not-judged', { code: 'capacity-missing', figures: {} }, measured.quantity);
  }
  return judgeCriterion({
    criterion: 'airflow',
    required: false,
    actual: measured.quantity,
    target: least.target,
    targetSource: least.source,
    tolerance: () => ({ low: 0, high: null, floored: false }),
    guard: procedure.guardProbability.value,
    gates: (evidence) => [staleReason(input, evidence)],
  });
}

function leastAirflow({ procedure, setup }: CheckInput): { target: Known; source: TargetSource } | null {
  const { leastDesignFraction, leastM3PerSPerW } = procedure.airflow;
  const entered = (value: number): Known => leaf({ id: 'leastAirflow', kind: 'flowM3PerS', value, origin: 'entered' });
  if (setup.designAirflowM3PerS !== undefined) {
    return { target: entered(leastDesignFraction.value * setup.designAirflowM3PerS), source: 'design-airflow' };
  }
  if (setup.nominalCapacityW !== undefined) {
    return { target: entered(leastM3PerSPerW.value * setup.nominalCapacityW), source: 'airflow-per-capacity' };
  }
  return null;
}

/**
 * Measured airflow outranks the split. Both gate by the rule on the bare values, so that a poorer instrument never opens a gate: a split above
 * its band shuts it also where its target or its finding is in doubt. Readings that do not count today (conditions, age) prove nothing.
 */
export function airflowEvidence(
  input: CheckInput,
  derived: DerivedQuantities,
  judgements: { readonly airflow: CriterionResult | null; readonly split: CriterionResult; readonly target: Quantity },
): AirflowEvidence {
  const { airflow, split, target } = judgements;
  if (airflow !== null && judged(airflow)) return airflow.byRule === 'fails' ? 'measured-low' : 'measured-enough';
  if (counts(split) && isAboveBand(input, derived, target)) return 'split-above';
  if (!judged(split)) return 'nothing';
  if (split.finding === 'too-close-to-call') return 'split-too-close';
  return split.finding === 'below' ? 'split-below' : 'split-within';
}

function isAboveBand({ procedure }: CheckInput, { temperatureSplit }: DerivedQuantities, target: Quantity): boolean {
  const actualK = bareValue(temperatureSplit);
  const targetK = bareValue(target);
  if (actualK === undefined || targetK === undefined) return false;
  return actualK - targetK > procedure.temperatureSplit.toleranceK.value + LIMIT_SLACK_K;
}

/** Reasons that the uncertainty of the readings alone can give. */
const DOUBTS: readonly (ReasonCode | undefined)[] = ['target-may-not-exist', 'no-target-here', 'outside-range'];

const counts = (split: CriterionResult): boolean => judged(split) || DOUBTS.includes(split.reason?.code);

const judged = ({ finding }: CriterionResult): boolean => finding !== 'not-judged' && finding !== 'not-verifiable';

export function airflowGate(evidence: AirflowEvidence): Reason | null {
  if (evidence === 'measured-low') return { code: 'airflow-too-low', figures: {} };
  return evidence === 'split-above' ? { code: 'split-above', figures: {} } : null;
}

/** A caution for an airflow gate whose limit lies inside the uncertainty of what is held against it; a split that is clear of it is said to be. */
export function airflowNearLimit(airflow: CriterionResult | null, split: CriterionResult): readonly Caution[] {
  if (airflow !== null && judged(airflow)) return nearLimit(airflow, 0);
  return split.finding === 'too-close-to-call' ? nearLimit(split, split.tolerance?.high ?? 0) : [];
}

function nearLimit({ actual, target, deviation }: CriterionResult, allowed: number): readonly Caution[] {
  if (actual === null || target === null || deviation === null) return [];
  if (Math.abs(deviation.value - allowed) >= expandedUncertainty(deviation)) return [];
  const figure = (value: number): Figure => ({ kind: actual.kind, value });
  return [{ code: 'near-limit', figures: { actual: figure(actual.value), limit: figure(target.value + allowed) } }];
}
