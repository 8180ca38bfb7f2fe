import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Bout, scoreBouts, simulateLesson } from '../../src/stats/index.ts';
import { testRandom } from './testRandom.ts';

const ten = { interval: 10, observed: 10, seconds: 30 };

function gapsOf(bouts: Bout[], seconds: number): Bout[] {
  const edges = [0, ...bouts.flatMap(({ on, off }) => [on, off]), seconds];
  const gaps: Bout[] = [];
  for (let i = 0; i < edges.length; i += 2) {
    const gap = { on: edges[i] as number, off: edges[i + 1] as number };
    if (gap.off > gap.on) gaps.push(gap);
  }
  return gaps;
}

describe('scoreBouts', () => {
  test('one bout from 4 to 17 in three intervals, by hand', () => {
    const bouts = [{ on: 4, off: 17 }];
    expect(scoreBouts(bouts, 'partial', ten)).toEqual([true, true, false]);
    expect(scoreBouts(bouts, 'momentary', ten)).toEqual([true, false, false]);
    expect(scoreBouts(bouts, 'whole', ten)).toEqual([false, false, false]);
  });

  test('what happens in the recording part is not seen', () => {
    const options = { interval: 15, observed: 10, seconds: 30 };
    expect(scoreBouts([{ on: 11, off: 14 }], 'partial', options)).toEqual([false, false]);
    expect(scoreBouts([{ on: 0, off: 10 }], 'whole', options)).toEqual([true, false]);
    expect(scoreBouts([{ on: 9, off: 16 }], 'momentary', options)).toEqual([true, false]);
  });

  test('a bout that ends at the look counts, one that begins there does not; touching bouts make a whole', () => {
    expect(scoreBouts([{ on: 5, off: 10 }], 'momentary', ten)).toEqual([true, false, false]);
    expect(scoreBouts([{ on: 10, off: 15 }], 'momentary', ten)).toEqual([false, false, false]);
    expect(scoreBouts([{ on: 10, off: 15 }], 'partial', ten)).toEqual([false, true, false]);
    expect(
      scoreBouts(
        [
          { on: 0, off: 4 },
          { on: 4, off: 10 },
        ],
        'whole',
        ten,
      ),
    ).toEqual([true, false, false]);
  });

  test('where nothing is watched, all three are the state at the opening', () => {
    for (const method of ['partial', 'momentary', 'whole'] as const) {
      expect(scoreBouts([{ on: 10, off: 15 }], method, { ...ten, observed: 0 })).toEqual([
        false,
        true,
        false,
      ]);
      expect(scoreBouts([{ on: 0, off: 10 }], method, { ...ten, observed: 0 })).toEqual([true, false, false]);
    }
  });

  test('a last interval that is cut short is left out; tenths of seconds are counted right', () => {
    expect(scoreBouts([], 'partial', { interval: 10, observed: 10, seconds: 29.9 })).toHaveLength(2);
    expect(scoreBouts([], 'partial', { interval: 0.1, observed: 0.1, seconds: 3 })).toHaveLength(30);
    expect(scoreBouts([], 'whole', ten)).toEqual([false, false, false]);
  });

  test('whole ≤ momentary ≤ partial in every interval, and WIR(on) = 1 − PIR(off)', () => {
    fc.assert(
      fc.property(
        fc.integer(),
        fc.integer({ min: 2, max: 120 }),
        fc.integer({ min: 2, max: 120 }),
        fc.integer({ min: 1, max: 30 }),
        fc.integer({ min: 1, max: 30 }),
        (seed, meanBout, meanGap, x, y) => {
          const options = { interval: Math.max(x, y), observed: Math.min(x, y), seconds: 600 };
          const bouts = simulateLesson({ meanBout, meanGap, seconds: 600, random: testRandom(seed) });
          const partial = scoreBouts(bouts, 'partial', options);
          const momentary = scoreBouts(bouts, 'momentary', options);
          const whole = scoreBouts(bouts, 'whole', options);
          const absent = scoreBouts(gapsOf(bouts, 600), 'partial', options);
          whole.forEach((scored, i) => {
            if (scored) expect(momentary[i]).toBe(true);
            if (momentary[i]) expect(partial[i]).toBe(true);
            expect(scored).toBe(!absent[i]);
          });
        },
      ),
    );
  });

  test('the true share lies between whole and partial when all of every interval is watched', () => {
    fc.assert(
      fc.property(fc.integer(), fc.integer({ min: 1, max: 60 }), (seed, interval) => {
        const seconds = interval * 20;
        const bouts = simulateLesson({ meanBout: 30, meanGap: 15, seconds, random: testRandom(seed) });
        const share = bouts.reduce((sum, { on, off }) => sum + off - on, 0) / seconds;
        const count = (method: 'whole' | 'partial'): number =>
          scoreBouts(bouts, method, { interval, observed: interval, seconds }).filter(Boolean).length / 20;
        expect(count('whole')).toBeLessThanOrEqual(share + 1e-12);
        expect(count('partial')).toBeGreaterThanOrEqual(share - 1e-12);
      }),
    );
  });

  test('nonsense throws and names the argument', () => {
    expect(() => scoreBouts([], 'whole', { ...ten, interval: 0 })).toThrow(/^interval/);
    expect(() => scoreBouts([], 'whole', { ...ten, observed: 11 })).toThrow(/^observed/);
    expect(() => scoreBouts([], 'whole', { ...ten, seconds: Number.NaN })).toThrow(/^seconds/);
    expect(() => scoreBouts([{ on: 5, off: 4 }], 'whole', ten)).toThrow(/^bouts/);
    expect(() =>
      scoreBouts(
        [
          { on: 5, off: 9 },
          { on: 8, off: 10 },
        ],
        'whole',
        ten,
      ),
    ).toThrow(RangeError);
    expect(() => scoreBouts([], 'some' as 'whole', ten)).toThrow(/^method/);
  });
});
