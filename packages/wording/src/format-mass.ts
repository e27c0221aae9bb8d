/** Refrigerant as a technician weighs it. */
import { massFromKg } from '@chargewright/engine';
import { formatNumber, formatTrimmed } from './format-value';
import type { UnitSystem } from './unit-system';

const OZ_PER_LB = 16;
const G_PER_KG = 1000;

/** "18 oz" or "510 g": in one small unit, as a rate times a length gives it. */
export const formatMassPlain = (kg: number, system: UnitSystem): string =>
  system === 'F-psi' ? `${formatTrimmed(massFromKg(kg, 'oz'), 1)} oz` : `${formatNumber(massFromKg(kg, 'g'), 0)} g`;

/** "6 lb 4 oz", "12.5 oz", "2.835 kg", "510 g". Rounded before it is split, so that no 16 oz is left over. */
export function formatMass(kg: number, system: UnitSystem): string {
  const plain = formatMassPlain(kg, system);
  const sign = kg < 0 ? '−' : '';
  if (system !== 'F-psi') {
    const grams = Math.round(Math.abs(massFromKg(kg, 'g')));
    return grams < G_PER_KG ? plain : `${sign}${formatTrimmed(grams / G_PER_KG, 3)} kg`;
  }
  const tenths = Math.round(Number((Math.abs(massFromKg(kg, 'oz')) * 10).toPrecision(12)));
  const pounds = Math.floor(tenths / (10 * OZ_PER_LB));
  if (pounds === 0) return plain;
  return `${sign}${pounds} lb ${formatTrimmed(tenths / 10 - pounds * OZ_PER_LB, 1)} oz`;
}

/** "1 lb 2 oz (18 oz)": both ways, where they differ. */
export function formatMassBoth(kg: number, system: UnitSystem): string {
  const [split, plain] = [formatMass(kg, system), formatMassPlain(kg, system)];
  return split === plain ? plain : `${split} (${plain})`;
}
