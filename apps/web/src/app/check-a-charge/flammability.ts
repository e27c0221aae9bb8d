import { isRefrigerantId, refrigerantFacts } from '@chargewright/engine';

/** Classes 2L, 2 and 3 of ASHRAE 34 burn. */
const FLAMMABLE = /[23]/;

/** "A2L" of a refrigerant that burns, else null. */
export function flammabilityOf(refrigerant: string): string | null {
  if (!isRefrigerantId(refrigerant)) return null;
  const { safetyClass } = refrigerantFacts(refrigerant);
  return FLAMMABLE.test(safetyClass) ? safetyClass : null;
}
