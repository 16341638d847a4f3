// Likelihood of a set of readings under a normal law with a full covariance.

/** Lower triangle L with L L' = `matrix` (symmetric, positive definite); rows of a square array. */
export function cholesky(matrix: readonly (readonly number[])[]): number[][] {
  const n = matrix.length;
  const lower: number[][] = matrix.map(() => new Array<number>(n).fill(0));
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i]![j]!;
      for (let k = 0; k < j; k++) sum -= lower[i]![k]! * lower[j]![k]!;
      lower[i]![j] = i === j ? Math.sqrt(Math.max(sum, Number.MIN_VALUE)) : sum / lower[j]![j]!;
    }
  }
  return lower;
}

/** Residuals in units of their standard deviation, uncorrelated: L^-1 r. The sum of their squares is chi-squared. */
export function whiten(lower: readonly (readonly number[])[], residuals: readonly number[]): number[] {
  const white: number[] = [];
  for (let i = 0; i < residuals.length; i++) {
    let sum = residuals[i]!;
    for (let k = 0; k < i; k++) sum -= lower[i]![k]! * white[k]!;
    white.push(sum / lower[i]![i]!);
  }
  return white;
}

/** ln of the normal density, without the constant in 2 pi. */
export function logDensity(lower: readonly (readonly number[])[], residuals: readonly number[]): number {
  const square = whiten(lower, residuals).reduce((sum, z) => sum + z * z, 0);
  return -square / 2 - lower.reduce((sum, row, i) => sum + Math.log(row[i]!), 0);
}

/** How many standard deviations a chi-squared of `freedom` stands above what is usual. Source: [WilsonHilferty1931]. */
export function excess(chiSquared: number, freedom: number): number {
  const variance = 2 / (9 * freedom);
  return (Math.cbrt(chiSquared / freedom) - (1 - variance)) / Math.sqrt(variance);
}
