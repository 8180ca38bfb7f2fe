/** Mean of the numbers; NaN for none. */
export function mean(values: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i] as number;
  return sum / values.length;
}

/**
 * Sum of squared deviations from the mean, in two passes. A sum that is rounding noise beside the numbers
 * themselves (relative 1e-12 on the standard deviation) is 0, so that equal differences written as decimals
 * (0.3 − 0.2, 0.2 − 0.1) have no spread. `scale` is the largest number the values were computed from.
 */
export function sumOfSquares(values: ArrayLike<number>, scale = 0): number {
  const centre = mean(values);
  let sum = 0;
  let largest = scale;
  for (let i = 0; i < values.length; i++) {
    const value = values[i] as number;
    sum += (value - centre) ** 2;
    largest = Math.max(largest, Math.abs(value));
  }
  return sum <= values.length * (1e-12 * largest) ** 2 ? 0 : sum;
}

/** Sample variance (divisor n − 1); NaN for fewer than two numbers. */
export function sampleVariance(values: ArrayLike<number>, scale = 0): number {
  return values.length < 2 ? Number.NaN : sumOfSquares(values, scale) / (values.length - 1);
}

/** Pearson's correlation; NaN when one side has no spread. */
export function correlation(a: ArrayLike<number>, b: ArrayLike<number>): number {
  const meanA = mean(a);
  const meanB = mean(b);
  let products = 0;
  for (let i = 0; i < a.length; i++) products += ((a[i] as number) - meanA) * ((b[i] as number) - meanB);
  const spread = Math.sqrt(sumOfSquares(a) * sumOfSquares(b));
  return spread === 0 ? Number.NaN : Math.max(-1, Math.min(1, products / spread));
}

export function largestAbsolute(...lists: ArrayLike<number>[]): number {
  let largest = 0;
  for (const list of lists) {
    for (let i = 0; i < list.length; i++) largest = Math.max(largest, Math.abs(list[i] as number));
  }
  return largest;
}
