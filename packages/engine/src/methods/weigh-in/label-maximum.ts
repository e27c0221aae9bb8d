/** Total charge against the most the unit's label allows, which for a flammable refrigerant goes with the room. */
import type { Quantity } from '../../derivation/quantity';
import { expandedUncertainty, isKnown } from '../../derivation/quantity';
import type { RefrigerantId } from '../../refrigerants/catalogue';
import { refrigerantFacts } from '../../refrigerants/catalogue';

export type LabelOutcome = 'within' | 'near' | 'above' | 'not-recorded' | 'not-applicable';

const SLACK_KG = 1e-9;

/**
 * The worst of the totals, required and actual: acts by the rule on the value itself, *near* inside its U (k = 2). Without a flammable refrigerant and
 * without a maximum: `not-applicable`; without a total: `not-recorded`.
 */
export function judgeLabelMaximum(input: {
  readonly refrigerant: RefrigerantId;
  readonly labelMaximumKg?: number;
  readonly totals: readonly Quantity[];
}): LabelOutcome {
  const { refrigerant, labelMaximumKg, totals } = input;
  const { safetyClass } = refrigerantFacts(refrigerant);
  if (labelMaximumKg === undefined) return isFlammable(safetyClass) ? 'not-recorded' : 'not-applicable';
  const known = totals.filter(isKnown);
  if (known.length === 0) return 'not-recorded';
  if (known.some(({ value }) => value > labelMaximumKg + SLACK_KG)) return 'above';
  return known.some((total) => total.value + expandedUncertainty(total) > labelMaximumKg) ? 'near' : 'within';
}

/** The figure after the toxicity letter: 1 does not propagate a flame. */
const isFlammable = (safetyClass: string): boolean => safetyClass[1] !== '1';
