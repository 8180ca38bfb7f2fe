import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { EntryBody } from '../../src/journal/entry.ts';
import { type IntervalRecord, readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { headerOf, journalOf } from '../support/session.ts';

/* One child for two minutes a part, on and off as touched. Stretches are written down by hand: from, to, what. */
type Said = readonly (readonly [number, EntryBody])[];
const header = headerOf(
  { method: 'duration', rotation: { kind: 'one' }, partLength: { kind: 'minutes', minutes: 2 } },
  ['before', 'after'],
);
const touch = (code: string | null): EntryBody => ({ kind: 'marked', interval: 1, code });
const told = (looks: readonly IntervalRecord[]) =>
  looks.map(({ openAt, closeAt, status, codes, missing }): [number, number, string] => [
    openAt / 1000,
    closeAt / 1000,
    status === 'scored' ? codes?.join('+') || 'none' : (missing ?? status),
  ]);
const read = (said: Said, options: { now?: number; final?: boolean } = { final: true }) =>
  readOut(fold(header, journalOf(...said)), options);

const lesson: Said = [
  [2000, touch('on')],
  [40_000, touch('off')],
  [55_500, touch('on')],
  [90_000, { kind: 'missing', interval: 1, reason: 'out of view' }],
  [100_000, touch(null)],
];

describe('a duration record', () => {
  it('is made of the stretches between touches, to the millisecond', () => {
    expect(told(read([...lesson, [125_000, { kind: 'ended', reason: 'early' }]]))).toEqual([
      [0, 2, 'missed'],
      [2, 40, 'on'],
      [40, 55.5, 'off'],
      [55.5, 90, 'on'],
      [90, 100, 'out of view'],
      [100, 120, 'none'],
      [Number.NaN, Number.NaN, 'ended early'],
    ]);
  });

  it('while it runs, ends with the stretch that goes on, and says what is still to come', () => {
    const looks = read(lesson, { now: 110_000 });
    expect(told(looks)).toEqual([
      [0, 2, 'missed'],
      [2, 40, 'on'],
      [40, 55.5, 'off'],
      [55.5, 90, 'on'],
      [90, 100, 'out of view'],
      [100, 110, 'none'],
      [Number.NaN, Number.NaN, 'waiting'],
    ]);
    expect(told(read([], { now: 1500 }))[0]).toEqual([0, 1.5, 'open']);
  });

  it('ends what held when the class is interrupted, the child goes, or the tablet stood still: nobody knows what came then', () => {
    expect(
      told(
        read([
          [1000, touch('on')],
          [10_000, { kind: 'interrupted' }],
          [20_000, { kind: 'continued' }],
          [23_000, touch('off')],
          [40_000, { kind: 'left', child: 'c1', reason: 'with another adult' }],
          [50_000, { kind: 'returned', child: 'c1' }],
          [50_500, touch('on')],
          [70_000, { kind: 'gap', from: 60_000, to: 70_000, cause: 'hidden', estimated: false }],
          [72_000, touch('on')],
          [80_000, { kind: 'ended', reason: 'early' }],
        ]),
      ).slice(0, -1),
    ).toEqual([
      [0, 1, 'missed'],
      [1, 10, 'on'],
      [10, 20, 'class interrupted'],
      [20, 23, 'missed'],
      [23, 40, 'off'],
      [40, 50, 'with another adult'],
      [50, 50.5, 'missed'],
      [50.5, 60, 'on'],
      [60, 72, 'missed'],
      [72, 80, 'on'],
      [80, 120, 'ended early'],
    ]);
  });

  it('stands cut by the break, by a stretch of no use and by parts of the lesson', () => {
    expect(
      told(
        read([
          [1000, touch('on')],
          [30_000, { kind: 'lessonPart', lessonPart: 'group' }],
          [50_000, { kind: 'unusable', from: 10_000, to: 20_000, reason: 'other' }],
          [60_000, { kind: 'breakStarted' }],
          [200_000, { kind: 'phaseStarted', phase: 'after', part: 1, origin: 203_000 }],
          [210_000, { kind: 'marked', interval: 2, code: 'off' }],
          [323_000, { kind: 'ended', reason: 'complete' }],
        ]),
      ),
    ).toEqual([
      [0, 1, 'missed'],
      [1, 10, 'on'],
      [10, 20, 'other'],
      [20, 30, 'on'],
      [30, 60, 'on'],
      [60, 120, 'ended early'],
      [203, 210, 'missed'],
      [210, 323, 'off'],
    ]);
  });

  it('tiles its parts whatever was said in whatever order, and numbers its stretches through', () => {
    const thing = fc.tuple(
      fc.integer({ min: 0, max: 130_000 }),
      fc.constantFrom<EntryBody>(
        touch('on'),
        touch('off'),
        touch(null),
        { kind: 'missing', interval: 1, reason: 'out of view' },
        { kind: 'interrupted' },
        { kind: 'continued' },
        { kind: 'left', child: 'c1', reason: 'left the room' },
        { kind: 'returned', child: 'c1' },
        { kind: 'unusable', from: 30_000, to: 45_000, reason: 'other' },
      ),
    );
    fc.assert(
      fc.property(fc.array(thing, { maxLength: 25 }), fc.boolean(), (said, over) => {
        const sorted = [...said].sort(([a], [b]) => a - b);
        const looks = read(
          [...sorted, ...(over ? ([[119_000, { kind: 'ended', reason: 'early' }]] as const) : [])],
          {
            final: over,
            now: 119_000,
          },
        );
        expect(looks.map(({ number }) => number)).toEqual(looks.map((_, i) => i + 1));
        const first = looks.filter(({ part }) => part === 0);
        expect(first[0]?.openAt).toBe(0);
        for (const [i, look] of first.entries()) {
          // Only what was touched this very moment has no length yet.
          if (over || i < first.length - 1) expect(look.closeAt).toBeGreaterThan(look.openAt);
          if (i > 0) expect(look.openAt).toBe(first[i - 1]?.closeAt);
        }
        expect(first.at(-1)?.closeAt).toBe(over ? 120_000 : 119_000);
      }),
      { numRuns: 300, seed: 4 },
    );
  });
});
