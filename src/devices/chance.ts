import type { Random } from '../kernel/random.ts';

/** Cryptographically strong chance: for ids and seeds that nobody may guess or meet again. */
export const chance: Random = () => {
  const [high = 0, low = 0] = crypto.getRandomValues(new Uint32Array(2));
  return ((high >>> 5) * 0x4000000 + (low >>> 6)) / 2 ** 53;
};
