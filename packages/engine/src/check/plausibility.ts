/** Values outside what a technician usually meets: worth a second look, never a limit of judgement (typical ranges; practice, no source). */
import type { Quantity } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import { differenceToK, temperatureToK } from '../units';
import type { UsedReadingId } from './assumed-uncertainty';
import type { Caution } from './codes';
import { guidingWindow } from './criteria/charge';
import type { DerivedQuantities } from './derived-quantities';
import type { CheckInput } from './input';

interface Range {
  readonly low: number;
  readonly high: number;
}

const temperatures = (lowF: number, highF: number): Range => ({
  low: temperatureToK(lowF, 'degF'),
  high: temperatureToK(highF, 'degF'),
});

const USUAL_READINGS: readonly (readonly [UsedReadingId, Range])[] = [
  ['supplyDryBulb', temperatures(40, 75)],
  ['returnDryBulb', temperatures(65, 95)],
  ['returnWetBulb', temperatures(45, 80)],
];
const USUAL_EVAPORATING = temperatures(25, 60);
const USUAL_CONDENSING_OVER_AIR: Range = { low: differenceToK(8, 'deltaF'), high: differenceToK(45, 'deltaF') };
const LIQUID_ABOVE_BUBBLE_K = differenceToK(2, 'deltaF');
const MOST_USUAL_SUBCOOLING_K = differenceToK(20, 'deltaF');

const outside = (quantity: Quantity, { low, high }: Range): number | null =>
  isKnown(quantity) && (quantity.value < low || quantity.value > high) ? quantity.value : null;

export function plausibilityCautions(input: CheckInput, derived: DerivedQuantities): readonly Caution[] {
  const { readings } = input;
  const found: Caution[] = [];
  for (const [id, range] of USUAL_READINGS) {
    const reading = readings[id]?.quantity;
    const value = reading === undefined ? null : outside(reading, range);
    if (value === null) continue;
    const actual = { kind: 'temperatureK', value } as const;
    found.push({ code: 'unusual-reading', figures: { readings: { kind: 'readings', value: [id] }, actual } });
  }
  const evaporating = outside(derived.evaporatingDewTemperature, USUAL_EVAPORATING);
  if (evaporating !== null) {
    found.push({ code: 'unusual-evaporating', figures: { actual: { kind: 'temperatureK', value: evaporating } } });
  }
  const condensing = outside(derived.condensingOverAmbient, USUAL_CONDENSING_OVER_AIR);
  if (condensing !== null) {
    found.push({ code: 'unusual-condensing', figures: { actual: { kind: 'differenceK', value: condensing } } });
  }
  const { subcooling } = derived;
  if (isKnown(subcooling) && subcooling.value > MOST_USUAL_SUBCOOLING_K) {
    found.push({ code: 'unusual-subcooling', figures: { actual: { kind: 'differenceK', value: subcooling.value } } });
  }
  const window = guidingWindow(input);
  const superheat = window && outside(derived.superheat, { low: window.lowK, high: window.highK });
  if (superheat !== null) {
    found.push({ code: 'unusual-superheat', figures: { actual: { kind: 'differenceK', value: superheat } } });
  }
  const liquid = readings.liquidLineTemperature?.quantity;
  if (liquid !== undefined && isKnown(subcooling) && subcooling.value < -LIQUID_ABOVE_BUBBLE_K) {
    found.push({ code: 'unusual-liquid-line', figures: { actual: { kind: 'temperatureK', value: liquid.value } } });
  }
  return found;
}
