/** What physics can refuse. A caller's bug (wrong type, not finite where a number is promised) is a `TypeError` or `RangeError` instead. */
export type EngineErrorKind = 'out-of-range' | 'inconsistent-inputs' | 'no-convergence' | 'not-supported';

export interface EngineErrorDetails {
  /** Name of the quantity that is refused, with its unit suffix, e.g. `dryBulbK`. */
  readonly quantity: string;
  readonly value: number;
  readonly min?: number;
  readonly max?: number;
  /** Machine-readable reason that wording turns into a sentence, e.g. `outside-curve`. */
  readonly reason: string;
  /** Publication or file that states the limit. */
  readonly source?: string;
}

/** The one error that formulas throw. `derive` turns it into a refused quantity; public doors return it in a `Result`. */
export class EngineError extends Error {
  override readonly name = 'EngineError';

  constructor(
    readonly kind: EngineErrorKind,
    readonly details: EngineErrorDetails,
  ) {
    const { quantity, value, min, max } = details;
    const range = min === undefined && max === undefined ? '' : `, valid ${min ?? '-∞'} to ${max ?? '∞'}`;
    super(`${kind}: ${quantity} = ${value}${range} (${details.reason})`);
  }
}

/** Throws `EngineError` `out-of-range` unless `min ≤ value ≤ max`; NaN is refused too. */
export function assertInRange(value: number, details: Omit<EngineErrorDetails, 'value'>): void {
  const { min = -Infinity, max = Infinity } = details;
  if (!(value >= min && value <= max)) throw new EngineError('out-of-range', { ...details, value });
}
