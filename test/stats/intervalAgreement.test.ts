import { describe, expect, test } from 'vitest';
import { intervalAgreement } from '../../src/stats/intervalAgreement.ts';
import { referenceTests } from './referenceCases.ts';

type Codes = (string | number | null)[];

function fromTable(a: number, b: number, c: number, d: number) {
  const run = (times: number, code: string): string[] => new Array<string>(times).fill(code);
  return intervalAgreement(
    [...run(a, 'on'), ...run(b, 'on'), ...run(c, 'off'), ...run(d, 'off')],
    [...run(a, 'on'), ...run(b, 'off'), ...run(c, 'on'), ...run(d, 'off')],
    'on',
  );
}

describe('intervalAgreement', () => {
  referenceTests<{ obs1: Codes; obs2: Codes; target: string | number }>(
    'interval_agreement',
    ({ obs1, obs2, target }) => {
      const got = intervalAgreement(obs1, obs2, target);
      return {
        n_scored: got.compared,
        overall_codes_pct: 100 * got.overall,
        occurrence_pct: 100 * got.occurrence,
        nonoccurrence_pct: 100 * got.nonOccurrence,
        mean_occ_nonocc_pct: 100 * got.mean,
        total_count_joint_pct: 100 * got.totalCount,
      };
    },
  );

  test.each([
    [40, 9, 6, 45, 0.85, 0.7273, 0.75, 0.939],
    [80, 10, 5, 5, 0.85, 0.8421, 0.25, 0.944],
    [50, 5, 5, 40, 0.9, 0.8333, 0.8, 1],
    [96, 6, 6, 12, 0.9, 0.8889, 0.5, 1],
    [90, 5, 5, 0, 0.9, 0.9, 0, 1],
    [57, 3, 0, 0, 0.95, 0.95, 0, 0.95],
  ])(
    'by hand; first two tables of Feinstein & Cicchetti 1990: %i %i %i %i',
    (a, b, c, d, overall, occ, non, total) => {
      const got = fromTable(a, b, c, d);
      expect(got.overall).toBeCloseTo(overall, 10);
      expect(got.occurrence).toBeCloseTo(occ, 4);
      expect(got.nonOccurrence).toBeCloseTo(non, 4);
      expect(got.totalCount).toBeCloseTo(total, 3);
    },
  );

  test('is undefined where nothing could be agreed on', () => {
    const oneCode = fromTable(60, 0, 0, 0);
    expect(oneCode.occurrence).toBe(1);
    expect(oneCode.nonOccurrence).toBeNaN();
    expect(oneCode.mean).toBeNaN();
    expect(fromTable(0, 0, 0, 9).totalCount).toBeNaN();
    const nothing = intervalAgreement([], [], 'on');
    expect(nothing.compared).toBe(0);
    expect(nothing.overall).toBeNaN();
  });

  test('typed arrays with −1 for missing, and other codes told apart in the overall figure', () => {
    const got = intervalAgreement(Int8Array.of(0, 1, 2, -1), Int8Array.of(0, 2, 1, 0), 0);
    expect(got).toMatchObject({ compared: 3, overall: 1 / 3, occurrence: 1, nonOccurrence: 1 });
  });

  test('unequal lengths throw', () => {
    expect(() => intervalAgreement(['on'], [], 'on')).toThrow(RangeError);
    expect(() => intervalAgreement(['on'], [], 'on')).toThrow(/^a, b/);
  });
});
