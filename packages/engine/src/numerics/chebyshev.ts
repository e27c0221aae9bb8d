/** A Chebyshev expansion on [lower, upper]: f(x) = Σ cₖ Tₖ(t), t = (2x − lower − upper)/(upper − lower). */
export interface ChebyshevSeries {
  readonly lower: number;
  readonly upper: number;
  readonly coefficients: readonly number[];
}

/**
 * Value and first derivative by Clenshaw's recurrence (Clenshaw, Math. Comp. 9 (1955) 118). `x` outside [lower, upper] is the caller's to refuse:
 * the expansion says nothing there.
 */
export function evaluateChebyshev(series: ChebyshevSeries, x: number): readonly [value: number, slope: number] {
  const { lower, upper, coefficients } = series;
  const scale = 2 / (upper - lower);
  const t = scale * (x - lower) - 1;
  let b1 = 0;
  let b2 = 0;
  let d1 = 0;
  let d2 = 0;
  for (let k = coefficients.length - 1; k >= 1; k--) {
    const d0 = 2 * t * d1 - d2 + 2 * b1;
    d2 = d1;
    d1 = d0;
    const b0 = 2 * t * b1 - b2 + coefficients[k]!;
    b2 = b1;
    b1 = b0;
  }
  return [t * b1 - b2 + coefficients[0]!, scale * (t * d1 - d2 + b1)];
}
