/**
 * Γ(w + ½) / (√w Γ(w)) for w > 0: just under 1, and 1 in the limit. By its series in 1/w from w = 40 up and by
 * recursion below, so that no two large logarithms of gamma functions are subtracted. Relative error about 1e-15.
 *
 * Source: Abramowitz & Stegun 1964, 6.1.47 (ratio of gamma functions); recursion from Γ(z + 1) = z Γ(z).
 */
export function gammaHalfStep(w: number): number {
  let factor = 1;
  let z = w;
  // With G(z) = Γ(z + ½)/Γ(z): G(z) = G(z + 1) z/(z + ½); the square roots are settled at the end.
  while (z < 40) {
    factor *= z / (z + 0.5);
    z++;
  }
  const y = 1 / z;
  const series =
    1 +
    y *
      (-1 / 8 +
        y *
          (1 / 128 +
            y *
              (5 / 1024 +
                y * (-21 / 32768 + y * (-399 / 262144 + y * (869 / 4194304 + y * (39325 / 33554432)))))));
  return factor * series * Math.sqrt(z / w);
}
