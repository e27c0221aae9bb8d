/** The chart as a table: what its lines say at whole dry bulbs. */
import {
  attempt,
  humidityRatioFromKgPerKg,
  moistAirFromDryBulbAndRelativeHumidity,
  temperatureFromK,
  temperatureToK,
  type MoistAir,
} from '@chargewright/engine';
import { formatNumber } from '@chargewright/wording';
import type { ScaleFrame } from './chart-frames';

export const TABLE_HUMIDITIES = [20, 40, 60, 80, 100] as const;

export interface ChartTableRow {
  readonly dryBulb: string;
  /** One for each of `TABLE_HUMIDITIES`; a dash where the water would boil. */
  readonly humidityRatios: readonly string[];
  readonly wetBulbs: readonly string[];
}

const NOTHING = '–';

export function chartTable(
  { scale, ratioUnit, low, high, step }: ScaleFrame,
  pressurePa: number,
): readonly ChartTableRow[] {
  const row = (degrees: number): ChartTableRow => {
    const states = TABLE_HUMIDITIES.map((percent) =>
      attempt(() =>
        moistAirFromDryBulbAndRelativeHumidity({
          dryBulbK: temperatureToK(degrees, scale),
          relativeHumidityRatio: percent / 100,
          pressurePa,
        }),
      ),
    );
    const cells = (text: (air: MoistAir) => string) => states.map((state) => (state.ok ? text(state.value) : NOTHING));
    return {
      dryBulb: formatNumber(degrees, 0),
      humidityRatios: cells(({ humidityRatio }) => formatNumber(humidityRatioFromKgPerKg(humidityRatio, ratioUnit), 1)),
      wetBulbs: cells(({ wetBulbK }) => formatNumber(temperatureFromK(wetBulbK, scale), 1)),
    };
  };
  return Array.from({ length: Math.floor((high - low) / step) + 1 }, (_, k) => row(low + k * step));
}
