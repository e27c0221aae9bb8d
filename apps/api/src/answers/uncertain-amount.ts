import type { EvaluationAnswer } from '@chargewright/contract/evaluation';
import { expandedUncertainty, isKnown } from '@chargewright/engine';
import type { Known, Quantity } from '@chargewright/engine';
import { presentValue } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';

export type UncertainAmount = NonNullable<EvaluationAnswer['criteria'][number]['actual']>;

/** A quantity of the engine as the contract answers it, k = 2, unrounded. */
export function uncertainAmount(quantity: Known, system: UnitSystem): UncertainAmount {
  const { kind, value } = quantity;
  const spread = expandedUncertainty(quantity);
  return {
    ...presentValue(kind, value, system),
    // an enthalpy's unit has a datum of its own: what is left of it at zero is not part of a spread
    plusMinus:
      kind === 'temperatureK'
        ? presentValue('differenceK', spread, system).value
        : presentValue(kind, spread, system).value - presentValue(kind, 0, system).value,
  };
}

/** `null` for what is missing or refused. */
export const amountOrNull = (quantity: Quantity, system: UnitSystem): UncertainAmount | null =>
  isKnown(quantity) ? uncertainAmount(quantity, system) : null;
