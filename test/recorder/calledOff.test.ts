import { describe, expect, it } from 'vitest';
import { fold } from '../../src/journal/step.ts';
import { epochMs } from '../../src/kernel/units.ts';
import { epochOf } from '../../src/kernel/wallTime.ts';
import { countInTick } from '../../src/recorder/cuePatterns.ts';
import { FakeStore } from './fakes/fakeStore.ts';
import { Lesson } from './fakes/lesson.ts';

/** The hand-driven wall clock begins at 10:00:00. */
const ten = Date.UTC(2026, 10, 3, 10);
const at = (seconds: number) => epochMs(ten + seconds * 1000);

/** Page times at which prompts came out, ticks of the count-in apart. */
const prompts = (lesson: Lesson) =>
  lesson.audio
    .heard()
    .filter(({ pattern }) => pattern !== countInTick)
    .map(({ heardAt }) => Math.round(heardAt ?? Number.NaN));

/** Waiting for 10:01:00, and called off at 10:00:10. */
async function calledOff(lesson = new Lesson({ checks: ['sound'], anyway: true })): Promise<Lesson> {
  await lesson.begin({ at: at(60), nudgeMs: 480 });
  await lesson.clock.advance(10_000);
  lesson.session.callOff();
  await lesson.clock.advance(0);
  return lesson;
}

/** The same session on the same tablet, after its page was loaded again. */
function loadedAgain(lesson: Lesson): Lesson {
  const journal = lesson.store.journal();
  const store = new FakeStore();
  for (const entry of journal) store.rows.set(`${entry.writer} ${entry.seq}`, entry);
  const next = new Lesson({ header: lesson.header, store, resumeFrom: journal });
  next.clock.wall = epochOf(journal.at(-1)?.wall ?? '') + 5000;
  return next;
}

describe('a start that is called off while the agreed second is awaited', () => {
  it('leaves the session as if it had not been begun, in silence, and gives the tablet back', async () => {
    const lesson = await calledOff();
    expect(lesson.session.snapshot()).toMatchObject({
      phase: 'ready',
      resuming: false,
      startsIn: null,
      ended: null,
    });
    await lesson.clock.advance(120_000);
    expect(lesson.audio.heard()).toEqual([]);
    expect(lesson.session.snapshot().phase).toBe('ready');
    expect([lesson.lockHeld, lesson.wakeLock]).toEqual([false, 'idle']);
  });

  it('may begin at another second, with its nudge counted once, and nothing is removed from the journal', async () => {
    const lesson = await calledOff();
    await lesson.begin({ at: at(42), nudgeMs: 480 });
    const pageOfStart = lesson.zero;
    await lesson.until(110_000);
    expect(prompts(lesson)).toEqual([15, 30, 45, 60, 75, 90].map((s) => pageOfStart + s * 1000));
    const journal = lesson.store.journal();
    expect(lesson.kinds()).toEqual([
      'started',
      'clockNudged',
      'withdrawn',
      'withdrawn',
      'started',
      'clockNudged',
      'ended',
    ]);
    expect(journal.map(({ seq }) => seq)).toEqual(journal.map((_, i) => i));
    expect(new Set(journal.map(({ writer }) => writer)).size).toBe(1);
    const state = fold(lesson.header, journal);
    expect(state.nudge).toBe(480);
    // What stood on hold at the door stands on hold for this start, too.
    expect(state.entries.filter(({ kind }) => kind === 'started')).toMatchObject([
      { agreedStart: '2026-11-03T10:00:42.000+00:00', checks: ['sound'], anyway: true },
    ]);
  });

  it('keeps what was written down meanwhile, and goes on telling the screen', async () => {
    const lesson = new Lesson();
    let told = 0;
    lesson.session.subscribe(() => {
      told += 1;
    });
    await lesson.begin({ at: at(60) });
    lesson.session.note('the bell is late');
    lesson.session.childLeft('c2', 'left the room');
    lesson.session.callOff();
    const before = told;
    await lesson.begin({ at: at(30) });
    expect(told).toBeGreaterThan(before);
    await lesson.until(110_000);
    expect(lesson.kinds()).toContain('noted');
    expect(lesson.outcome().filter((one) => one === 'left the room').length).toBe(2);
  });

  it('answers touches as it was told to, also after the next start', async () => {
    const lesson = new Lesson();
    lesson.session.behave({ confirm: false, remind: false });
    await calledOff(lesson);
    await lesson.begin({ at: at(30) });
    await lesson.until(15_500);
    lesson.touch('on');
    await lesson.clock.advance(10);
    expect(lesson.kept()[0]?.codes).toEqual(['on']);
    expect(lesson.vibrations).toBe(0);
  });

  it('is possible only before session time 0: no mark is ever taken back with the start', async () => {
    const lesson = await new Lesson().begin({ at: at(20) });
    await lesson.until(16_000);
    lesson.touch('on');
    lesson.session.callOff();
    expect(lesson.session.snapshot().phase).toBe('running');
    await lesson.until(110_000);
    expect(lesson.kinds()).toEqual(['started', 'marked', 'ended']);
  });

  it('outlives a page that is loaded again', async () => {
    const lesson = loadedAgain(await calledOff());
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'ready', resuming: false });
    await lesson.begin({ at: epochMs(lesson.clock.wall + 30_000) });
    const pageOfStart = lesson.zero;
    await lesson.until(110_000);
    expect(prompts(lesson)[0]).toBe(pageOfStart + 15_000);
    expect(lesson.kinds().slice(-2)).toEqual(['started', 'ended']);
    expect(lesson.store.journal().findLast(({ kind }) => kind === 'started')).toMatchObject({
      checks: ['sound'],
      anyway: true,
    });
  });

  it('taken up while it waits, it can still be called off', async () => {
    const before = await new Lesson().begin({ at: at(60) });
    await before.clock.advance(5000);
    const lesson = loadedAgain(before);
    await lesson.session.begin();
    expect(lesson.session.snapshot().startsIn).toBeGreaterThan(0);
    lesson.session.callOff();
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'ready', resuming: false });
    await lesson.begin({ at: epochMs(lesson.clock.wall + 30_000) });
    await lesson.until(110_000);
    // The gap of the first waiting covers none of its looks.
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('waits for a store that refuses, and begins when all is kept', async () => {
    const lesson = new Lesson();
    await lesson.begin({ at: at(60) });
    lesson.store.mood = 'refuses';
    lesson.session.callOff();
    expect(await lesson.session.begin({ at: at(40) })).toMatchObject({
      ok: false,
      problem: { code: 'recorder.storeSlow' },
    });
    lesson.store.mood = 'keeps';
    await lesson.begin({ at: at(40) });
    await lesson.until(110_000);
    expect(lesson.kinds()).toEqual(['started', 'withdrawn', 'started', 'ended']);
  });
});
