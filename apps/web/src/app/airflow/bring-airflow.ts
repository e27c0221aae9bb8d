/** The airflow of this page as the reading of a check: a text in a unit of its field, and the ± beside it. */
import { expandedUncertainty, FLOW_UNITS, flowFromM3PerS } from '@chargewright/engine';
import type { AirflowMethod, Known } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';
import type { TypedValue, WorkedOut } from '../loose-checks/check-draft';
import { unitsOf } from '../quantities/field-units';

export interface BroughtAirflow {
  readonly value: TypedValue;
  readonly workedOut: WorkedOut;
}

export function broughtAirflow(airflow: Known, method: AirflowMethod, system: UnitSystem): BroughtAirflow {
  const [usual] = unitsOf('reading:airflow', system);
  const unit = FLOW_UNITS.find((each) => each === usual) ?? 'cfm';
  return {
    // whole cubic feet, cubic metres or litres: far below its ±
    value: { text: flowFromM3PerS(airflow.value, unit).toFixed(0), unit },
    workedOut: { method, plusMinus: flowFromM3PerS(expandedUncertainty(airflow), unit) },
  };
}
