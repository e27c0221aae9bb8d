/** From the request for an airflow to SI quantities with their uncertainty. */
import type { ReadingInput } from '../check/request';
import type { Known, Quantity } from '../derivation/quantity';
import { missing } from '../derivation/quantity';
import type { AirflowInput, AnyMethod } from '../methods/airflow/airflow-input';
import type { FieldReadingId } from '../methods/airflow/field-readings';
import { fieldReading } from '../methods/airflow/field-readings';
import { heatingValueToJPerM3, powerToW, staticPressureToPa, volumeToM3 } from '../units';
import type { StaticPressureUnit } from '../units';
import type { FieldFault } from './field-codes';
import { fanTableInSi, FieldFaults } from './field-faults';
import type { AirflowRequest, HeatUnit, StatedAmount } from './field-request';
import { present } from '../check/present';
import { airReading, checkAir, humidityRatioAt, nominalCapacityOf, siteOf } from './read-air';

export type ReadAirflowRequest =
  { readonly ok: true; readonly input: AirflowInput } | { readonly ok: false; readonly faults: readonly FieldFault[] };

/** Every fault of the values; fields whose shape was at fault are left out. Total. */
export function crossCheckAirflow(request: Partial<AirflowRequest>): readonly FieldFault[] {
  const faults = new FieldFaults();
  checkAir(faults, request);
  faults.positive('nominalCapacity', request.nominalCapacity);
  if (request.lineVoltage !== undefined) faults.reading('lineVoltage', 'voltage', request.lineVoltage);
  if (request.heaterCurrent !== undefined) faults.reading('heaterCurrent', 'current', request.heaterCurrent);
  faults.notNegativeStated('blowerHeat', request.blowerHeat);
  faults.positiveStated('dialVolume', request.dialVolume);
  faults.positiveStated('gasRevolution', request.gasRevolution);
  faults.positiveStated('gasHeatingValue', request.gasHeatingValue);
  faults.efficiency('furnaceEfficiency', request.furnaceEfficiency);
  for (const id of ['returnStaticPressure', 'supplyStaticPressure'] as const) {
    const reading = request[id];
    if (reading !== undefined) faults.reading(id, 'staticPressure', reading);
  }
  faults.fanTable('fanTable', request.fanTable);
  return faults.list;
}

/** Reads a request of the right shape; answers every fault of its values at once. What its method does not use is checked and not used. Total. */
export function readAirflowRequest(request: AirflowRequest): ReadAirflowRequest {
  const faults = crossCheckAirflow(request);
  return faults.length > 0 ? { ok: false, faults } : { ok: true, input: airflowInput(request) };
}

function airflowInput(request: AirflowRequest): AirflowInput {
  const { statedAt = 'return', airflowIn = 'return' } = request;
  const site = siteOf(request);
  const air = (id: Parameters<typeof airReading>[0]): Quantity => airReading(id, request, site);
  const humidityAt = request.method === 'measured' && airflowIn === 'supply' ? 'supply' : 'return';
  const shared: AnyMethod = {
    ...site,
    atCoolingSpeed: request.atCoolingSpeed ?? 'unknown',
    ...present('humidityRatio', humidityRatioAt(humidityAt, request, site)),
    ...present('nominalCapacity', nominalCapacityOf(request.nominalCapacity)),
  };
  const rise = {
    returnDryBulb: air('returnDryBulb'),
    supplyDryBulb: air('supplyDryBulb'),
    ...present('blowerHeat', optionalStated('blowerHeat', request.blowerHeat, heatToW)),
    statedAt,
  };
  switch (request.method) {
    case 'measured':
      return {
        ...shared,
        method: request.method,
        measured: air('airflow'),
        shows: airflowIn,
        dryBulb: air(airflowIn === 'supply' ? 'supplyDryBulb' : 'returnDryBulb'),
      };
    case 'temperature-rise-electric':
      return {
        ...shared,
        ...rise,
        method: request.method,
        voltage: reading('lineVoltage', request.lineVoltage, same),
        current: reading('heaterCurrent', request.heaterCurrent, same),
      };
    case 'temperature-rise-gas':
      return {
        ...shared,
        ...rise,
        method: request.method,
        dialVolume: stated('dialVolume', request.dialVolume, volumeToM3),
        revolution: stated('gasRevolution', request.gasRevolution, same),
        heatingValue: stated('gasHeatingValue', request.gasHeatingValue, heatingValueToJPerM3),
        efficiency: stated('furnaceEfficiency', request.furnaceEfficiency, (percent) => percent / 100),
        efficiencyIs: request.efficiencyIs ?? 'steady-state',
      };
    case 'static-pressure':
      return {
        ...shared,
        method: request.method,
        returnStatic: reading('returnStaticPressure', request.returnStaticPressure, staticToPa),
        supplyStatic: reading('supplyStaticPressure', request.supplyStaticPressure, staticToPa),
        ...present('table', request.fanTable && fanTableInSi(request.fanTable)),
        dryBulb: air(`${statedAt}DryBulb`),
        place: statedAt,
      };
  }
}

const same = (value: number): number => value;
const staticToPa = (value: number, unit: string): number => staticPressureToPa(value, unit as StaticPressureUnit);
const heatToW = (value: number, unit: HeatUnit): number => (unit === 'W' ? value : powerToW(value, unit));

/** The scales are proportional, so that a ± and a step convert as the value does. */
type ToSi<Unit extends string> = (value: number, unit: Unit) => number;

const reading = (id: FieldReadingId, input: ReadingInput | undefined, toSi: ToSi<string>): Quantity =>
  stated<string>(id, input, toSi);

const stated = <Unit extends string>(
  id: FieldReadingId,
  amount: StatedAmount<Unit, string> | undefined,
  toSi: ToSi<Unit>,
): Quantity => optionalStated(id, amount, toSi) ?? missing(id);

function optionalStated<Unit extends string>(
  id: FieldReadingId,
  amount: StatedAmount<Unit, string> | undefined,
  toSi: ToSi<Unit>,
): Known | undefined {
  if (amount === undefined) return undefined;
  const { plusMinus, resolution, instrumentId, unit } = amount;
  const value = toSi(amount.value, unit);
  // percent of a percentage are its points
  const isPart = plusMinus?.unit === '%' && (unit as string) !== '%';
  const half =
    plusMinus && (isPart ? (plusMinus.value / 100) * Math.abs(value) : toSi(plusMinus.value, plusMinus.unit as Unit));
  return fieldReading(id, {
    value,
    ...present(plusMinus?.kind === 'k2' ? 'expanded' : 'limit', half),
    ...present('resolution', resolution === undefined ? undefined : toSi(resolution, unit)),
    ...present('instrumentId', instrumentId),
  });
}
