import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { attempt } from '../result';
import { humidityRatioFromRelativeHumidity } from './humidity-ratio';
import { ICE_BULB, WATER_BULB, WET_BULB_CURVATURE_PER_K, wetBulbImbalance } from './psychrometric-equation';
import { TRIPLE_POINT_K, waterVapourSaturationPressurePa } from './saturation-pressure';
import { humidityRatioFromWetBulb, wetBulbFromHumidityRatio, wetBulbKFromRelativeHumidity } from './wet-bulb';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

/** Any air in range, of which the vapour leaves some dry air. */
const air = fc
  .record({ dryBulbK: between(213.15, 363.15), relativeHumidityRatio: between(0, 1), pressurePa: between(50e3, 110e3) })
  .filter((x) => x.relativeHumidityRatio * waterVapourSaturationPressurePa(x.dryBulbK) < 0.999 * x.pressurePa)
  .map((x) => ({ ...x, humidityRatio: humidityRatioFromRelativeHumidity(x) }));

function refusal(compute: () => unknown) {
  const result = attempt(compute);
  if (result.ok) throw new Error(`not refused: ${String(result.value)}`);
  const { kind, details } = result.error;
  return { code: `${kind} ${details.quantity} ${details.reason}`, min: details.min, max: details.max };
}

describe('wet bulb and humidity ratio', () => {
  it('come back from each other to 1e-9 K and to the rounding of the equation', () => {
    fc.assert(
      fc.property(air, (x) => {
        const { wetBulbK } = wetBulbFromHumidityRatio(x);
        const back = humidityRatioFromWetBulb({ ...x, wetBulbK });
        const again = wetBulbFromHumidityRatio({ ...x, humidityRatio: back });
        expect(Math.abs(again.wetBulbK - wetBulbK)).toBeLessThan(1e-8);
        // 1e-9 K is worth at most 4e-13 of humidity where the bulb is dry, and as much of what is there where it is wet
        expect(Math.abs(back - x.humidityRatio)).toBeLessThan(1e-11 * (1 + 1e3 * x.humidityRatio ** 2));
      }),
      { numRuns: 3000 },
    );
  });

  it('rise together', () => {
    fc.assert(
      fc.property(air, between(0.001, 0.999), (x, part) => {
        fc.pre(x.humidityRatio > 1e-6);
        const drier = wetBulbFromHumidityRatio({ ...x, humidityRatio: part * x.humidityRatio });
        expect(drier.wetBulbK).toBeLessThan(wetBulbFromHumidityRatio(x).wetBulbK);
      }),
    );
  });

  it('are the dry bulb and saturation where they meet', () => {
    fc.assert(
      fc.property(between(213.15, 350), between(50e3, 110e3), (dryBulbK, pressurePa) => {
        fc.pre(waterVapourSaturationPressurePa(dryBulbK) < 0.99 * pressurePa);
        const humidityRatio = humidityRatioFromRelativeHumidity({ dryBulbK, relativeHumidityRatio: 1, pressurePa });
        expect(wetBulbFromHumidityRatio({ dryBulbK, humidityRatio, pressurePa }).wetBulbK).toBe(dryBulbK);
        expect(wetBulbKFromRelativeHumidity({ dryBulbK, relativeHumidityRatio: 1, pressurePa })).toBe(dryBulbK);
        const fromWetBulb = humidityRatioFromWetBulb({ dryBulbK, wetBulbK: dryBulbK, pressurePa });
        expect(Math.abs(fromWetBulb / humidityRatio - 1)).toBeLessThan(1e-12);
      }),
    );
  });

  it('agree however the humidity is stated', () => {
    fc.assert(
      fc.property(air, (x) => {
        expect(Math.abs(wetBulbKFromRelativeHumidity(x) - wetBulbFromHumidityRatio(x).wetBulbK)).toBeLessThan(2e-9);
      }),
    );
  });
});

/** Wet bulb of dry air. */
const lowestK = (x: { dryBulbK: number; pressurePa: number }) =>
  wetBulbFromHumidityRatio({ ...x, humidityRatio: 0 }).wetBulbK;

describe('wetBulbImbalance', () => {
  const trial = fc.record({ air, fraction: between(0, 1), bulb: fc.constantFrom(WATER_BULB, ICE_BULB) }).map((x) => {
    const [low, high] =
      x.bulb === ICE_BULB ? [174, Math.min(x.air.dryBulbK, 273.1)] : [273.2, Math.max(x.air.dryBulbK, 273.3)];
    return { ...x, wetBulbK: low + x.fraction * (high - low) };
  });

  it('has the slope of its central difference and rises', () => {
    fc.assert(
      fc.property(trial, ({ bulb, air, wetBulbK }) => {
        const at = (offsetK: number) => wetBulbImbalance(bulb, air, wetBulbK + offsetK)[0];
        const h = 1e-3;
        const [, slope] = wetBulbImbalance(bulb, air, wetBulbK);
        expect(Math.abs((at(h) - at(-h)) / (2 * h) / slope - 1)).toBeLessThan(1e-6);
        expect(slope).toBeGreaterThan(0);
      }),
    );
  });

  it('bends no more than the solver relies on', () => {
    fc.assert(
      fc.property(trial, ({ bulb, air, wetBulbK }) => {
        const slopeAt = (offsetK: number) => wetBulbImbalance(bulb, air, wetBulbK + offsetK)[1];
        const h = 1e-3;
        const bend = (slopeAt(h) - slopeAt(-h)) / (2 * h) / (2 * slopeAt(0));
        expect(Math.abs(bend)).toBeLessThan(WET_BULB_CURVATURE_PER_K);
      }),
      { numRuns: 5000 },
    );
  });
});

describe('the branch of the wet bulb', () => {
  const at5C = { dryBulbK: 278.15, pressurePa: 101_325 };
  const waterAt0C = humidityRatioFromWetBulb({ ...at5C, wetBulbK: 273.15 });
  const iceJustBelow0C = humidityRatioFromWetBulb({ ...at5C, wetBulbK: 273.15 - 1e-9 });

  it('takes a bulb at 0 °C as wet and below as iced', () => {
    // eqs. 33 and 35 by hand: Ws* = 0.621945 · 611.1536 / (101 325 − 611.1536) = 0.0037741
    expect(waterAt0C).toBeCloseTo((2501 * 0.0037741 - 1.006 * 5) / (2501 + 1.86 * 5), 7);
    expect(iceJustBelow0C).toBeCloseTo((2830 * 0.0037741 - 1.006 * 5) / (2830 + 1.86 * 5), 7);
  });

  it('is the liquid one wherever a wet bulb of 0 °C or more exists, also between the branches', () => {
    expect(iceJustBelow0C).toBeGreaterThan(waterAt0C);
    const { wetBulbK, wetBulbSurface } = wetBulbFromHumidityRatio({
      ...at5C,
      humidityRatio: 0.5 * (waterAt0C + iceJustBelow0C),
    });
    expect(wetBulbSurface).toBe('water');
    expect(wetBulbK).toBeGreaterThan(273.15);
    expect(wetBulbFromHumidityRatio({ ...at5C, humidityRatio: waterAt0C })).toEqual({
      wetBulbK: 273.15,
      wetBulbSurface: 'water',
    });
  });

  it('steps from 0 to −0.353 °C at 5 °C dry bulb and sea level when the humidity falls below the last liquid wet bulb', () => {
    const below = wetBulbFromHumidityRatio({ ...at5C, humidityRatio: waterAt0C * (1 - 1e-9) });
    expect(below.wetBulbSurface).toBe('ice');
    expect(below.wetBulbK - 273.15).toBeCloseTo(-0.353, 3);
  });

  it('keeps a measured iced bulb in the overlap, though the same humidity has a liquid one', () => {
    const icedK = 273.15 - 0.1;
    const humidityRatio = humidityRatioFromWetBulb({ ...at5C, wetBulbK: icedK });
    expect(humidityRatio).toBeGreaterThan(waterAt0C);
    expect(wetBulbFromHumidityRatio({ ...at5C, humidityRatio }).wetBulbSurface).toBe('water');
  });

  it('leaves no humidity without a wet bulb: the iced bulb at 0 °C always needs at least what the liquid one needs', () => {
    fc.assert(
      fc.property(
        between(273.15, 363.15),
        between(50e3, 110e3),
        between(0, 0.01),
        (dryBulbK, pressurePa, humidityRatio) => {
          const x = { dryBulbK, humidityRatio, pressurePa };
          const [water] = wetBulbImbalance(WATER_BULB, x, 273.15);
          const [ice] = wetBulbImbalance(ICE_BULB, x, 273.15);
          if (water > 0) expect(ice).toBeGreaterThan(0);
        },
      ),
    );
  });

  it('answers at dry bulbs around 0 °C and the triple point, dry to saturated', () => {
    for (const dryBulbK of [
      273.14,
      273.15 - 1e-12,
      273.15,
      273.15 + 1e-12,
      273.155,
      TRIPLE_POINT_K,
      273.17,
      273.2,
      274,
    ]) {
      for (const relativeHumidityRatio of [0, 0.5, 0.99, 1 - 1e-6, 1 - 1e-9, 1 - 1e-12, 1 - 1e-15, 1]) {
        const x = { dryBulbK, relativeHumidityRatio, pressurePa: 101_325 };
        const { wetBulbK, wetBulbSurface } = wetBulbFromHumidityRatio({
          ...x,
          humidityRatio: humidityRatioFromRelativeHumidity(x),
        });
        expect(wetBulbK).toBeLessThanOrEqual(dryBulbK);
        expect(wetBulbK).toBeGreaterThan(dryBulbK - 7);
        expect(wetBulbSurface).toBe(wetBulbK >= 273.15 ? 'water' : 'ice');
      }
    }
  });

  it.each([273.1501, 273.155, 273.1599, TRIPLE_POINT_K - 1e-5, TRIPLE_POINT_K - 1e-8])(
    'finds a wet bulb of %d K, between 0 and 0.01 °C, where saturation is over ice and the bulb wet',
    (wetBulbK) => {
      const dryBulbK = 278.15;
      const humidityRatio = humidityRatioFromWetBulb({ dryBulbK, wetBulbK, pressurePa: 101_325 });
      const found = wetBulbFromHumidityRatio({ dryBulbK, humidityRatio, pressurePa: 101_325 });
      expect(found.wetBulbSurface).toBe('water');
      expect(Math.abs(found.wetBulbK - wetBulbK)).toBeLessThan(1e-9);
    },
  );
});

describe('dry air', () => {
  it.each([
    [90, 50e3, 'water'],
    [20, 101_325, 'water'],
    [5, 101_325, 'ice'],
    [-60, 110e3, 'ice'],
  ])('at %d °C and %d Pa has a wet bulb, on %s', (dryBulbC, pressurePa, surface) => {
    const dryBulbK = dryBulbC + 273.15;
    const { wetBulbK, wetBulbSurface } = wetBulbFromHumidityRatio({ dryBulbK, humidityRatio: 0, pressurePa });
    expect(wetBulbSurface).toBe(surface);
    expect(wetBulbK).toBeLessThan(dryBulbK);
    expect(wetBulbKFromRelativeHumidity({ dryBulbK, relativeHumidityRatio: 0, pressurePa })).toBe(wetBulbK);
  });
});

describe('refusals of humidityRatioFromWetBulb', () => {
  const room = { dryBulbK: 300, pressurePa: 101_325 };
  const at = (wetBulbK: number, rest = room) => refusal(() => humidityRatioFromWetBulb({ ...rest, wetBulbK }));

  it('name a wet bulb above the dry bulb', () => {
    const { code, max } = at(300 * (1 + Number.EPSILON));
    expect(code).toBe('inconsistent-inputs wetBulbK wet-bulb-above-dry-bulb');
    expect(max).toBe(300);
  });

  it('name a wet bulb below that of dry air and say how low it may be', () => {
    const lowest = lowestK(room);
    expect(humidityRatioFromWetBulb({ ...room, wetBulbK: lowest })).toBeLessThan(1e-11);
    const { code, min } = at(lowest - 1e-7);
    expect(code).toBe('inconsistent-inputs wetBulbK wet-bulb-too-low');
    expect(min).toBeCloseTo(lowest, 9);
  });

  it('say it on the ice branch too, and far below the equations', () => {
    const cold = { dryBulbK: 278.15, pressurePa: 101_325 };
    expect(at(269.9, cold)).toMatchObject({
      code: 'inconsistent-inputs wetBulbK wet-bulb-too-low',
      min: lowestK(cold),
    });
    expect(at(100, cold).min).toBe(lowestK(cold));
    expect(at(-Infinity, cold).min).toBe(lowestK(cold));
    // dry air at 10 °C has a liquid and an iced wet bulb: an iced reading is held against the iced one
    const cool = { dryBulbK: 283.15, pressurePa: 101_325 };
    expect(lowestK(cool)).toBeGreaterThan(273.15);
    expect(at(272, cool).min).toBeLessThan(273.15);
  });

  it('name a wet bulb that boils', () => {
    expect(at(355, { dryBulbK: 363.15, pressurePa: 50e3 }).code).toBe(
      'inconsistent-inputs vapourPressurePa vapour-pressure-not-below-total',
    );
  });

  it('name NaN', () => {
    expect(at(Number.NaN).code).toBe('out-of-range wetBulbK not-a-number');
  });

  it('name a dry bulb or a pressure just outside the range', () => {
    const low = -60 + 273.15;
    expect(at(200, { ...room, dryBulbK: low * (1 - Number.EPSILON) }).code).toMatch(/^out-of-range dryBulbK/);
    expect(at(300, { ...room, dryBulbK: 363.15 * (1 + Number.EPSILON) }).code).toMatch(/^out-of-range dryBulbK/);
    expect(at(290, { ...room, pressurePa: 50e3 * (1 - Number.EPSILON) }).code).toMatch(/^out-of-range pressurePa/);
    expect(at(290, { ...room, pressurePa: 110e3 * (1 + Number.EPSILON) }).code).toMatch(/^out-of-range pressurePa/);
    expect(at(290, { ...room, dryBulbK: Number.NaN }).code).toMatch(/^out-of-range dryBulbK/);
    expect(at(290, { ...room, pressurePa: Number.NaN }).code).toMatch(/^out-of-range pressurePa/);
  });
});
