/**
 * Saturation of every refrigerant offered: bubble point (saturated liquid of the charged composition) and dew point (saturated vapour of it).
 * Curves through tables of published equations of state; a blend is the component mixture model, not a pseudo-pure fluid.
 * Valid from −50 °C to 0.99 of the critical temperature, within 0.002 K of the tables. The models themselves differ from printed
 * charts by up to 0.8 °F (R-410A) and 1.2 °F (R-407C, bubble).
 *
 * All functions throw `EngineError` `out-of-range`: reason `outside-curve` below the curve or between its end and the critical point,
 * `above-critical` beyond that, `not-a-number` for NaN. `refrigerantModel` names the publications.
 */
import type { RefrigerantId } from './generated/saturation-curves';
import { SATURATION_MODELS } from './generated/saturation-curves';
import { curvePressurePa, curveTemperatureK, saturationCurve } from './saturation-curve';
import type { SaturationCurve } from './saturation-curve';

export interface TemperatureQuery {
  readonly refrigerant: RefrigerantId;
  readonly temperatureK: number;
}

export interface PressureQuery {
  readonly refrigerant: RefrigerantId;
  /** Absolute. */
  readonly pressurePa: number;
}

/** Where the curves answer. A blend's dew curve has lower pressures than its bubble curve at the same two temperatures. */
export interface SaturationRange {
  readonly minTemperatureK: number;
  readonly maxTemperatureK: number;
  readonly minBubblePressurePa: number;
  readonly maxBubblePressurePa: number;
  readonly minDewPressurePa: number;
  readonly maxDewPressurePa: number;
  readonly criticalTemperatureK: number;
  readonly criticalPressurePa: number;
}

interface CurvePair {
  readonly bubble: SaturationCurve;
  readonly dew: SaturationCurve;
}

/** The ends of a curve take four evaluations; a page asks for one or two refrigerants and many points. */
const ready = new Map<RefrigerantId, CurvePair>();

function curves(refrigerant: RefrigerantId): CurvePair {
  const known = ready.get(refrigerant);
  if (known !== undefined) return known;
  const model = SATURATION_MODELS[refrigerant];
  const bubble = saturationCurve(model, model.bubble);
  const pair = { bubble, dew: model.dew === undefined ? bubble : saturationCurve(model, model.dew) };
  ready.set(refrigerant, pair);
  return pair;
}

/** Absolute pressure (Pa) at which liquid of this temperature (K) begins to boil. R-22 at 40 °F, `{ refrigerant: 'R-22', temperatureK: 277.594 }`: 574 kPa. */
export function bubblePressurePa({ refrigerant, temperatureK }: TemperatureQuery): number {
  return curvePressurePa(curves(refrigerant).bubble, temperatureK);
}

/** Absolute pressure (Pa) at which vapour of this temperature (K) begins to condense; the bubble pressure for a pure fluid. */
export function dewPressurePa({ refrigerant, temperatureK }: TemperatureQuery): number {
  return curvePressurePa(curves(refrigerant).dew, temperatureK);
}

/** Temperature (K) at which liquid of this absolute pressure (Pa) begins to boil: what subcooling counts from. */
export function bubbleTemperatureK({ refrigerant, pressurePa }: PressureQuery): number {
  return curveTemperatureK(curves(refrigerant).bubble, pressurePa);
}

/** Temperature (K) at which vapour of this absolute pressure (Pa) begins to condense: what superheat counts from. */
export function dewTemperatureK({ refrigerant, pressurePa }: PressureQuery): number {
  return curveTemperatureK(curves(refrigerant).dew, pressurePa);
}

/** Dew temperature less bubble temperature (K) at one absolute pressure (Pa); exactly 0 for a pure fluid, never negative. */
export function glideK(query: PressureQuery): number {
  return dewTemperatureK(query) - bubbleTemperatureK(query);
}

/** Ends of the two curves and the critical point (K, Pa). How the critical pressure of a blend is known: `refrigerantFacts`. */
export function saturationRange(refrigerant: RefrigerantId): SaturationRange {
  const { bubble, dew } = curves(refrigerant);
  return {
    minTemperatureK: bubble.minTemperatureK,
    maxTemperatureK: bubble.maxTemperatureK,
    minBubblePressurePa: bubble.minPressurePa,
    maxBubblePressurePa: bubble.maxPressurePa,
    minDewPressurePa: dew.minPressurePa,
    maxDewPressurePa: dew.maxPressurePa,
    criticalTemperatureK: bubble.criticalTemperatureK,
    criticalPressurePa: bubble.criticalPressurePa,
  };
}
