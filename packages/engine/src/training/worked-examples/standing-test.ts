/**
 * The test for air in the system: stopped, both coils at one temperature, the pressure must be the bubble pressure at that temperature. Air is found
 * where it stands for more than 3 °F too much, and for more than the instruments can be wrong by.
 */
import { derive } from '../../derivation/derive';
import type { Quantity } from '../../derivation/quantity';
import { expandedUncertainty, isKnown, leaf } from '../../derivation/quantity';
import { formula } from '../../derivation/formula';
import { condensingBubbleTemperature, saturationModelError } from '../../methods/cycle-points';
import type { SourcedFigure } from '../../methods/sourced-figure';
import { standardAtmospherePressurePa } from '../../psychrometrics/standard-atmosphere';
import type { RefrigerantId } from '../../refrigerants/catalogue';
import { differenceToK, pressureDifferenceToPa, pressureToPa, temperatureToK } from '../../units';
import type { StandingTest } from './worked-example';

export const AIR_FROM_EXCESS = {
  value: differenceToK(3, 'deltaF'),
  printed: '3 °F',
  standing: 'practice',
  source: 'Common practice, no source',
} as const satisfies SourcedFigure;

/** ± of the two readings as limits: those assumed of a check's liquid pressure and of its pipe temperatures. */
const PRESSURE_LIMIT_PA = pressureDifferenceToPa(4, 'psi');
const TEMPERATURE_LIMIT_K = differenceToK(1, 'deltaF');

export const standingExcess = formula({
  id: 'standingExcess',
  gives: 'differenceK',
  text: 'T_bubble − T_coils',
  symbols: { bubblePointK: 'T_bubble', coilsK: 'T_coils' },
  source: 'Common practice, no source',
  of: ({ bubblePointK, coilsK }) => bubblePointK - coilsK,
});

/** By how much the standing pressure is too high, as a temperature. Measured at sea level. */
export function standingExcessOf(refrigerant: RefrigerantId, { temperatureF, pressurePsig }: StandingTest): Quantity {
  const pressurePa = leaf({
    id: 'standingPressure',
    kind: 'pressurePa',
    value: pressureToPa(pressurePsig, 'psig', standardAtmospherePressurePa(0)),
    origin: 'reading',
    parts: [{ key: 'reading:standingPressure', u: PRESSURE_LIMIT_PA / Math.sqrt(3), shape: 'rectangular' }],
  });
  const coilsK = leaf({
    id: 'coilTemperature',
    kind: 'temperatureK',
    value: temperatureToK(temperatureF, 'degF'),
    origin: 'reading',
    parts: [{ key: 'reading:coilTemperature', u: TEMPERATURE_LIMIT_K / Math.sqrt(3), shape: 'rectangular' }],
  });
  const modelError = [saturationModelError(refrigerant, 'bubble')];
  const bubblePointK = derive(condensingBubbleTemperature(refrigerant), { pressurePa }, modelError);
  return derive(standingExcess, { bubblePointK, coilsK });
}

/** Whether a standing pressure shows air; `null` where it cannot be told. */
export function showsAir(excess: Quantity): boolean | null {
  if (!isKnown(excess)) return null;
  return excess.value > AIR_FROM_EXCESS.value && excess.value > expandedUncertainty(excess);
}
