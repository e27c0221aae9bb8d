/** A house still being pulled down: its readings wander, so two sets five minutes apart must agree before either counts. */
import { isKnown } from '../derivation/quantity';
import type { Quantity } from '../derivation/quantity';
import { COMMON_PRACTICE, OUR_CHOICE } from '../methods/sourced-figure';
import { LIMIT_SLACK_K } from './conformance';
import type { DerivedQuantities } from './derived-quantities';
import { deriveQuantities } from './derived-quantities';
import type { CheckInput } from './input';
import { differenceRule, plainRule, temperatureRule } from './procedure';

export const PULL_DOWN_FIGURES = {
  /** Warmer return air than a settled house has. */
  warmReturnK: temperatureRule(80, 'degF', ['practice', COMMON_PRACTICE]),
  /** Off for this long, a humid house has taken up moisture. */
  longOffHours: plainRule(2, '2 h', ['choice', OUR_CHOICE]),
  humid: plainRule(0.6, '60 %', ['choice', OUR_CHOICE]),
  /** Two sets are apart enough to tell a trend. */
  leastMinutesApart: plainRule(5, '5 min', ['practice', COMMON_PRACTICE]),
  /** Two sets agree when nothing has moved by more than this. */
  steadyWetBulbK: differenceRule(0.5, 'deltaF', ['choice', OUR_CHOICE]),
  steadyK: differenceRule(1, 'deltaF', ['choice', OUR_CHOICE]),
} as const;

/** True while readings still move, or the house is warm or was off for hours and humid and no agreeing second set has shown that they do not. */
export function isPullDown(input: CheckInput, derived: DerivedQuantities): boolean {
  const { readings, visit } = input;
  const trend = trendSinceEarlier(input, derived);
  if (trend !== 'unknown') return trend === 'moving';
  const warm = (readings.returnDryBulb?.quantity.value ?? 0) > PULL_DOWN_FIGURES.warmReturnK.value;
  return warm || (visit.hoursOff >= PULL_DOWN_FIGURES.longOffHours.value && isHumid(derived));
}

const isHumid = ({ returnRelativeHumidity }: DerivedQuantities): boolean =>
  isKnown(returnRelativeHumidity) && returnRelativeHumidity.value > PULL_DOWN_FIGURES.humid.value;

/** A move shows at once; to be steady, all that is read now must have been read far enough back too. */
function trendSinceEarlier(
  { setup, readings, visit }: CheckInput,
  now: DerivedQuantities,
): 'moving' | 'steady' | 'unknown' {
  const { earlier } = visit;
  if (earlier === undefined) return 'unknown';
  const before = deriveQuantities(setup, earlier.readings);
  const pairs = [
    [now.returnWetBulb, before.returnWetBulb, PULL_DOWN_FIGURES.steadyWetBulbK.value],
    [readings.returnDryBulb?.quantity, earlier.readings.returnDryBulb?.quantity, PULL_DOWN_FIGURES.steadyK.value],
    [now.temperatureSplit, before.temperatureSplit, PULL_DOWN_FIGURES.steadyK.value],
    [now.superheat, before.superheat, PULL_DOWN_FIGURES.steadyK.value],
    [now.subcooling, before.subcooling, PULL_DOWN_FIGURES.steadyK.value],
  ] as const;
  const read = pairs.filter(([value]) => isKnown(value));
  const trends = read.map(([value, previous, most]) => trendOf(value, previous, most));
  if (trends.includes('moving')) return 'moving';
  const proven =
    trends.length > 0 && !trends.includes('unknown') && earlier.minutesAgo >= PULL_DOWN_FIGURES.leastMinutesApart.value;
  return proven ? 'steady' : 'unknown';
}

function trendOf(
  now: Quantity | undefined,
  before: Quantity | undefined,
  most: number,
): 'moving' | 'steady' | 'unknown' {
  if (!isKnown(now) || !isKnown(before)) return 'unknown';
  return Math.abs(now.value - before.value) <= most + LIMIT_SLACK_K ? 'steady' : 'moving';
}
