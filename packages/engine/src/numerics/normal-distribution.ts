const density = (z: number): number => Math.exp(-0.5 * z * z) / Math.sqrt(2 * Math.PI);

/** Beyond this |z| four terms of the tail's expansion leave less than 3e-17. */
const FAR_Z = 7;

/**
 * Probability that a standard normal variable is at most `z`, absolute error below 2e-15: the series of Abramowitz & Stegun (1964), eq. 26.2.11, in
 * the order of Marsaglia, J. Stat. Softw. 11(4) (2004), and far out the expansion of eq. 26.2.12. ±∞ give 1 and 0, NaN throws `RangeError`.
 */
export function standardNormalCdf(z: number): number {
  if (Number.isNaN(z)) throw new RangeError('standardNormalCdf: z is NaN');
  const square = z * z;
  if (Math.abs(z) > FAR_Z) {
    const tail = (density(z) / Math.abs(z)) * (1 - (1 - (3 - 15 / square) / square) / square);
    return z > 0 ? 1 - tail : tail;
  }
  let term = z;
  let sum = z;
  let before = NaN;
  for (let n = 3; sum !== before; n += 2) {
    before = sum;
    term *= square / n;
    sum += term;
  }
  return 0.5 + sum * density(z);
}

/**
 * Probability that a normal variable lies in [low, high] (JCGM 106:2012, 7.2). A zero standard uncertainty gives 0 or 1, limits inclusive;
 * limits may be ±∞.
 */
export function probabilityBetween(mean: number, standardUncertainty: number, low: number, high: number): number {
  if (standardUncertainty === 0) return mean >= low && mean <= high ? 1 : 0;
  const above = standardNormalCdf((low - mean) / standardUncertainty);
  const below = standardNormalCdf((high - mean) / standardUncertainty);
  return Math.min(Math.max(below - above, 0), 1);
}
