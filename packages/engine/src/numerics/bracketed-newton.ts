import { EngineError } from '../errors';

export interface BracketedNewtonOptions {
  readonly lower: number;
  readonly upper: number;
  readonly start: number;
  /** Stop when the bracket or the step is at most this wide, in units of x. */
  readonly tolerance: number;
  /**
   * Bound of |f″ / 2f′| in the bracket, per unit of x, where it is known: a step s then leaves an error of at most curvature·s², so
   * the step that makes this smaller than the tolerance is the last.
   */
  readonly curvature?: number;
  /** Name of x for the message when there is no root or no convergence. */
  readonly quantity: string;
}

type ValueAndSlope = (x: number) => readonly [value: number, slope: number];

/** Bisection alone halves a bracket of 1e3 to 1e-13 in 54 steps; Newton needs about 5. */
const MOST_STEPS = 100;

/**
 * Root of a function of one variable inside a bracket. `f` returns value and derivative.
 *
 * Newton alone is trusted while it stays inside the bracket and halves its step each time, so that a good start never pays for the ends.
 * Otherwise the ends are evaluated and every step that would leave the shrinking bracket is a bisection. Then the signs at the two ends
 * must differ, else `EngineError` `no-convergence` carrying the bracket; an end within `tolerance` of a root is that root.
 */
export function bracketedNewton(f: ValueAndSlope, options: BracketedNewtonOptions): number {
  const { lower, upper, tolerance, curvature = Infinity } = options;
  let x = Math.min(Math.max(options.start, lower), upper);
  let mostStep = upper - lower;
  for (;;) {
    const at = f(x);
    const value = at[0];
    if (value === 0) return x;
    const next = x - value / at[1];
    const step = Math.abs(next - x);
    if (!(next >= lower && next <= upper && step <= mostStep)) return newtonInShrinkingBracket(f, x, options);
    if (step <= tolerance || curvature * step * step <= tolerance) return next;
    x = next;
    mostStep = 0.5 * step;
  }
}

function newtonInShrinkingBracket(f: ValueAndSlope, start: number, options: BracketedNewtonOptions): number {
  let { lower, upper } = options;
  const { tolerance, quantity } = options;
  const [atLower, slopeAtLower] = f(lower);
  if (Math.abs(atLower) <= tolerance * Math.abs(slopeAtLower)) return lower;
  const [atUpper, slopeAtUpper] = f(upper);
  if (Math.abs(atUpper) <= tolerance * Math.abs(slopeAtUpper)) return upper;
  if (!(atLower * atUpper < 0)) throw noConvergence(quantity, lower, upper);
  const rising = atUpper > 0;
  let x = start;
  for (let step = 0; step < MOST_STEPS; step++) {
    const [value, slope] = f(x);
    if (value === 0) return x;
    if (value > 0 === rising) upper = x;
    else lower = x;
    const newton = x - value / slope;
    const next = newton > lower && newton < upper ? newton : 0.5 * (lower + upper);
    if (Math.abs(next - x) <= tolerance || upper - lower <= tolerance) return next;
    x = next;
  }
  throw noConvergence(quantity, lower, upper);
}

function noConvergence(quantity: string, min: number, max: number): EngineError {
  return new EngineError('no-convergence', { quantity, value: Number.NaN, min, max, reason: 'no-root-in-bracket' });
}
