/** The airflow and the capacity of a sheet, as far as it is filled in. */
import {
  evaluateAirflow,
  evaluateCapacity,
  isKnown,
  readAirflowRequest,
  readCapacityRequest,
} from '@chargewright/engine';
import type { AirflowResult, CapacityResult, FieldFault } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';
import { readLeniently } from '../worksheets/read-leniently';
import { sheetUnits, type FilledSheet } from '../worksheets/sheet-fields';
import { airflowChoices, airflowRequest, STATIC_UNITS, TABLE_FLOW_UNITS } from './airflow-sheet';
import { capacityRequest } from './capacity-sheet';

export interface AirflowEvaluation {
  /** Null before a method is chosen. */
  readonly result: AirflowResult | null;
  readonly faults: readonly FieldFault[];
}

/** Units of the fan table: as chosen, else those of the person's unit system. */
export function tableUnits(filled: FilledSheet, system: UnitSystem) {
  const { staticPressureUnit, airflowUnit } = airflowChoices(filled.sheet);
  const [usualStatic] = sheetUnits('staticPressure', system);
  const [usualFlow] = sheetUnits('airflow', system);
  return {
    staticPressureUnit: staticPressureUnit ?? STATIC_UNITS.find((unit) => unit === usualStatic) ?? 'inH2O',
    airflowUnit: airflowUnit ?? TABLE_FLOW_UNITS.find((unit) => unit === usualFlow) ?? 'cfm',
  };
}

export function evaluateAirflowSheet(filled: FilledSheet, system: UnitSystem): AirflowEvaluation {
  const { method } = airflowChoices(filled.sheet);
  if (method === undefined) return { result: null, faults: [] };
  const request = airflowRequest(filled, method, tableUnits(filled, system));
  const { input, faults } = readLeniently(request, readAirflowRequest);
  return { result: input && evaluateAirflow(input), faults };
}

export interface CapacityEvaluation {
  /** Null before there is an airflow that counts. */
  readonly result: CapacityResult | null;
  readonly faults: readonly FieldFault[];
}

export function evaluateCapacitySheet(filled: FilledSheet, airflow: AirflowResult | null): CapacityEvaluation {
  if (airflow === null || !isKnown(airflow.airflow)) return { result: null, faults: [] };
  const request = capacityRequest(filled, airflow.airflow, airflow.statedIn);
  const { input, faults } = readLeniently(request, readCapacityRequest);
  return { result: input && evaluateCapacity(input), faults };
}
