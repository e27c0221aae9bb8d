/** How far the states from pairs of readings are from the sources those readings are taken from: rows for `measure.ts`. */
import type { MoistAir } from '../../../packages/engine/src/psychrometrics/moist-air';
import {
  MOIST_AIR_PAIRS,
  moistAirFromPair,
  type MoistAirPair,
  type MoistAirReading,
  type MoistAirReadings,
} from '../../../packages/engine/src/psychrometrics/moist-air-pairs';
import { temperatureToK } from '../../../packages/engine/src/units/temperature';
import type { AccuracyRow } from '../refrigerants/measure';
import { row } from './accuracy-row';
import { handbookValues } from './handbook-values';
import { oracle, oracleStates } from './oracle';
import { figure, readTable } from './read-table';

const HANDBOOK = 'ASHRAE Fundamentals 2017 ch. 1';

type Pair = readonly [MoistAirReading, MoistAirReading];
type Readings = MoistAirReadings & { readonly pressurePa: number };

function through([one, other]: Pair, readings: Readings): MoistAir {
  const pair = { [one]: readings[one], [other]: readings[other] } as unknown as MoistAirPair;
  return moistAirFromPair({ pressurePa: readings.pressurePa, ...pair });
}

const WITHOUT_DRY_BULB = MOIST_AIR_PAIRS.filter(([one]) => one !== 'dryBulbK');
const WITH_DRY_BULB = MOIST_AIR_PAIRS.filter(([one]) => one === 'dryBulbK');

const NAMES: Readonly<Record<MoistAirReading, string>> = {
  dryBulbK: 'dry bulb',
  wetBulbK: 'wet bulb',
  dewPointK: 'dew point',
  relativeHumidityRatio: 'relative humidity',
  humidityRatio: 'humidity ratio',
  enthalpyJPerKg: 'enthalpy',
};
const nameOf = ([one, other]: Pair): string => `${NAMES[one]} and ${NAMES[other]}`;

/** Largest difference in K of the dry bulb, which carries the method error of two readings. */
const REAL_GAS_LIMITS_K: Readonly<Record<string, number>> = {};

function realGasRows(): AccuracyRow[] {
  const states: Readings[] = readTable('moist-air-real-gas.csv').map((line) => ({
    pressurePa: figure(line, 'p_Pa'),
    dryBulbK: figure(line, 'T_dry_K'),
    wetBulbK: figure(line, 'T_wet_K'),
    dewPointK: figure(line, 'T_dew_K'),
    relativeHumidityRatio: figure(line, 'RH'),
    humidityRatio: figure(line, 'W'),
    enthalpyJPerKg: figure(line, 'h_J_kg'),
  }));
  return WITHOUT_DRY_BULB.map((pair) =>
    row(
      states.map((state) => through(pair, state).dryBulbK - state.dryBulbK),
      {
        quantity: `dry bulb from ${nameOf(pair)}`,
        source: 'real-gas model RP-1485, −15 to 50 °C, 70 and 101 kPa',
        unit: 'K',
        limit: REAL_GAS_LIMITS_K[nameOf(pair)] ?? Number.NaN,
        why: 'x',
      },
    ),
  );
}
export function measurePairs(): AccuracyRow[] { return realGasRows(); }
