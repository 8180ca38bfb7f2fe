/** A source of numbers in [0, 1). Whoever needs chance takes one as an argument. */
export type Random = () => number;

/** Name and version of the seeded generator: kept with every draw, so that it can be repeated in ten years. */
export const generatorName = 'xoshiro128** from FNV-1a and splitmix32, version 1';

/**
 * A generator that gives the same numbers for the same seed on every machine: xoshiro128** (Blackman & Vigna
 * 2021), its state filled by splitmix32 from the FNV-1a hash of the seed's UTF-16 code units.
 */
export function seededRandom(seed: string): Random {
  let hash = 0x811c9dc5;
  for (let i = 0; i < seed.length; i++) hash = Math.imul(hash ^ seed.charCodeAt(i), 0x01000193);
  const fill = (): number => {
    hash = (hash + 0x9e3779b9) | 0;
    let z = hash ^ (hash >>> 16);
    z = Math.imul(z, 0x21f0aaad);
    z ^= z >>> 15;
    z = Math.imul(z, 0x735a2d97);
    return (z ^ (z >>> 15)) >>> 0;
  };
  let [a, b, c, d] = [fill(), fill(), fill(), fill()];
  return () => {
    const turned = Math.imul(b, 5);
    const result = Math.imul((turned << 7) | (turned >>> 25), 9) >>> 0;
    const t = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= t;
    d = (d << 11) | (d >>> 21);
    return result / 4294967296;
  };
}

/** A whole number from 0 to n − 1, each equally likely up to 1 in 2³². n ≥ 1. */
export function randomBelow(random: Random, n: number): number {
  return Math.floor(random() * n);
}

/** A new array in random order (Fisher & Yates 1938; Durstenfeld 1964). The given one is left alone. */
export function shuffled<T>(items: readonly T[], random: Random): T[] {
  const result = [...items];
  for (let i = result.length - 1; i > 0; i--) {
    const j = randomBelow(random, i + 1);
    const held = result[i] as T;
    result[i] = result[j] as T;
    result[j] = held;
  }
  return result;
}
