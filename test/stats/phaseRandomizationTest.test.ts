import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { phaseRandomizationTest } from '../../src/stats/phaseRandomizationTest.ts';
import { expectNear } from './near.ts';
import { handA, handB } from './nonoverlapCases.ts';
import { referenceTests } from './referenceCases.ts';

interface Input {
  scores: (number | null)[];
  start: number;
  admissible: number[];
}

type Alternative = 'increase' | 'decrease' | 'two-sided';

function run({ scores, start, admissible }: Input, alternative: Alternative) {
  const options = {
    minBefore: Math.min(...admissible),
    minAfter: scores.length - Math.max(...admissible),
    alternative,
  };
  return phaseRandomizationTest(scores, start, options);
}

/** Every admissible start, its two means computed apart, in whole numbers where the scores are. */
function byEnumeration(
  scores: (number | null)[],
  start: number,
  from: number,
  to: number,
  alternative: Alternative,
) {
  const at = (s: number): [number, number] => {
    const before = scores.slice(0, s).filter((score) => score !== null);
    const after = scores.slice(s).filter((score) => score !== null);
    const sum = (list: number[]): number => list.reduce((x, y) => x + y, 0);
    return [sum(after) * before.length - sum(before) * after.length, before.length * after.length];
  };
  const [top, bottom] = at(start);
  let count = 0;
  let all = 0;
  for (let s = from; s <= to; s++) {
    const [t, b] = at(s);
    if (b === 0) continue;
    all++;
    const difference = t * bottom - top * b;
    if (alternative === 'increase' && difference >= 0) count++;
    if (alternative === 'decrease' && difference <= 0) count++;
    if (alternative === 'two-sided' && Math.abs(t) * bottom >= Math.abs(top) * b) count++;
  }
  return { p: bottom === 0 ? Number.NaN : count / all, arrangements: all };
}

describe('phaseRandomizationTest', () => {
  referenceTests<Input>(
    'randomization',
    (input) => {
      const increase = run(input, 'increase');
      return {
        observed: increase.statistic,
        n_assignments: increase.arrangements,
        p_increase: increase.p,
        p_decrease: run(input, 'decrease').p,
        p_two_sided: run(input, 'two-sided').p,
      };
    },
    { only: ({ design }) => design === 'AB' },
  );

  // Several classes with staggered starts are outside this measure; each class by itself is inside it.
  referenceTests<{ classes: Input[] }>(
    'randomization',
    ({ classes }) => {
      const figures: Record<string, number> = {};
      classes.forEach((one, i) => {
        figures[`per_class_observed.${i}`] = run(one, 'increase').statistic;
      });
      return figures;
    },
    { only: ({ design }) => design === 'MB' },
  );

  test('by hand: five admissible starts, the largest difference, p = .20, its floor', () => {
    const got = phaseRandomizationTest([...handA, ...handB], 5, {
      minBefore: 3,
      minAfter: 3,
      alternative: 'increase',
    });
    expectNear(got.statistic, 9.6);
    expect(got.p).toBe(0.2);
    expect(got.arrangements).toBe(5);
  });

  test('is the share counted by exact enumeration, with missing sessions and ties, also in tenths', () => {
    const score = fc.option(fc.integer({ min: 0, max: 4 }), { nil: null, freq: 6 });
    fc.assert(
      fc.property(
        fc.array(score, { minLength: 4, maxLength: 16 }),
        fc.nat(),
        fc.constantFrom<Alternative>('increase', 'decrease', 'two-sided'),
        (scores, pick, alternative) => {
          const start = 1 + (pick % (scores.length - 1));
          const options = { minBefore: 1, minAfter: 1, alternative };
          const want = byEnumeration(scores, start, 1, scores.length - 1, alternative);
          expect(phaseRandomizationTest(scores, start, options)).toMatchObject(want);
          const tenths = scores.map((x) => (x === null ? null : x / 10));
          expect(phaseRandomizationTest(tenths, start, options)).toMatchObject(want);
        },
      ),
    );
  });

  test('a phase without scores is undefined', () => {
    const got = phaseRandomizationTest([null, null, 3, 4], 1, {
      minBefore: 1,
      minAfter: 1,
      alternative: 'two-sided',
    });
    expect(got).toEqual({ statistic: Number.NaN, p: Number.NaN, arrangements: 1 });
    const empty = phaseRandomizationTest([null, null], 1, {
      minBefore: 1,
      minAfter: 1,
      alternative: 'increase',
    });
    expect(empty.p).toBeNaN();
    expect(empty.arrangements).toBe(0);
  });

  test('nonsense throws and names the argument', () => {
    const options = { minBefore: 2, minAfter: 2, alternative: 'increase' } as const;
    expect(() => phaseRandomizationTest([1, 2, 3, 4], 1, options)).toThrow(/^start/);
    expect(() => phaseRandomizationTest([1, 2, 3, 4], 3, options)).toThrow(/^start/);
    expect(() => phaseRandomizationTest([1, 2, 3, 4], 2.5, options)).toThrow(RangeError);
    expect(() => phaseRandomizationTest([1, 2, 3, 4], 2, { ...options, minBefore: 0 })).toThrow(/^minBefore/);
    expect(() => phaseRandomizationTest([1, 2, 3, 4], 2, { ...options, minAfter: 0.5 })).toThrow(/^minAfter/);
    expect(() =>
      phaseRandomizationTest([1, 2, 3, 4], 2, { ...options, alternative: 'up' as 'increase' }),
    ).toThrow(/^alternative/);
    expect(() => phaseRandomizationTest([1, Number.NaN, 3, 4], 2, options)).toThrow(/^series/);
  });
});
