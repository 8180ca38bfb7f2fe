import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type TimedInterval, whoseTouch } from '../../src/recorder/whoseTouch.ts';

/** One part of intervals without gaps, cues at 15 s, 30 s … */
const part = (n: number, from = 0, first = 1): TimedInterval[] =>
  Array.from({ length: n }, (_, k) => ({
    number: first + k,
    cueAt: from + (k + 1) * 15_000,
    closeAt: from + (k + 2) * 15_000,
  }));

const ask = (intervals: TimedInterval[], at: number, empty: (n: number) => boolean = () => true) =>
  whoseTouch({ intervals, at, graceMs: 400, isEmpty: empty, isBarred: () => false, before: null });

describe('whoseTouch', () => {
  it('agrees with a plain reading of the rule, at every millisecond that matters', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 12 }),
        fc.integer({ min: 0, max: 13 }),
        fc.integer({ min: -450, max: 450 }),
        fc.array(fc.boolean(), { minLength: 13, maxLength: 13 }),
        (n, cue, off, marked) => {
          const at = cue * 15_000 + off;
          const answer = ask(part(n), at, (number) => !marked[number - 1]);
          // The interval whose cue came last, counted without looking at the list.
          const last = Math.floor(at / 15_000);
          if (last < 1) expect(answer).toEqual({ taken: false, why: 'before the first cue' });
          else if (last > n) expect(answer).toEqual({ taken: false, why: 'after the last interval' });
          else {
            const late = at - last * 15_000 <= 400 && last >= 2 && !marked[last - 2];
            const interval = late ? last - 1 : last;
            expect(answer).toEqual({ taken: true, interval, late, before: false });
          }
        },
      ),
      { seed: 20261103, numRuns: 2000 },
    );
  });

  it('has no grace over a break: the first interval of a part has none before it', () => {
    const both = [...part(3), ...part(3, 100_000, 4)];
    expect(ask(both, 115_100)).toMatchObject({ taken: true, interval: 4, late: false });
    expect(ask(both, 99_999)).toEqual({ taken: false, why: 'after the last interval' });
  });

  it('takes nothing for barred intervals, also not by "child before"', () => {
    const barred = (before: number | null, at: number) =>
      whoseTouch({
        intervals: part(5),
        at,
        graceMs: 400,
        isEmpty: () => true,
        isBarred: (number) => number === 2,
        before,
      });
    expect(barred(null, 31_000)).toEqual({ taken: false, why: 'class interrupted' });
    expect(barred(2, 46_000)).toEqual({ taken: false, why: 'class interrupted' });
    // Within the grace after the next cue the barred one is passed over.
    expect(barred(null, 45_100)).toMatchObject({ interval: 3, late: false });
  });
});
