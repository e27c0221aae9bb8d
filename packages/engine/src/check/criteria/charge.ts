/** The criteria that judge the charge: superheat of a fixed orifice; subcooling and the superheat window of a valve. */
import { derive } from '../../derivation/derive';
import type { Known, Quantity } from '../../derivation/quantity';
import { bareValue, isKnown, missing } from '../../derivation/quantity';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { probabilityOfNoTarget } from '../../methods/target-existence';
import { SUPERHEAT_TABLE_FINER } from '../../methods/data/superheat-table-finer';
import type { Chart } from '../../methods/chart';
import { chartRounding, targetSuperheat } from '../../methods/targets';
import type { Reason } from '../codes';
import type { DerivedQuantities } from '../derived-quantities';
import { unfitPortReason } from '../fit-for-test';
import type { CheckInput, CheckSetup } from '../input';
import { isFixedOrifice } from '../input';
import type { Procedure, SuperheatChartId } from '../procedure';
import type { CriterionResult, Tolerance } from '../result';
import { judgeCriterion, judgeWindow, unjudged } from './criterion';

export interface ChargeJudgement {
  readonly input: CheckInput;
  readonly derived: DerivedQuantities;
  readonly unfit: Reason | null;
  /** Gates shared by all charge criteria: impossible readings, conditions, age, airflow. */
  readonly gates: (evidence: readonly Known[]) => readonly (Reason | null)[];
}

/**
 * A measured subcooling or superheat below zero means about zero: nothing that rests on the readings is called *within*, however poor the
 * instruments that might excuse it.
 */
function negativeDifference({ subcooling, superheat }: DerivedQuantities): Reason | null {
  if ((bareValue(subcooling) ?? 0) < 0) return { code: 'flash', figures: {} };
  return (bareValue(superheat) ?? 0) < 0 ? { code: 'saturation-impossible', figures: {} } : null;
}

export interface SuperheatTarget {
  readonly quantity: Quantity;
  readonly source: 'entered' | SuperheatChartId;
  readonly probabilityOfNoTarget: number;
}

const SUPERHEAT_CHARTS: Readonly<Record<SuperheatChartId, Chart>> = {
  'makers-chart-a': SUPERHEAT_CHART_A,
  'finer-table': SUPERHEAT_TABLE_FINER,
};

/** Entered, where the procedure takes that; else its table, which is for split systems: a packaged unit needs its maker's own. */
export function superheatTarget(input: CheckInput, derived: DerivedQuantities): SuperheatTarget {
  const { procedure, setup, readings } = input;
  const { chart: source, enteredTarget } = procedure.superheat;
  if (setup.targetSuperheat !== undefined && enteredTarget) {
    return { quantity: setup.targetSuperheat, source: 'entered', probabilityOfNoTarget: 0 };
  }
  if (setup.kind === 'packaged') {
    return { quantity: missing(), source: 'entered', probabilityOfNoTarget: 0 };
  }
  const chart = SUPERHEAT_CHARTS[source];
  const outdoorK: Quantity = readings.outdoorDryBulb?.quantity ?? missing('outdoorDryBulb');
  const wetBulbK = derived.returnWetBulb;
  const quantity = derive(targetSuperheat(chart), { wetBulbK, outdoorK }, [chartRounding(chart)]);
  const probability =
    isKnown(quantity) && isKnown(outdoorK) && isKnown(wetBulbK)
      ? probabilityOfNoTarget(chart, {
          rowK: outdoorK.value,
          rowUK: outdoorK.u,
          columnK: wetBulbK.value,
          columnUK: wetBulbK.u,
        })
      : 0;
  return { quantity, source, probabilityOfNoTarget: probability };
}

export function judgeSuperheat(
  { input, derived, unfit, gates }: ChargeJudgement,
  target: SuperheatTarget,
): CriterionResult {
  const actual = derived.superheat;
  if (unfit !== null) return unjudged('superheat', true, 'not-verifiable', unfit, actual);
  if (target.quantity.state === 'missing' && target.quantity.inputs.length === 0 && isKnown(actual)) {
    return unjudged('superheat', true, 'not-judged', { code: 'target-missing', figures: {} }, actual);
  }
  const { procedure } = input;
  const toleranceK = procedure.superheat.toleranceK.value;
  const floorK = procedure.superheat.floorK?.value ?? null;
  return judgeCriterion({
    criterion: 'superheat',
    required: true,
    actual,
    target: target.quantity,
    targetSource: target.source,
    tolerance: (known) => flooredTolerance(known.value, toleranceK, floorK),
    decision: procedure.decision,
    probabilityOfNoTarget: target.probabilityOfNoTarget,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates,
    neverWithin: negativeDifference(derived),
  });
}

/** The measured value itself must not pass under the floor, whatever the target allows. */
function flooredTolerance(targetK: number, toleranceK: number, floorK: number | null): Tolerance {
  const floored = floorK !== null && floorK - targetK > -toleranceK;
  return { low: floored ? floorK - targetK : -toleranceK, high: toleranceK, floored };
}

export function judgeSubcooling({ input, derived, unfit, gates }: ChargeJudgement): CriterionResult {
  const { procedure, setup } = input;
  const required = !isFixedOrifice(setup);
  const actual = derived.subcooling;
  if (unfit !== null) return unjudged('subcooling', required, 'not-verifiable', unfit, actual);
  const unfitPort = unfitPortReason(input);
  if (unfitPort !== null) {
    // a wrong kind of reading is there and cannot be used; the other cases lack something
    const finding = unfitPort.code === 'liquid-reading-at-discharge-port' ? 'not-verifiable' : 'not-judged';
    return unjudged('subcooling', required, finding, unfitPort, actual);
  }
  const target = setup.targetSubcooling;
  if (target === undefined && isKnown(actual)) {
    return unjudged('subcooling', required, 'not-judged', { code: 'target-missing', figures: {} }, actual);
  }
  const toleranceK = procedure.subcooling.toleranceK.value;
  return judgeCriterion({
    criterion: 'subcooling',
    required,
    actual,
    target: target ?? missing(),
    targetSource: 'entered',
    tolerance: (known) => flooredTolerance(known.value, toleranceK, procedure.subcooling.leastK?.value ?? null),
    decision: procedure.decision,
    gates,
    neverWithin: negativeDifference(derived),
  });
}

export function judgeSuperheatWindow({ input, derived, unfit, gates }: ChargeJudgement): CriterionResult {
  const { procedure, setup } = input;
  const actual = derived.superheat;
  if (unfit !== null) return unjudged('superheat-window', true, 'not-verifiable', unfit, actual);
  const range = windowOf(procedure.superheatWindow, setup.superheatRange);
  return judgeWindow({
    criterion: 'superheat-window',
    required: true,
    actual,
    targetSource: range.source,
    tolerance: { low: range.lowK, high: range.highK, floored: false },
    decision: procedure.decision,
    gates,
    neverWithin: negativeDifference(derived),
  });
}

interface SuperheatWindow {
  readonly lowK: number;
  readonly highK: number;
  readonly source: 'procedure-window' | 'entered-range' | 'window-and-range';
}

/** The procedure's window, the maker's range in its place, or what both allow. */
function windowOf(
  { lowK, highK, makersRange }: Procedure['superheatWindow'],
  entered: CheckSetup['superheatRange'],
): SuperheatWindow {
  const own = { lowK: lowK.value, highK: highK.value };
  if (entered === undefined) return { ...own, source: 'procedure-window' };
  if (makersRange === 'replaces') return { ...entered, source: 'entered-range' };
  const both = { lowK: Math.max(own.lowK, entered.lowK), highK: Math.min(own.highK, entered.highK) };
  return { ...both, source: 'window-and-range' };
}
