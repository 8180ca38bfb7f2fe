import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { simulateLesson } from '../../src/stats/simulateLesson.ts';
import { testRandom } from './testRandom.ts';

describe('simulateLesson', () => {
  test('gives sorted bouts, apart from each other, none empty, within the lesson', () => {
    fc.assert(
      fc.property(
        fc.integer(),
        fc.double({ min: 1, max: 200, noNaN: true }),
        fc.double({ min: 1, max: 200, noNaN: true }),
        fc.integer({ min: 0, max: 2000 }),
        (seed, meanBout, meanGap, seconds) => {
          const bouts = simulateLesson({ meanBout, meanGap, seconds, random: testRandom(seed) });
          let last = -1;
          for (const { on, off } of bouts) {
            expect(on).toBeGreaterThan(last);
            expect(off).toBeGreaterThan(on);
            last = off;
          }
          expect(last).toBeLessThanOrEqual(seconds);
        },
      ),
    );
  });

  test('the same generator gives the same lesson', () => {
    const lesson = () => simulateLesson({ meanBout: 40, meanGap: 10, seconds: 900, random: testRandom(7) });
    expect(lesson()).toEqual(lesson());
  });

  test('is in equilibrium: share of time, share on at the start and bouts a second within four errors', () => {
    const random = testRandom(11);
    const lessons = 4000;
    const seconds = 600;
    const time: number[] = [];
    let atStart = 0;
    let begun = 0;
    for (let i = 0; i < lessons; i++) {
      const bouts = simulateLesson({ meanBout: 30, meanGap: 20, seconds, random });
      time.push(bouts.reduce((sum, { on, off }) => sum + off - on, 0) / seconds);
      if (bouts[0]?.on === 0) atStart++;
      begun += bouts.filter(({ on }) => on > 0).length;
    }
    const centre = time.reduce((x, y) => x + y, 0) / lessons;
    const error = Math.sqrt(time.reduce((sum, x) => sum + (x - centre) ** 2, 0) / (lessons - 1) / lessons);
    expect(Math.abs(centre - 0.6)).toBeLessThan(4 * error);
    expect(Math.abs(atStart / lessons - 0.6)).toBeLessThan(4 * Math.sqrt(0.24 / lessons));
    // Bouts begin at rate 1/(μ + λ); their number varies less than a Poisson number would.
    const expected = (lessons * seconds) / 50;
    expect(Math.abs(begun - expected)).toBeLessThan(4 * Math.sqrt(expected));
  });

  test('nonsense throws and names the argument', () => {
    const options = { meanBout: 1, meanGap: 1, seconds: 1, random: () => 0.5 };
    expect(() => simulateLesson({ ...options, meanBout: 0 })).toThrow(/^meanBout/);
    expect(() => simulateLesson({ ...options, meanGap: Number.POSITIVE_INFINITY })).toThrow(/^meanGap/);
    expect(() => simulateLesson({ ...options, seconds: -1 })).toThrow(RangeError);
    expect(() => simulateLesson({ ...options, random: undefined as unknown as () => number })).toThrow(
      /^random/,
    );
    expect(simulateLesson({ ...options, seconds: 0 })).toEqual([]);
  });
});
