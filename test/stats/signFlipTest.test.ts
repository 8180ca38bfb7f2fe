import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { signFlipTest } from '../../src/stats/signFlipTest.ts';
import { expectNear } from './near.ts';
import { casesOf, referenceTests } from './referenceCases.ts';
import { testRandom } from './testRandom.ts';

interface Input {
  before: number[];
  after: number[];
}

const differences = ({ before, after }: Input): number[] =>
  after.map((score, i) => score - (before[i] as number));

/** All 2^n arrangements of whole numbers, counted one by one. */
function byEnumeration(values: number[]): number {
  const observed = Math.abs(values.reduce((x, y) => x + y, 0));
  let count = 0;
  for (let bits = 0; bits < 2 ** values.length; bits++) {
    const sum = values.reduce((total, value, i) => total + ((bits >> i) & 1 ? value : -value), 0);
    if (Math.abs(sum) >= observed) count++;
  }
  return count / 2 ** values.length;
}

describe('signFlipTest', () => {
  referenceTests<Input>('paired_change', (input) => ({ signflip_p: signFlipTest(differences(input)) }), {
    only: (_, { signflip_p }) => signflip_p !== null,
  });

  test('six children by hand: 6 of 64', () => {
    const before = [70, 80, 50, 800 / 9, 500 / 9, 100];
    const after = [90, 90, 70, 100, 87.5, 90];
    expect(signFlipTest(differences({ before, after }))).toBe(6 / 64);
  });

  test("Darwin's fifteen pairs of plants, Fisher 1935: p .0526 (863 arrangements a side as extreme or more; from memory)", () => {
    const darwin = [49, -67, 8, 16, 6, 23, 28, 41, 14, 29, 56, 24, 75, 60, -48];
    expect(signFlipTest(darwin)).toBe((2 * 863) / 2 ** 15);
  });

  test('is the share counted by exact enumeration, zeros and ties included', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: -6, max: 6 }), { minLength: 1, maxLength: 10 }), (values) => {
        expect(signFlipTest(values)).toBe(byEnumeration(values));
        // The same in tenths, where equal sums differ in the last bits.
        expect(signFlipTest(values.map((value) => value / 10))).toBe(byEnumeration(values));
        expect(signFlipTest(values.map((value) => -value))).toBe(byEnumeration(values));
      }),
    );
  });

  test('beyond 20 differences, drawn arrangements come close to the exact share', () => {
    // Twenty-two differences that add up to 6: exact share by the distribution of the number of positive signs.
    const values = [...new Array<number>(14).fill(1), ...new Array<number>(8).fill(-1)];
    let exact = 0;
    let ways = 1;
    for (let k = 0; k <= 22; k++) {
      if (Math.abs(2 * k - 22) >= 6) exact += ways / 2 ** 22;
      ways = (ways * (22 - k)) / (k + 1);
    }
    const draws = 20000;
    const p = signFlipTest(values, { random: testRandom(1), draws });
    expect(Math.abs(p - exact)).toBeLessThan(4 * Math.sqrt((exact * (1 - exact)) / draws));
    expectNear((p * (draws + 1)) % 1, 0, 1);
  });

  test('drawn: p = (as extreme + 1)/(draws + 1), never 0', () => {
    const far = new Array<number>(30).fill(1);
    expect(signFlipTest(far, { random: testRandom(2), draws: 99 })).toBe(1 / 100);
  });

  test('twenty differences are still exact and need no generator', () => {
    expect(signFlipTest(new Array<number>(20).fill(3))).toBe(2 / 2 ** 20);
    expect(casesOf('paired_change').length).toBeGreaterThan(0);
  });

  test('no difference is undefined, only zeros give 1', () => {
    expect(signFlipTest([])).toBeNaN();
    expect(signFlipTest([0, 0, 0])).toBe(1);
  });

  test('nonsense throws and names the argument', () => {
    expect(() => signFlipTest([Number.NaN])).toThrow(/^differences/);
    expect(() => signFlipTest(new Array<number>(21).fill(1))).toThrow(/^sampling/);
    expect(() => signFlipTest(new Array<number>(21).fill(1), { random: testRandom(1), draws: 0 })).toThrow(
      /^draws/,
    );
    expect(() => signFlipTest(new Array<number>(21).fill(1))).toThrow(RangeError);
  });
});
