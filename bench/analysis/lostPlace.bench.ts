import { slippedStretches } from '../../src/analysis/slippedStretches.ts';
import { seededRandom } from '../../src/kernel/random.ts';
import { type Loss, type Scene, simulatedPair } from '../../test/analysis/simulatedPair.ts';
import type { Bench, Row } from '../../tools/bench.ts';

const pairs = 1000;

/** Percent of simulated pairs of observers in which a lost place is found. */
function found(scene: Scene, loss?: Loss): number {
  const random = seededRandom(JSON.stringify([scene, loss]));
  let n = 0;
  for (let i = 0; i < pairs; i++)
    if (slippedStretches(...simulatedPair(scene, random, loss)).length > 0) n += 1;
  return (100 * n) / pairs;
}

const lively = { meanBout: 40, meanGap: 10 };
const twoThirds = { meanBout: 40, meanGap: 20 };
const half = { meanBout: 100, meanGap: 100 };
const turns: [string, Partial<Scene>][] = [
  ['in turn', {}],
  ['blocks of four', { block: 4 }],
  ['one child', { children: 1 }],
  ['whole class alike', { classWide: 0.7 }],
];

/** How often observers in step are called lost, and how often a lost place of so many looks is found (120 looks). */
export const bench: Bench = {
  name: `lost place: found in ${pairs} simulated pairs`,
  run: () => {
    const rows: Row[] = [];
    const add = (label: string, value: number): void => {
      rows.push({ label, value, unit: '%', ratio: 1 });
    };
    for (const [name, turn] of turns)
      for (const [bouts, life] of [
        ['lively', lively],
        ['long bouts', half],
      ] as const)
        for (const slips of [0.1, 0.2])
          add(`in step, ${name}, ${bouts}, slips ${slips}`, found({ looks: 120, slips, ...life, ...turn }));
    for (const looks of [10, 12, 16, 20, 30]) {
      const loss = { from: 40, looks, places: 1 };
      for (const [name, life] of [
        ['80 % on-task', lively],
        ['67 % on-task', twoThirds],
      ] as const)
        for (const slips of [0.02, 0.06])
          add(
            `lost for ${looks} looks, ${name}, slips ${slips}`,
            found({ looks: 120, slips, ...life }, loss),
          );
    }
    return rows;
  },
};
