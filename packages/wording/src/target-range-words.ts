import type { AwaitedCondition, TargetRange } from '@chargewright/engine';
import { formatShort, withUnit } from './format-value';
import { presentValue } from './present-value';
import type { UnitSystem } from './unit-system';

/** A range of conditions with a target, printed: whole degrees inside it, since its very edge is no place to measure. */
export interface TargetRangeWords {
  readonly along: AwaitedCondition;
  readonly low: string;
  readonly high: string;
  /** Which way the present condition has to go. */
  readonly go: 'up' | 'down' | 'nowhere';
  readonly at: { readonly condition: AwaitedCondition; readonly value: string } | null;
}

/** Rounding of the conversions, in degrees. */
const SLACK = 1e-6;

/** The ranges that hold at least one whole degree. */
export function targetRangeWords(ranges: readonly TargetRange[], system: UnitSystem): readonly TargetRangeWords[] {
  return ranges.flatMap(({ along, lowK, highK, presentK, at }) => {
    const [first, last] = [presentValue('temperatureK', lowK, system), presentValue('temperatureK', highK, system)];
    const low = Math.ceil(first.value - SLACK);
    const high = Math.floor(last.value + SLACK);
    if (low > high) return [];
    const go = presentK > highK ? 'down' : presentK < lowK ? 'up' : 'nowhere';
    const where = at && { condition: at.condition, value: formatShort('temperatureK', at.valueK, system) };
    return [{ along, low: `${low}`, high: withUnit(`${high}`, last.unit), go, at: where }];
  });
}
