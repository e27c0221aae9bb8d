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
import type { CheckInput, CheckSetup } from '../input';
import type { AirflowEvidence, AirflowRules, Procedure, Rule, SplitEvidence } from '../procedure';
import type { CriterionResult, TargetSource } from '../result';
import { conditionsGate } from './conditions';
import { judgeCriterion, unjudged } from './criterion';
import { halfWidth, sourceOf, symmetric } from './tolerance';

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
  return judgeCriterion({
    criterion: 'temperature-split',
    required: false,
    actual,
    target,
    targetSource: 'split-table',
    tolerance: () => symmetric(halfWidth(null, procedure.temperatureSplit.toleranceK)),
    decision: procedure.decision,
    probabilityOfNoTarget: isKnown(target) ? noSplitTarget(input, derived) : 0,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: (evidence) => [conditionsGate(input), staleReason(input, evidence)],
  });
}

/** The split among the criteria: a table that is not this maker's judges nothing where his data alone count. */
export const splitCriterion = ({ procedure }: CheckInput, split: CriterionResult): CriterionResult =>
  procedure.temperatureSplit.judged || split.reason?.code === 'readings-missing'
    ? split
    : unjudged(
        'temperature-split',
        false,
        'not-judged',
        { code: 'split-not-by-these-rules', figures: {} },
        split.actual,
      );

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
    const code = procedure.airflow.leastM3PerSPerW === null ? 'design-airflow-missing' : 'capacity-missing';
    return unjudged('airflow', false, 'not-judged', { code, figures: {} }, measured.quantity);
  }
  return judgeCriterion({
    criterion: 'airflow',
    required: false,
    actual: measured.quantity,
    target: least.target,
    targetSource: least.source,
    tolerance: () => ({
      low: procedure.airflow.limitPasses ? 0 : LEAST_EXCESS_M3_PER_S,
      high: null,
      floored: false,
      source: sourceOf(least.rule),
    }),
    decision: procedure.decision,
    gates: (evidence) => [staleReason(input, evidence)],
  });
}

/** A limit that must be exceeded: by more than the slack of the comparison, far less than any instrument shows. */
const LEAST_EXCESS_M3_PER_S = 2 * LIMIT_SLACK_K;

interface LeastAirflow {
  readonly target: Known;
  readonly source: TargetSource;
  readonly rule: Rule;
}

function leastAirflow({ procedure, setup }: CheckInput): LeastAirflow | null {
  const { leastDesignFraction: rule } = procedure.airflow;
  const entered = (value: number): Known => leaf({ id: 'leastAirflow', kind: 'flowM3PerS', value, origin: 'entered' });
  if (setup.designAirflowM3PerS !== undefined && rule !== null) {
    return { target: entered(rule.value * setup.designAirflowM3PerS), source: 'design-airflow', rule };
  }
  const perCapacity = leastPerCapacity(procedure.airflow, setup);
  return setup.nominalCapacityW === undefined || perCapacity === null
    ? null
    : {
        target: entered(perCapacity.value * setup.nominalCapacityW),
        source: 'airflow-per-capacity',
        rule: perCapacity,
      };
}

/** The limit of an alteration or a high-velocity system where the procedure has one; of the two the lower. */
function leastPerCapacity(rules: AirflowRules, { alteration, highVelocity }: CheckSetup): Rule | null {
  const limits = [
    rules.leastM3PerSPerW,
    alteration ? rules.leastOfAlterationM3PerSPerW : null,
    highVelocity ? rules.leastOfHighVelocityM3PerSPerW : null,
  ].filter((rule) => rule !== null);
  return limits.reduce<Rule | null>((least, rule) => (least === null || rule.value < least.value ? rule : least), null);
}

/**
 * What the charge is judged on: a measured airflow outranks a permitted path, and that the split. All gate by the rule on the bare values, so that
 * a poorer instrument never opens a gate. Readings that do not count today (conditions, age) prove nothing.
 */
export function airflowEvidence(
  input: CheckInput,
  { airflow, split }: { readonly airflow: CriterionResult | null; readonly split: SplitEvidence },
): AirflowEvidence {
  const { gates, splitCounts, eitherSuffices } = input.procedure.airflow;
  const measured = airflow !== null && judged(airflow) ? airflow.byRule : null;
  if (measured === 'passes') return 'measured-enough';
  if (isPathPermitted(input, measured === 'fails')) return 'permitted-path';
  const fromSplit = splitCounts ? split : 'nothing';
  if (measured === null) return fromSplit;
  return eitherSuffices && !gates.includes(fromSplit) ? fromSplit : 'measured-low';
}

const isPathPermitted = ({ procedure, setup }: CheckInput, measuredLow: boolean): boolean =>
  procedure.airflow.permittedPaths.some(
    ({ path, alterationOnly, despiteLowMeasurement }) =>
      path === setup.airflowPath && (!alterationOnly || setup.alteration) && (!measuredLow || despiteLowMeasurement),
  );

/** A split above its band counts also where its target or its finding is in doubt. */
export function splitEvidence(
  input: CheckInput,
  derived: DerivedQuantities,
  { split, target }: { readonly split: CriterionResult; readonly target: Quantity },
): SplitEvidence {
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

export function airflowGate({ airflow }: Procedure, evidence: AirflowEvidence): Reason | null {
  if (!airflow.gates.includes(evidence)) return null;
  if (evidence === 'measured-low') return { code: 'airflow-too-low', figures: {} };
  return { code: evidence === 'split-above' ? 'split-above' : 'airflow-not-proven', figures: {} };
}

/**
 * The airflow among the criteria. Where the procedure wants it proved, the overall finding waits for the measurement, or for something that stands in
 * for it.
 */
export function airflowCriterion(
  { procedure }: CheckInput,
  measured: CriterionResult | null,
  evidence: AirflowEvidence,
): CriterionResult | null {
  if (!procedure.airflow.gates.includes('nothing')) return measured;
  const unproven = evidence === 'nothing';
  const required = unproven || evidence === 'measured-low' || evidence === 'measured-enough';
  if (measured !== null) return { ...measured, required };
  return unproven ? unjudged('airflow', true, 'not-judged', { code: 'airflow-not-proven', figures: {} }) : null;
}

export const splitCautions = ({ procedure }: CheckInput, split: SplitEvidence): readonly Caution[] =>
  procedure.airflow.splitCautions.filter((code) => code === split).map((code) => ({ code, figures: {} }));

/** A caution for an airflow gate whose limit lies inside the uncertainty of what is held against it; a split that is clear of it is said to be. */
export function airflowNearLimit(
  { procedure }: CheckInput,
  airflow: CriterionResult | null,
  split: CriterionResult,
): readonly Caution[] {
  if (airflow !== null && judged(airflow)) return nearLimit(airflow, 0);
  const doubtful = split.finding === 'too-close-to-call' || split.onlyJust;
  return procedure.airflow.splitCounts && doubtful ? nearLimit(split, split.tolerance?.high ?? 0) : [];
}

function nearLimit({ actual, target, deviation }: CriterionResult, allowed: number): readonly Caution[] {
  if (actual === null || target === null || deviation === null) return [];
  if (Math.abs(deviation.value - allowed) >= expandedUncertainty(deviation)) return [];
  const figure = (value: number): Figure => ({ kind: actual.kind, value });
  return [{ code: 'near-limit', figures: { actual: figure(actual.value), limit: figure(target.value + allowed) } }];
}
