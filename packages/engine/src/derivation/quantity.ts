import type { EngineError } from '../errors';
import type { Formula } from './formula';

/** What a number is, so that it can be printed in any unit system. The suffix is its unit inside the engine. */
export type QuantityKind =
  | 'temperatureK'
  | 'differenceK'
  | 'pressurePa'
  | 'pressureDifferencePa'
  | 'gaugePressurePa'
  | 'fraction'
  | 'humidityRatio'
  | 'enthalpyJPerKg'
  | 'specificVolumeM3PerKg'
  | 'flowM3PerS'
  | 'powerW'
  | 'massKg'
  | 'lengthM'
  | 'voltageV'
  | 'currentA'
  | 'electricPowerW'
  | 'heatRateW'
  | 'durationS'
  | 'gasVolumeM3'
  | 'heatingValueJPerM3'
  | 'staticPressurePa'
  | 'densityKgPerM3'
  | 'specificHeatJPerKgK'
  | 'enthalpyDifferenceJPerKg'
  | 'massFlowKgPerS'
  | 'flowPerCapacityM3PerSPerW'
  | 'chargeRateKgPerM'
  | 'minutes'
  | 'days'
  | 'count';

/**
 * One source of uncertainty. Parts with the same `key` are the same unknown error (one instrument, one model): they are fully correlated.
 * `shape` matters only to a Monte Carlo replay.
 */
export interface ErrorPart {
  readonly key: string;
  /** Standard uncertainty, in the unit of the value it belongs to. */
  readonly u: number;
  readonly shape: 'rectangular' | 'normal';
}

export type LeafOrigin = 'reading' | 'entered' | 'constant';

export interface LeafStep {
  readonly type: 'leaf';
  readonly id: string;
  readonly origin: LeafOrigin;
  readonly parts: readonly ErrorPart[];
}

export interface DerivedStep {
  readonly type: 'derived';
  readonly formula: Formula;
  readonly from: Readonly<Record<string, Known>>;
  /** Errors of the formula itself (property model, rounding of a printed chart), added to its result. */
  readonly parts: readonly ErrorPart[];
}

/** A number with its standard uncertainty, where each part of it comes from, and how it was derived. */
export interface Known {
  readonly state: 'known';
  readonly kind: QuantityKind;
  readonly value: number;
  /** Combined standard uncertainty (JCGM 100:2008, eq. 10 and 13), in the unit of `value`. */
  readonly u: number;
  /** Signed contribution to `u` by error key: slope × standard uncertainty. */
  readonly contributions: ReadonlyMap<string, number>;
  /** By how much the mean of the possible values lies off `value`, where a formula bends within ±u: second order, in the unit of `value`. */
  readonly meanShift: number;
  readonly step: LeafStep | DerivedStep;
}

/** Nothing was given: lists the inputs that are missing. */
export interface Missing {
  readonly state: 'missing';
  readonly inputs: readonly string[];
}

/** Physics or a table refuses an answer for the given inputs. */
export interface Refused {
  readonly state: 'refused';
  readonly error: EngineError;
  /** The value where there is one, though its uncertainty reaches beyond what has an answer on both sides: it judges nothing, but it gates. */
  readonly value?: number;
}

export type Quantity = Known | Missing | Refused;

/** Coverage factor of the expanded uncertainty U = k·u (JCGM 100:2008, 6.2: about 95 % for a normal distribution). */
export const COVERAGE_FACTOR = 2;

/** Expanded uncertainty U, k = 2. */
export const expandedUncertainty = (quantity: Known): number => COVERAGE_FACTOR * quantity.u;

export const missing = (...inputs: readonly string[]): Missing => ({ state: 'missing', inputs });

export const isKnown = (quantity: Quantity | null | undefined): quantity is Known => quantity?.state === 'known';

/** The bare value, with or without an uncertainty to it, or `undefined`: gates act on it, so that a poorer instrument never opens one. */
export const bareValue = (quantity: Quantity): number | undefined =>
  quantity.state === 'missing' ? undefined : quantity.value;

const addInQuadrature = (contributions: ReadonlyMap<string, number>): number => {
  let sum = 0;
  for (const c of contributions.values()) sum += c * c;
  return Math.sqrt(sum);
};

/** A value as it enters: a reading, an entered target, a constant of the site. Parts are in the unit of the value. */
export function leaf(input: {
  readonly id: string;
  readonly kind: QuantityKind;
  readonly value: number;
  readonly origin: LeafOrigin;
  readonly parts?: readonly ErrorPart[];
}): Known {
  const { id, kind, value, origin, parts = [] } = input;
  if (!Number.isFinite(value)) throw new RangeError(`leaf ${id}: value ${value} is not finite`);
  return known({ kind, value, contributions: new Map(), step: { type: 'leaf', id, origin, parts }, parts });
}

/** Assembles a known quantity: the parts of its own step join the contributions that came through its inputs. */
export function known(input: {
  readonly kind: QuantityKind;
  readonly value: number;
  readonly contributions: Map<string, number>;
  readonly meanShift?: number;
  readonly step: LeafStep | DerivedStep;
  readonly parts: readonly ErrorPart[];
}): Known {
  const { kind, value, contributions, meanShift = 0, step, parts } = input;
  for (const { key, u } of parts) contributions.set(key, (contributions.get(key) ?? 0) + u);
  return { state: 'known', kind, value, u: addInQuadrature(contributions), contributions, meanShift, step };
}

/** Covariance of two results that share error sources (JCGM 102:2011, 6.2: Σ of the products of their contributions). */
export function covariance(a: Known, b: Known): number {
  let sum = 0;
  for (const [key, c] of a.contributions) sum += c * (b.contributions.get(key) ?? 0);
  return sum;
}
