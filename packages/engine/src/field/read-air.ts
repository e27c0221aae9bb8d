/** The air readings that airflow and capacity share, in SI. */
import type { AtmosphereInput } from '../check/atmosphere';
import { atmosphereOf } from '../check/atmosphere';
import type { Amount, ReadingInput } from '../check/request';
import { readReading } from '../check/read-request';
import { READING_DIMENSIONS } from '../check/readings';
import { derive } from '../derivation/derive';
import type { Known, Quantity } from '../derivation/quantity';
import { leaf, missing } from '../derivation/quantity';
import { returnHumidityRatio, returnWetBulbFromHumidity } from '../methods/air-side';
import type { AirPlace } from '../methods/airflow/air-properties';
import { supplyHumidityRatio, supplyWetBulbFromHumidity } from '../methods/capacity/supply-air';
import type { PowerUnit, TemperatureUnit } from '../units';
import { powerToW } from '../units';
import type { FieldFaults } from './field-faults';
import type { AirReadingId } from './field-request';
import { AIR_READINGS } from './field-request';

export type AirRequest = Readonly<Partial<Record<AirReadingId, ReadingInput>>> & AtmosphereInput;

export function checkAir(faults: FieldFaults, request: AirRequest): void {
  faults.atmosphere('', request);
  for (const id of AIR_READINGS) {
    const reading = request[id];
    if (reading !== undefined) faults.reading(id, READING_DIMENSIONS[id], reading);
  }
  const bulb = (id: AirReadingId) => request[id] as Amount<TemperatureUnit> | undefined;
  faults.wetBulb('returnWetBulb', bulb('returnDryBulb'), bulb('returnWetBulb'));
  faults.wetBulb('supplyWetBulb', bulb('supplyDryBulb'), bulb('supplyWetBulb'));
}

export interface Site {
  readonly atmosphere: Known;
  readonly elevationAssumed: boolean;
}

export const siteOf = (request: AtmosphereInput): Site => ({
  atmosphere: atmosphereOf(request),
  elevationAssumed: request.elevation === undefined && request.stationPressure === undefined,
});

/** A reading of the air, or that it is missing. */
export function airReading(id: AirReadingId, request: AirRequest, { atmosphere }: Site): Quantity {
  const reading = request[id];
  return reading === undefined ? missing(id) : readReading(id, reading, atmosphere, '').quantity;
}

const FORMULAS = {
  return: { wetBulb: returnWetBulbFromHumidity, ratio: returnHumidityRatio },
  supply: { wetBulb: supplyWetBulbFromHumidity, ratio: supplyHumidityRatio },
} as const;

/** Humidity ratio from the wet bulb, without one from the relative humidity; `undefined` where neither was read. */
export function humidityRatioAt(place: AirPlace, request: AirRequest, site: Site): Quantity | undefined {
  const { wetBulb, ratio } = FORMULAS[place];
  const dryBulbK = airReading(`${place}DryBulb`, request, site);
  const pressurePa = site.atmosphere;
  if (request[`${place}WetBulb`] !== undefined) {
    return derive(ratio, { dryBulbK, wetBulbK: airReading(`${place}WetBulb`, request, site), pressurePa });
  }
  if (request[`${place}RelativeHumidity`] === undefined) return undefined;
  const relativeHumidityRatio = airReading(`${place}RelativeHumidity`, request, site);
  return derive(ratio, {
    dryBulbK,
    wetBulbK: derive(wetBulb, { dryBulbK, relativeHumidityRatio, pressurePa }),
    pressurePa,
  });
}

export const nominalCapacityOf = (amount: Amount<PowerUnit> | undefined): Quantity | undefined =>
  amount &&
  leaf({ id: 'nominalCapacity', kind: 'powerW', value: powerToW(amount.value, amount.unit), origin: 'entered' });
