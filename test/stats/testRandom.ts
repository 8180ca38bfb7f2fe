import { type Random, seededRandom } from '../../src/kernel/random.ts';

/** The same numbers for the same seed, every time the tests run. */
export function testRandom(seed: number): Random {
  return seededRandom(`test ${seed}`);
}
