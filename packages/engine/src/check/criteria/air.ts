/** Airflow before charge: the temperature split and the measured airflow, and what they allow. */
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown, leaf, missing } from '../../derivation/quantity';
import { derive } from '../../derivation/derive';
import { probabilityOfNoTarget } from '../../methods/target-existence';
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { chartRounding, targetTemperatureSplit } from '../../methods/targets';
import type { Reason } from '../codes';
import { staleReason } from '../evidence';
import type { DerivedQuantities } from '../derived-quantities';
import type { CheckInput } from '../input';
import type { CriterionResult, TargetSource } from '../result';
import { conditionsGate } from './conditions';
import { judgeCriterion, unjudged } from './criterion';

/** What is known about the airflow; only the first two and `split-above` change what may be judged. */
export type AirflowEvidence =
  'measured-low' | 'measured-enough' | 'split-above' | 'split-within' | 'split-too-close' | 'split-below' | 'nothing';

export function judgeSplit(input: CheckInput, derived: DerivedQuantities, unfit: Reason | null): CriterionResult {
  const actual = derived.temperatureSplit;
  if (unfit !== null) return unjudged('temperature-split', false, 'not-verifiable', unfit, actual);
  const { procedure, readings } = input;
  const returnDryBulbK: Quantity = readings.returnDryBulb?.quantity ?? missing('returnDryBulb');
  const wetBulbK = derived.returnWetBulb;
  const target = derive(targetTemperatureSplit, { returnDryBulbK, wetBulbK }, [chartRounding(SPLIT_TABLE)]);
  const tolerance = procedure.temperatureSplit.toleranceK.value;
  return judgeCriterion({
    criterion: 'temperature-split',
    required: false,
    actual,
    target,
    targetSource: 'split-table',
    tolerance: () => ({ low: -tolerance, high: tolerance, floored: false }),
    guard: procedure.guardProbability.value,
    probabilityOfNoTarget: isKnown(target) ? noSplitTarget(returnDryBulbK, wetBulbK) : 0,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: (evidence) => [conditionsGate(input), staleReason(input, evidence)],
  });
}

function noSplitTarget(dryBulb: Quantity, wetBulb: Quantity): number {
  if (!isKnown(dryBulb) || !isKnown(wetBulb)) return 0;
  return probabilityOfNoTarget(SPLIT_TABLE, {
    rowK: dryBulb.value,
    rowUK: dryBulb.u,
    columnK: wetBulb.value,
    columnUK: wetBulb.u,
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

/** Measured airflow outranks the split. Both gate by the rule on the measured value, so that a poorer instrument never opens a gate. */
export function airflowEvidence(airflow: CriterionResult | null, split: CriterionResult): AirflowEvidence {
  if (airflow !== null && judged(airflow)) return airflow.byRule === 'fails' ? 'measured-low' : 'measured-enough';
  if (!judged(split) || split.deviation === null) return 'nothing';
  if (split.finding === 'above' || (split.byRule === 'fails' && split.deviation.value > 0)) return 'split-above';
  if (split.finding === 'too-close-to-call') return 'split-too-close';
  return split.finding === 'below' ? 'split-below' : 'split-within';
}

const judged = ({ finding }: CriterionResult): boolean => finding !== 'not-judged' && finding !== 'not-verifiable';

export function airflowGate(evidence: AirflowEvidence): Reason | null {
  if (evidence === 'measured-low') return { code: 'airflow-too-low', figures: {} };
  return evidence === 'split-above' ? { code: 'split-above', figures: {} } : null;
}
