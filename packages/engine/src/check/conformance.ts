/** From a deviation and its uncertainty to a finding: by the rule, and by the probability that the true value conforms (JCGM 106:2012). */
import type { Known } from '../derivation/quantity';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { Finding } from './codes';
import type { Decision } from './procedure';
import type { Tolerance } from './result';

/** Limits are inclusive; 31 of 200 deviations of exactly 5 °F come out above it in doubles of kelvin. */
export const LIMIT_SLACK_K = 1e-9;
/** The same for pressures, of which a million is a usual number. */
const LIMIT_SLACK_PA = 1e-3;

const slackOf = ({ kind }: Known): number => (kind === 'pressureDifferencePa' ? LIMIT_SLACK_PA : LIMIT_SLACK_K);

export interface Conformance {
  readonly byRule: 'passes' | 'fails';
  readonly probabilityWithin: number;
  /** A simple decision whose certainty is below `clearFrom`. */
  readonly onlyJust: boolean;
  readonly finding: Extract<Finding, 'within' | 'above' | 'below' | 'too-close-to-call'>;
}

/**
 * Simple decision: by the rule, with the certainty beside it. Guarded decision: *within* at the probability `clearFrom` or more, outside at its
 * complement or less, between them too close to call; outside also needs the other side to be as improbable, so that an instrument too poor to tell
 * the sides apart finds neither. `probabilityOfNoTarget` counts as not within, and never as outside.
 */
export function judgeConformance(input: {
  readonly measured: Known;
  readonly tolerance: Tolerance;
  readonly decision: Decision;
  readonly probabilityOfNoTarget?: number;
}): Conformance {
  const { measured, tolerance, decision, probabilityOfNoTarget = 0 } = input;
  const guard = decision.clearFrom.value;
  const low = tolerance.low ?? -Infinity;
  const high = tolerance.high ?? Infinity;
  const { value, u, meanShift } = measured;
  const mean = value + meanShift;
  const slack = slackOf(measured);
  const [from, to] = [low - slack, high + slack];
  const passes = value >= from && value <= to;
  const inside = probabilityBetween(mean, u, from, to);
  const probabilityWithin = inside * (1 - probabilityOfNoTarget);
  const byRule = passes ? 'passes' : 'fails';
  if (decision.type === 'simple') {
    const outside = value > to ? 'above' : 'below';
    const certainty = passes ? probabilityWithin : 1 - inside;
    return { byRule, probabilityWithin, onlyJust: certainty < guard, finding: passes ? 'within' : outside };
  }
  const numbers = { byRule, probabilityWithin, onlyJust: false } as const;
  // a kink may move the mean inwards as the uncertainty grows: what only that brings inside is not called within
  const withoutShift = probabilityBetween(value, u, from, to) * (1 - probabilityOfNoTarget);
  if (Math.min(probabilityWithin, withoutShift) >= guard) return { ...numbers, finding: 'within' };
  // only the deviation can be outside: a doubtful target is not a deviation
  if (inside <= 1 - guard) {
    if (probabilityBetween(mean, u, -Infinity, from) <= 1 - guard) return { ...numbers, finding: 'above' };
    if (probabilityBetween(mean, u, to, Infinity) <= 1 - guard) return { ...numbers, finding: 'below' };
  }
  return { ...numbers, finding: 'too-close-to-call' };
}
