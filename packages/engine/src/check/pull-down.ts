/** A house still being pulled down: its readings wander, so two sets five minutes apart must agree before either counts. */
import { isKnown } from '../derivation/quantity';
import type { Quantity } from '../derivation/quantity';
import { differenceToK, temperatureToK } from '../units';
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

/** True while the house is warm, was off for hours and humid, or the earlier readings differ, and no agreeing second set exists. */
export function isPullDown(input: CheckInput): boolean {
  const agreement = agreesWithEarlier(input);
  if (agreement !== null) return !agreement;
  const { readings, visit } = input;
  const warm = (readings.returnDryBulb?.quantity.value ?? 0) > WARM_RETURN_K;
  return warm || (visit.hoursOff >= LONG_OFF_HOURS && isHumid(input));
}

function isHumid({ setup, readings }: CheckInput): boolean {
  const { returnRelativeHumidity } = deriveQuantities(setup, readings);
  return isKnown(returnRelativeHumidity) && returnRelativeHumidity.value > HUMID;
}

/** `null` without an earlier set far enough back that shares a quantity with this one. */
function agreesWithEarlier({ setup, readings, visit }: CheckInput): boolean | null {
  const { earlier } = visit;
  if (earlier === undefined || earlier.minutesAgo < LEAST_MINUTES_APART) return null;
  const now = deriveQuantities(setup, readings);
  const before = deriveQuantities(setup, earlier.readings);
  const moved = [
    [now.returnWetBulb, before.returnWetBulb, STEADY_WET_BULB_K],
    [readings.returnDryBulb?.quantity, earlier.readings.returnDryBulb?.quantity, STEADY_K],
    [now.superheat, before.superheat, STEADY_K],
    [now.subcooling, before.subcooling, STEADY_K],
  ] as const;
  const compared = moved.flatMap(([a, b, most]) => comparison(a, b, most));
  return compared.length === 0 ? null : compared.every((steady) => steady);
}

const comparison = (a: Quantity | undefined, b: Quantity | undefined, most: number): readonly boolean[] =>
  isKnown(a) && isKnown(b) ? [Math.abs(a.value - b.value) <= most] : [];
