import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateChebyshev } from './chebyshev';

/** Tₖ(t) = cos(k arccos t), the definition. */
const chebyshevPolynomial = (k: number, t: number) => Math.cos(k * Math.acos(t));
const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

describe('evaluateChebyshev', () => {
  it('sums the polynomials of the definition', () => {
    fc.assert(
      fc.property(fc.array(between(-2, 2), { minLength: 1, maxLength: 12 }), between(2, 7), (coefficients, x) => {
        const t = (2 * x - 9) / 5;
        const expected = coefficients.reduce((sum, c, k) => sum + c * chebyshevPolynomial(k, t), 0);
        const [value] = evaluateChebyshev({ lower: 2, upper: 7, coefficients }, x);
        expect(Math.abs(value - expected)).toBeLessThan(1e-12);
      }),
    );
  });

  it('has the slope of the central difference', () => {
    fc.assert(
      fc.property(fc.array(between(-2, 2), { minLength: 1, maxLength: 8 }), between(2.1, 6.9), (coefficients, x) => {
        const series = { lower: 2, upper: 7, coefficients };
        const h = 1e-5;
        const difference = (evaluateChebyshev(series, x + h)[0] - evaluateChebyshev(series, x - h)[0]) / (2 * h);
        expect(Math.abs(evaluateChebyshev(series, x)[1] - difference)).toBeLessThan(1e-6);
      }),
    );
  });

  it('gives T₂ and its slope at the ends and in the middle', () => {
    const series = { lower: 0, upper: 2, coefficients: [0, 0, 1] };
    expect(evaluateChebyshev(series, 0)).toEqual([1, -4]);
    expect(evaluateChebyshev(series, 1)).toEqual([-1, 0]);
    expect(evaluateChebyshev(series, 2)).toEqual([1, 4]);
  });

  it('is constant for one coefficient', () => {
    expect(evaluateChebyshev({ lower: -1, upper: 1, coefficients: [3] }, 0.3)).toEqual([3, 0]);
  });
});
