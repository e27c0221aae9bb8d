/** At which conditions a chart has a target, inside a sentence. */
import type { AwaitedCondition } from '@chargewright/engine';
import type { TargetRangeWords } from '../target-range-words';

const PLACE: Readonly<Record<AwaitedCondition, string>> = {
  outdoorDryBulb: 'outdoors',
  returnWetBulb: 'wet bulb',
  returnDryBulb: 'return air',
};

const ADVICE: Readonly<Record<AwaitedCondition, Readonly<Record<'up' | 'down', string>>>> = {
  outdoorDryBulb: { up: 'come when it is warmer', down: 'come early or late, when it is cooler' },
  returnWetBulb: { up: 'when the house is more humid or warmer', down: 'when the house is drier or cooler' },
  returnDryBulb: { up: 'when the house is warmer', down: 'when the house is cooler' },
};

export function targetRangePhrase({ along, low, high, go, at }: TargetRangeWords): string {
  const where = at === null ? '' : `at ${at.value} ${PLACE[at.condition]} `;
  const advice = go === 'nowhere' ? '' : ` (${ADVICE[along][go]})`;
  return `${where}from ${low} to ${high} ${PLACE[along]}${advice}`;
}
