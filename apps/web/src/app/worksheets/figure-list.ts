import { expandedUncertainty, isKnown } from '@chargewright/engine';
import type { Quantity, QuantityKind } from '@chargewright/engine';
import { formatValue, uncertaintyKind, worksheetWords, type UnitSystem } from '@chargewright/wording';

export interface ShownFigure {
  readonly label: string;
  /** "1184 cfm" */
  readonly value: string;
  /** "± 68 cfm" */
  readonly plusMinus: string;
  readonly note: string;
}

/** A quantity as the page shows it; undefined for what is missing or refused. `as` shows it as another kind of the same SI unit. */
export function shownFigure(
  label: string,
  quantity: Quantity,
  system: UnitSystem,
  more: { readonly note?: string; readonly as?: QuantityKind } = {},
): ShownFigure | undefined {
  if (!isKnown(quantity)) return undefined;
  const kind = more.as ?? quantity.kind;
  return {
    label,
    value: formatValue(kind, quantity.value, system),
    plusMinus: worksheetWords.plusMinus(formatValue(uncertaintyKind(kind), expandedUncertainty(quantity), system)),
    note: more.note ?? '',
  };
}
