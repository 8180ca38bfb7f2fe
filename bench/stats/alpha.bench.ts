import { seededRandom } from '../../src/kernel/random.ts';
import { krippendorffAlpha, krippendorffAlphaInterval } from '../../src/stats/index.ts';
import type { Bench } from '../../tools/bench.ts';
import { timed } from './timed.ts';

export const bench: Bench = {
  name: "Krippendorff's alpha",
  run: () => {
    const random = seededRandom('bench alpha');
    const units = (count: number, observers: number): (number | null)[][] =>
      Array.from({ length: count }, () => {
        const truth = Math.floor(random() * 3);
        return Array.from({ length: observers }, () =>
          random() < 0.05 ? null : random() < 0.85 ? truth : Math.floor(random() * 3),
        );
      });
    const [small, two, three] = [units(100_000, 2), units(1_000_000, 2), units(1_000_000, 3)];
    const session = units(720, 2);
    return [
      timed('100 000 units, 2 observers', () => krippendorffAlpha(small)),
      timed('1 000 000 units, 2 observers', () => krippendorffAlpha(two)),
      timed('1 000 000 units, 3 observers', () => krippendorffAlpha(three)),
      timed('interval, 720 units, 1000 draws', () => krippendorffAlphaInterval(session, { random })),
    ];
  },
};
