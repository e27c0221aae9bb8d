/** The single check values of psychrometrics.csv beside what the engine gives, in the unit of the row. */
import {
  moistAirFromDryBulbAndRelativeHumidity,
  type MoistAir,
} from '../../../packages/engine/src/psychrometrics/moist-air';
import { waterVapourSaturationPressurePa } from '../../../packages/engine/src/psychrometrics/saturation-pressure';
import { standardAtmospherePressurePa } from '../../../packages/engine/src/psychrometrics/standard-atmosphere';
import { lengthToM } from '../../../packages/engine/src/units/flow';
import { moistAirEnthalpyBtuPerLb, specificVolumeToFt3PerLb } from '../../../packages/engine/src/units/moist-air';
import { PA_PER_PSI } from '../../../packages/engine/src/units/pressure';
import { temperatureToK } from '../../../packages/engine/src/units/temperature';
import { figure, readTable } from './read-table';

export interface HandbookValue {
  readonly quantity: string;
  readonly unit: string;
  readonly temperatureF: number;
  readonly printed: number;
  /** The independent value of the same row, where it has one. */
  readonly second: number | undefined;
  /** May throw: the standard atmosphere of the table goes further than ours. */
  readonly computed: () => number;
}

export function handbookValues(): HandbookValue[] {
  return readTable('psychrometrics.csv').map((row) => {
    const { quantity = '', unit = '' } = row;
    return {
      quantity,
      unit,
      temperatureF: figure(row, 'T_F'),
      printed: figure(row, 'value'),
      second: row['second_source'] === '' ? undefined : figure(row, 'second_source'),
      computed: computation(quantity, unit, row),
    };
  });
}

function computation(quantity: string, unit: string, row: Readonly<Record<string, string>>): () => number {
  const inchPound = ['psia', 'Btu', 'ft3', 'lb/lb'].some((start) => unit.startsWith(start));
  const temperatureK = inchPound
    ? temperatureToK(figure(row, 'T_F'), 'degF')
    : temperatureToK(figure(row, 'T_C'), 'degC');
  const perUnit = unit === 'psia' ? PA_PER_PSI : 1;
  if (quantity.startsWith('saturation pressure')) return () => waterVapourSaturationPressurePa(temperatureK) / perUnit;
  const elevation = /^standard atmosphere pressure at (-?\d+) (ft|m)$/.exec(quantity);
  if (elevation !== null) {
    const elevationM = lengthToM(Number(elevation[1]), elevation[2] as 'ft' | 'm');
    return () => standardAtmospherePressurePa(elevationM) / perUnit;
  }
  return () =>
    property(
      quantity,
      unit,
      moistAirFromDryBulbAndRelativeHumidity({
        dryBulbK: temperatureK,
        relativeHumidityRatio: quantity.startsWith('dry-air') ? 0 : 1,
        pressurePa: inchPound ? 14.696 * PA_PER_PSI : 101_325,
      }),
      figure(row, 'T_F'),
    );
}

function property(quantity: string, unit: string, air: MoistAir, temperatureF: number): number {
  if (quantity.startsWith('humidity ratio')) return air.humidityRatio;
  if (unit.startsWith('Btu')) return moistAirEnthalpyBtuPerLb(temperatureF, air.humidityRatio);
  if (unit.startsWith('J/kg')) return air.enthalpyJPerKg;
  if (unit === 'ft3/lb') return specificVolumeToFt3PerLb(air.specificVolumeM3PerKg);
  if (unit === 'm3/kg') return air.specificVolumeM3PerKg;
  throw new Error(`unknown quantity: ${quantity} in ${unit}`);
}
