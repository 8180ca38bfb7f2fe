import { type Random, randomBelow } from '../kernel/random.ts';

/** Letters and digits that are not mistaken for one another when somebody reads a seed out. */
const letters = 'abcdefghjkmnpqrstuvwxyz23456789';

/** A new seed of ten letters (31¹⁰ ≈ 8 · 10¹⁴). */
export const newSeed = (random: Random): string =>
  Array.from({ length: 10 }, () => letters[randomBelow(random, letters.length)]).join('');
