import { describe, expect, test } from 'vitest';
import {
  comparedPairs,
  doubleCodedShares,
  pairDetails,
  recordsOf,
  visits,
} from '../../src/analysis/index.ts';
import { looksOf, pairOf, sessionsFrom } from './sessionsFrom.ts';

const criterion = { agreement: 0.8, kappa: 0.6 };

async function detailsOf(rows: Parameters<typeof sessionsFrom>[0]) {
  const [pair] = comparedPairs(visits(recordsOf(await sessionsFrom(rows))));
  if (pair === undefined) throw new Error('no pair');
  return pairDetails(pair, criterion);
}

describe('pairDetails', () => {
  test('lists each difference, and who missed what and why', async () => {
    const { differences, excludedBy } = await detailsOf([
      ...looksOf({ session: 'a', observer: 'Marsh', visit: 'v' }, { A: '11.0', B: '10.' }),
      ...looksOf({ session: 'b', observer: 'Quill', visit: 'v' }, { A: '1.10', B: '11' }),
    ]);
    expect(differences).toMatchObject([
      { number: 4, child: 'B', a: { labels: ['off-task'] }, b: { labels: ['on-task'] } },
    ]);
    expect(excludedBy).toEqual([
      { observer: 'Marsh', reason: 'missed', n: 2 },
      { observer: 'Quill', reason: 'missed', n: 1 },
      { observer: 'Quill', reason: null, n: 1 },
    ]);
  });

  test("the study's own criterion, agreement and kappa both", async () => {
    const met = async (table: Parameters<typeof pairOf>[0]) => (await detailsOf(pairOf(table))).criterionMet;
    expect(await met([40, 9, 6, 45])).toBe(true);
    // Feinstein & Cicchetti 1990: as much agreement, kappa .32.
    expect(await met([80, 10, 5, 5])).toBe(false);
    expect(await met([40, 15, 6, 39])).toBe(false);
    // Kappa is undefined, so nobody can say.
    expect(await met([60, 0, 0, 0])).toBeNull();
  });

  test('warnings: few intervals, and a code that prevails', async () => {
    const codes = async (table: Parameters<typeof pairOf>[0]) =>
      (await detailsOf(pairOf(table))).warnings.map(({ code }) => code);
    expect(await codes([24, 2, 2, 21])).toEqual(['fewPairedIntervals']);
    expect(await codes([24, 2, 2, 22])).toEqual([]);
    const { prevalence, warnings } = await detailsOf(pairOf([96, 6, 6, 2]));
    expect(prevalence?.mean).toBeCloseTo((100 * 102) / 110, 9);
    expect(warnings.map(({ code }) => code)).toEqual(['nearlyAlwaysOnTask', 'underCriterion']);
  });
});

test('the share double-coded, phase by phase', async () => {
  const rows = [
    ...pairOf([5, 0, 0, 5], { phase: 'before' }),
    ...[2, 3, 4, 5, 6].flatMap((n) =>
      looksOf({ session: `s${n}`, visit: `v${n}`, phase: n < 6 ? 'before' : 'after' }, { A: '10' }),
    ),
  ];
  expect(doubleCodedShares(visits(recordsOf(await sessionsFrom(rows))))).toEqual([
    { phase: 'after', visits: 1, doubleCoded: 0, percent: 0, enough: false },
    { phase: 'before', visits: 5, doubleCoded: 1, percent: 20, enough: true },
  ]);
});
