import { seededRandom } from '../../src/kernel/random.ts';
import { cohenKappa, confusionTable, intervalAgreement, kappaPerCode } from '../../src/stats/index.ts';
import type { Bench } from '../../tools/bench.ts';
import { codesDrawn, timed } from './timed.ts';

const million = 1_000_000;

export const bench: Bench = {
  name: 'two observers, from typed arrays with 1 % missing (−1)',
  run: () => {
    const random = seededRandom('bench agreement');
    const a = codesDrawn(million, 4, random).map((code) => (random() < 0.01 ? -1 : code));
    const b = a.map((code) => (random() < 0.1 ? Math.floor(random() * 4) : code));
    const codes = [0, 1, 2, 3];
    const labels = ['on', 'talk', 'move', 'other'];
    const words = (series: Int8Array): (string | null)[] =>
      Array.from(series, (code) => labels[code] ?? null);
    const [wordsA, wordsB] = [words(a), words(b)];
    return [
      timed('cohenKappa, 100 000 pairs', () =>
        cohenKappa(confusionTable(a.subarray(0, 100_000), b.subarray(0, 100_000), codes)),
      ),
      timed('cohenKappa, 1 000 000 pairs', () => cohenKappa(confusionTable(a, b, codes))),
      timed('cohenKappa, 1 000 000 pairs of words', () => cohenKappa(confusionTable(wordsA, wordsB, labels))),
      timed('kappaPerCode, 1 000 000 pairs', () => kappaPerCode(confusionTable(a, b, codes))),
      timed('intervalAgreement, 1 000 000 pairs', () => intervalAgreement(a, b, 0)),
    ];
  },
};
