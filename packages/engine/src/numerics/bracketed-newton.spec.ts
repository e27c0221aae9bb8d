import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { bracketedNewton, type BracketedNewtonOptions } from './bracketed-newton';

const options = (rest: Partial<BracketedNewtonOptions>): BracketedNewtonOptions => ({
  lower: 0,
  upper: 4,
  start: 1,
  tolerance: 1e-12,
  quantity: 'x',
  ...rest,
});

function counting(f: (x: number) => readonly [number, number]) {
  const seen: number[] = [];
  const counted = (x: number) => {
    seen.push(x);
    return f(x);
  };
  return { seen, counted };
}

const squareMinusTwo = (x: number) => [x * x - 2, 2 * x] as const;
/** Newton diverges from |x| > 1.39 on the arc tangent. */
const arcTangent = (x: number) => [Math.atan(x), 1 / (1 + x * x)] as const;

describe('bracketedNewton', () => {
  it('finds the square root of 2', () => {
    expect(bracketedNewton(squareMinusTwo, options({}))).toBeCloseTo(Math.SQRT2, 14);
  });

  it('finds the root of a falling function', () => {
    const falling = (x: number) => [2 - x * x, -2 * x] as const;
    expect(bracketedNewton(falling, options({}))).toBeCloseTo(Math.SQRT2, 14);
  });

  it('does not pay for the ends of the bracket when the start is good', () => {
    const { seen, counted } = counting(squareMinusTwo);
    bracketedNewton(counted, options({ start: 1.5 }));
    expect(seen).not.toContain(0);
    expect(seen).not.toContain(4);
    expect(seen.length).toBeLessThanOrEqual(6);
  });

  it('stops one step earlier where the curvature is known, and is still within the tolerance', () => {
    const plain = counting(squareMinusTwo);
    const known = counting(squareMinusTwo);
    bracketedNewton(plain.counted, options({ start: 1.5 }));
    const root = bracketedNewton(known.counted, options({ start: 1.5, curvature: 0.5 }));
    expect(known.seen.length).toBe(plain.seen.length - 1);
    expect(Math.abs(root - Math.SQRT2)).toBeLessThanOrEqual(1e-12);
  });

  it('bisects where Newton alone would diverge', () => {
    expect(bracketedNewton(arcTangent, options({ lower: -3, upper: 50, start: 40 }))).toBeCloseTo(0, 12);
  });

  it('bisects from a flat start', () => {
    expect(bracketedNewton(squareMinusTwo, options({ start: 0 }))).toBeCloseTo(Math.SQRT2, 12);
  });

  it('brings a start outside the bracket inside', () => {
    const { seen, counted } = counting(squareMinusTwo);
    expect(bracketedNewton(counted, options({ start: 1e9 }))).toBeCloseTo(Math.SQRT2, 12);
    expect(Math.max(...seen)).toBeLessThanOrEqual(4);
  });

  it('returns an end that is a root within the tolerance, though the signs at the ends agree', () => {
    const justOutside = (x: number) => [x + 1e-14, 1] as const;
    expect(bracketedNewton(justOutside, options({ start: 2 }))).toBe(0);
  });

  it('refuses a bracket without a root and names it', () => {
    const refused = () => bracketedNewton((x) => [x * x + 1, 2 * x], options({}));
    expect(refused).toThrow(EngineError);
    expect(refused).toThrow(/no-convergence: x = NaN, valid 0 to 4 \(no-root-in-bracket\)/);
  });

  it('refuses a function that answers NaN', () => {
    expect(() => bracketedNewton(() => [Number.NaN, Number.NaN], options({}))).toThrow(EngineError);
  });
});
