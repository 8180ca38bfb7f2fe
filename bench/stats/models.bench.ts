import { seededRandom } from '../../src/kernel/random.ts';
import { linearMixedModel, poolRandomEffects, poolThreeLevel } from '../../src/stats/index.ts';
import type { Bench } from '../../tools/bench.ts';
import { timed } from './timed.ts';

export const bench: Bench = {
  name: 'pooling and the mixed model',
  run: () => {
    const random = seededRandom('bench models');
    const effects = Array.from({ length: 400 }, () => random() - 0.3);
    const variances = effects.map(() => 0.01 + 0.1 * random());
    const clusters = effects.map((_, i) => i >> 2);
    const rows = Array.from({ length: 4000 }, (_, i) => i);
    const children = Array.from({ length: 400 }, () => 20 * random());
    const model = {
      child: rows.map((i) => i % 400),
      phase: rows.map((i) => Number(i >= 2000)),
      group: rows.map((i) => i % 2),
      score: rows.map((i) => 60 + (children[i % 400] as number) + 10 * random()),
    };
    return [
      timed('poolRandomEffects, REML, 400 effects', () =>
        poolRandomEffects(effects, variances, { estimator: 'REML', inference: 'knapp-hartung' }),
      ),
      timed('poolThreeLevel, 400 effects in 100 classes', () =>
        poolThreeLevel(effects, variances, clusters, { inference: 't' }),
      ),
      timed('linearMixedModel, 4000 scores of 400 children', () => linearMixedModel(model)),
    ];
  },
};
