import { describe, expect, test } from 'vitest';
import { linearMixedModel, pairedChange, welchDifference } from '../../src/stats/index.ts';
import {
  type Child,
  designOf,
  gradientOf,
  type RandomInterceptFit,
  randomInterceptLikelihood,
} from '../../src/stats/randomInterceptLikelihood.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

type Row = [child: number, phase: number, group: number, score: number];

function modelOf(rows: Row[]) {
  return linearMixedModel({
    child: rows.map(([child]) => child),
    phase: rows.map(([, phase]) => phase),
    group: rows.map(([, , group]) => group),
    score: rows.map(([, , , score]) => score),
  });
}

function drawn(seed: number, children: number, spread: number): Row[] {
  const random = testRandom(seed);
  const normal = (): number => Math.sqrt(-2 * Math.log1p(-random())) * Math.cos(2 * Math.PI * random());
  return Array.from({ length: children }, (_, child) => {
    const level = 60 + spread * normal();
    return [0, 1].flatMap((phase) =>
      Array.from({ length: 1 + Math.floor(3 * random()) }, (): Row => {
        const group = child % 2;
        return [child, phase, group, level + 4 * phase + 3 * phase * group + 6 * normal()];
      }),
    );
  }).flat();
}

describe('linearMixedModel', () => {
  referenceTests<{ rows: Row[] }>(
    'mixed',
    ({ rows }) => {
      const got = modelOf(rows);
      expect(got.converged).toBe(true);
      const figures: Record<string, number> = {
        var_child: got.childVariance,
        var_resid: got.residualVariance,
        logLik_REML: got.logLikelihood,
        icc: got.childVariance / (got.childVariance + got.residualVariance),
      };
      got.fixed.forEach(({ estimate, standardError }, i) => {
        figures[`fixed.${i}`] = estimate;
        figures[`se.${i}`] = standardError;
      });
      return figures;
    },
    // Ten times closer than the file asks for.
    { only: ({ model }) => model === 'lmm', tolerance: () => ({ relative: 1e-8, absolute: 1e-9 }) },
  );

  test('balanced, one score a phase: the group difference in changes is the pooled t test of the changes, df and all', () => {
    const rows = Array.from({ length: 10 }, (_, child): Row[] => {
      const before = 50 + ((child * 37) % 23);
      const change = 3 + ((child * 17) % 11) + (child % 2) * 2;
      return [
        [child, 0, child % 2, before],
        [child, 1, child % 2, before + change],
      ];
    }).flat();
    const { fixed, converged } = modelOf(rows);
    expect(converged).toBe(true);
    const changes = [0, 1].map((group) =>
      Array.from({ length: 10 }, (_, child) => child)
        .filter((child) => child % 2 === group)
        .map((child) => 3 + ((child * 17) % 11) + group * 2),
    ) as [number[], number[]];
    // Equal numbers in both groups: the pooled and the Welch error are the same.
    const { difference, standardError } = welchDifference(changes[1], changes[0]);
    const interaction = fixed[3];
    expect(interaction?.name).toBe('phase:group');
    expectNear(interaction?.estimate as number, difference, 1e-8);
    expectNear(interaction?.standardError as number, standardError, 1e-8);
    expectNear(interaction?.df as number, 8, 1e-7);
    expectNear(
      fixed[1]?.estimate as number,
      pairedChange(
        changes[0].map(() => 0),
        changes[0],
      ).change,
      1e-8,
    );
    expectNear(fixed[1]?.df as number, 8, 1e-7);
  });

  test('stands where the derivative of the likelihood is 0, and that derivative agrees with differences', () => {
    for (let seed = 1; seed <= 8; seed++) {
      const rows = drawn(seed, 14, 9);
      const { childVariance, residualVariance, logLikelihood } = modelOf(rows);
      const children = [...new Set(rows.map(([child]) => child))].map((name): Child => {
        const own = rows.filter(([child]) => child === name);
        return { scores: own.map(([, , , score]) => score), rows: own.map(([, p, g]) => [1, p, g, p * g]) };
      });
      const design = designOf(children);
      const at = (c: number, e: number) => randomInterceptLikelihood(design, c, e) as RandomInterceptFit;
      const top = at(childVariance, residualVariance);
      expectNear(top.logLikelihood, logLikelihood);
      if (childVariance > 0) expect(Math.abs(gradientOf(top)[0])).toBeLessThan(1e-9);
      expect(Math.abs(gradientOf(top)[1])).toBeLessThan(1e-9);
      const height = (c: number, e: number): number => at(c, e).logLikelihood;
      const slopes = gradientOf(at(50, 40));
      expect(slopes[0]).toBeCloseTo((height(50.01, 40) - height(49.99, 40)) / 0.02, 6);
      expect(slopes[1]).toBeCloseTo((height(50, 40.01) - height(50, 39.99)) / 0.02, 6);
    }
  });

  test('without differences between children the child variance is 0 and least squares remain, with rows − 4 degrees', () => {
    const rows: Row[] = [];
    // Scores within a child further apart than children's means.
    for (let child = 0; child < 8; child++) {
      for (const phase of [0, 1])
        for (const swing of [-5, 5]) rows.push([child, phase, child % 2, 60 + phase * 4 + swing]);
    }
    const got = modelOf(rows);
    expect(got.converged).toBe(true);
    expect(got.childVariance).toBe(0);
    expectNear(got.residualVariance, (32 * 25) / 28, 1e-9);
    for (const { df } of got.fixed) expect(df).toBe(28);
    expectNear(got.fixed[1]?.estimate as number, 4, 1e-9);
  });

  test('does not change with the order of rows or the names of children; shifts and stretches with the scores', () => {
    const rows = drawn(5, 12, 8);
    const got = modelOf(rows);
    const back = modelOf([...rows].reverse());
    const renamed = linearMixedModel({
      child: rows.map(([child]) => `child ${99 - child}`),
      phase: rows.map(([, phase]) => phase),
      group: rows.map(([, , group]) => group),
      score: rows.map(([, , , score]) => 2 * score + 10),
    });
    got.fixed.forEach(({ estimate, standardError, df, p }, i) => {
      expectNear(back.fixed[i]?.estimate as number, estimate, 1e-8);
      expectNear(renamed.fixed[i]?.estimate as number, 2 * estimate + (i === 0 ? 10 : 0), 1e-8);
      expectNear(renamed.fixed[i]?.standardError as number, 2 * standardError, 1e-8);
      expectNear(renamed.fixed[i]?.df as number, df, 1e-6);
      if (i > 0) expectNear(renamed.fixed[i]?.p as number, p, 1e-6);
    });
    expectNear(renamed.childVariance, 4 * got.childVariance, 1e-7);
  });

  test('recovers the values it was simulated from within four standard errors', () => {
    const { fixed } = modelOf(drawn(77, 200, 9));
    [60, 4, 0, 3].forEach((truth, i) => {
      const { estimate, standardError } = fixed[i] as (typeof fixed)[number];
      expect(Math.abs(estimate - truth)).toBeLessThan(4 * standardError);
    });
  });

  test('is undefined, and says so, where the design or the data leave no estimate', () => {
    const oneGroup = drawn(4, 8, 5).map(([child, phase, , score]): Row => [child, phase, 0, score]);
    const oneRowEach: Row[] = Array.from({ length: 12 }, (_, i) => [
      i,
      i % 2,
      Math.floor(i / 2) % 2,
      50 + ((i * 7) % 5),
    ]);
    const noSpread: Row[] = Array.from({ length: 16 }, (_, i) => [i >> 1, i % 2, (i >> 1) % 2, 50]);
    for (const rows of [oneGroup, oneRowEach, noSpread, [], drawn(4, 1, 5)]) {
      const got = modelOf(rows);
      expect(got.converged).toBe(false);
      expect(got.childVariance).toBeNaN();
      expect(got.fixed.map(({ name }) => name)).toEqual(['intercept', 'phase', 'group', 'phase:group']);
      for (const { estimate, p, df } of got.fixed)
        for (const figure of [estimate, p, df]) expect(figure).toBeNaN();
    }
  });

  test('nonsense throws and names the argument', () => {
    const base = { score: [1, 2], phase: [0, 1], group: [0, 0], child: [1, 1] };
    expect(() => linearMixedModel({ ...base, phase: [0] })).toThrow(/^score, phase/);
    expect(() => linearMixedModel({ ...base, group: [0] })).toThrow(/^score, group/);
    expect(() => linearMixedModel({ ...base, child: [0] })).toThrow(/^score, child/);
    expect(() => linearMixedModel({ ...base, score: [1, Number.NaN] })).toThrow(/^score/);
    expect(() => linearMixedModel({ ...base, confidence: 0 })).toThrow(RangeError);
  });
});
