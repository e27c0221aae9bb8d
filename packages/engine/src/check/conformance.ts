/** From a deviation and its uncertainty to a finding: by the rule, and by the probability that the true value conforms (JCGM 106:2012). */
import type { Known } from '../derivation/quantity';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { Finding } from './codes';
import type { Tolerance } from './result';

/** Limits are inclusive; 31 of 200 deviations of exactly 5 °F come out above it in doubles of kelvin. */
export const LIMIT_SLACK_K = 1e-9;

export interface Conformance {
  readonly byRule: 'passes' | 'fails';
  readonly probabilityWithin: number;
  readonly finding: Extract<Finding, 'within' | 'above' | 'below' | 'too-close-to-call'>;
}

/**
 * Guarded decision: *within* at probability `guard` or more, outside at `1 − guard` or less, between them too close to call. Outside also needs
 * the other side to be as improbable: an instrument too poor to tell the sides apart finds neither.
 * `probabilityOfNoTarget` counts as not within.
 */
export function judgeConformance(input: {
  readonly measured: Known;
  readonly tolerance: Tolerance;
  readonly guard: number;
  readonly probabilityOfNoTarget?: number;
}): Conformance {
  const { measured, tolerance, guard, probabilityOfNoTarget = 0 } = input;
  const low = tolerance.low ?? -Infinity;
  const high = tolerance.high ?? Infinity;
  const { value, u, meanShift } = measured;
  const mean = value + meanShift;
  const [from, to] = [low - LIMIT_SLACK_K, high + LIMIT_SLACK_K];
  const passes = value >= from && value <= to;
  const inside = probabilityBetween(mean, u, from, to);
  const probabilityWithin = inside * (1 - probabilityOfNoTarget);
  const byRule = passes ? 'passes' : 'fails';
  // a kink may move the mean inwards as the uncertainty grows: what only that brings inside is not called within
  const withoutShift = probabilityBetween(value, u, from, to) * (1 - probabilityOfNoTarget);
  if (Math.min(probabilityWithin, withoutShift) >= guard) return { byRule, probabilityWithin, finding: 'within' };
  // only the deviation can be outside: a doubtful target is not a deviation
  if (inside <= 1 - guard) {
    if (probabilityBetween(mean, u, -Infinity, from) <= 1 - guard)
      return { byRule, probabilityWithin, finding: 'above' };
    if (probabilityBetween(mean, u, to, Infinity) <= 1 - guard) return { byRule, probabilityWithin, finding: 'below' };
  }
  return { byRule, probabilityWithin, finding: 'too-close-to-call' };
}
