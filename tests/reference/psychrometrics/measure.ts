/**
 * How far the moist-air layer is from what it is checked against. `accuracy.spec.ts` is the gate, `npm run accuracy` the meter: both read the
 * rows made here. A source row without an answer throws, so it cannot be skipped.
 */
import { dewPointKFromVapourPressure } from '../../../packages/engine/src/psychrometrics/dew-point';
import { moistAirFromDryBulbAndRelativeHumidity } from '../../../packages/engine/src/psychrometrics/moist-air';
import { FREEZING_K } from '../../../packages/engine/src/psychrometrics/psychrometric-equation';
import { standardAtmospherePressurePa } from '../../../packages/engine/src/psychrometrics/standard-atmosphere';
import { temperatureFromK } from '../../../packages/engine/src/units/temperature';
import type { AccuracyRow } from '../refrigerants/measure';
import { row } from './accuracy-row';
import { handbookValues, type HandbookValue } from './handbook-values';
import { measurePairs } from './measure-pairs';
import { oracle, oracleStates } from './oracle';
import { figure, readTable } from './read-table';
import { exampleDifferences, stateDifferences, type StateDifferences } from './worked-states';

const HANDBOOK = 'ASHRAE Fundamentals 2017 ch. 1';

/** The table's elevations that lie outside ours, −1,500 to 18,000 ft; `accuracy.spec.ts` asserts that they are refused. */
export const REFUSED_ELEVATIONS = ['30000 ft', '-500 m', '10000 m'];

function handbookRows(): AccuracyRow[] {
  const values = handbookValues();
  const select = (start: string, unit: RegExp, wanted: (value: HandbookValue) => boolean = () => true) =>
    values.filter((value) => value.quantity.startsWith(start) && unit.test(value.unit) && wanted(value));
  const relative = (scale: number) => (value: HandbookValue) => scale * (value.computed() / value.printed - 1);
  const absolute = (value: HandbookValue) => value.computed() - value.printed;
  const second = (value: HandbookValue) => 1e6 * (value.computed() / value.second! - 1);
  const inRange = ({ quantity }: HandbookValue) =>
    !REFUSED_ELEVATIONS.some((elevation) => quantity.endsWith(` ${elevation}`));
  const saturation = select('saturation pressure', /./);
  return [
    row(saturation.filter(({ temperatureF }) => temperatureF > -76).map(relative(1e6)), {
      quantity: 'saturation pressure, −20 to 150 °C',
      source: `${HANDBOOK}, Table 3`,
      unit: 'ppm',
      limit: 300,
      why: 'the equations and the table of the Handbook are two fits; 300 ppm is the agreement stated for them',
    }),
    row(saturation.filter(({ temperatureF }) => temperatureF === -76).map(relative(1e6)), {
      quantity: 'saturation pressure, −60 °C',
      source: `${HANDBOOK}, Table 3`,
      unit: 'ppm',
      limit: 4630,
      why: 'the table prints 1.08 Pa and 0.000157 psia: half the last digit',
    }),
    row(saturation.filter((value) => value.second !== undefined).map(second), {
      quantity: 'saturation pressure, 5 to 150 °C',
      source: 'IAPWS-95',
      unit: 'ppm',
      limit: 250,
      why: 'Hyland-Wexler 1983 against the 1995 formulation, most at 25 °C',
    }),
    row(select('humidity ratio', /./).map(relative(100)), {
      quantity: 'humidity ratio at saturation, −50 to 85 °C',
      source: `${HANDBOOK}, Table 2`,
      unit: '%',
      limit: 1.25,
      why: 'no enhancement factor in the ideal-gas equations: 0.4 % in the cold, 1.2 % at 85 °C (stated: up to 2 %)',
    }),
    row(select('enthalpy', /^J/).map(relative(100)), {
      quantity: 'enthalpy of saturated air, SI',
      source: `${HANDBOOK}, Table 2`,
      unit: '%',
      limit: 2.2,
      why: 'most at −5 °C, where 25 J/kg meet a value near zero (stated: up to 3 % there); below 0.9 % elsewhere',
    }),
    row(select('enthalpy', /^Btu/).map(relative(100)), {
      quantity: 'enthalpy of saturated air, IP',
      source: `${HANDBOOK}, Table 2`,
      unit: '%',
      limit: 0.9,
      why: 'the missing enhancement factor, most at 185 °F',
    }),
    row(select('dry-air', /./).map(relative(100)), {
      quantity: 'dry air, enthalpy and volume at 25 °C',
      source: `${HANDBOOK}, Table 2`,
      unit: '%',
      limit: 0.1,
      why: 'constant heat capacity, 0.240 Btu/(lb °F) the coarser of the two, and the ideal gas',
    }),
    row(select('standard atmosphere', /^Pa$/, inRange).map(absolute), {
      quantity: 'standard atmosphere, 0 to 4000 m',
      source: `${HANDBOOK}, Table 1`,
      unit: 'Pa',
      limit: 0.5,
      why: 'printed in whole Pa',
    }),
    row(select('standard atmosphere', /^psia$/, inRange).map(absolute), {
      quantity: 'standard atmosphere, −1000 to 10,000 ft',
      source: `${HANDBOOK}, Table 1`,
      unit: 'psia',
      limit: 0.0025,
      why: 'the inch-pound table lies up to 0.0024 psia from the formula that is given with it',
    }),
    row(
      [0, 500, 1000, 1600, 3000, 5000].map((elevationM) => {
        // eq. 3 as printed
        const printed = 101_325 * (1 - 2.25577e-5 * elevationM) ** 5.2559;
        return 1e6 * (standardAtmospherePressurePa(elevationM) / printed - 1);
      }),
      {
        quantity: 'standard atmosphere, 0 to 5000 m',
        source: `${HANDBOOK}, eq. 3`,
        unit: 'ppm',
        limit: 3,
        why: 'eq. 3 is the ICAO curve with rounded constants',
      },
    ),
  ];
}

function stateRows(): AccuracyRow[] {
  const states = stateDifferences();
  const of = (pick: (state: StateDifferences) => number | undefined) =>
    states.flatMap((state) => {
      const value = pick(state);
      return value === undefined ? [] : [value];
    });
  const same = 'computed from the same equations by another program';
  const computed = (
    quantity: string,
    unit: string,
    limit: number,
    pick: (state: StateDifferences) => number | undefined,
  ) => row(of(pick), { quantity, source: same, unit, limit, why: 'half the last digit kept' });
  const realGas = 'real-gas model RP-1485, room air';
  return [
    computed('wet bulb, room air', '°F', 0.005, (state) => state.wetBulbF),
    computed('dew point, room air', '°F', 0.05, (state) => state.dewPointF),
    computed('relative humidity, room air', '%', 0.05, (state) => state.relativeHumidityPercent),
    computed('humidity ratio, room air', 'lb/lb', 0.000005, (state) => state.humidityRatio),
    computed('enthalpy, room air', 'Btu/lb', 0.005, (state) => state.enthalpyBtuPerLb),
    row(
      of((state) => state.specificVolumeFt3PerLb),
      {
        quantity: 'specific volume, room air',
        source: same,
        unit: 'ft³/lb',
        limit: 0.00065,
        why: 'half the last digit kept, and 7 ppm between the gas constants 53.350 ft lbf/(lb °R) and 287.042 J/(kg K)',
      },
    ),
    row(
      of((state) => state.realGasWetBulbF),
      {
        quantity: 'wet bulb, room air',
        source: realGas,
        unit: '°F',
        limit: 0.028,
        why: 'stated method error 0.023 °F, and half the last digit kept',
      },
    ),
    row(
      of((state) => state.realGasHumidityRatioPercent),
      {
        quantity: 'humidity ratio, room air',
        source: realGas,
        unit: '%',
        limit: 1,
        why: 'stated method error 0.4 to 1 %',
      },
    ),
    row(exampleDifferences(), {
      quantity: 'worked example, IP and SI, five properties each',
      source: `${HANDBOOK}, Example 1`,
      unit: 'of the allowed error',
      limit: 1,
      why: 'the printed answers are chart readings; the errors allowed stand beside them',
    }),
  ];
}

function realGasRows(): AccuracyRow[] {
  const cases = readTable('moist-air-real-gas.csv').map((line) => ({
    line,
    air: moistAirFromDryBulbAndRelativeHumidity({
      dryBulbK: figure(line, 'T_dry_K'),
      relativeHumidityRatio: figure(line, 'RH'),
      pressurePa: figure(line, 'p_Pa'),
    }),
  }));
  const source = 'real-gas model RP-1485, −15 to 50 °C, 70 and 101 kPa';
  const wetBulb = (surface: 'water' | 'ice') =>
    cases
      .filter(({ air }) => air.wetBulbSurface === surface)
      .map(({ line, air }) => air.wetBulbK - figure(line, 'T_wet_K'));
  const why = 'method error of the ideal-gas equations';
  return [
    row(wetBulb('water'), { quantity: 'wet bulb, water', source, unit: 'K', limit: 0.022, why }),
    row(wetBulb('ice'), { quantity: 'wet bulb, ice', source, unit: 'K', limit: 0.026, why }),
    row(
      cases.map(({ line, air }) => air.dewPointK! - figure(line, 'T_dew_K')),
      { quantity: 'dew point and frost point', source, unit: 'K', limit: 0.02, why },
    ),
    row(
      cases.map(({ line, air }) => 100 * (air.humidityRatio / figure(line, 'W') - 1)),
      { quantity: 'humidity ratio', source, unit: '%', limit: 0.62, why },
    ),
    row(
      cases.map(({ line, air }) => 100 * (air.specificVolumeM3PerKg / figure(line, 'v_m3_kg') - 1)),
      { quantity: 'specific volume', source, unit: '%', limit: 0.085, why },
    ),
  ];
}

const ORACLE_STATES = 10_000;

function oracleRows(): AccuracyRow[] {
  const cases = oracleStates(ORACLE_STATES).map(({ dryBulbC, relativeHumidityRatio, pressurePa }) => {
    const dryBulbK = dryBulbC + FREEZING_K;
    const air = moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa });
    const wetBulbC = Math.min(temperatureFromK(air.wetBulbK, 'degC'), dryBulbC);
    const humidityRatio = oracle.GetHumRatioFromRelHum(dryBulbC, relativeHumidityRatio, pressurePa);
    const dewPointC = temperatureFromK(dewPointKFromVapourPressure(air.vapourPressurePa), 'degC');
    return {
      wetBulbK: wetBulbC - oracle.GetTWetBulbFromRelHum(dryBulbC, relativeHumidityRatio, pressurePa),
      wetBulbPutBack: oracle.GetHumRatioFromTWetBulb(dryBulbC, wetBulbC, pressurePa) / air.humidityRatio - 1,
      dewPointK: dewPointC - oracle.GetTDewPointFromVapPres(dryBulbC, air.vapourPressurePa),
      humidityRatio: air.humidityRatio / humidityRatio - 1,
      enthalpyJPerKg: air.enthalpyJPerKg - oracle.GetMoistAirEnthalpy(dryBulbC, humidityRatio),
      specificVolume: air.specificVolumeM3PerKg / oracle.GetMoistAirVolume(dryBulbC, humidityRatio, pressurePa) - 1,
    };
  });
  const source = 'open psychrometric library, random states';
  const rounding = 'the same closed formula: only rounding';
  const pick = (key: keyof (typeof cases)[number]) => cases.map((differences) => differences[key]);
  return [
    row(pick('wetBulbK'), {
      quantity: 'wet bulb',
      source,
      unit: 'K',
      limit: 5.001e-4,
      why: 'the library answers the middle of a bracket up to 0.001 K wide',
    }),
    row(pick('wetBulbPutBack'), {
      quantity: 'humidity ratio of our wet bulb',
      source,
      unit: 'relative',
      limit: 1e-8,
      why: 'its closed formula, which has no solver error: 1e-9 K of ours, at most 10 times as much of a small humidity ratio',
    }),
    row(pick('dewPointK'), {
      quantity: 'dew point',
      source,
      unit: 'K',
      limit: 1e-8,
      why: 'its last Newton step is below 0.001 K and leaves 0.006 per K of its square',
    }),
    row(pick('humidityRatio'), { quantity: 'humidity ratio', source, unit: 'relative', limit: 1e-12, why: rounding }),
    row(pick('enthalpyJPerKg'), { quantity: 'enthalpy', source, unit: 'J/kg', limit: 1e-6, why: rounding }),
    row(pick('specificVolume'), { quantity: 'specific volume', source, unit: 'relative', limit: 1e-12, why: rounding }),
  ];
}

export function measurePsychrometrics(): AccuracyRow[] {
  return [...handbookRows(), ...stateRows(), ...realGasRows(), ...oracleRows(), ...measurePairs()];
}
