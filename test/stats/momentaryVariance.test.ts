import { describe, expect, test } from 'vitest';
import { momentaryVariance, simulateLesson } from '../../src/stats/index.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

describe('momentaryVariance', () => {
  referenceTests<{ mu: number; lambda: number; delta: number; K: number }>(
    'sampling_bias',
    ({ mu, lambda, delta, K }) => {
      const phi = mu / (mu + lambda);
      const variance = momentaryVariance(phi, K, delta, { meanBout: mu, meanGap: lambda });
      return {
        mts_var: variance,
        mts_sd: Math.sqrt(variance),
        effective_looks: (phi * (1 - phi)) / variance,
      };
    },
  );

  test.each([
    [40, 10, 5, 180, 5.4],
    [40, 10, 15, 60, 6.0],
    [40, 10, 30, 30, 7.5],
    [40, 10, 60, 15, 10.3],
    [120, 30, 5, 180, 9.1],
    [120, 30, 15, 60, 9.3],
    [120, 30, 30, 30, 9.7],
    [120, 30, 60, 15, 11.2],
  ])(
    '15 minutes of one child, worked out by hand: bouts %i s, gaps %i s, every %i s, %i looks: %d points',
    (meanBout, meanGap, spacing, looks, points) => {
      const error = 100 * Math.sqrt(momentaryVariance(0.8, looks, spacing, { meanBout, meanGap }));
      expect(error).toBeCloseTo(points, 1);
    },
  );

  test('agrees with simulated lessons within four Monte-Carlo errors', () => {
    const random = testRandom(31);
    const shares = Array.from({ length: 6000 }, () => {
      const bouts = simulateLesson({ meanBout: 20, meanGap: 20, seconds: 100, random });
      let on = 0;
      for (let look = 1; look <= 10; look++) {
        if (bouts.some((bout) => bout.on <= look * 10 - 5 && look * 10 - 5 < bout.off)) on++;
      }
      return on / 10;
    });
    const centre = shares.reduce((x, y) => x + y, 0) / shares.length;
    const squares = shares.map((share) => (share - centre) ** 2);
    const variance = squares.reduce((x, y) => x + y, 0) / (shares.length - 1);
    const spread = squares.reduce((sum, x) => sum + (x - variance) ** 2, 0) / shares.length;
    const expected = momentaryVariance(0.5, 10, 10, { meanBout: 20, meanGap: 20 });
    expect(Math.abs(variance - expected)).toBeLessThan(4 * Math.sqrt(spread / shares.length));
  });

  test('one look is a coin, far looks are independent, looks at one instant are one look', () => {
    const bouts = { meanBout: 10, meanGap: 30 };
    expectNear(momentaryVariance(0.25, 1, 10, bouts), 0.1875);
    expectNear(momentaryVariance(0.25, 50, 1e6, bouts), 0.1875 / 50);
    expectNear(momentaryVariance(0.25, 50, 0, bouts), 0.1875);
    expect(momentaryVariance(0, 50, 10, bouts)).toBe(0);
  });

  test('no look is undefined; nonsense throws and names the argument', () => {
    const bouts = { meanBout: 10, meanGap: 30 };
    expect(momentaryVariance(0.5, 0, 10, bouts)).toBeNaN();
    expect(() => momentaryVariance(1.5, 1, 10, bouts)).toThrow(/^phi/);
    expect(() => momentaryVariance(0.5, 1.5, 10, bouts)).toThrow(/^looks/);
    expect(() => momentaryVariance(0.5, 1, -1, bouts)).toThrow(/^spacing/);
    expect(() => momentaryVariance(0.5, 1, 1, { meanBout: 0, meanGap: 1 })).toThrow(RangeError);
  });
});
