/** The criteria that judge the charge: superheat of a fixed orifice; subcooling and the superheat window of a valve. */
import type { Known } from '../../derivation/quantity';
import { bareValue, isKnown } from '../../derivation/quantity';
import type { ChargeMethod } from '../charge-method';
import { isEntered, usableChart } from '../charge-method';
import type { Reason } from '../codes';
import type { DerivedQuantities } from '../derived-quantities';
import { unfitPortReason } from '../fit-for-test';
import type { CheckInput, CheckSetup } from '../input';
import { isFixedOrifice } from '../input';
import type { Procedure } from '../procedure';
import type { CriterionResult, ToleranceSource } from '../result';
import type { ChargeTarget } from './charge-target';
import { chargeTarget } from './charge-target';
import { judgeCriterion, judgeWindow, unjudged } from './criterion';
import { floored, halfWidth, sourceOf } from './tolerance';

export interface ChargeJudgement {
  readonly input: CheckInput;
  readonly derived: DerivedQuantities;
  readonly unfit: Reason | null;
  /** What the person has to state before the procedure judges anything. */
  readonly unstated: Reason | null;
  /** By what the charge is decided: its criterion is required. */
  readonly method: ChargeMethod;
  /** Gates shared by all charge criteria, with the limits of the method that is judged by: impossible readings, conditions, age, airflow. */
  readonly gates: (method: ChargeMethod) => (evidence: readonly Known[]) => readonly (Reason | null)[];
}

/**
 * A measured subcooling or superheat below zero means about zero: nothing that rests on the readings is called *within*, however poor the
 * instruments that might excuse it.
 */
export function negativeDifference({ subcooling, superheat }: DerivedQuantities): Reason | null {
  if ((bareValue(subcooling) ?? 0) < 0) return { code: 'flash', figures: {} };
  return (bareValue(superheat) ?? 0) < 0 ? { code: 'saturation-impossible', figures: {} } : null;
}

const isMissing = ({ quantity }: ChargeTarget): boolean => quantity.state === 'missing' && quantity.inputs.length === 0;

export function judgeSuperheat({ input, derived, unfit, unstated, method, gates }: ChargeJudgement): CriterionResult {
  const { procedure } = input;
  const actual = derived.superheat;
  const required = method.kind === 'superheat';
  if (unfit !== null) return unjudged('superheat', required, 'not-verifiable', unfit, actual);
  if (unstated !== null) return unjudged('superheat', required, 'not-judged', unstated, actual);
  const own = methodOf(input, 'superheat');
  const target = chargeTarget(input, derived, own);
  if (isMissing(target) && isKnown(actual)) {
    return unjudged('superheat', required, 'not-judged', { code: 'target-missing', figures: {} }, actual);
  }
  const width = halfWidth(own.chart, procedure.superheat.toleranceK);
  return judgeCriterion({
    criterion: 'superheat',
    required,
    actual,
    target: target.quantity,
    targetSource: target.source,
    tolerance: ({ value }) => floored(width, value, procedure.superheat.floorK),
    decision: procedure.decision,
    probabilityOfNoTarget: target.probabilityOfNoTarget,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: gates(own),
    neverWithin: negativeDifference(derived),
  });
}

/** How superheat or subcooling would be judged here, whether or not it decides. */
const methodOf = (input: CheckInput, kind: 'superheat' | 'subcooling'): ChargeMethod => ({
  kind,
  chart: isEntered(input, kind) ? null : usableChart(input, kind),
});

export function judgeSubcooling({ input, derived, unfit, unstated, method, gates }: ChargeJudgement): CriterionResult {
  const { procedure } = input;
  const required = method.kind === 'subcooling';
  const actual = derived.subcooling;
  if (unfit !== null) return unjudged('subcooling', required, 'not-verifiable', unfit, actual);
  if (unstated !== null) return unjudged('subcooling', required, 'not-judged', unstated, actual);
  const unfitPort = unfitPortReason(input);
  if (unfitPort !== null) {
    // a wrong kind of reading is there and cannot be used; the other cases lack something
    const finding = unfitPort.code === 'liquid-reading-at-discharge-port' ? 'not-verifiable' : 'not-judged';
    return unjudged('subcooling', required, finding, unfitPort, actual);
  }
  const own = methodOf(input, 'subcooling');
  const target = chargeTarget(input, derived, own);
  if (isMissing(target) && isKnown(actual)) {
    return unjudged('subcooling', required, 'not-judged', { code: 'target-missing', figures: {} }, actual);
  }
  const width = halfWidth(own.chart, procedure.subcooling.toleranceK);
  return judgeCriterion({
    criterion: 'subcooling',
    required,
    actual,
    target: target.quantity,
    targetSource: target.source,
    tolerance: ({ value }) => floored(width, value, procedure.subcooling.leastK),
    decision: procedure.decision,
    probabilityOfNoTarget: target.probabilityOfNoTarget,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: gates(own),
    neverWithin: negativeDifference(derived),
  });
}

export function judgeSuperheatWindow(judgement: ChargeJudgement): CriterionResult {
  const { input, derived, unfit, unstated, method, gates } = judgement;
  const { procedure, setup } = input;
  const actual = derived.superheat;
  const range = windowOf(procedure.superheatWindow, setup.superheatRange);
  const required = range !== null;
  if (unfit !== null) return unjudged('superheat-window', required, 'not-verifiable', unfit, actual);
  if (unstated !== null) return unjudged('superheat-window', required, 'not-judged', unstated, actual);
  if (range === null) {
    const reason = { code: 'superheat-range-missing', figures: {} } as const;
    return unjudged('superheat-window', required, 'not-judged', reason, actual);
  }
  return judgeWindow({
    criterion: 'superheat-window',
    required,
    actual,
    targetSource: range.source,
    tolerance: { low: range.lowK, high: range.highK, floored: false, source: range.toleranceSource },
    decision: procedure.decision,
    gates: gates(method),
    neverWithin: negativeDifference(derived),
  });
}

interface SuperheatWindow {
  readonly lowK: number;
  readonly highK: number;
  readonly source: 'procedure-window' | 'entered-range' | 'window-and-range';
  readonly toleranceSource: ToleranceSource;
}

/** The procedure's window, the maker's range in its place, or what both allow; `null`: only a range is judged by, and none was entered. */
function windowOf(
  { lowK, highK, makersRange }: Procedure['superheatWindow'],
  entered: CheckSetup['superheatRange'],
): SuperheatWindow | null {
  const own = { lowK: lowK.value, highK: highK.value };
  if (entered === undefined) {
    if (makersRange === 'only') return null;
    return { ...own, source: 'procedure-window', toleranceSource: sourceOf(lowK) };
  }
  switch (makersRange) {
    case 'only':
    case 'replaces':
      return { ...entered, source: 'entered-range', toleranceSource: 'makers-data' };
    case 'also': {
      const both = { lowK: Math.max(own.lowK, entered.lowK), highK: Math.min(own.highK, entered.highK) };
      return { ...both, source: 'window-and-range', toleranceSource: sourceOf(lowK) };
    }
  }
}

/** The usual window of a valve whose superheat is not judged for want of the maker's range: it guides the next step and the search for a cause. */
export function guidingWindow({
  procedure,
  setup,
}: CheckInput): { readonly lowK: number; readonly highK: number } | null {
  const { lowK, highK } = procedure.superheatWindow;
  const guides = !isFixedOrifice(setup) && windowOf(procedure.superheatWindow, setup.superheatRange) === null;
  return guides ? { lowK: lowK.value, highK: highK.value } : null;
}
