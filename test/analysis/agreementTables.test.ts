import { describe, expect, test } from 'vitest';
import { agreementReport, recordsOf, visits } from '../../src/analysis/index.ts';
import { looksOf, pairOf, sessionsFrom } from './sessionsFrom.ts';

async function agreementOf(rows: Parameters<typeof sessionsFrom>[0]) {
  return agreementReport(visits(recordsOf(await sessionsFrom(rows)))).report;
}

describe('agreement of two observers', () => {
  // First two tables: Feinstein & Cicchetti 1990 (kappa .70 and .32 at 85 % agreement); the others by hand.
  test.each([
    [[40, 9, 6, 45], 85, 50.08, 0.6995, 0.56, 0.839, 0.7007, 72.73, 75, 0.94],
    [[80, 10, 5, 5], 85, 78, 0.3182, 0.057, 0.58, 0.808, 84.21, 25, 0.773],
    [[50, 5, 5, 40], 90, 50.5, 0.798, 0.679, 0.917, 0.802, 83.33, 80, 1],
    [[96, 6, 6, 12], 90, 74.5, 0.6078, 0.406, 0.809, 0.8658, 88.89, 50, 1],
  ] as const)(
    '%j',
    async (table, agreed, chance, kappa, lower, upper, ac1, occurrence, nonOccurrence, most) => {
      const { pairs } = await agreementOf(pairOf(table));
      const [pair] = pairs;
      expect(pair?.observers).toEqual(['Marsh', 'Quill']);
      expect(pair?.sessions).toEqual(['a', 'b']);
      expect(pair?.table).toEqual({
        codes: ['off-task', 'on-task'],
        counts: [
          [table[3], table[2]],
          [table[1], table[0]],
        ],
      });
      expect(pair?.percentAgreement).toBeCloseTo(agreed, 9);
      expect(pair?.chanceAgreement).toBeCloseTo(chance, 2);
      expect(pair?.kappa).toBeCloseTo(kappa, 4);
      expect(pair?.lower).toBeCloseTo(lower, 2);
      expect(pair?.upper).toBeCloseTo(upper, 2);
      expect(pair?.ac1).toBeCloseTo(ac1, 4);
      expect(pair?.occurrence).toBeCloseTo(occurrence, 2);
      expect(pair?.nonOccurrence).toBeCloseTo(nonOccurrence, 2);
      expect(pair?.maximumKappa).toBeCloseTo(most, 3);
      expect(pair?.why).toEqual({});
    },
  );

  test('one observer constant: kappa 0; nothing off-task by either side: non-occurrence 0', async () => {
    expect((await agreementOf(pairOf([90, 5, 5, 0]))).pairs[0]).toMatchObject({ nonOccurrence: 0 });
    expect((await agreementOf(pairOf([57, 3, 0, 0]))).pairs[0]).toMatchObject({ kappa: 0, maximumKappa: 0 });
  });

  test('both used one code only: undefined, never 0 or 100', async () => {
    const { pairs, overall } = await agreementOf(pairOf([60, 0, 0, 0]));
    expect(pairs[0]).toMatchObject({
      percentAgreement: 100,
      chanceAgreement: 100,
      kappa: null,
      ac1: null,
      occurrence: 100,
      nonOccurrence: null,
      table: { codes: ['on-task'], counts: [[60]] },
      why: { kappa: 'oneCodeOnly', ac1: 'oneCodeListed', nonOccurrence: 'alwaysOnTask' },
    });
    expect(overall).toMatchObject({ kappa: null, alpha: null, why: { kappa: 'oneCodeOnly' } });
  });

  test('pooled kappa from unweighted means, percent agreement from all intervals together', async () => {
    const { overall } = await agreementOf([
      ...pairOf([40, 9, 6, 45]),
      ...pairOf([80, 10, 5, 5], { visit: 'v2' }).map((row) => ({ ...row, session: `${row.session}2` })),
      ...looksOf({ session: 'alone', visit: 'v3' }, { 'Otter-01': '11' }),
      ...looksOf({ session: 'alone too', visit: 'v4' }, { 'Otter-01': '11' }),
    ]);
    // De Vries et al. 2008, by hand: mean po .85, mean pe (.5008 + .7800) / 2.
    expect(overall.kappa).toBeCloseTo((0.85 - 0.6404) / (1 - 0.6404), 9);
    expect(overall).toMatchObject({
      pairs: 2,
      compared: 200,
      doubleCoded: 2,
      visits: 4,
      percentDoubleCoded: 50,
    });
    expect(overall.percentAgreement).toBeCloseTo(85, 9);
    // Krippendorff 2011, by hand: 30 of 200 units differ; 245 on-task and 155 off-task of 400 codes.
    const values = { on: 89 + 6 + 80 + 80 + 15, off: 6 + 9 + 90 + 10 + 15 };
    expect(values.on + values.off).toBe(400);
    expect(overall.alpha).toBeCloseTo(1 - (399 * 2 * 30) / (2 * values.on * values.off), 9);
  });

  test('intervals that either did not score are excluded, as are those in one record only', async () => {
    const { pairs } = await agreementOf([
      ...looksOf({ session: 'a', observer: 'Marsh', visit: 'v' }, { A: '11.0', B: '10.' }),
      ...looksOf({ session: 'b', observer: 'Quill', visit: 'v' }, { A: '1.10', B: '11' }),
    ]);
    expect(pairs[0]).toMatchObject({ compared: 4, excluded: 3, percentAgreement: 75 });
  });

  test('three observers: three pairs, one alpha unit an interval', async () => {
    const at = (observer: string, looks: string) =>
      looksOf({ session: observer, observer, visit: 'v' }, { A: looks });
    const { pairs, overall } = await agreementOf([
      ...at('Z', '1100'),
      ...at('M', '1101'),
      ...at('Q', '1110'),
    ]);
    expect(pairs.map(({ observers }) => observers)).toEqual([
      ['M', 'Q'],
      ['M', 'Z'],
      ['Q', 'Z'],
    ]);
    // By hand: units 111, 111, 001, 010; 8 on, 4 off; observed (2·2/2)·2 = 4, expected 2·8·4/11.
    expect(overall.alpha).toBeCloseTo(1 - 4 / ((2 * 8 * 4) / 11), 9);
  });

  test('partial interval: identical sets agree, kappa only code by code', async () => {
    const rows = (session: string, observer: string, codes: string[]) =>
      codes.map((code, i) => ({
        session,
        observer,
        visit: 'v',
        child: 'A',
        interval: i + 1,
        code,
        method: 'partial',
      }));
    const { pairs, overall } = await agreementOf([
      ...rows('a', 'Marsh', ['on-task|off-task alone', 'on-task', '', 'off-task alone']),
      ...rows('b', 'Quill', ['off-task alone|on-task', 'off-task alone', '', 'off-task alone']),
    ]);
    expect(pairs[0]).toMatchObject({
      compared: 4,
      percentAgreement: 75,
      kappa: null,
      ac1: null,
      // On-task: both in interval 1, only Marsh in 2, neither in 3 and 4.
      occurrence: 50,
      nonOccurrence: 100 * (2 / 3),
      table: { codes: ['off-task alone', 'on-task'], counts: null },
      why: { kappa: 'severalCodes' },
    });
    // off-task alone: both in 1 and 4, only Quill in 2, neither in 3; po .75, pe (2·3 + 2·1)/16.
    expect(pairs[0]?.codes[0]).toMatchObject({ code: 'off-task alone', kappa: 0.5, nonOccurrence: 50 });
    expect(overall).toMatchObject({ percentAgreement: 75, kappa: null, why: { kappa: 'severalCodes' } });
  });

  test('a phase that changes within a session: one pair and one visit a phase', async () => {
    const halves = (session: string, observer: string) =>
      looksOf({ session, observer, visit: 'v' }, { A: '1010' }).map((row, i) => ({
        ...row,
        phase: i < 2 ? 'before' : 'after',
      }));
    const { pairs, overall } = await agreementOf([...halves('a', 'Marsh'), ...halves('b', 'Quill')]);
    expect(pairs.map(({ phase, compared }) => [phase, compared])).toEqual([
      ['before', 2],
      ['after', 2],
    ]);
    expect(overall).toMatchObject({ pairs: 2, visits: 2, doubleCoded: 2 });
  });
});
