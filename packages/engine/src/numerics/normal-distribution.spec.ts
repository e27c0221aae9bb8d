import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { probabilityBetween, standardNormalCdf } from './normal-distribution';

describe('standardNormalCdf', () => {
  // Abramowitz & Stegun (1964), table 26.1, 15 decimals (from memory).
  it.each([
    [0, 0.5],
    [0.5, 0.691462461274013],
    [1, 0.841344746068543],
    [1.5, 0.933192798731142],
    [2, 0.977249868051821],
    [2.5, 0.993790334674224],
    [3, 0.99865010196837],
    [4, 0.999968328758167],
    [5, 0.999999713348428],
  ])('at z = %d is %d', (z, expected) => {
    expect(Math.abs(standardNormalCdf(z) - expected)).toBeLessThan(1e-14);
  });

  it('inverts the usual coverage factors', () => {
    expect(standardNormalCdf(1.959963984540054)).toBeCloseTo(0.975, 14);
    expect(standardNormalCdf(1.6448536269514722)).toBeCloseTo(0.95, 14);
  });

  it('is symmetrical and rises', () => {
    fc.assert(
      fc.property(fc.double({ min: -9, max: 9, noNaN: true }), (z) => {
        const p = standardNormalCdf(z);
        expect(Math.abs(p + standardNormalCdf(-z) - 1)).toBeLessThan(1e-14);
        expect(standardNormalCdf(z + 0.01)).toBeGreaterThanOrEqual(p);
        expect(p >= 0 && p <= 1).toBe(true);
      }),
    );
  });

  it('ends at 0 and 1 at the infinities', () => {
    expect(standardNormalCdf(-Infinity)).toBe(0);
    expect(standardNormalCdf(Infinity)).toBe(1);
  });

  it('throws RangeError at NaN', () => {
    expect(() => standardNormalCdf(Number.NaN)).toThrow(RangeError);
  });
});

describe('probabilityBetween', () => {
  it('is 68.27, 95.45 and 99.73 % within one, two and three standard uncertainties', () => {
    expect(probabilityBetween(7, 2, 5, 9)).toBeCloseTo(0.682689492137086, 13);
    expect(probabilityBetween(7, 2, 3, 11)).toBeCloseTo(0.954499736103642, 13);
    expect(probabilityBetween(7, 2, 1, 13)).toBeCloseTo(0.99730020393674, 13);
  });

  it('takes an open side as infinite', () => {
    expect(probabilityBetween(5, 2, 5, Infinity)).toBeCloseTo(0.5, 14);
    expect(probabilityBetween(5, 2, -Infinity, Infinity)).toBe(1);
  });

  it('is yes or no without uncertainty, the limits included', () => {
    expect(probabilityBetween(5, 0, 5, 6)).toBe(1);
    expect(probabilityBetween(5, 0, 5.1, 6)).toBe(0);
    expect(probabilityBetween(6 + 1e-10, 0, 5, 6)).toBe(0);
  });

  it('refuses a NaN', () => {
    expect(() => probabilityBetween(Number.NaN, 1, 0, 1)).toThrow(RangeError);
  });
});
