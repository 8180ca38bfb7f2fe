import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { recordsOf, visits } from '../../src/analysis/index.ts';
import { headerOf } from '../support/session.ts';
import { looksOf, type Row, sessionsFrom } from './sessionsFrom.ts';

async function grouped(sessions: readonly Row[], pairings: { session: string; visit: string }[] = []) {
  const rows = sessions.flatMap((facts) => looksOf(facts, { A: '10' }));
  const records = recordsOf(await sessionsFrom(rows));
  return visits(records, pairings).map((visit) => visit.records.map(({ label }) => label).join('+'));
}

const marsh = { observer: 'Marsh', class: 'Otters', phase: 'before', date: '2026-11-03' };
const quill = { ...marsh, observer: 'Quill' };

describe('visits', () => {
  test('the same name of a visit brings observers together, another one keeps them apart', async () => {
    expect(
      await grouped([
        { ...quill, session: 'q', visit: 'one' },
        { ...marsh, session: 'm', visit: 'one' },
        { ...marsh, session: 'm2', visit: 'two' },
      ]),
    ).toEqual(['m+q', 'm2']);
  });

  test('the same name in two classes means two visits; a table that leaves the class out joins the only one', async () => {
    const herons = { ...quill, class: 'Herons' };
    expect(
      await grouped([
        { ...marsh, session: 'm', visit: '1' },
        { ...herons, session: 'h', visit: '1' },
      ]),
    ).toEqual(['h', 'm']);
    expect(
      await grouped([
        { ...marsh, session: 'm', visit: '1' },
        { ...quill, class: '', session: 'q', visit: '1' },
      ]),
    ).toEqual(['m+q']);
  });

  test('without a name: class, phase, date, and starts within 30 minutes', async () => {
    const at = (time: string) => `2026-11-03T${time}:00+00:00`;
    expect(
      await grouped([
        { ...marsh, session: 'm', start: at('09:00') },
        { ...quill, session: 'q', start: at('09:30') },
        { ...quill, session: 'late', start: at('09:31') },
        { ...quill, session: 'other class', class: 'Herons', start: at('09:00') },
      ]),
    ).toEqual(['other class', 'm+q', 'late']);
    expect(
      await grouped([
        { ...marsh, session: 'm' },
        { ...quill, session: 'q' },
      ]),
    ).toEqual(['m+q']);
    expect(
      await grouped([
        { ...marsh, session: 'm' },
        { ...quill, session: 'q', phase: 'after' },
      ]),
    ).toHaveLength(2);
  });

  test('with neither visit nor date each session is a visit of its own', async () => {
    const undated = { class: 'Otters', phase: 'before' };
    expect(
      await grouped([
        { ...undated, observer: 'Marsh', session: 'm' },
        { ...undated, observer: 'Quill', session: 'q' },
      ]),
    ).toEqual(['m', 'q']);
  });

  test("one observer twice under one key: the k-th goes with the other's k-th", async () => {
    expect(
      await grouped([
        { ...marsh, session: 'm2' },
        { ...quill, session: 'q1' },
        { ...quill, session: 'q2' },
        { ...marsh, session: 'm1' },
        { ...marsh, session: 'm3' },
      ]),
    ).toEqual(['m1+q1', 'm2+q2', 'm3']);
  });

  test('a pairing by hand goes first, and can also part what would be joined', async () => {
    const facts = [
      { ...marsh, session: 'm', visit: 'one' },
      { ...quill, session: 'q', visit: 'two' },
    ];
    const [m, q] = await sessionsFrom(facts.flatMap((one) => looksOf(one, { A: '10' })));
    const by = (session: string | undefined, visit: string | undefined) => [
      { session: session ?? '', visit: visit ?? '' },
    ];
    expect(await grouped(facts, by(q?.header.id, m?.header.visit))).toEqual(['m+q']);
    const same = facts.map((one) => ({ ...one, visit: 'one' }));
    const [, second] = await sessionsFrom(same.flatMap((one) => looksOf(one, { A: '10' })));
    expect(await grouped(same, by(second?.header.id, 'zz'))).toEqual(['m', 'q']);
  });

  test('recorded sessions come together by the visit that they share; practice only when asked for', () => {
    const header = (id: string, observer: string, more = {}) => ({
      header: headerOf({}, ['before'], { id, observer: { id: observer, name: observer }, ...more }),
      journal: [],
    });
    const sessions = [
      header('m', 'Marsh'),
      header('q', 'Quill'),
      header('x', 'Quill', { visit: 'another' }),
      header('p', 'Reed', { practice: true }),
    ];
    const names = (practice: boolean) =>
      visits(recordsOf(sessions, { practice })).map(({ records }) =>
        records.map(({ label }) => label).join('+'),
      );
    expect(names(false)).toEqual(['x', 'm+q']);
    expect(names(true)).toEqual(['x', 'm+q+p']);
  });

  test('the order of rows decides nothing', async () => {
    const facts: Row[] = ['Marsh', 'Quill', 'Reed'].flatMap((observer) =>
      ['09:00', '09:20', '10:00'].map((time) => ({
        ...marsh,
        observer,
        session: `${observer} ${time}`,
        start: `2026-11-03T${time}:00+00:00`,
      })),
    );
    const expected = await grouped(facts);
    await fc.assert(
      fc.asyncProperty(fc.shuffledSubarray(facts, { minLength: facts.length }), async (shuffled) => {
        expect(await grouped(shuffled)).toEqual(expected);
      }),
      { numRuns: 20 },
    );
  });
});
