/** A house still being pulled down: its readings wander, so two sets five minutes apart must agree before either counts. */
import { isKnown } from '../derivation/quantity';
import type { Quantity } from '../derivation/quantity';
import { differenceToK, temperatureToK } from '../units';
import { LIMIT_SLACK_K } from './conformance';
import type { DerivedQuantities } from './derived-quantities';
import { deriveQuantities } from './derived-quantities';
import type { CheckInput } from './input';

/** Warmer return air than a settled house has (practice, no source). */
const WARM_RETURN_K = temperatureToK(80, 'degF');
/** Off for this long, a humid house has taken up moisture (choice). */
const LONG_OFF_HOURS = 2;
const HUMID = 0.6;
/** Two sets are apart enough to tell a trend (practice). */
const LEAST_MINUTES_APART = 5;
/** Two sets agree when nothing has moved by more than this (choice). */
const STEADY_WET_BULB_K = differenceToK(0.5, 'deltaF');
const STEADY_K = differenceToK(1, 'deltaF');

/** True while readings still move, or the house is warm or was off for hours and humid and no agreeing second set has shown that they do not. */
export function isPullDown(input: CheckInput, derived: DerivedQuantities): boolean {
  const { readings, visit } = input;
  const trend = trendSinceEarlier(input, derived);
  if (trend !== 'unknown') return trend === 'moving';
  const warm = (readings.returnDryBulb?.quantity.value ?? 0) > WARM_RETURN_K;
  return warm || (visit.hoursOff >= LONG_OFF_HOURS && isHumid(derived));
}

const isHumid = ({ returnRelativeHumidity }: DerivedQuantities): boolean =>
  isKnown(returnRelativeHumidity) && returnRelativeHumidity.value > HUMID;

/** A move shows at once; to be steady, all that is read now must have been read far enough back too. */
function trendSinceEarlier(
  { setup, readings, visit }: CheckInput,
  now: DerivedQuantities,
): 'moving' | 'steady' | 'unknown' {
  const { earlier } = visit;
  if (earlier === undefined) return 'unknown';
  const before = deriveQuantities(setup, earlier.readings);
  const pairs = [
    [now.returnWetBulb, before.returnWetBulb, STEADY_WET_BULB_K],
    [readings.returnDryBulb?.quantity, earlier.readings.returnDryBulb?.quantity, STEADY_K],
    [now.temperatureSplit, before.temperatureSplit, STEADY_K],
    [now.superheat, before.superheat, STEADY_K],
    [now.subcooling, before.subcooling, STEADY_K],
  ] as const;
  const read = pairs.filter(([value]) => isKnown(value));
  const trends = read.map(([value, previous, most]) => trendOf(value, previous, most));
  if (trends.includes('moving')) return 'moving';
  const proven = trends.length > 0 && !trends.includes('unknown') && earlier.minutesAgo >= LEAST_MINUTES_APART;
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
