import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { expectedProportion } from '../../src/stats/expectedProportion.ts';
import { scoreBouts } from '../../src/stats/scoreBouts.ts';
import { simulateLesson } from '../../src/stats/simulateLesson.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

const length = fc.double({ min: 0.5, max: 500, noNaN: true });

describe('expectedProportion', () => {
  referenceTests<{ mu: number; lambda: number; c: number }>('sampling_bias', ({ mu, lambda, c }) => {
    const behaviour = { meanBout: mu, meanGap: lambda, observed: c };
    return {
      mts: expectedProportion('momentary', behaviour),
      pir: expectedProportion('partial', behaviour),
      wir: expectedProportion('whole', behaviour),
    };
  });

  test.each([
    [120, 30, [0.831, 0.857, 0.879, 0.897, 0.926, 0.973], [0.767, 0.736, 0.706, 0.677, 0.623, 0.485]],
    [40, 10, [0.879, 0.926, 0.955, 0.973, 0.99, 1], [0.706, 0.623, 0.55, 0.485, 0.378, 0.179]],
    [60, 60, [0.54, 0.577, 0.611, 0.642, 0.697, 0.816], [0.46, 0.423, 0.389, 0.358, 0.303, 0.184]],
    [15, 15, [0.642, 0.743, 0.816, 0.868, 0.932, 0.991], [0.358, 0.257, 0.184, 0.132, 0.068, 0.009]],
  ])(
    'table worked out by hand for 5, 10, 15, 20, 30, 60 s: bouts %i s, gaps %i s',
    (meanBout, meanGap, partial, whole) => {
      [5, 10, 15, 20, 30, 60].forEach((observed, i) => {
        const behaviour = { meanBout, meanGap, observed };
        expect(expectedProportion('partial', behaviour)).toBeCloseTo(partial[i] as number, 3);
        expect(expectedProportion('whole', behaviour)).toBeCloseTo(whole[i] as number, 3);
      });
    },
  );

  test('whole ≤ momentary ≤ partial; whole of the behaviour is what partial of its absence leaves', () => {
    fc.assert(
      fc.property(length, length, length, (meanBout, meanGap, observed) => {
        const on = { meanBout, meanGap, observed };
        const off = { meanBout: meanGap, meanGap: meanBout, observed };
        const [whole, momentary, partial] = (['whole', 'momentary', 'partial'] as const).map((method) =>
          expectedProportion(method, on),
        ) as [number, number, number];
        expect(whole).toBeLessThanOrEqual(momentary);
        expect(momentary).toBeLessThanOrEqual(partial);
        expect(partial).toBeLessThanOrEqual(1);
        expectNear(whole, 1 - expectedProportion('partial', off));
        expectNear(expectedProportion('partial', { ...on, observed: 0 }), momentary);
      }),
    );
  });

  test('agrees with simulated lessons within four Monte-Carlo errors', () => {
    const random = testRandom(20);
    const behaviour = { meanBout: 40, meanGap: 10 };
    const lessons = 3000;
    for (const method of ['momentary', 'partial', 'whole'] as const) {
      const shares = Array.from({ length: lessons }, () => {
        const scores = scoreBouts(simulateLesson({ ...behaviour, seconds: 300, random }), method, {
          interval: 15,
          observed: 10,
          seconds: 300,
        });
        return scores.filter(Boolean).length / scores.length;
      });
      const centre = shares.reduce((x, y) => x + y, 0) / lessons;
      const spread = shares.reduce((sum, x) => sum + (x - centre) ** 2, 0) / (lessons - 1);
      const error = Math.sqrt(spread / lessons);
      const expected = expectedProportion(method, { ...behaviour, observed: 10 });
      expect(Math.abs(centre - expected)).toBeLessThan(4 * error);
    }
  });

  test('nonsense throws and names the argument', () => {
    const behaviour = { meanBout: 1, meanGap: 1, observed: 1 };
    expect(() => expectedProportion('partial', { ...behaviour, meanBout: 0 })).toThrow(/^meanBout/);
    expect(() => expectedProportion('partial', { ...behaviour, meanGap: -1 })).toThrow(/^meanGap/);
    expect(() => expectedProportion('partial', { ...behaviour, observed: -1 })).toThrow(/^observed/);
    expect(() => expectedProportion('whole', { meanBout: 1, meanGap: 1 })).toThrow(/^observed/);
    expect(expectedProportion('momentary', { meanBout: 3, meanGap: 1 })).toBe(0.75);
    expect(() => expectedProportion('half' as 'whole', behaviour)).toThrow(/^method/);
    expect(() => expectedProportion('whole', { ...behaviour, meanGap: Number.NaN })).toThrow(RangeError);
  });
});
