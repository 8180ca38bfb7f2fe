import { expect, test } from 'vitest';
import type { EntryBody } from '../../../src/journal/entry.ts';
import { epochMs } from '../../../src/kernel/units.ts';
import { outlook } from '../../../src/screens/room/outlook.ts';
import { headerOf, journalOf } from '../../support/session.ts';

// Three children, two rounds, every 15 s, looked at when the interval ends: cues at 15, 30 … 90 s, closed at 105 s.
const header = headerOf({}, ['before', 'after']);
const begun = Date.UTC(2026, 10, 3, 10);
const journal = (...more: (readonly [number, EntryBody])[]) =>
  journalOf([0, { kind: 'started', checks: [], anyway: false }], ...more);
const mark = [16_000, { kind: 'marked', interval: 1, code: 'on' }] as const;
/** Taken up that many seconds after session time 0. */
const after = (seconds: number, entries = journal(mark), its = header) =>
  outlook({ header: its, journal: entries }, epochMs(begun + seconds * 1000));

test('it goes on at the next cue of its grid, and counts the cues that fell in between', () => {
  expect(after(50)).toEqual({
    scored: 1,
    intervals: 12,
    unit: 'look',
    time: null,
    between: 2,
    goesOn: { kind: 'at', number: 4, child: 'Otter-01' },
  });
});

test('past the end of its part it waits for the next one; past the last part nothing is left', () => {
  expect(after(3600)).toMatchObject({ between: 5, goesOn: { kind: 'part', phase: 'after' } });
  expect(after(3600, journal(mark), headerOf({}, ['before']))).toMatchObject({ goesOn: { kind: 'nothing' } });
});

test('a paused schedule has stood still', () => {
  expect(after(3600, journal(mark, [20_000, { kind: 'paused' }]))).toMatchObject({
    between: 0,
    goesOn: { kind: 'paused', number: 2, child: 'Otter-02' },
  });
});

test('one that never began starts with the first child', () => {
  expect(after(3600, [])).toMatchObject({ scored: 0, goesOn: { kind: 'start', child: 'Otter-01' } });
});

test('a duration record goes on within its time; what went by without the tablet is lost', () => {
  const watching = headerOf({
    method: 'duration',
    rotation: { kind: 'one' },
    partLength: { kind: 'minutes', minutes: 2 },
  });
  const entries = journal(
    [10_000, { kind: 'marked', interval: 1, code: 'on' }],
    [30_000, { kind: 'flagged', interval: null }],
  );
  expect(after(45, entries, watching)).toEqual({
    scored: 1,
    intervals: 1,
    unit: 'time',
    time: { kept: 20_000, of: 120_000, lost: 15_000 },
    between: 0,
    goesOn: { kind: 'within', child: 'Otter-01', left: 75_000 },
  });
  expect(after(130, entries, watching)).toMatchObject({ goesOn: { kind: 'nothing' } });
});
