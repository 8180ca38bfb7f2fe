import { describe, expect, it } from 'vitest';
import { onTaskReport, recordsOf, sessionDetails } from '../../src/analysis/index.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeIntervalTable } from '../../src/exchange/writeIntervalTable.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import { headerOf, journalOf } from '../support/session.ts';

/* Sessions as the tablet records them, and the figures that follow, worked out by hand beside them. */
type Said = readonly (readonly [number, EntryBody])[];
const sessionOf = (changes: Parameters<typeof headerOf>[0], said: Said, more = {}): StoredSession => ({
  header: headerOf(changes, ['before'], more),
  journal: journalOf([0, { kind: 'started', checks: [], anyway: false }], ...said),
});
const rowOf = (session: StoredSession) => onTaskReport(recordsOf([session])).report.sessions[0];

async function throughTable(session: StoredSession): Promise<StoredSession> {
  const bytes = new TextEncoder().encode(writeIntervalTable([session]));
  const read = await readIncoming({ name: 'recorded.csv', bytes });
  const [back] = read.ok ? read.bundle.sessions : [];
  if (back === undefined) throw new Error(JSON.stringify(read));
  return back;
}
const figures = ['scored', 'missing', 'onTask', 'percentOnTask', 'lower', 'upper', 'classPercent'] as const;
const figuresOf = (session: StoredSession) => {
  const row = rowOf(session);
  return [
    Object.fromEntries(figures.map((figure) => [figure, row?.[figure]])),
    row?.children.map(({ child, percentOnTask }) => [child, percentOnTask]),
  ];
};

const mark = (interval: number, code: string | null): EntryBody => ({ kind: 'marked', interval, code });

const whole = sessionOf({ method: 'whole', observeMs: 10_000 }, [
  [12_000, mark(1, 'on')],
  [27_000, mark(2, null)],
  [42_000, mark(3, 'off')],
  [57_000, mark(4, 'on')],
  [90_000, { kind: 'ended', reason: 'complete' }],
]);

const count = (interval: number, on: number, present: number): EntryBody => ({
  kind: 'marked',
  interval,
  code: null,
  counts: { on, present },
});
const headcount = sessionOf(
  { method: 'headcount', intervalMs: 60_000, partLength: { kind: 'minutes', minutes: 4 } },
  [
    [61_000, count(1, 1, 24)],
    [63_000, count(1, 18, 24)],
    [121_000, count(2, 20, 23)],
    [181_000, { kind: 'missing', interval: 3, reason: 'out of view' }],
    [300_000, { kind: 'ended', reason: 'complete' }],
  ],
);

const duration = sessionOf(
  { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
  [
    [0, mark(1, 'on')],
    [45_000, mark(1, 'off')],
    [60_000, mark(1, 'on')],
    [90_000, { kind: 'missing', interval: 1, reason: 'out of view' }],
    [100_000, mark(1, 'off')],
    [120_000, { kind: 'ended', reason: 'complete' }],
  ],
);

describe('figures of sessions that were recorded here', () => {
  it('whole interval: intervals with on-task throughout, of all that were scored', async () => {
    expect(rowOf(whole)).toMatchObject({ scored: 4, missing: 2, onTask: 2, percentOnTask: 50 });
    expect(figuresOf(await throughTable(whole))).toEqual(figuresOf(whole));
  });

  it('headcount: children on-task of children present, over all scans; the last count of a scan stands', async () => {
    // 18 + 20 of 24 + 23; one scan could not be made, one was missed.
    expect(rowOf(headcount)).toMatchObject({ scored: 47, missing: 2, onTask: 38, classPercent: null });
    expect(rowOf(headcount)?.percentOnTask).toBeCloseTo(80.851, 3);
    expect(figuresOf(await throughTable(headcount))).toEqual(figuresOf(headcount));
    // Two of four scans are missing, however many children the others counted.
    expect(sessionDetails(headcount).phases[0]?.warnings).toContainEqual({
      code: 'manyMissing',
      values: { percent: 50, missing: 2 },
    });
  });

  it('duration: seconds on-task of the seconds that were seen, one child', async () => {
    // 45 + 30 s on, 15 + 20 s off, 10 s out of view.
    expect(rowOf(duration)).toMatchObject({ scored: 110, missing: 10, onTask: 75 });
    expect(rowOf(duration)?.percentOnTask).toBeCloseTo((100 * 75) / 110, 10);
    expect(figuresOf(await throughTable(duration))).toEqual(figuresOf(duration));
  });

  it('a reserve who stepped in has figures under its own pseudonym', async () => {
    const session = sessionOf(
      {},
      [
        [16_000, mark(1, 'on')],
        [20_000, { kind: 'left', child: 'c2', reason: 'left the room', by: 'r1' }],
        [31_000, mark(2, 'off')],
        [46_000, mark(3, 'on')],
        [106_000, { kind: 'ended', reason: 'complete' }],
      ],
      { reserves: [{ id: 'r1', pseudonym: 'Otter-09', stratum: null }] },
    );
    expect(
      rowOf(session)?.children.map(({ child, scored, percentOnTask }) => [child, scored, percentOnTask]),
    ).toEqual([
      ['Otter-01', 1, 100],
      ['Otter-03', 1, 100],
      ['Otter-09', 1, 0],
    ]);
    expect(figuresOf(await throughTable(session))).toEqual(figuresOf(session));
  });

  it('corrections in the room count as what they say', () => {
    const session = sessionOf({}, [
      [16_000, mark(1, 'on')],
      [31_000, mark(2, 'off')],
      [46_000, mark(3, 'on')],
      [61_000, mark(4, 'on')],
      [62_000, { kind: 'swapped', pairs: [[1, 2]] }],
      [63_000, { kind: 'corrected', interval: 3, codes: ['off'], missing: null }],
      [64_000, { kind: 'unusable', from: 59_000, to: 61_000, reason: 'other' }],
      [106_000, { kind: 'ended', reason: 'complete' }],
    ]);
    expect(rowOf(session)?.children.map(({ child, scored, onTask }) => [child, scored, onTask])).toEqual([
      ['Otter-01', 1, 0],
      ['Otter-02', 1, 1],
      ['Otter-03', 1, 0],
    ]);
  });
});
