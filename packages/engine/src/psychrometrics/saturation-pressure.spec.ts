import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import {
  lnSaturationPressureOverIce,
  lnSaturationPressureOverWater,
  SATURATION_LIMITS,
  saturationPressureAndSlope,
  TRIPLE_POINT_K,
  waterVapourSaturationPressurePa,
} from './saturation-pressure';

const temperatureK = fc.double({ min: SATURATION_LIMITS.min, max: SATURATION_LIMITS.max, noNaN: true });

describe('waterVapourSaturationPressurePa', () => {
  it('is 611.657 Pa at the triple point, the accepted value within 10 ppm', () => {
    expect(Math.abs(waterVapourSaturationPressurePa(TRIPLE_POINT_K) / 611.657 - 1)).toBeLessThan(1e-5);
  });

  it('rises with temperature, across the triple point too', () => {
    fc.assert(
      fc.property(temperatureK, temperatureK, (a, b) => {
        fc.pre(Math.abs(a - b) > 1e-9);
        const rises = waterVapourSaturationPressurePa(a) < waterVapourSaturationPressurePa(b);
        expect(rises).toBe(a < b);
      }),
    );
  });

  it('has the analytic slope of its central difference', () => {
    fc.assert(
      fc.property(fc.double({ min: 173.2, max: 473.1, noNaN: true }), (T) => {
        const h = 1e-3;
        fc.pre(Math.abs(T - TRIPLE_POINT_K) > 2 * h);
        const [, slope] = saturationPressureAndSlope(T);
        const difference = (waterVapourSaturationPressurePa(T + h) - waterVapourSaturationPressurePa(T - h)) / (2 * h);
        expect(Math.abs(difference / slope - 1)).toBeLessThan(1e-7);
      }),
    );
  });

  it('joins ice and water at the triple point within 1e-8, where 0 °C would leave a step of 97 ppm', () => {
    const step = (T: number) => Math.abs(lnSaturationPressureOverIce(T) - lnSaturationPressureOverWater(T));
    expect(step(TRIPLE_POINT_K)).toBeLessThan(1e-8);
    expect(step(273.15)).toBeGreaterThan(9e-5);
  });

  it('is over ice just below the triple point and over water from there on', () => {
    expect(waterVapourSaturationPressurePa(273.1599)).toBeCloseTo(Math.exp(lnSaturationPressureOverIce(273.1599)), 10);
    expect(waterVapourSaturationPressurePa(273.16)).toBeCloseTo(Math.exp(lnSaturationPressureOverWater(273.16)), 10);
  });

  it('answers at both ends of its range', () => {
    expect(waterVapourSaturationPressurePa(SATURATION_LIMITS.min)).toBeCloseTo(0.001405, 6);
    expect(waterVapourSaturationPressurePa(SATURATION_LIMITS.max) / 1e6).toBeCloseTo(1.555, 3);
  });

  it.each([
    SATURATION_LIMITS.min * (1 - Number.EPSILON),
    SATURATION_LIMITS.max * (1 + Number.EPSILON),
    Number.NaN,
    Infinity,
    -Infinity,
    0,
  ])('refuses %d K', (T) => {
    expect(() => waterVapourSaturationPressurePa(T)).toThrow(EngineError);
  });
});
