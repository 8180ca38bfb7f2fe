import { describe, expect, test } from 'vitest';
import { pretestPosttestControl } from '../../src/stats/pretestPosttestControl.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

interface Arm {
  before: number[];
  after: number[];
}

const treated: Arm = { before: [62, 70, 66, 58, 71], after: [74, 78, 70, 66, 80] };
const control: Arm = { before: [60, 72, 65, 63], after: [61, 70, 68, 64] };

function variance(values: number[]): number {
  const centre = values.reduce((x, y) => x + y, 0) / values.length;
  return values.reduce((sum, x) => sum + (x - centre) ** 2, 0) / (values.length - 1);
}

function correlation({ before, after }: Arm): number {
  const sum = before.map((x, i) => x + (after[i] as number));
  return (
    (variance(sum) - variance(before) - variance(after)) / (2 * Math.sqrt(variance(before) * variance(after)))
  );
}

describe('pretestPosttestControl', () => {
  referenceTests<{ g1: Arm; g2: Arm }>('independent_change', ({ g1, g2 }) => ({
    dppc2_morris2008: pretestPosttestControl(g1.before, g1.after, g2.before, g2.after).estimate,
  }));

  test('the variance is the printed one of Morris 2008, eq. 25 (formula from memory), computed apart', () => {
    const got = pretestPosttestControl(treated.before, treated.after, control.before, control.after);
    const rho = (4 * correlation(treated) + 3 * correlation(control)) / 7;
    const c = 1 - 3 / (4 * 7 - 1);
    const k = 1 / 5 + 1 / 4;
    const g = got.estimate;
    expectNear(
      got.variance,
      2 * c ** 2 * (1 - rho) * k * (7 / 5) * (1 + g ** 2 / (2 * (1 - rho) * k)) - g ** 2,
      1e-9,
    );
    expect(got.variance).toBeGreaterThan(0);
  });

  test('turns its sign when the arms change places, the variance stays', () => {
    const there = pretestPosttestControl(treated.before, treated.after, control.before, control.after);
    const back = pretestPosttestControl(control.before, control.after, treated.before, treated.after);
    expectNear(back.estimate, -there.estimate);
    expectNear(back.variance, there.variance);
  });

  test('is undefined with a lone child in an arm, without spread before, and in its variance for four children', () => {
    expect(pretestPosttestControl([1], [2], [1, 2], [2, 2]).estimate).toBeNaN();
    expect(pretestPosttestControl([5, 5], [6, 7], [8, 8], [9, 9]).estimate).toBeNaN();
    const four = pretestPosttestControl([1, 2], [2, 4], [1, 3], [1, 4]);
    expect(four.estimate).not.toBeNaN();
    expect(four.variance).toBeNaN();
    expect(pretestPosttestControl([1, 2, 3], [5, 5, 5], [1, 3, 4], [1, 4, 4]).variance).toBeNaN();
  });

  test('unequal lengths throw', () => {
    expect(() => pretestPosttestControl([1, 2], [1], [1, 2], [1, 2])).toThrow(RangeError);
  });
});
