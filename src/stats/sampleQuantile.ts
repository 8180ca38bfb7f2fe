/** Quantile of sorted numbers, interpolated between neighbours (Hyndman & Fan 1996, Am Stat 50:361-365, type 7); NaN for none. */
export function sampleQuantile(sorted: ArrayLike<number>, p: number): number {
  const place = (sorted.length - 1) * p;
  const below = Math.floor(place);
  const low = sorted[below] ?? Number.NaN;
  const high = sorted[Math.min(below + 1, sorted.length - 1)] ?? Number.NaN;
  return low + (place - below) * (high - low);
}
