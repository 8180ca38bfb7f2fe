import { describe, expect, it } from 'vitest';
import { countInTick } from '../../src/recorder/cuePatterns.ts';
import { headerOf } from '../support/session.ts';
import { Lesson } from './fakes/lesson.ts';

/** Looks each 15 seconds for ten minutes. */
const begun = () =>
  new Lesson({ header: headerOf({ partLength: { kind: 'minutes', minutes: 10 } }) }).begin();

const grid = Array.from({ length: 40 }, (_, k) => (k + 1) * 15_000);

const heardTimes = (lesson: Lesson) =>
  lesson.audio
    .heard()
    .filter(({ pattern }) => pattern !== countInTick)
    .map(({ heardAt }) => Math.round(((heardAt ?? 0) - lesson.zero) * 100) / 100);

const planned = (lesson: Lesson) =>
  lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.planned] : []));

const gaps = (lesson: Lesson) =>
  lesson.store.journal().flatMap((e) => (e.kind === 'gap' ? [[e.cause, e.from, e.to, e.estimated]] : []));

describe('the sound stops and comes back', () => {
  it.each([
    ['the same context', false],
    ['a new context', true],
  ])('%s: cues lie anew on the same grid, none comes late, none is lost', async (_, anew) => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.audio.interrupt();
    expect(lesson.session.snapshot().sound.heard).toBe(false);
    await lesson.until(163_000);
    lesson.audio.comeBack({ anew });
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid.filter((at) => at < 100_000 || at > 163_000));
    expect(planned(lesson)).toEqual(grid);
    // The screen went on: nothing is missing for it, and the gap is written down without length.
    expect(gaps(lesson)).toEqual([['sound', 163_000, 163_000, false]]);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('a context that says "running" and stands still is not believed', async () => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.audio.frozen = true;
    await lesson.until(140_000);
    expect(lesson.session.snapshot().sound.heard).toBe(false);
    expect(lesson.session.snapshot().flashStrongly).toBe(true);
    lesson.audio.frozen = false;
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid.filter((at) => at < 100_000 || at > 140_000));
    const by = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.by.join('+')] : []));
    expect(by.filter((carriers) => carriers === 'screen')).toHaveLength(3);
    expect(planned(lesson)).toEqual(grid);
  });

  it('a frozen page whose audio stood still meanwhile: what lay ahead is laid anew before it sounds at a wrong moment', async () => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.setHidden(true);
    lesson.audio.frozen = true;
    // Nothing wakes for 32 seconds, while page and wall clock go on.
    lesson.clock.block(32_000);
    lesson.audio.frozen = false;
    lesson.setHidden(false);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid.filter((at) => at < 100_000 || at > 132_000));
    expect(gaps(lesson)).toEqual([
      ['hidden', 105_000, 132_000, false],
      ['sound', 132_250, 132_250, false],
    ]);
    expect(lesson.outcome().slice(5, 10)).toEqual([
      ...['missed', 'prompt failed', 'prompt failed', 'missed', 'missed'],
    ]);
  });
});

describe('the audio clock slips, as on a machine that stood still for a moment', () => {
  /** The audio clock alone stands still for so long from this session time on. */
  const slip = async (lesson: Lesson, from: number, ms: number) => {
    await lesson.until(from);
    lesson.audio.frozen = true;
    await lesson.until(from + ms);
    lesson.audio.frozen = false;
  };
  const told = (lesson: Lesson) =>
    lesson.store
      .journal()
      .flatMap((e) => (e.kind === 'cued' ? [[e.planned, e.delivered, e.by.join('+')]] : []));

  it('between two cues: noticed within two seconds, written down once, and no cue is late for it', async () => {
    const lesson = await begun();
    await slip(lesson, 100_000, 112);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    expect(gaps(lesson)).toEqual([['sound', 101_050, 101_050, false]]);
    expect(told(lesson)).toEqual(grid.map((at) => [at, at, 'sound+screen']));
  });

  it('just before a cue: the cue is shown in time, heard a little late, and said to be so', async () => {
    const lesson = await begun();
    await slip(lesson, 104_700, 112);
    await lesson.until(700_000);
    const late = grid.map((at) => (at === 105_000 ? 105_112 : at));
    expect(heardTimes(lesson)).toEqual(late);
    expect(gaps(lesson)).toEqual([['sound', 105_050, 105_050, false]]);
    expect(told(lesson)).toEqual(grid.map((at, i) => [at, late[i], 'sound+screen']));
  });

  it('by more than a quarter of a second: the cue is shown, and not heard so late', async () => {
    const lesson = await begun();
    await slip(lesson, 104_650, 300);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid.filter((at) => at !== 105_000));
    expect(gaps(lesson)).toEqual([['sound', 105_050, 105_050, false]]);
    expect(told(lesson)).toEqual(grid.map((at) => [at, at, at === 105_000 ? 'screen' : 'sound+screen']));
  });

  it('forth: a cue that has sounded already is not given a second time', async () => {
    const lesson = await begun();
    await lesson.until(104_850);
    lesson.audio.speed = 5;
    await lesson.until(104_900);
    lesson.audio.speed = 1;
    await lesson.until(700_000);
    // 200 ms ahead: what lay at 105 s came out at 104.8 s and something.
    expect(heardTimes(lesson).map((at) => Math.round(at / 15_000))).toEqual(grid.map((at) => at / 15_000));
    expect(told(lesson)[6]).toEqual([105_000, 104_800, 'sound+screen']);
    expect(heardTimes(lesson).filter((at) => at % 15_000 !== 0)).toHaveLength(1);
  });

  it('and the page is busy meanwhile: a cue that came late is said to be as late as it was', async () => {
    const lesson = await begun();
    await lesson.until(104_500);
    lesson.audio.frozen = true;
    lesson.clock.block(112);
    lesson.audio.frozen = false;
    lesson.clock.block(1000);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid.map((at) => (at === 105_000 ? 105_112 : at)));
    expect(told(lesson)[6]).toEqual([105_000, 105_112, 'sound+screen']);
    expect(told(lesson).filter(([planned, delivered]) => planned !== delivered)).toHaveLength(1);
    expect(gaps(lesson)).toEqual([['sound', 105_662, 105_662, false]]);
  });
});

describe('the page is hidden', () => {
  it('cues sound on time though timers come once a minute, and are known to have been heard', async () => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.clock.throttle = 60_000;
    lesson.setHidden(true);
    await lesson.until(400_000);
    lesson.clock.throttle = 0;
    lesson.setHidden(false);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    const by = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.by.join('+')] : []));
    expect(by.filter((carriers) => carriers === 'sound')).toHaveLength(20);
    expect(gaps(lesson)).toEqual([['hidden', 400_000, 400_000, false]]);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('silent and hidden, looks come to nobody: they are missing with that reason, and marked ones stay', async () => {
    const lesson = await begun();
    lesson.session.silence(true);
    await lesson.until(32_000);
    lesson.touch('on');
    await lesson.until(40_000);
    lesson.setHidden(true);
    await lesson.until(80_000);
    lesson.setHidden(false);
    await lesson.until(82_000);
    lesson.touch('off');
    await lesson.until(700_000);
    // Looks at 45, 60 and 75 seconds were neither heard nor shown; the last of them is still open and marked by hand.
    expect(lesson.outcome().slice(0, 6)).toEqual([
      ...['missed', 'on', 'prompt failed', 'prompt failed', 'off', 'missed'],
    ]);
    expect(gaps(lesson)).toEqual([['hidden', 45_000, 80_000, false]]);
  });

  it('still hidden at the end, the stretch ends with the session, and the end stays complete and on time', async () => {
    const lesson = await begun();
    lesson.session.silence(true);
    await lesson.until(560_000);
    lesson.clock.throttle = 60_000;
    lesson.setHidden(true);
    await lesson.until(700_000);
    expect(gaps(lesson)).toEqual([['hidden', 570_000, 615_000, false]]);
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', reason: 'complete', at: 615_000 });
    expect(lesson.outcome().slice(36)).toEqual(['missed', 'prompt failed', 'prompt failed', 'prompt failed']);
  });

  it('a busy page keeps its sounds, and shows no cue that is over', async () => {
    const lesson = await begun();
    await lesson.until(14_900);
    lesson.clock.block(900);
    await lesson.until(29_900);
    lesson.clock.block(5_000);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    const by = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.by.join('+')] : []));
    expect(by.slice(0, 3)).toEqual(['sound+screen', 'sound', 'sound+screen']);
  });
});

describe('the tablet sleeps', () => {
  it('the grid goes on by the wall clock; what fell in between is missing; no prompt is given afterwards', async () => {
    const lesson = await begun();
    await lesson.until(32_000);
    lesson.touch('on');
    await lesson.until(50_000);
    lesson.setHidden(true);
    lesson.clock.sleep(100_000);
    lesson.setHidden(false);
    lesson.zero -= 100_000;
    expect(lesson.session.snapshot().now).toBe(150_000);
    await lesson.until(700_000);
    expect(gaps(lesson)[0]).toEqual(['asleep', 50_000, 150_000, true]);
    expect(lesson.outcome().slice(0, 11)).toEqual([
      ...['missed', 'on', 'prompt failed', 'prompt failed', 'prompt failed', 'prompt failed'],
      ...['prompt failed', 'prompt failed', 'prompt failed', 'prompt failed', 'missed'],
    ]);
    // The look of the very moment of waking came to nobody; from 165 s on all sound on the grid.
    expect(lesson.store.journal().find((e) => e.kind === 'cued' && e.interval === 10)).toMatchObject({
      by: [],
    });
    const after = lesson.audio.heard().flatMap(({ heardAt }) => {
      const at = (heardAt ?? 0) - lesson.zero;
      return at > 150_001 ? [Math.round(at)] : [];
    });
    expect(after).toEqual(grid.filter((at) => at > 150_000));
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', at: 615_000 });
  });
});

describe('a gap is noticed within two seconds of return, with nobody touching anything', () => {
  it.each<[string, (lesson: Lesson) => Promise<void> | void]>([
    ['sleep', ({ clock }) => clock.sleep(60_000)],
    ['a page that hid for five seconds', ({ clock }) => clock.advance(5000)],
    ['a clock set back', ({ clock }) => clock.sleep(-600_000)],
  ])('%s', async (_, happens) => {
    const lesson = await begun();
    await lesson.until(50_400);
    // No event tells of it: only the next wake-up does.
    lesson.hidden = true;
    await happens(lesson);
    lesson.hidden = false;
    const back = lesson.clock.page;
    let noticed = Number.NaN;
    lesson.session.subscribe(() => {
      const known = lesson.session.snapshot().state.gaps.length > 0;
      if (known && Number.isNaN(noticed)) noticed = lesson.clock.page;
    });
    await lesson.clock.advance(10_000);
    expect(noticed - back).toBeLessThanOrEqual(2000);
    expect(lesson.store.journal().some(({ kind }) => kind === 'gap')).toBe(true);
  });
});

describe('the wall clock is moved', () => {
  it.each([
    ['forth by an hour', 3_600_000],
    ['back by an hour', -3_600_000],
    ['back by a day', -86_400_000],
  ])('%s: nothing shifts, and it is written down', async (_, ms) => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.clock.wall += ms;
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    expect(planned(lesson)).toEqual(grid);
    expect(gaps(lesson)).toHaveLength(1);
    expect(gaps(lesson)[0]?.[0]).toBe('clock');
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
    expect(lesson.store.journal().at(-1)).toMatchObject({ kind: 'ended', at: 615_000 });
  });

  it('back while hidden: nothing shifts either', async () => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.setHidden(true);
    lesson.clock.wall -= 3_600_000;
    await lesson.until(110_000);
    lesson.setHidden(false);
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('summer time ends in the lesson: nothing shifts, nothing is a gap, and entries keep their order', async () => {
    const lesson = new Lesson({ header: headerOf({ partLength: { kind: 'minutes', minutes: 10 } }) });
    // 25 October 2026, 1:55 of summer time in London: in five minutes it is one o'clock again.
    lesson.clock.wall = Date.UTC(2026, 9, 25, 0, 55);
    lesson.clock.offset = 60;
    await lesson.begin();
    await lesson.until(299_000);
    lesson.clock.offset = 0;
    await lesson.until(700_000);
    expect(heardTimes(lesson)).toEqual(grid);
    expect(gaps(lesson)).toEqual([]);
    const walls = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.wall] : []));
    expect(walls[18]).toBe('2026-10-25T01:59:48.250+01:00');
    expect(walls[19]).toBe('2026-10-25T01:00:03.250+00:00');
    expect(lesson.kept()).toHaveLength(40);
  });

  it('trimmed by less than a second: not even written down', async () => {
    const lesson = await begun();
    await lesson.until(100_000);
    lesson.clock.wall += 900;
    await lesson.until(700_000);
    expect(gaps(lesson)).toEqual([]);
  });
});
