import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  bulbEquation,
  dryBulbKByPsychrometricEquation,
  humidityRatioByPsychrometricEquation,
  ICE_BULB,
  vapourPressureByPsychrometricEquation,
  WATER_BULB,
} from './psychrometric-equation';
import { waterVapourSaturationPressurePa } from './saturation-pressure';
import { moistAirFromWetBulbAndRelativeHumidity } from './wet-bulb-pairs';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

/** A wet bulb with room above it, and a dry bulb somewhere between it and 90 °C. */
const wetBulb = fc
  .record({ wetBulbK: between(213.15, 350), pressurePa: between(50e3, 110e3), fraction: between(0, 1) })
  .filter(({ wetBulbK, pressurePa }) => waterVapourSaturationPressurePa(wetBulbK) < 0.9 * pressurePa)
  .map(({ fraction, ...x }) => ({ ...x, dryBulbK: x.wetBulbK + fraction * (363.15 - x.wetBulbK) }));

describe('eqs. 33 and 35 solved for the dry bulb', () => {
  it('undo the humidity ratio that they give', () => {
    fc.assert(
      fc.property(wetBulb, (x) => {
        const bulb = bulbEquation(x.wetBulbK);
        const humidityRatio = humidityRatioByPsychrometricEquation(bulb, x);
        const dryBulbK = dryBulbKByPsychrometricEquation(bulb, { ...x, humidityRatio });
        expect(Math.abs(dryBulbK - x.dryBulbK)).toBeLessThan(1e-9);
      }),
      { numRuns: 1000 },
    );
  });

  it('are of the wet bulb from 0 °C up and of the iced one below', () => {
    expect(bulbEquation(273.15)).toBe(WATER_BULB);
    expect(bulbEquation(273.15 * (1 - Number.EPSILON))).toBe(ICE_BULB);
  });
});

describe('the vapour pressure along a wet bulb', () => {
  it('has the slope of its central difference and falls', () => {
    fc.assert(
      fc.property(wetBulb, (x) => {
        const bulb = bulbEquation(x.wetBulbK);
        const at = (offsetK: number) =>
          vapourPressureByPsychrometricEquation(bulb, { ...x, dryBulbK: x.dryBulbK + offsetK });
        const h = 1e-2;
        expect(Math.abs((at(h)[0] - at(-h)[0]) / (2 * h) / at(0)[1] - 1)).toBeLessThan(1e-5);
        expect(at(0)[1]).toBeLessThan(0);
      }),
      { numRuns: 1000 },
    );
  });

  it('leaves one dry bulb for each relative humidity: it falls as that rises', () => {
    fc.assert(
      fc.property(wetBulb, between(0.4, 0.99), between(0.001, 0.2), ({ wetBulbK, pressurePa }, humid, less) => {
        fc.pre(wetBulbK < 320);
        const at = (relativeHumidityRatio: number) =>
          moistAirFromWetBulbAndRelativeHumidity({ wetBulbK, relativeHumidityRatio, pressurePa }).dryBulbK;
        expect(at(humid)).toBeLessThan(at(humid - less));
        expect(at(humid)).toBeGreaterThan(wetBulbK);
      }),
    );
  });
});
