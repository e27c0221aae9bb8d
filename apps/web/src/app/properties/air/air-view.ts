/** What the page knows of the air two typed readings describe. Only the engine computes. */
import {
  attempt,
  humidityRatioToKgPerKg,
  MOIST_AIR_READINGS,
  moistAirFromInchPoundEnthalpy,
  moistAirFromPair,
  temperatureToK,
  type HumidityRatioUnit,
  type InchPoundEnthalpyPair,
  type MoistAir,
  type MoistAirPair,
  type MoistAirReading,
  type TemperatureUnit,
} from '@chargewright/engine';
import { airRefusal, propertiesWords, refusedPairText, type UnitSystem } from '@chargewright/wording';
import type { TypedValue } from '../../loose-checks/check-draft';
import { readNumber, unitAmong } from '../typed-number';

type Units = readonly [string, ...string[]];

const TEMPERATURES: readonly TemperatureUnit[] = ['degF', 'degC'];
const HUMIDITY_RATIOS: readonly HumidityRatioUnit[] = ['gr/lb', 'lb/lb', 'g/kg', 'kg/kg'];

const INCH_POUND: Readonly<Record<MoistAirReading, Units>> = {
  dryBulbK: ['degF'],
  wetBulbK: ['degF'],
  dewPointK: ['degF'],
  relativeHumidityRatio: ['%'],
  humidityRatio: ['gr/lb', 'lb/lb'],
  enthalpyJPerKg: ['Btu/lb'],
};
const METRIC: Readonly<Record<MoistAirReading, Units>> = {
  dryBulbK: ['degC'],
  wetBulbK: ['degC'],
  dewPointK: ['degC'],
  relativeHumidityRatio: ['%'],
  humidityRatio: ['g/kg', 'kg/kg'],
  enthalpyJPerKg: ['kJ/kg'],
};

export const airUnits = (reading: MoistAirReading, system: UnitSystem): Units =>
  (system === 'F-psi' ? INCH_POUND : METRIC)[reading];

export type AirPair = readonly [MoistAirReading, MoistAirReading];

export interface AirQuestion {
  readonly pair: AirPair;
  readonly values: Readonly<Partial<Record<MoistAirReading, TypedValue>>>;
  /** Null while the place is not known. */
  readonly atmospherePa: number | null;
  readonly system: UnitSystem;
}

export interface AirView {
  /** Null without an answer. */
  readonly air: MoistAir | null;
  /** Beside the fields. */
  readonly complaints: Readonly<Partial<Record<MoistAirReading, string>>>;
  /** Of the pair itself, or of the place; empty when there is nothing to say. */
  readonly note: string;
}

export function airView({ pair, values, atmospherePa, system }: AirQuestion): AirView {
  const refusedPair = refusedPairText(pair);
  if (refusedPair !== '') return { air: null, complaints: {}, note: refusedPair };
  const read = pair.map((reading) => ({ reading, ...readNumber(values[reading]) }));
  const complaints = Object.fromEntries(read.map(({ reading, complaint }) => [reading, complaint]));
  if (atmospherePa === null) return { air: null, complaints, note: propertiesWords.place.unknown };
  const amounts = read.map(({ reading, value }) => siReading(reading, value, values[reading]?.unit));
  const [first, second] = amounts;
  if (first === undefined || second === undefined) return { air: null, complaints, note: '' };
  const readings = { ...first, ...second };
  // exactly two of the engine's readings: the pair has two different ones
  const result = attempt(() =>
    'enthalpyBtuPerLb' in readings
      ? moistAirFromInchPoundEnthalpy({ pressurePa: atmospherePa, ...(readings as unknown as InchPoundEnthalpyPair) })
      : moistAirFromPair({ pressurePa: atmospherePa, ...(readings as unknown as MoistAirPair) }),
  );
  if (result.ok) return { air: result.value, complaints, note: '' };
  const [one, other] = MOIST_AIR_READINGS.filter((reading) => pair.includes(reading));
  const humidityRatioUnit = unitAmong(HUMIDITY_RATIOS, values.humidityRatio?.unit);
  const refusal =
    one === undefined || other === undefined
      ? null
      : airRefusal(result.error, {
          pair: [one, other],
          system: systemOfTyped(pair, values, system),
          ...(humidityRatioUnit && { humidityRatioUnit }),
        });
  if (refusal === null) return { air: null, complaints, note: propertiesWords.place.unknown };
  return { air: null, complaints: { ...complaints, [refusal.at]: refusal.text }, note: '' };
}

/** A reading in the engine's unit; undefined without a number or with a unit of another quantity. */
function siReading(
  reading: MoistAirReading,
  value: number | undefined,
  unit: string | undefined,
): Readonly<Record<string, number>> | undefined {
  if (value === undefined) return undefined;
  switch (reading) {
    case 'dryBulbK':
    case 'wetBulbK':
    case 'dewPointK': {
      const scale = unitAmong(TEMPERATURES, unit);
      return scale && { [reading]: temperatureToK(value, scale) };
    }
    case 'relativeHumidityRatio':
      return { [reading]: value / 100 };
    case 'humidityRatio': {
      const ratio = unitAmong(HUMIDITY_RATIOS, unit);
      return ratio && { [reading]: humidityRatioToKgPerKg(value, ratio) };
    }
    case 'enthalpyJPerKg':
      return unit === 'Btu/lb' ? { enthalpyBtuPerLb: value } : { enthalpyJPerKg: value * 1e3 };
  }
}

/** A refusal is said in the scale that was typed in, whatever results are shown in. */
function systemOfTyped(pair: AirPair, values: AirQuestion['values'], system: UnitSystem): UnitSystem {
  const scale = pair
    .map((reading) => unitAmong(TEMPERATURES, values[reading]?.unit))
    .find((unit) => unit !== undefined);
  if (scale === undefined) return system;
  if (scale === 'degF') return 'F-psi';
  return system === 'F-psi' ? 'C-kPa' : system;
}
