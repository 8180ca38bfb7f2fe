import { describe, expect, it } from 'vitest';
import type { EntryBody } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { emptyState } from '../../src/journal/state.ts';
import { fold, step } from '../../src/journal/step.ts';
import { headerOf, journalOf } from '../support/session.ts';

/*
 * Momentary looks at 15, 30 … 90 s of c1, c2, c3, c1, c2, c3. What stands at each interval is written beside it by hand.
 */
type Said = readonly (readonly [number, EntryBody])[];
const marked = (interval: number, code: string | null): EntryBody => ({ kind: 'marked', interval, code });
const words = (said: Said, header = headerOf()): string[] =>
  readOut(fold(header, journalOf(...said)), { final: true }).map(
    ({ codes, missing }) => missing ?? (codes?.join('+') || 'none'),
  );

const round: Said = [
  [16_000, marked(1, 'on')],
  [31_000, marked(2, 'off')],
  [46_000, marked(3, 'on')],
  [61_000, marked(4, 'off')],
  [76_000, marked(5, 'on')],
];
const ended: Said[number] = [106_000, { kind: 'ended', reason: 'complete' }];

describe('a correction in the room', () => {
  it('says what the interval holds from now on; what was touched stays in the journal', () => {
    const said: Said = [...round, [80_000, { kind: 'corrected', interval: 2, codes: ['on'], missing: null }]];
    expect(words([...said, ended])).toEqual(['on', 'on', 'on', 'off', 'on', 'missed']);
    const look = readOut(fold(headerOf(), journalOf(...said)), { final: true })[1];
    expect(look).toMatchObject({ corrected: true, amended: false });
    expect(look?.touchedAt).toBeNaN();
  });

  it('may say that the look is missing, or fill a look that was missed', () => {
    expect(
      words([
        ...round,
        [95_000, { kind: 'corrected', interval: 1, codes: null, missing: 'out of view' }],
        [96_000, { kind: 'corrected', interval: 6, codes: ['off'], missing: null }],
        ended,
      ]),
    ).toEqual(['out of view', 'off', 'on', 'off', 'on', 'off']);
  });

  it('replaces a set of codes, to which later touches add', () => {
    const partial = headerOf({ method: 'partial', observeMs: 10_000 });
    const said: Said = [
      [12_000, marked(1, 'on')],
      [13_000, marked(1, 'off')],
      [14_000, { kind: 'corrected', interval: 1, codes: ['off'], missing: null }],
    ];
    expect(words([...said, ended], partial)[0]).toBe('off');
    expect(words([...said, [14_500, marked(1, 'on')], ended], partial)[0]).toBe('off+on');
  });

  it('corrects a headcount', () => {
    const header = headerOf({ method: 'headcount' });
    const counts = { on: 12, present: 20 };
    const state = fold(
      header,
      journalOf(
        [16_000, { kind: 'marked', interval: 1, code: null, counts: { on: 2, present: 20 } }],
        [20_000, { kind: 'corrected', interval: 1, codes: [], missing: null, counts }],
      ),
    );
    expect(readOut(state, { final: true })[0]).toMatchObject({ child: null, counts, corrected: true });
  });
});

describe('the wrong child was watched', () => {
  it('exchanges what stands at the two looks, an empty one, too; undone, all is as before', () => {
    const swapped: Said[number] = [
      95_000,
      {
        kind: 'swapped',
        pairs: [
          [4, 5],
          [3, 6],
        ],
      },
    ];
    expect(words([...round, swapped, ended])).toEqual(['on', 'off', 'missed', 'on', 'off', 'on']);
    const undone: Said[number] = [
      97_000,
      { kind: 'withdrawn', target: { writer: 'writer-1', seq: round.length } },
    ];
    expect(words([...round, swapped, undone, ended])).toEqual(['on', 'off', 'on', 'off', 'on', 'missed']);
  });

  it('tells no response time of a mark that was for another cue', () => {
    const looks = readOut(
      fold(headerOf(), journalOf(...round, [95_000, { kind: 'swapped', pairs: [[4, 5]] }])),
      { final: true },
    );
    expect(looks.map(({ corrected }) => corrected)).toEqual([false, false, false, true, true, false]);
    expect(looks[3]?.touchedAt).toBeNaN();
    expect(looks[2]?.touchedAt).toBe(46_000);
  });

  it('a mark that comes after the exchange is the interval’s own', () => {
    const swapped: Said[number] = [80_000, { kind: 'swapped', pairs: [[4, 5]] }];
    expect(words([...round, swapped, [81_000, marked(5, 'on')], ended])[4]).toBe('on');
  });
});

describe('a stretch of no use', () => {
  it('takes the looks whose cues lie in it, the first moment in and the last one out; the reason stands', () => {
    expect(
      words([...round, [80_000, { kind: 'unusable', from: 30_000, to: 60_000, reason: 'other' }], ended]),
    ).toEqual(['on', 'other', 'other', 'off', 'on', 'missed']);
  });

  it('can be taken back for one look by a correction that comes later', () => {
    expect(
      words([
        ...round,
        [80_000, { kind: 'unusable', from: 0, to: 80_000, reason: 'class interrupted' }],
        [81_000, { kind: 'corrected', interval: 5, codes: ['off'], missing: null }],
        ended,
      ]),
    ).toEqual([...Array(4).fill('class interrupted'), 'off', 'missed']);
  });
});

describe('an interval done once more after a pause', () => {
  const repeated: Said = [
    [16_000, marked(1, 'on')],
    [20_000, { kind: 'paused' }],
    [14_000, { kind: 'resumed', repeats: 2 }],
  ];

  it('turns session time back, and forgets what was said of its first half', () => {
    const partial = headerOf({ method: 'partial', observeMs: 10_000 });
    const said: Said = [[17_000, marked(2, 'off')], ...repeated];
    const state = fold(partial, journalOf(...said));
    expect(state.at).toBe(14_000);
    expect(readOut(state, { now: 15_500 })[1]).toMatchObject({ status: 'open' });
    expect(words([...said, ended], partial)[1]).toBe('missed');
  });

  it('folds step by step to the same state as from scratch', () => {
    const journal = journalOf(...repeated, [31_000, marked(2, 'on')]);
    const stepped = journal.reduce(step, emptyState(headerOf()));
    expect(stepped).toEqual(fold(headerOf(), journal));
    expect(stepped.at).toBe(31_000);
  });
});

describe('a reserve stands in', () => {
  const header = headerOf({}, ['before'], { reserves: [{ id: 'r1', pseudonym: 'Otter-09', stratum: null }] });
  const left: Said[number] = [20_000, { kind: 'left', child: 'c2', reason: 'left the room', by: 'r1' }];
  const childrenOf = (said: Said) =>
    readOut(fold(header, journalOf(...said)), { final: true }).map(({ child }) => child);

  it('from the next look of the child who left until that child returns', () => {
    expect(childrenOf([left, ended])).toEqual(['c1', 'r1', 'c3', 'c1', 'r1', 'c3']);
    expect(childrenOf([left, [50_000, { kind: 'returned', child: 'c2' }], ended])).toEqual([
      'c1',
      'r1',
      'c3',
      'c1',
      'c2',
      'c3',
    ]);
    expect(words([left, [31_000, marked(2, 'on')], ended], header)[1]).toBe('on');
    expect(words([left, ended], header)[1]).toBe('missed');
  });

  it('and is stood in for by nobody when it leaves, too', () => {
    const gone: Said[number] = [70_000, { kind: 'left', child: 'r1', reason: 'with another adult' }];
    expect(words([left, gone, ended], header)[4]).toBe('with another adult');
  });
});
