/** A psychrometric chart as paths and places: what the engine computed, laid out on so many pixels. */
import {
  attempt,
  relativeHumidityCurve,
  temperatureFromK,
  temperatureToK,
  humidityRatioFromKgPerKg,
  wetBulbCurve,
  type ChartPoint,
  type MoistAir,
} from '@chargewright/engine';
import { formatNumber } from '@chargewright/wording';
import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { chartFrame, type ScaleFrame } from './chart-frames';

export interface Label {
  readonly x: number;
  readonly y: number;
  readonly text: string;
}

export interface ChartLine {
  readonly name: string;
  readonly path: string;
  /** Null where there is no room for it. */
  readonly label: Label | null;
}

export interface ChartDrawing {
  readonly width: number;
  readonly height: number;
  readonly plot: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };
  readonly saturation: string;
  readonly relativeHumidities: readonly ChartLine[];
  readonly wetBulbs: readonly ChartLine[];
  readonly dryBulbTicks: readonly Label[];
  readonly humidityRatioTicks: readonly Label[];
  readonly state: { readonly x: number; readonly y: number; readonly guides: string; readonly wetBulb: string };
}

const TOP = 12;
const BOTTOM = 46;
const RIGHT = 58;
const LEFT = 14;
/** Narrower than this the lines and labels stand twice as far apart. */
const NARROW = 520;
const TALLEST = 520;
/** Where along its line a relative humidity is named: near the end, where the lines lie furthest apart, and there every other one. */
const LABEL_AT = 0.93;
const LABEL_EVERY = 20;
/** A wet bulb is named only where its line starts on the saturation line, clear of the corners. */
const CLEAR = 14;

export function drawChart(air: MoistAir, scaleFrame: ScaleFrame, width: number): ChartDrawing {
  const { scale, ratioUnit, low, high, most, step, wetBulbStep } = scaleFrame;
  const frame = chartFrame(scaleFrame, air.pressurePa);
  const height = Math.min(TALLEST, Math.round(width * 0.8));
  const plot = { left: LEFT, right: width - RIGHT, top: TOP, bottom: height - BOTTOM };
  const x = scaleLinear([low, high], [plot.left, plot.right]);
  const y = scaleLinear([0, most], [plot.bottom, plot.top]);
  const spread = width < NARROW ? 2 : 1;

  const placeOf = ({ dryBulbK, humidityRatio }: ChartPoint): readonly [number, number] => [
    x(temperatureFromK(dryBulbK, scale)),
    y(humidityRatioFromKgPerKg(humidityRatio, ratioUnit)),
  ];
  const draw = line<ChartPoint>()
    .x((point) => placeOf(point)[0])
    .y((point) => placeOf(point)[1]);
  const pathOf = (points: readonly ChartPoint[]): string => draw([...points]) ?? '';

  const relativeHumidities = steps(10 * spread, 90, 10 * spread).map((percent): ChartLine => {
    const points = relativeHumidityCurve(frame, percent / 100);
    const at = percent % (LABEL_EVERY * spread) === 0 ? points[Math.round(LABEL_AT * (points.length - 1))] : undefined;
    const text = `${formatNumber(percent, 0)} %`;
    return { name: text, path: pathOf(points), label: at === undefined ? null : labelAt(placeOf(at), text) };
  });

  const firstWetBulb = Math.ceil(low / wetBulbStep) * wetBulbStep;
  const wetBulbs = steps(firstWetBulb, high, wetBulbStep * spread).flatMap((degrees): readonly ChartLine[] => {
    const wetBulbK = temperatureToK(degrees, scale);
    // at high elevation and heat a wet bulb would boil: then there is no such line
    const points = attempt(() => wetBulbCurve(frame, wetBulbK));
    const first = points.ok ? points.value[0] : undefined;
    if (!points.ok || first === undefined) return [];
    const text = formatNumber(degrees, 0);
    const [labelX, labelY] = placeOf(first);
    const onSaturation = Math.abs(first.dryBulbK - wetBulbK) < 1e-6 && labelY > plot.top + CLEAR;
    const label = onSaturation && labelX > plot.left + CLEAR ? { x: labelX - 4, y: labelY - 5, text } : null;
    return [{ name: text, path: pathOf(points.value), label }];
  });

  const [stateX, stateY] = placeOf(air);
  const dewPoint = air.dewPointK === null ? low : Math.max(low, temperatureFromK(air.dewPointK, scale));
  const dewPointX = x(dewPoint);
  const ofWetBulb = attempt(() => wetBulbCurve(frame, air.wetBulbK));
  const towardsWetBulb = [
    ...(ofWetBulb.ok ? ofWetBulb.value.filter(({ dryBulbK }) => dryBulbK < air.dryBulbK) : []),
    air,
  ];
  return {
    width,
    height,
    plot,
    saturation: pathOf(relativeHumidityCurve(frame, 1)),
    relativeHumidities,
    wetBulbs,
    dryBulbTicks: steps(low, high, step * spread).map((degrees) => ({
      x: x(degrees),
      y: plot.bottom,
      text: formatNumber(degrees, 0),
    })),
    humidityRatioTicks: y.ticks(spread === 2 ? 5 : 8).map((ratio) => ({
      x: plot.right,
      y: y(ratio),
      text: formatNumber(ratio, 0),
    })),
    state: {
      x: stateX,
      y: stateY,
      guides: `M${stateX},${plot.bottom}V${stateY}M${dewPointX},${stateY}H${plot.right}`,
      wetBulb: pathOf(towardsWetBulb),
    },
  };
}

const labelAt = ([x, y]: readonly [number, number], text: string): Label => ({ x, y, text });

const steps = (low: number, high: number, step: number): readonly number[] =>
  Array.from({ length: Math.floor((high - low) / step + 1e-9) + 1 }, (_, k) => low + k * step);
