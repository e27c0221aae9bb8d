import type { AirflowRequest } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';
import { answerUnits } from './answer-units';

/** The units an airflow or a capacity is answered in: those of the temperatures given, without any of the airflow, the static pressure or the capacity. */
export function airAnswerUnits(request: Partial<AirflowRequest>): UnitSystem {
  const { returnDryBulb, supplyDryBulb, returnWetBulb, supplyWetBulb, airflow, nominalCapacity } = request;
  if (returnDryBulb ?? supplyDryBulb ?? returnWetBulb ?? supplyWetBulb) return answerUnits({ readings: request });
  if (airflow !== undefined) return airflow.unit === 'cfm' ? 'F-psi' : 'C-kPa';
  const staticPressure = request.returnStaticPressure ?? request.supplyStaticPressure;
  if (staticPressure !== undefined) return staticPressure.unit === 'inH2O' ? 'F-psi' : 'C-kPa';
  return nominalCapacity?.unit === 'kW' ? 'C-kPa' : 'F-psi';
}
