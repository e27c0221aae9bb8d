import { evaluateChebyshev } from '../src/numerics/chebyshev';
import type { ChebyshevSeries } from '../src/numerics/chebyshev';
import type { SaturationModel } from '../src/refrigerants/saturation-model';
import { curvePressurePa, curveTemperatureK, saturationCurve } from '../src/refrigerants/saturation-curve';
import type { SaturationCurve } from '../src/refrigerants/saturation-curve';
import { leastSquares } from './least-squares';
import type { SaturationState, SourceRefrigerant } from './saturation-source';

/** A tenth of what is promised (0.01 K): the curve then adds nothing to the error of the model. */
const AIM_K = 0.001;
const FEWEST_TERMS = 4;
const MOST_TERMS = 14;
/** T·ln p in kelvin: half of 1e-4 in each of 10 terms is below 1e-4 K of saturation temperature. */
const DIGITS = 4;
const DENSE_STEPS = 2000;
/** Two digits of T·ln p: a glide of 3e-5 K, so that solving to 1e-8 K never shows a dew point below the bubble point. */
const LEAST_DISTANCE_K = 2e-4;

/** Model of one refrigerant with the fewest terms that meet `AIM_K` on every state; throws when none does or the curves are not sound. */
export function fitSaturation(source: SourceRefrigerant): SaturationModel {
  const { states, criticalTemperatureK: tc } = source;
  const upper = Math.ceil(1000 * reduced(states[0]!.temperatureK, tc)) / 1000;
  const series = (coefficients: readonly number[]) => ({ lower: 0, upper, coefficients });
  const frame: Omit<SaturationModel, 'bubble' | 'dew'> = {
    kind: source.kind,
    grade: source.grade,
    criticalTemperatureK: tc,
    criticalPressurePa: Number(
      (source.criticalPressurePa ?? extrapolatedCriticalPressurePa(states, tc)).toPrecision(7),
    ),
    criticalPressureOrigin: source.criticalPressurePa === undefined ? 'bubble-curve-extrapolated' : 'equation-of-state',
    minTemperatureK: states[0]!.temperatureK,
    maxTemperatureK: states.at(-1)!.temperatureK,
  };

  const bubble = fewestTerms(source.id, (terms) => {
    const coefficients = fit(states, tc, upper, terms, (s) => s.temperatureK * Math.log(s.bubblePressurePa));
    const model = { ...frame, bubble: series(coefficients) };
    return {
      coefficients,
      errorK: largestErrorK(saturationCurve(model, model.bubble), states, (s) => s.bubblePressurePa),
    };
  });
  const model: SaturationModel = { ...frame, bubble: series(bubble) };
  if (source.kind === 'pure') return sound(source.id, model);

  // The dew curve is the fitted bubble curve less a fitted distance: two curves fitted apart would cross where a blend is nearly azeotropic.
  const dew = fewestTerms(source.id, (terms) => {
    const distance = apart(
      series(fit(states, tc, upper, terms, (s) => s.temperatureK * Math.log(s.bubblePressurePa / s.dewPressurePa))),
      reduced(frame.maxTemperatureK, tc),
    );
    const coefficients = Array.from({ length: Math.max(bubble.length, terms) }, (_, k) =>
      rounded((bubble[k] ?? 0) - (distance[k] ?? 0)),
    );
    return {
      coefficients,
      errorK: largestErrorK(saturationCurve(model, series(coefficients)), states, (s) => s.dewPressurePa),
    };
  });
  return sound(source.id, { ...model, dew: series(dew) });
}

/** Largest difference of saturation temperature between a curve and states, in kelvin, from the pressure difference and the curve's slope. */
export function largestErrorK(
  curve: SaturationCurve,
  states: readonly SaturationState[],
  pressure: (state: SaturationState) => number,
): number {
  return Math.max(
    ...states.map((state) => {
      const { temperatureK } = state;
      const step = temperatureK > (curve.minTemperatureK + curve.maxTemperatureK) / 2 ? -0.01 : 0.01;
      const here = Math.log(curvePressurePa(curve, temperatureK));
      const slope = (Math.log(curvePressurePa(curve, temperatureK + step)) - here) / step;
      return Math.abs((here - Math.log(pressure(state))) / slope);
    }),
  );
}

function reduced(temperatureK: number, criticalTemperatureK: number): number {
  return Math.sqrt(1 - temperatureK / criticalTemperatureK);
}

function rounded(value: number): number {
  return Number(value.toFixed(DIGITS));
}

/** Rounded Chebyshev coefficients of y(s) on [0, upper], each state weighted so that equal residuals are equal temperatures. */
function fit(
  states: readonly SaturationState[],
  tc: number,
  upper: number,
  terms: number,
  y: (state: SaturationState) => number,
): number[] {
  const weights = states.map((state, k) => {
    const a = states[Math.max(k - 1, 0)]!;
    const b = states[Math.min(k + 1, states.length - 1)]!;
    const slope = Math.log(b.bubblePressurePa / a.bubblePressurePa) / (b.temperatureK - a.temperatureK);
    return 1 / (state.temperatureK * slope);
  });
  const rows = states.map((state, k) => {
    const t = (2 * reduced(state.temperatureK, tc)) / upper - 1;
    return Array.from({ length: terms }, (_, j) => Math.cos(j * Math.acos(t)) * weights[k]!);
  });
  return leastSquares(
    rows,
    states.map((state, k) => y(state) * weights[k]!),
  ).map(rounded);
}

/** Distance raised just enough to stay positive: at an azeotrope it touches zero and a fit dips below it, by far less than `AIM_K`. */
function apart(distance: ChebyshevSeries, from: number): number[] {
  const { upper, coefficients } = distance;
  let least = Infinity;
  for (let k = 0; k <= DENSE_STEPS; k++) {
    least = Math.min(least, evaluateChebyshev(distance, from + ((upper - from) * k) / DENSE_STEPS)[0]);
  }
  const [mean = 0, ...rest] = coefficients;
  return [rounded(mean + Math.max(0, LEAST_DISTANCE_K - least)), ...rest];
}

function fewestTerms(id: string, attempt: (terms: number) => { coefficients: number[]; errorK: number }): number[] {
  for (let terms = FEWEST_TERMS; terms <= MOST_TERMS; terms++) {
    const { coefficients, errorK } = attempt(terms);
    if (errorK <= AIM_K) return coefficients;
  }
  throw new Error(`${id}: no fit with ${MOST_TERMS} terms within ${AIM_K} K`);
}

/** ln p as a parabola in T through the last three bubble points, at Tc: see `CriticalPressureOrigin` for how good that is. */
export function extrapolatedCriticalPressurePa(
  states: readonly SaturationState[],
  criticalTemperatureK: number,
): number {
  const last = states.slice(-3);
  const lnPressure = last.reduce((sum, point) => {
    const others = last.filter((other) => other !== point);
    const weight = others.reduce(
      (product, other) =>
        (product * (criticalTemperatureK - other.temperatureK)) / (point.temperatureK - other.temperatureK),
      1,
    );
    return sum + weight * Math.log(point.bubblePressurePa);
  }, 0);
  return Number(Math.exp(lnPressure).toPrecision(4));
}

/** Rising everywhere, dew temperature never below bubble temperature, ends found again: else there is nothing to commit. */
function sound(id: string, model: SaturationModel): SaturationModel {
  const bubble = saturationCurve(model, model.bubble);
  const dew = saturationCurve(model, model.dew ?? model.bubble);
  let before = { bubble: 0, dew: 0 };
  for (let k = 0; k <= DENSE_STEPS; k++) {
    const share = k / DENSE_STEPS;
    const temperatureK =
      k === DENSE_STEPS ? model.maxTemperatureK : model.minTemperatureK * (1 - share) + model.maxTemperatureK * share;
    const now = { bubble: curvePressurePa(bubble, temperatureK), dew: curvePressurePa(dew, temperatureK) };
    if (!(now.bubble > before.bubble && now.dew > before.dew))
      throw new Error(`${id}: not rising at ${temperatureK} K`);
    if (now.dew > now.bubble) throw new Error(`${id}: dew pressure above bubble pressure at ${temperatureK} K`);
    if (Math.abs(curveTemperatureK(dew, now.dew) - temperatureK) > 1e-8)
      throw new Error(`${id}: inverse off at ${temperatureK} K`);
    before = now;
  }
  return model;
}
