import { describe, expect, test } from 'vitest';
import { roundSheet, sessionDetails, sessionRecords } from '../../src/analysis/index.ts';
import type { EntryBody } from '../../src/journal/entry.ts';
import { headerOf, journalOf, type protocolOf } from '../support/session.ts';
import { looksOf, sessionsFrom } from './sessionsFrom.ts';

const mark = (interval: number, code: string, late = false): EntryBody =>
  late ? { kind: 'marked', interval, code, late } : { kind: 'marked', interval, code };

const cue = (interval: number, planned: number, delivered: number | null): EntryBody => ({
  kind: 'cued',
  interval,
  cue: 'look',
  planned,
  delivered,
  by: delivered === null ? [] : ['sound'],
});

/** Three children, two rounds, look at the end of 15 s; child c2 leaves before its second look. */
const session = {
  header: headerOf(),
  journal: journalOf(
    [0, { kind: 'started', checks: [], anyway: false }],
    [0, { kind: 'lessonPart', lessonPart: 'whole class' }],
    [15_000, cue(1, 15_000, 15_004)],
    [15_900, mark(1, 'on')],
    [30_000, cue(2, 30_000, 30_250)],
    [31_000, mark(2, 'off')],
    [45_000, cue(3, 45_000, null)],
    [50_000, { kind: 'lessonPart', lessonPart: 'group' }],
    [60_300, mark(4, 'on', true)],
    [70_000, { kind: 'left', child: 'c2', reason: 'left the room' }],
    [90_700, mark(6, 'off')],
    [105_000, { kind: 'ended', reason: 'complete' }],
  ),
};

describe('sessionDetails', () => {
  const details = sessionDetails(session);
  const [phase] = details.phases;

  test('completeness by reason, overall and per child', () => {
    expect(details).toMatchObject({ planned: 6, scored: 4, missing: 2, late: 1, ended: true });
    expect(details.missingBy).toEqual([
      { reason: 'left the room', n: 1 },
      { reason: 'prompt failed', n: 1 },
    ]);
    expect(phase?.children.map(({ child, missingBy }) => [child, missingBy])).toEqual([
      ['Otter-01', []],
      ['Otter-02', [{ reason: 'left the room', n: 1 }]],
      ['Otter-03', [{ reason: 'prompt failed', n: 1 }]],
    ]);
  });

  test('shares by lesson part and the make-up of off-task', () => {
    expect(phase?.lessonParts.map(({ lessonPart, scored, onTask }) => [lessonPart, scored, onTask])).toEqual([
      ['group', 2, 1],
      ['whole class', 2, 1],
    ]);
    expect(phase?.offTask).toEqual([{ code: 'off-task', role: 'off-task', n: 2, percent: 100 }]);
  });

  test('how well the cues kept their schedule', () => {
    expect(details.timing).toMatchObject({
      cues: 3,
      bySound: 2,
      failedCues: 1,
      largestDeviationMs: 250,
      medianDeviationMs: 127,
      late: 1,
      gaps: [],
    });
  });

  test('warnings: few looks of a child, more than 15 % missing', () => {
    expect(phase?.children[0]?.warnings).toEqual([{ code: 'fewLooksForChild', values: { looks: 2 } }]);
    expect(phase?.warnings).toEqual([
      { code: 'manyMissing', values: { percent: (100 * 2) / 6, missing: 2 } },
    ]);
  });

  test('warnings about the method, and a session that never ended', () => {
    const codes = (changes: Parameters<typeof protocolOf>[0]) =>
      sessionDetails({ header: headerOf(changes), journal: session.journal.slice(0, 4) }).warnings.map(
        ({ code }) => code,
      );
    expect(codes({ intervalMs: 31_000 })).toEqual(['longMomentary', 'neverEnded']);
    expect(codes({ intervalMs: 30_000 })).toEqual(['neverEnded']);
    expect(codes({ method: 'partial', intervalMs: 15_000, observeMs: 10_000 })).toEqual([
      'partialOverestimates',
      'neverEnded',
    ]);
    expect(codes({ method: 'whole', observeMs: 15_000 })).toContain('longInterval');
  });

  test('a class at 100 % or under 40 % is pointed out', async () => {
    const codes = async (looks: string) => {
      const [one] = await sessionsFrom(looksOf({ session: 's' }, { A: looks }));
      return one === undefined ? [] : sessionDetails(one).phases[0]?.warnings.map(({ code }) => code);
    };
    expect(await codes('1111')).toEqual(['allOnTask']);
    expect(await codes('1000')).toEqual(['underFortyPercent']);
    expect(await codes('1100')).toEqual([]);
  });

  test('effective looks by the correlation of one look with the next', async () => {
    const child = async (looks: string) => {
      const [one] = await sessionsFrom(looksOf({ session: 's' }, { A: looks }));
      return one === undefined ? undefined : sessionDetails(one).phases[0]?.children[0];
    };
    // By hand: 10 looks, five on then five off: r = (4·.25 − .25 + 4·.25) / 2.5 = .7; 10 · .3 / 1.7.
    const blocked = await child('1111100000');
    expect(blocked?.autocorrelation).toBeCloseTo(0.7, 12);
    expect(blocked?.effectiveLooks).toBeCloseTo(3 / 1.7, 12);
    expect((await child('1010101010'))?.effectiveLooks).toBe(10);
    expect(await child('1111111111')).toMatchObject({
      effectiveLooks: null,
      why: { effectiveLooks: 'alwaysTheSame' },
    });
    expect(await child('10101')).toMatchObject({
      effectiveLooks: null,
      why: { effectiveLooks: 'tooFewLooks' },
    });
  });
});

describe('roundSheet', () => {
  test('one row a child in the order of the schedule, one column a look', () => {
    const [record] = sessionRecords(session);
    if (record === undefined) throw new Error('no record');
    const sheet = roundSheet(record);
    expect(sheet.columns).toBe(2);
    const shown = sheet.rows.map(({ child, cells }) => [child, cells.map((cell) => cell?.mark.state)]);
    expect(shown).toEqual([
      ['Otter-01', ['on', 'on']],
      ['Otter-02', ['off', 'missing']],
      ['Otter-03', ['missing', 'off']],
    ]);
    expect(sheet.rows[0]?.cells[1]?.mark).toMatchObject({ late: true, codes: ['on-task'], codeIndexes: [0] });
    expect(sheet.rows[1]?.cells[1]?.mark).toMatchObject({ missing: 'left the room' });
    expect(sheet.rows[0]?.cells[0]).toMatchObject({ number: 1, at: 15_000, second: null, differs: false });
  });

  test('two observers: cells that differ are split, cells that one missed do not differ', async () => {
    const [a, b] = (
      await sessionsFrom([
        ...looksOf({ session: 'a', observer: 'Marsh' }, { A: '110', B: '1' }),
        ...looksOf({ session: 'b', observer: 'Quill' }, { A: '10.', B: '1' }),
      ])
    ).flatMap(sessionRecords);
    if (a === undefined || b === undefined) throw new Error('no records');
    const cells = roundSheet(a, b).rows.map((row) =>
      row.cells.map((cell) => cell && [cell.mark.state, cell.second?.state, cell.differs]),
    );
    expect(cells).toEqual([
      [
        ['on', 'on', false],
        ['on', 'off', true],
        ['off', 'missing', false],
      ],
      [['on', 'on', false], null, null],
    ]);
  });
});
