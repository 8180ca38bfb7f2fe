import { describe, expect, it } from 'vitest';
import type { KnownEntry } from '../../src/journal/entry.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { epochOf } from '../../src/kernel/wallTime.ts';
import type { SessionHeader } from '../../src/model/session.ts';
import type { LiveOptions } from '../../src/recorder/liveSession.ts';
import { headerOf } from '../support/session.ts';
import { FakeStore } from './fakes/fakeStore.ts';
import { Lesson, outcomeOf } from './fakes/lesson.ts';

/** A lesson of 20 minutes in which something of everything happens; its whole journal. */
async function eventful(): Promise<{ header: SessionHeader; journal: KnownEntry[] }> {
  const header = headerOf({ partLength: { kind: 'minutes', minutes: 10 } }, ['before', 'after']);
  const lesson = await new Lesson({ header }).begin();
  const markUntil = async (from: number, to: number, origin = 0) => {
    for (let k = from; k <= to; k++) {
      await lesson.until(origin + k * 15_000 + 1500 + ((k * 977) % 9000));
      if (k % 7 === 0) lesson.cannotSee();
      else lesson.touch(k % 3 === 0 ? 'off' : 'on');
    }
  };
  await markUntil(1, 8);
  lesson.session.undo();
  lesson.session.childLeft('c2', 'left the room');
  await markUntil(9, 12);
  lesson.session.childReturned('c2');
  lesson.session.interruptClass();
  await lesson.clock.advance(50_000);
  lesson.session.continueClass();
  await markUntil(17, 20);
  lesson.session.silence(true);
  lesson.session.flag();
  await markUntil(21, 22);
  lesson.session.breakStarted();
  await lesson.clock.advance(60_000);
  lesson.session.firstTaskGiven();
  const origin = lesson.session.snapshot().state.origins[1] ?? Number.NaN;
  await markUntil(1, 40, origin);
  await lesson.clock.advance(20_000);
  return { header, journal: lesson.store.journal() };
}

/** The tablet starts again `later` ms after the last entry that was kept, with what was kept until then. */
async function resumed(
  header: SessionHeader,
  journal: readonly KnownEntry[],
  later: number,
  options: Partial<LiveOptions> = {},
): Promise<Lesson> {
  const store = new FakeStore();
  for (const entry of journal) store.rows.set(`${entry.writer} ${entry.seq}`, entry);
  const lesson = new Lesson({ header, store, resumeFrom: journal, ...options });
  lesson.clock.wall = epochOf(journal.at(-1)?.wall ?? '') + later;
  return lesson;
}

describe('a journal cut at every place', () => {
  it.each([800, 40_000])(
    'goes on %i ms later on the same grid, loses no mark, and says what fell in between',
    async (later) => {
      const { header, journal } = await eventful();
      expect(journal.length).toBeGreaterThan(120);
      for (let cut = 1; cut < journal.length; cut++) {
        const before = journal.slice(0, cut);
        const last = before.at(-1);
        if (last === undefined || last.kind === 'ended') throw new Error('not cut');
        const lesson = await resumed(header, before, later);
        const snapshot = lesson.session.snapshot();
        const marksBefore = readOut(fold(header, before)).map(outcomeOf);
        const over = snapshot.phase === 'ended';
        if (!over) {
          expect(snapshot).toMatchObject({ phase: 'ready', resuming: true });
          await lesson.session.begin();
        }
        const now = lesson.session.snapshot().now;
        const told = Math.max(...before.map(({ at }) => at));
        // The grid has gone on by the wall clock: an entry may be told up to a busy moment late, never early.
        expect(now).toBeGreaterThanOrEqual(told);
        const end = (fold(header, before).origins[1] ?? Number.NaN) + 615_000;
        const expected = Math.max(told, last.at + later);
        expect(Math.abs(now - (over ? end : expected))).toBeLessThanOrEqual(1);
        expect(over && expected < end).toBe(false);
        await lesson.clock.advance(50_000);
        const state = fold(header, lesson.store.journal());
        // Old and new entries are one journal of one writer without gaps.
        expect(lesson.store.journal().map(({ seq }) => seq)).toEqual(
          [...lesson.store.rows.keys()].map((_, i) => i),
        );
        const after = readOut(state, { now: now + 50_000 });
        after.forEach((interval, i) => {
          const was = marksBefore[i] ?? '';
          if (was !== 'open' && was !== 'waiting' && was !== 'missed' && was !== 'prompt failed')
            expect([cut, i, outcomeOf(interval)]).toEqual([cut, i, was]);
        });
        const origin = (part: number) => state.origins[part] ?? Number.NaN;
        for (const entry of lesson.store.journal()) {
          if (entry.kind !== 'cued') continue;
          const line = state.planned[entry.interval - 1];
          expect(entry.planned).toBe(origin(line?.part ?? 0) + (line?.cueMs ?? Number.NaN));
        }
        // A look that fell wholly between is missing because nobody was told of it, never off-task, never "missed".
        const gap = state.gaps.findLast(({ cause }) => cause === 'closed');
        for (const interval of after) {
          const inGap = gap !== undefined && interval.cueAt > gap.from && interval.closeAt <= gap.to;
          if (!inGap) continue;
          expect(['prompt failed', 'class interrupted', 'left the room', 'ended early']).toContain(
            outcomeOf(interval),
          );
        }
      }
    },
  );
});

describe('resumption', () => {
  /** Three rounds, cut off at 50 seconds after three looks. */
  const cutOff = async (changes: Partial<SessionHeader> = {}) => {
    const header = headerOf({ partLength: { kind: 'rounds', rounds: 3 } }, ['before'], changes);
    const lesson = await new Lesson({ header }).begin();
    await lesson.until(47_000);
    lesson.touch('on');
    await lesson.until(50_000);
    lesson.session.flag();
    await lesson.clock.advance(0);
    return { header, journal: lesson.store.journal(), lesson };
  };

  it('after a minute and a half goes on with the right child, and cues sound again on the grid', async () => {
    const { header, journal } = await cutOff();
    const lesson = await resumed(header, journal, 90_000);
    await lesson.session.begin();
    const page = lesson.clock.page;
    expect(lesson.session.snapshot()).toMatchObject({
      phase: 'running',
      now: 140_000,
      current: { number: 9, child: 'c3', cueAt: 135_000 },
      kept: { of: journal.length + 1 },
    });
    await lesson.clock.advance(2000);
    lesson.touch('off');
    await lesson.clock.advance(20_000);
    expect(lesson.outcome()).toEqual([
      ...['missed', 'missed', 'on', 'prompt failed', 'prompt failed'],
      ...['prompt failed', 'prompt failed', 'prompt failed', 'off'],
    ]);
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', reason: 'complete', at: 150_000 });
    expect(lesson.audio.heard().filter(({ heardAt }) => (heardAt ?? 0) < page)).toEqual([]);
  });

  it('takes its time from the entry that was written soonest, not from one that a busy page wrote late', async () => {
    const header = headerOf();
    const first = await new Lesson({ header }).begin();
    await first.until(46_000);
    const down = first.clock.pageClock.now();
    first.clock.block(700);
    first.session.touch('on', down);
    await first.clock.advance(0);
    const journal = first.store.journal();
    expect(journal.at(-1)).toMatchObject({ kind: 'marked', at: 46_000 });
    const lesson = await resumed(header, journal, 5000);
    await lesson.session.begin();
    expect(lesson.session.snapshot().now).toBe(51_700);
  });

  it('during the count-in goes on counting', async () => {
    const { header, journal } = await cutOff();
    const lesson = await resumed(header, journal.slice(0, 1), 1250);
    await lesson.session.begin();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'counting in', now: -2000, countIn: 2 });
    await lesson.clock.advance(18_000);
    expect(lesson.session.snapshot().current?.number).toBe(1);
  });

  it('keeps a pause, an interruption and silence as they were', async () => {
    const paused = await cutOff({ role: null });
    paused.lesson.session.pause();
    await paused.lesson.clock.advance(10_000);
    paused.lesson.session.note('waiting');
    await paused.lesson.clock.advance(0);
    const again = await resumed(paused.header, paused.lesson.store.journal(), 600_000);
    await again.session.begin();
    await again.clock.advance(30_000);
    expect(again.session.snapshot()).toMatchObject({ phase: 'paused', now: 50_000 });
    again.session.resume();
    await again.clock.advance(10_000);
    expect(again.session.snapshot()).toMatchObject({ now: 60_000, current: { number: 4 } });

    const still = await cutOff();
    still.lesson.session.interruptClass();
    still.lesson.session.silence(true);
    await still.lesson.clock.advance(0);
    const later = await resumed(still.header, still.lesson.store.journal(), 20_000);
    await later.session.begin();
    expect(later.session.snapshot()).toMatchObject({
      phase: 'interrupted',
      sound: { on: false, cause: 'hand' },
    });
    later.session.continueClass();
    await later.clock.advance(40_000);
    expect(later.audio.heard()).toEqual([]);
  });

  it('after the end of its schedule is closed at once: complete, with what nobody was told of', async () => {
    const { header, journal } = await cutOff();
    const lesson = await resumed(header, journal, 86_400_000);
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'ended', ended: 'complete' });
    expect(await lesson.session.begin()).toMatchObject({ ok: false });
    await lesson.clock.advance(0);
    expect(lesson.outcome()).toEqual(['missed', 'missed', 'on', ...Array(6).fill('prompt failed')]);
    expect(lesson.store.packed).toBe(1);
  });

  it('with a wall clock set back goes on where the last sign of life was', async () => {
    const { header, journal } = await cutOff();
    const lesson = await resumed(header, journal, -3_600_000);
    await lesson.session.begin();
    expect(lesson.session.snapshot().now).toBe(50_000);
    await lesson.clock.advance(12_000);
    expect(lesson.session.snapshot().current?.number).toBe(4);
    const cued = lesson.store.journal().filter((e) => e.kind === 'cued' && e.interval === 3);
    expect(cued).toHaveLength(1);
  });

  it('elsewhere goes on under a new writer, so that two tablets never claim one entry', async () => {
    const { header, journal } = await cutOff();
    const other = journal.map((entry) => ({ ...entry, writer: 'tablet-1' }));
    const lesson = await resumed(header, other, 20_000, { elsewhere: true });
    await lesson.session.begin();
    await lesson.clock.advance(12_000);
    lesson.touch('off');
    await lesson.clock.advance(0);
    const fresh = lesson.store.journal().filter(({ writer }) => writer !== 'tablet-1');
    expect(fresh.map(({ seq }) => seq)).toEqual(fresh.map((_, i) => i));
    expect(fresh[0]).toMatchObject({ kind: 'gap', cause: 'closed', from: 50_000, to: 70_000 });
    expect(lesson.outcome().slice(2, 5)).toEqual(['on', 'prompt failed', 'off']);
  });
});
