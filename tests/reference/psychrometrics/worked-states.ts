/** Room-air states of psychrometric-states.csv and Example 1 of the Handbook, as differences between the engine and the file. */
import {
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
  type MoistAir,
} from '../../../packages/engine/src/psychrometrics/moist-air';
import { moistAirEnthalpyBtuPerLb, specificVolumeToFt3PerLb } from '../../../packages/engine/src/units/moist-air';
import { PA_PER_PSI } from '../../../packages/engine/src/units/pressure';
import { temperatureFromK, temperatureToK } from '../../../packages/engine/src/units/temperature';
import { figure, readTable } from './read-table';

export interface StateDifferences {
  /** What the row gives has no difference. */
  readonly wetBulbF: number | undefined;
  readonly relativeHumidityPercent: number | undefined;
  readonly dewPointF: number;
  readonly humidityRatio: number;
  readonly enthalpyBtuPerLb: number;
  readonly specificVolumeFt3PerLb: number;
  readonly realGasWetBulbF: number | undefined;
  readonly realGasHumidityRatioPercent: number;
}

export function stateDifferences(): StateDifferences[] {
  return readTable('psychrometric-states.csv').map((row) => {
    const dryBulbF = figure(row, 'db_F');
    const byWetBulb = row['given'] === 'db+wb';
    const dryBulbK = temperatureToK(dryBulbF, 'degF');
    const pressurePa = figure(row, 'p_psia') * PA_PER_PSI;
    const air = byWetBulb
      ? moistAirFromDryBulbAndWetBulb({
          dryBulbK,
          wetBulbK: temperatureToK(figure(row, 'wb_F_eq'), 'degF'),
          pressurePa,
        })
      : moistAirFromDryBulbAndRelativeHumidity({
          dryBulbK,
          relativeHumidityRatio: figure(row, 'rh_pct') / 100,
          pressurePa,
        });
    const wetBulbF = temperatureFromK(air.wetBulbK, 'degF');
    return {
      wetBulbF: byWetBulb ? undefined : wetBulbF - figure(row, 'wb_F_eq'),
      relativeHumidityPercent: byWetBulb ? 100 * air.relativeHumidityRatio - figure(row, 'rh_pct') : undefined,
      dewPointF: temperatureFromK(air.dewPointK!, 'degF') - figure(row, 'dp_F_eq'),
      humidityRatio: air.humidityRatio - figure(row, 'W_lb_per_lb_eq'),
      enthalpyBtuPerLb: moistAirEnthalpyBtuPerLb(dryBulbF, air.humidityRatio) - figure(row, 'h_Btu_per_lb_eq'),
      specificVolumeFt3PerLb: specificVolumeToFt3PerLb(air.specificVolumeM3PerKg) - figure(row, 'v_ft3_per_lb_eq'),
      realGasWetBulbF: byWetBulb ? undefined : wetBulbF - figure(row, 'wb_F_rp'),
      realGasHumidityRatioPercent: 100 * (air.humidityRatio / figure(row, 'W_rp') - 1),
    };
  });
}

interface Answer {
  readonly printed: number;
  readonly allowed: number;
  readonly computed: number;
}

/**
 * ASHRAE Handbook - Fundamentals, 2017, ch. 1, Example 1, as quoted with its allowed errors in the test files of the public PsychroLib repository,
 * version 2.5.0 (read; the Handbook was not opened). Its answers are readings from the chart.
 */
export function exampleAnswers(): Answer[] {
  const ip = moistAirFromDryBulbAndWetBulb({
    dryBulbK: temperatureToK(100, 'degF'),
    wetBulbK: temperatureToK(65, 'degF'),
    pressurePa: 14.696 * PA_PER_PSI,
  });
  const si = moistAirFromDryBulbAndWetBulb({
    dryBulbK: temperatureToK(40, 'degC'),
    wetBulbK: temperatureToK(20, 'degC'),
    pressurePa: 101_325,
  });
  const dewPoint = (air: MoistAir, unit: 'degF' | 'degC') => temperatureFromK(air.dewPointK!, unit);
  return [
    { printed: 0.00523, allowed: 0.001, computed: ip.humidityRatio },
    { printed: 40, allowed: 1, computed: dewPoint(ip, 'degF') },
    { printed: 0.13, allowed: 0.01, computed: ip.relativeHumidityRatio },
    { printed: 29.8, allowed: 0.1, computed: moistAirEnthalpyBtuPerLb(100, ip.humidityRatio) },
    { printed: 14.22, allowed: 0.01 * 14.22, computed: specificVolumeToFt3PerLb(ip.specificVolumeM3PerKg) },
    { printed: 0.0065, allowed: 0.0001, computed: si.humidityRatio },
    { printed: 7, allowed: 0.5, computed: dewPoint(si, 'degC') },
    { printed: 0.14, allowed: 0.01, computed: si.relativeHumidityRatio },
    { printed: 56.7, allowed: 0.1, computed: si.enthalpyJPerKg / 1e3 },
    { printed: 0.896, allowed: 0.01 * 0.896, computed: si.specificVolumeM3PerKg },
  ];
}

/** Each as a fraction of its allowed error. */
export const exampleDifferences = (): number[] =>
  exampleAnswers().map(({ printed, allowed, computed }) => (computed - printed) / allowed);
