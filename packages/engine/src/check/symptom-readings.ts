/** What a diagnosis reads off a check: the criteria by their numbers, whatever gate shuts their findings, and the differences between refrigerant and air. */
import { derive } from '../derivation/derive';
import type { Quantity } from '../derivation/quantity';
import { isKnown, missing } from '../derivation/quantity';
import type { Held, SymptomReadings } from '../diagnosis/read-symptoms';
import { liquidLineApproach, returnOverEvaporating } from '../methods/air-to-refrigerant';
import type { UsedReadingId } from './assumed-uncertainty';
import type { CriterionId } from './codes';
import { currentTest } from './current-test';
import { judgeSplit, splitTarget } from './criteria/air';
import { guidingWindow } from './criteria/charge';
import type { DerivedQuantities } from './derived-quantities';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';
import type { CheckResult, CriterionResult } from './result';

export function symptomReadings(
  input: CheckInput,
  derived: DerivedQuantities,
  { criteria }: CheckResult,
): SymptomReadings {
  const { setup, visit, readings, procedure } = input;
  const read = (id: UsedReadingId): Quantity => readings[id]?.quantity ?? missing(id);
  // a head raised on purpose shows nothing, nor does what hangs on it
  const free = (quantity: Quantity): Quantity => (visit.headRaised ? missing() : quantity);
  const { subcooling } = derived;
  const { lowBelowK, clearFromK, highAboveK } = procedure.subcooling;
  const hasLevels = isKnown(subcooling) && setup.targetSubcooling === undefined && setup.highSidePort === 'liquid';
  return {
    metering: isFixedOrifice(setup) ? 'orifice' : 'valve',
    refrigerant: setup.refrigerant,
    port: setup.highSidePort === 'discharge' ? 'discharge' : 'liquid',
    superheat:
      heldByWindow(input, derived) ?? heldBy(criteria, isFixedOrifice(setup) ? 'superheat' : 'superheat-window'),
    subcooling: heldBy(criteria, 'subcooling'),
    subcoolingLevels: hasLevels
      ? {
          measured: subcooling,
          lowBelowK: lowBelowK.value,
          clearFromK: clearFromK.value,
          highAboveK: highAboveK.value,
        }
      : null,
    split: procedure.temperatureSplit.judged ? heldBy(criteria, 'temperature-split') : heldByTable(input, derived),
    returnOverEvaporating: derive(returnOverEvaporating, {
      returnDryBulbK: read('returnDryBulb'),
      evaporatingK: derived.meanEvaporatingTemperature,
    }),
    airflowPerCapacity: airflowPerCapacity(input),
    condensingOverAir: free(derived.condensingOverAmbient),
    liquidLineApproach: free(
      derive(liquidLineApproach, { liquidLineK: read('liquidLineTemperature'), outdoorK: read('outdoorDryBulb') }),
    ),
    currentOffExpected: currentTest(input).offExpected,
  };
}

/** By the usual window of a valve, where its superheat is not judged. */
function heldByWindow(input: CheckInput, { superheat }: DerivedQuantities): Held | null {
  const window = guidingWindow(input);
  return window === null || !isKnown(superheat) ? null : { measured: superheat, low: window.lowK, high: window.highK };
}

/** By the published table of the split, where these rules do not judge by it. */
const heldByTable = (input: CheckInput, derived: DerivedQuantities): Held | null =>
  heldBy([judgeSplit(input, derived, splitTarget(input, derived), null)], 'temperature-split');

function airflowPerCapacity({ setup, readings }: CheckInput): number | null {
  const { nominalCapacityW } = setup;
  return readings.airflow === undefined || nominalCapacityW === undefined
    ? null
    : readings.airflow.quantity.value / nominalCapacityW;
}

export const criterionOf = (criteria: readonly CriterionResult[], id: CriterionId): CriterionResult | undefined =>
  criteria.find(({ criterion }) => criterion === id);

/** A number and the limits it is judged by, whatever gate shuts the finding; none where a target may not exist. */
export function heldBy(criteria: readonly CriterionResult[], id: CriterionId): Held | null {
  const criterion = criterionOf(criteria, id);
  if (criterion === undefined || criterion.reason?.code === 'target-may-not-exist') return null;
  const { actual, deviation, tolerance } = criterion;
  const measured = id === 'superheat-window' ? actual : deviation;
  if (measured === null || tolerance?.low == null || tolerance.high === null) return null;
  return { measured, low: tolerance.low, high: tolerance.high };
}
