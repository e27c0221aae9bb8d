/** Airflow by any of the methods, with what it rests on: actual, as standard air, and by nominal capacity. */
import { derive } from '../../derivation/derive';
import type { Known, Quantity } from '../../derivation/quantity';
import { bareValue, isKnown, leaf, missing } from '../../derivation/quantity';
import type { DerivationStep } from '../../derivation/steps';
import { derivationSteps } from '../../derivation/steps';
import { EngineError } from '../../errors';
import type { AirflowCaution, AirflowMethod, AirflowReason } from './airflow-codes';
import {
  airflowFromMass,
  airflowPerCapacity,
  dryAirMassFlowFromHeat,
  dryAirMassFlowFromVolume,
  RISE_SAMPLING,
  temperatureRise,
} from './airflow-formulas';
import type {
  AirflowInput,
  ElectricTemperatureRise,
  GasTemperatureRise,
  MeasuredAirflow,
  StaticPressureAirflow,
} from './airflow-input';
import type { AirPlace } from './air-properties';
import { airSpecificHeat, airSpecificVolume } from './air-properties';
import type { FanTable } from './fan-table';
import { fanTableAirflow, fanTableError, risingAirflow, staticInStandardAir, totalExternalStatic } from './fan-table';
import { electricHeat, gasHeat, gasInput, totalHeat } from './heat-input';
import { standardAirDensity, standardAirflow } from './standard-air';

export interface AirflowResult {
  readonly method: AirflowMethod;
  /** m³/s that counts for cooling; refused without a number where the blower ran at another speed. */
  readonly airflow: Quantity;
  /** m³/s as found, whatever the speed. */
  readonly airflowAsFound: Quantity;
  /** The air `airflow` is stated in: actual at the return or the supply, or standard air where an instrument shows only that. */
  readonly statedIn: AirPlace | 'standard';
  /** Of the airflow that counts. 0.075 lb/ft³. */
  readonly standardAirflow: Quantity;
  /** (m³/s)/W of nominal cooling capacity, of the airflow that counts. */
  readonly perCapacity: Quantity;
  /** `null`: there is an airflow that counts. */
  readonly reason: AirflowReason | null;
  readonly cautions: readonly AirflowCaution[];
  readonly steps: readonly DerivationStep[];
}

/** The air of a heated or a cooled house, ±, as a limit (choice). The airflow hardly feels it: 0.1 % over the whole span. */
const ASSUMED_HUMIDITY = leaf({
  id: 'humidityRatio',
  kind: 'humidityRatio',
  value: 0.006,
  origin: 'constant',
  parts: [{ key: 'humidity-assumed', u: 0.006 / Math.sqrt(3), shape: 'rectangular' }],
});

interface Found {
  readonly airflow: Quantity;
  readonly statedIn: AirPlace | 'standard';
  readonly standard: Quantity;
}

/** Never throws for what physics or a table refuses: the reason is in the result. */
export function evaluateAirflow(input: AirflowInput): AirflowResult {
  const humidityRatio = input.humidityRatio ?? ASSUMED_HUMIDITY;
  const { airflow, standard, statedIn } = find(input, humidityRatio);
  const counts = (found: Quantity): Quantity =>
    input.atCoolingSpeed === 'no' && isKnown(found) ? refuse(found) : found;
  const counted = counts(airflow);
  const capacity = input.nominalCapacity ?? missing('nominalCapacity');
  const perCapacity = derive(airflowPerCapacity, { airflowM3PerS: counted, nominalCapacityW: capacity });
  return {
    method: input.method,
    airflow: counted,
    airflowAsFound: airflow,
    statedIn,
    standardAirflow: counts(standard),
    perCapacity,
    reason: reasonOf(counted),
    cautions: cautionsOf(input),
    steps: derivationSteps([airflow, standard, perCapacity].filter(isKnown)),
  };
}

function find(input: AirflowInput, humidityRatio: Quantity): Found {
  switch (input.method) {
    case 'measured':
      return measured(input, humidityRatio);
    case 'temperature-rise-electric':
    case 'temperature-rise-gas':
      return byTemperatureRise(input, humidityRatio);
    case 'static-pressure':
      return byStaticPressure(input, humidityRatio);
  }
}

function measured({ measured, shows, dryBulb, atmosphere }: MeasuredAirflow, humidityRatio: Quantity): Found {
  if (shows === 'standard') return { airflow: measured, statedIn: shows, standard: measured };
  return {
    airflow: measured,
    statedIn: shows,
    standard: toStandard(measured, shows, { dryBulb, humidityRatio, atmosphere }),
  };
}

interface Air {
  readonly dryBulb: Quantity;
  readonly humidityRatio: Quantity;
  readonly atmosphere: Quantity;
}

function toStandard(airflow: Quantity, place: AirPlace, air: Air): Quantity {
  const mass = derive(dryAirMassFlowFromVolume, {
    airflowM3PerS: airflow,
    specificVolumeM3PerKg: volumeOf(place, air),
  });
  return derive(standardAirflow, { dryAirMassFlowKgPerS: mass, standardDensityKgPerM3: standardAirDensity });
}

const volumeOf = (place: AirPlace, { dryBulb, humidityRatio, atmosphere }: Air): Quantity =>
  derive(airSpecificVolume(place), { dryBulbK: dryBulb, humidityRatio, pressurePa: atmosphere });

function byTemperatureRise(input: ElectricTemperatureRise | GasTemperatureRise, humidityRatio: Quantity): Found {
  const { returnDryBulb, supplyDryBulb, blowerHeat, statedAt, atmosphere } = input;
  const heater = input.method === 'temperature-rise-gas' ? heatOfGas(input) : heatOfElements(input);
  const heat = blowerHeat === undefined ? heater : derive(totalHeat, { heaterW: heater, blowerW: blowerHeat });
  const rise = derive(temperatureRise, { supplyDryBulbK: supplyDryBulb, returnDryBulbK: returnDryBulb }, [
    RISE_SAMPLING,
  ]);
  const specificHeat = derive(airSpecificHeat, { humidityRatio });
  const mass = derive(dryAirMassFlowFromHeat, { heatW: heat, specificHeatJPerKgK: specificHeat, riseK: rise });
  const dryBulb = statedAt === 'return' ? returnDryBulb : supplyDryBulb;
  return {
    airflow: derive(airflowFromMass(statedAt), {
      dryAirMassFlowKgPerS: mass,
      specificVolumeM3PerKg: volumeOf(statedAt, { dryBulb, humidityRatio, atmosphere }),
    }),
    statedIn: statedAt,
    standard: derive(standardAirflow, { dryAirMassFlowKgPerS: mass, standardDensityKgPerM3: standardAirDensity }),
  };
}

const heatOfElements = ({ voltage, current }: ElectricTemperatureRise): Quantity =>
  derive(electricHeat, { voltageV: voltage, currentA: current });

function heatOfGas({ dialVolume, revolution, heatingValue, efficiency }: GasTemperatureRise): Quantity {
  const gas = derive(gasInput, { dialVolumeM3: dialVolume, revolutionS: revolution, heatingValueJPerM3: heatingValue });
  return derive(gasHeat, { gasInputW: gas, efficiencyFraction: efficiency });
}

function byStaticPressure(input: StaticPressureAirflow, humidityRatio: Quantity): Found {
  const { returnStatic, supplyStatic, table, dryBulb, place, atmosphere } = input;
  const air = { dryBulb, humidityRatio, atmosphere };
  const external = derive(totalExternalStatic, { returnStaticPa: returnStatic, supplyStaticPa: supplyStatic });
  const externalStaticPa = derive(staticInStandardAir, {
    externalStaticPa: external,
    standardDensityKgPerM3: standardAirDensity,
    specificVolumeM3PerKg: volumeOf(place, air),
    humidityRatio,
  });
  const airflow = byTable(table, externalStaticPa);
  return { airflow, statedIn: place, standard: toStandard(airflow, place, air) };
}

function byTable(table: FanTable | undefined, externalStaticPa: Quantity): Quantity {
  if (table === undefined) {
    return missing(...(externalStaticPa.state === 'missing' ? externalStaticPa.inputs : []), 'fanTable');
  }
  const printed = bareValue(derive(fanTableAirflow(table), { externalStaticPa }));
  const parts = printed === undefined ? [] : [fanTableError(printed)];
  return derive(fanTableAirflow(table), { externalStaticPa }, parts);
}

function refuse({ value }: Known): Quantity {
  const reason = 'other-blower-speed';
  // no value beside it: a gate acts on bare values, and this one says nothing about cooling
  return { state: 'refused', error: new EngineError('not-supported', { quantity: 'airflowM3PerS', value, reason }) };
}

const NAMED_REASONS = [
  'other-blower-speed',
  'no-temperature-rise',
  'dash',
  'outside-table',
  'table-not-usable',
] as const;

function reasonOf(airflow: Quantity): AirflowReason | null {
  if (isKnown(airflow)) return null;
  if (airflow.state === 'missing') return { code: 'inputs-missing', inputs: airflow.inputs };
  return { code: NAMED_REASONS.find((reason) => reason === airflow.error.details.reason) ?? 'outside-range' };
}

function cautionsOf(input: AirflowInput): readonly AirflowCaution[] {
  const cautions: AirflowCaution[] = [];
  if (input.atCoolingSpeed === 'unknown') cautions.push('blower-speed-unknown');
  const showsStandard = input.method === 'measured' && input.shows === 'standard';
  if (input.elevationAssumed === true && !showsStandard) cautions.push('elevation-assumed');
  if (input.humidityRatio === undefined && !showsStandard) cautions.push('humidity-assumed');
  if (input.method === 'temperature-rise-gas' && input.efficiencyIs === 'afue') cautions.push('afue-for-steady-state');
  if (input.method === 'static-pressure') {
    const supply = bareValue(input.supplyStatic);
    if (supply !== undefined && supply <= 0) cautions.push('supply-static-not-above-room');
    if (input.table !== undefined && risingAirflow(input.table)) cautions.push('fan-table-rises');
  }
  return cautions;
}
