import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { EntryBody, JournalEntry } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { emptyState } from '../../src/journal/state.ts';
import { fold, step } from '../../src/journal/step.ts';
import { unionOfJournals } from '../../src/journal/union.ts';
import { headerOf, journalOf } from '../support/session.ts';

const header = headerOf();
const mark = (interval: number, code: string | null): EntryBody => ({ kind: 'marked', interval, code });
const end: EntryBody = { kind: 'ended', reason: 'complete' };
const outcome = (entries: JournalEntry[], options = {}) =>
  readOut(fold(header, entries), options).map((i) => i.missing ?? i.codes?.join('+') ?? i.status);

// Six intervals of 15 s, cues at 15, 30 … 90 s, the last one open until 105 s.
describe('the fold of a journal', () => {
  it('scores marks, and calls what was not marked missed, never off-task', () => {
    const journal = journalOf([16_000, mark(1, 'on')], [31_000, mark(2, 'off')], [105_000, end]);
    expect(outcome(journal)).toEqual(['on', 'off', 'missed', 'missed', 'missed', 'missed']);
  });

  it('lets the last word count, and undo bring back the word before', () => {
    const journal = journalOf(
      [16_000, mark(1, 'on')],
      [17_000, mark(1, 'off')],
      [18_000, { kind: 'missing', interval: 1, reason: 'out of view' }],
    );
    expect(outcome(journal)[0]).toBe('out of view');
    const undone = [
      ...journal,
      ...journalOf(
        [0, end],
        [0, end],
        [0, end],
        [19_000, { kind: 'withdrawn', target: { writer: 'writer-1', seq: 2 } }],
      ).slice(3),
    ];
    expect(outcome(undone)[0]).toBe('off');
  });

  it('waits for what has not come, holds open what may still be marked', () => {
    expect(
      outcome(journalOf([16_000, mark(1, 'on')], [31_000, { kind: 'flagged', interval: null }])),
    ).toEqual(['on', 'open', 'waiting', 'waiting', 'waiting', 'waiting']);
  });

  it('keeps the schedule running through an interruption and says so for its intervals', () => {
    const journal = journalOf(
      [16_000, mark(1, 'on')],
      [40_000, { kind: 'interrupted' }],
      [70_000, { kind: 'continued' }],
      [76_000, mark(5, 'on')],
      [91_000, mark(6, 'off')],
      [105_000, end],
    );
    expect(outcome(journal)).toEqual([
      'on',
      'class interrupted',
      'class interrupted',
      'class interrupted',
      'on',
      'off',
    ]);
  });

  it('keeps an explicit mark made before the alarm', () => {
    const journal = journalOf([31_000, mark(2, 'off')], [32_000, { kind: 'interrupted' }], [105_000, end]);
    expect(outcome(journal)).toEqual([
      'missed',
      'off',
      'class interrupted',
      'class interrupted',
      'class interrupted',
      'class interrupted',
    ]);
  });

  it('makes only that child missing who left, until it came back', () => {
    const journal = journalOf(
      [20_000, { kind: 'left', child: 'c2', reason: 'with another adult' }],
      [80_000, { kind: 'returned', child: 'c2' }],
      [105_000, end],
    );
    // c2 is looked at in intervals 2 (30 s) and 5 (75 s).
    expect(outcome(journal)).toEqual([
      'missed',
      'with another adult',
      'missed',
      'missed',
      'with another adult',
      'missed',
    ]);
  });

  it('calls intervals in a gap prompt failed, and those after the early end ended early', () => {
    const journal = journalOf(
      [16_000, mark(1, 'on')],
      [50_000, { kind: 'gap', from: 29_000, to: 50_000, cause: 'closed', estimated: true }],
      [61_000, mark(4, 'on')],
      [62_000, { kind: 'ended', reason: 'early' }],
    );
    expect(outcome(journal)).toEqual([
      'on',
      'prompt failed',
      'prompt failed',
      'on',
      'ended early',
      'ended early',
    ]);
  });

  it('counts a cue that was only shown as a cue, and one that was neither heard nor shown as prompt failed', () => {
    const cue = (interval: number, by: ('sound' | 'screen')[]): EntryBody => ({
      kind: 'cued',
      interval,
      cue: 'look',
      planned: interval * 15_000,
      delivered: by.length ? interval * 15_000 : null,
      by,
    });
    const journal = journalOf([15_000, cue(1, ['screen'])], [30_000, cue(2, [])], [105_000, end]);
    expect(outcome(journal).slice(0, 2)).toEqual(['missed', 'prompt failed']);
  });

  it('changes nothing for a moved wall clock', () => {
    const journal = journalOf(
      [40_000, { kind: 'gap', from: 40_000, to: 40_000, cause: 'clock', estimated: false }],
      [105_000, end],
    );
    expect(outcome(journal)).toEqual(Array(6).fill('missed'));
  });

  it('reads a session that never ended as if it had ended where its journal stops', () => {
    const journal = journalOf([16_000, mark(1, 'on')], [31_000, mark(2, 'on')]);
    expect(outcome(journal, { final: true })).toEqual([
      'on',
      'on',
      'ended early',
      'ended early',
      'ended early',
      'ended early',
    ]);
  });

  it('closes a part by the break and opens the next where the first task was given', () => {
    const two = headerOf({ partLength: { kind: 'rounds', rounds: 1 } }, ['before', 'after']);
    const journal = journalOf(
      [16_000, mark(1, 'on')],
      [33_000, { kind: 'breakStarted' }],
      [400_000, { kind: 'breakEnded' }],
      [430_000, { kind: 'phaseStarted', phase: 'after', part: 1, origin: 433_000 }],
      [449_000, mark(4, 'off')],
      [494_000, end],
    );
    const lines = readOut(fold(two, journal));
    expect(lines.map((l) => l.missing ?? l.codes?.join('+'))).toEqual([
      'on',
      'missed',
      'ended early',
      'off',
      'missed',
      'missed',
    ]);
    expect(lines.map((l) => l.phase)).toEqual(['before', 'before', 'before', 'after', 'after', 'after']);
    expect(lines[3]).toMatchObject({ cueAt: 448_000, minutesFromBreak: 0.25 });
    expect(lines[0]?.minutesFromBreak).toBe(-0.3);
  });

  it('adds codes up in partial recording; "nothing" clears them; amended replaces', () => {
    const partial = headerOf({ method: 'partial', observeMs: 10_000 });
    const read = (entries: JournalEntry[]) => readOut(fold(partial, entries))[0]?.codes;
    expect(read(journalOf([1000, mark(1, 'off')], [2000, mark(1, 'on')], [3000, mark(1, 'off')]))).toEqual([
      'off',
      'on',
    ]);
    expect(read(journalOf([1000, mark(1, 'off')], [2000, mark(1, null)]))).toEqual([]);
    expect(
      read(
        journalOf(
          [1000, mark(1, 'off')],
          [
            9000,
            { kind: 'amended', interval: 1, codes: ['on'], missing: null, why: 'wrong child', by: 'Quill' },
          ],
        ),
      ),
    ).toEqual(['on']);
  });

  it('keeps entries of kinds it does not know out of the way', () => {
    const odd = { ...journalOf([5000, end])[0], kind: 'sung', verse: 2 } as JournalEntry;
    expect(fold(header, [odd]).entries).toEqual([]);
  });
});

const bodies: fc.Arbitrary<EntryBody> = fc.oneof(
  fc.record({
    kind: fc.constant('marked' as const),
    interval: fc.integer({ min: 1, max: 8 }),
    code: fc.constantFrom('on', 'off', null),
  }),
  fc.record({
    kind: fc.constant('missing' as const),
    interval: fc.integer({ min: 1, max: 8 }),
    reason: fc.constant('out of view' as const),
  }),
  fc.record({
    kind: fc.constant('withdrawn' as const),
    target: fc.record({ writer: fc.constant('writer-1'), seq: fc.nat(20) }),
  }),
  fc.constantFrom<EntryBody>(
    { kind: 'interrupted' },
    { kind: 'continued' },
    { kind: 'paused' },
    { kind: 'resumed' },
    { kind: 'breakStarted' },
    end,
  ),
  fc.record({
    kind: fc.constant('left' as const),
    child: fc.constantFrom('c1', 'c2', 'nobody'),
    reason: fc.constant('left the room' as const),
  }),
  fc.record({ kind: fc.constant('returned' as const), child: fc.constantFrom('c1', 'c2') }),
  fc.record({
    kind: fc.constant('phaseStarted' as const),
    phase: fc.constant('after'),
    part: fc.nat(3),
    origin: fc.nat(200_000),
  }),
  fc.record({
    kind: fc.constant('gap' as const),
    from: fc.nat(100_000),
    to: fc.nat(100_000),
    cause: fc.constantFrom('closed' as const, 'clock' as const),
    estimated: fc.boolean(),
  }),
);
const journals = fc
  .array(fc.tuple(fc.nat(120_000), bodies), { maxLength: 25 })
  .map((said) => journalOf(...said));

describe('properties', () => {
  it('every prefix of any journal folds, and one entry at a time gives the same as all at once', () => {
    fc.assert(
      fc.property(journals, (journal) => {
        let state = emptyState(header);
        for (let n = 0; n <= journal.length; n++) {
          const whole = fold(header, journal.slice(0, n));
          expect(whole).toEqual(state);
          expect(readOut(whole)).toHaveLength(6);
          const next = journal[n];
          if (next) state = step(state, next);
        }
      }),
    );
  });

  it('does not depend on the order in which entries were stored', () => {
    fc.assert(
      fc.property(journals, (journal) => {
        expect(fold(header, [...journal].reverse())).toEqual(fold(header, journal));
      }),
    );
  });

  it('an ended session has no interval without an outcome, and never a scored one that nobody marked', () => {
    fc.assert(
      fc.property(journals, (journal) => {
        const said = new Set(journal.flatMap((e) => (e.kind === 'marked' ? [e.interval] : [])));
        for (const line of readOut(fold(header, journal), { final: true })) {
          expect(['scored', 'missing']).toContain(line.status);
          if (line.status === 'scored') expect(said).toContain(line.number);
        }
      }),
    );
  });

  it('union of journals is idempotent, commutative and associative, and keeps both sides of a conflict', () => {
    const many = fc
      .array(fc.tuple(fc.constantFrom('w1', 'w2'), fc.nat(5), fc.nat(3)), { maxLength: 12 })
      .map((rows) =>
        rows.map(
          ([writer, seq, interval]): JournalEntry => ({
            session: 's',
            writer,
            seq,
            at: seq * 1000,
            wall: '2026-11-03T10:00:00.000+00:00',
            ...mark(interval + 1, 'on'),
          }),
        ),
      );
    fc.assert(
      fc.property(many, many, many, (a, b, c) => {
        const u = (...all: JournalEntry[][]) => unionOfJournals(...all);
        expect(u(a, a)).toEqual(u(a));
        expect(u(a, b)).toEqual(u(b, a));
        expect(u(u(a, b).entries, c)).toEqual(u(a, u(b, c).entries));
      }),
    );
    const one = { session: 's', writer: 'w', seq: 0, at: 0, wall: '2026-11-03T10:00:00.000+00:00' };
    expect(
      unionOfJournals([{ ...one, ...mark(1, 'on') }], [{ ...one, ...mark(1, 'off') }]).conflicts,
    ).toHaveLength(1);
  });
});
