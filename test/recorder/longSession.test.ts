import { describe, expect, it } from 'vitest';
import type { KnownEntry } from '../../src/journal/entry.ts';
import { countInTick, cuePattern } from '../../src/recorder/cuePatterns.ts';
import { headerOf } from '../support/session.ts';
import { beforeZero, Lesson } from './fakes/lesson.ts';

type Cued = Extract<KnownEntry, { kind: 'cued' }>;

const cuesOf = (lesson: Lesson): Cued[] =>
  lesson.store.journal().filter((entry): entry is Cued => entry.kind === 'cued');

describe('two hours, one look each 15 seconds, nobody touches anything', () => {
  const run = async (): Promise<Lesson> => {
    const lesson = new Lesson({ header: headerOf({ partLength: { kind: 'minutes', minutes: 120 } }) });
    await lesson.begin();
    await lesson.until(2 * 3_600_000 + 15_000);
    return lesson;
  };

  it('gives 480 cues exactly on the grid, by sound and screen, and ends when the last look closes', async () => {
    const lesson = await run();
    const expected = Array.from({ length: 480 }, (_, k) => (k + 1) * 15_000);
    expect(cuesOf(lesson).map(({ planned }) => planned)).toEqual(expected);
    expect(cuesOf(lesson).map(({ delivered }) => delivered)).toEqual(expected);
    expect(new Set(cuesOf(lesson).map(({ by }) => by.join()))).toEqual(new Set(['sound,screen']));
    expect(cuesOf(lesson).map(({ interval }) => interval)).toEqual(expected.map((_, k) => k + 1));
    const last = lesson.store.journal().at(-1);
    expect(last).toMatchObject({ kind: 'ended', reason: 'complete', at: 7_215_000 });
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
    expect(lesson.session.snapshot()).toMatchObject({ phase: 'ended', ended: 'complete', current: null });
  });

  it('sounds three equal ticks before time 0 and each look at its own moment, and nothing else', async () => {
    const lesson = await run();
    const heard = lesson.audio.heard();
    const at = (sound: (typeof heard)[number]) =>
      Math.round(((sound.heardAt ?? 0) - lesson.zero) * 1000) / 1000;
    expect(heard.slice(0, 3).map((sound) => [sound.pattern, at(sound)])).toEqual([
      [countInTick, -3000],
      [countInTick, -2000],
      [countInTick, -1000],
    ]);
    expect(heard.slice(3).map(at)).toEqual(Array.from({ length: 480 }, (_, k) => (k + 1) * 15_000));
    expect(heard.slice(3).every(({ pattern }) => pattern === cuePattern('look'))).toBe(true);
  });

  it('has every sound on the audio clock a minute before it is due', async () => {
    const lesson = await run();
    const late = lesson.audio
      .heard()
      .filter(({ heardAt, laidAt }) => (heardAt ?? 0) - laidAt < 60_000 && laidAt > lesson.zero - beforeZero);
    expect(late).toEqual([]);
  });

  it('lets go of screen, sound and the right to record, packs the journal and leaves no timer', async () => {
    const lesson = await run();
    expect(lesson).toMatchObject({ wakeLock: 'idle', lockHeld: false });
    expect(lesson.audio.closed).toBe(true);
    expect(lesson.store.packed).toBe(1);
    expect(lesson.clock.pendingTimers).toBe(0);
  });
});

describe('three hours with a break, observe and record parts, two crystals that disagree', () => {
  const ppm = 80;
  const run = async (): Promise<Lesson> => {
    const lesson = new Lesson({
      header: headerOf(
        {
          method: 'partial',
          intervalMs: 10_000,
          observeMs: 7000,
          partLength: { kind: 'minutes', minutes: 85 },
        },
        ['before', 'after'],
      ),
    });
    lesson.audio.speed = 1 + ppm / 1e6;
    // Readings of the clock scatter by up to 8 ms, the same each time.
    let n = 0;
    lesson.audio.jitter = () => ((n++ * 7) % 17) - 8;
    await lesson.begin();
    await lesson.until(85 * 60_000 + 30_000);
    lesson.session.breakStarted();
    await lesson.clock.advance(8 * 60_000);
    lesson.session.firstTaskGiven();
    await lesson.clock.advance(86 * 60_000);
    return lesson;
  };

  it('keeps both parts on their own exact grid, and the sounds on it to the audio clock', async () => {
    const lesson = await run();
    const origins = lesson.session.snapshot().state.origins;
    const second = origins[1] ?? Number.NaN;
    const grid = [0, second].flatMap((origin) =>
      Array.from({ length: 510 }, (_, k) => [origin + k * 10_000, origin + k * 10_000 + 7000]).flat(),
    );
    expect(cuesOf(lesson).map(({ planned }) => planned)).toEqual(grid);
    expect(cuesOf(lesson).every(({ by }) => by.includes('sound'))).toBe(true);
    // In audio time every sound lies where the grid says, without any error, over three hours.
    const cues = lesson.audio.heard().filter(({ pattern }) => pattern !== countInTick);
    const first = cues[0]?.at ?? Number.NaN;
    const off = cues.map(({ at }, k) => Math.abs(at - first - (grid[k] ?? 0) / 1000));
    expect(Math.max(...off)).toBeLessThan(1e-9);
    expect(cues).toHaveLength(grid.length);
    expect(lesson.session.snapshot().ended).toBe('complete');
  });

  it('stamps touches by the clock of the cues: one at the sound of a cue is stamped with it, up to the scatter', async () => {
    const lesson = new Lesson({ header: headerOf({ partLength: { kind: 'minutes', minutes: 180 } }) });
    lesson.audio.speed = 1 + ppm / 1e6;
    let n = 0;
    lesson.audio.jitter = () => ((n++ * 7) % 17) - 8;
    await lesson.begin();
    await lesson.until(179 * 60_000);
    const next = lesson.audio.laid.find(({ heardAt, takenBack }) => heardAt === null && takenBack === null);
    const seconds = ((next?.at ?? 0) - (lesson.audio.now() ?? 0)) / lesson.audio.speed;
    await lesson.clock.advance(seconds * 1000 + 500);
    lesson.touch('on');
    await lesson.clock.advance(100);
    const [cued] = cuesOf(lesson).slice(-1);
    const marked = lesson.store.journal().find((entry) => entry.kind === 'marked');
    expect(Math.abs((marked?.at ?? 0) - (cued?.planned ?? 0) - 500)).toBeLessThanOrEqual(8);
    // The page clock alone would have been wrong by more than half a second.
    expect(Math.abs(lesson.clock.page - 100 - lesson.zero - (marked?.at ?? 0))).toBeGreaterThan(500);
  });
});
