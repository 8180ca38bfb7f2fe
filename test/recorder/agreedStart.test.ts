import { describe, expect, it } from 'vitest';
import { fold } from '../../src/journal/step.ts';
import { epochMs } from '../../src/kernel/units.ts';
import { epochOf } from '../../src/kernel/wallTime.ts';
import { countInTick } from '../../src/recorder/cuePatterns.ts';
import { headerOf } from '../support/session.ts';
import { FakeStore } from './fakes/fakeStore.ts';
import { Lesson } from './fakes/lesson.ts';

/** The hand-driven wall clock begins at 10:00:00. */
const ten = Date.UTC(2026, 10, 3, 10);
const at = (seconds: number) => epochMs(ten + seconds * 1000);

/** Page times at which sounds came out, ticks of the count-in and cues apart. */
const heard = (lesson: Lesson, ticks: boolean) =>
  lesson.audio
    .heard()
    .filter(({ pattern }) => (pattern === countInTick) === ticks)
    .map(({ heardAt }) => heardAt ?? Number.NaN);

/** True times of the cues heard, by a clock that is right: this tablet's wall clock is so many ms fast. */
const trueTimes = (lesson: Lesson, fastMs: number) =>
  heard(lesson, false).map((page) => page + lesson.clock.wall - lesson.clock.page - fastMs);

describe('a start by an agreed second', () => {
  it('begins at that moment of the wall clock to the millisecond, after three ticks', async () => {
    const lesson = await new Lesson().begin({ at: at(42) });
    const pageOfStart = 5000 + 42_000;
    await lesson.until(110_000);
    expect(heard(lesson, true).map((t) => t - pageOfStart)).toEqual([-3000, -2000, -1000]);
    expect(heard(lesson, false).map((t) => t - pageOfStart)).toEqual([
      15_000, 30_000, 45_000, 60_000, 75_000, 90_000,
    ]);
    expect(lesson.store.journal()[0]).toMatchObject({
      kind: 'started',
      at: -42_000,
      agreedStart: '2026-11-03T10:00:42.000+00:00',
    });
    // No nudge, no entry about one.
    expect(lesson.kinds()).toEqual(['started', 'ended']);
  });

  it('shows the time that is left, then three, two, one', async () => {
    const lesson = await new Lesson().begin({ at: at(20) });
    const shown: (string | null)[] = [];
    for (let second = 0; second < 20; second++) {
      const { startsIn, countIn, phase } = lesson.session.snapshot();
      expect(phase).toBe('counting in');
      shown.push(countIn === null ? `in ${Math.ceil((startsIn ?? Number.NaN) / 1000)}` : `${countIn}`);
      await lesson.clock.advance(1000);
    }
    expect(shown.slice(0, 3)).toEqual(['in 20', 'in 19', 'in 18']);
    expect(shown.slice(-5)).toEqual(['in 5', '3', '3', '2', '1']);
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'running', startsIn: null, countIn: null });
  });

  it('two tablets 3.480 s apart begin within a millisecond after the right nudge, and not without', async () => {
    const run = async (fastMs: number, nudgeMs: number) => {
      const lesson = new Lesson();
      lesson.clock.wall += fastMs;
      // Neither is switched on at the same moment of its page clock.
      await lesson.clock.advance(fastMs === 0 ? 0 : 1234.4);
      await lesson.begin({ at: at(60), nudgeMs });
      await lesson.until(110_000);
      return lesson;
    };
    const [first, second, unnudged] = [await run(0, 0), await run(-3480, 3480), await run(-3480, 0)];
    const times = trueTimes(first, 0);
    expect(times).toEqual([75, 90, 105, 120, 135, 150].map((s) => ten + s * 1000));
    trueTimes(second, -3480).forEach((time, i) => {
      expect(Math.abs(time - (times[i] ?? Number.NaN))).toBeLessThan(1);
    });
    expect((trueTimes(unnudged, -3480)[0] ?? Number.NaN) - (times[0] ?? Number.NaN)).toBeCloseTo(3480, 0);
    const journal = second.store.journal();
    expect(second.kinds()).toEqual(['started', 'clockNudged', 'ended']);
    expect(journal[1]).toMatchObject({ kind: 'clockNudged', by: 3480 });
    // The agreed second is written as both agreed on it, not as the slow clock shows it.
    expect(journal[0]).toMatchObject({ agreedStart: '2026-11-03T10:01:00.000+00:00' });
    expect(fold(second.header, journal).nudge).toBe(3480);
  });

  it('refuses a second that is too near for the count-in, and takes a later one', async () => {
    const lesson = new Lesson();
    expect(await lesson.session.begin({ at: epochMs(ten + 3249) })).toEqual({
      ok: false,
      problem: { code: 'recorder.startTooNear', values: { seconds: 4 } },
    });
    expect(lesson.session.snapshot().phase).toBe('ready');
    expect(lesson.store.journal()).toEqual([]);
    // The nudge says that it is later than this clock shows.
    expect(await lesson.session.begin({ at: at(6), nudgeMs: 3000 })).toMatchObject({ ok: false });
    expect(await lesson.session.begin({ at: at(6) })).toMatchObject({ ok: true });
  });

  it('a shared count keeps the nudge as well, and names no second', async () => {
    const lesson = await new Lesson().begin({ nudgeMs: -260 });
    await lesson.until(110_000);
    expect(lesson.kinds()).toEqual(['started', 'clockNudged', 'ended']);
    expect(lesson.store.journal()[0]).not.toHaveProperty('agreedStart');
    expect(lesson.store.journal()[1]).toMatchObject({ by: -260 });
  });

  it('ended while it waits: every look is missing, ended early', async () => {
    const lesson = await new Lesson().begin({ at: at(60) });
    await lesson.clock.advance(10_000);
    lesson.session.end('fire drill');
    await lesson.clock.advance(100_000);
    expect(lesson.session.snapshot().ended).toBe('early');
    expect(lesson.audio.heard()).toEqual([]);
    expect(new Set(lesson.outcome())).toEqual(new Set(['ended early']));
  });

  it.each([
    ['without a nudge', 0],
    ['with a nudge', 1500],
  ])('killed while it waits, it is taken up and begins at the agreed second: %s', async (_, nudgeMs) => {
    const before = await new Lesson().begin({ at: at(60), nudgeMs });
    await before.clock.advance(10_000);
    const journal = before.store.journal();

    const store = new FakeStore();
    for (const entry of journal) store.rows.set(`${entry.writer} ${entry.seq}`, entry);
    const lesson = new Lesson({ header: headerOf(), store, resumeFrom: journal });
    lesson.clock.wall = epochOf(journal[0]?.wall ?? '') + 25_000;
    await lesson.session.begin();
    expect(lesson.session.snapshot().startsIn).toBe(35_000 - nudgeMs);
    const pageOfStart = lesson.clock.page + 35_000 - nudgeMs;
    await lesson.clock.advance(150_000);
    expect(heard(lesson, true).map((t) => t - pageOfStart)).toEqual([-3000, -2000, -1000]);
    expect(heard(lesson, false)[0]).toBe(pageOfStart + 15_000);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });
});
