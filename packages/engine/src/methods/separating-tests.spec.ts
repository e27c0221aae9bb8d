import { describe, expect, it } from 'vitest';
import type { Known } from '../derivation/quantity';
import { expandedUncertainty, isKnown, leaf, missing } from '../derivation/quantity';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { bubblePressurePa, dewPressurePa } from '../refrigerants/saturation';
import { differenceFromK, differenceToK, pressureDifferenceToPa, temperatureToK } from '../units';
import { bracketWetBulb, testAir, testDrier } from './separating-tests';

const LIMIT = 1 / Math.sqrt(3);

const pipe = (id: string, degF: number, halfF = 1): Known =>
  leaf({
    id,
    kind: 'temperatureK',
    value: temperatureToK(degF, 'degF'),
    origin: 'reading',
    parts: [{ key: id, u: differenceToK(halfF, 'deltaF') * LIMIT, shape: 'rectangular' }],
  });

const pressure = (pa: number, halfPsi = 4): Known =>
  leaf({
    id: 'standing',
    kind: 'pressurePa',
    value: pa,
    origin: 'reading',
    parts: [{ key: 'gauge', u: pressureDifferenceToPa(halfPsi, 'psi') * LIMIT, shape: 'rectangular' }],
  });

const drier = (dropF: number, halfF = 1) =>
  testDrier({ inletK: pipe('in', 95, halfF), outletK: pipe('out', 95 - dropF, halfF) });

describe('the drop over a drier', () => {
  // two clamps of ±1 °F have u = 0.82 °F: clear from 0.84 × 0.82 = 0.69 °F beyond 3 on either side
  it.each([
    [-2, 'small'],
    [0, 'small'],
    [2.3, 'small'],
    [2.4, 'unclear'],
    [3, 'unclear'],
    [3.6, 'unclear'],
    [3.7, 'drop'],
    [12, 'drop'],
  ] as const)('of %d °F is %s', (dropF, finding) => {
    expect(drier(dropF).finding).toBe(finding);
  });

  it('is told by better clamps, never by poorer ones', () => {
    expect(drier(3.6, 0.5).finding).toBe('drop');
    expect(drier(3.7, 1.5).finding).toBe('unclear');
    expect(drier(0, 10).finding).toBe('unclear');
  });

  it('with one clamp for both places has its error in neither', () => {
    const same = { ...pipe('in', 91.9), contributions: pipe('out', 91.9).contributions };
    const { drop } = testDrier({ inletK: pipe('out', 95), outletK: same });
    expect(isKnown(drop) && drop.u).toBeCloseTo(0, 9);
  });

  it('is unmeasured with one of the two', () => {
    expect(testDrier({ inletK: pipe('in', 95), outletK: missing('drierOutletTemperature') }).finding).toBe(
      'unmeasured',
    );
  });
});

interface Case {
  readonly refrigerant?: RefrigerantId;
  readonly excessF: number;
  readonly outdoorF?: number;
  readonly indoorF?: number;
  readonly shutIn?: boolean;
  readonly halfPsi?: number;
}

/** The standing system whose bubble point lies so far over its outdoor coil. */
const air = ({ refrigerant = 'R-410A', excessF, outdoorF = 85, indoorF, shutIn = true, halfPsi }: Case) =>
  testAir({
    refrigerant,
    pressurePa: pressure(
      bubblePressurePa({ refrigerant, temperatureK: temperatureToK(outdoorF + excessF, 'degF') }),
      halfPsi,
    ),
    outdoorCoilK: pipe('outdoor coil', outdoorF),
    indoorCoilK: indoorF === undefined ? missing('standingIndoorCoilTemperature') : pipe('indoor coil', indoorF),
    liquidShutIn: shutIn,
  });

describe('the air test', () => {
  it.each([
    [0, 'none'],
    [1.5, 'none'],
    [2.9, 'unclear'],
    [3.1, 'found'],
    [10, 'found'],
    [-2.9, 'unclear'],
    [-3.1, 'below'],
    [-20, 'below'],
  ] as const)('of a standing pressure %d °F over saturation: %s', (excessF, finding) => {
    expect(air({ excessF }).finding).toBe(finding);
  });

  it('finds air only beyond its own uncertainty', () => {
    const poor = air({ excessF: 5, halfPsi: 30 });
    expect(isKnown(poor.excess) && differenceFromK(expandedUncertainty(poor.excess), 'deltaF')).toBeGreaterThan(5);
    expect(poor.finding).toBe('unclear');
    expect(air({ excessF: 0, halfPsi: 30 }).finding).toBe('unclear');
  });

  it('counts with the liquid shut in, or with both coils within 3 °F; else the colder coil hides the air', () => {
    expect(air({ excessF: 8, shutIn: false }).finding).toBe('not-valid');
    expect(air({ excessF: 8, shutIn: false, indoorF: 81.9 }).finding).toBe('not-valid');
    expect(air({ excessF: 8, shutIn: false, indoorF: 82 }).finding).toBe('found');
    expect(air({ excessF: 8, shutIn: false, indoorF: 88 }).finding).toBe('found');
    expect(air({ excessF: 8, shutIn: true, indoorF: 60 }).finding).toBe('found');
  });

  it('holds the pressure against the colder of two like coils, which sets it', () => {
    const { excess } = air({ excessF: 1, shutIn: false, indoorF: 82.5 });
    expect(isKnown(excess) && differenceFromK(excess.value, 'deltaF')).toBeCloseTo(3.5, 6);
    expect(air({ excessF: 1, shutIn: false, indoorF: 82.5 }).finding).toBe('found');
  });

  it('of a blend goes by the bubble point: at its dew pressure there is no air', () => {
    const refrigerant = 'R-407C';
    const temperatureK = temperatureToK(85, 'degF');
    const at = (pa: number) =>
      testAir({
        refrigerant,
        pressurePa: pressure(pa),
        outdoorCoilK: pipe('outdoor coil', 85),
        indoorCoilK: missing(),
        liquidShutIn: true,
      }).finding;
    expect(at(bubblePressurePa({ refrigerant, temperatureK }))).toBe('none');
    expect(at(dewPressurePa({ refrigerant, temperatureK }))).toBe('below');
  });

  it('is untested without pressure or coil, and unclear where the curve ends', () => {
    const whole = {
      refrigerant: 'R-410A',
      pressurePa: pressure(1.7e6),
      outdoorCoilK: pipe('outdoor coil', 85),
      indoorCoilK: missing(),
      liquidShutIn: true,
    } as const;
    expect(testAir({ ...whole, pressurePa: missing('standingPressure') }).finding).toBe('untested');
    expect(testAir({ ...whole, outdoorCoilK: missing('standingOutdoorCoilTemperature') }).finding).toBe('untested');
    expect(testAir({ ...whole, pressurePa: pressure(1) }).finding).toBe('unclear');
  });
});

describe('two wet bulbs of one visit', () => {
  const both = (beforeF: number, afterF: number) =>
    bracketWetBulb({ beforeK: pipe('wick', beforeF), afterK: pipe('wick', afterF) });

  it('within 1 °F count as their mean, the drift between them adding to the error of the one wick', () => {
    const mean = both(65, 65.8);
    if (mean === null || !isKnown(mean)) throw new Error('no mean');
    expect(mean.value).toBeCloseTo(temperatureToK(65.4, 'degF'), 9);
    expect(mean.u).toBeCloseTo(differenceToK(Math.hypot(1, 0.4), 'deltaF') * LIMIT, 9);
    expect(both(65, 66)).not.toBeNull();
    expect(both(66, 65)).not.toBeNull();
  });

  it('further apart have none', () => {
    expect(both(65, 66.01)).toBeNull();
    expect(both(66.01, 65)).toBeNull();
  });
});
