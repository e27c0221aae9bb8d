/** How numbers and mixtures are drawn. */
import fc from 'fast-check';

const STEPS = 1_000_000;

/** A number in an open interval; the offset keeps it off every round limit, where a last digit would decide. */
export const between = (low: number, high: number): fc.Arbitrary<number> =>
  fc.integer({ min: 0, max: STEPS - 1 }).map((k) => low + ((high - low) * (k + Math.SQRT1_2)) / STEPS);

type Weighted<T> = readonly [weight: number, arbitrary: fc.Arbitrary<T>];

export const mixed = <T>(...choices: readonly Weighted<T>[]): fc.Arbitrary<T> =>
  fc.oneof(...choices.map(([weight, arbitrary]) => ({ weight, arbitrary })));
