/** Every property of a state of moist air, as lines of text. */
import {
  humidityRatioFromKgPerKg,
  moistAirEnthalpyBtuPerLb,
  temperatureFromK,
  type MoistAir,
} from '@chargewright/engine';
import {
  formatAmount,
  formatStated,
  formatValue,
  formatVapourPressure,
  moistAirWords,
  type UnitSystem,
} from '@chargewright/wording';

export interface AirLine {
  readonly name: string;
  readonly value: string;
  /** Beside the value: the same in another unit, or what wets the bulb. */
  readonly more: string;
}

export function airLines(air: MoistAir, system: UnitSystem): readonly AirLine[] {
  const { readings, ...words } = moistAirWords;
  const [fine, plain] = system === 'F-psi' ? (['gr/lb', 'lb/lb'] as const) : (['g/kg', 'kg/kg'] as const);
  const line = (name: string, value: string, more = ''): AirLine => ({ name, value, more });
  const temperature = (kelvin: number) => formatValue('temperatureK', kelvin, system);
  return [
    line(readings.dryBulbK, temperature(air.dryBulbK)),
    line(readings.wetBulbK, temperature(air.wetBulbK), air.wetBulbSurface === 'ice' ? words.icedBulb : ''),
    line(readings.dewPointK, air.dewPointK === null ? words.tooDry : temperature(air.dewPointK)),
    line(readings.relativeHumidityRatio, formatStated('fraction', air.relativeHumidityRatio, system)),
    line(
      readings.humidityRatio,
      formatAmount(humidityRatioFromKgPerKg(air.humidityRatio, fine), fine),
      formatAmount(air.humidityRatio, plain),
    ),
    line(readings.enthalpyJPerKg, enthalpyText(air, system)),
    line(words.specificVolume, formatValue('specificVolumeM3PerKg', air.specificVolumeM3PerKg, system)),
    line(words.vaporPressure, formatVapourPressure(air.vapourPressurePa, system)),
    line(words.airPressure, formatValue('pressurePa', air.pressurePa, system)),
  ];
}

/** The inch-pound datum needs the state, not only the SI enthalpy. */
const enthalpyText = ({ dryBulbK, humidityRatio, enthalpyJPerKg }: MoistAir, system: UnitSystem): string =>
  system === 'F-psi'
    ? formatAmount(moistAirEnthalpyBtuPerLb(temperatureFromK(dryBulbK, 'degF'), humidityRatio), 'Btu/lb')
    : formatAmount(enthalpyJPerKg / 1e3, 'kJ/kg');
