import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { standardizedMeanChange } from '../../src/stats/standardizedMeanChange.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

const before = [70, 80, 50, 800 / 9, 500 / 9, 100];
const after = [90, 90, 70, 100, 87.5, 90];

describe('standardizedMeanChange', () => {
  referenceTests<{ before: number[]; after: number[] }>('paired_change', (input) => {
    const raw = standardizedMeanChange(input.before, input.after, 'raw-score');
    const changes = standardizedMeanChange(input.before, input.after, 'change-score');
    return {
      smcr_yi: raw.estimate,
      smcr_vi: raw.variance,
      smcc_yi: changes.estimate,
      smcc_vi: changes.variance,
    };
  });

  test('six children by hand: mean change 13.8426, SD before 19.3176, SD of changes 14.1011, J(5) = .8408', () => {
    const j = 0.8407487;
    expect(standardizedMeanChange(before, after, 'raw-score').estimate).toBeCloseTo(
      (j * 13.8426) / 19.3176,
      4,
    );
    expect(standardizedMeanChange(before, after, 'change-score').estimate).toBeCloseTo(
      (j * 13.8426) / 14.1011,
      4,
    );
  });

  test('does not change with the unit of the scores; turns its sign with before and after (change-score)', () => {
    const pair = fc.tuple(fc.integer({ min: 0, max: 100 }), fc.integer({ min: 0, max: 100 }));
    fc.assert(
      fc.property(fc.array(pair, { minLength: 3, maxLength: 30 }), (pairs) => {
        const x = pairs.map(([first]) => first);
        const y = pairs.map(([, second]) => second);
        for (const kind of ['raw-score', 'change-score'] as const) {
          const plain = standardizedMeanChange(x, y, kind);
          const scaled = standardizedMeanChange(
            x.map((v) => v / 8),
            y.map((v) => v / 8),
            kind,
          );
          if (Number.isNaN(plain.estimate)) expect(scaled.estimate).toBeNaN();
          else expectNear(scaled.estimate, plain.estimate);
          if (!Number.isNaN(plain.variance)) expectNear(scaled.variance, plain.variance);
        }
        const there = standardizedMeanChange(x, y, 'change-score');
        if (!Number.isNaN(there.estimate)) {
          const back = standardizedMeanChange(y, x, 'change-score');
          expectNear(back.estimate, -there.estimate);
          expectNear(back.variance, there.variance);
        }
      }),
    );
  });

  test('is undefined for two pairs, without spread, and in its variance when the scores after are all the same', () => {
    expect(standardizedMeanChange([1, 2], [3, 5], 'raw-score')).toEqual({
      estimate: Number.NaN,
      variance: Number.NaN,
    });
    expect(standardizedMeanChange([], [], 'change-score').estimate).toBeNaN();
    expect(standardizedMeanChange([5, 5, 5], [1, 2, 3], 'raw-score').estimate).toBeNaN();
    expect(standardizedMeanChange([0.1, 0.2, 0.7], [0.2, 0.3, 0.8], 'change-score').estimate).toBeNaN();
    const ceiling = standardizedMeanChange([50, 60, 70], [100, 100, 100], 'raw-score');
    expect(ceiling.estimate).toBeGreaterThan(0);
    expect(ceiling.variance).toBeNaN();
  });

  test('nonsense throws and names the argument', () => {
    expect(() => standardizedMeanChange([1], [1, 2], 'raw-score')).toThrow(/^before, after/);
    expect(() => standardizedMeanChange([1], [2], 'other' as 'raw-score')).toThrow(/^kind/);
    expect(() => standardizedMeanChange([Number.NaN], [2], 'raw-score')).toThrow(RangeError);
  });
});
