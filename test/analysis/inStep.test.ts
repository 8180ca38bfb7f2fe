import { describe, expect, test } from 'vitest';
import { comparedPairs, pairDetails, recordsOf, visits } from '../../src/analysis/index.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import { testRandom } from '../stats/testRandom.ts';
import { pairOfRecorded, type Recorded } from './recordedPair.ts';
import { looksOf, type Row, sessionsFrom } from './sessionsFrom.ts';

// Forty looks in no order, and the same with four of them seen otherwise (looks 3, 14, 25 and 36).
const seen = '1011010011101000110100111010110001011010';
const flip = (text: string, ...at: number[]): string =>
  [...text].map((c, i) => (at.includes(i + 1) ? (c === '1' ? '0' : '1') : c)).join('');
const alike = flip(seen, 3, 14, 25, 36);
const otherwise = flip(seen, 2, 3, 6, 9, 11, 14, 15, 19, 22, 25, 28, 30, 33, 36, 38);

describe('by the clocks', () => {
  test('in step: prompts within a tenth of a second and marks that agree', () => {
    const { step } = pairOfRecorded({ looks: seen }, { looks: alike, lag: (i) => 80 + i });
    expect(step).toMatchObject({ code: 'inStep', lost: [], notSearched: null, far: null });
    expect(step.apart).toMatchObject({ by: 'cues', cues: 40, nudges: [0, 0] });
    expect(step.apart?.median).toBeCloseTo(0.1005, 9);
    expect(step.apart?.largest).toBeCloseTo(0.12, 9);
  });

  test('from one second on they are apart, and it is said who was later and what kappa was within reach', () => {
    const at = (ms: number) => pairOfRecorded({ looks: seen }, { looks: alike, lag: () => ms }).step;
    expect(at(999).code).toBe('inStep');
    expect(at(1000).code).toBe('apart');
    const { far, kappaAtBest } = at(-2000);
    expect(far).toMatchObject({ seconds: -2, cues: 40, fromStart: true, to: null });
    // Two perfect observers 2 s and 5 s out of step: .78 and .54 (bouts of 40 s on-task and 10 s off, derived).
    expect(kappaAtBest).toBeCloseTo(0.78, 2);
    expect(at(5000).kappaAtBest).toBeCloseTo(0.535, 3);
  });

  test("each tablet's clock is read as the tick check says, nudges added up", () => {
    const nudge = (by: number): readonly [number, EntryBody] => [0, { kind: 'clockNudged', by }];
    const { step } = pairOfRecorded(
      { looks: seen, more: [nudge(1500), nudge(40)] },
      { looks: alike, lag: () => 1600, more: [nudge(-20)] },
    );
    // 1600 − 20 − 1540 = 40 ms.
    expect(step.code).toBe('inStep');
    expect(step.apart?.median).toBeCloseTo(0.04, 9);
    expect(step.apart?.nudges).toEqual([1540, -20]);
  });

  test('out of step from the 21st look on, as after a pause of one of them', () => {
    const { step } = pairOfRecorded({ looks: seen }, { looks: alike, lag: (i) => (i > 20 ? 4000 : 0) });
    expect(step).toMatchObject({
      code: 'apart',
      far: {
        from: { number: 21, wall: '2026-11-03T10:05:15.000+00:00' },
        to: null,
        fromStart: false,
        seconds: 4,
      },
    });
    expect(step.apart?.course).toMatchObject([
      { from: { number: 1 }, cues: 20, median: 0 },
      { from: { number: 21 }, cues: 20, median: 4 },
    ]);
  });

  test('a drift shows from five minutes to five minutes', () => {
    const { step } = pairOfRecorded({ looks: seen }, { looks: alike, lag: (i) => 20 * i });
    expect(step.code).toBe('inStep');
    expect(step.apart?.course.map(({ median }) => median.toFixed(3))).toEqual(['0.210', '0.610']);
  });

  test('two late prompts are no schedule out of step', () => {
    const { step } = pairOfRecorded({ looks: seen }, { looks: alike, lag: (i) => (i < 3 ? 3000 : 0) });
    expect(step).toMatchObject({ code: 'inStep', apart: { largest: 3 } });
  });

  test('a clock that is set in mid-session is read as if it had gone on', () => {
    // Between looks 20 and 21 Quill's clock is set an hour forth; the gap is the first entry by the new clock.
    const lag = (i: number): number => (i > 20 ? 3_600_000 : 0);
    const at = 20.6 * 15_000;
    const set: EntryBody = { kind: 'gap', from: at, to: at, cause: 'clock', estimated: false };
    const { step } = pairOfRecorded({ looks: seen }, { looks: alike, lag, more: [[at, set]] });
    expect(step).toMatchObject({ code: 'inStep', apart: { median: 0, largest: 0 } });
    // Without that entry nobody knows better.
    expect(pairOfRecorded({ looks: seen }, { looks: alike, lag }).step.far?.seconds).toBe(3600);
  });
});

describe('by the marks', () => {
  // Quill misses the 11th look and is one line late until the 26th.
  const long = `${seen}${flip(seen, 1, 4, 8, 9, 17, 20, 21, 26, 31, 35)}`;
  const lost = `${long.slice(0, 10)}-${long.slice(10, 38)}${long.slice(39)}`;

  test('one place off, from when until when, whose entries stand later', () => {
    const { step } = pairOfRecorded({ looks: long }, { looks: lost });
    expect(step.code).toBe('placeLost');
    expect(step.lost).toHaveLength(1);
    const [one] = step.lost;
    expect(one).toMatchObject({ places: 1, later: 1, fromStart: false, who: null });
    expect(Math.abs((one?.from.number ?? 0) - 11)).toBeLessThanOrEqual(1);
    expect(Math.abs((one?.to?.number ?? 0) - 39)).toBeLessThanOrEqual(1);
    expect(one?.from.wall?.slice(11, 16)).toBe('10:02');
    expect(one?.shifted.same).toBe(one?.shifted.compared);
  });

  test('who it was is said only where one record alone has signs of it', () => {
    const late: readonly [number, EntryBody] = [
      18 * 15_000 + 200,
      { kind: 'marked', interval: 17, code: lost[16] === '1' ? 'on' : 'off', late: true },
    ];
    const { step } = pairOfRecorded({ looks: long }, { looks: lost, more: [late] });
    expect(step.lost[0]).toMatchObject({
      signs: [
        { missed: 0, late: 0, corrected: 0 },
        { missed: 1, late: 1, corrected: 0 },
      ],
      who: 1,
    });
    const both = pairOfRecorded(
      { looks: flip(`${long.slice(0, 19)}-${long.slice(20)}`) },
      { looks: lost, more: [late] },
    );
    expect(both.step.lost[0]?.who).toBeNull();
  });

  test('the clocks are told apart from it: 15 s late with one child is no lost place', () => {
    const one: Recorded['protocol'] = { rotation: { kind: 'one' } };
    const random = testRandom(4);
    const truth = Array.from({ length: 61 }, () => (random() < 0.5 ? '1' : '0')).join('');
    const { step } = pairOfRecorded(
      { looks: truth.slice(0, 60), protocol: one },
      { looks: truth.slice(1), protocol: one, lag: () => 15_000 },
    );
    expect(step).toMatchObject({ code: 'apart', lost: [], far: { seconds: 15 } });
    // The same marks with clocks that agree: the place was lost.
    const same = pairOfRecorded(
      { looks: truth.slice(0, 60), protocol: one },
      { looks: truth.slice(1), protocol: one },
    );
    expect(same.step).toMatchObject({
      code: 'placeLost',
      lost: [{ places: 1, later: 0, fromStart: true, to: null }],
    });
  });

  test('neither: they simply disagree', () => {
    const { step, criterionMet } = pairOfRecorded({ looks: seen }, { looks: otherwise });
    expect(criterionMet).toBe(false);
    expect(step).toMatchObject({ code: 'disagreeing', lost: [], lacking: null });
  });

  test('without prompt times disagreement cannot be told from being out of step', () => {
    const { step } = pairOfRecorded({ looks: seen, silent: true }, { looks: otherwise });
    expect(step).toMatchObject({ code: 'unknown', lacking: 'cueTimes', apart: null });
  });

  test('a dozen looks are too few to look for a lost place', () => {
    const { step } = pairOfRecorded({ looks: '110101101001' }, { looks: '011010010110' });
    expect(step).toMatchObject({ code: 'unknown', lacking: 'tooFew', notSearched: 'tooFew' });
  });
});

describe('other records', () => {
  const first = async (rows: Row[]) => {
    const [pair] = comparedPairs(visits(recordsOf(await sessionsFrom(rows))));
    if (pair === undefined) throw new Error('no pair');
    return pairDetails(pair, { agreement: 0.8, kappa: 0.6 }).step;
  };
  const table = (
    observer: string,
    codes: readonly string[],
    more: Row = {},
    each = (_: number): Row => ({}),
  ) =>
    codes.map((code, k) => ({
      session: observer,
      observer,
      visit: 'v',
      child: `C${(k % 3) + 1}`,
      interval: k + 1,
      code,
      missing: '',
      ...more,
      ...each(k),
    }));
  const random = testRandom(9);
  const sets = Array.from(
    { length: 60 },
    () => ['on-task', 'off-task', 'on-task|off-task', ''][Math.floor(random() * 4)] ?? '',
  );
  const shifted = (all: readonly string[]): string[] => [...all.slice(0, 20), '', ...all.slice(20, -1)];

  test.each(['partial', 'whole'])(
    '%s interval: sets of codes, by the order of interval numbers',
    async (method) => {
      const step = await first([
        ...table('Marsh', sets, { method }),
        ...table('Quill', shifted(sets), { method }),
      ]);
      expect(step).toMatchObject({
        code: 'placeLost',
        apart: null,
        lost: [{ places: 1, later: 1, to: null }],
      });
      expect(step.lost[0]?.from).toMatchObject({ wall: null, at: null });
      expect(Math.abs((step.lost[0]?.from.number ?? 0) - 21)).toBeLessThanOrEqual(1);
    },
  );

  test('headcounts: shares of those present', async () => {
    const counts = Array.from({ length: 60 }, () => 8 + Math.floor(random() * 13));
    const rows = (observer: string, all: readonly number[]): Row[] =>
      table(
        observer,
        all.map(() => ''),
        { method: 'headcount', child: '' },
        (k) => ({
          on_count: all[k] ?? 0,
          present_count: 24,
        }),
      );
    expect((await first([...rows('Marsh', counts), ...rows('Quill', counts)])).lost).toEqual([]);
    const late = [...counts.slice(0, 20), 12, ...counts.slice(20, -1)];
    expect((await first([...rows('Marsh', counts), ...rows('Quill', late)])).lost).toMatchObject([
      { places: 1, later: 1 },
    ]);
  });

  test('tables that give their starts have clocks of a kind', async () => {
    const codes = [...seen].map((c) => (c === '1' ? 'on-task' : 'off-task'));
    const rows = (observer: string, start: string) =>
      table(observer, codes, { start }, (k) => ({ start_s: 15 * k }));
    const step = await first([
      ...rows('Marsh', '2026-11-03T10:00:00+01:00'),
      ...rows('Quill', '2026-11-03T10:00:03+01:00'),
    ]);
    expect(step).toMatchObject({ code: 'apart', apart: { by: 'starts', cues: 40 }, far: { seconds: 3 } });
    expect(step.far?.from).toMatchObject({ wall: null, at: 0 });
  });

  test('one number for several children has no order', async () => {
    const rows = (observer: string): Row[] =>
      looksOf({ session: observer, observer, visit: 'v' }, { A: seen, B: alike }).map((row) => ({
        ...row,
        interval: Math.ceil(Number(row.interval) / 2),
      }));
    expect(await first([...rows('Marsh'), ...rows('Quill')])).toMatchObject({
      code: 'unknown',
      notSearched: 'orderUnknown',
    });
  });
});
