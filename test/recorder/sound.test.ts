import { describe, expect, it } from 'vitest';
import { leadIn } from '../../src/recorder/cuePatterns.ts';
import { headerOf } from '../support/session.ts';
import { Lesson } from './fakes/lesson.ts';
import { begun, heardTimes, mark } from './fakes/quarters.ts';

describe('silence and the output', () => {
  it('by hand: no sound from that moment on, also of what lay ahead; the screen goes on; sound comes back on the grid', async () => {
    const lesson = await begun();
    await lesson.until(20_000);
    lesson.session.silence(true);
    await lesson.until(50_000);
    expect(lesson.session.snapshot()).toMatchObject({ flash: 3, sound: { on: false, cause: 'hand' } });
    lesson.session.silence(false);
    await lesson.until(110_000);
    expect(heardTimes(lesson)).toEqual([15_000, 60_000, 75_000, 90_000]);
    const by = lesson.store.journal().flatMap((e) => (e.kind === 'cued' ? [e.by.join('+')] : []));
    expect(by).toEqual(['sound+screen', 'screen', 'screen', 'sound+screen', 'sound+screen', 'sound+screen']);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('earpiece out: cues fall silent, the screen goes on, the observer is told, and sound waits for their word', async () => {
    const lesson = await begun();
    await lesson.until(20_000);
    lesson.audio.output('gone');
    expect(lesson.session.snapshot().sound).toMatchObject({ on: false, cause: 'device' });
    await lesson.until(40_000);
    lesson.audio.output('new');
    await lesson.until(50_000);
    expect(heardTimes(lesson)).toEqual([15_000]);
    lesson.session.silence(false);
    await lesson.until(110_000);
    expect(heardTimes(lesson)).toEqual([15_000, 60_000, 75_000, 90_000]);
    expect(lesson.kinds()).toEqual(['started', 'outputChanged', 'outputChanged', 'ended']);
    expect(new Set(lesson.outcome())).toEqual(new Set(['missed']));
  });

  it('a tablet without any sound records all the same, by the screen', async () => {
    const lesson = new Lesson();
    lesson.audio.unlocks = false;
    expect(await lesson.session.begin()).toEqual({ ok: true, value: { sound: false } });
    lesson.zero = lesson.clock.page + 3250;
    await mark(lesson, 1, 2, 3, 4, 5, 6);
    await lesson.until(110_000);
    expect(lesson.outcome()).toEqual(Array(6).fill('on'));
    expect(lesson.kinds()).not.toContain('gap');
  });

  it('wakes an earpiece on the air with something quiet before each tone, and a wired one with nothing', async () => {
    for (const [latencyMs, leads] of [
      [180, true],
      [20, false],
    ] as const) {
      const lesson = new Lesson();
      lesson.audio.latencyMs = latencyMs;
      // The screen has looked at the session before its sound was unlocked.
      expect(lesson.session.snapshot().phase).toBe('ready');
      await lesson.begin();
      await lesson.until(110_000);
      const patterns = lesson.audio.heard().map(({ pattern }) => pattern.tones.includes(leadIn));
      expect(patterns).toEqual(Array(9).fill(leads));
      expect(heardTimes(lesson)).toEqual([15_000, 30_000, 45_000, 60_000, 75_000, 90_000]);
      expect(lesson.store.journal()[0]).toMatchObject({ kind: 'started', audioLatencyMs: latencyMs });
    }
  });

  it('vibrates only where the protocol asks for it', async () => {
    const quiet = await begun();
    const shaking = await begun(
      headerOf({ cues: { channel: 'left', volume: 0.2, flash: false, vibration: true } }),
    );
    await quiet.until(110_000);
    await shaking.until(110_000);
    expect([quiet.vibrations, shaking.vibrations]).toEqual([0, 6]);
    expect(shaking.audio.settings).toMatchObject({ channel: 'left', volume: 0.2 });
    const by = shaking.store.journal().flatMap((e) => (e.kind === 'cued' ? e.by : []));
    expect(by.filter((carrier) => carrier === 'vibration')).toHaveLength(6);
  });
});
