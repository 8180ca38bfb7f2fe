import { expect, it } from 'vitest';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { type Amendment, addNote, amendInterval, pairVisit, settleInterval } from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { headerOf, journalOf as sayings } from '../support/session.ts';
import { type Bench, bench, recorded, school } from './bench.ts';

async function interval(on: Bench, session: string, number: number) {
  const stored = given(await on.deps.store.readSession(session));
  if (stored === null) throw new Error('no session');
  return readOut(fold(stored.header, stored.journal)).find((one) => one.number === number);
}

const wish: Amendment = { interval: 2, codes: ['off'], missing: null, why: 'wrong tap', by: 'Quill' };

it('corrects an interval by a new entry with why and by whom; the mark stays', async () => {
  // The clock of this bench stands an hour behind the recorder's: a correction counts all the same.
  const on = await bench();
  const { id } = await recorded(on, await school(on));
  given(await on.deps.store.pack(id));
  expect(await interval(on, id, 2)).toMatchObject({ codes: ['on'], amended: false });
  given(await amendInterval(on.deps, id, wish));
  expect(await interval(on, id, 2)).toMatchObject({ codes: ['off'], amended: true });
  given(await amendInterval(on.deps, id, { ...wish, codes: null, missing: 'out of view' }));
  expect(await interval(on, id, 2)).toMatchObject({ status: 'missing', missing: 'out of view' });
  const journal = given(await on.deps.store.readSession(id))?.journal ?? [];
  expect(journal.filter((entry) => entry.kind === 'marked')).toHaveLength(3);
  const amended = journal.filter((entry) => entry.kind === 'amended');
  expect(amended).toMatchObject([
    { writer: 'tablet-a', seq: 0, why: 'wrong tap', by: 'Quill' },
    { writer: 'tablet-a', seq: 1 },
  ]);
});

it('takes two corrections at once, one after the other', async () => {
  const on = await bench();
  const { id } = await recorded(on, await school(on));
  const both = await Promise.all([
    amendInterval(on.deps, id, wish),
    amendInterval(on.deps, id, { ...wish, interval: 3 }),
  ]);
  expect(both.map(codeOf)).toEqual(['ok', 'ok']);
  const seqs = given(await on.deps.store.readSession(id))?.journal.filter(({ kind }) => kind === 'amended');
  expect(seqs?.map(({ seq }) => seq)).toEqual([0, 1]);
});

it('settles a code after review without replacing the mark', async () => {
  const on = await bench();
  const { id } = await recorded(on, await school(on));
  given(await settleInterval(on.deps, id, { interval: 1, codes: ['off'], why: 'talked over', by: 'Marsh' }));
  expect(await interval(on, id, 1)).toMatchObject({ codes: ['on'], settled: ['off'], amended: false });
});

it('refuses a correction that makes no sense, and one while the session runs', async () => {
  const on = await bench();
  const made = await school(on);
  const { id } = await recorded(on, made);
  const running = await recorded(on, made, { ended: false });
  const before = await on.dump();
  const refused = async (changes: Partial<Amendment>) =>
    codeOf(await amendInterval(on.deps, id, { ...wish, ...changes }));
  expect(await refused({ interval: 9999 })).toBe('task.noSuchInterval');
  expect(await refused({ codes: ['sings'] })).toBe('task.noSuchCode');
  expect(await refused({ codes: ['on', 'off'] })).toBe('task.oneCode');
  expect(await refused({ codes: [] })).toBe('task.oneCode');
  expect(await refused({ missing: 'other' })).toBe('task.codesOrReason');
  expect(await refused({ codes: null })).toBe('task.codesOrReason');
  expect(await refused({ why: ' ' })).toBe('task.noReason');
  expect(await refused({ by: '' })).toBe('task.nameMissing');
  expect(codeOf(await amendInterval(on.deps, running.id, wish))).toBe('task.sessionRuns');
  expect(codeOf(await amendInterval(on.deps, 'nothing', wish))).toBe('task.noSession');
  expect(await on.dump()).toBe(before);
});

it('makes a corrected session one that has to be handed over again', async () => {
  const on = await bench();
  const { id } = await recorded(on, await school(on));
  given(await on.deps.store.markHandedOver([{ session: id, own: 5 }]));
  expect(given(await on.deps.store.session(id))?.handedOver).toBe(true);
  given(await amendInterval(on.deps, id, wish));
  expect(given(await on.deps.store.session(id))?.handedOver).toBe(false);
});

it('pairs a session with a visit by hand, and lets it go again', async () => {
  const on = await bench();
  const made = await school(on);
  const [one, other] = [await recorded(on, made), await recorded(on, made)];
  expect(given(await pairVisit(on.deps, one.id, other.visit)).pairings).toEqual([
    { session: one.id, visit: other.visit },
  ]);
  expect(given(await pairVisit(on.deps, one.id, one.visit)).pairings).toHaveLength(1);
  const before = await on.dump();
  expect(codeOf(await pairVisit(on.deps, one.id, 'no visit'))).toBe('task.noVisit');
  expect(codeOf(await pairVisit(on.deps, 'nothing', other.visit))).toBe('task.noSession');
  expect(await on.dump()).toBe(before);
  expect(given(await pairVisit(on.deps, one.id, null)).pairings).toEqual([]);
});

it('adds words to a flag after the session, and nothing while it runs', async () => {
  const on = await bench();
  const made = await school(on);
  const { id } = await recorded(on, made);
  const running = await recorded(on, made, { ended: false });
  const about = { writer: 'run-1', seq: 2 };
  given(await addNote(on.deps, id, { text: ' the fire  bell ', about }));
  const journal = given(await on.deps.store.readSession(id))?.journal;
  expect(journal?.find(({ kind }) => kind === 'noted')).toMatchObject({
    text: 'the fire bell',
    about,
    seq: 0,
  });
  const before = await on.dump();
  expect(codeOf(await addNote(on.deps, id, { text: ' ' }))).toBe('task.noWords');
  expect(codeOf(await addNote(on.deps, running.id, { text: 'x' }))).toBe('task.sessionRuns');
  expect(await on.dump()).toBe(before);
});

/** A recorded session of this method whose journal says nothing but its end. */
async function recordedBy(on: Bench, protocol: Parameters<typeof headerOf>[0]) {
  const header = headerOf(protocol, ['before'], { id: 'session-1' });
  given(await on.deps.store.createSession(header));
  const journal = sayings(
    [0, { kind: 'started', checks: [], anyway: false }],
    [600_000, { kind: 'ended', reason: 'complete' }],
  );
  given(await on.deps.store.appendEntries(header.id, journal));
  return header.id;
}

it('corrects a scan by two counts or a reason, and by counts that can be', async () => {
  const on = await bench();
  const id = await recordedBy(on, { method: 'headcount', partLength: { kind: 'minutes', minutes: 2 } });
  const scan: Amendment = { ...wish, codes: [], counts: { on: 17, present: 22 } };
  const said = async (changes: Partial<Amendment>) =>
    codeOf(await amendInterval(on.deps, id, { ...scan, ...changes }));
  expect(await said({})).toBe('ok');
  expect(await interval(on, id, 2)).toMatchObject({
    status: 'scored',
    counts: { on: 17, present: 22 },
    amended: true,
  });
  const { counts, ...without } = scan;
  expect(codeOf(await amendInterval(on.deps, id, without))).toBe('task.countsOrReason');
  expect(await said({ counts: { on: 23, present: 22 } })).toBe('task.countsOutOfRange');
  expect(await said({ counts: { on: 1.5, present: 22 } })).toBe('task.countsOutOfRange');
  expect(await said({ counts: { on: Number.NaN, present: 22 } })).toBe('task.countsOutOfRange');
  expect(await said({ codes: null, missing: 'missed' })).toBe('task.countsOrReason');
  expect(counts?.on).toBe(17);
  expect(codeOf(await amendInterval(on.deps, id, { ...without, codes: null, missing: 'missed' }))).toBe('ok');
  expect(await interval(on, id, 2)).toMatchObject({ missing: 'missed', counts: null });
});

it('gives no counts to a look, and corrects no stretch of a recorded duration', async () => {
  const on = await bench();
  const { id } = await recorded(on, await school(on));
  expect(codeOf(await amendInterval(on.deps, id, { ...wish, counts: { on: 1, present: 2 } }))).toBe(
    'task.countsOrReason',
  );
  const other = await recordedBy(on, { method: 'duration', rotation: { kind: 'one' } });
  expect(codeOf(await amendInterval(on.deps, other, { ...wish, interval: 1, codes: ['on'] }))).toBe(
    'task.durationNotCorrected',
  );
});
