import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { ELEVATION_LIMITS, standardAtmosphereElevationM, standardAtmospherePressurePa } from './standard-atmosphere';

describe('standardAtmospherePressurePa', () => {
  it('is 101,325 Pa at sea level', () => {
    expect(standardAtmospherePressurePa(0)).toBe(101_325);
  });

  it('is 12.23 psia at 5,000 ft', () => {
    expect(standardAtmospherePressurePa(1524) / 6894.757293168).toBeCloseTo(12.23, 2);
  });

  it('comes back from its pressure to the millimetre', () => {
    fc.assert(
      fc.property(fc.double({ ...ELEVATION_LIMITS, noNaN: true }), (elevationM) => {
        const back = standardAtmosphereElevationM(standardAtmospherePressurePa(elevationM));
        expect(Math.abs(back - elevationM)).toBeLessThan(1e-8);
      }),
    );
  });

  it('answers at −1,500 and 18,000 ft, typed in feet or in metres', () => {
    for (const elevationM of [-1500 * 0.3048, -457.2, 18_000 * 0.3048, 5486.4]) {
      expect(standardAtmospherePressurePa(elevationM)).toBeGreaterThan(50e3);
    }
  });

  it.each([-457.21, 5486.41, Number.NaN, Infinity, -Infinity])('refuses %d m', (elevationM) => {
    expect(() => standardAtmospherePressurePa(elevationM)).toThrow(EngineError);
  });

  it.each([50_599, 107_000, 0, -1, Number.NaN])('refuses an elevation for %d Pa', (pressurePa) => {
    expect(() => standardAtmosphereElevationM(pressurePa)).toThrow(EngineError);
  });
});
