import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { PA_PER_PSI, pressureFromPa, pressureToPa } from '../units/pressure';
import { differenceFromK, temperatureToK } from '../units/temperature';
import { CHECK_POINTS, REFRIGERANT_IDS } from './generated/saturation-curves';
import type { RefrigerantId } from './generated/saturation-curves';
import {
  bubblePressurePa,
  bubbleTemperatureK,
  dewPressurePa,
  dewTemperatureK,
  glideK,
  saturationRange,
} from './saturation';

const refrigerants = fc.constantFrom(...REFRIGERANT_IDS);
const share = fc.double({ min: 0, max: 1, noNaN: true });

const ends = REFRIGERANT_IDS.flatMap((id): [RefrigerantId, number][] => [
  [id, 0],
  [id, 1],
]);

const between = (min: number, max: number, at: number): number => (at === 1 ? max : min + (max - min) * at);

function refusalOf(compute: () => number): EngineError {
  try {
    const value = compute();
    throw new Error(`answered ${value}`);
  } catch (error) {
    if (error instanceof EngineError) return error;
    throw error;
  }
}

/** The next double: just outside a limit. */
function next(value: number, direction: 1 | -1): number {
  const bits = new BigInt64Array(new Float64Array([value]).buffer);
  bits[0]! += BigInt(direction);
  return new Float64Array(bits.buffer)[0]!;
}

describe('saturation pressure', () => {
  it('is 574 kPa for R-22 at 40 °F: 68.6 psig in the trade table', () => {
    const temperatureK = temperatureToK(40, 'degF');
    const pressurePa = bubblePressurePa({ refrigerant: 'R-22', temperatureK });
    expect(Math.abs(pressureFromPa(pressurePa, 'psig', 14.696 * PA_PER_PSI) - 68.6)).toBeLessThan(0.05);
  });

  it.each(REFRIGERANT_IDS)('%s goes through the check points beside the coefficients', (refrigerant) => {
    for (const { temperatureK, bubblePressurePa: bubble, dewPressurePa: dew } of CHECK_POINTS[refrigerant]) {
      // 6e-5 in pressure is 0.002 K where the curve is steepest
      expect(Math.abs(bubblePressurePa({ refrigerant, temperatureK }) / bubble - 1)).toBeLessThan(6e-5);
      expect(Math.abs(dewPressurePa({ refrigerant, temperatureK }) / dew - 1)).toBeLessThan(6e-5);
    }
  });

  it.each(REFRIGERANT_IDS)('%s rises, and dew is never above bubble', (refrigerant) => {
    const { minTemperatureK, maxTemperatureK } = saturationRange(refrigerant);
    let before = { bubble: 0, dew: 0 };
    for (let k = 0; k <= 3000; k++) {
      const temperatureK = between(minTemperatureK, maxTemperatureK, k / 3000);
      const now = {
        bubble: bubblePressurePa({ refrigerant, temperatureK }),
        dew: dewPressurePa({ refrigerant, temperatureK }),
      };
      if (!(now.bubble > before.bubble && now.dew > before.dew && now.dew <= now.bubble))
        expect.fail(`${refrigerant} at ${temperatureK} K`);
      before = now;
    }
  });
});

describe('saturation temperature', () => {
  it('is the inverse of the pressure within 1e-8 K, ends included', () => {
    fc.assert(
      fc.property(refrigerants, share, (refrigerant, at) => {
        const { minTemperatureK, maxTemperatureK } = saturationRange(refrigerant);
        const temperatureK = between(minTemperatureK, maxTemperatureK, at);
        const bubble = bubbleTemperatureK({
          refrigerant,
          pressurePa: bubblePressurePa({ refrigerant, temperatureK }),
        });
        const dew = dewTemperatureK({ refrigerant, pressurePa: dewPressurePa({ refrigerant, temperatureK }) });
        expect(Math.abs(bubble - temperatureK)).toBeLessThan(1e-8);
        expect(Math.abs(dew - temperatureK)).toBeLessThan(1e-8);
      }),
      {
        numRuns: 20_000,
        examples: ends,
      },
    );
  });

  it('gives the pressure back to 1e-9 from any pressure on the curve, and the result is on the curve', () => {
    fc.assert(
      fc.property(refrigerants, share, (refrigerant, at) => {
        const range = saturationRange(refrigerant);
        const pressurePa = between(range.minBubblePressurePa, range.maxBubblePressurePa, at);
        const temperatureK = bubbleTemperatureK({ refrigerant, pressurePa });
        expect(Math.abs(bubblePressurePa({ refrigerant, temperatureK }) / pressurePa - 1)).toBeLessThan(1e-9);
      }),
      { numRuns: 10_000 },
    );
  });

  it('has no dew point below the bubble point', () => {
    fc.assert(
      fc.property(refrigerants, share, (refrigerant, at) => {
        const range = saturationRange(refrigerant);
        const pressurePa = between(range.minBubblePressurePa, range.maxDewPressurePa, at);
        expect(glideK({ refrigerant, pressurePa })).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 20_000 },
    );
  });

  // Glides of the pseudo-pure equations at 120 and 300 psig as the header of the trade table prints them; R-454B of its mixture model.
  it.each([
    ['R-22', 0, 0],
    ['R-410A', 0.2, 0.2],
    ['R-404A', 0.8, 0.5],
    ['R-454B', 2.7, 2.7],
    ['R-407C', 10.3, 8.1],
  ] as const)('has for %s a glide of %f °F at 120 psig and %f °F at 300 psig', (refrigerant, at120, at300) => {
    const glideF = (psig: number) =>
      differenceFromK(glideK({ refrigerant, pressurePa: pressureToPa(psig, 'psig', 14.696 * PA_PER_PSI) }), 'deltaF');
    expect(Math.abs(glideF(120) - at120)).toBeLessThan(0.06);
    expect(Math.abs(glideF(300) - at300)).toBeLessThan(0.06);
  });

  it('has exactly no glide for a pure fluid', () => {
    expect(glideK({ refrigerant: 'R-22', pressurePa: 1e6 })).toBe(0);
  });
});

describe('refusals', () => {
  it.each(REFRIGERANT_IDS)('%s: the ends answer, the next number outside does not', (refrigerant) => {
    const range = saturationRange(refrigerant);
    const temperatures = [
      [range.minTemperatureK, range.maxTemperatureK, bubblePressurePa],
      [range.minTemperatureK, range.maxTemperatureK, dewPressurePa],
    ] as const;
    for (const [min, max, f] of temperatures) {
      for (const temperatureK of [min, max]) expect(f({ refrigerant, temperatureK })).toBeGreaterThan(0);
      for (const temperatureK of [next(min, -1), next(max, 1)])
        expect(refusalOf(() => f({ refrigerant, temperatureK })).details).toMatchObject({
          quantity: 'temperatureK',
          value: temperatureK,
          min,
          max,
          reason: 'outside-curve',
        });
    }
    const pressures = [
      [range.minBubblePressurePa, range.maxBubblePressurePa, bubbleTemperatureK],
      [range.minDewPressurePa, range.maxDewPressurePa, dewTemperatureK],
    ] as const;
    for (const [min, max, f] of pressures) {
      for (const pressurePa of [min, max]) expect(f({ refrigerant, pressurePa })).toBeGreaterThan(0);
      for (const pressurePa of [next(min, -1), next(max, 1)])
        expect(refusalOf(() => f({ refrigerant, pressurePa })).details).toMatchObject({
          quantity: 'pressurePa',
          value: pressurePa,
          min,
          max,
          reason: 'outside-curve',
        });
    }
  });

  it.each(REFRIGERANT_IDS)(
    '%s: up to the critical point is outside the curve, beyond is above critical',
    (refrigerant) => {
      const { criticalTemperatureK, criticalPressurePa, maxTemperatureK, maxBubblePressurePa } =
        saturationRange(refrigerant);
      expect(criticalTemperatureK).toBeGreaterThan(maxTemperatureK);
      expect(criticalPressurePa).toBeGreaterThan(maxBubblePressurePa);
      const reasonAt = (temperatureK: number) =>
        refusalOf(() => dewPressurePa({ refrigerant, temperatureK })).details.reason;
      expect(reasonAt(criticalTemperatureK)).toBe('outside-curve');
      expect(reasonAt(next(criticalTemperatureK, 1))).toBe('above-critical');
      const reasonFor = (pressurePa: number) =>
        refusalOf(() => bubbleTemperatureK({ refrigerant, pressurePa })).details.reason;
      expect(reasonFor(criticalPressurePa)).toBe('outside-curve');
      expect(reasonFor(next(criticalPressurePa, 1))).toBe('above-critical');
    },
  );

  it.each([
    [Number.NaN, 'not-a-number'],
    [Number.POSITIVE_INFINITY, 'above-critical'],
    [Number.NEGATIVE_INFINITY, 'outside-curve'],
    [0, 'outside-curve'],
    [-1, 'outside-curve'],
  ])('%f is refused as %s', (value, reason) => {
    for (const refused of [
      refusalOf(() => dewTemperatureK({ refrigerant: 'R-410A', pressurePa: value })),
      refusalOf(() => bubblePressurePa({ refrigerant: 'R-410A', temperatureK: value })),
      refusalOf(() => glideK({ refrigerant: 'R-410A', pressurePa: value })),
    ]) {
      expect(refused.kind).toBe('out-of-range');
      expect(refused.details.reason).toBe(reason);
    }
  });
});
