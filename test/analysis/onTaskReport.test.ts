import { describe, expect, test } from 'vitest';
import { onTaskReport, recordsOf } from '../../src/analysis/index.ts';
import { headerOf, journalOf, onOff } from '../support/session.ts';
import { looksOf, type Row, sessionsFrom } from './sessionsFrom.ts';

async function rowsOf(rows: readonly Row[], options = {}) {
  return onTaskReport(recordsOf(await sessionsFrom(rows, options))).report.sessions;
}

describe('onTaskReport', () => {
  test('a session in which the phase changes is one row a phase, in the order of the phases', async () => {
    const rows = looksOf({ session: 's' }, { A: '1101' }).map((row, i) => ({
      ...row,
      phase: i < 3 ? 'later in the alphabet' : 'after',
    }));
    const report = await rowsOf(rows);
    expect(report.map(({ phase, scored, onTask }) => [phase, scored, onTask])).toEqual([
      ['later in the alphabet', 3, 2],
      ['after', 1, 1],
    ]);
  });

  test('limits are those of Wilson 1927 (16 of 20: .584 to .919)', async () => {
    const [row] = await rowsOf(looksOf({ session: 's' }, { A: `${'1'.repeat(16)}0000` }));
    expect(row?.percentOnTask).toBe(80);
    expect(row?.lower).toBeCloseTo(58.4, 1);
    expect(row?.upper).toBeCloseTo(91.9, 1);
    expect(row?.children[0]).toMatchObject({ child: 'A', percentOnTask: 80, lower: row?.lower });
  });

  test('codes that are neither on-task nor off-task are scored and left out of percent on-task', async () => {
    const rows = ['on-task', 'off-task', 'on-task', 'asked to help'].map((code, i) => ({
      session: 's',
      observer: 'Quill',
      child: 'A',
      interval: i + 1,
      code,
    }));
    const [row] = await rowsOf(rows, { other: ['asked to help'] });
    expect(row).toMatchObject({ scored: 4, onTask: 2, percentOnTask: (100 * 2) / 3 });
    const [only] = await rowsOf(rows.slice(3), { other: ['asked to help'] });
    expect(only).toMatchObject({
      scored: 1,
      percentOnTask: null,
      classPercent: null,
      why: { percentOnTask: 'neitherOnNorOff', lower: 'neitherOnNorOff', classPercent: 'neitherOnNorOff' },
    });
  });

  test('nothing scored: null with why, never 0', async () => {
    const [row] = await rowsOf(looksOf({ session: 's' }, { A: '..' }));
    expect(row).toMatchObject({
      scored: 0,
      missing: 2,
      percentOnTask: null,
      lower: null,
      upper: null,
      classPercent: null,
      why: { percentOnTask: 'nothingScored', classPercent: 'nothingScored' },
    });
  });

  test('partial interval: intervals with some on-task code, of all scored ones', async () => {
    const rows = ['on-task|off-task', '', 'off-task', 'on-task'].map((code, i) => ({
      session: 's',
      observer: 'Quill',
      child: 'A',
      interval: i + 1,
      code,
      method: 'partial',
    }));
    expect((await rowsOf(rows))[0]).toMatchObject({
      method: 'partial',
      scored: 4,
      onTask: 2,
      percentOnTask: 50,
    });
  });

  test('headcount: child looks are counted, no child is known', async () => {
    const counts = [
      [20, 25],
      [18, 24],
    ] as const;
    const rows = counts.map(([on, present], i) => ({
      session: 's',
      observer: 'Quill',
      child: '',
      interval: i + 1,
      code: '',
      method: 'headcount',
      on_count: on,
      present_count: present,
      missing: '',
    }));
    const missed = { ...rows[0], interval: 3, on_count: '', present_count: '', missing: 'missed' } as Row;
    expect((await rowsOf([...rows, missed]))[0]).toMatchObject({
      scored: 49,
      missing: 1,
      onTask: 38,
      percentOnTask: (100 * 38) / 49,
      classPercent: null,
      children: [],
      why: { classPercent: 'headcountHasNoChildren' },
    });
  });

  test('duration: by time in seconds, without limits', async () => {
    const stretch = (interval: number, code: string, start_s: number, end_s: number): Row => ({
      session: 's',
      observer: 'Quill',
      child: 'A',
      interval,
      code,
      method: 'duration',
      start_s,
      end_s,
    });
    const [row] = await rowsOf([stretch(1, 'on-task', 0, 45), stretch(2, 'off-task', 45, 60)]);
    expect(row).toMatchObject({
      scored: 60,
      onTask: 45,
      percentOnTask: 75,
      lower: null,
      why: { lower: 'durationHasNoLooks', upper: 'durationHasNoLooks' },
    });
  });

  test('a recorded session that was cut off: what was not reached is missing; a phase that never began is no row', () => {
    const header = headerOf({}, ['before', 'after']);
    const journal = journalOf(
      [0, { kind: 'started', checks: [], anyway: false }],
      [15_500, { kind: 'marked', interval: 1, code: 'on' }],
      [30_500, { kind: 'marked', interval: 2, code: 'off' }],
    );
    const rows = onTaskReport(recordsOf([{ header, journal }])).report.sessions;
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({ phase: 'before', scored: 2, missing: 4, onTask: 1, percentOnTask: 50 });
    expect(header.schedule.kind === 'laid' && header.schedule.protocol.codeSet).toBe(onOff);
  });
});
