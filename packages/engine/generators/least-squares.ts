/**
 * Least-squares solution of A·x = b by Householder reflections (Golub and Van Loan, Matrix Computations, algorithm 5.3.2):
 * the normal equations would square the condition number. `rows` of A and `b` are overwritten copies; A has at least as many rows as columns.
 */
export function leastSquares(rows: readonly (readonly number[])[], b: readonly number[]): number[] {
  const a = rows.map((row) => [...row]);
  const y = [...b];
  const m = a.length;
  const n = a[0]!.length;
  for (let k = 0; k < n; k++) {
    let norm = 0;
    for (let i = k; i < m; i++) norm += a[i]![k]! ** 2;
    norm = a[k]![k]! > 0 ? -Math.sqrt(norm) : Math.sqrt(norm);
    const v = a.slice(k).map((row) => row[k]!);
    v[0]! -= norm;
    const square = v.reduce((sum, entry) => sum + entry ** 2, 0);
    for (let j = k; j < n; j++) {
      let dot = 0;
      for (let i = k; i < m; i++) dot += v[i - k]! * a[i]![j]!;
      for (let i = k; i < m; i++) a[i]![j]! -= (2 * dot * v[i - k]!) / square;
    }
    let dot = 0;
    for (let i = k; i < m; i++) dot += v[i - k]! * y[i]!;
    for (let i = k; i < m; i++) y[i]! -= (2 * dot * v[i - k]!) / square;
  }
  const x = new Array<number>(n).fill(0);
  for (let k = n - 1; k >= 0; k--) {
    let sum = y[k]!;
    for (let j = k + 1; j < n; j++) sum -= a[k]![j]! * x[j]!;
    x[k] = sum / a[k]![k]!;
  }
  return x;
}
