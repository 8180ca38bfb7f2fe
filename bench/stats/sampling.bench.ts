import { seededRandom } from '../../src/kernel/random.ts';
import {
  clopperPearsonInterval,
  momentaryVariance,
  scoreBouts,
  simulateLesson,
  wilsonInterval,
} from '../../src/stats/index.ts';
import type { Bench } from '../../tools/bench.ts';
import { timed } from './timed.ts';

export const bench: Bench = {
  name: 'time sampling and shares',
  run: () => {
    const random = seededRandom('bench sampling');
    const behaviour = { meanBout: 40, meanGap: 10 };
    const scored = { interval: 15, observed: 10, seconds: 900 };
    const all = Array.from({ length: 1000 }, (_, i) => i);
    return [
      timed('1000 lessons of 15 minutes, simulated and scored three ways', () => {
        for (const _ of all) {
          const bouts = simulateLesson({ ...behaviour, seconds: 900, random });
          for (const method of ['momentary', 'partial', 'whole'] as const) scoreBouts(bouts, method, scored);
        }
      }),
      timed('momentaryVariance, a million looks', () => momentaryVariance(0.8, 1_000_000, 0.01, behaviour)),
      timed('1000 Wilson intervals', () => all.map((i) => wilsonInterval(i, 1000))),
      timed('1000 Clopper–Pearson intervals', () => all.map((i) => clopperPearsonInterval(i, 1000))),
    ];
  },
};
