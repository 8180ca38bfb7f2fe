import { describe, expect, test } from 'vitest';
import { poolRandomEffects } from '../../src/stats/poolRandomEffects.ts';
import { poolThreeLevel } from '../../src/stats/poolThreeLevel.ts';
import { threeLevelLikelihood } from '../../src/stats/threeLevelLikelihood.ts';
import { expectNear } from './near.ts';
import { casesOf, referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

interface Input {
  yi: number[];
  vi: number[];
  cluster: number[];
  conf: number;
}

function drawn(seed: number, clusters: number, between: number, within: number) {
  const random = testRandom(seed);
  const normal = (): number => Math.sqrt(-2 * Math.log1p(-random())) * Math.cos(2 * Math.PI * random());
  const effects: number[] = [];
  const variances: number[] = [];
  const names: number[] = [];
  for (let c = 0; c < clusters; c++) {
    const shift = Math.sqrt(between) * normal();
    for (let i = 0; i < 2 + Math.floor(3 * random()); i++) {
      const variance = 0.01 + 0.1 * random();
      effects.push(0.4 + shift + Math.sqrt(within + variance) * normal());
      variances.push(variance);
      names.push(c);
    }
  }
  return { effects, variances, names };
}

describe('poolThreeLevel', () => {
  referenceTests<Input>(
    'pooling',
    ({ yi, vi, cluster, conf }) => {
      const normal = poolThreeLevel(yi, vi, cluster, { inference: 'normal', confidence: conf });
      const t = poolThreeLevel(yi, vi, cluster, { inference: 't', confidence: conf });
      expect(normal.converged).toBe(true);
      return {
        sigma2_class: normal.varianceBetween,
        sigma2_effect: normal.varianceWithin,
        b: normal.estimate,
        se: normal.standardError,
        ci_lo: normal.lower,
        ci_hi: normal.upper,
        ci_t_lo: t.lower,
        ci_t_hi: t.upper,
        logLik_REML: normal.logLikelihood,
      };
    },
    // The file allows 1e-4; this program promises 1e-8.
    { only: ({ model }) => model === 'three-level', tolerance: () => ({ relative: 1e-8, absolute: 1e-10 }) },
  );

  test('Konstantopoulos 2011: .0651, .0327, mean .1847, error .0846 (printed values from memory)', () => {
    const school = casesOf('pooling').find(({ id }) => id.includes('konstantopoulos'))
      ?.input as unknown as Input;
    const got = poolThreeLevel(school.yi, school.vi, school.cluster, { inference: 'normal' });
    expect(got.varianceBetween).toBeCloseTo(0.0651, 4);
    expect(got.varianceWithin).toBeCloseTo(0.0327, 4);
    expect(got.estimate).toBeCloseTo(0.1847, 4);
    expect(got.standardError).toBeCloseTo(0.0846, 4);
  });

  test('stands where both derivatives are 0, or at 0 where they point below; derivatives agree with differences', () => {
    for (let seed = 1; seed <= 12; seed++) {
      const { effects, variances, names } = drawn(
        seed,
        8,
        seed % 3 === 0 ? 0 : 0.1,
        seed % 4 === 0 ? 0 : 0.05,
      );
      const got = poolThreeLevel(effects, variances, names, { inference: 'normal' });
      expect(got.converged).toBe(true);
      const clusters = [...new Set(names)].map((name) => ({
        effects: effects.filter((_, i) => names[i] === name),
        variances: variances.filter((_, i) => names[i] === name),
      }));
      const at = [got.varianceBetween, got.varianceWithin] as const;
      const { gradient, logLikelihood } = threeLevelLikelihood(clusters, at);
      at.forEach((variance, i) => {
        if (variance > 0) expect(Math.abs(gradient[i] as number)).toBeLessThan(1e-6);
        else expect(gradient[i] as number).toBeLessThan(1e-6);
      });
      for (const [first, second] of [
        [1.2, 1],
        [1, 1.2],
        [0.8, 1.1],
      ] as const) {
        const other = threeLevelLikelihood(clusters, [first * at[0] + 0.001, second * at[1] + 0.001]);
        expect(other.logLikelihood).toBeLessThanOrEqual(logLikelihood);
      }
      const [b, w] = [0.07, 0.03];
      const step = 1e-5;
      const rise = (db: number, dw: number): number =>
        (threeLevelLikelihood(clusters, [b + db, w + dw]).logLikelihood -
          threeLevelLikelihood(clusters, [b - db, w - dw]).logLikelihood) /
        (2 * step);
      const there = threeLevelLikelihood(clusters, [b, w]).gradient;
      expect(there[0]).toBeCloseTo(rise(step, 0), 4);
      expect(there[1]).toBeCloseTo(rise(0, step), 4);
    }
  });

  test('without a variance between clusters it is the two-level REML', () => {
    let compared = 0;
    for (let seed = 20; seed < 60; seed++) {
      const { effects, variances, names } = drawn(seed, 6, 0, 0.1);
      const three = poolThreeLevel(effects, variances, names, { inference: 'normal' });
      if (three.varianceBetween > 0) continue;
      const two = poolRandomEffects(effects, variances, { estimator: 'REML', inference: 'normal' });
      expectNear(three.varianceWithin, two.tau2, 1e-7);
      expectNear(three.estimate, two.estimate, 1e-8);
      compared++;
    }
    expect(compared).toBeGreaterThan(5);
  });

  test('does not change with the order of effects; turns with their sign', () => {
    const { effects, variances, names } = drawn(3, 7, 0.1, 0.05);
    const got = poolThreeLevel(effects, variances, names, { inference: 't' });
    const back = poolThreeLevel([...effects].reverse(), [...variances].reverse(), [...names].reverse(), {
      inference: 't',
    });
    const turned = poolThreeLevel(
      effects.map((y) => -y),
      variances,
      names,
      { inference: 't' },
    );
    for (const figure of ['varianceBetween', 'varianceWithin', 'standardError'] as const) {
      expectNear(back[figure], got[figure], 1e-8);
      expectNear(turned[figure], got[figure], 1e-8);
    }
    expectNear(turned.lower, -got.upper, 1e-8);
  });

  test('is undefined, and says that nothing was found, where the two variances cannot be told apart', () => {
    for (const [effects, clusters] of [
      [[], []],
      [[0.3], ['A']],
      [
        [0.3, 0.5, 0.1],
        ['A', 'A', 'A'],
      ],
      [
        [0.3, 0.5, 0.1],
        ['A', 'B', 'C'],
      ],
    ] as const) {
      const got = poolThreeLevel(
        effects,
        effects.map(() => 0.1),
        clusters,
        { inference: 'normal' },
      );
      expect(got.converged).toBe(false);
      expect(got.estimate).toBeNaN();
      expect(got.varianceBetween).toBeNaN();
    }
    expect(poolThreeLevel([1, 2, 3], [0, 1, 1], ['A', 'A', 'B'], { inference: 't' }).converged).toBe(false);
  });

  test('nonsense throws and names the argument', () => {
    expect(() => poolThreeLevel([1], [1, 2], ['A'], { inference: 't' })).toThrow(/^effects, variances/);
    expect(() => poolThreeLevel([1], [1], [], { inference: 't' })).toThrow(/^effects, clusters/);
    expect(() => poolThreeLevel([1], [-1], ['A'], { inference: 't' })).toThrow(/^variances/);
    expect(() => poolThreeLevel([1], [1], ['A'], { inference: 'z' as 't' })).toThrow(/^inference/);
    expect(() => poolThreeLevel([1], [1], ['A'], { inference: 't', confidence: 3 })).toThrow(RangeError);
  });
});
