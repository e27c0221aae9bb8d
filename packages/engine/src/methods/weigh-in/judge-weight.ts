/** Weighed against required: by the rule after rounding, and by what scale and rate can tell apart. */
import type { Known } from '../../derivation/quantity';
import { expandedUncertainty } from '../../derivation/quantity';
import { WEIGH_IN_FIGURES } from './data/weigh-in-figures';
import type { WeighInFinding } from './weigh-in-codes';

export interface Scale {
  /** Smallest step it shows, kg. */
  readonly resolutionKg: number;
  /** Its ±, kg, as a limit. */
  readonly limitKg: number;
}

/** `simple`: the rule alone; `guarded`: the finding also knows what the scale and the rate cannot tell. */
export type WeighInDecision = 'simple' | 'guarded';

export interface WeightJudgement {
  readonly requiredRoundedKg: number;
  readonly actualRoundedKg: number;
  readonly byRule: 'passes' | 'fails';
  readonly finding: Extract<WeighInFinding, 'within' | 'above' | 'below' | 'too-close-to-call'>;
}

/** Rounding of kilograms, far below any scale. */
const SLACK_KG = 1e-9;

/** To the nearest step; half a step goes up. The slack keeps 102.25 oz, back from kilograms, on the side it was written on. */
export const roundToStepKg = (kg: number, stepKg: number): number =>
  stepKg > 0 ? Math.floor((kg + SLACK_KG) / stepKg + 0.5) * stepKg : kg;

export const isCoarse = ({ resolutionKg, limitKg }: Scale): boolean =>
  Math.max(resolutionKg, limitKg) > WEIGH_IN_FIGURES.wantedScaleKg.value + SLACK_KG;

/**
 * The rule of CEC 2019: required = actual. It codes no tolerance, so both are rounded to the scale's step first.
 * Guarded: *within* where they differ by no more than the scale can show (its step, or its U); *too close to call* where they differ by less than the U of the
 * difference, the rate's included, or where the scale is coarser than wanted in the field; else *above* or *below*.
 */
export function judgeWeight(input: {
  readonly required: Known;
  readonly actual: Known;
  readonly difference: Known;
  readonly scale: Scale;
  readonly decision: WeighInDecision;
}): WeightJudgement {
  const { required, actual, difference, scale, decision } = input;
  const requiredRoundedKg = roundToStepKg(required.value, scale.resolutionKg);
  const actualRoundedKg = roundToStepKg(actual.value, scale.resolutionKg);
  const passes = Math.abs(requiredRoundedKg - actualRoundedKg) <= SLACK_KG;
  const byRule = passes ? 'passes' : 'fails';
  const side = difference.value > 0 ? 'above' : 'below';
  const rounded = { requiredRoundedKg, actualRoundedKg, byRule } as const;
  if (decision === 'simple') return { ...rounded, finding: passes ? 'within' : side };
  const apart = Math.abs(difference.value);
  const scaleShowsKg = Math.max(scale.resolutionKg, expandedUncertainty(actual));
  if (!isCoarse(scale) && apart <= scaleShowsKg + SLACK_KG) return { ...rounded, finding: 'within' };
  const untoldKg = Math.max(scaleShowsKg, expandedUncertainty(difference));
  return { ...rounded, finding: apart <= untoldKg + SLACK_KG ? 'too-close-to-call' : side };
}
