/** The middle of sorted numbers, the mean of the two middle ones of an even count; null of none. */
export function medianOfSorted(sorted: readonly number[]): number | null {
  const half = sorted.length / 2;
  const [low, high] = [sorted[Math.ceil(half) - 1], sorted[Math.floor(half)]];
  return low === undefined || high === undefined ? null : (low + high) / 2;
}
