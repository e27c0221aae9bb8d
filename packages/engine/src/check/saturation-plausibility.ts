/** Readings that cannot all be true of a running system: hoses swapped, a wrong refrigerant, a probe off the pipe. */
import type { Quantity } from '../derivation/quantity';
import { bareValue, expandedUncertainty, isKnown } from '../derivation/quantity';
import type { Caution, Reason } from './codes';
import type { DerivedQuantities } from './derived-quantities';
import { highSideReading } from './derived-quantities';
import type { CheckInput } from './input';

/** `ports-swapped` or `saturation-impossible`, as the caution to show and the reason that shuts the charge criteria; `null` when plausible. */
export function impossibleReadings(
  input: CheckInput,
  derived: DerivedQuantities,
): { caution: Caution; reason: Reason } | null {
  if (input.setup.mode !== 'cooling') return null;
  const swapped = portsSwapped(input);
  if (swapped !== null) return { caution: swapped, reason: { code: 'ports-swapped', figures: {} } };
  if (!saturationImpossible(input, derived)) return null;
  const message = { code: 'saturation-impossible', figures: {} } as const;
  return { caution: message, reason: message };
}

function portsSwapped({ setup, readings }: CheckInput): Caution | null {
  const suction = readings.suctionPressure?.quantity;
  const liquid = setup.highSidePort === 'none' ? undefined : readings[highSideReading(setup)]?.quantity;
  if (suction === undefined || liquid === undefined) return null;
  const uncertainty = Math.hypot(expandedUncertainty(suction), expandedUncertainty(liquid));
  if (suction.value < liquid.value - uncertainty) return null;
  const pressure = (value: number) => ({ kind: 'pressurePa', value }) as const;
  return { code: 'ports-swapped', figures: { suction: pressure(suction.value), liquid: pressure(liquid.value) } };
}

function saturationImpossible({ readings }: CheckInput, derived: DerivedQuantities): boolean {
  const { superheat, subcooling } = derived;
  const overAirK = bareValue(derived.condensingOverAmbient);
  const evaporatingK = bareValue(derived.evaporatingDewTemperature);
  const returnAirK = readings.returnDryBulb?.quantity.value;
  return (
    clearlyNegative(superheat) ||
    clearlyNegative(subcooling) ||
    (overAirK !== undefined && overAirK <= 0) ||
    (evaporatingK !== undefined && returnAirK !== undefined && evaporatingK >= returnAirK)
  );
}

const clearlyNegative = (quantity: Quantity): boolean =>
  isKnown(quantity) && quantity.value < -expandedUncertainty(quantity);
