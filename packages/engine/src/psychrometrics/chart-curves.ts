/** The lines of a psychrometric chart at one air pressure: humidity ratio against dry bulb. What is drawn is for the page; the points are computed here. */
import { attempt } from '../result';
import { humidityRatioFromRelativeHumidity } from './humidity-ratio';
import { moistAirFromRelativeHumidityAndHumidityRatio } from './humidity-pairs';
import { humidityRatioFromWetBulb } from './wet-bulb';
import { moistAirFromWetBulbAndHumidityRatio } from './wet-bulb-pairs';

export interface ChartPoint {
  readonly dryBulbK: number;
  readonly humidityRatio: number;
}

export interface ChartFrame {
  readonly pressurePa: number;
  readonly leastDryBulbK: number;
  readonly mostDryBulbK: number;
  readonly mostHumidityRatio: number;
}

/** So close that straight lines between the points look like the curve: within 0.1 % of the frame's height over 60 K. */
const STEPS = 60;
/** A line of constant wet bulb bends so little that fewer do. */
const WET_BULB_STEPS = 12;

const between = (low: number, high: number, steps: number): readonly number[] =>
  Array.from({ length: steps + 1 }, (_, k) => low + ((high - low) * k) / steps);

/**
 * Points of a line of constant relative humidity (0 to 1; 1 is saturation) from the left edge of a frame to its right or its upper edge, whichever it
 * meets first; empty where the whole line lies above. Throws `EngineError` as the frame's dry bulbs, pressure or the humidity are out of range.
 */
export function relativeHumidityCurve(frame: ChartFrame, relativeHumidityRatio: number): readonly ChartPoint[] {
  const { pressurePa, leastDryBulbK, mostDryBulbK, mostHumidityRatio } = frame;
  const at = (dryBulbK: number): number =>
    humidityRatioFromRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa });
  if (at(leastDryBulbK) > mostHumidityRatio) return [];
  const upperK = dryBulbAtTop(frame, relativeHumidityRatio) ?? mostDryBulbK;
  return between(leastDryBulbK, Math.min(upperK, mostDryBulbK), STEPS).map((dryBulbK) => ({
    dryBulbK,
    // the last point of a line that leaves through the top is the top itself
    humidityRatio: Math.min(at(dryBulbK), mostHumidityRatio),
  }));
}

/** Where a line of relative humidity reaches the top of the frame; undefined where it stays below it up to 90 °C. */
function dryBulbAtTop(frame: ChartFrame, relativeHumidityRatio: number): number | undefined {
  const { pressurePa, mostHumidityRatio: humidityRatio } = frame;
  const top = attempt(() =>
    moistAirFromRelativeHumidityAndHumidityRatio({ relativeHumidityRatio, humidityRatio, pressurePa }),
  );
  return top.ok ? top.value.dryBulbK : undefined;
}

/**
 * Points of a line of constant wet bulb from saturation down to dry air or the right edge of a frame, the part inside it; empty where there is none.
 * A wet bulb below 0 °C is an iced one. Throws `EngineError` as `moistAirFromPair` does for a wet bulb that is out of range or boils.
 */
export function wetBulbCurve(frame: ChartFrame, wetBulbK: number): readonly ChartPoint[] {
  const { pressurePa, leastDryBulbK, mostDryBulbK, mostHumidityRatio } = frame;
  const saturated = humidityRatioFromWetBulb({ dryBulbK: wetBulbK, wetBulbK, pressurePa });
  const firstK = Math.max(
    leastDryBulbK,
    saturated > mostHumidityRatio ? dryBulbOf(frame, wetBulbK, mostHumidityRatio) : wetBulbK,
  );
  const lastK = Math.min(mostDryBulbK, dryBulbOf(frame, wetBulbK, 0));
  if (firstK >= lastK) return [];
  return between(firstK, lastK, WET_BULB_STEPS).map((dryBulbK) => ({
    dryBulbK,
    humidityRatio: humidityRatioFromWetBulb({ dryBulbK, wetBulbK, pressurePa }),
  }));
}

/** Dry bulb of a wet bulb and a humidity ratio; beyond 90 °C the right edge. */
function dryBulbOf({ pressurePa, mostDryBulbK }: ChartFrame, wetBulbK: number, humidityRatio: number): number {
  const air = attempt(() => moistAirFromWetBulbAndHumidityRatio({ wetBulbK, humidityRatio, pressurePa }));
  return air.ok ? air.value.dryBulbK : mostDryBulbK;
}
