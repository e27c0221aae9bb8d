import { EngineError } from '../../errors';

/** Throws `EngineError` `out-of-range`, reason `not-above-zero`, unless the value is above zero; NaN is refused too. */
export function assertPositive(value: number, quantity: string): void {
  if (!(value > 0)) throw new EngineError('out-of-range', { quantity, value, min: 0, reason: 'not-above-zero' });
}
