/**
 * How far the states from pairs of readings are from the sources that give those readings: rows for `measure.ts`. The dry bulb is looked at where it is not
 * given, the humidity where it is.
 */
import type { MoistAir } from '../../../packages/engine/src/psychrometrics/moist-air';
import {
  MOIST_AIR_PAIRS,
  MOIST_AIR_READINGS,
  moistAirFromPair,
  type MoistAirPair,
  type MoistAirReading,
  type MoistAirReadings,
} from '../../../packages/engine/src/psychrometrics/moist-air-pairs';
import { FREEZING_K } from '../../../packages/engine/src/psychrometrics/psychrometric-equation';
import { temperatureToK } from '../../../packages/engine/src/units/temperature';
import type { AccuracyRow } from '../refrigerants/measure';
import { row } from './accuracy-row';
import { handbookValues } from './handbook-values';
import { oracle, oracleStates } from './oracle';
import { figure, readTable } from './read-table';

type Pair = readonly [MoistAirReading, MoistAirReading];
type Readings = MoistAirReadings & { readonly pressurePa: number };

const HANDBOOK = 'ASHRAE Fundamentals 2017 ch. 1';

const NAMES: Readonly<Record<MoistAirReading, string>> = {
  dryBulbK: 'dry bulb',
  wetBulbK: 'wet bulb',
  dewPointK: 'dew point',
  relativeHumidityRatio: 'relative humidity',
  humidityRatio: 'humidity ratio',
  enthalpyJPerKg: 'enthalpy',
};

const PAIRS = MOIST_AIR_PAIRS.map((pair: Pair) => ({ pair, name: `${NAMES[pair[0]]} and ${NAMES[pair[1]]}` }));

function through([one, other]: Pair, readings: Readings): MoistAir {
  const pair = { [one]: readings[one], [other]: readings[other] } as unknown as MoistAirPair;
  return moistAirFromPair({ pressurePa: readings.pressurePa, ...pair });
}

const givesDryBulb = ([one]: Pair): boolean => one === 'dryBulbK';

/** Method error of two readings at once: limit in % of relative humidity where the dry bulb is given, else in K of the dry bulb. */
const REAL_GAS: Readonly<Record<string, readonly [limit: number, why: string]>> = {
  'dry bulb and wet bulb': [0.42, 'method error of the wet bulb'],
  'dry bulb and dew point': [0.032, 'method error of the dew point'],
  'dry bulb and humidity ratio': [0.5, 'method error of the humidity ratio'],
  'dry bulb and enthalpy': [
    3.1,
    '100 J/kg at −15 °C and 70 kPa, where saturation is worth 3.6 kJ/kg; below 0.53 % from 10 °C up',
  ],
  'wet bulb and dew point': [0.072, 'method error of both'],
  'wet bulb and relative humidity': [0.047, 'method error of the wet bulb'],
  'wet bulb and humidity ratio': [1.2, '0.6 % of the humidity ratio, which at 50 °C and 90 % is 0.7 g/kg'],
  'dew point and relative humidity': [0.027, 'method error of the dew point'],
  'dew point and enthalpy': [1.12, '0.6 % of the humidity ratio, which at 50 °C and 90 % is 0.7 g/kg'],
  'relative humidity and humidity ratio': [0.11, '0.6 % of the humidity ratio'],
  'relative humidity and enthalpy': [0.1, 'method error of the enthalpy'],
  'humidity ratio and enthalpy': [0.2, '243 J/kg at 50 °C, 90 % and 70 kPa'],
};

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
  // relative humidity by itself would be compared with itself
  return PAIRS.filter(({ pair }) => !(givesDryBulb(pair) && pair[1] === 'relativeHumidityRatio')).map(
    ({ pair, name }) => {
      const [limit, why] = REAL_GAS[name]!;
      const rest = { source: 'real-gas model RP-1485, −15 to 50 °C, 70 and 101 kPa', limit, why };
      const pairs = states.map((state) => [through(pair, state), state] as const);
      return givesDryBulb(pair)
        ? row(
            pairs.map(([air, state]) => 100 * (air.relativeHumidityRatio - state.relativeHumidityRatio)),
            { ...rest, quantity: `relative humidity from ${name}`, unit: '%' },
          )
        : row(
            pairs.map(([air, state]) => air.dryBulbK - state.dryBulbK),
            { ...rest, quantity: `dry bulb from ${name}`, unit: 'K' },
          );
    },
  );
}

/** Saturated air of Table 2 by its relative humidity and the figure printed for it. */
function saturatedRows(): AccuracyRow[] {
  const differences = (start: string, unit: RegExp, reading: MoistAirReading) =>
    handbookValues()
      .filter((value) => value.quantity.startsWith(start) && unit.test(value.unit))
      .map(({ printed, temperatureF }) => {
        const pair = { relativeHumidityRatio: 1, [reading]: printed } as unknown as MoistAirPair;
        return moistAirFromPair({ pressurePa: 101_325, ...pair }).dryBulbK - temperatureToK(temperatureF, 'degF');
      });
  return [
    row(differences('humidity ratio', /./, 'humidityRatio'), {
      quantity: 'dry bulb of saturated air from humidity ratio, −50 to 85 °C',
      source: `${HANDBOOK}, Table 2, read backwards`,
      unit: 'K',
      limit: 0.132,
      why: 'no enhancement factor: 0.4 to 1.2 % of the humidity ratio',
    }),
    row(differences('enthalpy', /^J/, 'enthalpyJPerKg'), {
      quantity: 'dry bulb of saturated air from enthalpy, −50 to 85 °C',
      source: `${HANDBOOK}, Table 2, read backwards`,
      unit: 'K',
      limit: 0.098,
      why: 'no enhancement factor, most at 85 °C',
    }),
  ];
}

/** Example 1 in SI: the state and the errors allowed of its answers; dry and wet bulb are given. Its origin: worked-states.ts. */
const EXAMPLE: Readings = {
  pressurePa: 101_325,
  dryBulbK: temperatureToK(40, 'degC'),
  wetBulbK: temperatureToK(20, 'degC'),
  dewPointK: temperatureToK(7, 'degC'),
  relativeHumidityRatio: 0.14,
  humidityRatio: 0.0065,
  enthalpyJPerKg: 56_700,
};
const EXAMPLE_ALLOWED: MoistAirReadings = {
  dryBulbK: 0,
  wetBulbK: 0,
  dewPointK: 0.5,
  relativeHumidityRatio: 0.01,
  humidityRatio: 0.0001,
  enthalpyJPerKg: 100,
};

/** Every reading of the example from every pair of its readings, as a fraction of what their allowed errors come to. */
function exampleDifferences(): number[] {
  return PAIRS.flatMap(({ pair }) => {
    const air = through(pair, EXAMPLE);
    const moved = pair.map((name) => through(pair, { ...EXAMPLE, [name]: EXAMPLE[name] + EXAMPLE_ALLOWED[name] }));
    return MOIST_AIR_READINGS.filter((name) => !pair.includes(name)).map((name) => {
      const carried = moved.reduce((sum, { [name]: value }) => sum + Math.abs(value! - air[name]!), 0);
      return (air[name]! - EXAMPLE[name]) / (EXAMPLE_ALLOWED[name] + carried);
    });
  });
}

const ORACLE_STATES = 10_000;
const DEW_POINT_ERROR = 'the dew point of the library is good to 1e-8 K';
const CLOSED = 'closed formulas both: only rounding';
const SOLVED = 'solved to 1e-9 K';

/** Limits relative to the humidity ratio where the wet bulb is given, else in K of the dry bulb. */
const ORACLE: Readonly<Record<string, readonly [limit: number, why: string]>> = {
  'wet bulb and dew point': [1e-12, CLOSED],
  'wet bulb and relative humidity': [1e-10, `${SOLVED} of dry bulb`],
  'wet bulb and humidity ratio': [1e-12, CLOSED],
  'dew point and relative humidity': [1e-8, DEW_POINT_ERROR],
  'dew point and enthalpy': [1.1e-7, `${DEW_POINT_ERROR}, and in hot humid air moves the dry bulb ten times as much`],
  'relative humidity and humidity ratio': [1e-9, SOLVED],
  'relative humidity and enthalpy': [1.001e-9, SOLVED],
  'humidity ratio and enthalpy': [1e-12, CLOSED],
};

/** The readings of the library's closed formulas at a dry bulb; its wet bulb is only good to 5e-4 K, so ours is put back into its equation instead. */
function oracleRows(): AccuracyRow[] {
  const states = oracleStates(ORACLE_STATES).map(({ dryBulbC, relativeHumidityRatio, pressurePa }) => {
    const humidityRatio = oracle.GetHumRatioFromRelHum(dryBulbC, relativeHumidityRatio, pressurePa);
    const vapourPressurePa = relativeHumidityRatio * oracle.GetSatVapPres(dryBulbC);
    return {
      pressurePa,
      dryBulbK: dryBulbC + FREEZING_K,
      wetBulbK: oracle.GetTWetBulbFromRelHum(dryBulbC, relativeHumidityRatio, pressurePa) + FREEZING_K,
      dewPointK: oracle.GetTDewPointFromVapPres(dryBulbC, vapourPressurePa) + FREEZING_K,
      relativeHumidityRatio,
      humidityRatio,
      enthalpyJPerKg: oracle.GetMoistAirEnthalpy(dryBulbC, humidityRatio),
    };
  });
  return PAIRS.filter(({ pair }) => !givesDryBulb(pair)).map(({ pair, name }) => {
    const [limit, why] = ORACLE[name]!;
    const rest = { source: 'open psychrometric library, random states', limit, why };
    return pair.includes('wetBulbK')
      ? row(
          states.map((state) => {
            const { dryBulbK, wetBulbK, humidityRatio } = through(pair, state);
            const [t, tStar] = [dryBulbK - FREEZING_K, wetBulbK - FREEZING_K];
            return oracle.GetHumRatioFromTWetBulb(t, tStar, state.pressurePa) / humidityRatio - 1;
          }),
          { ...rest, quantity: `humidity ratio from ${name}, put back`, unit: 'relative' },
        )
      : row(
          states.map((state) => through(pair, state).dryBulbK - state.dryBulbK),
          { ...rest, quantity: `dry bulb from ${name}`, unit: 'K' },
        );
  });
}

export function measurePairs(): AccuracyRow[] {
  return [
    ...realGasRows(),
    ...saturatedRows(),
    row(exampleDifferences(), {
      quantity: 'worked example, SI, every reading from every pair of the others',
      source: `${HANDBOOK}, Example 1`,
      unit: 'of the allowed error',
      limit: 1,
      why: 'the errors allowed of the chart readings, carried through the pair',
    }),
    ...oracleRows(),
  ];
}
