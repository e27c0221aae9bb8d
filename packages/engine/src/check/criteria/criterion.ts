/** How every numerical criterion comes to its finding: what is missing, which gate is shut, then the number itself. */
import { derive } from '../../derivation/derive';
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown, missing } from '../../derivation/quantity';
import { deviation as deviationOf } from '../../methods/targets';
import type { CriterionId, Finding, Reason } from '../codes';
import type { Conformance } from '../conformance';
import { judgeConformance } from '../conformance';
import { absenceReason } from '../evidence';
import type { Decision } from '../procedure';
import type { CriterionResult, TargetSource, Tolerance } from '../result';

export interface NumericCriterion {
  readonly criterion: CriterionId;
  readonly required: boolean;
  readonly actual: Quantity;
  readonly target: Quantity;
  readonly targetSource: TargetSource;
  /** `null`: none can be told for this target. */
  readonly tolerance: (target: Known) => Tolerance | null;
  readonly decision: Decision;
  readonly probabilityOfNoTarget?: number;
  readonly mostProbabilityOfNoTarget?: number;
  /** First match shuts the criterion; `null` entries are open. Looked at only when there is something to judge. */
  readonly gates: (evidence: readonly Known[]) => readonly (Reason | null)[];
  /** A reason why a finding *within* would claim too much. */
  readonly neverWithin?: Reason | null;
}

/** A criterion for which nothing was computed. */
export const unjudged = (
  criterion: CriterionId,
  required: boolean,
  finding: Extract<Finding, 'not-judged' | 'not-verifiable'>,
  reason: Reason | null,
  actual: Quantity | null = null,
): CriterionResult => ({
  criterion,
  required,
  actual: isKnown(actual) ? actual : null,
  target: null,
  targetSource: null,
  deviation: null,
  tolerance: null,
  byRule: null,
  probabilityWithin: null,
  onlyJust: false,
  finding,
  reason,
});

/** Judges actual against target. The numbers stand whenever they exist; gates change only the finding. */
export function judgeCriterion(input: NumericCriterion): CriterionResult {
  const { criterion, required, actual, target, targetSource } = input;
  const deviation = derive(deviationOf(criterion, kindOfDeviation(criterion)), { actual, target });
  const tolerance = isKnown(target) ? input.tolerance(target) : null;
  const conformance = isKnown(deviation) && tolerance !== null ? conformanceOf(input, deviation, tolerance) : null;
  const numbers = {
    criterion,
    required,
    actual: isKnown(actual) ? actual : null,
    target: isKnown(target) ? target : null,
    targetSource: isKnown(target) ? targetSource : null,
    deviation: isKnown(deviation) ? deviation : null,
    tolerance,
    byRule: conformance?.byRule ?? null,
    probabilityWithin: conformance?.probabilityWithin ?? null,
  };
  return { ...numbers, ...findingOf(input, conformance) };
}

/** What is left when two of them are subtracted. */
function kindOfDeviation(criterion: CriterionId): 'flowM3PerS' | 'pressureDifferencePa' | 'differenceK' {
  if (criterion === 'airflow') return 'flowM3PerS';
  const pressure = criterion === 'liquid-pressure' || criterion === 'heating-discharge-pressure';
  return pressure ? 'pressureDifferencePa' : 'differenceK';
}

/** A window holds the actual value itself; there is no target to deviate from. */
export function judgeWindow(
  input: Omit<NumericCriterion, 'target' | 'tolerance'> & { readonly tolerance: Tolerance },
): CriterionResult {
  const { criterion, required, actual, targetSource, tolerance } = input;
  const conformance = isKnown(actual) ? conformanceOf(input, actual, tolerance) : null;
  const numbers = {
    criterion,
    required,
    actual: isKnown(actual) ? actual : null,
    target: null,
    targetSource,
    deviation: null,
    tolerance,
    byRule: conformance?.byRule ?? null,
    probabilityWithin: conformance?.probabilityWithin ?? null,
  };
  return { ...numbers, ...findingOf({ ...input, target: actual }, conformance) };
}

function conformanceOf(
  input: Pick<NumericCriterion, 'decision' | 'probabilityOfNoTarget'>,
  measured: Known,
  tolerance: Tolerance,
): Conformance {
  const { decision, probabilityOfNoTarget = 0 } = input;
  return judgeConformance({ measured, tolerance, decision, probabilityOfNoTarget });
}

type FindingAndReason = Pick<CriterionResult, 'finding' | 'reason' | 'onlyJust'>;
type FindingInput = Pick<
  NumericCriterion,
  'actual' | 'target' | 'gates' | 'neverWithin' | 'probabilityOfNoTarget' | 'mostProbabilityOfNoTarget'
>;

function findingOf(input: FindingInput, conformance: Conformance | null): FindingAndReason {
  const { actual, target, probabilityOfNoTarget = 0, mostProbabilityOfNoTarget = 1, neverWithin = null } = input;
  const without = (finding: Finding, reason: Reason): FindingAndReason => ({ finding, reason, onlyJust: false });
  const lacking = lackingInputs(actual, target);
  if (lacking !== null) return without('not-judged', lacking);
  const evidence = [actual, target].filter(isKnown);
  const shut = input.gates(evidence).find((reason) => reason !== null);
  if (shut !== undefined) return without('not-verifiable', shut);
  // what is left without a number is a table that has no value at this point
  if (!isKnown(target)) return without('not-verifiable', absenceReason(target));
  if (conformance === null) return without('not-judged', { code: 'outside-range', figures: {} });
  if (probabilityOfNoTarget > mostProbabilityOfNoTarget) {
    const probability = { kind: 'fraction', value: probabilityOfNoTarget } as const;
    return without('not-verifiable', { code: 'target-may-not-exist', figures: { probability } });
  }
  if (conformance.finding === 'within' && neverWithin !== null) {
    return without('too-close-to-call', neverWithin);
  }
  return { finding: conformance.finding, reason: null, onlyJust: conformance.onlyJust };
}

/** Missing readings of both sides together; else why the actual value, or the target's inputs, cannot be had. */
function lackingInputs(actual: Quantity, target: Quantity): Reason | null {
  const inputs = [actual, target].flatMap((quantity) => (quantity.state === 'missing' ? quantity.inputs : []));
  if (inputs.length > 0) return absenceReason(missing(...new Set(inputs)));
  if (actual.state === 'refused') return absenceReason(actual);
  if (target.state !== 'refused') return null;
  const reason = absenceReason(target);
  return reason.code === 'no-target-here' ? null : reason;
}
