import { describe, expect, test } from 'vitest';
import { sessionDetails } from '../../src/analysis/index.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import { headerOf, journalOf } from '../support/session.ts';
import { looksOf, sessionsFrom } from './sessionsFrom.ts';

type Said = readonly [number, EntryBody];
type By = ('sound' | 'screen' | 'vibration')[];

const cue = (interval: number, off: number | null = 0, by: By = ['sound', 'screen']): Said => {
  const planned = interval * 15_000;
  const delivered = off === null ? null : planned + off;
  return [
    planned,
    { kind: 'cued', interval, cue: 'look', planned, delivered, by: delivered === null ? [] : by },
  ];
};
const mark = (interval: number, after: number, more: { late?: true; before?: true } = {}): Said => [
  interval * 15_000 + after,
  { kind: 'marked', interval, code: 'on', ...more },
];

/** Three children, forty looks, one every 15 s; `cues` stand in the place of the regular ones of their interval. */
function timed(cues: readonly Said[], more: readonly Said[] = [], protocol: Partial<Protocol> = {}) {
  const own = new Set(cues.flatMap(([, body]) => (body.kind === 'cued' ? [body.interval] : [])));
  const regular = Array.from({ length: 40 }, (_, k) => k + 1).filter((n) => !own.has(n));
  const all = [...regular.map((n) => cue(n)), ...cues, ...more].sort(([x], [y]) => x - y);
  return sessionDetails({
    header: headerOf({ partLength: { kind: 'minutes', minutes: 10 }, ...protocol }),
    journal: journalOf([0, { kind: 'started', checks: [], anyway: false }], ...all, [
      615_000,
      { kind: 'ended', reason: 'complete' },
    ]),
  }).timing;
}

const gap = (
  from: number,
  to: number,
  cause: 'hidden' | 'asleep' | 'clock' | 'closed',
  estimated = false,
): Said => [to, { kind: 'gap', from, to, cause, estimated }];

describe('whether timing can be relied on', () => {
  test('reliable: every prompt heard, within 50 ms', () => {
    const timing = timed([cue(7, 50)]);
    expect(timing?.verdict).toEqual({ word: 'reliable', reasons: [] });
    expect(timing).toMatchObject({ cues: 40, bySound: 40, byScreenOnly: 0, failedCues: 0 });
    expect(timing).toMatchObject({ largestDeviationMs: 50, medianDeviationMs: 0, gaps: [], nudgeMs: 0 });
  });

  test('with care: one at 51 ms', () => {
    expect(timed([cue(7, -51)])?.verdict).toEqual({
      word: 'withCare',
      reasons: [{ code: 'timingUneven', values: { ms: 50, largest: 51 } }],
    });
  });

  test('one prompt over 250 ms off of forty is care, two are 5 % and too many', () => {
    expect(timed([cue(7, 251)])?.verdict).toEqual({
      word: 'withCare',
      reasons: [{ code: 'timingOff', values: { off: 1, ms: 250, largest: 251 } }],
    });
    expect(timed([cue(7, 251), cue(8, -300)])?.verdict?.word).toBe('notReliable');
    expect(timed([cue(7, 250), cue(8, -250)])?.verdict?.word).toBe('withCare');
  });

  test('prompts that came to nobody', () => {
    const one = timed([cue(7, null)]);
    expect(one?.failedCues).toBe(1);
    expect(one?.verdict).toEqual({
      word: 'withCare',
      reasons: [{ code: 'timingLost', values: { lost: 1, of: 40 } }],
    });
    expect(timed([cue(7, null), cue(8, null)])?.verdict?.word).toBe('notReliable');
    // One lost and another off: two of forty.
    expect(timed([cue(7, null), cue(8, 900, ['screen'])])?.verdict?.word).toBe('notReliable');
  });

  test('a silent stretch', () => {
    const timing = timed([cue(3, 20, ['screen']), cue(4, 30, ['screen', 'vibration'])]);
    expect(timing).toMatchObject({ bySound: 38, byScreenOnly: 2 });
    expect(timing?.verdict).toEqual({
      word: 'withCare',
      reasons: [{ code: 'timingSilent', values: { silent: 2, of: 40 } }],
    });
  });

  test('a gap counts by the intervals whose prompt fell into it, with its cause and the time of day', () => {
    // Asleep from 10:01:40 to 10:01:58; the prompt at 10:01:45 came to nobody and the journal says nothing of it.
    const header = headerOf({ partLength: { kind: 'minutes', minutes: 10 } });
    const journal = journalOf(
      ...Array.from({ length: 40 }, (_, k) => cue(k + 1)).filter(([at]) => at !== 105_000),
      gap(100_000, 118_000, 'asleep', true),
      [615_000, { kind: 'ended', reason: 'complete' }],
    );
    const { timing } = sessionDetails({ header, journal });
    expect(timing?.gaps).toEqual([
      { from: 100_000, to: 118_000, wall: '2026-11-03T10:01:40.000+00:00', cause: 'asleep', estimated: true },
    ]);
    expect(timing?.verdict).toEqual({
      word: 'withCare',
      reasons: [
        { code: 'timingLost', values: { lost: 1, of: 40 } },
        { code: 'timingEstimated', values: { gaps: 1 } },
      ],
    });
  });

  test('a hidden page that lost no prompt, and a clock that was set, take nothing away', () => {
    const timing = timed([], [gap(200_000, 200_000, 'hidden'), gap(300_000, 300_000, 'clock')]);
    expect(timing?.gaps.map(({ cause }) => cause)).toEqual(['hidden', 'clock']);
    expect(timing?.verdict?.word).toBe('reliable');
  });

  test('a duration counts time instead of prompts', () => {
    const duration = (ms: number) =>
      sessionDetails({
        header: headerOf({ method: 'duration', partLength: { kind: 'minutes', minutes: 10 } }),
        journal: journalOf(
          [0, { kind: 'cued', interval: 1, cue: 'observe', planned: 0, delivered: 0, by: ['sound'] }],
          [1000, { kind: 'marked', interval: 1, code: 'on' }],
          gap(100_000, 100_000 + ms, 'hidden'),
          [600_000, { kind: 'ended', reason: 'complete' }],
        ),
      }).timing;
    expect(duration(29_999)?.verdict?.word).toBe('withCare');
    expect(duration(30_000)?.verdict).toEqual({
      word: 'notReliable',
      reasons: [{ code: 'timingTimeLost', values: { seconds: 30, percent: 5 } }],
    });
    expect(duration(0)?.responses).toBeNull();
  });

  test('a table holds no prompts, so nothing is said of them', async () => {
    const [one] = await sessionsFrom(looksOf({ session: 's' }, { A: '1101' }));
    if (one === undefined) throw new Error('no session');
    expect(sessionDetails(one).timing).toMatchObject({ verdict: null, cues: 0, responses: null });
  });

  test("the tick check's nudges, added up", () => {
    const nudge = (by: number): Said => [0, { kind: 'clockNudged', by }];
    expect(timed([], [nudge(100), nudge(-20)])?.nudgeMs).toBe(80);
  });
});

describe('response times', () => {
  test('by hand: median, nine in ten, middle half', () => {
    // 500, 600, 700, 800, 900 ms: median 700; at .9 · 4 = 3.6 → 860; quarters 600 and 800.
    const marks = [900, 500, 700, 600, 800].map((ms, k) => mark(k + 1, ms));
    const { marks: n, median, ninetieth, spread } = timed([], marks)?.responses ?? {};
    expect([n, median, ninetieth, spread]).toEqual([5, 700, 860, 200]);
  });

  test('from the prompt as it was delivered', () => {
    expect(timed([cue(1, 200, ['screen'])], [mark(1, 900)])?.responses?.median).toBe(700);
  });

  test('only the first mark counts; late ones, "child before" and corrections are left out', () => {
    const more: Said[] = [
      mark(1, 700),
      mark(1, 4000),
      mark(2, 15_200, { late: true }),
      mark(3, 16_000, { before: true }),
      [62_000, { kind: 'corrected', interval: 4, codes: ['off'], missing: null }],
      mark(4, 3000),
      mark(5, 1000),
      mark(6, 2000),
      [100_000, { kind: 'swapped', pairs: [[5, 6]] }],
      [110_000, { kind: 'unusable', from: 105_000, to: 106_000, reason: 'other' }],
      [130_000, { kind: 'missing', interval: 8, reason: 'out of view' }],
    ];
    const timing = timed([], more);
    expect(timing?.responses).toEqual({ marks: 1, median: 700, ninetieth: 700, spread: 0 });
    expect(timing?.late).toBe(1);
  });

  test('partial interval has none: a mark there says when it was seen', () => {
    const protocol = { method: 'partial', observeMs: 10_000 } as const;
    expect(timed([], [mark(1, 700)], protocol)?.responses).toBeNull();
  });
});
