/**
 * Mends a quantile of a distribution on 0…∞ (or 0…1): where the library's answer does not give back the
 * probability to a relative 1e-12, the root is sought anew on the logarithms of both sides, where far tails are
 * nearly straight. `log` gives ln of the tail that is the smaller one, rising or falling in x.
 */
export function mendQuantile(start: number, tail: number, tailAt: (x: number) => number): number {
  if (Number.isNaN(start) || !(tail > 0)) return start;
  const wanted = Math.log(tail);
  const off = (u: number): number => Math.log(tailAt(Math.exp(u))) - wanted;
  let low = start > 0 && Number.isFinite(start) ? Math.log(start) : 0;
  let atLow = off(low);
  if (Math.abs(atLow) <= 1e-12) return start;
  let high = low;
  let atHigh = atLow;
  for (let step = 1e-6; Math.sign(atLow) === Math.sign(atHigh); step *= 4) {
    if (step > 1e4) return start;
    low -= step;
    high += step;
    atLow = off(low);
    atHigh = off(high);
  }
  // Bisection with a secant guess in between (Illinois): slow but sure, and only ever used where the library failed.
  let kept = 0;
  for (let i = 0; i < 200 && high - low > 1e-16 * Math.max(1, Math.abs(low)); i++) {
    const guess = high - (atHigh * (high - low)) / (atHigh - atLow);
    const u = guess > low && guess < high ? guess : (low + high) / 2;
    const value = off(u);
    if (value === 0) return Math.exp(u);
    if (Math.sign(value) === Math.sign(atHigh)) {
      high = u;
      atHigh = value;
      if (kept === 1) atLow /= 2;
      kept = 1;
    } else {
      low = u;
      atLow = value;
      if (kept === -1) atHigh /= 2;
      kept = -1;
    }
  }
  return Math.exp((low + high) / 2);
}
