import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { mergeBundles } from '../../src/exchange/mergeBundles.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import type { Bundle } from '../../src/exchange/types.ts';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import {
  bytesOf,
  classroom,
  journalOf,
  laidHeader,
  protocol,
  sampleBundle,
  study,
  visitPlan,
} from './sampleStudy.ts';
import { sentence } from './sentence.ts';

const empty: Bundle = {
  study: null,
  classes: [],
  observers: [],
  protocols: [],
  sessions: [],
  visitPlans: [],
};
const merge = (...bundles: Bundle[]): Bundle => mergeBundles(bundles).bundle;
const told = (...bundles: Bundle[]): string[] =>
  mergeBundles(bundles).notices.map((problem) => sentence({ problem }));

const revision = fc.record({ counter: fc.nat(2), writer: fc.constantFrom('tablet-1', 'tablet-2', 'table') });
const name = fc.constantFrom('3B', '3C');
const entry = fc.record({
  kind: fc.constantFrom('interrupted', 'continued', 'hummed'),
  at: fc.constantFrom(0, 500),
});
const bundles: fc.Arbitrary<Bundle> = fc.record({
  study: fc.option(
    fc.record({ id: fc.constantFrom('s1', 's2'), name, revision }).map((some) => ({ ...study, ...some })),
  ),
  classes: fc.array(
    fc
      .record({
        id: fc.constantFrom('c1', 'c2'),
        condition: fc.constantFrom(null, 'break', 'usual'),
        removed: fc.boolean(),
        children: fc.subarray(classroom.children),
        revision,
      })
      .map((some) => ({
        ...classroom,
        ...some,
        // A removal is an edit: its state has a writer of its own, never the table.
        removed: some.removed && some.revision.writer !== 'table',
      })),
    { maxLength: 3 },
  ),
  observers: fc.array(
    fc
      .record({ id: fc.constantFrom('o1', 'o2'), name, removed: fc.boolean(), revision })
      .map((some) => ({ ...some, study: study.id, keyMap: null })),
    { maxLength: 3 },
  ),
  protocols: fc.array(
    fc.record({ version: fc.constantFrom(1, 2), name, revision }).map((some) => ({ ...protocol, ...some })),
    { maxLength: 3 },
  ),
  sessions: fc.array(
    fc
      .record({
        id: fc.constantFrom('x1', 'x2'),
        device: fc.constantFrom('tablet', 'other'),
        writer: fc.constantFrom('w1', 'w2'),
        says: fc.array(entry, { maxLength: 4 }),
      })
      .map(({ id, device, writer, says }) => ({
        header: { ...laidHeader(id), device },
        journal: journalOf(id, writer, says),
      })),
    { maxLength: 3 },
  ),
  visitPlans: fc.array(
    fc.constantFrom(null, 'break').map((condition) => ({ ...visitPlan, condition })),
    { maxLength: 2 },
  ),
});

function same(a: Bundle, b: Bundle): void {
  expect(canonicalJson(a)).toBe(canonicalJson(b));
}

describe('a merge is a union', () => {
  test('idempotent', () => {
    fc.assert(
      fc.property(bundles, (a) => {
        const once = merge(a);
        same(merge(a, a), once);
        same(merge(once), once);
        same(merge(once, a), once);
      }),
    );
  });

  test('commutative', () => {
    fc.assert(
      fc.property(bundles, bundles, (a, b) => {
        same(merge(a, b), merge(b, a));
        expect(mergeBundles([a, b]).conflicts.length).toBe(mergeBundles([b, a]).conflicts.length);
      }),
    );
  });

  test('associative, with nothing as its zero', () => {
    fc.assert(
      fc.property(bundles, bundles, bundles, (a, b, c) => {
        const all = merge(a, b, c);
        same(merge(merge(a, b), c), all);
        same(merge(a, merge(b, c)), all);
        same(merge(a, empty), merge(a));
      }),
      { numRuns: 300 },
    );
  });

  test('every entry of every journal under the header that is kept is there', () => {
    fc.assert(
      fc.property(bundles, bundles, (a, b) => {
        const merged = merge(a, b);
        for (const { header, journal } of [...a.sessions, ...b.sessions]) {
          const kept = merged.sessions.find((session) => session.header.id === header.id);
          if (canonicalJson(kept?.header) !== canonicalJson(header)) continue;
          const texts = new Set(kept?.journal.map(canonicalJson));
          expect(journal.every((one) => texts.has(canonicalJson(one)))).toBe(true);
        }
      }),
    );
  });
});

describe('what a merge keeps and tells', () => {
  test('the higher revision, ties by writer; the other is history; a removal stays removed', () => {
    const at = (counter: number, writer: string, removed: boolean) => ({
      ...empty,
      classes: [{ ...classroom, removed, revision: { counter, writer } }],
    });
    const { bundle, history, conflicts } = mergeBundles([
      at(3, 'b', true),
      at(2, 'z', false),
      at(3, 'a', false),
    ]);
    expect(bundle.classes.map(({ removed, revision: { writer } }) => [removed, writer])).toEqual([
      [true, 'b'],
    ]);
    expect(history.map(({ noun }) => noun)).toEqual(['class', 'class']);
    expect(conflicts).toEqual([]);
  });

  test('two contents of one revision are told, whatever the order', () => {
    const other = { ...empty, classes: [{ ...classroom, name: '3C' }] };
    const words = [
      'The class 3B stands with two contents of the same age; one of them is taken, and both can be looked at.',
    ];
    expect(told(sampleBundle(), other)).toEqual(words);
    expect(told(other, sampleBundle())).toEqual(words);
  });

  test('two headers of one session are a conflict that shows both; records are not mixed', () => {
    const one = {
      ...empty,
      sessions: [
        { header: laidHeader(), journal: journalOf('session-1', 'w1', [{ kind: 'interrupted', at: 1 }]) },
      ],
    };
    const two = {
      ...empty,
      sessions: [
        {
          header: { ...laidHeader(), condition: 'usual' },
          journal: journalOf('session-1', 'w2', [{ kind: 'interrupted', at: 1 }]),
        },
      ],
    };
    const { bundle, conflicts, notices } = mergeBundles([two, one]);
    expect(conflicts).toMatchObject([
      { kind: 'session', headers: [{ condition: 'break' }, { condition: 'usual' }] },
    ]);
    expect(bundle.sessions[0]?.journal.map(({ writer }) => writer)).toEqual(['w1']);
    expect(notices.map((problem) => sentence({ problem }))).toEqual([
      'Session session-1 of Quill stands in 2 different forms in these files; one of them is taken, and all can be looked at.',
    ]);
  });

  test('one entry with two contents is told, and both are kept', () => {
    const entry = (kind: string) => ({
      ...empty,
      sessions: [{ header: laidHeader(), journal: journalOf('session-1', 'w1', [{ kind, at: 1 }]) }],
    });
    const { bundle, conflicts } = mergeBundles([entry('interrupted'), entry('continued')]);
    expect(bundle.sessions[0]?.journal).toHaveLength(2);
    expect(conflicts).toMatchObject([{ kind: 'entry', session: 'session-1', writer: 'w1', seq: 0 }]);
  });

  test('a journal cut off and the whole one make the whole one', () => {
    const [session] = sampleBundle().sessions;
    if (session === undefined) throw new Error('no session');
    const cut = { ...empty, sessions: [{ header: session.header, journal: session.journal.slice(0, 2) }] };
    expect(merge(cut, sampleBundle()).sessions).toEqual([session]);
  });

  test('files of two studies are told', () => {
    const other = { ...empty, study: { ...study, id: 'study-2', name: 'Another one' } };
    expect(told(other, sampleBundle())).toEqual([
      'The files belong to different studies: Breaks at Heron Hill and Another one; expected files of one study.',
    ]);
  });

  test('reading a table twice, or under another name, doubles nothing', async () => {
    const head = 'session,observer,child,interval,code,class';
    const take = async (name: string, text: string): Promise<Bundle> => {
      const outcome = await readIncoming({ name, bytes: bytesOf(text) });
      if (!outcome.ok) throw new Error(outcome.problems.map(sentence).join());
      return outcome.bundle;
    };
    const a = await take('a.csv', `${head}\ns,Quill,Otter-07,1,on,3B\ns,Quill,Heron-02,2,off,3B\n`);
    const b = await take('b.csv', `${head}\ns,Quill,Heron-02,2,off,3B\ns,Quill,Otter-07,1,on,3B\n`);
    const c = await take('c.csv', `${head}\nt,Quill,Finch-11,1,on,3B\n`);
    const { bundle, notices } = mergeBundles([a, b, c]);
    expect(notices).toEqual([]);
    expect(bundle.sessions).toHaveLength(2);
    expect(bundle.classes.map(({ children }) => children.map(({ pseudonym }) => pseudonym))).toEqual([
      ['Finch-11', 'Heron-02', 'Otter-07'],
    ]);
    const corrected = await take('a.csv', `${head}\ns,Quill,Otter-07,1,off,3B\ns,Quill,Heron-02,2,off,3B\n`);
    expect(mergeBundles([a, corrected]).conflicts.length).toBeGreaterThan(0);
  });
});
