import { EngineError } from '../errors';
import type { ChebyshevSeries } from '../numerics/chebyshev';
import { evaluateChebyshev } from '../numerics/chebyshev';
import type { SaturationModel } from './saturation-model';

/** One curve, bubble or dew, ready for use: the model's series and what follows from it at the two ends. */
export interface SaturationCurve {
  readonly series: ChebyshevSeries;
  readonly criticalTemperatureK: number;
  readonly criticalPressurePa: number;
  readonly minTemperatureK: number;
  readonly maxTemperatureK: number;
  readonly minPressurePa: number;
  readonly maxPressurePa: number;
  readonly lnMinPressure: number;
  readonly startsPerLnPressure: number;
  /** 1/T at equal steps of ln p from end to end; straight lines between them start Newton so near that one step usually is enough. */
  readonly startsPerK: Float64Array;
}

const START_INTERVALS = 128;

/**
 * The error after Newton's step δ is κ·δ², in temperature, with κ up to 0.015 per kelvin (0.99 Tc of the widest blends) and 1e-4 elsewhere:
 * after a last step of 2e-9 in 1/T, which is 4e-4 K at most, less than 3e-9 K is left.
 */
const LAST_STEP_PER_K = 2e-9;

/** One is usual with a near start, three from the chord of the whole curve. */
const MOST_STEPS = 10;

/** ln p and its slope against u = 1/T. From T·ln p = C(s), s = √(1 − T/Tc): d ln p/du = C + T·C′/(2·Tc·s). */
function lnPressure(
  series: ChebyshevSeries,
  criticalTemperatureK: number,
  u: number,
): readonly [value: number, slope: number] {
  const temperatureK = 1 / u;
  const s = Math.sqrt(1 - temperatureK / criticalTemperatureK);
  const [value, slope] = evaluateChebyshev(series, s);
  return [value * u, value + (temperatureK * slope) / (2 * criticalTemperatureK * s)];
}

/** One of the model's two series as a curve. */
export function saturationCurve(model: SaturationModel, series: ChebyshevSeries): SaturationCurve {
  const { criticalTemperatureK, criticalPressurePa, minTemperatureK, maxTemperatureK } = model;
  const [lnMin] = lnPressure(series, criticalTemperatureK, 1 / minTemperatureK);
  const [lnMax] = lnPressure(series, criticalTemperatureK, 1 / maxTemperatureK);
  const startsPerK = new Float64Array(START_INTERVALS + 1);
  startsPerK[0] = 1 / minTemperatureK;
  startsPerK[START_INTERVALS] = 1 / maxTemperatureK;
  for (let k = 1; k < START_INTERVALS; k++) {
    const share = k / START_INTERVALS;
    const chord = (1 - share) / minTemperatureK + share / maxTemperatureK;
    startsPerK[k] = reciprocalTemperature(series, criticalTemperatureK, lnMin + share * (lnMax - lnMin), chord);
  }
  return {
    series,
    criticalTemperatureK,
    criticalPressurePa,
    minTemperatureK,
    maxTemperatureK,
    minPressurePa: Math.exp(lnMin),
    maxPressurePa: Math.exp(lnMax),
    lnMinPressure: lnMin,
    startsPerLnPressure: START_INTERVALS / (lnMax - lnMin),
    startsPerK,
  };
}

/** Pressure on the curve. Throws `EngineError` `out-of-range` outside `minTemperatureK` to `maxTemperatureK`. */
export function curvePressurePa(curve: SaturationCurve, temperatureK: number): number {
  const { minTemperatureK, maxTemperatureK, criticalTemperatureK, minPressurePa, maxPressurePa } = curve;
  if (!(temperatureK >= minTemperatureK && temperatureK <= maxTemperatureK))
    throw refusal('temperatureK', temperatureK, minTemperatureK, maxTemperatureK, criticalTemperatureK);
  const pressurePa = Math.exp(lnPressure(curve.series, criticalTemperatureK, 1 / temperatureK)[0]);
  return withoutRounding(pressurePa, minPressurePa, maxPressurePa);
}

/** Inverse of `curvePressurePa`, to 1e-8 K. Throws `EngineError` `out-of-range` outside `minPressurePa` to `maxPressurePa`. */
export function curveTemperatureK(curve: SaturationCurve, pressurePa: number): number {
  const { series, minTemperatureK, maxTemperatureK, criticalTemperatureK, minPressurePa, maxPressurePa } = curve;
  if (!(pressurePa >= minPressurePa && pressurePa <= maxPressurePa))
    throw refusal('pressurePa', pressurePa, minPressurePa, maxPressurePa, curve.criticalPressurePa);
  const wanted = Math.log(pressurePa);
  const place = (wanted - curve.lnMinPressure) * curve.startsPerLnPressure;
  const k = Math.min(Math.max(Math.floor(place), 0), START_INTERVALS - 1);
  const below = curve.startsPerK[k]!;
  const start = below + (place - k) * (curve.startsPerK[k + 1]! - below);
  const temperatureK = 1 / reciprocalTemperature(series, criticalTemperatureK, wanted, start);
  return withoutRounding(temperatureK, minTemperatureK, maxTemperatureK);
}

/**
 * 1/T at which ln p is `wanted`, by Newton without the bracket and its options, which would cost as much again at every call; here the curve is known to rise and to be nearly straight in 1/T, which the generator checks densely.
 */
function reciprocalTemperature(
  series: ChebyshevSeries,
  criticalTemperatureK: number,
  wanted: number,
  start: number,
): number {
  let u = start;
  for (let k = 0; k < MOST_STEPS; k++) {
    const [value, slope] = lnPressure(series, criticalTemperatureK, u);
    const step = (value - wanted) / slope;
    u -= step;
    if (Math.abs(step) <= LAST_STEP_PER_K) return u;
  }
  throw new EngineError('no-convergence', {
    quantity: 'pressurePa',
    value: Math.exp(wanted),
    reason: 'newton-steps-exhausted',
  });
}

/** The argument was inside, so only the last digits of a result can be outside the ends: without this they would not survive a round trip. */
function withoutRounding(value: number, min: number, max: number): number {
  return Math.min(Math.max(value, min), max);
}

function refusal(quantity: string, value: number, min: number, max: number, critical: number): EngineError {
  const reason = Number.isNaN(value) ? 'not-a-number' : value > critical ? 'above-critical' : 'outside-curve';
  return new EngineError('out-of-range', { quantity, value, min, max, reason });
}
