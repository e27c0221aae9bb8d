/** Total and sensible cooling delivered, from the air side. */
import { derive } from '../../derivation/derive';
import type { ErrorPart, Quantity } from '../../derivation/quantity';
import { bareValue, isKnown, missing } from '../../derivation/quantity';
import type { DerivationStep } from '../../derivation/steps';
import { derivationSteps } from '../../derivation/steps';
import {
  returnEnthalpy,
  returnHumidityRatio,
  returnWetBulbFromHumidity,
  SINGLE_POINT_SAMPLING,
  temperatureSplit,
} from '../air-side';
import { dryAirMassFlowFromVolume } from '../airflow/airflow-formulas';
import type { AirPlace } from '../airflow/air-properties';
import { airSpecificHeat, airSpecificVolume } from '../airflow/air-properties';
import { standardAirDensity } from '../airflow/standard-air';
import {
  capacityRatio,
  condensateEnthalpy,
  dryAirMassFlowFromStandard,
  sensibleCapacity,
  sensibleHeatRatio,
  totalCapacity,
  totalCapacityLessCondensate,
} from './capacity-formulas';
import { supplyEnthalpy, supplyHumidityRatio, supplyWetBulbFromHumidity } from './supply-air';

/** Dry bulb in K with a wet bulb in K or a relative humidity (0 to 1). Both given: the wet bulb counts. */
export interface AirReading {
  readonly dryBulb: Quantity;
  readonly wetBulb?: Quantity;
  readonly relativeHumidity?: Quantity;
}

export interface CapacityInput {
  /** m³/s: actual at the return or the supply, or standard air of 0.075 lb/ft³. */
  readonly airflow: Quantity;
  readonly airflowIn: AirPlace | 'standard';
  readonly returnAir: AirReading;
  readonly supplyAir: AirReading;
  /** Station pressure, absolute. */
  readonly atmosphere: Quantity;
  /** Nobody stated the site: the atmosphere is that of sea level. */
  readonly elevationAssumed?: boolean;
  /** `neglected` (the default) as the air-enthalpy method of testing does; counted, the total is 0.3 to 1 % less. */
  readonly condensate?: 'neglected' | 'counted';
  readonly nominalCapacity?: Quantity;
}

/** Why there is no total. `inputs` are the ids of what is missing. */
export type CapacityReason =
  { readonly code: 'inputs-missing'; readonly inputs: readonly string[] } | { readonly code: 'outside-range' };

export type CapacityCaution =
  /** Sea level was taken. */
  | 'elevation-assumed'
  /** More water in the supply than in the return: a coil does not do that; exchanged or wetted probes, or attic air drawn in. */
  | 'supply-wetter-than-return'
  /** The supply is not cooler than the return. */
  | 'no-cooling';

export interface CapacityResult {
  readonly totalW: Quantity;
  readonly sensibleW: Quantity;
  readonly sensibleHeatRatio: Quantity;
  /** Of the nominal capacity. */
  readonly ofNominal: Quantity;
  readonly dryAirMassFlowKgPerS: Quantity;
  /** `null`: there is a total. */
  readonly reason: CapacityReason | null;
  readonly cautions: readonly CapacityCaution[];
  readonly steps: readonly DerivationStep[];
}

/**
 * What sampling the supply at one point does to its enthalpy, at constant humidity. By a key of its own: for the ratio of sensible to total that is a
 * little too much, never too little.
 */
const ENTHALPY_SAMPLING: ErrorPart = {
  key: 'placement:supplyEnthalpy',
  u: 1006 * SINGLE_POINT_SAMPLING.u,
  shape: 'rectangular',
};

interface AirState {
  readonly dryBulbK: Quantity;
  readonly humidityRatio: Quantity;
  readonly enthalpyJPerKg: Quantity;
}

/** Never throws for what physics refuses: the quantities say why they have no value. */
export function evaluateCapacity(input: CapacityInput): CapacityResult {
  const { atmosphere } = input;
  const before = returnState(input.returnAir, atmosphere);
  const after = supplyState(input.supplyAir, atmosphere);
  const dryAirMassFlowKgPerS = massFlow(input, before, after);
  const total = totalOf(input, dryAirMassFlowKgPerS, before, after);
  const sensible = derive(sensibleCapacity, {
    dryAirMassFlowKgPerS,
    specificHeatJPerKgK: derive(airSpecificHeat, { humidityRatio: after.humidityRatio }),
    splitK: derive(temperatureSplit, { returnDryBulbK: before.dryBulbK, supplyDryBulbK: after.dryBulbK }, [
      SINGLE_POINT_SAMPLING,
    ]),
  });
  const ratio = derive(sensibleHeatRatio, { sensibleW: sensible, totalW: total });
  const nominalW = input.nominalCapacity ?? missing('nominalCapacity');
  const ofNominal = derive(capacityRatio, { totalW: total, nominalW });
  return {
    totalW: total,
    sensibleW: sensible,
    sensibleHeatRatio: ratio,
    ofNominal,
    dryAirMassFlowKgPerS,
    reason: reasonOf(total),
    cautions: cautionsOf(input, before, after),
    steps: derivationSteps([total, sensible, ratio, ofNominal].filter(isKnown)),
  };
}

function returnState({ dryBulb, wetBulb, relativeHumidity }: AirReading, pressurePa: Quantity): AirState {
  const wetBulbK =
    wetBulb ??
    derive(returnWetBulbFromHumidity, {
      dryBulbK: dryBulb,
      relativeHumidityRatio: relativeHumidity ?? missing('returnWetBulb'),
      pressurePa,
    });
  const humidityRatio = derive(returnHumidityRatio, { dryBulbK: dryBulb, wetBulbK, pressurePa });
  return {
    dryBulbK: dryBulb,
    humidityRatio,
    enthalpyJPerKg: derive(returnEnthalpy, { dryBulbK: dryBulb, humidityRatio }),
  };
}

function supplyState({ dryBulb: read, wetBulb, relativeHumidity }: AirReading, pressurePa: Quantity): AirState {
  const wetBulbK =
    wetBulb ??
    derive(supplyWetBulbFromHumidity, {
      dryBulbK: read,
      relativeHumidityRatio: relativeHumidity ?? missing('supplyWetBulb'),
      pressurePa,
    });
  const humidityRatio = derive(supplyHumidityRatio, { dryBulbK: read, wetBulbK, pressurePa });
  return {
    dryBulbK: read,
    humidityRatio,
    enthalpyJPerKg: derive(supplyEnthalpy, { dryBulbK: read, humidityRatio }, [ENTHALPY_SAMPLING]),
  };
}

function massFlow({ airflow, airflowIn, atmosphere }: CapacityInput, before: AirState, after: AirState): Quantity {
  if (airflowIn === 'standard') {
    return derive(dryAirMassFlowFromStandard, {
      standardAirflowM3PerS: airflow,
      standardDensityKgPerM3: standardAirDensity,
    });
  }
  const { dryBulbK, humidityRatio } = airflowIn === 'return' ? before : after;
  const specificVolumeM3PerKg = derive(airSpecificVolume(airflowIn), {
    dryBulbK,
    humidityRatio,
    pressurePa: atmosphere,
  });
  return derive(dryAirMassFlowFromVolume, { airflowM3PerS: airflow, specificVolumeM3PerKg });
}

function totalOf({ condensate }: CapacityInput, dryAirMassFlowKgPerS: Quantity, before: AirState, after: AirState) {
  const flows = {
    dryAirMassFlowKgPerS,
    returnEnthalpyJPerKg: before.enthalpyJPerKg,
    supplyEnthalpyJPerKg: after.enthalpyJPerKg,
  };
  if (condensate !== 'counted') return derive(totalCapacity, flows);
  const condensateJPerKg = derive(condensateEnthalpy, {
    returnHumidityRatio: before.humidityRatio,
    supplyHumidityRatio: after.humidityRatio,
    supplyDryBulbK: after.dryBulbK,
  });
  return derive(totalCapacityLessCondensate, { ...flows, condensateJPerKg });
}

function reasonOf(total: Quantity): CapacityReason | null {
  if (isKnown(total)) return null;
  return total.state === 'missing' ? { code: 'inputs-missing', inputs: total.inputs } : { code: 'outside-range' };
}

function cautionsOf(
  { elevationAssumed }: CapacityInput,
  before: AirState,
  after: AirState,
): readonly CapacityCaution[] {
  const cautions: CapacityCaution[] = elevationAssumed === true ? ['elevation-assumed'] : [];
  const [wet, dry] = [bareValue(after.humidityRatio), bareValue(before.humidityRatio)];
  if (wet !== undefined && dry !== undefined && wet > dry) cautions.push('supply-wetter-than-return');
  const [cold, warm] = [bareValue(after.dryBulbK), bareValue(before.dryBulbK)];
  if (cold !== undefined && warm !== undefined && cold >= warm) cautions.push('no-cooling');
  return cautions;
}
