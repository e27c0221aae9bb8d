/** Abscissae of the 5-point Gauss-Legendre half rule on [−1, 1], 10 points in all (Abramowitz & Stegun (1964), table 25.4). */
const LEGENDRE: readonly (readonly [x: number, weight: number])[] = [
  [0.14887433898163122, 0.29552422471475287],
  [0.4333953941292472, 0.26926671930999635],
  [0.6794095682990244, 0.21908636251598204],
  [0.8650633666889845, 0.1494513491505806],
  [0.9739065285171717, 0.06667134430868814],
];

const density = (z: number): number => Math.exp(-0.5 * z * z) / Math.sqrt(2 * Math.PI);

/** Beyond this |z| the tail is below 1e-16, less than a double can show beside 1. */
const TAIL_Z = 8.3;
/** Panels of one standard deviation keep the 10-point rule below 1e-15. */
const PANEL = 1;

/**
 * Probability that a standard normal variable is at most `z` (JCGM 100:2008, annex G; defined by Abramowitz & Stegun (1964), eq. 26.2.2).
 * Integrated panel by panel, absolute error below 1e-14; ±∞ give 1 and 0, NaN throws `RangeError`.
 */
export function standardNormalCdf(z: number): number {
  if (Number.isNaN(z)) throw new RangeError('standardNormalCdf: z is NaN');
  if (z >= TAIL_Z) return 1;
  if (z <= -TAIL_Z) return 0;
  let area = 0;
  const end = Math.abs(z);
  for (let from = 0; from < end; from += PANEL) {
    const half = 0.5 * (Math.min(from + PANEL, end) - from);
    const middle = from + half;
    for (const [x, weight] of LEGENDRE)
      area += half * weight * (density(middle - half * x) + density(middle + half * x));
  }
  return 0.5 + Math.sign(z) * area;
}

/**
 * Probability that a normal variable lies in [low, high] (JCGM 106:2012, 7.2). A zero standard uncertainty gives 0 or 1, limits inclusive
 * with the slack `edge`; limits may be ±∞.
 */
export function probabilityBetween(
  mean: number,
  standardUncertainty: number,
  low: number,
  high: number,
  edge = 0,
): number {
  if (standardUncertainty === 0) return mean >= low - edge && mean <= high + edge ? 1 : 0;
  const above = standardNormalCdf((low - mean) / standardUncertainty);
  const below = standardNormalCdf((high - mean) / standardUncertainty);
  return Math.min(Math.max(below - above, 0), 1);
}
