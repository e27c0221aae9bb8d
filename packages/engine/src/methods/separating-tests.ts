/**
 * Tests that tell apart faults with like readings. Figures: 3 °F over a drier and 3 °F of standing pressure are common practice, no source; how sure a
 * finding must be is our choice.
 */
import { derive } from '../derivation/derive';
import type { Known, Quantity } from '../derivation/quantity';
import { expandedUncertainty, isKnown } from '../derivation/quantity';
import { formula } from '../derivation/formula';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceToK } from '../units';
import type { SaturationFormula } from './cycle-points';
import { condensingBubbleTemperature, saturationModelError } from './cycle-points';

/** Probability from which something is called clear (choice, as in the general rules). */
export const CLEAR_FROM = 0.8;
/** Drop over a drier, strainer or piece of line that is a restriction. */
export const MOST_DRIER_DROP_K = differenceToK(3, 'deltaF');
/** Standing pressure over saturation that is air, as a temperature. */
export const MOST_STANDING_EXCESS_K = differenceToK(3, 'deltaF');
/** Coils within this of each other hold one saturation pressure. */
const ALIKE_K = differenceToK(3, 'deltaF');
/** Two wet bulbs of one visit within this of each other count as their mean. */
const SAME_WET_BULB_K = differenceToK(1, 'deltaF');
/** Rounding of the conversions. */
const SLACK_K = 1e-9;

export const drierDrop = formula({
  id: 'drierDrop',
  gives: 'differenceK',
  text: 'T_before − T_after',
  symbols: { inletK: 'T_before', outletK: 'T_after' },
  source: 'Definition; common practice, no source',
  of: ({ inletK, outletK }) => inletK - outletK,
});

/** Bubble point at the pressure of the standing system: liquid is there, and it has the composition that was charged. */
export const standingSaturation = (refrigerant: RefrigerantId): SaturationFormula => ({
  ...condensingBubbleTemperature(refrigerant),
  id: 'standingSaturation',
  text: 'T_bubble(p_standing)',
  symbols: { pressurePa: 'p_standing' },
});

export const standingExcess = formula({
  id: 'standingExcess',
  gives: 'differenceK',
  text: 'T_standing − T_coil',
  symbols: { standingK: 'T_standing', coilK: 'T_coil' },
  source: 'Common practice, no source',
  of: ({ standingK, coilK }) => standingK - coilK,
});

export const bracketedWetBulb = formula({
  id: 'returnWetBulb',
  gives: 'temperatureK',
  text: '(T_before + T_after) / 2',
  symbols: { beforeK: 'T_before', afterK: 'T_after' },
  source: 'Common practice, no source',
  of: ({ beforeK, afterK }) => (beforeK + afterK) / 2,
});

/** A restriction is there, is not, or is not to be told with these thermometers. */
export type DrierFinding = 'unmeasured' | 'unclear' | 'small' | 'drop';

export interface DrierTest {
  readonly finding: DrierFinding;
  readonly drop: Quantity;
}

export function testDrier(from: { readonly inletK: Quantity; readonly outletK: Quantity }): DrierTest {
  const drop = derive(drierDrop, from);
  if (!isKnown(drop)) return { finding: 'unmeasured', drop };
  const above = probabilityBetween(drop.value, drop.u, MOST_DRIER_DROP_K + SLACK_K, Infinity);
  if (above >= CLEAR_FROM) return { finding: 'drop', drop };
  return { finding: above <= 1 - CLEAR_FROM ? 'small' : 'unclear', drop };
}

/**
 * `found`: air. `below`: the pressure is under saturation, so that there is no liquid left, or another refrigerant. `not-valid`: with the liquid free
 * to move, the colder of two unlike coils sets the pressure and hides the air.
 */
export type AirFinding = 'untested' | 'not-valid' | 'unclear' | 'none' | 'found' | 'below';

export interface AirTest {
  readonly finding: AirFinding;
  /** Standing saturation less the coil that sets it. */
  readonly excess: Quantity;
}

export interface StandingSystem {
  readonly refrigerant: RefrigerantId;
  readonly pressurePa: Quantity;
  readonly outdoorCoilK: Quantity;
  readonly indoorCoilK: Quantity;
  readonly liquidShutIn: boolean;
}

export function testAir(system: StandingSystem): AirTest {
  const { refrigerant, pressurePa, outdoorCoilK, indoorCoilK, liquidShutIn } = system;
  const standingK = derive(standingSaturation(refrigerant), { pressurePa }, [
    saturationModelError(refrigerant, 'bubble'),
  ]);
  const colder = isKnown(indoorCoilK) && isKnown(outdoorCoilK) && indoorCoilK.value < outdoorCoilK.value;
  const coilK = colder && !liquidShutIn ? indoorCoilK : outdoorCoilK;
  const excess = derive(standingExcess, { standingK, coilK });
  if (excess.state === 'missing') return { finding: 'untested', excess };
  const alike = areWithin(outdoorCoilK, indoorCoilK, ALIKE_K);
  if (!liquidShutIn && !alike) return { finding: 'not-valid', excess };
  return { finding: isKnown(excess) ? judgeExcess(excess) : 'unclear', excess };
}

function judgeExcess(excess: Known): AirFinding {
  const { value, u } = excess;
  if (Math.abs(value) > MOST_STANDING_EXCESS_K + SLACK_K && Math.abs(value) > expandedUncertainty(excess)) {
    return value > 0 ? 'found' : 'below';
  }
  const none = probabilityBetween(value, u, -MOST_STANDING_EXCESS_K, MOST_STANDING_EXCESS_K);
  return none >= CLEAR_FROM ? 'none' : 'unclear';
}

/** Two wet bulbs, before and after the readings outdoors: their mean while they agree, else none. The drift between them adds to its uncertainty. */
export function bracketWetBulb(from: { readonly beforeK: Known; readonly afterK: Known }): Quantity | null {
  const { beforeK, afterK } = from;
  if (!areWithin(beforeK, afterK, SAME_WET_BULB_K)) return null;
  const u = Math.abs(afterK.value - beforeK.value) / 2 / Math.sqrt(3);
  return derive(bracketedWetBulb, from, [{ key: 'drift:returnWetBulb', u, shape: 'rectangular' }]);
}

const areWithin = (a: Quantity, b: Quantity, mostK: number): boolean =>
  isKnown(a) && isKnown(b) && Math.abs(a.value - b.value) <= mostK + SLACK_K;
