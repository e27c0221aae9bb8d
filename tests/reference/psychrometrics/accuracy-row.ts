import type { AccuracyRow } from '../refrigerants/measure';

type Rest = Omit<AccuracyRow, 'n' | 'mean' | 'max'>;

/** What differences amount to. None, or one that is not a number, throws: a source without an answer must not pass. */
export function row(differences: readonly number[], rest: Rest): AccuracyRow {
  const sizes = differences.map(Math.abs);
  const max = Math.max(...sizes);
  if (!Number.isFinite(max)) throw new Error(`${rest.quantity}, ${rest.source}: no rows, or a row without an answer`);
  return { ...rest, n: sizes.length, mean: sizes.reduce((sum, size) => sum + size, 0) / sizes.length, max };
}
