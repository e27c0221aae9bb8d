/** What a result says, without the formulas behind it: two results can be compared by it. */
import type { CheckResult, Known } from '@chargewright/engine';

interface Figures {
  readonly value: number;
  readonly u: number;
}

const figures = (quantity: Known | null | undefined): Figures | null =>
  quantity == null ? null : { value: quantity.value, u: quantity.u };

export function digest({ engineVersion, procedure, derived, criteria, overall, derivation }: CheckResult) {
  return {
    engineVersion,
    procedure,
    derived: Object.fromEntries(Object.entries(derived).map(([id, quantity]) => [id, figures(quantity)])),
    criteria: criteria.map((result) => ({
      ...result,
      actual: figures(result.actual),
      target: figures(result.target),
      deviation: figures(result.deviation),
    })),
    overall,
    derivation: derivation.map(({ id, result }) => ({ id, ...figures(result) })),
  };
}

/** Path of the first difference: numbers may differ by 1e-9 of their size and `slack`, everything else must be the same. `null` when they agree. */
export function findDifference(a: unknown, b: unknown, slack: number, path = 'result'): string | null {
  if (typeof a === 'number' && typeof b === 'number') {
    const agree = Math.abs(a - b) <= slack + 1e-9 * Math.max(Math.abs(a), Math.abs(b));
    return agree ? null : `${path}: ${a} and ${b}`;
  }
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) {
    return Object.is(a, b) ? null : `${path}: ${String(a)} and ${String(b)}`;
  }
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  for (const key of keys) {
    const found = findDifference(a[key as never], b[key as never], slack, `${path}.${key}`);
    if (found !== null) return found;
  }
  return null;
}
