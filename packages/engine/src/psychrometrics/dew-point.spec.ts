import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { DEW_POINT_VAPOUR_PRESSURE_LIMITS, dewPointKFromVapourPressure } from './dew-point';
import {
  SATURATION_LIMITS,
  saturationPressureAndSlope,
  TRIPLE_POINT_K,
  waterVapourSaturationPressurePa,
} from './saturation-pressure';

const { min, max } = DEW_POINT_VAPOUR_PRESSURE_LIMITS;

describe('dewPointKFromVapourPressure', () => {
  it('returns the temperature whose saturation pressure it is, to 1e-9 K from −100 to 200 °C', () => {
    fc.assert(
      fc.property(fc.double({ min: SATURATION_LIMITS.min, max: SATURATION_LIMITS.max, noNaN: true }), (T) => {
        expect(Math.abs(dewPointKFromVapourPressure(waterVapourSaturationPressurePa(T)) - T)).toBeLessThan(1e-9);
      }),
      { numRuns: 2000 },
    );
  });

  it('crosses the triple point without a jump', () => {
    const [pressurePa, slope] = saturationPressureAndSlope(TRIPLE_POINT_K);
    for (const offsetK of [-1e-3, -1e-6, -1e-8, 0, 1e-8, 1e-6, 1e-3]) {
      const dewPointK = dewPointKFromVapourPressure(pressurePa + slope * offsetK);
      const expectedK = TRIPLE_POINT_K + offsetK;
      // over ice the slope is 13 % steeper
      expect(Math.abs(dewPointK - expectedK)).toBeLessThan(0.15 * Math.abs(offsetK) + 1e-7);
    }
  });

  it('rises with the vapour pressure', () => {
    const pressurePa = fc.double({ min: Math.log(min), max: Math.log(max), noNaN: true }).map(Math.exp);
    fc.assert(
      fc.property(pressurePa, (p) => {
        fc.pre(p >= min && p * 1.001 <= max);
        expect(dewPointKFromVapourPressure(p * 1.001)).toBeGreaterThan(dewPointKFromVapourPressure(p));
      }),
    );
  });

  it('ends at −100 and 200 °C', () => {
    expect(dewPointKFromVapourPressure(min)).toBeCloseTo(173.15, 9);
    expect(dewPointKFromVapourPressure(max)).toBeCloseTo(473.15, 9);
  });

  it.each([min * (1 - Number.EPSILON), max * (1 + Number.EPSILON), 0, -1, Number.NaN, Infinity])(
    'refuses %d Pa: dry air has no dew point',
    (vapourPressurePa) => {
      expect(() => dewPointKFromVapourPressure(vapourPressurePa)).toThrow(EngineError);
    },
  );
});
