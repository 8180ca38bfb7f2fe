import { seededRandom } from '../../src/kernel/random.ts';
import {
  phaseRandomizationTest,
  signFlipTest,
  theilSenSlope,
  wilcoxonSignedRank,
} from '../../src/stats/index.ts';
import type { Bench } from '../../tools/bench.ts';
import { timed } from './timed.ts';

export const bench: Bench = {
  name: 'exact and sampled tests',
  run: () => {
    const random = seededRandom('bench exact tests');
    const drawn = (n: number): number[] =>
      Array.from({ length: n }, () => Math.round(200 * random() - 80) / 10);
    const [twenty, fifty, hundred, series] = [drawn(20), drawn(50), drawn(100), drawn(2000)];
    return [
      timed('signFlipTest, 20 differences, exact', () => signFlipTest(twenty)),
      timed('signFlipTest, 100 differences, 10 000 draws', () =>
        signFlipTest(hundred, { random, draws: 10_000 }),
      ),
      timed('wilcoxonSignedRank, 50 differences, exact', () => wilcoxonSignedRank(fifty)),
      timed('phaseRandomizationTest, 2000 sessions', () =>
        phaseRandomizationTest(series, 1000, { minBefore: 5, minAfter: 5, alternative: 'two-sided' }),
      ),
      timed('theilSenSlope, 2000 sessions', () => theilSenSlope(series)),
    ];
  },
};
