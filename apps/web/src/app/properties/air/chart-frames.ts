/** What part of a psychrometric chart is drawn: the ordinary one, or a colder or hotter one where the air lies there. */
import {
  humidityRatioToKgPerKg,
  temperatureFromK,
  temperatureToK,
  type ChartFrame,
  type MoistAir,
} from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';

/** A frame in the units its axes have. */
export interface ScaleFrame {
  readonly scale: 'degF' | 'degC';
  readonly ratioUnit: 'gr/lb' | 'g/kg';
  readonly low: number;
  readonly high: number;
  readonly most: number;
  /** Between two labelled dry bulbs, and between two wet-bulb lines. */
  readonly step: number;
  readonly wetBulbStep: number;
}

const inchPound = (low: number, high: number, most: number, step: number, wetBulbStep: number): ScaleFrame => ({
  scale: 'degF',
  ratioUnit: 'gr/lb',
  low,
  high,
  most,
  step,
  wetBulbStep,
});
const metric = (low: number, high: number, most: number, step: number, wetBulbStep: number): ScaleFrame => ({
  ...inchPound(low, high, most, step, wetBulbStep),
  scale: 'degC',
  ratioUnit: 'g/kg',
});

/** The first that holds the air is drawn. */
const INCH_POUND: readonly ScaleFrame[] = [
  inchPound(30, 120, 210, 10, 5),
  inchPound(-60, 50, 50, 10, 10),
  inchPound(60, 190, 1400, 10, 10),
];
const METRIC: readonly ScaleFrame[] = [metric(0, 50, 30, 5, 5), metric(-50, 10, 8, 5, 5), metric(15, 90, 200, 5, 5)];

/** Null for air that lies beyond all of them. */
export function frameOf(air: MoistAir, system: UnitSystem): ScaleFrame | null {
  const frames = system === 'F-psi' ? INCH_POUND : METRIC;
  return (
    frames.find(({ scale, low, high, most, ratioUnit }) => {
      const dryBulb = temperatureFromK(air.dryBulbK, scale);
      return dryBulb >= low && dryBulb <= high && air.humidityRatio <= humidityRatioToKgPerKg(most, ratioUnit);
    }) ?? null
  );
}

export const chartFrame = ({ scale, low, high, most, ratioUnit }: ScaleFrame, pressurePa: number): ChartFrame => ({
  pressurePa,
  leastDryBulbK: temperatureToK(low, scale),
  mostDryBulbK: temperatureToK(high, scale),
  mostHumidityRatio: humidityRatioToKgPerKg(most, ratioUnit),
});
