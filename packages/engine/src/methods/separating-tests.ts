/** Tests that tell apart faults with like readings. */
import { derive } from '../derivation/derive';
import type { Known, Quantity } from '../derivation/quantity';
import { expandedUncertainty, isKnown } from '../derivation/quantity';
import { formula } from '../derivation/formula';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceToK } from '../units';
import type { SaturationFormula } from './cycle-points';
import { condensingBubbleTemperature, saturationModelError } from './cycle-points';
import { COMMON_PRACTICE, OUR_CHOICE } from './sourced-figure';
import type { SourcedFigure } from './sourced-figure';

/** Probability from which something is called clear. */
export const CLEAR_FROM = 0.8;

const differenceF = (value: number): SourcedFigure => ({
  value: differenceToK(value, 'deltaF'),
  printed: `${value} °F`,
  standing: 'practice',
  source: COMMON_PRACTICE,
});

export const TEST_FIGURES = {
  clearFrom: { value: CLEAR_FROM, printed: `${CLEAR_FROM}`, standing: 'choice', source: OUR_CHOICE },
  /** Drop over a drier, strainer or piece of line that is a restriction. */
  mostDrierDropK: differenceF(3),
  /** Standing pressure over saturation that is air, as a temperature. */
  mostStandingExcessK: differenceF(3),
  /** Coils within this of each other hold one saturation pressure. */
  coilsAlikeK: differenceF(3),
  /** Two wet bulbs of one visit within this of each other count as their mean. */
  sameWetBulbK: differenceF(1),
} as const satisfies Readonly<Record<string, SourcedFigure>>;

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
  const above = probabilityBetween(drop.value, drop.u, TEST_FIGURES.mostDrierDropK.value + SLACK_K, Infinity);
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
  const alike = areWithin(outdoorCoilK, indoorCoilK, TEST_FIGURES.coilsAlikeK.value);
  if (!liquidShutIn && !alike) return { finding: 'not-valid', excess };
  return { finding: isKnown(excess) ? judgeExcess(excess) : 'unclear', excess };
}

function judgeExcess(excess: Known): AirFinding {
  const { value, u } = excess;
  if (
    Math.abs(value) > TEST_FIGURES.mostStandingExcessK.value + SLACK_K &&
    Math.abs(value) > expandedUncertainty(excess)
  ) {
    return value > 0 ? 'found' : 'below';
  }
  const none = probabilityBetween(
    value,
    u,
    -TEST_FIGURES.mostStandingExcessK.value,
    TEST_FIGURES.mostStandingExcessK.value,
  );
  return none >= CLEAR_FROM ? 'none' : 'unclear';
}

/** Two wet bulbs, before and after the readings outdoors: their mean while they agree, else none. The drift between them adds to its uncertainty. */
export function bracketWetBulb(from: { readonly beforeK: Known; readonly afterK: Known }): Quantity | null {
  const { beforeK, afterK } = from;
  if (!areWithin(beforeK, afterK, TEST_FIGURES.sameWetBulbK.value)) return null;
  const u = Math.abs(afterK.value - beforeK.value) / 2 / Math.sqrt(3);
  return derive(bracketedWetBulb, from, [{ key: 'drift:returnWetBulb', u, shape: 'rectangular' }]);
}

const areWithin = (a: Quantity, b: Quantity, mostK: number): boolean =>
  isKnown(a) && isKnown(b) && Math.abs(a.value - b.value) <= mostK + SLACK_K;
